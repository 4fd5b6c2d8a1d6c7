namespace HemoRheo;

/// <summary>What became of a curve in its lane.</summary>
/// <param name="Solution">Its numbers.</param>
/// <param name="AtWall">Whether a parameter ran to its bound.</param>
/// <param name="Good">Whether the numbers stand as they are.</param>
internal readonly record struct LaneOutcome(CurveSolution Solution, bool AtWall, bool Good);
