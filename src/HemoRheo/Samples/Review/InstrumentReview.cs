namespace HemoRheo;

/// <summary>An instrument at one moment: is it right, did it change and since when, and which samples does that put in doubt.</summary>
/// <param name="Study">Name of the study.</param>
/// <param name="Course">Its checks.</param>
/// <param name="At">The moment.</param>
/// <param name="Standing">Its standing then.</param>
/// <param name="Chart">The control chart of its checks until then.</param>
/// <param name="Samples">Number of the study's samples measured on it until then.</param>
/// <param name="InDoubt">Those of them in doubt, by time.</param>
/// <param name="Log">How the log was verified; null where the checks are the study's own.</param>
/// <param name="NotInLog">Checks of the study that the log does not hold, by time.</param>
public sealed record InstrumentReview(
    string Study,
    InstrumentCourse Course,
    DateTimeOffset At,
    InstrumentStanding Standing,
    ControlChart Chart,
    int Samples,
    Items<SampleInDoubt> InDoubt,
    LogVerification? Log,
    Items<LoggedCheck> NotInLog)
{
    /// <summary>Its standing then by decade of torque, ascending; none where the torques of its checks are not known.</summary>
    public Items<TorqueStanding> ByTorque => Course.ByTorque(At);

    /// <summary>The instrument.</summary>
    public Instrument Instrument => Course.Instrument;

    /// <inheritdoc/>
    public override string ToString() => FormattableString.Invariant($"{Instrument.Name} on {At:yyyy-MM-dd HH:mm zzz}, {Standing}; {InDoubt.Count} of {Samples} samples in doubt");
}
