using HemoRheo.Benchmarks;

namespace HemoRheo.Tests.Samples;

/// <summary>
/// 200 simulated studies of ten samples, five loaded twice, written, read and analyzed through the public API. The benchmarks run 1,000.
/// Limits: the coverage asked for, widened by three standard errors of a share over the studies.
/// </summary>
public sealed class CoverageTests(CoverageTests.Studies studies) : IClassFixture<CoverageTests.Studies>
{
    private const int Number = 200;

    private static readonly double Error = Math.Sqrt(0.95 * 0.05 / Number);

    public sealed class Studies
    {
        internal CoverageCounts Counts { get; } = CoverageRun.Run(Number);
    }

    [Fact]
    public void Intervals_hold_the_truth_as_often_as_they_say()
    {
        Assert.Equal(20, studies.Counts.Quantities.Count());
        Assert.All(studies.Counts.Quantities, quantity =>
            Assert.InRange(studies.Counts.Share(quantity, "whole budget"), 0.93 - 3 * Error, (quantity.StartsWith("ratio", StringComparison.Ordinal) ? 0.995 : 0.98) + 3 * Error));
    }

    [Fact]
    public void Without_the_loading_part_coverage_falls()
    {
        foreach (var rate in SimulatedStudy.StandardRates) Assert.InRange(studies.Counts.Share($"two samples, native at {rate}", "no loading"), 0, 0.85);
    }

    [Fact]
    public void Without_the_shared_parts_the_mean_of_all_falls()
    {
        foreach (var rate in SimulatedStudy.StandardRates)
        {
            Assert.InRange(studies.Counts.Share($"mean of all, standard at {rate}", "no shared part"), 0, 0.88);
        }
    }

    [Fact]
    public void Verdicts_with_the_truth_at_the_limit_are_wrong_no_more_often_than_the_level_implies()
    {
        var (wrong, of) = studies.Counts.Verdicts;
        Assert.Equal(Number * 10 * 6 * 4, of);

        // The ten samples of a study share parts, so the study is the unit of the standard error.
        Assert.InRange((double)wrong / of, 0, 0.05 + 3 * Error);
    }
}
