namespace HemoRheo;

/// <summary>Which input files feed which sample.</summary>
internal static class RunFeeds
{
    /// <summary>By sample: its export files, then the tables its row and its person's row stand in.</summary>
    internal static IEnumerable<NamedText> Of(AnalyzedStudy analyzed)
    {
        var people = analyzed.Readings.People.DistinctBy(person => person.Id).ToDictionary(person => person.Id, person => person.Where.File);
        foreach (var sample in analyzed.Samples)
        {
            var exports = sample.Loadings.Select(loading => loading.Recording.Where.File);
            var tables = new[] { sample.Record?.Where.File, sample.Record is null ? null : people.GetValueOrDefault(sample.Record.Person) };
            foreach (var path in exports.Concat(tables).OfType<string>().Distinct()) yield return new(sample.Sample, path);
        }
    }
}
