namespace HemoRheo;

/// <summary>
/// Torque below the instrument's declared floor. Cause: low rates with thin liquids. Cure: a geometry with more surface. Without a declared floor: a note on the curve.
/// </summary>
internal sealed class TorqueBelowFloor : IScreeningRule
{
    public Items<FindingKind> Kinds { get; } = [RheometryFindings.TorqueBelowFloor, RheometryFindings.NoTorqueFloor, RheometryFindings.TorqueNotKnown];

    public IEnumerable<Finding> Judge(FlowCurve curve, Study study, SampleRecord? sample) => TorqueFloor.Judge(curve, study);
}
