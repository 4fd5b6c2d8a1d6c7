namespace HemoRheo;

/// <summary>How far laws that a study's curves cannot part lie from each other at the standard rates.</summary>
internal static class LawSpreads
{
    /// <summary>One spread a law that is not parted and a standard rate, over the samples that have a value by each of these laws inside the kept rates.</summary>
    public static IEnumerable<LawSpread> Of(Study study, PooledComparison comparison, IEnumerable<SampleValue[]> samples)
    {
        if (comparison.NotParted.Count == 0) yield break;
        foreach (var measurand in study.Analysis.StandardRates.Select(Measurand.Viscosity))
        {
            var values = samples.Select(native => comparison.NotParted.Select(law => native.FirstOrDefault(value => value.Law == law && value.Measurand == measurand && value.Findings.All(finding => finding.Kind != SampleFindings.Extrapolated))?.Value.X).OfType<double>().ToArray())
                .Where(laws => laws.Length == comparison.NotParted.Count).ToArray();
            if (values.Length == 0) continue;
            double[] means = [.. Enumerable.Range(0, comparison.NotParted.Count).Select(law => values.Average(laws => laws[law]))];
            var (middle, size) = ((means.Max() + means.Min()) / 2, (means.Max() - means.Min()) / 2 / Math.Sqrt(3));
            for (var law = 0; law < means.Length; law++) yield return new(comparison.NotParted[law], measurand, means[law] > middle ? -size : size, values.Length);
        }
    }

    /// <summary>Native values with the part of their law.</summary>
    public static SampleValue[] Added(IReadOnlyCollection<LawSpread> spreads, SampleValue[] native) => [.. native.Select(value =>
        spreads.FirstOrDefault(spread => spread.Law == value.Law && spread.Measurand == value.Measurand) is { } spread ? value with { Value = value.Value.With(spread.Part) } : value)];
}
