namespace HemoRheo.Tests.Decisions;

/// <summary>Verdicts against the worked example and against R (tests/ReferenceData/decisions).</summary>
public sealed class VerdictTests
{
    public static TheoryData<string, string> Judged =>
        [.. ReferenceTable.Read("decisions", "expected-verdicts.csv").Select(row => (row["sample"], row["shear_rate_per_s"]))];

    [Theory]
    [MemberData(nameof(Judged))]
    public void Verdicts_of_the_worked_example_are_reproduced_from_its_values(string sample, string rate)
    {
        var expected = ReferenceTable.Read("decisions", "expected-verdicts.csv").Single(row => row["sample"] == sample && row["shear_rate_per_s"] == rate);
        var given = ReferenceTable.Read("decisions", "expected.csv").Single(row => row["law"] == "Quemada" && row["value"] == "standard" && row["sample"] == sample && row["shear_rate_per_s"] == rate);
        var value = new Value(given.Number("ln_value"), [new(new(SourceKind.Fit, sample), given.Number("u_ln"), "all", given.Number("degrees_of_freedom"))]);
        var verdict = Verdict.Of(value, new(Math.Log(expected.Number("lower_limit_mPa_s") / 1000), Math.Log(expected.Number("upper_limit_mPa_s") / 1000)));
        Assert.Equal(expected["verdict"], verdict.Outcome.ToString(), ignoreCase: true);
        Close(expected.Number("p_below"), verdict.Below);
        Close(expected.Number("p_within"), verdict.Within);
        Close(expected.Number("p_above"), verdict.Above);
    }

    [Fact]
    public void A_diode_within_its_one_limit_conforms_as_R_says() =>
        // JCGM 106:2012, 7.3: -5.47 V, u 0.05 V, upper limit -5.40 V.
        Assert.Equal(Jcgm("JCGM 106 7.3 Zener diode"), Verdict.Of(Exactly(-5.47, 0.05), new(double.NegativeInfinity, -5.40)).Within, 1e-12);

    [Fact]
    public void An_oil_between_two_limits_conforms_as_R_says() =>
        // JCGM 106:2012, 7.4: 13.6 mm2/s, u 1.8, limits 12.5 and 16.3.
        Assert.Equal(Jcgm("JCGM 106 7.4 motor oil SAE 40"), Verdict.Of(Exactly(13.6, 1.8), new(12.5, 16.3)).Within, 1e-12);

    [Theory]
    [InlineData(0, "0")]
    [InlineData(0.5, "0.5")]
    [InlineData(0.75, "0.75")]
    [InlineData(1, "1")]
    public void A_guard_band_leaves_the_risk_that_R_says(double r, string written)
    {
        // A value at the acceptance limit, r U = 2 r u inside the tolerance limit.
        var risk = ReferenceTable.Read("decisions", "jcgm-106.r.csv").Single(row => row["quantity"].EndsWith("r = " + written, StringComparison.Ordinal)).Number("value");
        Assert.Equal(risk, Verdict.Of(Exactly(10 - 2 * r * 0.3, 0.3), new(double.NegativeInfinity, 10)).Above, 1e-12);
    }

    [Fact]
    public void The_level_decides_at_the_multiple_of_u_that_R_says()
    {
        // One-sided 5 %: 1.64485362695147 u inside the limit is just decided, a little less is not.
        var multiple = ReferenceTable.Read("decisions", "jcgm-106.r.csv").Single(row => row["quantity"] == "multiple of u, risk 0.05").Number("value");
        Assert.Equal(Outcome.Within, Verdict.Of(Exactly(-multiple * 1.0001, 1), new(double.NegativeInfinity, 0)).Outcome);
        Assert.Equal(Outcome.Undecided, Verdict.Of(Exactly(-multiple * 0.9999, 1), new(double.NegativeInfinity, 0)).Outcome);
    }

    [Fact]
    public void Probabilities_add_up_and_none_is_negative()
    {
        for (var x = -3.0; x <= 3; x += 0.01)
        {
            var verdict = Verdict.Of(Exactly(x, 0.1), new(-1, 1));
            Assert.True(verdict is { Below: >= 0, Within: >= 0, Above: >= 0 });
            Assert.Equal(1, verdict.Below + verdict.Within + verdict.Above, 1e-12);
        }
    }

    [Fact]
    public void A_value_without_uncertainty_is_decided_by_where_it_lies()
    {
        Assert.Equal(Outcome.Below, Verdict.Of(Value.Exact(-2), new(-1, 1)).Outcome);
        Assert.Equal(Outcome.Within, Verdict.Of(Value.Exact(0), new(-1, 1)).Outcome);
        Assert.Equal(Outcome.Above, Verdict.Of(Value.Exact(2), new(-1, 1)).Outcome);
    }

    /// <summary>20,000 measurements of a truth at the limit itself: a wrong verdict comes at most at the rate 1 - level.</summary>
    [Theory]
    [InlineData(double.PositiveInfinity)]
    [InlineData(5)]
    public void A_truth_at_the_limit_is_wrongly_called_above_no_oftener_than_the_level_says(double df)
    {
        const int count = 20_000;
        var random = new MathNet.Numerics.Random.Xoshiro256StarStar(20261201, threadSafe: false);
        var wrong = 0;
        for (var k = 0; k < count; k++)
        {
            var u = double.IsFinite(df) ? Math.Sqrt(MathNet.Numerics.Distributions.ChiSquared.Sample(random, df) / df) : 1;
            var value = new Value(MathNet.Numerics.Distributions.Normal.Sample(random, 0, 1), [new(new(SourceKind.Fit, ""), u, "e", df)]);
            if (Verdict.Of(value, new(-100, 0)).Outcome == Outcome.Above) wrong++;
        }

        Assert.InRange(wrong / (double)count, 0.05 - 3 * Math.Sqrt(0.05 * 0.95 / count), 0.05 + 3 * Math.Sqrt(0.05 * 0.95 / count));
    }

    [Fact]
    public void Levels_limits_and_values_that_cannot_be_are_refused_in_words()
    {
        Assert.Contains("above 0.5 and below 1", Assert.Throws<ArgumentOutOfRangeException>(() => Verdict.Of(Value.Exact(0), new(-1, 1), 0.5)).Message, StringComparison.Ordinal);
        Assert.Contains("not in order", Assert.Throws<ArgumentException>(() => Verdict.Of(Value.Exact(0), new(1, -1))).Message, StringComparison.Ordinal);
        Assert.Contains("finite", Assert.Throws<ArgumentException>(() => Verdict.Of(Value.Exact(double.NaN), new(-1, 1))).Message, StringComparison.Ordinal);
    }

    private static Value Exactly(double x, double u) => new(x, [new(new(SourceKind.Fit, ""), u)]);

    private static double Jcgm(string example) => ReferenceTable.Read("decisions", "jcgm-106.r.csv").Single(row => row["example"] == example).Number("value");

    /// <summary>To 1e-5 relative; the inputs carry eight digits of u, which leaves less in the last places of a probability near nothing.</summary>
    private static void Close(double expected, double actual) => Assert.InRange(actual, expected * (1 - 1e-5) - 1e-15, expected * (1 + 1e-5) + 1e-15);
}
