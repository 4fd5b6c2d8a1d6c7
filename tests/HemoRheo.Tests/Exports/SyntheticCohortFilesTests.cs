namespace HemoRheo.Tests.Exports;

/// <summary>The synthetic cohort, whose README says what was made: 84 samples, half of them loaded twice, five checks, one file cut in the middle.</summary>
public sealed class SyntheticCohortFilesTests
{
    [Fact]
    public void All_of_it_is_read_and_the_one_cut_file_is_told()
    {
        var readings = Study.Open(Path.Combine(Repository.Root, "synthetic-cohort", "study.toml")).ReadExports();

        var cut = Assert.Single(readings.Findings);
        Assert.Equal((ExportFindings.FileCut, "exports/blocks-2025-04-08-S-0071.txt"), (cut.Kind, cut.Where.File));
        Assert.Equal((84, 80, 5), (readings.Samples.Count, readings.People.Count, readings.Checks.Select(check => check.Sample).Distinct().Count()));
        Assert.Equal(84, readings.Blood.Select(recording => recording.Sample).Distinct().Count());
        Assert.Equal("S-0071", Assert.Single(readings.Blood, recording => recording.HasFault).Sample);
        Assert.All(readings.Blood.Where(recording => !recording.HasFault), recording => Assert.Equal(26, recording.Readings.Count));
    }
}
