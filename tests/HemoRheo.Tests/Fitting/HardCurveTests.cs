namespace HemoRheo.Tests.Fitting;

/// <summary>A thousand of the benchmark's hard curves, the nine laws in turn: each ends with a reason, and no usable fit holds what is not a number.</summary>
public class HardCurveTests
{
    [Fact]
    public void A_thousand_hard_curves_end_with_a_reason()
    {
        var faults = new List<string>();
        var usable = 0;
        for (var number = 0; number < 1000; number++)
        {
            var law = FlowLaw.All[number % FlowLaw.All.Count];
            var fit = HardCurves.Of(number).Fit(law, WeightedFits.Errors);
            if (fit.Usable) usable++;
            if (HardCurves.Fault(fit) is { } fault) faults.Add($"{number} {law.Name}: {fault}");
        }

        Assert.Empty(faults);
        Assert.InRange(usable, 300, 900);
    }

    /// <summary>Four of a million: Cross's law ran to an exponent of hundreds, where its covariance overflows.</summary>
    [Theory]
    [InlineData(274219)]
    [InlineData(333475)]
    [InlineData(417967)]
    [InlineData(858346)]
    public void A_fit_whose_covariance_overflows_says_so(int number)
    {
        var fit = HardCurves.Of(number).Fit(FlowLaw.Cross, WeightedFits.Errors);
        Assert.False(fit.Usable);
        Assert.Contains(fit.Findings, finding => finding.Code == "not-identifiable");
    }
}
