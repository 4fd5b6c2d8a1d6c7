namespace HemoRheo;

/// <summary>A joint problem at one set of unknowns: what the laws say there, the weights, and the undamped step from there.</summary>
internal sealed class JointSolution
{
    private readonly JointProblem _problem;
    private readonly int[] _free;
    private readonly double[] _slopes;
    private readonly HouseholderQr _factored;

    /// <param name="problem">The problem.</param>
    /// <param name="scaled">Unknowns on the fitting scale, column by column; infinite for a held one.</param>
    /// <param name="held">Whether a column is held at its bound.</param>
    /// <param name="deviations">Standard deviations of the readings, Pa; null for those at the fitted stress.</param>
    public JointSolution(JointProblem problem, double[] scaled, bool[] held, double[]? deviations)
    {
        (_problem, Scaled, Held) = (problem, scaled, held);
        _free = [.. Enumerable.Range(0, held.Length).Where(c => !held[c])];
        var (points, rows) = (problem.Points, Math.Max(problem.Points, _free.Length));
        (Fitted, Residuals, _slopes) = (new double[points], new double[points], new double[points * scaled.Length]);
        problem.Evaluate(scaled, Fitted, _slopes);
        Deviations = deviations ?? problem.Deviations(Fitted);
        _factored = new(rows, _free.Length);
        for (var i = 0; i < points; i++)
        {
            Residuals[i] = (problem.Stresses[i] - Fitted[i]) / Deviations[i];
            ChiSquare += Residuals[i] * Residuals[i];
            for (var j = 0; j < _free.Length; j++) _factored.Matrix[j * rows + i] = _slopes[_free[j] * points + i] / Deviations[i];
        }

        _factored.Factor();
    }

    /// <summary>Unknowns on the fitting scale, column by column; infinite for a held one.</summary>
    public double[] Scaled { get; }

    /// <summary>Whether a column is held at its bound.</summary>
    public bool[] Held { get; }

    /// <summary>How many columns are fitted.</summary>
    public int Free => _free.Length;

    /// <summary>Standard deviations of the readings.</summary>
    public double[] Deviations { get; }

    /// <summary>Stresses of the laws, Pa.</summary>
    public double[] Fitted { get; }

    /// <summary>Standardized residuals.</summary>
    public double[] Residuals { get; }

    /// <summary>Their sum of squares.</summary>
    public double ChiSquare { get; }

    /// <summary>How it ended.</summary>
    public required Convergence End { get; init; }

    /// <summary>Change of the unknowns, column by column, when the readings are raised by these stresses (linear response).</summary>
    public double[] Response(Func<int, double> raised)
    {
        var right = new double[Math.Max(Fitted.Length, _free.Length)];
        for (var i = 0; i < Fitted.Length; i++) right[i] = raised(i) / Deviations[i];
        var (solved, response) = (new double[_free.Length], new double[Scaled.Length]);
        _factored.Turn(right);
        _factored.Solve(right, solved);
        for (var j = 0; j < solved.Length; j++) response[_free[j]] = solved[j];
        return response;
    }

    /// <summary>The undamped step, column by column.</summary>
    public double[] Step() => Response(i => _problem.Stresses[i] - Fitted[i]);

    /// <summary>Inverse of the weighted normal equations, row by row; zero rows for held columns.</summary>
    public double[] Inverse()
    {
        var (inverse, size) = (_factored.InverseOfNormal(), Scaled.Length);
        var whole = new double[size * size];
        for (var r = 0; r < _free.Length; r++)
        {
            for (var c = 0; c < _free.Length; c++) whole[_free[r] * size + _free[c]] = inverse[r * _free.Length + c];
        }

        return whole;
    }

    /// <summary>Whether the sum of squares falls when a held column leaves its bound.</summary>
    public bool FallsInward(int column)
    {
        var wall = _problem.Columns[column].Wall!;
        var at = Scaled.ToArray();
        at[column] = wall.At;
        var (stresses, slopes) = (new double[Fitted.Length], new double[_slopes.Length]);
        _problem.Evaluate(at, stresses, slopes);
        var score = 0.0;
        for (var i = 0; i < stresses.Length; i++) score += slopes[column * stresses.Length + i] * (_problem.Stresses[i] - stresses[i]) / (Deviations[i] * Deviations[i]);
        return wall.Inward * score > 0;
    }
}
