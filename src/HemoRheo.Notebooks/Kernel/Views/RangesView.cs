namespace HemoRheo.Notebooks;

/// <summary>Reference ranges, one row each.</summary>
internal static class RangesView
{
    public static Table Table(IEnumerable<ReferenceRange> ranges) => HemoRheo.Table.Of("measurand", "law", "basis", "lower limit", "lower limit from", "lower limit to", "upper limit", "upper limit from", "upper limit to", "unit", "n").WithRows(
        ranges,
        range =>
        [
            range.Measurand.Name,
            range.Law,
            Words.Short(range.Basis),
            .. Limit(range, range.Limits.Lower, range.LowerLimit),
            .. Limit(range, range.Limits.Upper, range.UpperLimit),
            range.Measurand.Shown.Symbol,
            range.Used,
        ]);

    public static Markup Of(IReadOnlyCollection<ReferenceRange> ranges) => Markup.Of($"""
        {TableMarkup.Of(Table(ranges), "Reference ranges, with the limits' own 90 % intervals")}<ul>{ranges.Select(range => $"{range.Method}. {range.Source}").Distinct().Select(method => Markup.Of($"<li>{method}</li>"))}</ul>
        <p><i>{ResearchUse.Caution}</i></p>
        """);

    private static Cell[] Limit(ReferenceRange range, double limit, Interval? own)
    {
        var shown = range.Measurand.ToShown(limit);
        if (own is not { } interval) return [shown, Cell.Empty, Cell.Empty];
        var ends = interval.Select(range.Measurand.ToShown);
        var quarter = Math.Abs(ends.Upper - ends.Lower) / 4;
        return [Cell.Rounded(shown, quarter), Cell.Rounded(ends.Lower, quarter), Cell.Rounded(ends.Upper, quarter)];
    }
}
