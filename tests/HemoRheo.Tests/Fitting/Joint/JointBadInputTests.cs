namespace HemoRheo.Tests.Fitting;

/// <summary>Misuse throws with what is wrong and what there is; bad data are left out with a finding, and too few left refuse the fit.</summary>
public class JointBadInputTests
{
    private static readonly ErrorModel Errors = WeightedFits.Errors;
    private static readonly FlowCurve Good = Simulated.Exact(FlowLaw.Casson, 0.005, 0.0034);
    private static readonly FlowCurve Bad = FlowCurve.Of([100, 50, 10, 5], [0.5, -0.1, 0.08, 0.05], "S-2");

    [Fact]
    public void No_curve_or_one_is_misuse()
    {
        Assert.Contains("there are none", Thrown(() => Array.Empty<FlowCurve>().FitLoadings(FlowLaw.Casson, Errors)), StringComparison.Ordinal);
        Assert.Contains("there is 1. One curve alone is fitted by curve.Fit(law)", Thrown(() => new[] { Good }.FitTogether(FlowLaw.Casson, [], Errors)), StringComparison.Ordinal);
        Assert.Throws<ArgumentNullException>(() => ((FlowCurve[])null!).FitLoadings(FlowLaw.Casson, Errors));
    }

    [Fact]
    public void An_unknown_parameter_is_told_with_those_there_are() => Assert.Contains(
        "Casson has no parameter 'yeld stress' to share; its parameters are yield stress, Casson viscosity.",
        Thrown(() => new[] { Good, Good }.FitTogether(FlowLaw.Casson, ["yeld stress"], Errors)),
        StringComparison.Ordinal);

    [Fact]
    public void A_parameter_asked_for_by_a_wrong_name_or_without_its_curve_is_told_with_those_there_are()
    {
        var fit = new[] { Good, Good }.FitTogether(FlowLaw.Casson, ["yield stress"], Errors);
        Assert.Contains("There is no parameter 'Casson viscosity' that all curves share; there are yield stress, Casson viscosity of curve 0, Casson viscosity of curve 1.", Thrown(() => fit["Casson viscosity"]), StringComparison.Ordinal);
        Assert.Throws<ArgumentOutOfRangeException>(() => fit.ApparentViscosity(2, ShearRate.FromReciprocalSeconds(10)));
    }

    [Theory]
    [InlineData(0.0)]
    [InlineData(1.0)]
    [InlineData(45.0)]
    [InlineData(double.NaN)]
    public void A_hematocrit_outside_0_to_1_is_misuse(double h) =>
        Assert.Contains("A hematocrit lies between 0 and 1 L/L", Thrown(() => new[] { Good, Good }.FitDilution([Hematocrit.FromLiterPerLiter(0.4), Hematocrit.FromLiterPerLiter(h)], Errors)), StringComparison.Ordinal);

    [Fact]
    public void Lists_of_unequal_length_are_misuse()
    {
        Assert.Contains("2 curves and 1 hematocrits", Thrown(() => new[] { Good, Good }.FitDilution([Hematocrit.FromLiterPerLiter(0.4)], Errors)), StringComparison.Ordinal);
        Assert.Contains("2 curves and 1 error models", Thrown(() => new[] { Good, Good }.FitLoadings(FlowLaw.Casson, [Errors])), StringComparison.Ordinal);
        Assert.Contains("2 curves and 1 laws", Thrown(() => new[] { Good, Good }.FitTogether([FlowLaw.Casson], [], [Errors, Errors])), StringComparison.Ordinal);
    }

    [Fact]
    public void Laws_of_other_parameters_and_error_models_of_two_kinds_are_misuse()
    {
        Assert.Contains("The parameters of Bingham are not those of Casson", Thrown(() => new[] { Good, Good }.FitTogether([FlowLaw.Casson, FlowLaw.Bingham], [], [Errors, Errors])), StringComparison.Ordinal);
        Assert.Contains("need one kind", Thrown(() => new[] { Good, Good }.FitLoadings(FlowLaw.Casson, [Errors, Errors with { ScaleKnown = false }])), StringComparison.Ordinal);
    }

    [Fact]
    public void A_curve_that_cannot_be_fitted_is_left_out_with_a_finding()
    {
        var fit = new[] { Good, Bad, Good }.FitLoadings(FlowLaw.Casson, Errors);
        Assert.True(fit.Usable, fit.ToString());
        Assert.Equal(2, fit.Factors.Count);
        var left = Assert.Single(fit.Findings, finding => finding.Code == "curve-left-out");
        Assert.Contains("Loading 1 of S-2 took no part: Point 2", left.Message, StringComparison.Ordinal);
        Assert.Equal("S-2", left.Where.Sample);
    }

    [Fact]
    public void Fewer_than_two_curves_left_refuse_the_fit_and_no_value_is_given()
    {
        var fit = new[] { Good, Bad }.FitLoadings(FlowLaw.Casson, Errors);
        Assert.False(fit.Usable);
        Assert.Equal(StopReason.BadData, fit.Joint.Convergence.Reason);
        Assert.Equal(["curve-left-out", "too-few-curves"], fit.Findings.Select(finding => finding.Code));
        Assert.Empty(fit.Factors);
        Assert.Throws<InvalidOperationException>(() => fit.ApparentViscosity(ShearRate.FromReciprocalSeconds(10)));
        Assert.Contains("not usable\n1 of 2 curves are left", fit.ToString(), StringComparison.Ordinal);
    }

    [Fact]
    public void As_many_parameters_as_points_with_sizes_up_to_scale_have_no_errors_and_say_why()
    {
        var shorter = Good with { Points = Good.Points.Where((_, i) => i is 0 or 11).ToItems() };
        var fit = new[] { shorter, shorter }.FitTogether(FlowLaw.Casson, [], Errors with { ScaleKnown = false });
        Assert.False(fit.Usable);
        Assert.Contains(fit.Findings, finding => finding.Code == "no-error-scale");
        Assert.All(fit.Parameters, parameter => Assert.Equal("no degrees of freedom left to estimate the size of the errors", parameter.Number.WhyNoError));
    }

    /// <summary>It throws between the thicknesses of the two curves, where a shared one lies.</summary>
    [Fact]
    public void A_law_of_ones_own_that_throws_refuses_the_fit_and_says_so()
    {
        double[] thick = [0.003, 0.006];
        FlowLaw[] laws = [.. thick.Select(start => FlowLaw.Custom("odd", (rate, p) => p[0].Value[0] is > 0.0035 and < 0.0055 ? throw new InvalidOperationException("not here") : p[0] * rate, new LawParameter("thickness", "t", "Pa.s", Start: start)))];
        var fit = thick.Select(t => Simulated.Exact(FlowLaw.Newtonian, t)).ToArray().FitTogether(laws, ["thickness"], [Errors, Errors]);
        Assert.False(fit.Usable);
        Assert.Contains("odd throws: not here.", Assert.Single(fit.Findings, finding => finding.Code == "law-failed").Message, StringComparison.Ordinal);
    }

    [Fact]
    public void Readings_of_any_shape_end_with_a_reason()
    {
        var stream = RandomStream.Of(20261201, "any shape together", 1);
        for (var i = 0; i < 8; i++)
        {
            FlowCurve[] curves = [.. Enumerable.Range(0, 3).Select(_ => FlowCurve.Of(Simulated.Rates, [.. Simulated.Rates.Select(_ => Math.Exp(4 * stream.Normal()))]))];
            foreach (var law in (FlowLaw[])[FlowLaw.Casson, FlowLaw.Quemada])
            {
                foreach (var fit in (JointFit[])[curves.FitLoadings(law, Errors).Joint, curves.FitTogether(law, [law.Parameters[1].Name], Errors)])
                {
                    Assert.NotEmpty(fit.Convergence.Message);
                    Assert.True(fit.Usable || fit.Findings.Any(finding => finding.Severity == Severity.Fault), fit.ToString());
                }
            }
        }
    }

    private static string Thrown(Func<object> misuse) => Assert.ThrowsAny<ArgumentException>(misuse).Message;
}
