using static System.FormattableString;

namespace HemoRheo;

/// <summary>The rule by which checks vouch for an instrument.</summary>
internal static class Vouching
{
    /// <summary>The instrument's standing at a moment, without a period.</summary>
    /// <param name="instrument">The instrument.</param>
    /// <param name="checks">Its checks in order of time.</param>
    /// <param name="moment">The moment; a check at this very moment lies before it.</param>
    internal static InstrumentStanding At(Instrument instrument, IReadOnlyList<VouchingCheck> checks, DateTimeOffset moment)
    {
        var before = checks.Where(check => check.At <= moment).ToArray();
        if (before.Length == 0) return Unknown(Invariant($"No check of '{instrument.Name}' lies before {moment:yyyy-MM-dd HH:mm zzz}."));

        var last = before[^1];
        var decided = before.LastOrDefault(check => check.Outcome != CheckOutcome.CannotTell);
        if (decided?.Outcome == CheckOutcome.Fails)
        {
            var reason = $"Failed at {decided}; none has passed since.";
            return new(InstrumentStatus.Failed, reason, null, [CalibrationFindings.InstrumentFailed.At(decided.Where, reason)]);
        }

        if (AdjustedSince(instrument, last.At, moment) is { } then) return Unknown(Invariant($"'{instrument.Name}' was adjusted on {then:yyyy-MM-dd HH:mm zzz} and not checked since; the last check was {last}."));

        var doubts = Doubts(instrument, checks, moment, last, decided).ToItems();
        if (doubts.Count > 0) return new(InstrumentStatus.InDoubt, doubts[0].Message, null, doubts);
        var until = last.At + instrument.CheckEvery;
        return new(InstrumentStatus.InOrder, Invariant($"Passed {last}, which vouches until {until:yyyy-MM-dd}."), null, []);
    }

    /// <summary>The standing at a moment for readings of one torque, named in the reason and in the findings.</summary>
    /// <param name="instrument">The instrument.</param>
    /// <param name="checks">Its checks in order of time, each with its outcome at this torque; null where it says nothing of it.</param>
    /// <param name="moment">The moment.</param>
    /// <param name="newtonMeters">The torque, N.m, above zero.</param>
    internal static InstrumentStanding At(Instrument instrument, IEnumerable<(VouchingCheck Check, CheckOutcome? There)> checks, DateTimeOffset moment, double newtonMeters)
    {
        var range = TorqueDecade.Words(TorqueDecade.Of(newtonMeters));
        var there = checks.Where(check => check.There is not null).Select(check => check.Check with { Outcome = check.There!.Value }).ToArray();
        var standing = At(instrument, there, moment);
        return standing with
        {
            Reason = $"{range}: {standing.Reason}",
            Findings = standing.Findings.Select(finding => finding with { Message = $"{range}: {finding.Message}" }).ToItems(),
        };
    }

    /// <summary>The first adjustment after one moment and not after another; null where there is none.</summary>
    internal static DateTimeOffset? AdjustedSince(Instrument instrument, DateTimeOffset since, DateTimeOffset moment) =>
        instrument.AdjustedAfter(since) is { } adjusted && adjusted <= moment ? adjusted : null;

    private static IEnumerable<Finding> Doubts(Instrument instrument, IReadOnlyList<VouchingCheck> checks, DateTimeOffset moment, VouchingCheck last, VouchingCheck? passed)
    {
        var next = checks.FirstOrDefault(check => check.At > moment && check.Outcome != CheckOutcome.CannotTell);
        if (next?.Outcome == CheckOutcome.Fails)
        {
            var since = passed is null ? $"no check has passed before, {last} could not tell" : $"the last passed one was {passed}";
            yield return CalibrationFindings.FailureReachesBack.At(next.Where, $"Failed afterwards at {next}; {since}.");
        }

        if (last.Outcome == CheckOutcome.CannotTell)
        {
            yield return CalibrationFindings.LastCheckUnsure.At(last.Where, $"Could not tell at {last}.");
        }

        if (passed is not null && moment - passed.At > instrument.CheckEvery)
        {
            var (age, allowed) = ((moment - passed.At).TotalDays, instrument.CheckEvery.TotalDays);
            yield return CalibrationFindings.CheckOverdue.At(passed.Where, Invariant($"Passed {passed} {age:F1} days before; it vouches for {allowed:G3} days."), age, allowed);
        }
    }

    private static InstrumentStanding Unknown(string reason) => new(InstrumentStatus.Unknown, reason, null, [CalibrationFindings.NotChecked.At(Where.Nowhere, reason)]);
}
