using static System.FormattableString;

namespace HemoRheo;

/// <summary>
/// A check within one decade of torque. An instrument can be right at high torque and wrong at low, and the check as a whole, which rests on its largest torques, then does not see it.
/// </summary>
/// <param name="Torque">The decade, N.m: from its lower end to below its upper one.</param>
/// <param name="Readings">How many readings it has.</param>
/// <param name="Measured">Viscosity of these readings.</param>
/// <param name="Error">ln(measured/expected) with its contributions: those of the check, with fit and torque zero of these readings.</param>
/// <param name="Limit">Largest relative error allowed.</param>
/// <param name="Level">Probability that decides.</param>
/// <param name="Outcome">What it says, by the same rule as the whole check.</param>
/// <param name="ProbabilityWithin">Probability that the error lies within the limit.</param>
/// <remarks>Source: JCGM 106:2012 for the decision, ISO 13528:2015 for E_n.</remarks>
public sealed record CheckBand(
    Interval Torque,
    int Readings,
    Viscosity Measured,
    Value Error,
    double Limit,
    double Level,
    CheckOutcome Outcome,
    double ProbabilityWithin)
{
    /// <summary>E_n: the error over its expanded uncertainty.</summary>
    public double NormalizedError => HemoRheo.NormalizedError.Of(Error);

    /// <summary>The error held against limits of acceptance, a guard band inside the limit as the level asks for, with the probability that accepting is wrong.</summary>
    public Acceptance Acceptance => Acceptance.AtLevel(Error, CheckJudgement.Limits(Limit), Level);

    /// <summary>What would decide; null where it is decided.</summary>
    public CheckNeed? Need => Outcome == CheckOutcome.CannotTell ? CheckNeeds.Of(Error, Readings, CheckJudgement.Limits(Limit), Level) : null;

    /// <summary>The decade in words, e.g. <c>1 to 10 uN.m</c>.</summary>
    public string Range => TorqueDecade.Words(Torque);

    /// <summary>Whether a torque lies in it.</summary>
    /// <param name="newtonMeters">The torque, N.m.</param>
    public bool Holds(double newtonMeters) => TorqueDecade.Holds(Torque, newtonMeters);

    /// <inheritdoc/>
    public override string ToString() => Invariant($"{Range}: {100 * (Math.Exp(Error.X) - 1):+0.00;-0.00} % from {Readings} readings, E_n {NormalizedError:0.00}, {Outcome.Words()}, wrongly accepted with a probability of {Acceptance.WrongAcceptance:G3}{(Need is { } need ? $". {need}" : "")}");
}
