namespace HemoRheo.Tests.Fitting;

/// <summary>The floor that comes from the step in which an instrument gives torques.</summary>
public class TorqueResolutionTests
{
    private static readonly ErrorModel Declared = ErrorModel.Known(0.01, ShearStress.FromPascals(0.0003));

    /// <summary>1e-8 N.m through 25,000 Pa/(N.m): 2.5e-4 Pa / sqrt(12) = 7.2168784e-5 Pa; with 3e-4 Pa in quadrature 3.0855848e-4 Pa.</summary>
    [Fact]
    public void It_joins_the_declared_floor_in_quadrature()
    {
        var errors = Declared.WithTorqueResolution(newtonMeters: 1e-8, 25000);
        Assert.Equal(3.0855848e-4, errors.Floor.Pascals, 1e-11);
        Assert.Equal((0.01, true), (errors.Relative, errors.ScaleKnown));
    }

    /// <summary>Rounding a spread-out stress to steps scatters it by step / sqrt(12) (JCGM 100:2008, 4.3.7).</summary>
    [Fact]
    public void It_is_the_scatter_that_rounding_to_steps_makes()
    {
        var stream = RandomStream.Of(20261201, "steps", 1);
        const double step = 1e-8, perTorque = 25000;
        var errors = Enumerable.Range(0, 20000).Select(_ => 0.01 + 0.01 * stream.Uniform()).Select(stress => perTorque * step * Math.Round(stress / perTorque / step) - stress).ToArray();
        var made = MathNet.Numerics.Statistics.ArrayStatistics.StandardDeviation(errors);
        Assert.InRange(made / ErrorModel.Known(0.01, new(0)).WithTorqueResolution(step, perTorque).Floor.Pascals, 0.98, 1.02);
    }

    [Fact]
    public void A_resolution_of_zero_changes_nothing() => Assert.Same(Declared, Declared.WithTorqueResolution(0, 25000));

    [Theory]
    [InlineData(-1e-8, 25000.0, "zero or above")]
    [InlineData(double.NaN, 25000.0, "zero or above")]
    [InlineData(1e-8, null, "knows no geometry")]
    [InlineData(1e-8, 0.0, "above zero")]
    public void Misuse_is_told_in_words(double step, double? perTorque, string words) =>
        Assert.Contains(words, Assert.Throws<ArgumentException>(() => Declared.WithTorqueResolution(step, perTorque)).Message, StringComparison.Ordinal);

    [Fact]
    public void Curves_with_error_models_of_their_own_are_fitted_each_with_its_own_in_their_order()
    {
        var other = Declared.WithTorqueResolution(1e-7, 25000);
        FlowCurve[] curves = [.. WeightedFits.Curves.Values];
        ErrorModel[] errors = [.. curves.Select((_, i) => i % 3 == 1 ? other : Declared)];
        var fits = Fits.InParallel(curves, FlowLaw.Casson, errors, threads: 2, TestContext.Current.CancellationToken);
        for (var i = 0; i < curves.Length; i++) Assert.Equal(curves[i].Fit((FlowLaw)FlowLaw.Casson, errors[i]), fits[i]);
    }
}
