namespace HemoRheo.Tests.Fitting;

/// <summary>An interval says what the curve says: two limits, one, or none, in words.</summary>
public class IntervalTests
{
    private const double Normal95 = 1.959963984540054;

    private static readonly FittedLaw Blood = Noisy("blood", FlowLaw.Casson, 0.005, 0.0033).Fit((FlowLaw)FlowLaw.Casson, WeightedFits.Errors);

    private static readonly FlowCurve Plasma = Noisy("plasma", FlowLaw.Newtonian, 0.0013);

    [Fact]
    public void A_closed_interval_shows_estimate_limits_unit_level_and_method() =>
        Assert.Matches(@"^yield stress [45]\.\d+, 4\.\d+ to 5\.\d+ mPa \(95 %, profile likelihood\)\. Right only if the form of Casson is: the lowest stress read is 2\.\d times the upper limit$", Blood.Interval("yield stress").ToString());

    [Fact]
    public void A_yield_stress_of_plasma_is_at_most_something_and_zero_is_not_excluded()
    {
        var interval = Plasma.Fit((FlowLaw)FlowLaw.Casson, WeightedFits.Errors).Interval("yield stress");
        Assert.Equal(IntervalKind.AtMost, interval.Kind);
        Assert.InRange(interval.Upper!.Value, 1e-6, 1e-4);
        Assert.True(interval.Allows(0));
        Assert.Matches(@"^yield stress at most 0\.0\d+ mPa \(95 %, profile likelihood\); these shear rates do not exclude zero$", interval.ToString());
    }

    [Fact]
    public void A_ratio_and_a_critical_rate_of_plasma_are_not_identifiable()
    {
        var fit = Plasma.Fit((FlowLaw)FlowLaw.Quemada, WeightedFits.Errors);
        Assert.Equal("critical rate: not identifiable with these shear rates (95 %, profile likelihood)", fit.Interval("critical rate").ToString());
        Assert.NotEqual(IntervalKind.Closed, fit.Interval("ratio").Kind);
    }

    /// <summary>A fit without a unique solution still knows the viscosities that the curve shows.</summary>
    [Fact]
    public void Viscosities_of_a_fit_without_a_unique_solution_have_limits_and_its_parameters_have_none()
    {
        var fit = Simulated.Exact(FlowLaw.Newtonian, 0.0013).Fit((FlowLaw)FlowLaw.Quemada, WeightedFits.Errors);
        var (quemada, newtonian) = (fit.Interval(Measurand.Viscosity(100.PerSecond())), Simulated.Exact(FlowLaw.Newtonian, 0.0013).Fit((FlowLaw)FlowLaw.Newtonian, WeightedFits.Errors).Interval("viscosity"));
        Assert.Equal(IntervalKind.Closed, quemada.Kind);
        Assert.True(quemada.Allows(0.0013) && quemada.Lower <= newtonian.Lower && quemada.Upper >= newtonian.Upper && quemada.Upper < 1.05 * newtonian.Upper, quemada.ToString());
        Assert.Equal(IntervalKind.NotIdentifiable, fit.Interval("critical rate").Kind);
    }

    [Fact]
    public void Wald_gives_no_answer_at_a_bound_and_near_it()
    {
        var held = Simulated.Exact(FlowLaw.Newtonian, 0.0013).Fit((FlowLaw)FlowLaw.Casson, WeightedFits.Errors).Interval("yield stress", 0.95, IntervalMethod.Wald);
        Assert.Equal(IntervalKind.NoAnswer, held.Kind);
        Assert.Equal("yield stress: no answer (95 %, Wald): it is held at its bound; ask for profile likelihood", held.ToString());
        var near = Simulated.Exact(FlowLaw.Casson, 0.00001, 0.0013).Fit((FlowLaw)FlowLaw.Casson, WeightedFits.Errors).Interval("yield stress", 0.95, IntervalMethod.Wald);
        Assert.Contains("standard errors from its bound", near.WhyNone, StringComparison.Ordinal);
    }

    [Fact]
    public void A_measurand_that_is_a_parameter_has_its_interval_under_its_own_name()
    {
        var (measurand, parameter) = (Blood.Interval(Measurand.CassonYieldStress), Blood.Interval("yield stress"));
        Assert.Equal("Casson yield stress", measurand.Name);
        Assert.Equal(parameter, measurand with { Name = parameter.Name });
        Assert.Equal(parameter, Blood.Interval(Blood.Law.Parameters[0]));
    }

    /// <summary>Held at zero, the yield stress leaves every viscosity above a floor: an interval of a viscosity closes also then.</summary>
    [Fact]
    public void A_viscosity_of_a_fit_at_its_bound_has_two_limits_and_the_upper_one_lets_a_yield_stress_in()
    {
        var fit = Simulated.Exact(FlowLaw.Newtonian, 0.0013).Fit((FlowLaw)FlowLaw.Casson, WeightedFits.Errors);
        var (profile, wald) = (fit.Interval(Measurand.Viscosity(1.PerSecond())), fit.Interval(Measurand.Viscosity(1.PerSecond()), 0.95, IntervalMethod.Wald));
        Assert.Equal(IntervalKind.Closed, profile.Kind);
        Assert.InRange(profile.Lower!.Value / wald.Lower!.Value, 0.999, 1.001);
        Assert.True(profile.Upper > 1.05 * wald.Upper);
    }

    [Fact]
    public void A_fit_that_found_nothing_has_no_interval_but_says_so()
    {
        var singular = Simulated.Exact(FlowLaw.PowerLaw, 0.014, 0.78).Fit((FlowLaw)FlowLaw.CarreauYasuda, WeightedFits.Errors);
        Assert.NotEqual(IntervalKind.Closed, singular.Interval("low-shear viscosity").Kind);
        var bad = FlowCurve.Of([1, 2, 3], [1, -1, 2]).Fit((FlowLaw)FlowLaw.Casson);
        foreach (var method in Enum.GetValues<IntervalMethod>()) Assert.Contains("there is no fit", bad.Interval("yield stress", 0.95, method).WhyNone, StringComparison.Ordinal);
        Assert.Contains("there is no fit", bad.Interval(Measurand.Viscosity(1.PerSecond())).WhyNone, StringComparison.Ordinal);
        var few = FlowCurve.Of([1, 10], [0.012, 0.06]).Fit((FlowLaw)FlowLaw.Casson);
        foreach (var method in Enum.GetValues<IntervalMethod>()) Assert.Contains("no degrees of freedom", few.Interval("yield stress", 0.95, method).WhyNone, StringComparison.Ordinal);
    }

    [Fact]
    public void A_law_of_ones_own_that_throws_on_the_way_out_gives_no_answer()
    {
        var law = FlowLaw.Custom("brittle", (rate, p) => Checked(p[0] * rate), new LawParameter("eta", "η", "Pa.s", Start: 0.0033));
        var fit = Simulated.Exact(FlowLaw.Newtonian, 0.0033).Fit((FlowLaw)law, ErrorModel.Known(0.5, ShearStress.FromPascals(0.1)));
        Assert.Contains("throws: too far", fit.Interval("eta").WhyNone, StringComparison.Ordinal);
        Assert.Empty(fit.Profile("eta").Points);

        static LaneDual Checked(LaneDual stress) => stress.Value[0] > 1.1 ? throw new InvalidOperationException("too far") : stress;
    }

    [Fact]
    public void Misuse_is_told_what_to_do()
    {
        Assert.Contains("it has yield stress, Casson viscosity", Assert.Throws<ArgumentException>(() => Blood.Interval("tau")).Message, StringComparison.Ordinal);
        Assert.Contains("does not come from", Assert.Throws<ArgumentException>(() => Blood.Interval(Measurand.RelativeViscosity(1.PerSecond()))).Message, StringComparison.Ordinal);
        Assert.Throws<ArgumentOutOfRangeException>(() => Blood.Interval("yield stress", 95));
        Assert.Throws<ArgumentOutOfRangeException>(() => Blood.Interval("yield stress", 0.95, IntervalMethod.ResidualBootstrap, new(1, 20)));
    }

    /// <summary>At 68.27 % the limit is one standard deviation; a wider level gives a wider interval.</summary>
    [Fact]
    public void Levels_are_nested_and_the_quantile_is_normal_or_Student()
    {
        var (wide, narrow) = (Blood.Profile("yield stress", 0.99), Blood.Profile("yield stress", 0.6826894921370859));
        Assert.Equal(1, narrow.Limit, 1e-12);
        Assert.True(wide.Interval.Lower < narrow.Interval.Lower && wide.Interval.Upper > narrow.Interval.Upper);
        Assert.Equal(Normal95, Blood.Profile("yield stress").Limit, 1e-12);
        Assert.Equal(2.2281388519649385, (Blood.Curve.Fit((FlowLaw)FlowLaw.Casson, ErrorModel.Default)).Profile("yield stress").Limit, 1e-9);
    }

    /// <summary>The profile of a viscosity at a high rate is nearly a straight line, so for correlated readings it must follow the standard error that knows of them; known and estimated scale.</summary>
    [Theory]
    [InlineData(true)]
    [InlineData(false)]
    public void Correlated_readings_widen_every_method_alike(bool known)
    {
        var fit = Blood.Curve.Fit((FlowLaw)FlowLaw.Casson, WeightedFits.Errors with { ScaleKnown = known });
        var correlated = fit.WithCorrelation(0.6);
        double Width(FittedLaw of, IntervalMethod method) => of.Interval(Measurand.Viscosity(100.PerSecond()), 0.95, method) is var interval ? interval.Upper!.Value - interval.Lower!.Value : 0;
        var wald = Width(correlated, IntervalMethod.Wald);
        Assert.True(wald > 1.3 * Width(fit, IntervalMethod.Wald));
        Assert.Equal(1, Width(correlated, IntervalMethod.ProfileLikelihood) / wald, 0.01);
        Assert.Equal(1, Width(correlated, IntervalMethod.ParametricBootstrap) / wald, 0.1);
        Assert.Contains("cannot change places", correlated.Interval("yield stress", 0.95, IntervalMethod.ResidualBootstrap).WhyNone, StringComparison.Ordinal);
    }

    [Fact]
    public void An_index_of_a_Newtonian_liquid_has_no_lower_limit_of_the_data()
    {
        var interval = Plasma.Fit((FlowLaw)FlowLaw.Casson, WeightedFits.Errors).Interval(Measurand.ShearThinningIndex(1.PerSecond(), 100.PerSecond()));
        Assert.True(interval.Allows(1), interval.ToString());
        Assert.True(interval.Upper < 2, interval.ToString());
    }

    private static FlowCurve Noisy(string name, FlowLaw law, params double[] truth) => Simulated.Noisy(RandomStream.Of(20261201, name, 1), law, 0.01, 0.0003, truth);

    [Fact]
    public void An_interval_outside_the_kept_rates_says_that_the_form_of_the_law_gives_it()
    {
        var outside = Blood.Interval(Measurand.Viscosity(new ShearRate(0.001)));
        Assert.Contains(outside.Findings, finding => finding.Kind == FittingFindings.IntervalExtrapolated);
        Assert.Contains("lies outside the kept shear rates", outside.ToString(), StringComparison.Ordinal);
        Assert.Contains(Blood.Profile(Measurand.ShearThinningIndex(new(0.001), new(100))).Interval.Findings, finding => finding.Kind == FittingFindings.IntervalExtrapolated);
        Assert.Empty(Blood.Interval(Measurand.Viscosity(new ShearRate(100))).Findings);
    }

    [Theory]
    [InlineData(0)]
    [InlineData(-1)]
    [InlineData(double.NaN)]
    public void A_viscosity_at_no_rate_is_refused(double rate) => Assert.Throws<ArgumentOutOfRangeException>(() => Blood.ApparentViscosity(new(rate)));
}
