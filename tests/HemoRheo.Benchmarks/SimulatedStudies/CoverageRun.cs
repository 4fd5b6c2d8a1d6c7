namespace HemoRheo.Benchmarks;

/// <summary>Writes, reads and analyzes simulated studies through the public API and counts how often intervals held the truth.</summary>
internal static class CoverageRun
{
    /// <summary>Runs studies number 0 to <paramref name="studies"/> - 1.</summary>
    public static CoverageCounts Run(int studies)
    {
        var counts = new CoverageCounts();
        for (var number = 0; number < studies; number++)
        {
            var folder = Directory.CreateTempSubdirectory("hemorheo-simulated-").FullName;
            try
            {
                var simulated = SimulatedStudy.Draw(number);
                var study = Study.Open(SimulatedFolder.Write(simulated, folder));
                counts.Add(simulated, study.Evaluate(study.ReadExports()));
            }
            finally
            {
                Directory.Delete(folder, true);
            }
        }

        return counts;
    }
}
