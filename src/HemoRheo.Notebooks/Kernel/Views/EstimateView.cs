namespace HemoRheo.Notebooks;

/// <summary>A value derived from one fit.</summary>
internal static class EstimateView
{
    public static Markup Of(Estimate estimate)
    {
        var interval = estimate.Interval();
        var quarter = Math.Abs(interval.Upper - interval.Lower) / 4;
        var table = Table.Of("measurand", "value", "lower end", "upper end", "unit").With(
            estimate.Extrapolated ? $"{estimate.Measurand.Name} (extrapolated)" : estimate.Measurand.Name,
            Cell.Rounded(estimate.Shown, quarter),
            Cell.Rounded(interval.Lower, quarter),
            Cell.Rounded(interval.Upper, quarter),
            estimate.Measurand.Shown.Symbol);
        return TableMarkup.Of(table, estimate.Value.Part(SourceKind.Loading) is null
            ? "95 % interval from the fit alone: the scatter between loadings and the instrument are not in it"
            : "95 % interval from the fit and the scatter between these loadings: the instrument is not in it");
    }
}
