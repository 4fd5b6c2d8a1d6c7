namespace HemoRheo;

/// <summary>Screens flow curves.</summary>
public static class FlowCurveScreening
{
    /// <summary>
    /// The curve judged by every rule of <see cref="ScreeningRules"/>: points with a fault are set aside with all their findings, never dropped;
    /// kept and set-aside points together are those the curve came with. Screening a screened curve changes nothing.
    /// </summary>
    /// <param name="curve">The curve.</param>
    /// <param name="study">The study, which declares the limits.</param>
    /// <param name="sample">The sample's row of the samples table; null where there is none.</param>
    public static FlowCurve Screened(this FlowCurve curve, Study study, SampleRecord? sample)
    {
        var judged = curve.WithFindings(ScreeningRules.OnReadings.SelectMany(rule => rule.Judge(curve, study, sample)));
        return judged.WithFindings(ScreeningRules.OnWhatIsLeft.SelectMany(rule => rule.Judge(judged, study, sample)));
    }
}
