namespace HemoRheo.Tests.ReferenceRanges;

public sealed class JudgedValueTests
{
    private static readonly Interval Limits = new(-5.2, -5.0);

    private static ReferenceRange Range(params Contribution[] shared) => new(
        BuiltCohort.At10, "Casson", HematocritBasis.Native, Limits, new(-5.22, -5.18), new(-5.02, -4.98), "invented", 30, [], shared.ToItems(), "invented");

    [Fact]
    public void A_value_at_the_other_standard_is_told_the_rule_that_decides_in_plain_words()
    {
        var analyzed = BuiltCohort.Controls(BuiltCohort.Spread(20));
        var other = analyzed.Samples.Select(sample => sample with { Values = sample.Values.With([sample.Values[0] with { Basis = HematocritBasis.StandardBySlope }]) });
        var judged = (analyzed with { Samples = other.ToItems() }).Judged().Samples[0].Values[^1];
        Assert.Equal("The study decides on values at standard hematocrit, plasma rule; this one stands beside it.", judged.WhyNotJudged);
    }

    [Fact]
    public void What_value_and_limits_share_is_taken_out_first()
    {
        // Calibration 0.05 of both, 0.01 of its own: 0.03 above the limit is three standard uncertainties, not 0.59.
        var value = BuiltCohort.Value(-4.97, BuiltCohort.Calibration(-0.05), BuiltCohort.Fit(0.01, "S-1"));
        var shared = value.JudgedBy(Range(BuiltCohort.Calibration(-0.05))).Verdict!;
        var alone = value.JudgedBy(Range()).Verdict!;
        Assert.Equal(Outcome.Above, shared.Outcome);
        Assert.Equal(0.9986501019683699, shared.Above, 1e-9); // R: pnorm(3)
        Assert.Equal(Outcome.Undecided, alone.Outcome);
    }

    [Fact]
    public void What_only_the_limits_carry_of_another_period_stays_with_the_opposite_sign()
    {
        var value = BuiltCohort.Value(-4.97, BuiltCohort.Calibration(-0.03, "R1/2"));
        var verdict = value.JudgedBy(Range(BuiltCohort.Calibration(0.04))).Verdict!;
        var own = new Value(-4.97, [BuiltCohort.Calibration(-0.03, "R1/2"), BuiltCohort.Calibration(-0.04)]);
        Assert.Equal(0.05, own.StandardUncertainty, 1e-15);
        Assert.Equal(Verdict.Of(own, Limits), verdict);
    }

    [Fact]
    public void Individual_parts_are_never_taken_out()
    {
        var value = BuiltCohort.Value(-4.97, BuiltCohort.Fit(0.05, "S-1"));
        Assert.Equal(Verdict.Of(value.Value, Limits), value.JudgedBy(Range()).Verdict);
    }

    [Fact]
    public void A_range_of_another_measurand_law_or_basis_is_refused_in_words()
    {
        var value = BuiltCohort.Value(-5.1);
        foreach (var (range, word) in new[]
        {
            (Range() with { Measurand = new ViscosityAtRate(new(100)) }, "viscosity at 100 1/s"),
            (Range() with { Law = "Quemada" }, "Quemada"),
            (Range() with { Basis = HematocritBasis.StandardByPlasma }, "standard hematocrit, plasma rule"),
        })
        {
            var judged = value.JudgedBy(range);
            Assert.Null(judged.Verdict);
            Assert.Null(judged.Range);
            Assert.Contains(word, judged.WhyNotJudged!, StringComparison.Ordinal);
        }
    }

    [Fact]
    public void Declared_limits_take_values_of_any_law() => Assert.Equal(Outcome.Within, BuiltCohort.Value(-5.1).JudgedBy(Range() with { Law = null }).Verdict!.Outcome);

    [Fact]
    public void A_value_that_may_not_be_decided_on_keeps_its_worst_finding_as_the_reason()
    {
        var value = BuiltCohort.Value(-5.1) with { Decidable = false, Findings = [new(RangeFindings.ValueMissing, "a note", Where.Nowhere), new(RangeFindings.TooFewControls, "extrapolated", Where.Nowhere)] };
        var judged = value.JudgedBy(Range());
        Assert.Null(judged.Verdict);
        Assert.Equal("extrapolated", judged.WhyNotJudged);
    }

    [Fact]
    public void A_verdict_says_whether_it_hangs_on_the_limits_own_intervals()
    {
        // The upper limit's interval is -5.02 to -4.98; u 0.005.
        Assert.False(BuiltCohort.Value(-5.10, BuiltCohort.Fit(0.005, "S-1")).JudgedBy(Range()).ChangesWithLimits);
        Assert.True(BuiltCohort.Value(-4.985, BuiltCohort.Fit(0.005, "S-1")).JudgedBy(Range()).ChangesWithLimits);
        Assert.False(BuiltCohort.Value(-4.95, BuiltCohort.Fit(0.005, "S-1")).JudgedBy(Range()).ChangesWithLimits);
        Assert.False(BuiltCohort.Value(-4.985, BuiltCohort.Fit(0.005, "S-1")).JudgedBy(Range() with { LowerLimit = null, UpperLimit = null }).ChangesWithLimits);
    }

    [Fact]
    public void A_sample_of_an_instrument_in_doubt_is_judged_but_marked()
    {
        var analyzed = BuiltCohort.Controls(BuiltCohort.Spread(20)).With(BuiltCohort.Sample("S-p", "p1", BuiltCohort.Value(-4)) with { Status = InstrumentStatus.Failed });
        var judged = analyzed.Judged()["S-p"].Values[0];
        Assert.True(judged.Marked);
        Assert.Equal(Outcome.Above, judged.Verdict!.Outcome);
    }

    [Fact]
    public void The_studys_level_decides()
    {
        var analyzed = BuiltCohort.Controls(BuiltCohort.Spread(20));
        var strict = analyzed with { Study = analyzed.Study with { Analysis = analyzed.Study.Analysis with { Level = 0.999 } } };
        Assert.All(strict.Judged().Samples, sample => Assert.Equal(0.999, sample.Values[0].Verdict!.Level));
    }

    [Fact]
    public void Findings_of_files_pool_samples_and_ranges_are_gathered_once_each()
    {
        Finding Named(string message) => new(RangeFindings.ValueMissing, message, Where.Nowhere);
        var analyzed = BuiltCohort.Controls(BuiltCohort.Spread(19));
        analyzed = analyzed with
        {
            Readings = analyzed.Readings with { Findings = [Named("files")] },
            Pool = analyzed.Pool with { Findings = [Named("pool")], Scatter = [new("Casson", [], [], 3, [Named("scatter"), Named("pool")])] },
            Samples = analyzed.Samples.Select((sample, i) => i == 0 ? sample with { Findings = [Named("sample")] } : sample).ToItems(),
        };
        Assert.Equal(["files", "pool", "scatter", "sample"], analyzed.Judged().Findings.SkipLast(1).Select(finding => finding.Message));
        Assert.Equal(RangeFindings.TooFewControls, analyzed.Judged().Findings[^1].Kind);
    }
}
