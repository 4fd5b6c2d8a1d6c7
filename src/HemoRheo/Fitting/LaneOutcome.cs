namespace HemoRheo;

/// <summary>What became of a curve in its lane.</summary>
/// <param name="solution">Its numbers.</param>
/// <param name="atWall">Whether a parameter ran to its bound.</param>
/// <param name="good">Whether the numbers stand as they are.</param>
internal sealed class LaneOutcome(CurveSolution solution, bool atWall, bool good)
{
    /// <summary>Its numbers.</summary>
    public CurveSolution Solution { get; } = solution;

    /// <summary>Whether a parameter ran to its bound.</summary>
    public bool AtWall { get; } = atWall;

    /// <summary>Whether the numbers stand as they are.</summary>
    public bool Good { get; } = good;
}
