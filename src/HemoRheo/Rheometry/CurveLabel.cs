namespace HemoRheo;

/// <summary>What a flow curve is of.</summary>
/// <param name="Sample">Pseudonym of the sample, name of the check, or a name of one's own.</param>
/// <param name="Loading">Number of the loading.</param>
/// <param name="Ramp">Which ramp.</param>
/// <param name="Recording">The recording it was made from; null for a curve made from numbers.</param>
public sealed record CurveLabel(string Sample, int Loading, Ramp Ramp, Recording? Recording)
{
    /// <summary>As a place for findings.</summary>
    public Where Where => (Recording?.Where ?? Where.Nowhere) with { Sample = Sample, Loading = Loading };
}
