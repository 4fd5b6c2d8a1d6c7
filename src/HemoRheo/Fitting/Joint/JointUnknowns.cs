using System.Globalization;

namespace HemoRheo;

/// <summary>From the columns of a joint solution to its parameters: the same, and a factor for every loading, the last of which is minus the sum of the others.</summary>
internal sealed class JointUnknowns
{
    private readonly JointProblem _problem;
    private readonly JointSolution _solution;
    private readonly double[][] _rows;

    public JointUnknowns(JointProblem problem, JointSolution solution)
    {
        (_problem, _solution) = (problem, solution);
        var (size, first) = (problem.Columns.Length, problem.FirstFactor);
        var factors = first < size ? problem.Curves.Length : 0;
        _rows = new double[first + factors][];
        for (var r = 0; r < _rows.Length; r++)
        {
            _rows[r] = new double[size];
            if (r < first) _rows[r][r] = 1;
            else problem.Curves[r - first].Contrast.CopyTo(_rows[r], first);
        }
    }

    /// <summary>Numbers of the columns as numbers of the parameters.</summary>
    public IEnumerable<double> Expanded(double[] columns) => _rows.Select((row, r) => r < _problem.FirstFactor ? columns[r] : Sum(row, columns));

    /// <summary>Covariance of the parameters, row by row.</summary>
    public double[] Covariance(double scale)
    {
        var size = _problem.Columns.Length;
        var inverse = _solution.Inverse();
        var covariance = new double[_rows.Length * _rows.Length];
        for (var r = 0; r < _rows.Length; r++)
        {
            double[] middle = [.. Enumerable.Range(0, size).Select(c => r < _problem.FirstFactor ? inverse[r * size + c] : Sum(_rows[r], Column(inverse, c, size)))];
            for (var s = 0; s < _rows.Length; s++) covariance[r * _rows.Length + s] = scale * (s < _problem.FirstFactor ? middle[s] : Sum(_rows[s], middle));
        }

        return covariance;
    }

    /// <summary>The parameters on the natural scale.</summary>
    /// <param name="covariance">Their covariance on the fitting scale; empty where there is none.</param>
    /// <param name="whyNone">Why there is none.</param>
    public IEnumerable<JointParameter> Parameters(double[] covariance, string whyNone)
    {
        double[] scaled = [.. Expanded(_solution.Scaled)];
        for (var r = 0; r < _rows.Length; r++)
        {
            var isFactor = r >= _problem.FirstFactor;
            var parameter = isFactor ? LoadingFactor.Parameter : _problem.Columns[r].Parameter;
            var held = !isFactor && _solution.Held[r];
            var natural = parameter.ToNatural(new Lane(scaled[r]));
            var why = held ? "held at its bound" : covariance.Length == 0 ? whyNone : null;
            double? error = why is null ? parameter.SlopeOf(natural)[0] * Math.Sqrt(covariance[r * _rows.Length + r]) : null;
            yield return new(new(parameter, natural[0], error, why, held), isFactor ? r - _problem.FirstFactor : _problem.Columns[r].Curve);
        }
    }

    /// <summary>One finding for each parameter that is held at its bound.</summary>
    public IEnumerable<Finding> AtBounds(JointFit fit)
    {
        for (var c = 0; c < _problem.FirstFactor; c++)
        {
            if (!_solution.Held[c]) continue;
            var number = fit.Parameters[c].Number;
            var whose = _problem.Columns[c].Curve is { } curve ? fit.Curves[curve].Label.Where : fit.Where;
            yield return FittingFindings.Boundary.At(whose, string.Create(CultureInfo.InvariantCulture, $"{fit.LawName} at its boundary, {number.Parameter.Name} = {number.Estimate:G3}: {_problem.Columns[c].Wall!.Law} describes {(_problem.Columns[c].Curve is null ? "the curves" : "this curve")}."));
        }
    }

    private static IEnumerable<double> Column(double[] matrix, int column, int size) => Enumerable.Range(0, size).Select(r => matrix[r * size + column]);

    private static double Sum(double[] row, IEnumerable<double> columns) => columns.Zip(row, (x, weight) => weight == 0 ? 0 : weight * x).Sum();
}
