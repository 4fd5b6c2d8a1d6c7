namespace HemoRheo.Tests.Decisions;

/// <summary>Guard bands and their risks against R (tests/ReferenceData/decisions).</summary>
public sealed class AcceptanceTests
{
    private static readonly Interval OneLimit = new(double.NegativeInfinity, 10);

    [Fact]
    public void A_diode_and_an_oil_are_wrongly_accepted_as_often_as_R_says()
    {
        // JCGM 106:2012, 7.3 and 7.4, without a guard band.
        var diode = Acceptance.Of(Exactly(-5.47, 0.05), new(double.NegativeInfinity, -5.40), GuardBand.None);
        Assert.True(diode.Accepted);
        Assert.Equal(1 - 0.919243340766227, diode.WrongAcceptance, 1e-12);
        Assert.Equal(0.5, diode.LargestWrongAcceptance, 1e-12);
        var oil = Acceptance.Of(Exactly(13.6, 1.8), new(12.5, 16.3), GuardBand.None);
        Assert.True(oil.Accepted);
        Assert.Equal((1 - 0.662629786495308, 0.662629786495308), (oil.WrongAcceptance, oil.WrongRejection), NearlyEqual);
    }

    [Theory]
    [InlineData(0, "0")]
    [InlineData(0.5, "0.5")]
    [InlineData(0.75, "0.75")]
    [InlineData(1, "1")]
    public void The_largest_wrong_acceptance_is_that_at_the_acceptance_limit(double r, string written)
    {
        var risk = ReferenceTable.Read("decisions", "jcgm-106.r.csv").Single(row => row["quantity"].EndsWith("r = " + written, StringComparison.Ordinal)).Number("value");
        var acceptance = Acceptance.Of(Exactly(5, 0.3), OneLimit, new(r));
        Assert.Equal(10 - 2 * r * 0.3, acceptance.Limits!.Value.Upper, 1e-12);
        Assert.Equal(risk, acceptance.LargestWrongAcceptance, 1e-12);
        Assert.Equal(1 - risk, acceptance.LargestWrongRejection, 1e-12);
    }

    [Fact]
    public void A_guard_band_for_a_level_is_the_multiple_of_u_that_R_says()
    {
        var multiple = ReferenceTable.Read("decisions", "jcgm-106.r.csv").Single(row => row["quantity"] == "multiple of u, risk 0.05").Number("value");
        Assert.Equal(multiple, GuardBand.ForLevel(0.95).Width(1), 1e-12);
        // Student's t at 0.95 with 5 degrees of freedom: 2.015048372669157 (R qt, scipy t.ppf).
        Assert.Equal(2.015048372669157, GuardBand.ForLevel(0.95, 5).Width(1), 1e-9);
    }

    [Fact]
    public void A_verdict_at_a_level_and_a_guard_band_for_that_level_agree_at_one_limit()
    {
        for (var x = 8.0; x <= 10.5; x += 0.007)
        {
            var value = Exactly(x, 0.3);
            Assert.Equal(Verdict.Of(value, OneLimit).Outcome == Outcome.Within, Acceptance.Of(value, OneLimit, GuardBand.ForLevel(0.95)).Accepted);
        }
    }

    [Theory]
    [InlineData(0.2, double.PositiveInfinity)]
    [InlineData(0.45, double.PositiveInfinity)]
    [InlineData(0.3, 4)]
    public void Limits_of_acceptance_at_a_level_are_those_of_the_verdict_between_two_limits(double u, double df)
    {
        var limits = new Interval(-1, 1);
        Value At(double x) => new(x, [new(new(SourceKind.Fit, ""), u, "e", df)]);
        for (var x = -1.2; x <= 1.2; x += 0.0123)
        {
            var acceptance = Acceptance.AtLevel(At(x), limits, 0.95);
            Assert.Equal(Verdict.Of(At(x), limits).Outcome == Outcome.Within, acceptance.Accepted);
            Assert.Equal(0.05, acceptance.LargestWrongAcceptance, 1e-9);
        }

        Assert.Null(Acceptance.AtLevel(At(0) with { Parts = [new(new(SourceKind.Fit, ""), 0.6)] }, limits, 0.95).Limits);
        // One limit: 1.64485362695147 u inside it (R qnorm).
        Assert.Equal(10 - 1.64485362695147 * 0.3, Acceptance.AtLevel(Exactly(5, 0.3), OneLimit, 0.95).Limits!.Value.Upper, 1e-12);
    }

    [Fact]
    public void Bands_that_meet_accept_nothing()
    {
        var acceptance = Acceptance.Of(Exactly(0, 1), new(-1, 1), new(1));
        Assert.False(acceptance.Accepted);
        Assert.Null(acceptance.Limits);
        Assert.Equal(0, acceptance.LargestWrongAcceptance);
        // Within one standard deviation of a normal distribution: 0.682689492137086 (R pnorm).
        Assert.Equal(0.682689492137086, acceptance.LargestWrongRejection, 1e-12);
    }

    [Theory]
    [InlineData(0, "0")]
    [InlineData(0.5, "0.04")]
    [InlineData(1, "0.08")]
    public void Global_risks_are_those_of_the_resistors(double r, string guard)
    {
        // JCGM 106:2012, 9.5: 1500 ohm +- 0.2, process 0.12, u 0.04; the guard bands 0, U/2 and U.
        var rows = ReferenceTable.Read("decisions", "metrology.r.csv").Where(row => row["example"].EndsWith("guard band " + guard, StringComparison.Ordinal)).ToDictionary(row => row["quantity"], row => row.Number("value"));
        var risk = GlobalRisk.Of(1500, 0.12, 0.04, new(1499.8, 1500.2), new(r));
        Assert.Equal(rows["global consumer's risk"], risk.Consumer, 1e-9);
        Assert.Equal(rows["global producer's risk"], risk.Producer, 1e-9);
        Assert.Equal(rows["conforming fraction"], risk.Conforming, 1e-9);
    }

    [Fact]
    public void A_normalized_error_is_what_R_says()
    {
        var expected = ReferenceTable.Read("decisions", "metrology.r.csv").Single(row => row["quantity"].StartsWith("E_n", StringComparison.Ordinal)).Number("value");
        Assert.Equal(expected, NormalizedError.Of(4.62, 0.20, 4.40, 0.08), 1e-12);
        var difference = new Value(4.62 - 4.40, [new(new(SourceKind.Fit, "a"), 0.10), new(new(SourceKind.Certificate, "b"), 0.04)]);
        Assert.Equal(expected, NormalizedError.Of(difference), 1e-9);
    }

    [Fact]
    public void The_tolerance_zone_of_a_certified_oil_is_that_of_the_worked_example()
    {
        var rows = ReferenceTable.Read("decisions", "metrology.r.csv").Where(row => row["example"].StartsWith("tolerance zone", StringComparison.Ordinal)).ToArray();
        var half = ToleranceZone.Half(0.19, 0.22, 2);
        Assert.Equal(rows[0].Number("value"), half, 1e-12);
        Assert.Equal(rows[1].Number("value"), 33.98 * (1 - half / 100), 1e-9);
        Assert.Equal(rows[2].Number("value"), 33.98 * (1 + half / 100), 1e-9);
    }

    [Fact]
    public void What_a_verdict_would_take_is_the_factor_at_which_it_decides()
    {
        // x = 0, limit 1, parts 0.5 and 0.6: undecided at 0.781; decided where u = 1/1.64485362695147, of which the certificate has 0.5.
        var value = new Value(0, [new(new(SourceKind.Certificate, "c"), 0.5), new(new(SourceKind.Fit, "f"), 0.6)]);
        var limits = new Interval(double.NegativeInfinity, 1);
        var expected = Math.Sqrt(1 / (1.64485362695147 * 1.64485362695147) - 0.25) / 0.6;
        Assert.Equal(expected, NeededPrecision.Factor(value, limits, 0.95, source => source.Kind == SourceKind.Fit)!.Value, 1e-9);
        Assert.Null(NeededPrecision.Factor(value with { X = 0.9 }, limits, 0.95, source => source.Kind == SourceKind.Fit));
        Assert.Equal(1, NeededPrecision.Factor(value with { X = -2 }, limits, 0.95, source => source.Kind == SourceKind.Fit));
    }

    [Fact]
    public void Populations_without_a_spread_and_levels_that_cannot_be_are_refused_in_words()
    {
        Assert.Contains("above zero", Assert.Throws<ArgumentOutOfRangeException>(() => GlobalRisk.Of(0, 0, 1, OneLimit, GuardBand.None)).Message, StringComparison.Ordinal);
        Assert.Contains("above zero", Assert.Throws<ArgumentOutOfRangeException>(() => GlobalRisk.Of(0, 1, 0, OneLimit, GuardBand.None)).Message, StringComparison.Ordinal);
        Assert.Contains("above 0.5 and below 1", Assert.Throws<ArgumentOutOfRangeException>(() => GuardBand.ForLevel(0.5)).Message, StringComparison.Ordinal);
    }

    private static Value Exactly(double x, double u) => new(x, [new(new(SourceKind.Fit, ""), u)]);

    private static bool NearlyEqual((double A, double B) one, (double A, double B) other) => Math.Abs(one.A - other.A) < 1e-12 && Math.Abs(one.B - other.B) < 1e-12;
}
