namespace HemoRheo;

/// <summary>A rule broken by one check or by successive ones.</summary>
/// <param name="Rule">The rule.</param>
/// <param name="First">The check at which it was broken first.</param>
/// <param name="Checks">How many successive checks break it.</param>
/// <param name="Upwards">Whether the checks read too high.</param>
/// <param name="Provisional">Whether the baseline was not complete yet.</param>
/// <param name="FalseAlarm">How often an instrument that has not changed gives such a signal.</param>
/// <param name="Finding">The signal in words, its false alarms beside it.</param>
public sealed record ChartSignal(ChartRule Rule, ChartedCheck First, int Checks, bool Upwards, bool Provisional, ChartFalseAlarm FalseAlarm, Finding Finding)
{
    /// <inheritdoc/>
    public override string ToString() => Finding.Message;
}
