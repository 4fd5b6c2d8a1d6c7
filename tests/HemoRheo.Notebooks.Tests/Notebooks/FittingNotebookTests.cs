namespace HemoRheo.Notebooks.Tests;

[Collection(OneKernelAtATime.Name)]
public sealed class FittingNotebookTests(FittingNotebook notebook) : KeptNotebookTests(notebook), IClassFixture<FittingNotebook>
{
    [Fact]
    public void Rates_that_reach_low_contradict_a_yield_stress()
    {
        Assert.Contains("shear-thinning, no sign of a yield stress at these rates", Showing("curve.FlowBehavior", "text/html"), StringComparison.Ordinal);
        Assert.Contains("Contradicted: Newtonian", Showing("// the whole curve", "text/html"), StringComparison.Ordinal);
    }

    [Fact]
    public void Rates_that_do_not_reach_low_cannot_tell_the_laws_apart_and_leave_the_yield_stress_open()
    {
        Assert.Contains("These data cannot tell Casson and Quemada apart", Showing("// the same blood from 10 1/s up", "text/html"), StringComparison.Ordinal);
        Assert.Contains("at most", Showing("high.Interval(\"ratio\")", "text/html"), StringComparison.Ordinal);
        Assert.Contains("yield stress not decided by these rates", Showing("upper.FlowBehavior", "text/html"), StringComparison.Ordinal);
    }

    [Fact]
    public void A_law_of_ones_own_is_compared_with_the_built_in_ones() => Assert.Contains("Sisko</td>", Showing("FlowLaw.Custom", "text/html"), StringComparison.Ordinal);
}
