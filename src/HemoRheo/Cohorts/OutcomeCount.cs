namespace HemoRheo;

/// <summary>How many verdicts of each kind a group has for one range, counted in samples.</summary>
/// <param name="Label">Label of the group.</param>
/// <param name="Measurand">The measurand.</param>
/// <param name="Basis">The hematocrit it speaks of.</param>
/// <param name="Below">Below.</param>
/// <param name="Within">Within.</param>
/// <param name="Above">Above.</param>
/// <param name="Undecided">Undecided.</param>
/// <param name="NotJudged">Not judged.</param>
/// <param name="Marked">Judged but marked, because the instrument was not in order; not among the others.</param>
public sealed record OutcomeCount(string Label, Measurand Measurand, HematocritBasis Basis, int Below, int Within, int Above, int Undecided, int NotJudged, int Marked)
{
    /// <summary>All samples of the group: each stands under exactly one of the counts.</summary>
    public int Samples => Below + Within + Above + Undecided + NotJudged + Marked;
}
