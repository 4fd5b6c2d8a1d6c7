namespace HemoRheo;

/// <summary>One side of a profile, followed outward from the estimate until the rise of the sum of squares reaches its limit.</summary>
/// <param name="fit">Least squares with the quantity held.</param>
/// <param name="scale">Sum of squares and its unit, and the limit of the rise.</param>
/// <param name="start">Where it starts.</param>
/// <param name="direction">1 upward, -1 downward.</param>
/// <param name="longestStep">Longest step on the working scale.</param>
/// <param name="end">Working value beyond which it is not followed.</param>
internal sealed class ProfileSide(ConstrainedFit fit, ProfileScale scale, ConstrainedMinimum start, int direction, double longestStep, double end)
{
    private const int StepsToLimit = 6;
    private const int ShorteningLimit = 8;
    private const int PointLimit = 200;

    /// <summary>Where the root passes its limit in a jump, the outer end of the jump is taken.</summary>
    private const double Sharp = 1e-6;

    /// <summary>A root this far below the limit is too near the arithmetic's own to foretell a step from.</summary>
    private const double Flat = 0.02;
    private const int CrossingLimit = 60;

    private readonly List<ConstrainedMinimum> _points = [start];

    /// <summary>Points outward, the start first, the limit last where it is reached.</summary>
    public IReadOnlyList<ConstrainedMinimum> Points => _points;

    /// <summary>The working value at which the rise reaches its limit; null where it does not.</summary>
    public double? Limit { get; private set; }

    /// <summary>Follows the side.</summary>
    /// <param name="firstStep">First step on the working scale.</param>
    public void Follow(double firstStep)
    {
        var step = Math.Min(firstStep, longestStep);
        do
        {
            while (!Reached && StepOut(ref step))
            {
            }
        }
        while ((Improve() | Doubt()) && !Reached);
        if (Reached) Cross();
    }

    private bool Reached => scale.Root(_points[^1]) >= scale.Limit;

    private bool StepOut(ref double step)
    {
        var last = _points[^1];
        if (direction * (last.Value - end) >= 0 || _points.Count == PointLimit) return false;
        for (var attempt = 0; attempt < ShorteningLimit; attempt++)
        {
            if (fit.At(last.Value + direction * step, last.Scaled) is { } next)
            {
                _points.Add(next);
                step = Math.Clamp(Wanted(next), step / 2, Math.Min(2 * step, longestStep));
                return true;
            }

            step /= 4;
        }

        return false;
    }

    /// <summary>The step that would raise the root by a share of its limit.</summary>
    private double Wanted(ConstrainedMinimum point)
    {
        var wanted = scale.Limit / StepsToLimit / Math.Abs(scale.SlopeOfRoot(point));
        return scale.Root(point) > Flat * scale.Limit && double.IsFinite(wanted) ? wanted : double.PositiveInfinity;
    }

    /// <summary>Tries every point again from its outer neighbor; whether one was lower from there.</summary>
    private bool Improve()
    {
        var improved = false;
        for (var i = _points.Count - 2; i > 0; i--)
        {
            if (fit.At(_points[i].Value, _points[i + 1].Scaled) is not { } other || !scale.IsLower(other, _points[i])) continue;
            _points[i] = other;
            improved = true;
        }

        return improved;
    }

    /// <summary>Tries the end again from far starts, so that no other minimum is left out of the interval; whether one was lower.</summary>
    private bool Doubt()
    {
        if (!Reached || fit.Elsewhere(_points[^1]) is not { } other || !scale.IsLower(other, _points[^1])) return false;
        _points[^1] = other;
        return true;
    }

    /// <summary>The outermost crossing of the limit, by Newton steps of the root of the rise, kept between two points.</summary>
    private void Cross()
    {
        var inner = _points.FindLastIndex(point => scale.Root(point) < scale.Limit);
        var (low, high) = (_points[inner], _points[inner + 1]);
        var (here, guess) = (high, Between(low, high));
        for (var i = 0; i < CrossingLimit; i++)
        {
            var near = Math.Abs(guess - low.Value) < Math.Abs(guess - high.Value) ? low : high;
            if (fit.At(guess, near.Scaled) is not { } next)
            {
                guess = (guess + low.Value) / 2;
                continue;
            }

            here = next;
            if (scale.Root(here) < scale.Limit) low = here;
            else high = here;
            var newton = guess + direction * (scale.Limit - scale.Root(here)) / Math.Abs(scale.SlopeOfRoot(here));
            var smallest = 1e-13 * (1 + Math.Abs(guess));
            if (Math.Abs(newton - guess) <= smallest || Math.Abs(high.Value - low.Value) <= smallest) break;
            var inside = (newton - low.Value) * (newton - high.Value) < 0;
            guess = inside ? newton : i % 3 == 2 ? (low.Value + high.Value) / 2 : Between(low, high);
        }

        if (Math.Abs(scale.Root(here) - scale.Limit) > Sharp * scale.Limit) here = high;
        Limit = here.Value;
        _points.RemoveRange(inner + 1, _points.Count - inner - 1);
        _points.Add(here);
    }

    private double Between(ConstrainedMinimum low, ConstrainedMinimum high)
    {
        var (a, b) = (scale.Root(low), scale.Root(high));
        var share = (scale.Limit - a) / (b - a);
        return low.Value + Math.Clamp(double.IsFinite(share) ? share : 0.5, 0.01, 0.99) * (high.Value - low.Value);
    }
}
