namespace HemoRheo;

/// <summary>The profile of a parameter or derived quantity: how far the curve's fit worsens when it is held at another value.</summary>
/// <param name="Interval">The interval where the rise stays within the limit.</param>
/// <param name="Limit">The limit of the rise, in standard deviations: the normal quantile where the error sizes are known, Student's t where the scale is estimated.</param>
/// <param name="Points">Points by ascending value, the estimate and the limits among them; none where the interval has no answer.</param>
public sealed record Profile(FitInterval Interval, double Limit, Items<ProfilePoint> Points)
{
    /// <inheritdoc/>
    public override string ToString() => $"{Interval}; {Points.Count} points";
}
