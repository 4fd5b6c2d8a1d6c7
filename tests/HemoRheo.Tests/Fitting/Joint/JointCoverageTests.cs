namespace HemoRheo.Tests.Fitting;

/// <summary>Intervals of joint fits hold the truth, and the test of sharing raises false alarms, as often as they say; by simulation, within three standard errors.</summary>
public class JointCoverageTests
{
    private const int Replicates = 600;

    /// <summary>95 % of 600, plus or minus three standard errors of 0.89 %.</summary>
    private static readonly Interval Near95 = new(0.9233, 0.9767);

    private static readonly ErrorModel Known = ErrorModel.Known(0.01, ShearStress.FromPascals(0.0003));

    /// <summary>Three loadings that scatter by 2 %: the mean keeps 2 % / sqrt(3), estimated on two degrees of freedom; without that part the interval of the fit alone covers less than half.</summary>
    [Fact]
    public void The_viscosity_at_10_of_three_loadings_is_covered_with_the_loading_part_and_not_without()
    {
        var truth = Math.Log(FlowLaw.Casson.Stress(ShearRate.FromReciprocalSeconds(10), 0.005, 0.0034).Pascals / 10);
        double whole = 0, alone = 0;
        for (var i = 1; i <= Replicates; i++)
        {
            var value = Loadings("coverage", i, 0.02).FitLoadings(FlowLaw.Casson, Known).ApparentViscosity(ShearRate.FromReciprocalSeconds(10)).Value;
            if (value.Interval().Contains(truth)) whole++;
            if (value.Only(source => source.Kind == SourceKind.Fit).Interval().Contains(truth)) alone++;
        }

        Assert.InRange(whole / Replicates, Near95.Lower, Near95.Upper);
        Assert.InRange(alone / Replicates, 0, 0.5);
    }

    /// <summary>The ratio of two viscosities does not feel a factor of the loading: the fit alone is right, and the loading part next to nothing.</summary>
    [Fact]
    public void An_index_that_loadings_do_not_move_gets_no_loading_part()
    {
        var index = Measurand.ShearThinningIndex(ShearRate.FromReciprocalSeconds(1), ShearRate.FromReciprocalSeconds(100));
        var value = Loadings("index", 1, 0.02).FitLoadings(FlowLaw.Casson, Known).Estimate(index).Value;
        Assert.InRange(Math.Abs(value.Part(SourceKind.Loading)!.Value), 0, 1e-12);
        Assert.InRange(value.Part(SourceKind.Fit)!.Value, 0.001, 0.05);
    }

    /// <summary>A critical rate shared by four curves, errors known up to scale, Student's t with the joint fit's degrees of freedom; and false alarms of the F test, which 5 %, plus or minus three standard errors of 0.89 %, may raise.</summary>
    [Fact]
    public void A_shared_critical_rate_is_covered_and_the_test_of_sharing_alarms_in_5_percent()
    {
        var errors = ErrorModel.UpToScale(0.02, ShearStress.FromPascals(0.0006));
        double covered = 0, alarms = 0;
        for (var i = 1; i <= Replicates; i++)
        {
            var stream = RandomStream.Of(20261201, "critical rate", i);
            FlowCurve[] curves = [.. ((double[][])[[0.0021, 2.5, 0.45], [0.0026, 2.5, 0.33], [0.0033, 2.5, 0.24], [0.0043, 2.5, 0.17]]).Select(truth => Simulated.Noisy(stream, FlowLaw.Quemada, 0.01, 0.0003, truth))];
            var fit = curves.FitTogether(FlowLaw.Quemada, ["critical rate"], errors);
            Assert.True(fit.Usable, fit.ToString());
            Assert.Equal("critical rate", fit.Parameters[0].Number.Parameter.Name);
            var reach = StudentQuantile.At(fit.Fit.DegreesOfFreedom, 0.975) * Math.Sqrt(fit.Covariance[0]);
            if (Math.Abs(fit.Scaled[0] - Math.Log(2.5)) <= reach) covered++;
            if (fit.Compatibility!.Probability < 0.05) alarms++;
        }

        Assert.InRange(covered / Replicates, Near95.Lower, Near95.Upper);
        Assert.InRange(alarms / Replicates, 0.0233, 0.0767);
    }

    /// <summary>Known sizes: chi-square, on loadings with factors of their own.</summary>
    [Fact]
    public void The_test_of_sharing_alarms_in_5_percent_of_loadings_of_one_law()
    {
        var alarms = Enumerable.Range(1, Replicates).Count(i => Loadings("alarms", i, 0.02).FitLoadings(FlowLaw.Casson, Known).Joint.Compatibility!.Probability < 0.05);
        Assert.InRange(alarms / (double)Replicates, 0.0233, 0.0767);
    }

    private static FlowCurve[] Loadings(string what, int replicate, double scatter)
    {
        var stream = RandomStream.Of(20261201, what, replicate);
        return [.. Enumerable.Range(0, 3).Select(_ => Math.Exp(scatter * stream.Normal())).Select(factor => Simulated.Noisy(stream, FlowLaw.Casson, 0.01, 0.0003, 0.005 * factor, 0.0034 * factor))];
    }
}
