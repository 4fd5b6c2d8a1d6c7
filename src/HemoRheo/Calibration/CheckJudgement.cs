using static System.FormattableString;

namespace HemoRheo;

/// <summary>Holds a check's error against its limit.</summary>
internal static class CheckJudgement
{
    /// <summary>The check with its outcome: it passes or fails where that is at least as probable as the level, else it cannot tell.</summary>
    internal static InstrumentCheck Judged(this InstrumentCheck check, double level)
    {
        var verdict = Verdict.Of(check.Error, Limits(check.Limit), level);
        return check with { Outcome = OutcomeOf(verdict), ProbabilityWithin = verdict.Within };
    }

    /// <summary>Limits of ln(measured/expected) for a largest relative error.</summary>
    internal static Interval Limits(double relative) => new(Math.Log(1 - relative), Math.Log(1 + relative));

    /// <summary>What a verdict says of the instrument.</summary>
    internal static CheckOutcome OutcomeOf(Verdict verdict) => verdict.Outcome switch
    {
        Outcome.Within => CheckOutcome.Passes,
        Outcome.Below or Outcome.Above => CheckOutcome.Fails,
        _ => CheckOutcome.CannotTell,
    };

    /// <summary>The check judged again with the scatter of checks beyond their fits in its budget, its decades of torque, and the findings of its outcome.</summary>
    internal static InstrumentCheck Settled(this InstrumentCheck check, Instrument instrument, CheckScatter? scatter, double level)
    {
        var error = scatter is null ? check.Error : check.Error.With(scatter.OfCheck(InstrumentDay.Key(instrument.Name, check.Day)));
        var settled = (check with { Error = error }).Judged(level);
        settled = settled with { Bands = CheckBands.Of(settled, instrument, level) };
        return settled with { Findings = settled.Findings.With(settled.OutcomeFindings().Concat(CheckBands.Findings(settled))) };
    }

    private static IEnumerable<Finding> OutcomeFindings(this InstrumentCheck check)
    {
        if (check.Outcome == CheckOutcome.Passes) yield break;
        var kind = check.Outcome == CheckOutcome.Fails ? CalibrationFindings.CheckFailed : CalibrationFindings.CheckCannotTell;
        var interval = check.Error.Interval().Select(Math.Exp);
        var percent = 100 * (Math.Exp(check.Error.X) - 1);
        yield return kind.At(
            check.Fit.Curve.Label.Where,
            Invariant($"Check '{check.Name}' of {check.Day:yyyy-MM-dd} is off by {percent:+0.00;-0.00} % (95 % interval {100 * (interval.Lower - 1):+0.00;-0.00} to {100 * (interval.Upper - 1):+0.00;-0.00} %); {100 * check.Limit:G3} % is allowed, probability within {check.ProbabilityWithin:F3}."),
            percent,
            100 * check.Limit);
    }
}
