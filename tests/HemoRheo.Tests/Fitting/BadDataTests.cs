namespace HemoRheo.Tests.Fitting;

/// <summary>Bad data give an unusable fit that says why; only misuse throws.</summary>
public class BadDataTests
{
    [Theory]
    [InlineData(double.NaN)]
    [InlineData(double.PositiveInfinity)]
    [InlineData(0)]
    [InlineData(-0.01)]
    public void A_stress_that_is_not_above_zero_and_finite_is_named_with_its_point(double bad)
    {
        var fit = FlowCurve.Of([100, 50, 10, 5], [0.5, bad, 0.08, 0.05]).Fit(FlowLaw.Casson);
        Refused(fit, "point-not-positive");
        Assert.Equal(2, fit.Findings[0].Where.Point);
    }

    [Theory]
    [InlineData(0)]
    [InlineData(-5)]
    [InlineData(double.NaN)]
    public void A_rate_that_is_not_above_zero_and_finite_is_named(double bad) => Refused(FlowCurve.Of([100, 50, bad], [0.5, 0.3, 0.08]).Fit(FlowLaw.Casson), "point-not-positive");

    [Fact]
    public void Fewer_points_than_parameters_are_too_few() => Refused(FlowCurve.Of([100, 50], [0.5, 0.3]).Fit(FlowLaw.Quemada), "too-few-points");

    [Fact]
    public void Many_points_at_one_rate_are_too_few_for_two_parameters()
    {
        var fit = FlowCurve.Of([100, 100, 100, 100], [0.5, 0.51, 0.49, 0.5]).Fit(FlowLaw.Casson);
        Refused(fit, "too-few-points");
        Assert.Contains("4 points at 1 different rates; Casson has 2 parameters", fit.Findings[0].Message, StringComparison.Ordinal);
    }

    [Fact]
    public void A_curve_whose_points_are_all_set_aside_is_too_short()
    {
        var curve = FlowCurve.Of([100], [0.5]);
        Refused((curve with { Points = [] }).Fit(FlowLaw.Newtonian), "too-few-points");
    }

    [Fact]
    public void A_fit_without_estimates_says_why_when_its_values_are_asked_for()
    {
        var fit = FlowCurve.Of([100, 50], [0.5, double.NaN]).Fit(FlowLaw.Casson);
        Assert.Contains("Point 2", Assert.Throws<InvalidOperationException>(() => fit.Values).Message, StringComparison.Ordinal);
    }

    [Fact]
    public void Readings_of_any_shape_end_with_a_reason()
    {
        var stream = RandomStream.Of(20261201, "any shape", 1);
        for (var i = 0; i < 300; i++)
        {
            var curve = FlowCurve.Of(Simulated.Rates, [.. Simulated.Rates.Select(_ => Math.Exp(6 * stream.Normal()))]);
            foreach (var law in FlowLaw.All)
            {
                var fit = curve.Fit(law, WeightedFits.Errors);
                Assert.NotEmpty(fit.Convergence.Message);
                Assert.True(fit.Usable || fit.Findings.Any(finding => finding.Severity == Severity.Fault), fit.ToString());
                if (fit.Usable) Assert.All(fit.Parameters, parameter => Assert.True(parameter.StandardError is not null || parameter.WhyNoError is not null));
            }
        }
    }

    [Fact]
    public void Misuse_throws()
    {
        var curve = FlowCurve.Of([100], [0.5]);
        Assert.Throws<ArgumentNullException>(() => curve.Fit((FlowLaw)null!));
        Assert.Throws<ArgumentNullException>(() => ((FlowCurve)null!).Fit(FlowLaw.Newtonian));
        Assert.Throws<ArgumentException>(() => curve.Fit(FlowLaw.Newtonian, ErrorModel.Known(0, ShearStress.FromPascals(0))));
        Assert.Throws<ArgumentException>(() => curve.Fit(FlowLaw.Newtonian, ErrorModel.Known(-0.01, ShearStress.FromPascals(0.001))));
    }

    private static void Refused(FittedLaw fit, string code)
    {
        Assert.False(fit.Usable);
        Assert.Equal(StopReason.BadData, fit.Convergence.Reason);
        var finding = Assert.Single(fit.Findings);
        Assert.Equal(code, finding.Code);
        Assert.Equal(Severity.Fault, finding.Severity);
        Assert.Empty(fit.Parameters);
    }

    [Fact]
    public void Millipascals_given_as_pascals_are_fitted_and_said_not_to_be_like_blood()
    {
        double[] rates = [100, 30, 10, 3, 1];
        double[] pascals = [.. rates.Select(rate => FlowLaw.Casson.Stress(new(rate), 0.004, 0.0034).Pascals)];
        Assert.DoesNotContain(FlowCurve.Of(rates, pascals).Fit(FlowLaw.Casson).Findings, finding => finding.Kind == FittingFindings.NotLikeBlood);
        Assert.Contains(FlowCurve.Of(rates, [.. pascals.Select(stress => 1000 * stress)]).Fit(FlowLaw.Casson).Findings, finding => finding.Kind == FittingFindings.NotLikeBlood);
    }

    [Theory]
    [InlineData(0, 0)]
    [InlineData(double.PositiveInfinity, 0)]
    [InlineData(0.01, double.PositiveInfinity)]
    [InlineData(double.NaN, 0.001)]
    public void Weights_that_are_zero_or_infinite_are_refused(double relative, double floor) => Assert.Contains(
        "needs a relative part and a floor",
        Assert.Throws<ArgumentException>(() => FlowCurve.Of([100, 10, 1], [0.43, 0.06, 0.014]).Fit(FlowLaw.Casson, ErrorModel.Known(relative, ShearStress.FromPascals(floor)))).Message,
        StringComparison.Ordinal);

    /// <summary>A point given twice counts twice: the same estimates, errors smaller by the root of two.</summary>
    [Fact]
    public void Points_given_twice_count_twice()
    {
        double[] rates = [100, 30, 10, 3, 1];
        double[] pascals = [0.43, 0.153, 0.062, 0.0262, 0.0148];
        var errors = ErrorModel.Known(0.02, ShearStress.FromMillipascals(0.3));
        var once = FlowCurve.Of(rates, pascals).Fit(FlowLaw.Casson, errors);
        var twice = FlowCurve.Of([.. rates, .. rates], [.. pascals, .. pascals]).Fit(FlowLaw.Casson, errors);
        for (var k = 0; k < 2; k++)
        {
            Assert.Equal(once.Parameters[k].Estimate, twice.Parameters[k].Estimate, 1e-9 * once.Parameters[k].Estimate);
            Assert.Equal(once.Parameters[k].StandardError!.Value, Math.Sqrt(2) * twice.Parameters[k].StandardError!.Value, 1e-6 * once.Parameters[k].StandardError!.Value);
        }
    }
}
