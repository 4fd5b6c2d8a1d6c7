namespace HemoRheo;

/// <summary>Where a general least-squares solution stands: parameters, values, slopes and weights there, and the same at a trial.</summary>
internal sealed class LeastSquaresState
{
    private const double Probe = 0.1;
    private const double LongestBend = 0.75;

    private readonly PointModel _model;
    private readonly double[] _data;
    private readonly double _relative;
    private readonly double _floor;
    private readonly double[]? _deviations;
    private readonly double[] _diagonal;
    private readonly double[] _roots;
    private double[] _at;
    private double[] _values;
    private double[] _slopes;
    private double[] _trial;
    private double[] _trialValues;
    private double[] _trialSlopes;
    private HouseholderQr? _damped;
    private double[]? _lastStep;

    public LeastSquaresState(PointModel model, double[] data, double[] start, double relative, double floor, double[]? deviations = null)
    {
        (_model, _data, _at, _relative, _floor, _deviations) = (model, data, start, relative, floor, deviations);
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
        _damped = new HouseholderQr(rows, size);
        var right = new double[rows];
        for (var i = 0; i < points; i++) right[i] = _roots[i] * (_data[i] - _values[i]);
        for (var k = 0; k < size; k++)
        {
            for (var i = 0; i < points; i++) _damped.Matrix[k * rows + i] = _roots[i] * _slopes[k * points + i];
            _damped.Matrix[k * rows + rows - size + k] = Math.Sqrt(damping) * _diagonal[k];
        }

        _damped.Factor();
        LeastPivot = _damped.LeastPivot;
        return Solved(right);
    }

    /// <summary>Bends the step just made along the curve of the model: half the second-order correction, from the change of the slopes along the step. Null where the correction is too long for the step to be trusted.</summary>
    public double[]? Bent(double[] step)
    {
        var (points, size) = (_data.Length, _at.Length);
        for (var k = 0; k < size; k++) _trial[k] = _at[k] + Probe * step[k];
        _model(_trial, _trialValues, _trialSlopes);
        var right = new double[Math.Max(points, size) + size];
        for (var i = 0; i < points; i++)
        {
            double change = 0;
            for (var k = 0; k < size; k++) change += _slopes[k * points + i] * step[k];
            right[i] = -_roots[i] * ((_trialValues[i] - _values[i]) / Probe - change) / Probe;
        }

        var bend = Solved(right);
        if (!(4 * Dot(bend, bend) <= LongestBend * LongestBend * Dot(step, step))) return null;
        for (var k = 0; k < size; k++) bend[k] += step[k];
        return bend;
    }

    /// <summary>Product in the scale of the slopes.</summary>
    private double Dot(double[] x, double[] y)
    {
        double sum = 0;
        for (var k = 0; k < x.Length; k++) sum += _diagonal[k] * x[k] * (_diagonal[k] * y[k]);
        return sum;
    }

    private double[] Solved(double[] right)
    {
        _damped!.Turn(right);
        var solution = new double[_at.Length];
        _damped.Solve(right, solution);
        return solution;
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

    /// <summary>Whether a trial that climbs may be taken: the step keeps the direction of the last one, as along the floor of a narrow curved valley, and the sum of squares at most doubles.</summary>
    public bool MayClimb(double[] step, double decrease)
    {
        if (_lastStep is null) return false;
        var cosine = Dot(step, _lastStep) / Math.Sqrt(Dot(step, step) * Dot(_lastStep, _lastStep));
        var risen = ChiSquare - decrease;
        return cosine > 0 && (1 - cosine) * risen <= ChiSquare && risen <= 2 * ChiSquare;
    }

    /// <summary>Moves to the trial.</summary>
    /// <param name="step">The step, before it was bent.</param>
    public void Accept(double[] step)
    {
        _lastStep = step;
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

        qr.Factor();
        qr.Turn(right);
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
            _roots[i] = _deviations is null ? 1 / Math.Sqrt(deviation * deviation + _floor * _floor) : 1 / _deviations[i];
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
