namespace HemoRheo;

/// <summary>What an interval says.</summary>
public enum IntervalKind
{
    /// <summary>It has a lower and an upper limit.</summary>
    Closed,

    /// <summary>An upper limit alone: the lower end of the quantity's range is not excluded.</summary>
    AtMost,

    /// <summary>A lower limit alone: the upper end of the quantity's range is not excluded.</summary>
    AtLeast,

    /// <summary>Neither side closes: these shear rates say nothing of the quantity.</summary>
    NotIdentifiable,

    /// <summary>The method has no answer here; the interval says why.</summary>
    NoAnswer,
}
