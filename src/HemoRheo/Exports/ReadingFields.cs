namespace HemoRheo;

/// <summary>Makes readings of the fields of rows, by a layout's units and decimal sign.</summary>
internal sealed class ReadingFields(Layout layout, FileFindings findings)
{
    private static readonly FieldMeaning[] Numbers =
        [FieldMeaning.Speed, FieldMeaning.SetSpeed, FieldMeaning.Torque, FieldMeaning.ShearRate, FieldMeaning.SetShearRate, FieldMeaning.ShearStress, FieldMeaning.Temperature, FieldMeaning.Elapsed];

    private static readonly FieldMeaning[] Needed = [FieldMeaning.Speed, FieldMeaning.Torque, FieldMeaning.ShearRate, FieldMeaning.ShearStress];

    private readonly Dictionary<FieldMeaning, LayoutField> _fields = layout.Fields.ToDictionary(field => field.Meaning);
    private readonly double?[] _values = new double?[Enum.GetValues<FieldMeaning>().Length];

    /// <summary>Adds one reading to a recording, or keeps it out with findings. A wrong decimal sign refuses the file.</summary>
    public void Add(FieldTexts texts, int line, RecordingDraft draft)
    {
        var point = ++draft.Rows;
        var kept = true;
        foreach (var meaning in Numbers)
        {
            _values[(int)meaning] = null;
            if (texts[meaning] is { } text) kept &= Read(meaning, text, texts, line, draft, point);
            if (findings.Refused) return;
        }

        if (!kept || Needed.Any(meaning => texts[meaning] is not null && Value(meaning) is null)) return;
        // The torque of an empty gap lies about zero, and it may be read at rest.
        if (draft.Kind != RecordingKind.Blank)
        {
            Question(ExportFindings.RateNotPositive, FieldMeaning.Speed, texts, line, draft, point);
            Question(ExportFindings.RateNotPositive, FieldMeaning.ShearRate, texts, line, draft, point);
            Question(ExportFindings.StressNotPositive, FieldMeaning.Torque, texts, line, draft, point);
            Question(ExportFindings.StressNotPositive, FieldMeaning.ShearStress, texts, line, draft, point);
        }

        draft.Readings.Add(new(
            point,
            RampOf(texts, line, draft, point),
            Value(FieldMeaning.Speed),
            Value(FieldMeaning.SetSpeed),
            Value(FieldMeaning.Torque),
            Value(FieldMeaning.ShearRate),
            Value(FieldMeaning.SetShearRate),
            Value(FieldMeaning.ShearStress),
            Value(FieldMeaning.Temperature),
            Value(FieldMeaning.Elapsed),
            draft.Where with { Line = line, Column = FirstColumn(texts), Point = point }));
    }

    private double? Value(FieldMeaning meaning) => _values[(int)meaning];

    private bool Read(FieldMeaning meaning, string text, FieldTexts texts, int line, RecordingDraft draft, int point)
    {
        var field = _fields[meaning];
        var column = texts.Column(meaning);
        var at = field.PerReading ? line : texts.Line(meaning);
        switch (NumberText.Read(text, layout.DecimalSign, out var number))
        {
            case NumberFault.None:
                _values[(int)meaning] = field.Unit!.ToSi(number);
                return true;
            case NumberFault.Empty:
                findings.Add(draft.Mark(ExportFindings.FieldEmpty, at, column, $"Found an empty field, expected a number in \"{field.Header}\"{(Needed.Contains(meaning) ? "; the reading was kept out" : "")}.", point));
                return true;
            case NumberFault.OtherDecimalSign:
                findings.Refuse(ExportFindings.DecimalSignDiffers, at, column, $"Found \"{text}\" in \"{field.Header}\", expected the decimal sign \"{layout.DecimalSign}\" that layout {layout.Name} declares.");
                return false;
            case NumberFault.NotFinite:
                findings.Add(draft.Mark(ExportFindings.NotFinite, at, column, $"Found \"{text}\" in \"{field.Header}\", expected a finite number.", point));
                return false;
            default:
                findings.Add(draft.Mark(ExportFindings.NotANumber, at, column, $"Found \"{Shortened(text)}\" in \"{field.Header}\", expected a number.", point));
                return false;
        }
    }

    private void Question(FindingKind kind, FieldMeaning meaning, FieldTexts texts, int line, RecordingDraft draft, int point)
    {
        if (Value(meaning) is not { } value || value > 0) return;
        var unit = _fields[meaning].Unit!;
        var number = unit.FromSi(value);
        var finding = kind.At(
            draft.Where with { Line = line, Column = texts.Column(meaning), Point = point },
            FormattableString.Invariant($"Found {number:G6} {unit} in \"{_fields[meaning].Header}\", expected a value greater than 0."),
            number,
            0);
        draft.Mark(finding);
        findings.Add(finding);
    }

    private Ramp RampOf(FieldTexts texts, int line, RecordingDraft draft, int point)
    {
        if (texts[FieldMeaning.Ramp] is not { } word) return Ramp.Unstated;
        if (layout.DownWords.Contains(word)) return Ramp.Down;
        if (layout.UpWords.Contains(word)) return Ramp.Up;
        findings.Add(draft.Mark(ExportFindings.RampWordUnknown, line, texts.Column(FieldMeaning.Ramp), $"Found the ramp \"{Shortened(word)}\", expected one of {string.Join(", ", layout.UpWords.Concat(layout.DownWords).Select(known => $"\"{known}\""))}.", point));
        return Ramp.Unstated;
    }

    private int? FirstColumn(FieldTexts texts) =>
        (_fields.GetValueOrDefault(FieldMeaning.ShearStress) ?? _fields.GetValueOrDefault(FieldMeaning.Torque)) is { PerReading: true } field ? texts.Column(field.Meaning) : null;

    private static string Shortened(string text) => text.Length <= 40 ? text : text[..40] + "...";
}
