namespace HemoRheo;

/// <summary>Dates a change of the mean in a series of checks by maximum likelihood.</summary>
/// <remarks>
/// Mean before, change, and scatter are unknown: x = a + b u, u = 0 before the moment, then 1 (step) or the time since (drift).
/// The best moment has the smallest residual sum of squares. The interval takes moments by their likelihood, averaged over a, b and the scatter
/// (Suu^(-1/2) RSS^(-(n-2)/2), every moment alike beforehand), until they hold 95 %. Sources: Hinkley 1970, Biometrika 57:1-17; Smith 1975, Biometrika 62:407-416.
/// </remarks>
internal sealed class ChangeDating
{
    /// <summary>A month, days.</summary>
    internal const double Month = 30.4375;

    private const int MomentsPerGap = 8;
    private const double Level = 0.95;

    private readonly DateTimeOffset _origin;
    private readonly double[] _days;
    private readonly double[] _errors;
    private readonly double _squares;

    private ChangeDating(IReadOnlyList<ChartedCheck> checks)
    {
        _origin = checks[0].At;
        _days = [.. checks.Select(check => (check.At - _origin).TotalDays)];
        var mean = checks.Average(check => check.Error.X);
        _errors = [.. checks.Select(check => check.Error.X - mean)];
        _squares = _errors.Sum(error => error * error);
    }

    /// <summary>Dates the change.</summary>
    /// <param name="checks">Checks in order of time, at least four and not all alike.</param>
    /// <param name="signal">Number of the check, from 0 and above it, by which the change had begun.</param>
    internal static ChartChanges Of(IReadOnlyList<ChartedCheck> checks, int signal)
    {
        var dating = new ChangeDating(checks);
        return new(dating.As(ChangeShape.Step, signal), dating.As(ChangeShape.Drift, signal), checks.Count - 1 - signal);
    }

    private ChartChange As(ChangeShape shape, int signal)
    {
        var moments = Moments(shape, signal);
        var best = moments.MinBy(moment => moment.Residual);
        var top = moments.Max(moment => moment.LogWeight);
        var whole = moments.Sum(moment => moment.Width * Math.Exp(moment.LogWeight - top));
        var (held, earliest, latest) = (0.0, double.PositiveInfinity, double.NegativeInfinity);
        foreach (var moment in moments.OrderByDescending(moment => moment.LogWeight))
        {
            if (held >= Level * whole) break;
            held += moment.Width * Math.Exp(moment.LogWeight - top);
            (earliest, latest) = (Math.Min(earliest, moment.Day - moment.Width / 2), Math.Max(latest, moment.Day + moment.Width / 2));
        }

        var n = _days.Length;
        var perUnit = shape == ChangeShape.Step ? 1 : Month;
        var size = best.Slope * perUnit;
        var uncertainty = Math.Sqrt(best.Residual / (n - 3) / best.SquaresOfTime) * perUnit;
        return new(shape, At(best.Day), At(earliest), At(latest), size, uncertainty, -n / 2.0 * Math.Log(best.Residual));
    }

    /// <summary>Every moment looked at, with the sums over the checks after it carried backwards in time.</summary>
    private List<ChangeMoment> Moments(ChangeShape shape, int signal)
    {
        var moments = new List<ChangeMoment>();
        var (n, t, tt, x, xt) = (0, 0.0, 0.0, 0.0, 0.0);
        for (var first = _days.Length - 1; first >= 1; first--)
        {
            var (day, error) = (_days[first], _errors[first]);
            (n, t, tt, x, xt) = (n + 1, t + day, tt + day * day, x + error, xt + error * day);
            var gap = day - _days[first - 1];
            if (first > signal || gap <= 0) continue;
            if (shape == ChangeShape.Step)
            {
                moments.Add(Moment(day - gap / 2, gap, n, n, x));
                continue;
            }

            for (var i = 0; i < MomentsPerGap; i++)
            {
                var onset = _days[first - 1] + gap * (i + 0.5) / MomentsPerGap;
                moments.Add(Moment(onset, gap / MomentsPerGap, t - n * onset, tt - 2 * onset * t + n * onset * onset, xt - onset * x));
            }
        }

        return moments;
    }

    private ChangeMoment Moment(double day, double width, double sum, double sumOfSquares, double products)
    {
        var all = _days.Length;
        var suu = sumOfSquares - sum * sum / all;
        var residual = Math.Max(_squares - products * products / suu, 1e-15 * _squares);
        return new(day, width, suu, products / suu, residual, -0.5 * Math.Log(suu) - (all - 2) / 2.0 * Math.Log(residual));
    }

    private DateTimeOffset At(double days) => _origin.AddDays(days);
}
