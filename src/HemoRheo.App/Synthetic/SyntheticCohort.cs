namespace HemoRheo.App.Synthetic;

/// <summary>Makes the synthetic cohort from a seed: no clock, no culture, nothing of the machine.</summary>
internal static class SyntheticCohort
{
    /// <summary>Seed of the cohort in the repository.</summary>
    public const long RepositorySeed = 1;

    /// <summary>All files of the cohort, in path order.</summary>
    public static IReadOnlyList<SyntheticFile> Files(long seed)
    {
        var samples = CohortPlan.Samples(seed);
        var truth = Truth(seed, samples);
        var instrument = new TrueInstrument(seed);
        var bench = new Bench(seed, instrument);
        var files = new List<SyntheticFile>
        {
            new("README.md", CohortReadme.Of(seed)),
            new("study.toml", CohortStudyFile.Of(seed)),
            new("people.csv", CohortTables.People(samples)),
            new("samples.csv", new CohortTables(seed, instrument).Samples(samples, truth)),
            new("truth/effects.csv", TruthTables.Effects(samples, truth)),
            new("truth/faults.csv", TruthTables.Faults(samples)),
            new("truth/instrument.csv", TruthTables.Instrument(samples, instrument)),
            new("truth/parameters.csv", TruthTables.Parameters(samples, truth)),
            new("truth/viscosities.csv", TruthTables.Viscosities(samples, truth)),
        };
        files.AddRange(Enumerable.Range(1, CohortPlan.Weeks).Select(week => new SyntheticFile(
            $"checks/blocks-{Written.Day(CohortPlan.CheckAt(week))}-check.txt", BlocksExport.Of([bench.Check(week)]))));
        files.AddRange(Exports(samples, sample => sample.StartedAt.Select((_, i) => bench.Measure(sample, truth[sample.Sample], i + 1))));
        return [.. files.OrderBy(file => file.Path, StringComparer.Ordinal)];
    }

    private static Dictionary<string, TrueBlood> Truth(long seed, IReadOnlyList<PlannedSample> samples)
    {
        var atFirst = samples.Where(sample => sample.Visit == 1)
            .ToDictionary(sample => sample.Person, sample => TruePopulation.Draw(RandomStream.Of(seed, $"person {sample.Person}", 1), sample.Man, sample.Second));
        return samples.ToDictionary(
            sample => sample.Sample,
            sample => sample.Visit == 1 ? atFirst[sample.Person] : TruePopulation.Later(atFirst[sample.Person], RandomStream.Of(seed, $"person {sample.Person}", sample.Visit)));
    }

    private static IEnumerable<SyntheticFile> Exports(IReadOnlyList<PlannedSample> samples, Func<PlannedSample, IEnumerable<SimulatedRecording>> measured)
    {
        foreach (var day in samples.Where(sample => sample.Rows).GroupBy(sample => Written.Day(sample.StartedAt[0])))
        {
            yield return new($"exports/rows-{day.Key}.csv", RowsExport.Of(day.SelectMany(measured)));
        }
        foreach (var sample in samples.Where(sample => !sample.Rows))
        {
            var text = BlocksExport.Of(measured(sample));
            yield return new($"exports/blocks-{Written.Day(sample.StartedAt[0])}-{sample.Sample}.txt", sample.Fault == PlantedFault.FileCut ? Cut(text) : text);
        }
    }

    // Ends in the middle of a number, in the middle of the second block.
    private static string Cut(string text)
    {
        var end = text.Length - text.Length / 4;
        while (text[end] != '.') end--;
        return text[..(end + 2)];
    }
}
