namespace HemoRheo.Notebooks;

/// <summary>Who must do what about an instrument.</summary>
internal static class ReviewTasks
{
    private const string Measuring = "Whoever measures";
    private const string Managing = "Lab manager";
    private const string Judging = "Whoever judges the samples";

    /// <summary>The tasks, the most urgent first.</summary>
    public static Items<ReviewTask> Of(InstrumentReview review) => [.. OfStanding(review), .. OfTorques(review), .. OfChange(review), .. OfSamples(review), .. OfLog(review)];

    private static IEnumerable<ReviewTask> OfStanding(InstrumentReview review)
    {
        var checks = review.Course.Checks;
        var last = checks.Count == 0 ? null : checks[^1];
        switch (review.Standing.Status)
        {
            case InstrumentStatus.InOrder:
                yield return new(Measuring, $"Go on; check again by {Figures.Date(last!.At + review.Instrument.CheckEvery)}.", false);
                break;
            case InstrumentStatus.Failed:
                yield return new(Measuring, "Stop: measure no sample. Clean, look at fluid and temperature, and check again with a new filling.", true);
                yield return new(Managing, "If it fails again, have it adjusted, and write the moment in the study file.", true);
                break;
            case InstrumentStatus.InDoubt when last?.Outcome == CheckOutcome.CannotTell:
                yield return new(Measuring, "Check again before the next sample, with several fillings or a fluid that is certified better.", true);
                break;
            default:
                yield return new(Measuring, "Check it before the next sample.", true);
                break;
        }
    }

    private static IEnumerable<ReviewTask> OfTorques(InstrumentReview review)
    {
        var failed = review.ByTorque.Where(decade => decade.Standing.Status == InstrumentStatus.Failed).Select(decade => decade.Range).ToArray();
        if (failed.Length == 0 || review.Standing.Status == InstrumentStatus.Failed) yield break;
        yield return new(Measuring, $"Trust no readings at torques of {string.Join(" and ", failed)}: set the torque zero anew, run the instrument empty, and check again.", true);
    }

    private static IEnumerable<ReviewTask> OfChange(InstrumentReview review)
    {
        if (review.Chart.Current.Changes is not { } changes) yield break;
        yield return new(Measuring, "Check once more with a new filling from a fresh bottle: is it the fluid or the instrument?", true);
        yield return new(Managing, $"Look up what was done to the instrument around {Figures.Date(changes.Better.MostLikely)}; have it adjusted before its checks fail.", true);
    }

    private static IEnumerable<ReviewTask> OfSamples(InstrumentReview review)
    {
        if (review.InDoubt.Count == 0) yield break;
        yield return new(Judging, $"Rest nothing on the {Figures.Count(review.InDoubt.Count, "sample")} in doubt alone; have measured again what matters.", true);
    }

    private static IEnumerable<ReviewTask> OfLog(InstrumentReview review)
    {
        if (review.Log is { FirstBreak: { } broken }) yield return new(Managing, $"The log was changed after it was written ({broken}). {CalibrationFindings.LogBroken.WhatToDo}", true);
        if (review.NotInLog.Count > 0) yield return new(Measuring, $"Record {Figures.Count(review.NotInLog.Count, "check")} of the study that the log does not hold: hemorheo check record.", true);
        if (review.Log is { Sound: true }) yield return new(Managing, "Write the log's last digest in the lab book.", false);
    }
}
