namespace HemoRheo;

/// <summary>The flow-behavior class of a curve, asked as a sentence: <c>curve.FlowBehavior(errors)</c>.</summary>
public static class FlowClassifying
{
    /// <summary>Slope of log stress over log rate at the lower rates above which stress still falls steadily, by choice: with half of the lowest stress a yield stress, Casson's law has a slope of 0.3 there.</summary>
    private const double SteadyFall = 0.5;

    /// <summary>
    /// The class of a curve by intervals: shear-thinning or shear-thickening where the interval of the slope of log stress over log rate lies on one side of 1 and no half of the rates contradicts it;
    /// Newtonian only where the slopes of both halves are shown to be near 1 (two one-sided tests); else undecided.
    /// </summary>
    /// <param name="curve">The curve; its kept points are used.</param>
    /// <param name="errors">The error model; null for <see cref="ErrorModel.Default"/>. Normal quantiles where its sizes are known, Student's t where they are known up to a scale.</param>
    /// <param name="newtonianWithin">Largest relative change of viscosity a decade of shear rate that is still called none. 0.05 by choice: a tenth over the two decades in which plasma is usually measured.</param>
    /// <param name="level">Coverage of the intervals, and the probability at which each half is shown to be near 1.</param>
    /// <returns>The answer. Curves that cannot be fitted are undecided and say so.</returns>
    /// <exception cref="ArgumentOutOfRangeException">The margin is not above zero, or the level not between 0.5 and 1.</exception>
    /// <remarks>
    /// A yield stress is present only if a law with one describes the curve, laws of no more freedom without one are clearly worse (also one whose viscosity levels off below a tenth of the lowest rate),
    /// and at least half of the stress at the lowest rate is yield stress. Readings of one ramp that are correlated make every interval too narrow.
    /// Sources: Schuirmann 1987, Journal of Pharmacokinetics and Biopharmaceutics 15:657-680 (two one-sided tests); Barnes and Walters 1985, Rheologica Acta 24:323-326 (what a yield stress from a curve is).
    /// </remarks>
    public static FlowBehavior FlowBehavior(this FlowCurve curve, ErrorModel? errors = null, double newtonianWithin = 0.05, double level = 0.95)
    {
        ArgumentNullException.ThrowIfNull(curve);
        if (!(newtonianWithin > 0 && double.IsFinite(newtonianWithin))) throw new ArgumentOutOfRangeException(nameof(newtonianWithin), newtonianWithin, "The margin within which a liquid is called Newtonian is above zero, e.g. 0.05 for 5 % a decade of shear rate.");
        if (!(level > 0.5 && level < 1)) throw new ArgumentOutOfRangeException(nameof(level), level, "A level lies between 0.5 and 1, e.g. 0.95.");
        var model = errors ?? ErrorModel.Default;
        var slopes = new FlowSlopes(curve, model, newtonianWithin, level);
        var (flowClass, evidence) = slopes.Judge();
        var (answer, why) = flowClass switch
        {
            FlowClass.Newtonian => (YieldStressAnswer.NoSign, []),
            FlowClass.ShearThinning => YieldStressEvidence.Judge(curve, model),
            _ => (YieldStressAnswer.Undecided, ["A yield stress is asked only of a curve that thins."]),
        };
        if (flowClass == FlowClass.ShearThinning && answer == YieldStressAnswer.NoSign && !(slopes.OfLow?.Lower > SteadyFall))
        {
            (answer, why) = (YieldStressAnswer.Undecided, ["At the lowest rates the stress falls too slowly to leave out a yield stress, whatever the laws compared say."]);
        }

        return new(flowClass, answer, slopes.Rates, slopes.OfWhole, slopes.OfLow, slopes.OfHigh, evidence.Concat(why).ToItems());
    }
}
