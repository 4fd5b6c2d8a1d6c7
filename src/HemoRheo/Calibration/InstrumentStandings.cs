using static System.FormattableString;

namespace HemoRheo;

/// <summary>What an instrument's checks say of a moment.</summary>
public static class InstrumentStandings
{
    /// <summary>
    /// The instrument's status at a moment from the checks around it. Unknown: no check before, or none since an adjustment. Failed: after a failed check and before the next passed one.
    /// In doubt: the next decided check failed, the last could not tell, or the last passed one is longer ago than it vouches. In order: else.
    /// </summary>
    /// <param name="history">The instrument's history.</param>
    /// <param name="moment">The moment; a check at this very moment lies before it.</param>
    /// <returns>The status, and the period whose correction applies: the last that began before the moment, unless the instrument was adjusted since its last check.</returns>
    public static InstrumentStanding At(this InstrumentHistory history, DateTimeOffset moment)
    {
        var instrument = history.Instrument;
        var before = history.Checks.Where(check => check.At <= moment).ToArray();
        if (before.Length == 0) return Unknown(Invariant($"No check of '{instrument.Name}' lies before {moment:yyyy-MM-dd HH:mm zzz}."));

        var last = before[^1];
        var adjusted = instrument.AdjustedAfter(last.At) is { } at && at <= moment ? at : (DateTimeOffset?)null;
        var period = adjusted is null ? history.Periods.LastOrDefault(period => period.From <= moment) : null;
        var correction = history.Findings.Where(finding => finding.Kind == CalibrationFindings.ScatterUnknown);

        var decided = before.LastOrDefault(check => check.Outcome != CheckOutcome.CannotTell);
        if (decided?.Outcome == CheckOutcome.Fails)
        {
            var reason = $"Failed at {Named(decided)}; none has passed since.";
            return new(InstrumentStatus.Failed, reason, period, CorrectionFirst(correction, CalibrationFindings.InstrumentFailed.At(PlaceOf(decided), reason)));
        }

        if (adjusted is { } then) return Unknown(Invariant($"'{instrument.Name}' was adjusted on {then:yyyy-MM-dd HH:mm zzz} and not checked since; the last check was {Named(last)}."));

        var doubts = Doubts(history, moment, last, decided).ToArray();
        if (doubts.Length > 0) return new(InstrumentStatus.InDoubt, doubts[0].Message, period, CorrectionFirst(correction, doubts));
        var until = last.At + instrument.CheckEvery;
        return new(InstrumentStatus.InOrder, Invariant($"Passed {Named(last)}, which vouches until {until:yyyy-MM-dd}."), period, correction.ToItems());
    }

    private static IEnumerable<Finding> Doubts(InstrumentHistory history, DateTimeOffset moment, InstrumentCheck last, InstrumentCheck? passed)
    {
        var next = history.Checks.FirstOrDefault(check => check.At > moment && check.Outcome != CheckOutcome.CannotTell);
        if (next?.Outcome == CheckOutcome.Fails)
        {
            var since = passed is null ? $"no check has passed before, {Named(last)} could not tell" : $"the last passed one was {Named(passed)}";
            yield return CalibrationFindings.FailureReachesBack.At(PlaceOf(next), $"Failed afterwards at {Named(next)}; {since}.");
        }

        if (last.Outcome == CheckOutcome.CannotTell)
        {
            yield return CalibrationFindings.LastCheckUnsure.At(PlaceOf(last), $"Could not tell at {Named(last)}.");
        }

        if (passed is not null && moment - passed.At > history.Instrument.CheckEvery)
        {
            var (age, allowed) = ((moment - passed.At).TotalDays, history.Instrument.CheckEvery.TotalDays);
            yield return CalibrationFindings.CheckOverdue.At(PlaceOf(passed), Invariant($"Passed {Named(passed)} {age:F1} days before; it vouches for {allowed:G3} days."), age, allowed);
        }
    }

    private static InstrumentStanding Unknown(string reason) => new(InstrumentStatus.Unknown, reason, null, [CalibrationFindings.NotChecked.At(Where.Nowhere, reason)]);

    private static Items<Finding> CorrectionFirst(IEnumerable<Finding> correction, params Finding[] findings) => correction.Concat(findings).ToItems();

    private static Where PlaceOf(InstrumentCheck check) => check.Fit.Curve.Label.Where;

    private static string Named(InstrumentCheck check) => Invariant($"check '{check.Name}' of {check.Day:yyyy-MM-dd}");
}
