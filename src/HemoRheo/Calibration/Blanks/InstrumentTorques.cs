using static System.FormattableString;

namespace HemoRheo;

/// <summary>What an instrument's blank runs say of a moment.</summary>
public static class InstrumentTorques
{
    /// <summary>
    /// How far torques can be trusted at a moment: by the last blank run of that local day before it (else the first after it that day), else by the last one before, with its age
    /// and with the declared uncertainty of the day's zero beside its own, else by what the study file declares. A run that an adjustment parts from the moment does not count.
    /// </summary>
    /// <param name="history">The instrument's history.</param>
    /// <param name="moment">The moment.</param>
    public static TorqueTrust TorqueAt(this InstrumentHistory history, DateTimeOffset moment) => Of(history.Instrument, history.Blanks, moment);

    /// <summary>The blank runs of an instrument by time, and findings for recordings that give none.</summary>
    internal static (Items<BlankRun> Runs, Items<Finding> Faults) Read(Study study, Instrument instrument, IEnumerable<Recording> recordings)
    {
        var read = recordings.Where(recording => recording.Instrument == instrument.Name).OrderBy(recording => recording.StartedAt).Select(recording => BlankReading.Of(study, instrument, recording)).ToArray();
        return (read.Select(reading => reading.Run).OfType<BlankRun>().ToItems(), read.Select(reading => reading.Fault).OfType<Finding>().ToItems());
    }

    internal static TorqueTrust Of(Instrument instrument, Items<BlankRun> runs, DateTimeOffset moment)
    {
        var date = DateOnly.FromDateTime(moment.DateTime);
        var declared = TorqueTrust.OfDeclared(instrument, InstrumentDay.Key(instrument.Name, date));
        var valid = runs.Where(run => !(instrument.AdjustedAfter(run.At < moment ? run.At : moment) is { } adjusted && adjusted <= (run.At < moment ? moment : run.At))).ToArray();
        var ofDay = valid.LastOrDefault(run => run.Day == date && run.At <= moment) ?? valid.FirstOrDefault(run => run.Day == date);
        if ((ofDay ?? valid.LastOrDefault(run => run.At <= moment)) is not { } run) return declared;
        var before = runs.Count(other => other.Day == run.Day && other.At < run.At);
        return declared with
        {
            Basis = ofDay is null ? TorqueBasis.EarlierBlank : TorqueBasis.BlankOfDay,
            BlankRun = run.Name,
            Age = moment - run.At,
            Speeds = run.Torques,
            Corrected = instrument.CorrectTorqueZero,
            DeclaredZero = ofDay is null ? instrument.TorqueZero : 0,
            BlankDay = InstrumentDay.Key(instrument.Name, run.Day) + (before == 0 ? "" : Invariant($" ({before + 1})")),
        };
    }

    /// <summary>Says so where a study that makes blank runs has none of the day for a recording.</summary>
    internal static IEnumerable<Finding> Findings(Study study, FlowCurve curve)
    {
        if (curve is not { Torque: { } torque, Label.Recording: { } recording }) yield break;
        if (torque.Basis == TorqueBasis.EarlierBlank)
        {
            yield return CalibrationFindings.BlankEarlier.At(curve.Label.Where, Invariant($"The last blank run of '{recording.Instrument}', '{torque.BlankRun}', is {torque.Age!.Value.TotalDays:F1} days old."), torque.Age.Value.TotalDays);
        }
        else if (torque.BlankRun is null && study.Files.Blanks.Count > 0)
        {
            yield return CalibrationFindings.BlankNone.At(curve.Label.Where, $"There is no blank run of '{recording.Instrument}' before; torques rest on {(torque.Basis == TorqueBasis.Declared ? "the declared floor" : "nothing")}.");
        }
    }
}
