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
        Show<Items<Finding>>(FindingsView.Of, findings => FindingsView.Count(findings));
        ShowReadings();
        ShowFits();
        ShowValues();
        ShowStudies();
        Show<InteractiveChart>(ChartMarkup.Of);
        Show<GenericChart>(ChartMarkup.Of, _ => "chart");
        ShowFrames();
        Line<ShearRate>();
        Line<ShearStress>();
        Line<Viscosity>();
        Line<Temperature>();
        Line<Hematocrit>();
        Line<Interval>();
    }

    private static void ShowReadings()
    {
        Show<Study>(StudyView.Of);
        Show<StudyReadings>(ReadingsView.Of);
        Show<FlowCurve>(CurveView.Of);
        Show<FittedLaw>(FitView.Of);
        Show<LoadingResult>(LoadingView.Of, loading => loading.Curve.ToString());
        Show<InstrumentHistory>(history => HistoryView.Of([history]), history => $"instrument {history.Instrument.Name}: {history.Checks.Count} checks");
        Show<Items<InstrumentHistory>>(HistoryView.Of, histories => $"{histories.Count} instruments, {histories.Sum(history => history.Checks.Count)} checks");
        Show<ControlChart>(ControlChartView.Of);
        Show<LogContents>(ControlChartView.Of);
        Show<InstrumentReview>(ControlChartView.Of);
        Show<Items<InstrumentCheck>>(checks => TableMarkup.Of(HistoryView.Table(checks)), checks => $"{checks.Count} checks");
    }

    private static void ShowFits()
    {
        Show<Items<FittedLaw>>(fits => TableMarkup.Of(fits.ToTable()), fits => $"{fits.Count} fits");
        Show<FitInterval>(IntervalView.Of);
        Show<Items<FitInterval>>(IntervalView.Of, intervals => $"{intervals.Count} intervals");
        Show<Profile>(IntervalView.Of);
        Show<LawComparison>(ComparisonView.Of, comparison => comparison.Verdict);
        Show<FlowBehavior>(BehaviorView.Of);
        Show<JointFit>(JointFitView.Of);
        Show<LoadingsFit>(loadings => JointFitView.Of(loadings.Joint));
        Show<QuemadaStructure>(structure => Markup.Of($"<p>{structure.ToString()}</p>{FindingsView.Of(structure.Findings)}"));
    }

    private static void ShowValues()
    {
        Show<Estimate>(EstimateView.Of);
        Show<SampleResult>(SampleView.Of);
        Show<JudgedSample>(SampleView.Of);
        Show<SampleValue>(BudgetView.Of);
        Show<JudgedValue>(BudgetView.Of, value => $"{value.Value}: {(value.Verdict is { } verdict ? Words.Of(verdict.Outcome) : "not judged")}");
        Show<Items<SampleValue>>(values => TableMarkup.Of(ValuesView.Table(values)), values => $"{values.Count} values");
        Show<Items<JudgedValue>>(values => TableMarkup.Of(ValuesView.Table(values)), values => $"{values.Count} values");
    }

    private static void ShowStudies()
    {
        Show<StudyPool>(PoolView.Of, pool => $"pool of {pool.Laws.Count} laws, {pool.Slopes.Count} slopes");
        Show<Items<LawEvidence>>(laws => TableMarkup.Of(PoolView.Laws(laws)), laws => $"evidence for {laws.Count} laws");
        Show<PooledComparison>(comparison => TableMarkup.Of(PoolView.Compared(comparison)), comparison => comparison.Words);
        Show<ReferenceRange>(range => RangesView.Of([range]), range => $"reference range of {range.Measurand.Name}, {Words.Of(range.Basis)}: {range.Limits.Select(range.Measurand.ToShown)} {range.Measurand.Shown}");
        Show<Items<ReferenceRange>>(RangesView.Of, ranges => $"{ranges.Count} reference ranges");
        Show<StudyResult>(ResultView.Of);
        Show<CohortSummary>(SummaryView.Of, summary => $"{summary.Study} by {summary.By}: {summary.Measurands.Count} measurands");
        Show<RunRecord>(LedgerView.Of, record => $"run of {record.Study}: {record.Results.Count} numbers, digest {record.ResultDigest}");
        Show<RunComparison>(LedgerView.Of);
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

    private static void Line<T>()
        where T : struct
    {
        Formatter.Register<T>((value, writer) => writer.Write(value.ToString()), Plain);
        Formatter.SetPreferredMimeTypesFor(typeof(T), Plain);
    }
}
