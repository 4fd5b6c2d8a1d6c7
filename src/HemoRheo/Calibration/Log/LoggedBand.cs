namespace HemoRheo;

/// <summary>A check within one decade of torque as the log keeps it.</summary>
/// <param name="Torque">The decade, N.m: from its lower end to below its upper one.</param>
/// <param name="Readings">How many readings it has.</param>
/// <param name="Error">ln(measured/expected) of these readings.</param>
/// <param name="Uncertainty">Its standard uncertainty.</param>
/// <param name="Outcome">What it said.</param>
/// <param name="ProbabilityWithin">Probability that the error lay within the limit of the check.</param>
public sealed record LoggedBand(Interval Torque, int Readings, double Error, double Uncertainty, CheckOutcome Outcome, double ProbabilityWithin)
{
    /// <summary>The decade in words, e.g. <c>1 to 10 uN.m</c>.</summary>
    public string Range => TorqueDecade.Words(Torque);

    /// <inheritdoc/>
    public override string ToString() => FormattableString.Invariant($"{Range}: {100 * (Math.Exp(Error) - 1):+0.00;-0.00} %, {Outcome.Words()}");
}
