namespace HemoRheo;

/// <summary>What hematocrit and plasma viscosity add to a sample's native values: relative viscosities and values at the standard hematocrit.</summary>
internal static class StandardValues
{
    /// <summary>Values made from the native ones.</summary>
    public static IEnumerable<SampleValue> Of(Study study, SampleRecord? record, IReadOnlyList<SampleValue> native, Value? plasma, IReadOnlyList<HematocritSlope> slopes)
    {
        var counter = study.Counters.FirstOrDefault(known => known.Name == record?.Counter);
        foreach (var value in native.Where(value => value.Measurand is ViscosityAtRate))
        {
            if (plasma is not null)
            {
                yield return value with { Measurand = Measurand.RelativeViscosity(((ViscosityAtRate)value.Measurand).Rate), Value = value.Value - plasma, Interpolated = value.Interpolated - plasma.X };
            }

            if (record?.Hematocrit is not { } hematocrit || counter is null) continue;
            if (plasma is not null) yield return ByPlasma(study, record.Sample, hematocrit, counter, value, plasma);
            var slope = slopes.FirstOrDefault(known => known.Law == value.Law && known.Measurand == value.Measurand);
            if (slope is { WhyNot: null }) yield return BySlope(study, record.Sample, hematocrit, counter, value, slope);
        }
    }

    private static SampleValue ByPlasma(Study study, string sample, Hematocrit hematocrit, Counter counter, SampleValue native, Value plasma)
    {
        var range = StandardHematocritRule.PowerRuleRange;
        var k = study.Standard.Hematocrit.LiterPerLiter / hematocrit.LiterPerLiter;
        IEnumerable<Finding> outside = range.Contains(hematocrit.LiterPerLiter)
            ? []
            : [SampleFindings.OutsidePowerRule.At(new(Sample: sample), FormattableString.Invariant($"Hematocrit {hematocrit}; the rule is used from {range.Lower} to {range.Upper} L/L."), hematocrit.LiterPerLiter, hematocrit.LiterPerLiter < range.Lower ? range.Lower : range.Upper)];
        return Standardised(
            study, sample, native, HematocritBasis.StandardByPlasma, StandardisingRule.PlasmaPower, outside,
            StandardHematocritRule.ByPlasma(native.Value, plasma, sample, hematocrit, study.Standard.Hematocrit, counter),
            native.Interpolated * k + (1 - k) * plasma.X);
    }

    private static SampleValue BySlope(Study study, string sample, Hematocrit hematocrit, Counter counter, SampleValue native, HematocritSlope slope) => Standardised(
        study, sample, native, HematocritBasis.StandardBySlope, StandardisingRule.StudySlope, [],
        StandardHematocritRule.BySlope(native.Value, slope, sample, hematocrit, study.Standard.Hematocrit, counter),
        native.Interpolated + slope.Slope * (study.Standard.Hematocrit.LiterPerLiter - hematocrit.LiterPerLiter));

    private static SampleValue Standardised(Study study, string sample, SampleValue native, HematocritBasis basis, StandardisingRule rule, IEnumerable<Finding> more, Value value, double? interpolated)
    {
        IEnumerable<Finding> beside = study.Standard.DecideBy == rule ? [] : [SampleFindings.ShownBeside.At(new(Sample: sample), "The study standardises by another rule.")];
        var added = more.Concat(beside).ToArray();
        return new(native.Measurand, native.Law, basis, value, interpolated, native.Decidable && added.Length == 0, native.Findings.With(added));
    }
}
