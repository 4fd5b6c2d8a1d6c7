namespace HemoRheo.Tests.FlowLaws;

/// <summary>Stresses and slopes against numbers of 15 digits computed with mpmath (tests/ReferenceData/flow-laws).</summary>
public class CheckPointTests
{
    private static readonly IReadOnlyList<IReadOnlyDictionary<string, string>> Points = ReferenceTable.Read("flow-laws", "check-points.mpmath.csv");
    private static readonly IReadOnlyList<IReadOnlyDictionary<string, string>> Gradients = ReferenceTable.Read("flow-laws", "gradients.mpmath.csv");

    [Fact]
    public void Stress_and_viscosity_agree_at_every_check_point()
    {
        Assert.Equal(162, Points.Count);
        foreach (var row in Points)
        {
            var law = PublishedSets.Law(row["law"]);
            var rate = ShearRate.FromReciprocalSeconds(row.Number("shear_rate_1_s"));
            var stress = law.Stress(rate, PublishedSets.Natural(row["law"], PublishedSets.Written(row["parameters"])));
            Near(row.Number("stress_Pa"), stress.Pascals, 1e-13, row["parameter_set"]);
            Near(row.Number("viscosity_Pa_s"), (stress / rate).PascalSeconds, 1e-13, row["parameter_set"]);
        }
    }

    [Fact]
    public void Slopes_agree_at_every_check_point()
    {
        Assert.Equal(230, Gradients.Count);
        var sets = Points.GroupBy(row => (row["law"], row["parameter_set"])).ToDictionary(rows => rows.Key, rows => PublishedSets.Written(rows.First()["parameters"]));
        foreach (var row in Gradients)
        {
            var law = PublishedSets.Law(row["law"]);
            var written = sets[(row["law"], row["parameter_set"])];
            var natural = PublishedSets.Natural(row["law"], written);
            var (rate, by, expected) = (row.Number("shear_rate_1_s"), row["with_respect_to"], row.Number("d_stress_d_parameter"));
            if (by == "shear_rate") Near(expected, ByRate(law, rate, natural), 1e-9, row["parameter_set"]);
            else Close(expected, Dot(NaturalSlopes(law, rate, natural), PublishedSets.Chain(row["law"], written, by)), 1e-12, $"{row["parameter_set"]} {by}");
        }
    }

    /// <summary>The library's slopes are by scaled parameters: divided by d natural / d scaled, which is 1 where there is no bound, p for a logarithm and r (1 - r) for a logit.</summary>
    private static double[] NaturalSlopes(FlowLaw law, double rate, double[] natural)
    {
        var slopes = new double[natural.Length];
        law.StressAt(rate, law.ToScaled(natural), slopes);
        for (var k = 0; k < slopes.Length; k++)
        {
            var parameter = law.Parameters[k];
            slopes[k] /= double.IsInfinity(parameter.Lower) ? 1 : double.IsInfinity(parameter.Upper) ? natural[k] : natural[k] * (1 - natural[k]);
        }

        return slopes;
    }

    /// <summary>Central difference, once extrapolated.</summary>
    private static double ByRate(FlowLaw law, double rate, double[] natural)
    {
        double Difference(double h) => (law.Stress(ShearRate.FromReciprocalSeconds(rate + h), natural).Pascals - law.Stress(ShearRate.FromReciprocalSeconds(rate - h), natural).Pascals) / (2 * h);
        return (4 * Difference(5e-4 * rate) - Difference(1e-3 * rate)) / 3;
    }

    private static double Dot(double[] x, double[] y) => x.Zip(y, (a, b) => a * b).Sum();

    /// <summary>Slope by the flow index at 1 1/s is log 1 = 0.</summary>
    private static void Close(double expected, double found, double relative, string what)
    {
        if (expected == 0) Assert.Equal(0, found, 1e-17);
        else Near(expected, found, relative, what);
    }

    private static void Near(double expected, double found, double relative, string what) =>
        Assert.True(Math.Abs(found - expected) <= relative * Math.Abs(expected), $"{what}: {found:R}, expected {expected:R}");
}
