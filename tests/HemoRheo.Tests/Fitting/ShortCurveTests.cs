namespace HemoRheo.Tests.Fitting;

/// <summary>Checks with a calibration fluid: one or two points, hand-worked.</summary>
public class ShortCurveTests
{
    /// <summary>One point: viscosity 0.5/100; its relative standard error sqrt((0.01 x 0.5)^2 + 0.003^2)/0.5 = 0.01166.</summary>
    [Fact]
    public void One_point_gives_a_viscosity_with_its_error()
    {
        var fit = FlowCurve.Of([100], [0.5]).Fit(FlowLaw.Newtonian, ErrorModel.Known(0.01, ShearStress.FromPascals(0.003)));
        Assert.True(fit.Usable, fit.ToString());
        Assert.Equal(0.005, fit.Values.Viscosity.PascalSeconds, 1e-15);
        Assert.Equal(0.011661903789690602 * 0.005, fit.Parameters[0].StandardError!.Value, 1e-12);
        Assert.Equal(0, fit.Fit.DegreesOfFreedom);
        Assert.Null(fit.Fit.Probability);
        Assert.Empty(fit.Findings);
        Assert.Equal(2, fit.StressResponse[0], 1e-12);
    }

    /// <summary>Without a floor the estimate is the mean of 0.004 and 0.0044; known 1 % each gives 0.01/sqrt 2; chi-square 2 (0.0002/0.000042)^2.</summary>
    [Fact]
    public void Two_points_give_their_mean_viscosity()
    {
        var fit = FlowCurve.Of([100, 10], [0.4, 0.044]).Fit(FlowLaw.Newtonian, ErrorModel.Known(0.01, ShearStress.FromPascals(0)));
        Assert.Equal(0.0042, fit.Values.Viscosity.PascalSeconds, 1e-14);
        Assert.Equal(0.007071067811865476 * 0.0042, fit.Parameters[0].StandardError!.Value, 1e-13);
        Assert.Equal(45.35147392290249, fit.Fit.ChiSquare, 1e-8);
        Assert.Equal("lack-of-fit", Assert.Single(fit.Findings).Code);
        Assert.True(fit.Usable);
    }

    [Fact]
    public void One_point_with_an_unknown_scale_has_no_error_and_says_so()
    {
        var fit = FlowCurve.Of([100], [0.5]).Fit(FlowLaw.Newtonian);
        Assert.False(fit.Usable);
        Assert.Equal("no-error-scale", Assert.Single(fit.Findings).Code);
        Assert.Equal(0.005, fit.Parameters[0].Estimate, 1e-15);
        Assert.Null(fit.Parameters[0].StandardError);
        Assert.Contains("no degrees of freedom", fit.Parameters[0].WhyNoError, StringComparison.Ordinal);
    }

    /// <summary>Scale unknown: s^2 = chi-square / 2, and the covariance is that of known sizes times s^2.</summary>
    [Fact]
    public void An_unknown_scale_multiplies_the_covariance()
    {
        var curve = FlowCurve.Of([100, 50, 10], [0.4, 0.205, 0.044]);
        var known = curve.Fit(FlowLaw.Newtonian, ErrorModel.Known(0.01, ShearStress.FromPascals(0.0003)));
        var upTo = curve.Fit(FlowLaw.Newtonian, ErrorModel.UpToScale(0.01, ShearStress.FromPascals(0.0003)));
        Assert.Equal(known.Covariance[0] * known.Fit.ChiSquare / 2, upTo.Covariance[0], 1e-18);
        Assert.Null(upTo.Fit.Probability);
    }
}
