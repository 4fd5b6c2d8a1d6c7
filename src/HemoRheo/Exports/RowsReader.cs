namespace HemoRheo;

/// <summary>Reads a file of one header row and one row a reading.</summary>
internal sealed class RowsReader(Layout layout, RecordingKind kind, FileFindings findings)
{
    private readonly DraftMaker _maker = new(layout, kind, findings);
    private readonly ReadingFields _readings = new(layout, findings);
    private readonly Dictionary<string, RecordingDraft> _drafts = [];
    private readonly List<string> _fields = [];
    private readonly FieldTexts _texts = new();
    private RecordingDraft? _last;

    /// <summary>The recordings, in the order they begin.</summary>
    public List<RecordingDraft> Read(TextLines lines)
    {
        ColumnMap? map = null;
        var any = false;
        while (!findings.Refused && lines.TryRead(out var line))
        {
            if (string.IsNullOrWhiteSpace(line.Text)) continue;
            any = true;
            if (!line.Ended && layout.LastLineEnds) Cut(line, "a last line without a line end");
            else if (!FieldSplitter.Split(line.Text, layout.Separator, _fields)) findings.Refuse(ExportFindings.QuoteNotClosed, line.Number, null, "Found a quote that is not closed, or text after a closing quote.");
            else if (map is null) map = ColumnMap.Of(layout.Fields, _fields, line.Number, findings);
            else if (_fields.Count != map.Count) Misfit(line, map.Count);
            else Row(map, line.Number);
        }

        if (lines.Fault is { } fault) findings.Refuse(fault);
        else if (!any) findings.Refuse(ExportFindings.FileEmpty, 1, 1, "Found no text, expected a header row and readings.");
        else if (_drafts.Count == 0 && !findings.Refused) findings.Add(ExportFindings.FileWithoutReadings, 1, null, "Found no readings after the header row.");
        return findings.Refused ? [] : [.. _drafts.Values];
    }

    private void Row(ColumnMap map, int line)
    {
        map.Put(_fields, line, _texts);
        var key = string.Join('\n', Parts.Select(part => _texts[part]));
        if (!_drafts.TryGetValue(key, out var draft))
        {
            draft = _maker.Start(_texts, line);
            if (draft is null) return;
            _drafts.Add(key, draft);
        }

        _last = draft;
        _readings.Add(_texts, line, draft);
    }

    private static FieldMeaning[] Parts { get; } =
        [FieldMeaning.Sample, FieldMeaning.Person, FieldMeaning.Visit, FieldMeaning.Loading, FieldMeaning.Instrument, FieldMeaning.Geometry, FieldMeaning.Fluid, FieldMeaning.StartedAt];

    private void Misfit(TextLine line, int expected)
    {
        if (!line.Ended && _fields.Count < expected)
        {
            Cut(line, $"{_fields.Count} fields of {expected}");
            return;
        }

        var message = $"Found {_fields.Count} fields, expected {expected}.";
        var column = Math.Min(_fields.Count, expected) + 1;
        findings.Add(_last?.Mark(ExportFindings.FieldCountDiffers, line.Number, column, message) ?? ExportFindings.FieldCountDiffers.At(new(findings.File, Line: line.Number, Column: column), message));
    }

    private void Cut(TextLine line, string found)
    {
        var message = $"Found {found}, expected a whole line; the file was cut here, and its last line was not read.";
        findings.Add(_last?.Mark(ExportFindings.FileCut, line.Number, line.Text.Length + 1, message) ?? ExportFindings.FileCut.At(new(findings.File, Line: line.Number, Column: line.Text.Length + 1), message));
    }
}
