namespace HemoRheo.Tests.Fitting;

/// <summary>Flow-behavior classes are claimed on evidence: falsely in at most 5 % of curves, and not at all where the readings are silent.</summary>
public class FlowBehaviorTests
{
    private const int Curves = 120;

    /// <summary>At most 5 % plus three standard errors of 120 curves: 13 of 120.</summary>
    private const int MostFalse = 13;

    private static readonly double[] Low = [300, 200, 100, 50, 20, 10, 5, 2, 1, 0.5, 0.2, 0.1];

    [Theory]
    [InlineData("Newtonian", 0.005)]
    [InlineData("Newtonian", 0.0013)]
    public void A_Newtonian_liquid_is_seldom_said_to_thin_or_thicken(string law, double viscosity)
    {
        var found = Found(law, Simulated.Rates, viscosity);
        Assert.InRange(found.Count(it => it.Class is FlowClass.ShearThinning or FlowClass.ShearThickening), 0, MostFalse);
        Assert.DoesNotContain(found, it => it.YieldStress == YieldStressAnswer.Present);
    }

    [Fact]
    public void A_Newtonian_oil_is_shown_to_be_one_by_dense_precise_readings()
    {
        double[] rates = [.. Enumerable.Range(0, 40).Select(i => Math.Pow(10, 0.5 + i / 20.0))];
        Assert.InRange(Found("Newtonian", rates, 0.005).Count(it => it is { Class: FlowClass.Newtonian, YieldStress: YieldStressAnswer.NoSign }), 100, Curves);
    }

    /// <summary>5 % a decade is a slope of 0.9788: a liquid just there is called Newtonian in at most 5 %.</summary>
    [Fact]
    public void A_liquid_at_the_margin_is_seldom_called_Newtonian() =>
        Assert.InRange(Found("Power law", Simulated.Rates, 0.005, 1 - Math.Log10(1.05)).Count(it => it.Class == FlowClass.Newtonian), 0, MostFalse);

    [Theory]
    [InlineData("Power law", 0.005, 0.95)]
    [InlineData("Casson", 0.0002, 0.003)]
    [InlineData("Casson", 0.005, 0.0033)]
    public void A_thinning_liquid_thins_and_its_yield_stress_is_not_decided_from_a_distance(string law, params double[] numbers)
    {
        var found = Found(law, Simulated.Rates, numbers);
        Assert.All(found, it => Assert.Equal(FlowClass.ShearThinning, it.Class));
        Assert.InRange(found.Count(it => it.YieldStress != YieldStressAnswer.Undecided), 0, MostFalse);
    }

    [Fact]
    public void A_thickening_liquid_thickens() =>
        Assert.All(Found("Power law", Simulated.Rates, 0.004, 1.03), it => Assert.Equal(FlowClass.ShearThickening, it.Class));

    [Theory]
    [InlineData("Casson", 0.005, 0.0033)]
    [InlineData("Herschel-Bulkley", 0.0175, 0.00897, 0.8601)]
    public void A_yield_stress_is_found_where_the_low_rates_reach_near_it(string law, params double[] numbers) =>
        Assert.InRange(Found(law, Low, numbers).Count(it => it.YieldStress == YieldStressAnswer.Present), 100, Curves);

    /// <summary>Blood whose viscosity levels off at low rates has no yield stress; the third levels off at a tenth of the lowest rate.</summary>
    [Theory]
    [InlineData("Quemada", 0.003, 2.0, 0.2)]
    [InlineData("Carreau", 0.056, 0.00345, 3.313, 0.3568)]
    [InlineData("Quemada", 0.0033, 1.5, 0.0816)]
    [InlineData("Power law", 0.02, 0.6)]
    public void A_liquid_without_a_yield_stress_is_seldom_given_one(string law, params double[] numbers) =>
        Assert.InRange(Found(law, Low, numbers).Count(it => it.YieldStress == YieldStressAnswer.Present), 0, MostFalse);

    [Fact]
    public void A_liquid_that_thins_and_then_thickens_is_undecided_and_says_why()
    {
        var curve = FlowCurve.Of(Simulated.Rates, [.. Simulated.Rates.Select(rate => 0.004 * rate * Math.Exp(0.05 * Math.Pow(Math.Log(rate / 25), 2)))]);
        var found = curve.FlowBehavior(WeightedFits.Errors);
        Assert.Equal(FlowClass.Undecided, found.Class);
        Assert.True(found.SlopeAtLowRates!.Value.Upper < 1 && found.SlopeAtHighRates!.Value.Lower > 1, found.ToString());
    }

    [Fact]
    public void Too_few_readings_are_undecided_and_say_so()
    {
        var found = FlowCurve.Of([100, 10], [0.4, 0.05]).FlowBehavior();
        Assert.Equal((FlowClass.Undecided, YieldStressAnswer.Undecided), (found.Class, found.YieldStress));
        Assert.Equal("undecided, yield stress not decided by these rates", found.Verdict);
        Assert.Contains("Too few readings", found.Evidence[0], StringComparison.Ordinal);
    }

    [Fact]
    public void Readings_that_cannot_be_fitted_are_undecided_and_never_an_exception()
    {
        double[] poison = [double.NaN, double.PositiveInfinity, 0, -1, 1e300];
        foreach (var bad in poison)
        {
            var found = FlowCurve.Of(Simulated.Rates, [.. Simulated.Rates.Select((rate, i) => i == 3 ? bad : 0.004 * rate)]).FlowBehavior();
            Assert.DoesNotContain("NaN", found.ToString(), StringComparison.Ordinal);
        }
    }

    [Fact]
    public void Misuse_is_told_in_words()
    {
        var curve = Simulated.Exact(FlowLaw.Casson, 0.005, 0.0033);
        Assert.Contains("above zero", Assert.Throws<ArgumentOutOfRangeException>(() => curve.FlowBehavior(newtonianWithin: 0)).Message, StringComparison.Ordinal);
        Assert.Contains("between 0.5 and 1", Assert.Throws<ArgumentOutOfRangeException>(() => curve.FlowBehavior(level: 95)).Message, StringComparison.Ordinal);
    }

    private static FlowBehavior[] Found(string name, double[] rates, params double[] numbers)
    {
        var law = FlowLaw.Named(name);
        return [.. Enumerable.Range(1, Curves).Select(i =>
        {
            var stream = RandomStream.Of(20261201, $"behavior {name}", i);
            return FlowCurve.Of(rates, [.. rates.Select(rate => law.Stress(new(rate), numbers).Pascals * (1 + 0.01 * stream.Normal()) + 0.0003 * stream.Normal())]).FlowBehavior(WeightedFits.Errors);
        })];
    }

    /// <summary>Three quarters of the lowest stress is yield stress, of a law that none of those compared is.</summary>
    [Fact]
    public void A_stress_that_hardly_falls_at_the_lowest_rates_leaves_the_yield_stress_open()
    {
        double[] rates = [100, 30, 10, 3, 1, 0.3, 0.1, 0.03, 0.01];
        var curve = FlowCurve.Of(rates, [.. rates.Select(rate => 0.005 + 0.003 * rate + 0.01 * Math.Pow(rate, 0.4))]);
        Assert.NotEqual(YieldStressAnswer.NoSign, curve.FlowBehavior(ErrorModel.Known(0.01, ShearStress.FromMillipascals(0.1))).YieldStress);
    }
}
