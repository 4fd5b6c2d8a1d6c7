namespace HemoRheo.Tests.Fitting;

/// <summary>Joint fits against SciPy: weights at the fitted stress, at their fixed point.</summary>
public class JointFitsAgainstSciPyTests
{
    public static TheoryData<string> Cases => ["loadings", "series", "dilution"];

    [Theory]
    [MemberData(nameof(Cases))]
    public void A_joint_fit_has_the_reference_numbers(string name)
    {
        var fit = Fitted(name, known: true);

        Assert.True(fit.Usable, fit.ToString());
        Near(name, "scaled", fit.Scaled, 1e-9);
        Near(name, "covariance", fit.Covariance, 1e-7);
        Near(name, "residual", [.. fit.Residuals.SelectMany(one => one)], 1e-7);
        Near(name, "chi_square", [fit.Fit.ChiSquare], 1e-9);
        Near(name, "probability", [fit.Fit.Probability!.Value], 1e-7);
        var shared = fit.Compatibility!;
        Near(name, "rise", [shared.Rise], 1e-7);
        Near(name, "rise_df", [shared.DegreesOfFreedom], 0);
        Near(name, "rise_probability", [shared.Probability], 1e-7);
        Assert.Null(shared.F);
    }

    [Theory]
    [MemberData(nameof(Cases))]
    public void Standard_errors_on_the_natural_scale_are_those_of_the_reference(string name)
    {
        var fit = Fitted(name, known: true);
        var covariance = JointCases.Expected(name, "covariance");
        for (var k = 0; k < fit.Parameters.Count; k++)
        {
            var (number, error) = (fit.Parameters[k].Number, Math.Sqrt(covariance[k * fit.Parameters.Count + k]));
            var (x, upper) = (number.Estimate, number.Parameter.Upper);
            Assert.Equal(1, number.StandardError!.Value / (error * (double.IsInfinity(upper) ? x : x * (upper - x) / upper)), 1e-6);
        }
    }

    [Theory]
    [MemberData(nameof(Cases))]
    public void With_sizes_up_to_scale_the_scale_multiplies_the_covariance_and_the_test_is_F(string name)
    {
        var fit = Fitted(name, known: false);
        var scale = JointCases.Expected(name, "chi_square")[0] / fit.Fit.DegreesOfFreedom;
        Near(name, "scaled", fit.Scaled, 1e-9);
        Near(name, "covariance", [.. fit.Covariance.Select(x => x / scale)], 1e-7);
        Assert.Null(fit.Fit.Probability);
        Near(name, "F", [fit.Compatibility!.F!.Value], 1e-7);
        Near(name, "F_df", [fit.Compatibility.ScaleDegreesOfFreedom!.Value], 0);
        Near(name, "F_probability", [fit.Compatibility.Probability], 1e-7);
    }

    private static JointFit Fitted(string name, bool known)
    {
        var (curves, errors) = (JointCases.Curves(name), JointCases.Errors(name, known));
        return name switch
        {
            "loadings" => curves.FitLoadings(FlowLaw.Casson, errors).Joint,
            "series" => curves.FitTogether([.. curves.Select(_ => FlowLaw.Quemada)], ["critical rate"], errors),
            _ => curves.FitDilution(JointCases.Hematocrits(name), errors[0]),
        };
    }

    private static void Near(string name, string quantity, IReadOnlyList<double> found, double relative)
    {
        var expected = JointCases.Expected(name, quantity);
        Assert.Equal(expected.Length, found.Count);
        var size = expected.Max(Math.Abs);
        for (var i = 0; i < expected.Length; i++)
        {
            Assert.True(Math.Abs(found[i] - expected[i]) <= relative * size, $"{quantity} {i}: {found[i]:R}, SciPy {expected[i]:R}");
        }
    }
}
