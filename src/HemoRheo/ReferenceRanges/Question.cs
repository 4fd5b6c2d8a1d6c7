namespace HemoRheo;

/// <summary>What a value answers: a measurand, by a law, at a hematocrit. A range of another question says nothing about it.</summary>
internal sealed record Question(Measurand Measurand, string Law, HematocritBasis Basis)
{
    internal string Name => $"{Law}/{Measurand.Name}/{Basis}";

    internal static Question Of(SampleValue value) => new(value.Measurand, value.Law, value.Basis);

    /// <summary>Whether the study's curves together contradict the law, so that no value may be decided on.</summary>
    internal bool IsContradicted(AnalyzedStudy analyzed) => analyzed.Pool.Laws.Any(evidence => evidence.Law == Law && !evidence.Fits);

    internal static HematocritBasis DecidingStandard(Study study) =>
        study.Standard.DecideBy == StandardisingRule.PlasmaPower ? HematocritBasis.StandardByPlasma : HematocritBasis.StandardBySlope;

    /// <summary>The questions a study decides on: by its deciding law and standardising rule, and measurands that only another law has.</summary>
    internal static Items<Question> DecidedIn(AnalyzedStudy analyzed)
    {
        var decideBy = analyzed.Study.Analysis.DecideBy;
        var standard = DecidingStandard(analyzed.Study);
        var all = analyzed.Samples.SelectMany(sample => sample.Values).Select(Of).Distinct().ToArray();
        var settled = all.Where(question => question.Law == decideBy).Select(question => question.Measurand).ToHashSet();
        return all
            .Where(question => question.Basis == HematocritBasis.Native || question.Basis == standard)
            .Where(question => question.Law == decideBy || !settled.Contains(question.Measurand))
            .ToItems();
    }
}
