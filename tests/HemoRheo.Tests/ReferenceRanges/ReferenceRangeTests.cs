namespace HemoRheo.Tests.ReferenceRanges;

/// <summary>Ranges from the controls of studies built by hand.</summary>
public sealed class ReferenceRangeTests
{
    [Fact]
    public void Twenty_controls_make_a_range_on_the_logarithm_with_percentiles_said()
    {
        var logs = BuiltCohort.Spread(20).ToArray();
        var range = Assert.Single(BuiltCohort.Controls(logs).Judged().Ranges);
        Assert.Equal(RobustLimits.Of(logs).Limits, range.Limits);
        Assert.Equal(BuiltCohort.At10, range.Measurand);
        Assert.Equal("Casson", range.Law);
        Assert.Equal(20, range.Used);
        Assert.Empty(range.Missing);
        Assert.Contains("2.5th and 97.5th percentile", range.Method, StringComparison.Ordinal);
        Assert.True(range.LowerLimit!.Value.Contains(range.Limits.Lower) && range.UpperLimit!.Value.Contains(range.Limits.Upper));
        Assert.Contains("1998", range.Source, StringComparison.Ordinal);
    }

    [Fact]
    public void Nineteen_controls_are_refused_with_a_reason_and_nothing_is_judged()
    {
        var result = BuiltCohort.Controls(BuiltCohort.Spread(19)).Judged();
        Assert.Empty(result.Ranges);
        var finding = Assert.Single(result.Findings, finding => finding.Kind == RangeFindings.TooFewControls);
        Assert.Equal((19, 20), (finding.Observed, finding.Limit));
        Assert.All(result.Samples.SelectMany(sample => sample.Values), value =>
        {
            Assert.Null(value.Verdict);
            Assert.Contains("needs 20 controls; 19 can be used", value.WhyNotJudged!, StringComparison.Ordinal);
        });
    }

    [Fact]
    public void With_too_few_controls_declared_limits_stand_in_with_their_source()
    {
        var declared = new DeclaredLimits(new(10), false, Viscosity.FromMillipascalSeconds(5), Viscosity.FromMillipascalSeconds(7), "an invented paper");
        var analyzed = BuiltCohort.Controls(BuiltCohort.Spread(19));
        var result = (analyzed with { Study = analyzed.Study with { Reference = new(true, [declared]) } }).Judged();
        var range = Assert.Single(result.Ranges);
        Assert.Equal("an invented paper", range.Source);
        Assert.Equal(0, range.Used);
        Assert.Equal(5, range.Measurand.ToShown(range.Limits.Lower), 1e-12);
        Assert.Null(range.LowerLimit);
        Assert.Contains(result.Findings, finding => finding.Kind == RangeFindings.TooFewControls && finding.Message.Contains("declared limits are used", StringComparison.Ordinal));
        Assert.All(result.Samples, sample => Assert.NotNull(sample.Values[0].Verdict));
    }

    [Fact]
    public void A_study_that_declares_limits_alone_never_looks_at_its_controls()
    {
        var declared = new DeclaredLimits(new(10), false, Viscosity.FromMillipascalSeconds(5), Viscosity.FromMillipascalSeconds(7), "an invented paper");
        var unused = declared with { Rate = new(3) };
        var analyzed = BuiltCohort.Controls(BuiltCohort.Spread(30));
        var result = (analyzed with { Study = analyzed.Study with { Reference = new(false, [declared, unused]) } }).Judged();
        Assert.Null(Assert.Single(result.Ranges).Law);
        Assert.Contains("3 1/s", Assert.Single(result.Findings).Message, StringComparison.Ordinal);
    }

    [Fact]
    public void Visits_of_one_person_are_one_control()
    {
        var logs = BuiltCohort.Spread(20).ToArray();
        var again = BuiltCohort.Sample("S-again", "c1", BuiltCohort.Value(logs[0] + 0.2));
        var analyzed = BuiltCohort.Controls(logs);
        var range = Assert.Single((analyzed with { Samples = analyzed.Samples.With([again]) }).Judged().Ranges);
        Assert.Equal(20, range.Used);
        logs[0] += 0.1;
        Assert.Equal(RobustLimits.Of(logs).Limits.Lower, range.Limits.Lower, 1e-12);
    }

    [Fact]
    public void Controls_left_out_are_counted_by_reason_and_people_of_other_groups_never_enter()
    {
        var misfit = new Finding(RangeFindings.ValueNotDecidable, "does not fit", Where.Nowhere);
        var analyzed = BuiltCohort.Controls(BuiltCohort.Spread(20))
            .With(BuiltCohort.Sample("S-a", "a", BuiltCohort.Value(-3) with { Decidable = false, Findings = [misfit] }), "c")
            .With(BuiltCohort.Sample("S-b", "b", BuiltCohort.Value(-3)) with { Status = InstrumentStatus.InDoubt }, "c")
            .With(BuiltCohort.Sample("S-d", "d", BuiltCohort.Value(-3)) with { Status = InstrumentStatus.Unknown }, "c")
            .With(BuiltCohort.Sample("S-e", "e"), "c")
            .With(BuiltCohort.Sample("S-p", "p1", BuiltCohort.Value(-3)), "p");
        analyzed = analyzed with { Readings = analyzed.Readings with { People = analyzed.Readings.People.With([BuiltCohort.Person("nobody", "c")]) } };
        var range = Assert.Single(analyzed.Judged().Ranges);
        Assert.Equal(20, range.Used);
        Assert.Equal(
            [new("instrument-not-in-order", 2), new("person-not-measured", 1), new("value-missing", 1), new CountedReason("value-not-decidable", 1)],
            range.Missing);
    }

    [Fact]
    public void What_the_controls_share_is_their_mean_source_by_source()
    {
        var analyzed = BuiltCohort.Controls(BuiltCohort.Spread(20));
        var later = analyzed.Samples.Select((sample, i) => i < 5 ? sample with { Values = [BuiltCohort.Value(sample.Values[0].Value.X, BuiltCohort.Calibration(-0.02, "R1/2"), BuiltCohort.Fit(0.02, sample.Sample))] } : sample);
        var range = Assert.Single((analyzed with { Samples = later.ToItems() }).Judged().Ranges);
        Assert.Equal(2, range.Shared.Count);
        Assert.Equal(-0.01 * 15 / 20, range.Shared.Single(part => part.Source.Of == "R1/1").Amount, 1e-15);
        Assert.Equal(-0.02 * 5 / 20, range.Shared.Single(part => part.Source.Of == "R1/2").Amount, 1e-15);
    }

    [Fact]
    public void A_measurand_that_only_another_law_has_gets_a_range_of_its_own_and_another_laws_viscosity_does_not()
    {
        var analyzed = BuiltCohort.Controls(BuiltCohort.Spread(24));
        var index = analyzed.Samples.Select((sample, i) => sample with
        {
            Values = sample.Values.With([new(new InventedIndex(), "Quemada", HematocritBasis.Native, new(Math.Sin(i), []), null, true, []), sample.Values[0] with { Law = "Quemada" }]),
        });
        var result = (analyzed with { Samples = index.ToItems() }).Judged();
        Assert.Equal([("viscosity at 10 1/s", "Casson"), ("invented index", "Quemada")], result.Ranges.Select(range => (range.Measurand.Name, range.Law!)));
        Assert.DoesNotContain("logarithm", result.Ranges[1].Method, StringComparison.Ordinal);
        Assert.Contains("decides by Casson", result.Samples[0].Values[2].WhyNotJudged!, StringComparison.Ordinal);
    }

    [Fact]
    public void Standardised_values_by_the_rule_that_does_not_decide_stand_beside_unjudged()
    {
        var analyzed = BuiltCohort.Controls(BuiltCohort.Spread(24));
        var both = analyzed.Samples.Select(sample => sample with
        {
            Values = sample.Values.With([sample.Values[0] with { Basis = HematocritBasis.StandardByPlasma }, sample.Values[0] with { Basis = HematocritBasis.StandardBySlope }]),
        });
        var result = (analyzed with { Samples = both.ToItems() }).Judged();
        Assert.Equal([HematocritBasis.Native, HematocritBasis.StandardByPlasma], result.Ranges.Select(range => range.Basis));
        Assert.Contains("standard hematocrit, plasma rule", result.Samples[0].Values[2].WhyNotJudged!, StringComparison.Ordinal);
    }

    [Fact]
    public void Controls_of_one_and_the_same_value_are_refused()
    {
        var result = BuiltCohort.Controls(Enumerable.Repeat(-5.0, 30)).Judged();
        Assert.Empty(result.Ranges);
        Assert.Contains(result.Findings, finding => finding.Kind == RangeFindings.ControlsWithoutSpread);
    }

    [Fact]
    public void Two_runs_give_the_same_bits()
    {
        var analyzed = BuiltCohort.Controls(BuiltCohort.Spread(25));
        Assert.Equal(analyzed.Judged(), analyzed.Judged());
    }
}
