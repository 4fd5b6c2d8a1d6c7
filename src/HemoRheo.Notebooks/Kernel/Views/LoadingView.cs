namespace HemoRheo.Notebooks;

/// <summary>One loading: its curve, the fits of every law, and how the instrument stood.</summary>
internal static class LoadingView
{
    public static Table Fits(IEnumerable<FittedLaw> fits) => Table.Of("law", "parameter", "estimate", "standard error", "unit", "chi-square", "degrees of freedom", "usable").WithRows(
        fits.SelectMany(fit => fit.ToTable().Rows.Select(row => (fit, row))),
        one => [one.fit.Law.Name, one.row[0], one.row[2], one.row[3], one.row[4], one.fit.Fit.ChiSquare, one.fit.Fit.DegreesOfFreedom, one.fit.Usable]);

    public static Markup Of(LoadingResult loading) => Markup.Of($"""
        {TableMarkup.Of(CurveView.Table(loading.Curve), loading.Curve.ToString())}{TableMarkup.Of(Fits(loading.Fits), "Fits; errors are those of the fit alone")}<p>Instrument {Words.Of(loading.Standing.Status)}: {loading.Standing.Reason}</p>
        {FindingsView.Folded(loading.Findings)}
        """);
}
