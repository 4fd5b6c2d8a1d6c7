namespace HemoRheo;

/// <summary>A rule that flow curves are screened by. Its limits come from the study.</summary>
public interface IScreeningRule
{
    /// <summary>What it can find, with cause, cure and source.</summary>
    Items<FindingKind> Kinds { get; }

    /// <summary>Judges the kept points of a curve. A fault at a point sets that point aside; any other finding is of the curve.</summary>
    /// <param name="curve">The curve.</param>
    /// <param name="study">The study, which declares the limits.</param>
    /// <param name="sample">The sample's row of the samples table; null where there is none.</param>
    IEnumerable<Finding> Judge(FlowCurve curve, Study study, SampleRecord? sample);
}
