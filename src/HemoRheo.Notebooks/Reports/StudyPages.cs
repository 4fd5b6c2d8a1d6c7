using System.Text;

namespace HemoRheo.Notebooks;

/// <summary>Writes a study's result as pages and tables that need nothing else: no network, no script, no program but a browser and a spreadsheet.</summary>
public static class StudyPages
{
    /// <summary>
    /// Writes <c>index.html</c> (the cohort), <c>samples/*.html</c>, <c>instruments/*.html</c> with a weekly page each, <c>tables/*.csv</c> with <c>data-dictionary.csv</c>, and <c>run.json</c>.
    /// Each file is written whole or not at all. The folder as a whole is the caller's: write to a new one and rename it where an interrupted run must leave the earlier one as it was.
    /// </summary>
    /// <param name="results">The study, analyzed and judged.</param>
    /// <param name="summary">The groups side by side; null where the study compares none.</param>
    /// <param name="record">The record of this run.</param>
    /// <param name="comparison">This run held beside the earlier one; null where there is none.</param>
    /// <param name="folder">Path of the folder; made where it is missing.</param>
    /// <exception cref="IOException">A file cannot be written.</exception>
    public static void Write(StudyResult results, CohortSummary? summary, RunRecord record, RunComparison? comparison, string folder)
    {
        var edition = new Edition(results, summary, record, comparison);
        foreach (var below in (string[])["samples", "instruments", "tables"]) Directory.CreateDirectory(Path.Combine(folder, below));

        Put("index.html", OverviewPage.Write(edition));
        for (var place = 0; place < results.Samples.Count; place++) Put(Path.Combine("samples", edition.SamplePages[results.Samples[place].Sample]), SamplePage.Write(edition, place));
        foreach (var history in results.Analyzed.Histories) Put(Path.Combine("instruments", edition.InstrumentPages[history.Instrument.Name]), InstrumentPage.Write(edition, history));
        foreach (var history in results.Analyzed.Histories.Where(history => history.Checks.Count > 0)) Put(Path.Combine("instruments", edition.InstrumentPages[Edition.Week(history.Instrument.Name)]), Weekly(edition, history));
        foreach (var table in StudyTables.Files(edition)) Put(Path.Combine("tables", table.Name), table.Text);
        Put("run.json", record.ToJson());

        void Put(string name, string text) => ReplacedFile.Write(Path.Combine(folder, name), Encoding.UTF8.GetBytes(text));
    }

    /// <summary>Writes the weekly page of an instrument, one side of A4: whole or not at all.</summary>
    /// <param name="review">The instrument at a moment.</param>
    /// <param name="path">Path of the file; its folder exists.</param>
    /// <exception cref="IOException">It cannot be written.</exception>
    public static void WriteWeekly(InstrumentReview review, string path) => ReplacedFile.Write(path, WeeklyPage.Write(review, Markup.None));

    private static string Weekly(Edition edition, InstrumentHistory history)
    {
        var name = history.Instrument.Name;
        return WeeklyPage.Write(history.ReviewAtLast(edition.Results.Analyzed.Readings)!, Markup.Of($"""<ul><li><a href="../index.html">Cohort overview</a></li><li>{edition.InstrumentLink(name, "../")}</li></ul>"""));
    }
}
