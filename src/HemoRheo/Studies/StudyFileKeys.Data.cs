namespace HemoRheo;

/// <content>The study itself, its files, and what its exports look like.</content>
public static partial class StudyFileKeys
{
    private static StudyFileKey[] Top =>
    [
        Text("", "name", "Name of the study, shown on every page.", "Blood viscosity, winter"),
        new("", "seed", StudyFileKeyKind.WholeNumber, "Seed of every random stream of the study.", "20261201"),
    ];

    private static StudyFileKey[] Files =>
    [
        Texts("[files]", "exports", "Files or folders with the exports of blood, below the study's folder.", "exports"),
        Default("[]", Texts("[files]", "checks", "Files or folders with the exports of instrument checks.", "checks")),
        Default("[]", Texts("[files]", "blanks", "Files or folders with the exports of blank runs: the instrument turning with nothing in the gap, which show torque zero and noise.", "blanks")),
        Text("[files]", "samples", "The samples table (CSV: comma, decimal point, UTF-8).", "samples.csv"),
        Optional(Text("[files]", "people", "The people table (CSV) with person and group; needed to compare groups.", "people.csv")),
        Optional(Text("[files]", "check_table", "A table (CSV) with what exports of checks and blank runs do not say: fluid, instrument, started_at, geometry.", "checks.csv")),
        Default("[]", Texts("[files]", "allowed_columns", "Columns of these tables that look like direct identifiers and may stand there all the same; they are never read.", "collection_name")),
    ];

    private static StudyFileKey[] Layouts =>
    [
        Text("[[layouts]]", "name", "Name of the layout, shown beside each file it read.", "rows"),
        Word("[[layouts]]", "shape", "rows: one header row, then one row a reading. blocks: one block a recording, lines of key and value, then a header row and readings.", "rows", "blocks"),
        Texts("[[layouts]]", "files", "File-name patterns it applies to; * stands for any letters, ? for one.", "*.csv"),
        Default("\"utf-8\"", Text("[[layouts]]", "encoding", "Text encoding; a file that does not fit it is refused.", "windows-1252")),
        Text("[[layouts]]", "separator", "What stands between fields: one character.", ";"),
        Word("[[layouts]]", "decimal_sign", "Decimal sign of its numbers.", ".", ","),
        Optional(Text("[[layouts]]", "time_format", "Format of dates and times in .NET letters; zzz, the offset, must be part of it. Needed with started_at.", "yyyy-MM-dd HH:mm:ss zzz")),
        Optional(Text("[[layouts]]", "block_start", "Blocks only: the key whose line starts a block.", "Sample")),
        Default("\":\"", Text("[[layouts]]", "key_separator", "Blocks only: what stands between key and value.", "=")),
        Default("[]", Texts("[[layouts]]", "up_words", "Words in the ramp field that mean an upward ramp.", "up")),
        Default("[]", Texts("[[layouts]]", "down_words", "Words in the ramp field that mean a downward ramp.", "down")),
        Default("true", Truth("[[layouts]]", "last_line_ends", "Whether the last line of a whole file ends with a line end; a file whose last line does not was cut.", "false")),
    ];

    private static StudyFileKey[] Fields =>
    [
        .. Enum.GetValues<FieldMeaning>().Select(meaning => Field("[layouts.columns]", meaning)),
        .. Enum.GetValues<FieldMeaning>().Select(meaning => Field("[layouts.keys]", meaning)),
    ];

    private static StudyFileKey Field(string section, FieldMeaning meaning) =>
        new(section, meaning.Word(), StudyFileKeyKind.Field, $"{(section == "[layouts.keys]" ? "Key line of a block" : "Column")}: {meaning.InWords()}.", Example(meaning))
        {
            Required = false,
            Quantity = meaning.Quantity() ?? Quantity.Number,
        };

    private static string Example(FieldMeaning meaning)
    {
        var header = meaning.Word().Replace('_', ' ');
        return meaning.Quantity() is { } quantity ? $"{{ header = \"{header} [{UnitTable.SpellingsOf(quantity)[0]}]\", unit = \"{UnitTable.SpellingsOf(quantity)[0]}\" }}" : $"{{ header = \"{header}\" }}";
    }
}
