namespace HemoRheo;

/// <summary>Whether a curve shows a yield stress.</summary>
public enum YieldStressAnswer
{
    /// <summary>Not decided by these rates and readings.</summary>
    Undecided,

    /// <summary>A law with a yield stress describes the curve, laws without one are clearly worse, and the low rates reach near enough.</summary>
    Present,

    /// <summary>These rates show none: the curve is Newtonian, or every law with a yield stress is clearly worse than one without and stress still falls steadily at the lowest rates. A yield stress far below the lowest stress is not excluded.</summary>
    NoSign,
}
