using Deedle;
using Microsoft.DotNet.Interactive.Formatting;
using Plotly.NET;

namespace HemoRheo.Notebooks;

/// <summary>How the library's results, frames and charts are shown in a notebook: as HTML, with one line of plain text beside it.</summary>
internal static class ResultFormats
{
    private const string Html = "text/html";
    private const string Plain = "text/plain";

    public static void Register()
    {
        Show<Table>(table => TableMarkup.Of(table));
        Show<Finding>(finding => TableMarkup.Of(FindingsView.Table([finding])));
        Show<Items<Finding>>(FindingsView.Of);
        Show<Study>(StudyView.Of);
        Show<StudyReadings>(ReadingsView.Of);
        Show<FlowCurve>(CurveView.Of);
        Show<FittedLaw>(FitView.Of);
        Show<SampleResult>(SampleView.Of);
        Show<JudgedSample>(SampleView.Of);
        Show<SampleValue>(BudgetView.Of);
        Show<JudgedValue>(BudgetView.Of);
        Show<Items<SampleValue>>(values => TableMarkup.Of(ValuesView.Table(values)));
        Show<Items<JudgedValue>>(values => TableMarkup.Of(ValuesView.Table(values)));
        Show<Items<InstrumentCheck>>(checks => TableMarkup.Of(HistoryView.Table(checks)));
        Show<InstrumentHistory>(history => HistoryView.Of([history]));
        Show<Items<InstrumentHistory>>(HistoryView.Of);
        Show<ReferenceRange>(range => RangesView.Of([range]));
        Show<Items<ReferenceRange>>(RangesView.Of);
        Show<StudyResult>(ResultView.Of);
        Show<CohortSummary>(SummaryView.Of);
        Show<RunRecord>(LedgerView.Of);
        Show<RunComparison>(LedgerView.Of);
        Show<InteractiveChart>(ChartMarkup.Of);
        Show<GenericChart>(ChartMarkup.Of, _ => "chart");
        ShowFrames();
    }

    private static void ShowFrames()
    {
        Formatter.Register(typeof(Frame<,>), (frame, writer) => writer.Write(FrameMarkup.Of((IFrame)frame)), Html);
        Formatter.Register(typeof(Frame<,>), (frame, writer) => writer.Write(FrameMarkup.Size((IFrame)frame)), Plain);
        Formatter.SetPreferredMimeTypesFor(typeof(Frame<,>), Html, Plain);
    }

    private static void Show<T>(Func<T, Markup> markup, Func<T, string>? line = null)
        where T : class
    {
        Formatter.Register<T>((value, writer) => writer.Write(markup(value).Text), Html);
        Formatter.Register<T>((value, writer) => writer.Write(line?.Invoke(value) ?? value.ToString() ?? ""), Plain);
        Formatter.SetPreferredMimeTypesFor(typeof(T), Html, Plain);
    }
}
