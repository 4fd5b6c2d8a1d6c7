namespace HemoRheo;

/// <summary>The flow-behavior class of a curve, with its evidence. It rests on intervals and on laws compared, never on a threshold for an estimate.</summary>
/// <param name="Class">How viscosity goes with shear rate.</param>
/// <param name="YieldStress">Whether there is a yield stress.</param>
/// <param name="Rates">Rates over which the class speaks, 1/s: those of readings that are well above the floor of the errors; null where there are too few.</param>
/// <param name="Slope">Interval of the slope of log stress over log rate (flow index of the power law) over these rates; 1 is Newtonian. Null where it cannot be had.</param>
/// <param name="SlopeAtLowRates">The same over the lower half of these readings.</param>
/// <param name="SlopeAtHighRates">The same over the upper half.</param>
/// <param name="Evidence">What the answers rest on, a sentence each.</param>
public sealed record FlowBehavior(FlowClass Class, YieldStressAnswer YieldStress, Interval? Rates, Interval? Slope, Interval? SlopeAtLowRates, Interval? SlopeAtHighRates, Items<string> Evidence)
{
    /// <summary>The answer in a few words, e.g. <c>shear-thinning, yield stress not decided by these rates</c>.</summary>
    public string Verdict => $"{ClassWords}, {YieldWords}";

    /// <inheritdoc/>
    public override string ToString() => $"{Verdict}. {string.Join(" ", Evidence)}";

    private string ClassWords => Class switch
    {
        FlowClass.Newtonian => "Newtonian",
        FlowClass.ShearThinning => "shear-thinning",
        FlowClass.ShearThickening => "shear-thickening",
        _ => "undecided",
    };

    private string YieldWords => YieldStress switch
    {
        YieldStressAnswer.Present => "with a yield stress",
        YieldStressAnswer.NoSign => "no sign of a yield stress at these rates",
        _ => "yield stress not decided by these rates",
    };
}
