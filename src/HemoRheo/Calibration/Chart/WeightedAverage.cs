namespace HemoRheo;

/// <summary>The exponentially weighted average of standardized checks, begun at the center, with limits that grow to their final width.</summary>
/// <remarks>Source: Montgomery, Introduction to Statistical Quality Control, chapter 9; Lucas and Saccucci 1990, Technometrics 32:1-12 (designs by run length).</remarks>
internal static class WeightedAverage
{
    /// <summary>The average after one more check.</summary>
    internal static double Next(double average, double check, double weight) => weight * check + (1 - weight) * average;

    /// <summary>Half the width of the limits after so many checks: width sqrt(weight / (2 - weight) (1 - (1 - weight)^(2 checks))).</summary>
    internal static double Reach(int checks, double weight, double width) => width * Math.Sqrt(weight / (2 - weight) * (1 - Math.Pow(1 - weight, 2.0 * checks)));
}
