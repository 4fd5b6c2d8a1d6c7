namespace HemoRheo.Tests.Fitting;

/// <summary>What is shared, from nothing to everything, in any order of the curves, also at bounds and for a law of one's own.</summary>
public class JointSharingTests
{
    private static readonly ErrorModel Errors = WeightedFits.Errors;

    /// <summary>Ten curves of invented blood.</summary>
    private static readonly FlowCurve[] Curves = [.. WeightedFits.Curves.Values];

    [Theory]
    [InlineData("Casson")]
    [InlineData("Quemada")]
    public void With_nothing_shared_estimates_and_covariances_are_those_of_single_fits(string name)
    {
        var law = FlowLaw.Named(name);
        var fit = Curves.FitTogether(law, [], Errors);
        Assert.Null(fit.Compatibility);
        var size = law.Parameters.Count;
        for (var l = 0; l < Curves.Length; l++)
        {
            var single = Curves[l].Fit(law, Errors);
            for (var k = 0; k < size; k++)
            {
                Assert.Equal(single.Scaled[k], fit.Scaled[l * size + k], 1e-9);
                for (var j = 0; j < size; j++) Assert.Equal(single.Covariance[k * size + j], fit.Covariance[(l * size + k) * fit.Scaled.Count + l * size + j], 1e-9);
            }

            Assert.Equal(single.Residuals.Sum(r => r * r), fit.Residuals[l].Sum(r => r * r), 1e-8);
        }
    }

    [Fact]
    public void With_all_shared_it_is_one_fit_of_all_points()
    {
        var pooled = (Curves[0] with { Points = Curves.SelectMany(curve => curve.Points).ToItems() }).Fit(FlowLaw.Casson, Errors);
        var fit = Curves.FitTogether(FlowLaw.Casson, ["yield stress", "Casson viscosity"], Errors);
        for (var k = 0; k < 2; k++) Assert.Equal(pooled.Scaled[k], fit.Scaled[k], 1e-10);
        for (var k = 0; k < 4; k++) Assert.Equal(pooled.Covariance[k], fit.Covariance[k], 1e-12);
        Assert.Equal(pooled.Fit.ChiSquare, fit.Fit.ChiSquare, 1e-7);
        Assert.Equal(2 * Curves.Length - 2, fit.Compatibility!.DegreesOfFreedom);
    }

    /// <summary>Blood of five people is not one blood.</summary>
    [Fact]
    public void Curves_that_do_not_share_a_parameter_contradict_it_in_words()
    {
        var fit = Curves.FitTogether(FlowLaw.Casson, ["yield stress", "Casson viscosity"], Errors);
        Assert.True(fit.Compatibility!.Contradicts);
        Assert.Contains(fit.Findings, finding => finding.Code == "sharing-contradicted");
        Assert.Contains("sharing contradicted: chi-square rises by", fit.ToString(), StringComparison.Ordinal);
    }

    [Theory]
    [InlineData(1)]
    [InlineData(2)]
    [InlineData(3)]
    public void The_order_of_the_curves_changes_nothing(int seed)
    {
        var stream = RandomStream.Of(seed, "order", 1);
        int[] order = [.. Enumerable.Range(0, 4).OrderBy(_ => stream.Uniform())];
        var (curves, errors, hematocrits) = (JointCases.Curves("series"), JointCases.Errors("series"), JointCases.Hematocrits("series"));
        Same(curves.FitTogether(Laws(4), ["critical rate"], errors), Picked(curves).FitTogether(Laws(4), ["critical rate"], Picked(errors)), order);
        Same(curves.FitLoadings(FlowLaw.Casson, errors).Joint, Picked(curves).FitLoadings(FlowLaw.Casson, Picked(errors)).Joint, order);
        Same(curves.FitDilution(hematocrits, errors[0]), Picked(curves).FitDilution(Picked(hematocrits), errors[0]), order);

        T[] Picked<T>(T[] list) => [.. order.Select(i => list[i])];
    }

    [Fact]
    public void Casson_loadings_of_plasma_end_without_a_yield_stress()
    {
        var fit = Noisy(4, FlowLaw.Newtonian, 0.0013).FitLoadings(FlowLaw.Casson, Errors);
        var newtonian = Noisy(4, FlowLaw.Newtonian, 0.0013).FitLoadings(FlowLaw.Newtonian, Errors);
        Assert.True(fit.Usable, fit.ToString());
        if (!fit["yield stress"].AtBound) Assert.True(fit.Joint.Fit.ChiSquare <= newtonian.Joint.Fit.ChiSquare);
        else Assert.Equal(newtonian.Joint.Fit.ChiSquare, fit.Joint.Fit.ChiSquare, 1e-8);
    }

    /// <summary>At r = 0, which noisy Casson curves reach about half the time, the joint fit of Quemada is that of Casson.</summary>
    [Fact]
    public void A_shared_ratio_at_its_bound_is_Casson_and_said_to_be()
    {
        var held = 0;
        for (var i = 1; i <= 20; i++)
        {
            FlowCurve[] curves = [.. Noisy(10 + i, FlowLaw.Casson, 0.005, 0.0034)];
            var (quemada, casson) = (curves.FitTogether(FlowLaw.Quemada, ["high-shear viscosity", "critical rate", "ratio"], Errors), curves.FitTogether(FlowLaw.Casson, ["yield stress", "Casson viscosity"], Errors));
            Assert.True(quemada.Usable, quemada.ToString());
            Assert.True(quemada.Fit.ChiSquare <= casson.Fit.ChiSquare * (1 + 1e-3));
            if (!quemada["ratio"].AtBound) continue;
            held++;
            Assert.Equal(casson.Fit.ChiSquare, quemada.Fit.ChiSquare, 1e-8);
            Assert.Equal(casson["Casson viscosity"].Estimate, quemada["high-shear viscosity"].Estimate, 1e-11);
            Assert.Contains(quemada.Findings, finding => finding.Code == "law-at-boundary" && finding.Message.Contains("Casson describes the curves", StringComparison.Ordinal));
        }

        Assert.InRange(held, 4, 16);
    }

    [Fact]
    public void A_parameter_that_starts_at_its_bound_comes_back_inside_where_the_curves_want_it()
    {
        var curve = Simulated.Exact(FlowLaw.Quemada, 0.0031, 2.5, 0.2);
        var plan = new JointPlan { Curves = [curve, curve], Laws = Laws(2), Errors = [Errors, Errors], Shared = ["high-shear viscosity", "critical rate", "ratio"] };
        var solution = JointSolver.Solve(plan.ToProblem(), [Math.Log(0.003), Math.Log(2), double.NegativeInfinity]);
        Assert.True(solution.End.Converged);
        Assert.Equal([Math.Log(0.0031), Math.Log(2.5), Math.Log(0.25)], solution.Scaled, (x, y) => Math.Abs(x - y) < 1e-9);
    }

    [Fact]
    public void A_ratio_of_one_curve_at_its_bound_is_held_for_that_curve_alone()
    {
        var fit = new[] { Simulated.Exact(FlowLaw.Quemada, 0.0031, 2.5, 0.3), Simulated.Exact(FlowLaw.Casson, 0.0034 * 2.5, 0.0034) }.FitTogether(FlowLaw.Quemada, ["critical rate"], Errors);
        Assert.True(fit.Usable, fit.ToString());
        Assert.Equal(0.3, fit["ratio", 0].Estimate, 1e-8);
        Assert.True(fit["ratio", 1].AtBound);
        Assert.Equal("held at its bound", fit["ratio", 1].WhyNoError);
        Assert.Equal(2.5, fit["critical rate"].Estimate, 1e-7);
    }

    /// <summary>A cubic-root relative of Casson's law, with its exact numbers.</summary>
    [Fact]
    public void A_law_of_ones_own_is_fitted_together_too()
    {
        var law = FlowLaw.Custom(
            "cubic root",
            (rate, p) => LaneDual.Pow(LaneDual.Pow(p[0], new(new Lane(1 / 3.0))) + LaneDual.Pow(p[1] * rate, new(new Lane(1 / 3.0))), new(new Lane(3.0))),
            new LawParameter("yield", "y", "Pa", Start: 0.003),
            new LawParameter("thickness", "t", "Pa.s", Start: 0.003));
        double[] thick = [0.0024, 0.0031, 0.0045];
        var fit = thick.Select(t => Simulated.Exact(law, 0.001, t)).ToArray().FitTogether(law, ["yield"], Errors);
        Assert.True(fit.Usable, fit.ToString());
        Assert.Equal(1, fit["yield"].Estimate / 0.001, 1e-10);
        for (var l = 0; l < thick.Length; l++) Assert.Equal(1, fit["thickness", l].Estimate / thick[l], 1e-10);
    }

    /// <summary>Two rates alone cannot tell Quemada's three numbers; with a neighbor's critical rate and ratio they tell the viscosity.</summary>
    [Fact]
    public void A_curve_too_short_for_the_law_takes_part_with_what_is_its_own()
    {
        var whole = Simulated.Exact(FlowLaw.Quemada, 0.0031, 2.5, 0.2);
        var other = Simulated.Exact(FlowLaw.Quemada, 0.0042, 2.5, 0.2);
        var shorter = other with { Points = other.Points.Take(2).ToItems() };
        var fit = new[] { whole, shorter }.FitTogether(FlowLaw.Quemada, ["critical rate", "ratio"], Errors);
        Assert.True(fit.Usable, fit.ToString());
        Assert.Equal(0.0042, fit["high-shear viscosity", 1].Estimate, 1e-12);
        Assert.Null(fit.Compatibility);
        Assert.Contains(fit.Findings, finding => finding.Code == "sharing-not-tested");
    }

    private static FlowLaw[] Laws(int count) => [.. Enumerable.Repeat(FlowLaw.Quemada, count)];

    private static FlowCurve[] Noisy(int replicate, FlowLaw law, params double[] truth)
    {
        var stream = RandomStream.Of(20261201, "sharing", replicate);
        return [.. Enumerable.Range(0, 3).Select(_ => Simulated.Noisy(stream, law, 0.01, 0.0003, truth))];
    }

    private static void Same(JointFit fit, JointFit permuted, int[] order)
    {
        Assert.Equal(fit.Fit.ChiSquare, permuted.Fit.ChiSquare, 1e-9 * fit.Fit.ChiSquare);
        foreach (var parameter in permuted.Parameters)
        {
            int? curve = parameter.Curve is { } at ? order[at] : null;
            var same = fit.Parameters.Single(other => other.Number.Parameter.Name == parameter.Number.Parameter.Name && other.Curve == curve).Number;
            Assert.Equal(1, parameter.Number.Estimate / same.Estimate, 1e-9);
            Assert.Equal(1, parameter.Number.StandardError!.Value / same.StandardError!.Value, 1e-9);
        }
    }
}
