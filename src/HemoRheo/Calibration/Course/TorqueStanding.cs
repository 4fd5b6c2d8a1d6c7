namespace HemoRheo;

/// <summary>An instrument's standing in one decade of torque: it can be right at high torque and wrong at low.</summary>
/// <param name="Torque">The decade, N.m: from its lower end to below its upper one.</param>
/// <param name="Standing">The standing there.</param>
public sealed record TorqueStanding(Interval Torque, InstrumentStanding Standing)
{
    /// <summary>The decade in words, e.g. <c>1 to 10 uN.m</c>.</summary>
    public string Range => TorqueDecade.Words(Torque);

    /// <inheritdoc/>
    public override string ToString() => $"{Standing.Status.Words()} at {Standing.Reason}";
}
