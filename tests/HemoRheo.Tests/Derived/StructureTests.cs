using HemoRheo.Tests.Fitting;

namespace HemoRheo.Tests.Derived;

/// <summary>Quemada's structure parameters. Expected values: the set of Neofytou and Drikakis 2003 (k0 4.33, kinf 2.07, critical rate 1.88 1/s, plasma 1.2 mPa.s, hematocrit 0.45).</summary>
public class StructureTests
{
    private static readonly Hematocrit Usual = Hematocrit.FromLiterPerLiter(0.45);
    private static readonly Viscosity Plasma = Viscosity.FromMillipascalSeconds(1.2);

    [Fact]
    public void A_published_set_goes_in_and_comes_out()
    {
        var structure = Published().Fit(FlowLaw.Quemada, WeightedFits.Errors).Structure(Usual, 0.006, Plasma, 0.01);
        Assert.Equal(4.33, structure.AtRest.X, 1e-8);
        Assert.Equal(2.07, structure.AtHighShear.X, 1e-8);
        Assert.Empty(structure.Findings);
    }

    [Fact]
    public void Every_contribution_is_the_finite_difference_of_its_source()
    {
        var fit = Noisy(1);
        const double step = 1e-6;
        var (h, logPlasma) = (0.45, Math.Log(0.0012));
        var structure = fit.Structure(Usual, 0.006, Plasma, 0.01);
        foreach (var (value, atRest) in new[] { (structure.AtRest, true), (structure.AtHighShear, false) })
        {
            var scaled = fit.Scaled.ToArray();
            double K(double[] at, double hematocrit, double log) =>
                2 / hematocrit * (1 - (atRest ? 1 / (1 + Math.Exp(-at[2])) : 1) * Math.Sqrt(Math.Exp(log) / Math.Exp(at[0])));
            Assert.Equal(0.006 * (K(scaled, h + step, logPlasma) - K(scaled, h - step, logPlasma)) / (2 * step), value.Part(SourceKind.Hematocrit)!.Value, 1e-8);
            Assert.Equal(0.01 * (K(scaled, h, logPlasma + step) - K(scaled, h, logPlasma - step)) / (2 * step), value.Part(SourceKind.Plasma)!.Value, 1e-8);

            var gradient = new double[3];
            for (var k = 0; k < 3; k++)
            {
                var (up, down) = (scaled.ToArray(), scaled.ToArray());
                up[k] += step;
                down[k] -= step;
                gradient[k] = (K(up, h, logPlasma) - K(down, h, logPlasma)) / (2 * step);
            }

            var variance = Enumerable.Range(0, 3).Sum(i => Enumerable.Range(0, 3).Sum(j => gradient[i] * gradient[j] * fit.Covariance[3 * i + j]));
            Assert.Equal(Math.Sqrt(variance), value.Part(SourceKind.Fit)!.Value, 1e-7);
        }
    }

    /// <summary>Curves, hematocrits and plasma viscosities drawn anew: the spread of the results is the stated uncertainty, to 5 % of a spread from 4,000 draws (its own standard error is 1.1 %).</summary>
    [Fact]
    public void The_uncertainty_is_the_spread_of_repeated_measurements()
    {
        const int draws = 4000;
        var stream = RandomStream.Of(20261201, "structure", 1);
        var curves = Enumerable.Range(0, draws).Select(_ => Simulated.Noisy(stream, FlowLaw.Quemada, 0.01, 0.0003, PublishedNumbers)).ToArray();
        var fits = Fits.OfAll(curves, FlowLaw.Quemada, WeightedFits.Errors);
        var structures = fits.Select(fit => fit.Structure(
            Hematocrit.FromLiterPerLiter(0.45 + 0.006 * stream.Normal()), 0.006, Viscosity.FromPascalSeconds(0.0012 * Math.Exp(0.01 * stream.Normal())), 0.01)).ToArray();
        var stated = Published().Fit(FlowLaw.Quemada, WeightedFits.Errors).Structure(Usual, 0.006, Plasma, 0.01);
        Near(stated.AtRest.StandardUncertainty, Spread(structures.Select(structure => structure.AtRest.X)));
        Near(stated.AtHighShear.StandardUncertainty, Spread(structures.Select(structure => structure.AtHighShear.X)));
    }

    [Fact]
    public void At_the_boundary_the_parameter_at_rest_is_two_over_hematocrit_and_says_so()
    {
        var fit = Simulated.Exact(FlowLaw.Casson, 0.006, 0.0035).Fit(FlowLaw.Quemada, WeightedFits.Errors);
        var structure = fit.Structure(Usual, 0.006, Plasma, 0.01);
        Assert.Equal(2 / 0.45, structure.AtRest.X, 1e-12);
        Assert.Equal(0, structure.AtRest.Part(SourceKind.Fit)!.Value, 1e-12);
        Assert.Equal("structure-at-boundary", Assert.Single(structure.Findings).Code);
    }

    [Fact]
    public void A_plasma_thicker_than_the_blood_is_said()
    {
        var structure = Published().Fit(FlowLaw.Quemada, WeightedFits.Errors).Structure(Usual, 0.006, Viscosity.FromMillipascalSeconds(12), 0.01);
        Assert.True(structure.AtHighShear.X < 0);
        Assert.Contains(structure.Findings, finding => finding.Code == "structure-out-of-range");
    }

    [Fact]
    public void Misuse_is_told_in_words()
    {
        var quemada = Published().Fit(FlowLaw.Quemada, WeightedFits.Errors);
        var casson = Published().Fit(FlowLaw.Casson, WeightedFits.Errors);
        Assert.Contains("not of Casson", Assert.Throws<ArgumentException>(() => casson.Structure(Usual, 0.006, Plasma, 0.01)).Message, StringComparison.Ordinal);
        Assert.Contains("between 0 and 1", Assert.Throws<ArgumentException>(() => quemada.Structure(new(45), 0.006, Plasma, 0.01)).Message, StringComparison.Ordinal);
        Assert.Throws<ArgumentException>(() => quemada.Structure(Usual, -0.006, Plasma, 0.01));
        Assert.Throws<ArgumentException>(() => quemada.Structure(Usual, 0.006, new(0), 0.01));
    }

    private static double[] PublishedNumbers { get; } = [0.0012 / Math.Pow(1 - 0.45 * 2.07 / 2, 2), 1.88, (1 - 0.45 * 4.33 / 2) / (1 - 0.45 * 2.07 / 2)];

    private static FlowCurve Published() => Simulated.Exact(FlowLaw.Quemada, PublishedNumbers);

    private static FittedLaw<Quemada> Noisy(int replicate) =>
        Simulated.Noisy(RandomStream.Of(20261201, "structure noise", replicate), FlowLaw.Quemada, 0.01, 0.0003, 0.003, 2, 0.2).Fit(FlowLaw.Quemada, WeightedFits.Errors);

    private static double Spread(IEnumerable<double> values) => MathNet.Numerics.Statistics.ArrayStatistics.StandardDeviation([.. values]);

    private static void Near(double stated, double spread) => Assert.InRange(spread / stated, 0.95, 1.05);
}
