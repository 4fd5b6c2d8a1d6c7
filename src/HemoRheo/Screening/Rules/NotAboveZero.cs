namespace HemoRheo;

/// <summary>
/// Shear rate or stress that is zero, negative or not finite. Cause: the instrument stood still, or its torque zero is larger than the torque. Cure: measure the torque zero.
/// </summary>
internal sealed class NotAboveZero : IScreeningRule
{
    public Items<FindingKind> Kinds { get; } = [RheometryFindings.NotPositive];

    public IEnumerable<Finding> Judge(FlowCurve curve, Study study, SampleRecord? sample) =>
        curve.Points.Select(curve.NotPositive).OfType<Finding>();
}
