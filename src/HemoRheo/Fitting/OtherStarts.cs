namespace HemoRheo;

/// <summary>A curve solved from starts beside its own, four at a time.</summary>
internal static class OtherStarts
{
    private static readonly double[] Away = [-1.5, 1.5];

    private static readonly double[] NearAndFar = [-3, -1.5, -0.7, 0.7, 1.5, 3];

    /// <summary>Relative difference of two distances that is none.</summary>
    public const double SameDistance = 1e-6;

    private const double SameEstimate = 1e-4;

    /// <summary>Every minimum that another start reaches, inside the bounds or at one.</summary>
    /// <param name="law">The law.</param>
    /// <param name="curve">The curve.</param>
    /// <param name="start">Its own start: the others lie away from it, one parameter at a time.</param>
    public static IEnumerable<CurveSolution> Reached(FlowLaw law, CurveData curve, double[] start)
    {
        foreach (var group in Beside(start, law.MayHaveManyMinima ? NearAndFar : Away).Chunk(Lane.Count))
        {
            foreach (var outcome in Outcomes(law, curve, group))
            {
                if (outcome.Good) yield return outcome.Solution;
                else if (outcome.AtWall && Rescue.AtBoundary(law, curve, outcome.Solution.Scaled) is { End.Converged: true } bound) yield return bound;
            }
        }
    }

    /// <summary>Where starts end; none for a user's law that throws on the way, since its own start did not.</summary>
    private static LaneOutcome[] Outcomes(FlowLaw law, CurveData curve, double[][] starts)
    {
        try
        {
            return LaneGroup.Outcomes(law, [.. starts.Select(_ => curve)], starts);
        }
        catch (Exception) when (law.MayHaveManyMinima)
        {
            return [];
        }
    }

    /// <summary>The minimum nearest to the readings, the first of equal ones, beside the next that differs from it; null where there is no minimum.</summary>
    public static CurveSolution? Nearest(FlowLaw law, CurveData curve, IReadOnlyList<CurveSolution> minima)
    {
        double[] distances = [.. minima.Select(minimum => Distance(law, curve, minimum))];
        if (distances.Length == 0) return null;
        var smallest = distances.Min();
        var first = Array.FindIndex(distances, distance => IsSame(distance, smallest));
        var (given, own) = (minima[first], distances[first]);
        foreach (var i in Enumerable.Range(0, distances.Length).OrderBy(i => distances[i]))
        {
            var equal = IsSame(distances[i], smallest);
            if (!equal || !SameEstimates(given, minima[i])) return given.Beside(new(distances[i], own, equal));
        }

        return given;
    }

    private static bool IsSame(double distance, double smallest) => distance == smallest || distance - smallest <= SameDistance * (1 + smallest);

    /// <summary>Sum of squares, its variances between reading and law, infinite where it overflows; see <see cref="OtherMinimum"/>.</summary>
    public static double Distance(FlowLaw law, CurveData curve, CurveSolution solution)
    {
        var slopes = new double[solution.Scaled.Length];
        double sum = 0;
        for (var i = 0; i < curve.Rates.Length; i++)
        {
            var stress = law.StressAt(curve.Rates[i], solution.Scaled, slopes);
            var residual = curve.Stresses[i] - stress;
            sum += residual * residual / curve.VarianceOf(i, Math.Sqrt(curve.Stresses[i]) * Math.Sqrt(stress));
        }

        return double.IsNaN(sum) ? double.PositiveInfinity : sum;
    }

    private static bool SameEstimates(CurveSolution one, CurveSolution other)
    {
        for (var k = 0; k < one.Scaled.Length; k++)
        {
            var error = Math.Sqrt(one.Inverse[k * one.Scaled.Length + k]);
            if (!(Math.Abs(one.Scaled[k] - other.Scaled[k]) <= SameEstimate + 0.01 * error) && one.Scaled[k] != other.Scaled[k]) return false;
        }

        return true;
    }

    private static IEnumerable<double[]> Beside(double[] start, double[] shifts)
    {
        for (var k = 0; k < start.Length; k++)
        {
            foreach (var shift in shifts)
            {
                var other = start.ToArray();
                other[k] += shift;
                yield return other;
            }
        }
    }
}
