namespace HemoRheo;

/// <summary>Why a fit stopped.</summary>
public enum StopReason
{
    /// <summary>The step became smaller than the tolerance.</summary>
    SmallStep,

    /// <summary>The sum of squares stopped falling.</summary>
    SmallDecrease,

    /// <summary>The gradient vanished.</summary>
    SmallGradient,

    /// <summary>The largest number of iterations was reached.</summary>
    IterationLimit,

    /// <summary>The equations had no unique solution.</summary>
    Singular,

    /// <summary>The data cannot be fitted: too few points, or not finite.</summary>
    BadData,
}
