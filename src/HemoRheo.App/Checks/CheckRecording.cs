namespace HemoRheo.App;

/// <summary>Appends to an instrument's log what the study knows and the log does not: adjustments of the study file and checks, in the order in which they happened.</summary>
internal sealed class CheckRecording(TextWriter output, TimeProvider clock)
{
    /// <summary>Records.</summary>
    /// <param name="request">Which instrument.</param>
    /// <param name="by">Who records.</param>
    /// <returns>The exit code.</returns>
    public int Of(CheckRequest request, string by)
    {
        if (string.IsNullOrWhiteSpace(by) || by.Any(char.IsControl) || by[0] is '=' or '+' or '-' or '@') throw new CouldNotRunException("Say who records: --by <name>, in one line, not beginning with = + - @.");
        var study = CheckedStudy.Of(request);
        var log = Opened(study, by);
        var contents = log.Read();
        if (contents.Instrument != study.Instrument) throw new CouldNotRunException($"\"{log.Path}\" is the log of instrument \"{contents.Instrument}\", not of \"{study.Instrument}\". Nothing was recorded.");
        if (contents.Verification.FirstBreak is { } broken) throw new CouldNotRunException($"\"{log.Path}\" is not as it was written: {broken}. Nothing was recorded. Keep the file as it is, compare it with a copy, and go on with the last good one.");

        var checks = study.History.Course(study.Readings).Checks.Where(check => !contents.Holds(check)).ToArray();
        var adjusted = study.History.Instrument.Adjusted.Except(contents.Adjustments.Select(adjustment => adjustment.At)).Select(at => new LoggedAdjustment(at, "adjusted, as the study file says"));
        var changed = checks.Where(contents.HoldsOtherwise).ToArray();
        var events = checks.Except(changed).Select(check => (check.At, What: (LoggedEvent)check)).Concat(adjusted.Select(one => (one.At, What: (LoggedEvent)one))).OrderBy(one => one.At).ToArray();
        var digest = contents.Verification.LastDigest;
        foreach (var (_, what) in events)
        {
            var entry = log.Append(what, clock.GetLocalNow(), by);
            digest = entry.Digest;
            Tell($"recorded {entry.Number}: {what}");
            foreach (var finding in entry.Findings) Tell($"  {finding.Message} {finding.Kind.WhatToDo}");
        }

        foreach (var check in changed) Tell($"not recorded: {check}. The log holds it with other readings, so its export was changed since. Find out why; what is right is recorded as a correction, from a notebook.");
        foreach (var finding in study.History.Findings.Where(finding => finding.Severity == Severity.Fault)) Tell($"not counted: {finding.Message} {finding.Kind.WhatToDo}");
        if (events.Length == 0) Tell("nothing new: the log holds every check of the study");
        Tell($"log {log.Path}");
        Tell($"last digest {digest}");
        Tell("Note the last digest outside the computer, in the lab book: it shows later that nothing was changed or cut off.");
        return ExitCode.Done;
    }

    private InstrumentLog Opened(CheckedStudy study, string by)
    {
        if (File.Exists(study.Log.Path)) return InstrumentLog.Open(study.Log.Path);
        var log = InstrumentLog.Create(study.Log.Path, study.Instrument, clock.GetLocalNow(), by);
        Tell($"a new log was begun for {study.Instrument}");
        return log;
    }

    private void Tell(string line) => output.Write($"{Plain.Text(line)}\n");
}
