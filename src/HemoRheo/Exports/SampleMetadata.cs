using System.Globalization;

namespace HemoRheo;

/// <summary>Person and visit of samples whose row of the samples table does not say them, from the exports of their recordings.</summary>
internal static class SampleMetadata
{
    /// <summary>The rows that have a person, from table or exports; the others are set aside with findings.</summary>
    public static StudyTables Complete(StudyTables tables, List<FileReading> files)
    {
        if (tables.Samples.Count == 0) return tables;
        var table = tables.Files.Single(file => file.Path == tables.Samples[0].Record.Where.File).Findings;
        var drafts = files.SelectMany(file => file.Drafts.Select(draft => (Draft: draft, file.Findings))).Where(pair => pair.Draft.Kind == RecordingKind.Blood).ToLookup(pair => pair.Draft.Sample);
        return tables with { Samples = [.. tables.Samples.Select(row => Completed(row, drafts[row.Record.Sample].ToArray(), table)).OfType<SampleRow>()] };
    }

    private static SampleRow? Completed(SampleRow row, (RecordingDraft Draft, FileFindings Findings)[] drafts, FileFindings table)
    {
        var persons = Said(row.Person, drafts, "person", draft => draft.Person);
        var visits = Said(row.Visit?.ToString(CultureInfo.InvariantCulture), drafts, "visit", draft => draft.Visit?.ToString(CultureInfo.InvariantCulture));
        if (persons.Count == 0)
            table.Add(ExportFindings.IdentifierMissing.At(row.Record.Where with { Column = row.PersonColumn }, "Found no person of this sample in samples table or exports, expected a pseudonym in one of them; its row was set aside."));
        if (persons.Count != 1 || visits.Count > 1) return null;
        return row with { Record = row.Record with { Person = persons[0], Visit = visits.Count == 0 ? 1 : int.Parse(visits[0], CultureInfo.InvariantCulture) } };
    }

    private static List<string> Said(string? entered, (RecordingDraft Draft, FileFindings Findings)[] drafts, string field, Func<RecordingDraft, string?> exported)
    {
        if (entered is not null) return [entered];
        var said = drafts.Where(pair => exported(pair.Draft) is not null).ToArray();
        var different = said.Select(pair => exported(pair.Draft)!).Distinct().ToList();
        if (different.Count > 1)
            foreach (var (draft, findings) in said)
                findings.Add(draft.Mark(ExportFindings.MetadataDiffers, null, null, $"Found more than one {field} in the exports of this sample ({string.Join("; ", said.Select(other => $"{other.Draft.Where.File}:{other.Draft.Where.Line}"))}), expected one; the sample's row was set aside."));
        return different;
    }
}
