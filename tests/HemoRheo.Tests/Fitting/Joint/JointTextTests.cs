namespace HemoRheo.Tests.Fitting;

/// <summary>Joint fits as text and tables, and what their values carry.</summary>
public class JointTextTests
{
    [Fact]
    public void The_text_form_fits_100_columns_and_says_whose_each_number_is()
    {
        foreach (var text in Texts())
        {
            Assert.All(text.Split('\n'), line => Assert.True(line.Length <= 100, line));
            Assert.Contains("sharing not contradicted: chi-square rises by", text, StringComparison.Ordinal);
        }

        Assert.Contains("loading factor", Texts().First(), StringComparison.Ordinal);
        Assert.Contains("S-1, loading 3", Texts().First(), StringComparison.Ordinal);
    }

    [Fact]
    public void The_table_shows_units_of_the_trade()
    {
        var table = JointCases.Curves("loadings").FitLoadings(FlowLaw.Casson, JointCases.Errors("loadings")).ToTable();
        Assert.Equal(5, table.Rows.Count);
        Assert.Equal(["yield stress", "all", "mPa"], ((int[])[0, 1, 4]).Select(column => table.Rows[0][column].Shown));
        Assert.Equal(1e3 * Math.Exp(JointCases.Expected("loadings", "scaled")[0]), table.Rows[0][2].Number!.Value, 1e-6);
        Assert.NotEmpty(table.Dictionary().Rows);
    }

    [Fact]
    public void Curves_that_are_labelled_alike_are_told_apart_by_their_numbers()
    {
        var curve = Simulated.Exact(FlowLaw.Casson, 0.005, 0.0034);
        var table = new[] { curve, curve }.FitTogether(FlowLaw.Casson, ["yield stress"], WeightedFits.Errors).ToTable();
        Assert.Equal(["all", "curve 0", "curve 1"], table.Rows.Select(row => row[1].Shown));
    }

    /// <summary>Two curves of a joint fit share the critical rate: its part in their difference is smaller than their parts apart would make it.</summary>
    [Fact]
    public void What_curves_share_is_one_source_in_all_of_their_values()
    {
        var fit = JointCases.Curves("series").FitTogether([.. Enumerable.Repeat(FlowLaw.Quemada, 4)], ["critical rate"], JointCases.Errors("series"));
        var at = ShearRate.FromReciprocalSeconds(10);
        var (a, b) = (fit.ApparentViscosity(0, at).Value, fit.ApparentViscosity(1, at).Value);
        var shared = a.Parts.Select(part => part.Source).Intersect(b.Parts.Select(part => part.Source)).ToArray();
        Assert.NotEmpty(shared);

        var (gradientA, gradientB) = (Gradient(fit, 0, 10), Gradient(fit, 1, 10));
        var size = gradientA.Length;
        double Product(double[] x, double[] y) => Enumerable.Range(0, size * size).Sum(i => x[i / size] * fit.Covariance[i] * y[i % size]);
        var (varianceA, covariance) = (Product(gradientA, gradientA), Product(gradientA, gradientB));
        Assert.Equal(1, a.Variance / varianceA, 1e-6);
        Assert.Equal(1, (a - b).Variance / (varianceA + Product(gradientB, gradientB) - 2 * covariance), 1e-5);
        Assert.NotEqual(0, covariance);
    }

    /// <summary>Slopes of the log viscosity by differences on the fitting scale.</summary>
    private static double[] Gradient(JointFit fit, int curve, double rate)
    {
        const double h = 1e-5;
        int[] places = [1 + 2 * curve, 0, 2 + 2 * curve];
        var gradient = new double[fit.Scaled.Count];
        for (var k = 0; k < places.Length; k++)
        {
            double LogStress(double shift)
            {
                double[] scaled = [.. places.Select((place, j) => fit.Scaled[place] + (j == k ? shift : 0))];
                return Math.Log(FlowLaw.Quemada.Stress(ShearRate.FromReciprocalSeconds(rate), Math.Exp(scaled[0]), Math.Exp(scaled[1]), 1 / (1 + Math.Exp(-scaled[2]))).Pascals);
            }

            gradient[places[k]] = (LogStress(h) - LogStress(-h)) / (2 * h);
        }

        return gradient;
    }

    private static IEnumerable<string> Texts()
    {
        yield return JointCases.Curves("loadings").FitLoadings(FlowLaw.Casson, JointCases.Errors("loadings")).ToString();
        yield return JointCases.Curves("dilution").FitDilution(JointCases.Hematocrits("dilution"), JointCases.Errors("dilution")[0]).ToString();
    }
}
