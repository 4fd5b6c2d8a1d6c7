namespace HemoRheo;

/// <summary>What hematocrit and plasma viscosity add to a sample's native values: relative viscosities and values at the standard hematocrit.</summary>
internal static class StandardValues
{
    /// <summary>Values made from the native ones.</summary>
    public static IEnumerable<SampleValue> Of(Study study, SampleRecord? record, IReadOnlyList<SampleValue> native, PlasmaValue? plasma, IReadOnlyList<HematocritSlope> slopes)
    {
        var counter = study.Counters.FirstOrDefault(known => known.Name == record?.Counter);
        foreach (var value in native.Where(value => value.Measurand is ViscosityAtRate))
        {
            if (plasma is not null)
            {
                yield return Relative(record!.Sample, value, plasma);
            }

            if (record?.Hematocrit is not { } hematocrit || counter is null) continue;
            if (plasma is not null) yield return ByPlasma(study, record.Sample, hematocrit, counter, value, plasma);
            var slope = slopes.FirstOrDefault(known => known.Law == value.Law && known.Measurand == value.Measurand);
            if (slope is { WhyNot: null }) yield return BySlope(study, record.Sample, hematocrit, counter, value, slope);
        }
    }

    private static SampleValue Relative(string sample, SampleValue native, PlasmaValue plasma)
    {
        var added = plasma.Findings(sample).ToArray();
        return new(
            Measurand.RelativeViscosity(((ViscosityAtRate)native.Measurand).Rate), native.Law, native.Basis, native.Value - plasma.Value,
            native.Interpolated - plasma.Value.X, native.Decidable && added.Length == 0, native.Findings.With(added));
    }

    private static SampleValue ByPlasma(Study study, string sample, Hematocrit hematocrit, Counter counter, SampleValue native, PlasmaValue plasma)
    {
        var range = StandardHematocritRule.PowerRuleRange;
        var k = study.Standard.Hematocrit.LiterPerLiter / hematocrit.LiterPerLiter;
        IEnumerable<Finding> outside = range.Contains(hematocrit.LiterPerLiter)
            ? []
            : [SampleFindings.OutsidePowerRule.At(new(Sample: sample), FormattableString.Invariant($"Hematocrit {hematocrit}; the rule is used from {range.Lower} to {range.Upper} L/L."), hematocrit.LiterPerLiter, hematocrit.LiterPerLiter < range.Lower ? range.Lower : range.Upper)];
        return Standardised(
            study, sample, native, HematocritBasis.StandardByPlasma, StandardisingRule.PlasmaPower, outside.Concat(plasma.Findings(sample)),
            StandardHematocritRule.ByPlasma(native.Value, plasma.Value, sample, hematocrit, study.Standard.Hematocrit, counter),
            native.Interpolated * k + (1 - k) * plasma.Value.X);
    }

    private static SampleValue BySlope(Study study, string sample, Hematocrit hematocrit, Counter counter, SampleValue native, HematocritSlope slope)
    {
        IEnumerable<Finding> outside = slope.Hematocrits is { } range && !range.Contains(hematocrit.LiterPerLiter)
            ? [SampleFindings.OutsideSlope.At(new(Sample: sample), FormattableString.Invariant($"Hematocrit {hematocrit}; the slope rests on {range.Lower:G3} to {range.Upper:G3} L/L."), hematocrit.LiterPerLiter, hematocrit.LiterPerLiter < range.Lower ? range.Lower : range.Upper)]
            : [];
        return Standardised(
            study, sample, native, HematocritBasis.StandardBySlope, StandardisingRule.StudySlope, outside,
            StandardHematocritRule.BySlope(native.Value, slope, sample, hematocrit, study.Standard.Hematocrit, counter),
            native.Interpolated + slope.Slope * (study.Standard.Hematocrit.LiterPerLiter - hematocrit.LiterPerLiter));
    }

    private static SampleValue Standardised(Study study, string sample, SampleValue native, HematocritBasis basis, StandardisingRule rule, IEnumerable<Finding> more, Value value, double? interpolated)
    {
        IEnumerable<Finding> beside = study.Standard.DecideBy == rule ? [] : [SampleFindings.ShownBeside.At(new(Sample: sample), "The study standardises by another rule.")];
        var added = more.Concat(beside).ToArray();
        return new(native.Measurand, native.Law, basis, value, interpolated, native.Decidable && added.Length == 0, native.Findings.With(added));
    }
}
