namespace HemoRheo;

/// <summary>Measurands of one law whose loading scatter is pooled together.</summary>
/// <param name="Law">The law.</param>
/// <param name="Measurands">The measurands.</param>
/// <param name="Scatter">Their loading scatter.</param>
internal sealed record MeasurandSet(FlowLaw Law, Items<Measurand> Measurands, LoadingScatter Scatter)
{
    /// <summary>What sources and estimates of this set are named after.</summary>
    public string Key => Measurands.Count == 1 ? $"{Law.Name}, {Measurands[0].Name}" : Law.Name;

    /// <summary>The sets of a study: viscosities at the standard rates together, other numbers of a law each alone.</summary>
    public static IEnumerable<Items<Measurand>> Of(Study study, FlowLaw law)
    {
        yield return study.Analysis.StandardRates.Select(Measurand.Viscosity).ToItems();
        if (law == FlowLaw.Casson)
        {
            yield return [Measurand.CassonYieldStress];
            yield return [Measurand.CassonViscosity];
        }
    }
}
