using static System.FormattableString;

namespace HemoRheo;

/// <summary>Makes rows of events and entries of rows.</summary>
internal static class LogEntries
{
    /// <summary>The row that follows; the first where there is none before.</summary>
    internal static LogRow Row(LogRow? before, LoggedEvent what, DateTimeOffset recordedAt, string by)
    {
        var row = new LogRow((before?.Number ?? 0) + 1, what.Kind, LogMoment.Text(recordedAt), Checked(by, "name of who records"), LogJson.Write(what), "");
        return row with { Digest = row.DigestAfter(before?.Digest ?? "") };
    }

    /// <summary>The entry of a row that says this.</summary>
    internal static LogEntry Of(LogRow row, LoggedEvent what, LogRow? before)
    {
        var recordedAt = LogMoment.Read(row.RecordedAt);
        return new(row.Number, recordedAt, row.By, what, row.Digest, ClockFindings(row, recordedAt, what, before).ToItems());
    }

    internal static string Checked(string text, string what) => string.IsNullOrWhiteSpace(text) || text.Any(char.IsControl) || text[0] is '=' or '+' or '-' or '@'
        ? throw new ArgumentException($"The {what} may not be empty, hold a line break or other control character, or begin with = + - @: '{text}'.", nameof(text))
        : text;

    internal static void Check(LoggedEvent what, string instrument)
    {
        if (what is LoggedOpening) throw new ArgumentException("A log is opened once, when it is created.", nameof(what));
        if (what is LoggedCheck check)
        {
            if (check.Instrument != instrument) throw new ArgumentException($"The check '{check.Name}' is of instrument '{check.Instrument}', the log of '{instrument}': record it in the log of its own.", nameof(what));
            double[] numbers = [check.Temperature.DegreesCelsius, check.Measured.PascalSeconds, check.Expected.PascalSeconds, check.Error.X, check.Limit, check.ProbabilityWithin, .. check.Error.Parts.Select(part => part.Amount), .. check.Readings.SelectMany(reading => new[] { reading.Rate, reading.Torque ?? 0, reading.Error })];
            if (!numbers.All(double.IsFinite)) throw new ArgumentException($"The check '{check.Name}' holds a number that is not finite: what gives no number is not recorded.", nameof(what));
        }

        if (what is LoggedBlankRun run && !run.Readings.All(reading => double.IsFinite(reading.Speed) && double.IsFinite(reading.Torque) && double.IsFinite(reading.Noise)))
        {
            throw new ArgumentException("The blank run holds a number that is not finite: leave that speed out.", nameof(what));
        }

        if (what is LoggedCorrection correction)
        {
            if (string.IsNullOrWhiteSpace(correction.Why)) throw new ArgumentException("A correction says why.", nameof(what));
            if (correction.Instead is { } instead) Check(instead, instrument);
        }
    }

    internal static void CheckTarget(LoggedCorrection correction, LogRow? target)
    {
        if (target is null) throw new ArgumentException(Invariant($"There is no entry {correction.Of} to correct."), nameof(correction));
        if (target.Kind is "opening") throw new ArgumentException("The opening of a log cannot be corrected: create another log.", nameof(correction));
        if (target.Kind is "correction") throw new ArgumentException(Invariant($"Entry {correction.Of} is a correction itself: correct the entry it speaks of once more, the last correction counts."), nameof(correction));
        if (correction.Instead is { } instead && instead.Kind != target.Kind) throw new ArgumentException(Invariant($"Entry {correction.Of} is a {target.Kind} and cannot become a {instead.Kind}: withdraw it and record the other."), nameof(correction));
    }

    private static IEnumerable<Finding> ClockFindings(LogRow row, DateTimeOffset recordedAt, LoggedEvent what, LogRow? before)
    {
        if (before is not null && LogMoment.Read(before.RecordedAt) is var earlier && recordedAt < earlier)
        {
            yield return CalibrationFindings.LogClockSetBack.At(Where.Nowhere, Invariant($"Entry {row.Number} was recorded at {recordedAt:yyyy-MM-dd HH:mm zzz}, before entry {before.Number} at {earlier:yyyy-MM-dd HH:mm zzz}."));
        }

        if (what.Happened is { } happened && happened > recordedAt)
        {
            yield return CalibrationFindings.LogAheadOfClock.At(Where.Nowhere, Invariant($"Entry {row.Number} speaks of {happened:yyyy-MM-dd HH:mm zzz} and was recorded before, at {recordedAt:yyyy-MM-dd HH:mm zzz}."));
        }
    }
}
