namespace HemoRheo;

/// <summary>
/// The unit that a header text carries: in brackets (square ones always, round ones where it is a spelling of the table), or as the last word or
/// words of an export's header where these are a spelling of the table.
/// </summary>
internal static class HeaderUnit
{
    /// <summary>The text in the last brackets; null where there is none.</summary>
    public static string? Bracketed(string header)
    {
        var trimmed = header.TrimEnd();
        if (trimmed.Length == 0 || trimmed[^1] is not (']' or ')')) return null;
        var open = trimmed.LastIndexOf(trimmed[^1] == ']' ? '[' : '(');
        if (open < 0) return null;
        var spelling = trimmed[(open + 1)..^1].Trim();
        return trimmed[^1] == ']' || UnitTable.FindAll(spelling).Count > 0 ? spelling : null;
    }

    /// <summary>The header without the unit it carries in brackets.</summary>
    public static string BeforeBrackets(string header)
    {
        if (Bracketed(header) is null) return header.Trim();
        var trimmed = header.TrimEnd();
        return trimmed[..trimmed.LastIndexOf(trimmed[^1] == ']' ? '[' : '(')].Trim();
    }

    /// <summary>The unit's text, in brackets or as the last words; null where there is none.</summary>
    public static string? Spelling(string header) => Bracketed(header) ?? Last(header);

    /// <summary>The header without the unit it carries.</summary>
    public static string Name(string header) =>
        Bracketed(header) is null && Last(header) is { } last ? header.TrimEnd()[..^last.Length].Trim() : BeforeBrackets(header);

    /// <summary>The header's unit where it is not the declared one; null where they agree or the header has none.</summary>
    public static string? Contradiction(string header, Unit declared)
    {
        if (Spelling(header) is not { } spelling) return null;
        var unit = UnitTable.Find(spelling, declared.Quantity);
        if (unit == declared) return null;

        // One letter without brackets that is no unit of this quantity may be an abbreviation, such as m for measured.
        return unit is null && spelling.Length == 1 && Bracketed(header) is null ? null : spelling;
    }

    // Some spellings have two words (mPa s). A number alone is no unit here: it may count columns.
    private static string? Last(string header)
    {
        var trimmed = header.Trim();
        var last = trimmed.LastIndexOf(' ');
        if (last <= 0) return null;
        var before = trimmed.LastIndexOf(' ', last - 1);
        if (before > 0 && UnitTable.FindAll(trimmed[(before + 1)..]).Count > 0) return trimmed[(before + 1)..];
        var word = trimmed[(last + 1)..];
        return word != "1" && UnitTable.FindAll(word).Count > 0 ? word : null;
    }
}
