using HemoRheo.Tests.Fitting;

namespace HemoRheo.Tests.FlowLaws;

/// <summary>A user's own law: it fits as a built-in one does, and a mistake in it is told in words.</summary>
public class CustomLawTests
{
    private static readonly LawParameter YieldStress = new("yield stress", "τ_y", "Pa", Start: 0.01);
    private static readonly LawParameter Viscosity = new("Casson viscosity", "η_C", "Pa.s", Start: 0.004);

    [Fact]
    public void A_law_written_by_hand_gives_the_numbers_of_the_built_in_one()
    {
        var mine = FlowLaw.Custom("my Casson", default(MyCasson), YieldStress, Viscosity);
        var lambda = FlowLaw.Custom("my lambda", (rate, p) => LaneDual.Square(LaneDual.Sqrt(p[0]) + LaneDual.Sqrt(p[1] * rate)), YieldStress, Viscosity);
        var curve = Simulated.Noisy(RandomStream.Of(20261201, "custom", 1), FlowLaw.Casson, 0.01, 0.0003, 0.005, 0.0034);
        var expected = curve.Fit(FlowLaw.Casson, WeightedFits.Errors);
        foreach (var fit in (FittedLaw<NamedValues>[])[curve.Fit(mine, WeightedFits.Errors), curve.Fit(lambda, WeightedFits.Errors)])
        {
            Assert.True(fit.Usable, fit.ToString());
            Assert.Equal(expected.Values.YieldStress.Pascals, fit.Values["yield stress"], 1e-11);
            Assert.Equal(expected.Values.CassonViscosity.PascalSeconds, fit.Values["Casson viscosity"], 1e-12);
            Assert.Equal(expected.Parameters[0].StandardError!.Value, fit.Parameters[0].StandardError!.Value, 1e-9);
        }
    }

    [Fact]
    public void A_wrong_parameter_name_is_answered_with_those_there_are()
    {
        var values = Simulated.Exact(FlowLaw.Casson, 0.005, 0.0034).Fit(FlowLaw.Custom("my Casson", default(MyCasson), YieldStress, Viscosity)).Values;
        Assert.Contains("no parameter named 'yield'; the parameters are yield stress, Casson viscosity", Assert.Throws<ArgumentException>(() => values["yield"]).Message, StringComparison.Ordinal);
    }

    [Fact]
    public void A_struct_may_hold_a_constant() =>
        Assert.Equal(0.004 * Math.Pow(50, 0.7), FlowLaw.Custom("fixed index", new FixedIndex(0.7), new LawParameter("consistency", "K", "Pa.s^n", Start: 0.01)).Stress(50.PerSecond(), 0.004).Pascals, 1e-14);

    [Fact]
    public void Too_few_parameters_are_told() => Refused("reads more parameters than the 1 that were given (yield stress)", () => FlowLaw.Custom("mine", default(MyCasson), YieldStress));

    [Fact]
    public void A_parameter_that_is_ignored_is_told() => Refused("ignores its parameter 'Casson viscosity', p[1]", () => FlowLaw.Custom("mine", (rate, p) => p[0] * rate, YieldStress, Viscosity));

    [Fact]
    public void A_formula_that_is_no_number_is_told() => Refused("all must be finite", () => FlowLaw.Custom("mine", (rate, p) => LaneDual.Log(p[0] - 1) * rate, YieldStress));

    [Fact]
    public void A_formula_that_throws_is_told() => Refused("throws at 1 1/s: no such fluid", () => FlowLaw.Custom("mine", (_, _) => throw new InvalidOperationException("no such fluid"), YieldStress));

    [Fact]
    public void A_parameter_without_a_start_or_outside_its_bounds_is_told()
    {
        Refused("has no start", () => FlowLaw.Custom("mine", default(MyCasson), YieldStress, Viscosity with { Start = null }));
        Refused("starts at -1, which is not between its bounds 0 and", () => FlowLaw.Custom("mine", default(MyCasson), YieldStress, Viscosity with { Start = -1 }));
        Refused("same name", () => FlowLaw.Custom("mine", default(MyCasson), YieldStress, YieldStress));
        Refused("has 0 parameters", () => FlowLaw.Custom("mine", default(MyCasson)));
    }

    /// <summary>Finite where it is tried, at 1, 10 and 100 1/s, and not at 300 1/s.</summary>
    [Fact]
    public void A_formula_that_is_no_number_at_a_rate_of_the_curve_gives_a_finding()
    {
        var fit = Simulated.Exact(FlowLaw.Newtonian, 0.004).Fit(FlowLaw.Custom("mine", (rate, p) => p[0] * rate + 0 * LaneDual.Log(200 - rate), Viscosity), WeightedFits.Errors);
        Assert.False(fit.Usable);
        Assert.Contains("not finite", Assert.Single(fit.Findings).Message, StringComparison.Ordinal);
    }

    private static void Refused(string words, Action make) => Assert.Contains(words, Assert.Throws<ArgumentException>(make).Message, StringComparison.Ordinal);

    private readonly struct MyCasson : IFormula
    {
        public T Stress<T>(T rate, ReadOnlySpan<T> p) where T : struct, ILawNumber<T> => T.Square(T.Sqrt(p[0]) + T.Sqrt(p[1] * rate));
    }

    private readonly struct FixedIndex(double index) : IFormula
    {
        public T Stress<T>(T rate, ReadOnlySpan<T> p) where T : struct, ILawNumber<T> => p[0] * T.Exp(index * T.Log(rate));
    }
}
