namespace HemoRheo;

/// <summary>The unit that a header text carries in brackets: in square ones always, in round ones where it is a spelling of the table.</summary>
internal static class HeaderUnit
{
    /// <summary>The text in the last brackets; null where there is none.</summary>
    public static string? Spelling(string header)
    {
        var trimmed = header.TrimEnd();
        if (trimmed.Length == 0 || trimmed[^1] is not (']' or ')')) return null;
        var open = trimmed.LastIndexOf(trimmed[^1] == ']' ? '[' : '(');
        if (open < 0) return null;
        var spelling = trimmed[(open + 1)..^1].Trim();
        return trimmed[^1] == ']' || UnitTable.FindAll(spelling).Count > 0 ? spelling : null;
    }

    /// <summary>The header without the unit it carries.</summary>
    public static string Name(string header)
    {
        if (Spelling(header) is null) return header.Trim();
        var trimmed = header.TrimEnd();
        return trimmed[..trimmed.LastIndexOf(trimmed[^1] == ']' ? '[' : '(')].Trim();
    }

    /// <summary>The header's unit where it is not the declared one; null where they agree or the header has none.</summary>
    public static string? Contradiction(string header, Unit declared)
    {
        var spelling = Spelling(header);
        return spelling is null || UnitTable.Find(spelling, declared.Quantity) == declared ? null : spelling;
    }
}
