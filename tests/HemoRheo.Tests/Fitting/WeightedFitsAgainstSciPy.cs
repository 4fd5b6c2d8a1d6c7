namespace HemoRheo.Tests.Fitting;

/// <summary>Every curve of the weighted fits against SciPy: weights at the fitted stress, at their fixed point.</summary>
public class WeightedFitsAgainstSciPy
{
    public static TheoryData<string, string> Cases()
    {
        var cases = new TheoryData<string, string>();
        foreach (var (curve, law) in WeightedFits.Expected.Select(group => (group.Key.Curve, group.Key.Law)).Distinct()) cases.Add(curve, law);
        return cases;
    }

    [Theory]
    [MemberData(nameof(Cases))]
    public void A_fit_has_the_reference_numbers(string curve, string law)
    {
        var fit = WeightedFits.Curves[curve].Fit(FlowLaw.Named(law), WeightedFits.Errors);

        Assert.True(fit.Usable, fit.ToString());
        Near(curve, law, "scaled", fit.Scaled, 1e-9);
        Near(curve, law, "covariance", fit.Covariance, 1e-7);
        Near(curve, law, "response", fit.StressResponse, 1e-7);
        Near(curve, law, "residual", fit.Residuals, 1e-7);
        Near(curve, law, "chi_square", [fit.Fit.ChiSquare], 1e-9);
        Near(curve, law, "probability", [fit.Fit.Probability!.Value], 1e-7);
    }

    private static void Near(string curve, string law, string quantity, IReadOnlyList<double> found, double relative)
    {
        var expected = WeightedFits.Expected[(curve, law, quantity)].ToArray();
        Assert.Equal(expected.Length, found.Count);
        var size = expected.Max(Math.Abs);
        for (var i = 0; i < expected.Length; i++)
        {
            Assert.True(Math.Abs(found[i] - expected[i]) <= relative * size, $"{quantity} {i}: {found[i]:R}, SciPy {expected[i]:R}");
        }
    }
}
