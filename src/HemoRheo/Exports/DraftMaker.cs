using System.Globalization;

namespace HemoRheo;

/// <summary>Starts recordings from what a row or a block says of them.</summary>
internal sealed class DraftMaker(Layout layout, RecordingKind kind, FileFindings findings)
{
    /// <summary>A recording without readings yet; null, with a finding, where the fields name no sample.</summary>
    public RecordingDraft? Start(FieldTexts texts, int line)
    {
        if (string.IsNullOrEmpty(texts[FieldMeaning.Sample]))
        {
            findings.Add(ExportFindings.IdentifierMissing, line, Column(texts, FieldMeaning.Sample), "Found no identifier of the sample, expected a pseudonym.");
            return null;
        }

        var sample = texts[FieldMeaning.Sample]!;
        var faults = new List<Finding>();
        var loading = Whole(texts, FieldMeaning.Loading, faults) ?? 1;
        var where = new Where(findings.File, Line: line, Sample: sample, Loading: loading);
        var visit = Whole(texts, FieldMeaning.Visit, faults);
        var draft = new RecordingDraft(kind, sample, loading, where)
        {
            Person = Text(texts, FieldMeaning.Person),
            Visit = visit,
            Instrument = Text(texts, FieldMeaning.Instrument),
            Geometry = Text(texts, FieldMeaning.Geometry),
            Fluid = Text(texts, FieldMeaning.Fluid),
            StartedAt = Time(texts, where, faults),
        };
        if (faults.Count > 0) draft.PutAside();
        if (!Identifier.IsPlain(sample)) faults.Add(ExportFindings.IdentifierUnusual.At(where with { Sample = null, Column = Column(texts, FieldMeaning.Sample) }, Identifier.Expected));
        foreach (var fault in faults)
        {
            draft.Mark(fault);
            findings.Add(fault);
        }

        return draft;
    }

    private DateTimeOffset? Time(FieldTexts texts, Where where, List<Finding> faults)
    {
        if (Text(texts, FieldMeaning.StartedAt) is not { } text) return null;
        var at = where with { Line = texts.Line(FieldMeaning.StartedAt), Column = Column(texts, FieldMeaning.StartedAt) };
        var moment = TimeText.Read(text, layout.TimeFormat, at, "the time", out var finding);
        if (finding is not null) faults.Add(finding);
        return moment;
    }

    private int? Whole(FieldTexts texts, FieldMeaning meaning, List<Finding> faults)
    {
        if (Text(texts, meaning) is not { } text) return null;
        if (int.TryParse(text, NumberStyles.None, CultureInfo.InvariantCulture, out var number) && number > 0) return number;
        faults.Add(ExportFindings.LoadingNotRead.At(new(findings.File, Line: texts.Line(meaning), Column: Column(texts, meaning)), $"Found a {meaning.Word()} that is not a whole number from 1."));
        return null;
    }

    private static string? Text(FieldTexts texts, FieldMeaning meaning) => texts[meaning] is { Length: > 0 } text ? text : null;

    private static int? Column(FieldTexts texts, FieldMeaning meaning) => texts.Column(meaning) > 0 ? texts.Column(meaning) : null;
}
