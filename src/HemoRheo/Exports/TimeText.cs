using System.Globalization;

namespace HemoRheo;

/// <summary>Dates and times of exports and tables. Without an offset they are refused: the hour when clocks go back happens twice.</summary>
internal static class TimeText
{
    private static readonly string[] TableFormats = ["yyyy-MM-dd'T'HH:mmzzz", "yyyy-MM-dd'T'HH:mm:sszzz", "yyyy-MM-dd'T'HH:mm:ss.FFFFFFFzzz", "yyyy-MM-dd HH:mmzzz", "yyyy-MM-dd HH:mm:sszzz", "yyyy-MM-dd HH:mm zzz", "yyyy-MM-dd HH:mm:ss zzz"];

    /// <summary>Reads a time of a table: ISO 8601 with offset (+01:00 or Z).</summary>
    public static DateTimeOffset? Read(string text, Where where, string field, out Finding? finding) =>
        Read(text.EndsWith('Z') ? $"{text[..^1]}+00:00" : text, TableFormats, "like 2026-03-02T09:00:00+01:00", where, field, out finding);

    /// <summary>Reads a time of an export by its layout's format.</summary>
    public static DateTimeOffset? Read(string text, string format, Where where, string field, out Finding? finding) =>
        Read(text, [format], $"in the layout's format {format}", where, field, out finding);

    private static DateTimeOffset? Read(string text, string[] formats, string expected, Where where, string field, out Finding? finding)
    {
        finding = null;
        if (DateTimeOffset.TryParseExact(text, formats, CultureInfo.InvariantCulture, DateTimeStyles.AssumeUniversal, out var moment)) return moment;
        var without = formats.Select(format => format.Replace("zzz", "", StringComparison.Ordinal).Trim()).Distinct().ToArray();
        finding = DateTime.TryParseExact(text, without, CultureInfo.InvariantCulture, DateTimeStyles.None, out _)
            ? ExportFindings.TimeWithoutOffset.At(where, $"Found {field} \"{text}\" without an offset, expected a time {expected}; on the night clocks go back one hour happens twice, so the offset is never guessed.")
            : ExportFindings.TimeNotRead.At(where, $"Found {field} \"{text}\", expected a time {expected}.");
        return null;
    }
}
