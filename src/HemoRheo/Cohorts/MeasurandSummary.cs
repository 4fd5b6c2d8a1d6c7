namespace HemoRheo;

/// <summary>Two groups side by side for one measurand.</summary>
/// <param name="Measurand">The measurand.</param>
/// <param name="Law">Name of the law.</param>
/// <param name="Basis">The hematocrit it speaks of.</param>
/// <param name="First">First group, the controls.</param>
/// <param name="Second">Second group.</param>
/// <param name="Total">Difference as it is.</param>
/// <param name="Adjusted">Difference at equal hematocrit; null for values that are already standardised.</param>
public sealed record MeasurandSummary(Measurand Measurand, string Law, HematocritBasis Basis, GroupSummary First, GroupSummary Second, GroupDifference Total, GroupDifference? Adjusted);
