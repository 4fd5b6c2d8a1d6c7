namespace HemoRheo;

/// <summary>Where a general least-squares solution stands: parameters, values, slopes and weights there, and the same at a trial.</summary>
internal sealed class LeastSquaresState
{
    private readonly PointModel _model;
    private readonly double[] _data;
    private readonly double _relative;
    private readonly double _floor;
    private readonly double[] _diagonal;
    private readonly double[] _roots;
    private double[] _at;
    private double[] _values;
    private double[] _slopes;
    private double[] _trial;
    private double[] _trialValues;
    private double[] _trialSlopes;

    public LeastSquaresState(PointModel model, double[] data, double[] start, double relative, double floor)
    {
        (_model, _data, _at, _relative, _floor) = (model, data, start, relative, floor);
        var (points, size) = (data.Length, start.Length);
        (_diagonal, _roots) = (new double[size], new double[points]);
        (_trial, _trialValues, _trialSlopes) = (new double[size], new double[points], new double[points * size]);
        (_values, _slopes) = (new double[points], new double[points * size]);
        _model(_at, _values, _slopes);
        Weigh();
    }

    public double ChiSquare { get; private set; }

    public double LeastPivot { get; private set; }

    public bool IsFinite => double.IsFinite(ChiSquare) && _slopes.All(double.IsFinite);

    /// <summary>The step with a damping; zero for the undamped one.</summary>
    public double[] Step(double damping)
    {
        var (points, size) = (_data.Length, _at.Length);
        var rows = Math.Max(points, size) + size;
        var qr = new HouseholderQr(rows, size);
        var right = new double[rows];
        for (var i = 0; i < points; i++) right[i] = _roots[i] * (_data[i] - _values[i]);
        for (var k = 0; k < size; k++)
        {
            for (var i = 0; i < points; i++) qr.Matrix[k * rows + i] = _roots[i] * _slopes[k * points + i];
            qr.Matrix[k * rows + rows - size + k] = Math.Sqrt(damping) * _diagonal[k];
        }

        qr.Factor(right);
        LeastPivot = qr.LeastPivot;
        var step = new double[size];
        qr.Solve(right, step);
        return step;
    }

    /// <summary>Largest step relative to its parameter.</summary>
    public double RelativeLength(ReadOnlySpan<double> step)
    {
        double length = 0;
        for (var k = 0; k < step.Length; k++)
        {
            var relative = step[k] == 0 ? 0 : Math.Abs(step[k]) / (Math.Abs(_at[k]) + Math.Abs(step[k]));
            if (!(relative <= length)) length = relative;
        }

        return length;
    }

    /// <summary>Decrease of the sum of squares that the linear model foretells.</summary>
    public double Predicted(ReadOnlySpan<double> step)
    {
        double decrease = 0;
        for (var i = 0; i < _data.Length; i++)
        {
            double change = 0;
            for (var k = 0; k < step.Length; k++) change += _slopes[k * _data.Length + i] * step[k];
            decrease += _roots[i] * change * (_roots[i] * (2 * (_data[i] - _values[i]) - change));
        }

        return decrease;
    }

    /// <summary>Tries a step. Gives the decrease of the sum of squares under the weights of the present point; not a number where the model is not finite there.</summary>
    public double Try(ReadOnlySpan<double> step)
    {
        for (var k = 0; k < step.Length; k++) _trial[k] = _at[k] + step[k];
        _model(_trial, _trialValues, _trialSlopes);
        double decrease = 0;
        for (var i = 0; i < _data.Length; i++)
        {
            decrease += _roots[i] * (_trialValues[i] - _values[i]) * (_roots[i] * (2 * _data[i] - _trialValues[i] - _values[i]));
        }

        return double.IsFinite(decrease) && _trialSlopes.All(double.IsFinite) ? decrease : double.NaN;
    }

    /// <summary>Moves to the trial.</summary>
    public void Accept()
    {
        (_at, _trial) = (_trial, _at);
        (_values, _trialValues) = (_trialValues, _values);
        (_slopes, _trialSlopes) = (_trialSlopes, _slopes);
        Weigh();
    }

    /// <summary>What there is to say at the present point.</summary>
    public LeastSquaresSolution Solved(Convergence end)
    {
        var (points, size) = (_data.Length, _at.Length);
        var rows = Math.Max(points, size);
        var qr = new HouseholderQr(rows, size);
        var right = new double[rows];
        var residuals = new double[points];
        for (var i = 0; i < points; i++)
        {
            right[i] = _roots[i];
            residuals[i] = _roots[i] * (_data[i] - _values[i]);
            for (var k = 0; k < size; k++) qr.Matrix[k * rows + i] = _roots[i] * _slopes[k * points + i];
        }

        qr.Factor(right);
        var response = new double[size];
        qr.Solve(right, response);
        return new(_at, qr.InverseOfNormal(), response, residuals, ChiSquare, qr.LeastPivot, end);
    }

    private void Weigh()
    {
        var points = _data.Length;
        ChiSquare = 0;
        for (var i = 0; i < points; i++)
        {
            var deviation = _relative * _values[i];
            _roots[i] = 1 / Math.Sqrt(deviation * deviation + _floor * _floor);
            var residual = _roots[i] * (_data[i] - _values[i]);
            ChiSquare += residual * residual;
        }

        for (var k = 0; k < _at.Length; k++)
        {
            double sum = 0;
            for (var i = 0; i < points; i++)
            {
                var slope = _roots[i] * _slopes[k * points + i];
                sum += slope * slope;
            }

            _diagonal[k] = Math.Max(_diagonal[k], Math.Sqrt(sum));
        }
    }
}
