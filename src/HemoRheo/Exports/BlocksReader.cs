using System.Globalization;

namespace HemoRheo;

/// <summary>Reads a file of blocks: lines of key and value, a header row, readings.</summary>
internal sealed class BlocksReader(Layout layout, RecordingKind kind, FileFindings findings)
{
    private readonly DraftMaker _maker = new(layout, kind, findings);
    private readonly ReadingFields _readings = new(layout, findings);
    private readonly List<RecordingDraft> _drafts = [];
    private readonly List<string> _fields = [];
    private readonly SortedSet<string> _otherKeys = new(StringComparer.Ordinal);
    private readonly HashSet<string> _blockKeys = [];
    private FieldTexts? _keys;
    private RecordingDraft? _draft;
    private ColumnMap? _map;
    private int _start;
    private bool _skipped;
    private int? _preamble;

    /// <summary>The recordings, in file order.</summary>
    public List<RecordingDraft> Read(TextLines lines)
    {
        var any = false;
        while (!findings.Refused && lines.TryRead(out var line))
        {
            if (string.IsNullOrWhiteSpace(line.Text)) continue;
            any = true;
            if (!line.Ended && layout.LastLineEnds) Cut(line);
            else Take(line);
        }

        if (lines.Fault is { } fault) findings.Refuse(fault);
        if (!findings.Refused) EndBlock();
        if (!any && !findings.Refused) findings.Refuse(ExportFindings.FileEmpty, 1, 1, "Found no text, expected blocks.");
        else if (_start == 0 && !findings.Refused) findings.Refuse(ExportFindings.FileWithoutReadings, 1, null, $"Found no line that begins a block, expected the key \"{layout.BlockStart}\".");
        if (_preamble is { } first) findings.Add(ExportFindings.TextNotRead, first, null, "Found lines before the first block; they were not read.");
        if (_otherKeys.Count > 0) findings.Add(ExportFindings.KeysNotRead, null, null, $"Keys not read: {string.Join(", ", _otherKeys.Select(key => $"\"{key}\""))}.");
        return findings.Refused ? [] : _drafts;
    }

    private void Take(TextLine line)
    {
        var key = KeyOf(line.Text, out var value);
        if (key is not null && key == layout.BlockStart)
        {
            EndBlock();
            (_keys, _map, _draft, _start, _skipped) = (new(), null, null, line.Number, false);
            _blockKeys.Clear();
            Key(key, value, line);
        }
        else if (_keys is null) _preamble ??= line.Number;
        else if (_skipped) return;
        else if (!FieldSplitter.Split(line.Text, layout.Separator, _fields)) findings.Refuse(ExportFindings.QuoteNotClosed, line.Number, null, "Found a quote that is not closed, or text after a closing quote.");
        else if (_map is not null) Row(line);
        else if (layout.Fields.Any(field => field.PerReading && _fields.Contains(field.Header)) || (key is null && _fields.Count > 1)) Header(line.Number);
        else if (key is not null) Key(key, value, line);
        else Skip(ExportFindings.LineNotUnderstood, line, "Found a line that is neither key and value nor a header row; its block was set aside.");
    }

    private string? KeyOf(string line, out string value)
    {
        var at = line.IndexOf(layout.KeySeparator, StringComparison.Ordinal);
        value = at < 0 ? "" : line[(at + layout.KeySeparator.Length)..].Trim();
        return at < 0 ? null : line[..at].Trim();
    }

    private void Key(string key, string value, TextLine line)
    {
        if (!_blockKeys.Add(key)) Skip(ExportFindings.KeyTwice, line, $"Found the key \"{key}\" a second time in the block of line {_start}; the block was set aside.");
        else if (layout.Fields.FirstOrDefault(field => !field.PerReading && field.Header == key) is { } known) _keys!.Put(known.Meaning, value, line.Number, line.Text.IndexOf(layout.KeySeparator, StringComparison.Ordinal) + layout.KeySeparator.Length + 1);
        else if (key != layout.BlockStart) _otherKeys.Add(key);
    }

    private void Header(int line)
    {
        _map = ColumnMap.Of(layout.Fields.Where(field => field.PerReading), _fields, line, findings);
        StartDraft();
    }

    private void StartDraft()
    {
        _draft = _maker.Start(_keys!, _start);
        if (_draft is null) _skipped = true;
        else _drafts.Add(_draft);
    }

    private void Row(TextLine line)
    {
        if (_fields.Count != _map!.Count)
        {
            findings.Add(_draft!.Mark(ExportFindings.FieldCountDiffers, line.Number, Math.Min(_fields.Count, _map.Count) + 1, $"Found {_fields.Count} fields, expected {_map.Count}."));
            _draft.Rows++;
            return;
        }

        _map.Put(_fields, line.Number, _keys!);
        _readings.Add(_keys!, line.Number, _draft!);
    }

    private void EndBlock()
    {
        if (_keys is null || _skipped) return;
        if (_draft is null) StartDraft();
        if (_draft is null || _keys[FieldMeaning.ReadingCount] is not { Length: > 0 } text) return;
        var line = _keys.Line(FieldMeaning.ReadingCount);
        if (!int.TryParse(text, NumberStyles.None, CultureInfo.InvariantCulture, out var announced))
            findings.Add(_draft.Mark(ExportFindings.LoadingNotRead, line, null, "Found a number of readings that is not a whole number."));
        else if (_draft.Rows < announced && !_draft.Findings.Any(finding => finding.Kind == ExportFindings.FileCut))
            findings.Add(_draft.Mark(ExportFindings.FileCut, line, null, $"Found {_draft.Rows} readings, expected the {announced} that the block announces; it was cut."));
        else if (_draft.Rows > announced)
            findings.Add(_draft.Mark(ExportFindings.ReadingCountDiffers, line, null, $"Found {_draft.Rows} readings, expected the {announced} that the block announces."));
    }

    private void Skip(FindingKind kind, TextLine line, string message)
    {
        if (_draft is null) StartDraft();
        var finding = _draft?.Mark(kind, line.Number, null, message) ?? kind.At(new(findings.File, Line: line.Number), message);
        _draft?.PutAside();
        findings.Add(finding);
        _skipped = true;
    }

    private void Cut(TextLine line)
    {
        if (_keys is not null && _draft is null && !_skipped) StartDraft();
        const string message = "Found a last line without a line end, expected a whole line; the file was cut here, and its last line was not read.";
        findings.Add(_draft?.Mark(ExportFindings.FileCut, line.Number, line.Text.Length + 1, message) ?? ExportFindings.FileCut.At(new(findings.File, Line: line.Number, Column: line.Text.Length + 1), message));
    }
}
