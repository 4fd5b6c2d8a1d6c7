namespace HemoRheo;

/// <summary>A sample that what is wrong with an instrument puts in doubt.</summary>
/// <param name="Sample">Pseudonym.</param>
/// <param name="Loading">Number of its first loading in doubt.</param>
/// <param name="At">When that was measured.</param>
/// <param name="Status">The instrument's status then; in doubt where only the control chart speaks against it.</param>
/// <param name="Reason">Why, in one sentence.</param>
public sealed record SampleInDoubt(string Sample, int Loading, DateTimeOffset At, InstrumentStatus Status, string Reason)
{
    /// <inheritdoc/>
    public override string ToString() => FormattableString.Invariant($"sample {Sample}, loading {Loading} of {At:yyyy-MM-dd HH:mm zzz}, {Status.Words()}: {Reason}");
}
