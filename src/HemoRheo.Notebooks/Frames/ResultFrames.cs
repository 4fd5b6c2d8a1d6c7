using Deedle;
using HemoRheo.Notebooks;

namespace HemoRheo;

/// <summary>Results as frames, one row a value, a point or a check. Numbers are in the unit that the heading or the row names.</summary>
public static class ResultFrames
{
    /// <summary>Every value of every sample, with its interval, uncertainty and verdict.</summary>
    /// <param name="result">The result of a study.</param>
    public static Frame<int, string> ValuesFrame(this StudyResult result) => Values(result.Samples).ToFrame();

    /// <summary>Every value of one sample.</summary>
    /// <param name="sample">The sample.</param>
    public static Frame<int, string> ValuesFrame(this JudgedSample sample) => Values([sample]).ToFrame();

    /// <summary>Every point of a curve, those set aside included.</summary>
    /// <param name="curve">The curve.</param>
    public static Frame<int, string> PointsFrame(this FlowCurve curve) => CurveView.Table(curve).ToFrame();

    /// <summary>Every point of every analyzed curve of a study, those set aside included.</summary>
    /// <param name="result">The result of a study.</param>
    public static Frame<int, string> PointsFrame(this StudyResult result)
    {
        var loadings = result.Samples.SelectMany(sample => sample.Result.Loadings.SelectMany(loading => CurveView.Table(loading.Curve).Rows.Select(row => (sample.Sample, loading.Recording.Loading, row))));
        return Table.Of("sample", "loading", "point", "shear rate", "shear stress", "viscosity", "temperature", "kept", "set aside because", "where")
            .WithRows(loadings, one => [one.Sample, one.Loading, .. one.row]).ToFrame();
    }

    /// <summary>Every check of a study's instruments.</summary>
    /// <param name="result">The result of a study.</param>
    public static Frame<int, string> ChecksFrame(this StudyResult result) => HistoryView.Table(result.Analyzed.Histories.SelectMany(history => history.Checks)).ToFrame();

    private static Table Values(IEnumerable<JudgedSample> samples) =>
        Table.Of("sample", "measurand", "law", "basis", "value", "lower", "upper", "standard uncertainty", "degrees of freedom", "unit", "interpolated", "decidable", "outcome", "p below", "p within", "p above", "marked", "status")
            .WithRows(samples.SelectMany(sample => sample.Values.Select(value => (sample, value))), one => Row(one.sample, one.value));

    private static Cell[] Row(JudgedSample sample, JudgedValue judged)
    {
        var value = judged.Value;
        var interval = value.Interval();
        return
        [
            sample.Sample,
            value.Measurand.Name,
            value.Law,
            Words.Of(value.Basis),
            Number(value.Shown),
            Number(interval.Lower),
            Number(interval.Upper),
            Number(value.Value.StandardUncertainty * (value.Measurand.Logarithmic ? value.Shown : 1 / value.Measurand.Shown.Factor)),
            value.Value.DegreesOfFreedom,
            value.Measurand.Shown.Symbol,
            value.Interpolated is { } read ? Number(value.Measurand.ToShown(read)) : Cell.Empty,
            value.Decidable,
            judged.Verdict is { } verdict ? Words.Of(verdict.Outcome) : Cell.Empty,
            judged.Verdict?.Below,
            judged.Verdict?.Within,
            judged.Verdict?.Above,
            judged.Marked,
            Words.Of(sample.Result.Status),
        ];
    }

    private static Cell Number(double number) => double.IsFinite(number) ? number : Cell.Empty;
}
