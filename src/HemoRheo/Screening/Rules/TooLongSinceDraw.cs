using static System.FormattableString;

namespace HemoRheo;

/// <summary>
/// Blood measured longer after the draw than the study allows, before it, or at an unknown age. Cause: a queue, or a time not written down. Cure: draw again, or write it down.
/// </summary>
internal sealed class TooLongSinceDraw : IScreeningRule
{
    public Items<FindingKind> Kinds { get; } = [ScreeningFindings.TooLongSinceDraw, ScreeningFindings.MeasuredBeforeDraw, ScreeningFindings.TimeSinceDrawUnknown];

    public IEnumerable<Finding> Judge(FlowCurve curve, Study study, SampleRecord? sample)
    {
        if (curve.Label.Recording is not { Kind: RecordingKind.Blood } recording) yield break;
        var where = curve.Label.Where;
        if (sample?.DrawnAt is not { } drawn)
        {
            yield return ScreeningFindings.TimeSinceDrawUnknown.At(where, $"The samples table does not say when sample '{curve.Label.Sample}' was drawn.");
            yield break;
        }

        var (age, longest) = (recording.StartedAt - drawn, study.Screening.LongestSinceDraw);
        if (age < TimeSpan.Zero)
        {
            yield return ScreeningFindings.MeasuredBeforeDraw.At(where, Invariant($"Measured at {recording.StartedAt:yyyy-MM-dd HH:mm zzz}, {Clock(-age)} before the draw."), age.TotalHours, 0);
        }
        else if (age > longest)
        {
            yield return ScreeningFindings.TooLongSinceDraw.At(where, $"Measured {Clock(age)} after the draw; at most {Clock(longest)} is allowed.", age.TotalHours, longest.TotalHours);
        }
    }

    private static string Clock(TimeSpan span) => Invariant($"{Math.Floor(span.TotalHours):F0} h {span.Minutes:00} min");
}
