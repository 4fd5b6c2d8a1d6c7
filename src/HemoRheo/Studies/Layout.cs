namespace HemoRheo;

/// <summary>A declared export layout: how to read one kind of file without guessing.</summary>
/// <param name="Name">Name, shown beside each file it read.</param>
/// <param name="Shape">Rows or blocks.</param>
/// <param name="Files">File-name patterns it applies to, e.g. <c>*.csv</c>.</param>
/// <param name="Encoding">Web name of the text encoding, e.g. <c>utf-8</c>, <c>utf-16</c>, <c>windows-1252</c>; a byte order mark that contradicts it is refused.</param>
/// <param name="Separator">Field separator.</param>
/// <param name="DecimalSign">Decimal sign, <c>.</c> or <c>,</c>.</param>
/// <param name="TimeFormat">Format of date and time as .NET writes it; the offset is part of it (<c>zzz</c>), or times are refused.</param>
/// <param name="BlockStart">Blocks only: the key whose line starts a block.</param>
/// <param name="KeySeparator">Blocks only: what stands between key and value.</param>
/// <param name="Fields">What each column or key holds.</param>
/// <param name="UpWords">Words in the ramp field that mean an upward ramp.</param>
/// <param name="DownWords">Words in the ramp field that mean a downward ramp.</param>
public sealed record Layout(
    string Name,
    LayoutShape Shape,
    Items<string> Files,
    string Encoding,
    char Separator,
    char DecimalSign,
    string TimeFormat,
    string? BlockStart,
    string KeySeparator,
    Items<LayoutField> Fields,
    Items<string> UpWords,
    Items<string> DownWords)
{
    /// <summary>Whether the last line of a whole file ends with a line end; if so, a file whose last line has none was cut.</summary>
    public bool LastLineEnds { get; init; } = true;
}
