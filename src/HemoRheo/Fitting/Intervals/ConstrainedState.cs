namespace HemoRheo;

/// <summary>Parameters at which a function has its held value, with the sum of squares there. One parameter, the one that moves the function most, gives way so that the others are free.</summary>
internal sealed class ConstrainedState
{
    private const int NewtonLimit = 40;
    private const double LongestStep = 3;

    private readonly HeldWeights _held;
    private readonly FitFunction _function;
    private readonly double[] _residuals;
    private readonly double[] _slopes;
    private readonly double[] _gradient;

    private ConstrainedState(HeldWeights held, FitFunction function, double[] scaled)
    {
        (_held, _function, Scaled) = (held, function, scaled);
        (_residuals, _slopes, _gradient) = (new double[held.Points], new double[held.Points * scaled.Length], new double[scaled.Length]);
    }

    public double[] Scaled { get; }

    /// <summary>Sum of squares.</summary>
    public double Sum { get; private set; }

    /// <summary>The parameter that gives way.</summary>
    public int GivesWay { get; private set; }

    /// <summary>Change of the sum a change of the held value, at the minimum.</summary>
    public double SlopeOfSum => -2 * Along(_residuals, Column(GivesWay)) / _gradient[GivesWay];

    public ReadOnlySpan<double> Residuals => _residuals;

    /// <summary>The state near some parameters at which the function has a value; null where none is found or the law is not finite.</summary>
    public static ConstrainedState? Near(HeldWeights held, FitFunction function, double value, ReadOnlySpan<double> near)
    {
        var state = new ConstrainedState(held, function, near.ToArray());
        if (!state.Reach(value)) return null;
        state.Sum = held.At(state.Scaled, state._residuals, state._slopes);
        return double.IsFinite(state.Sum) ? state : null;
    }

    /// <summary>The state after a step of the free parameters.</summary>
    public ConstrainedState? Moved(double value, ReadOnlySpan<double> step)
    {
        var near = (double[])Scaled.Clone();
        for (var k = 0; k < near.Length; k++) near[k] += step[k];
        return Near(_held, _function, value, near);
    }

    /// <summary>Slopes over standard deviations when a parameter moves and the one that gives way keeps the function at its value.</summary>
    public void ReducedColumn(int k, Span<double> column)
    {
        var own = Column(k);
        var other = Column(GivesWay);
        var share = _gradient[k] / _gradient[GivesWay];
        for (var i = 0; i < column.Length; i++) column[i] = own[i] - share * other[i];
    }

    private bool Reach(double value)
    {
        if (_function.Parameter is { } parameter)
        {
            (GivesWay, Scaled[parameter]) = (parameter, value);
            _gradient[parameter] = 1;
            return true;
        }

        for (var i = 0; i < NewtonLimit; i++)
        {
            var miss = value - _function.At(Scaled, _gradient);
            GivesWay = Steepest();
            if (!double.IsFinite(miss) || _gradient[GivesWay] == 0) return false;
            if (Math.Abs(miss) <= 1e-14 * (1 + Math.Abs(value))) return true;
            var longest = LongestStep * Math.Max(1, Math.Abs(Scaled[GivesWay]));
            Scaled[GivesWay] += Math.Clamp(miss / _gradient[GivesWay], -longest, longest);
        }

        return false;
    }

    private int Steepest()
    {
        var best = 0;
        for (var k = 0; k < Scaled.Length; k++)
        {
            if (!double.IsFinite(_gradient[k]) || double.IsInfinity(Scaled[k])) _gradient[k] = 0;
            if (Math.Abs(_gradient[k]) > Math.Abs(_gradient[best])) best = k;
        }

        return best;
    }

    private ReadOnlySpan<double> Column(int k) => _slopes.AsSpan(k * _residuals.Length, _residuals.Length);

    private static double Along(ReadOnlySpan<double> a, ReadOnlySpan<double> b)
    {
        double sum = 0;
        for (var i = 0; i < a.Length; i++) sum += a[i] * b[i];
        return sum;
    }
}
