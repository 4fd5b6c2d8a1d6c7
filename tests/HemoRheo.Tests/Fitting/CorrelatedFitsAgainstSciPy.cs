using System.Globalization;

namespace HemoRheo.Tests.Fitting;

/// <summary>Fits of correlated readings against NumPy and SciPy: tests/ReferenceData/weighted-fits/correlated-fits.scipy.csv.</summary>
public sealed class CorrelatedFitsAgainstSciPy
{
    private static readonly ILookup<(string Curve, string Law, double Correlation, string Quantity), double> Expected =
        ReferenceTable.Read("weighted-fits", "correlated-fits.scipy.csv").ToLookup(row => ($"{row["sample"]}/{row["loading"]}", row["law"], row.Number("rho"), row["quantity"]), row => row.Number("value"));

    public static TheoryData<string, string, double> Cases()
    {
        var cases = new TheoryData<string, string, double>();
        foreach (var (curve, law, correlation) in Expected.Select(group => (group.Key.Curve, group.Key.Law, group.Key.Correlation)).Distinct()) cases.Add(curve, law, correlation);
        return cases;
    }

    [Theory]
    [MemberData(nameof(Cases))]
    public void A_fit_of_correlated_readings_has_the_reference_numbers(string curve, string law, double correlation)
    {
        var plain = WeightedFits.Curves[curve].Fit(FlowLaw.Named(law), WeightedFits.Errors);
        var fit = plain.WithCorrelation(correlation);
        IEnumerable<double> Of(string quantity) => Expected[(curve, law, correlation, quantity)];

        Near(Of("covariance"), fit.Covariance, 1e-7);
        Near(Of("expected"), [fit.Fit.Expected], 1e-8);
        Near(Of("effective_df"), [fit.Fit.EffectiveDegreesOfFreedom], 1e-8);
        Near(Of("minus_two_log"), [Likelihood.MinusTwiceLog(fit)], 1e-7);
        Assert.Equal(plain.Scaled, fit.Scaled);
        Assert.Equal(plain.StressResponse, fit.StressResponse);

        // Three cumulants against the exact distribution.
        var exact = Of("probability").Single();
        Assert.InRange(fit.Fit.Probability!.Value, 0.97 * exact - 0.004, 1.03 * exact + 0.004);
    }

    [Theory]
    [MemberData(nameof(Cases))]
    public void With_an_estimated_scale_the_residuals_are_held_against_what_correlated_readings_leave(string curve, string law, double correlation)
    {
        var fit = WeightedFits.Curves[curve].Fit(FlowLaw.Named(law), WeightedFits.Errors with { ScaleKnown = false }).WithCorrelation(correlation);
        var scale = fit.Fit.ChiSquare / Expected[(curve, law, correlation, "expected")].Single();
        Near(Expected[(curve, law, correlation, "covariance")].Select(x => x * scale), fit.Covariance, 1e-7);
        Assert.Null(fit.Fit.Probability);
        var value = fit.ApparentViscosity(10.PerSecond()).Value;
        Assert.Equal(Expected[(curve, law, correlation, "effective_df")].Single(), value.DegreesOfFreedom, 1e-6);
    }

    private static void Near(IEnumerable<double> expected, IReadOnlyList<double> found, double relative)
    {
        var numbers = expected.ToArray();
        Assert.Equal(numbers.Length, found.Count);
        var size = numbers.Max(Math.Abs);
        for (var i = 0; i < numbers.Length; i++)
        {
            Assert.True(Math.Abs(found[i] - numbers[i]) <= relative * size, string.Create(CultureInfo.InvariantCulture, $"{i}: {found[i]:R}, SciPy {numbers[i]:R}"));
        }
    }
}
