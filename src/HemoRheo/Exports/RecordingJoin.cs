namespace HemoRheo;

/// <summary>Completes recordings from the tables and sets aside what is incomplete, twice or undeclared; every unmatched row or recording is a finding.</summary>
internal sealed class RecordingJoin(Study study, StudyTables tables)
{
    private readonly Dictionary<string, SampleRow> _samples = tables.Samples.ToDictionary(row => row.Record.Sample);
    private readonly Dictionary<string, CheckRow> _checks = tables.Checks.ToDictionary(row => row.Check);

    /// <summary>The recordings that can be used. Findings go to the file each recording began in.</summary>
    public List<Recording> Complete(List<FileReading> files)
    {
        var drafts = files.SelectMany(file => file.Drafts.Select(draft => (Draft: draft, file.Findings))).ToList();
        foreach (var same in drafts.GroupBy(pair => (pair.Draft.Kind, pair.Draft.Sample, pair.Draft.Loading)).Where(same => same.Count() > 1))
            foreach (var (draft, findings) in same)
                SetAside(draft, findings, ExportFindings.LoadingTwice, $"Found this sample and loading {same.Count()} times ({string.Join("; ", same.Select(other => $"{other.Draft.Where.File}:{other.Draft.Where.Line}"))}), expected it once; all of them were set aside.");
        return [.. drafts.Select(pair => pair.Draft.Kind == RecordingKind.Blood ? Blood(pair.Draft, pair.Findings) : WithoutBlood(pair.Draft, pair.Findings)).OfType<Recording>()];
    }

    private Recording? Blood(RecordingDraft draft, FileFindings findings)
    {
        var row = _samples.GetValueOrDefault(draft.Sample);
        if (row is null)
        {
            findings.Add(draft.Mark(ExportFindings.RecordingWithoutSample, null, null, $"Found no row of the samples table {study.Files.Samples} for this recording's sample."));
        }
        else
        {
            if (draft.Person is not null && row.Person is not null && draft.Person != row.Person) Differs(draft, findings, "person", row.Record.Where);
            if (draft.Visit is not null && row.Visit is not null && draft.Visit != row.Visit) Differs(draft, findings, "visit", row.Record.Where);
        }

        return Made(draft, findings, row?.Instrument, row?.Geometry, row?.StartedAt, null, row?.Record.Where);
    }

    /// <summary>A check or blank run. A blank run needs no row of the check table where its export says all.</summary>
    private Recording? WithoutBlood(RecordingDraft draft, FileFindings findings)
    {
        var row = _checks.GetValueOrDefault(draft.Sample);
        if (row is null && draft.Kind == RecordingKind.Check && study.Files.CheckTable is { } table)
            findings.Add(draft.Mark(ExportFindings.RecordingWithoutCheckRow, null, null, $"Found no row of the check table {table} for this check."));
        return Made(draft, findings, row?.Instrument, row?.Geometry, row?.StartedAt, row?.Fluid, row?.Where);
    }

    private Recording? Made(RecordingDraft draft, FileFindings findings, string? instrument, string? geometry, DateTimeOffset? startedAt, string? fluid, Where? row)
    {
        Compare(draft, findings, "instrument", draft.Instrument, instrument, row);
        Compare(draft, findings, "geometry", draft.Geometry, geometry, row);
        Compare(draft, findings, "fluid", draft.Fluid, fluid, row);
        if (draft.StartedAt is { } exported && startedAt is { } entered && exported != entered) Differs(draft, findings, "started_at", row!);
        instrument = draft.Instrument ?? instrument;
        geometry = draft.Geometry ?? geometry;
        fluid = draft.Fluid ?? fluid;
        startedAt = draft.StartedAt ?? startedAt;
        Declared(draft, findings, "instrument", instrument, study.Instruments.Select(known => known.Name), required: true);
        Declared(draft, findings, "geometry", geometry, study.Geometries.Select(known => known.Name), required: draft.Readings.Exists(reading => reading.Stress is null));
        if (draft.Kind == RecordingKind.Check) Declared(draft, findings, "fluid", fluid, study.Fluids.Select(known => known.Name), required: true);
        if (startedAt is null && !draft.SetAside) SetAside(draft, findings, ExportFindings.MetadataMissing, $"Found no started_at in export or {TableOf(draft)}; the recording was set aside.");
        if (draft.Readings.Count == 0) SetAside(draft, findings, ExportFindings.RecordingWithoutReadings, "Found no reading that can be used; the recording was set aside.");
        return draft.SetAside
            ? null
            : new(draft.Kind, draft.Sample, draft.Loading, instrument!, geometry, draft.Kind == RecordingKind.Check ? fluid : null, startedAt!.Value, draft.Readings.ToItems(), draft.Where)
            {
                Findings = draft.Findings.ToItems(),
            };
    }

    private static void Compare(RecordingDraft draft, FileFindings findings, string field, string? exported, string? entered, Where? row)
    {
        if (exported is not null && entered is not null && exported != entered) Differs(draft, findings, field, row!);
    }

    private static void Differs(RecordingDraft draft, FileFindings findings, string field, Where row) =>
        findings.Add(draft.Mark(ExportFindings.MetadataDiffers, null, null, $"Found a {field} in the export that differs from the one at {row.File}:{row.Line}; the export's is used and the recording marked."));

    private void Declared(RecordingDraft draft, FileFindings findings, string field, string? name, IEnumerable<string> declared, bool required)
    {
        if (name is null)
        {
            if (required) SetAside(draft, findings, ExportFindings.MetadataMissing, $"Found no {field} in export or {TableOf(draft)}; the recording was set aside.");
        }
        else if (!declared.Contains(name))
        {
            var near = Spelling.Nearest(name, declared);
            SetAside(draft, findings, ExportFindings.NameUndeclared, $"Found the {field} \"{name}\", which the study file does not declare{(near is null ? "" : $"; did you mean \"{near}\"?")}; the recording was set aside.");
        }
    }

    private string TableOf(RecordingDraft draft) => draft.Kind == RecordingKind.Blood ? "samples table" : study.Files.CheckTable is null ? "check table (there is none)" : "check table";

    private static void SetAside(RecordingDraft draft, FileFindings findings, FindingKind kind, string message)
    {
        draft.PutAside();
        findings.Add(draft.Mark(kind, null, null, message));
    }
}
