namespace HemoRheo.Tests.Fitting;

/// <summary>A user's law that fails while it is fitted ends that curve's fit with its message, and touches no neighbor.</summary>
public class UserLawFitTests
{
    private static readonly LawParameter Viscosity = new("viscosity", "η", "Pa.s", Start: 0.004);
    private static readonly LawParameter YieldStress = new("yield stress", "τ_y", "Pa", Start: 0.01);

    [Fact]
    public void A_law_that_throws_at_a_rate_of_one_curve_ends_that_fit_with_its_message()
    {
        FlowLaw law = FlowLaw.Custom("mine", default(Fragile), Viscosity);
        var (sound, broken) = (Simulated.Exact(FlowLaw.Newtonian, 0.0013), FlowCurve.Of([400, 20, 3], [0.52, 0.026, 0.004]));
        var fits = Fits.OfAll([sound, broken, sound], law, WeightedFits.Errors);
        Assert.Equal(sound.Fit(law, WeightedFits.Errors), fits[0]);
        Assert.Equal(fits[0], fits[2]);
        Assert.True(fits[0].Usable, fits[0].ToString());
        Assert.Equal(0.0013, fits[0].Parameters[0].Estimate, 1e-14);
        Failed(fits[1], "mine throws: no such fluid above 350 1/s.");
    }

    [Fact]
    public void A_law_that_is_no_number_at_a_rate_of_one_curve_ends_that_fit_alone()
    {
        FlowLaw law = FlowLaw.Custom("mine", (rate, p) => p[0] * rate + 0 * LaneDual.Log(350 - rate), Viscosity);
        var (sound, broken) = (Simulated.Exact(FlowLaw.Newtonian, 0.0013), FlowCurve.Of([400, 20, 3], [0.52, 0.026, 0.004]));
        var fits = Fits.OfAll([sound, broken], law, WeightedFits.Errors);
        Assert.Equal(sound.Fit(law, WeightedFits.Errors), fits[0]);
        Assert.True(fits[0].Usable, fits[0].ToString());
        Failed(fits[1], "mine gives a stress or a slope that is not finite");
    }

    /// <summary>Seen where it is tried, at 1 1/s, and no more at the rates of the curve.</summary>
    [Fact]
    public void A_law_that_ignores_a_parameter_at_the_rates_of_the_curve_is_not_identifiable()
    {
        var law = FlowLaw.Custom("mine", (rate, p) => p[0] * rate + p[1] * LaneDual.Exp(-5 * rate), Viscosity, YieldStress);
        var fit = FlowCurve.Of([300, 100, 30, 10], [0.4, 0.13, 0.04, 0.013]).Fit(law, WeightedFits.Errors);
        Assert.False(fit.Usable);
        Assert.Contains(fit.Findings, finding => finding.Code == "not-identifiable");
    }

    [Fact]
    public void A_struct_gives_the_bits_of_the_same_law_as_a_lambda()
    {
        var curve = Simulated.Noisy(RandomStream.Of(20261201, "struct", 1), FlowLaw.Bingham, 0.01, 0.0003, 0.01, 0.004);
        var (one, other) = (curve.Fit(FlowLaw.Custom("mine", default(Line), Viscosity, YieldStress)), curve.Fit(FlowLaw.Custom("mine", (rate, p) => p[0] * rate + p[1], Viscosity, YieldStress)));
        Assert.Equal(one.Scaled, other.Scaled);
        Assert.Equal(one.Covariance, other.Covariance);
    }

    private static void Failed(FittedLaw fit, string words)
    {
        Assert.False(fit.Usable);
        Assert.Equal(StopReason.BadData, fit.Convergence.Reason);
        var finding = Assert.Single(fit.Findings);
        Assert.Equal("law-failed", finding.Code);
        Assert.StartsWith(words, finding.Message, StringComparison.Ordinal);
        Assert.Empty(fit.Parameters);
    }

    private readonly struct Line : IFormula
    {
        public T Stress<T>(T rate, ReadOnlySpan<T> p) where T : struct, ILawNumber<T> => p[0] * rate + p[1];
    }

    /// <summary>A formula has no branches, but a user may find a way: a table that ends at 350 1/s.</summary>
    private readonly struct Fragile : IFormula
    {
        public T Stress<T>(T rate, ReadOnlySpan<T> p) where T : struct, ILawNumber<T>
        {
            if (rate is LaneDual { Value: var lanes } && Enumerable.Range(0, Lane.Count).Any(lane => lanes[lane] > 350)) throw new InvalidOperationException("no such fluid above 350 1/s");
            return p[0] * rate;
        }
    }

    /// <summary>A law with many minima, from a start beside the wrong one: the truth is found, or the fit says that another start decides.</summary>
    [Fact]
    public void A_law_with_many_minima_is_tried_from_near_and_far_starts()
    {
        var wave = FlowLaw.Custom(
            "wave",
            (rate, p) => p[0] * rate * (1 + p[1] * LaneDual.Sin(p[2] * LaneDual.Log(rate))),
            new LawParameter("viscosity", "η", "Pa.s", Start: 0.004),
            new LawParameter("size", "a", "1", -1, 1, 0.05),
            new LawParameter("frequency", "w", "1", 0, 20, 1.5));
        double[] rates = [300, 200, 130, 80, 50, 30, 20, 12, 8, 5, 3, 2, 1.2, 0.8, 0.5];
        var fit = FlowCurve.Of(rates, [.. rates.Select(rate => 0.004 * rate * (1 + 0.1 * Math.Sin(3.5 * Math.Log(rate))))]).Fit(wave);
        Assert.Equal(3.5, fit.Values["frequency"], 1e-6);
    }

    [Fact]
    public void A_parameter_with_an_upper_bound_alone_is_refused() => Assert.Contains(
        "an upper bound and no lower one",
        Assert.Throws<ArgumentException>(() => FlowLaw.Custom("mine", (rate, p) => p[0] * rate, new LawParameter("viscosity", "η", "Pa.s", double.NegativeInfinity, 0.003, 0.002))).Message,
        StringComparison.Ordinal);

    [Fact]
    public void The_name_of_a_built_in_law_is_refused() => Assert.Contains(
        "the name of a built-in law",
        Assert.Throws<ArgumentException>(() => FlowLaw.Custom("casson", (rate, p) => p[0] * rate, new LawParameter("viscosity", "η", "Pa.s", Start: 0.003))).Message,
        StringComparison.Ordinal);
}
