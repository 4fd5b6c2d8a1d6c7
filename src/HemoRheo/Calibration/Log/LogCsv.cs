using System.Globalization;
using System.Text;

namespace HemoRheo;

/// <summary>A log as comma-separated values: RFC 4180 with line feeds, numbers in their shortest exact form.</summary>
internal static class LogCsv
{
    private const string Header = "entry,kind,recorded_at,recorded_by,corrects,happened_at,name,filling,fluid,lot,temperature_degC,measured_Pa.s,expected_Pa.s,error_ln,standard_uncertainty_ln,limit,outcome,text,content,digest\n";

    internal static string Write(IReadOnlyList<LogRow> rows)
    {
        var text = new StringBuilder(Header);
        foreach (var (row, what) in rows.Zip(LogJson.TryRead(rows)))
        {
            string[] fields = [row.Number.ToString(CultureInfo.InvariantCulture), row.Kind, row.RecordedAt, row.By, .. Columns(what), row.Content, row.Digest];
            text.AppendJoin(',', fields.Select(Quoted)).Append('\n');
        }

        return text.ToString();
    }

    private static IEnumerable<string> Columns(LoggedEvent? what)
    {
        var (corrects, why) = what is LoggedCorrection correction ? (correction.Of.ToString(CultureInfo.InvariantCulture), correction.Why) : ("", "");
        var said = (what as LoggedCorrection)?.Instead ?? what;
        var happened = said?.Happened is { } moment ? LogMoment.Text(moment) : "";
        string[] check = said is LoggedCheck one
            ? [Guarded(one.Name), one.Filling.ToString(CultureInfo.InvariantCulture), Guarded(one.Fluid), Guarded(one.Lot), Number(one.Temperature.DegreesCelsius), Number(one.Measured.PascalSeconds), Number(one.Expected.PascalSeconds), Number(one.Error.X), Number(one.Error.StandardUncertainty), Number(one.Limit), one.Outcome.Words()]
            : ["", "", "", "", "", "", "", "", "", "", ""];
        var words = what switch
        {
            LoggedOpening opening => opening.Instrument,
            LoggedAdjustment adjustment => adjustment.What,
            LoggedCorrection => why,
            _ => "",
        };
        return [corrects, happened, .. check, Guarded(words)];
    }

    private static string Number(double number) => number.ToString("R", CultureInfo.InvariantCulture);

    // What a spreadsheet would take for a formula.
    private static string Guarded(string text) => text is ['=' or '+' or '-' or '@' or '\t' or '\r', ..] ? $"'{text}" : text;

    private static string Quoted(string text) => text.AsSpan().IndexOfAny(",\"\n\r") < 0 ? text : $"\"{text.Replace("\"", "\"\"", StringComparison.Ordinal)}\"";
}
