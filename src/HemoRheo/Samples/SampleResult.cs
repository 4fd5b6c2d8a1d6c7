namespace HemoRheo;

/// <summary>Everything of one blood sample.</summary>
/// <param name="Sample">Pseudonym of the sample.</param>
/// <param name="Record">Its row of the samples table; null where it has none.</param>
/// <param name="Loadings">Its loadings.</param>
/// <param name="Values">Its values: every law, measurand and basis that could be had.</param>
/// <param name="Status">The worst instrument status among its loadings.</param>
/// <param name="Findings">All findings about it.</param>
/// <param name="PlasmaStatus">Status of the instrument of the study that measured its plasma, then; null where another device did, or none.</param>
public sealed record SampleResult(string Sample, SampleRecord? Record, Items<LoadingResult> Loadings, Items<SampleValue> Values, InstrumentStatus Status, Items<Finding> Findings, InstrumentStatus? PlasmaStatus = null)
{
    /// <summary>The value of a law, measurand and basis; null where there is none.</summary>
    public SampleValue? Find(string law, Measurand measurand, HematocritBasis basis) =>
        Values.FirstOrDefault(value => value.Law == law && value.Basis == basis && value.Measurand == measurand);

    /// <summary>The worst status among the instruments that a value of this sample comes from: that of its loadings, and that of its plasma where plasma enters.</summary>
    /// <param name="value">The value.</param>
    public InstrumentStatus StatusOf(SampleValue value) =>
        PlasmaStatus > Status && (value.Basis == HematocritBasis.StandardByPlasma || value.Measurand is RelativeViscosityAtRate) ? PlasmaStatus.Value : Status;

    /// <inheritdoc/>
    public override string ToString() => $"sample {Sample}: {Loadings.Count} loadings, {Values.Count} values, instrument {Status.Words()}, {Findings.Count} findings";
}
