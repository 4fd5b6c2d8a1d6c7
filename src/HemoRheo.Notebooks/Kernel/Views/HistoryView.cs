using System.Globalization;

namespace HemoRheo.Notebooks;

/// <summary>The checks of instruments, in order of time.</summary>
internal static class HistoryView
{
    public static Table Table(IEnumerable<InstrumentCheck> checks) => HemoRheo.Table.Of("instrument", "check", "started at", "fluid", "temperature", "measured", "expected", "relative error", "relative limit", "check outcome", "probability within").WithRows(
        checks,
        check =>
        [
            check.Instrument,
            check.Name,
            check.At,
            check.Fluid.Name,
            Cell.Rounded(check.Temperature.DegreesCelsius, check.Temperature.DegreesCelsius.ToString("0.00", CultureInfo.InvariantCulture)),
            check.Measured.MillipascalSeconds,
            check.Expected.MillipascalSeconds,
            Cell.Rounded(100 * (Math.Exp(check.Error.X) - 1), 100 * check.Error.StandardUncertainty),
            100 * check.Limit,
            Words.Of(check.Outcome),
            Cell.Rounded(check.ProbabilityWithin, check.ProbabilityWithin.ToString("0.000", CultureInfo.InvariantCulture)),
        ]);

    public static Markup Of(IReadOnlyCollection<InstrumentHistory> histories)
    {
        var findings = histories.SelectMany(history => history.Findings.With(history.Checks.SelectMany(check => check.Findings))).ToItems();
        return Markup.Of($"{TableMarkup.Of(Table(histories.SelectMany(history => history.Checks)), "Instrument checks")}{FindingsView.Of(findings)}");
    }
}
