namespace HemoRheo;

/// <summary>A check as the log keeps it: what any later judgement needs, without the study it was made in.</summary>
/// <param name="Instrument">Name of the instrument.</param>
/// <param name="Name">Name of the check.</param>
/// <param name="Filling">Number of the filling of the gap, from 1: readings of one filling are one check.</param>
/// <param name="At">When it was taken, with offset.</param>
/// <param name="Fluid">Name of the fluid.</param>
/// <param name="Lot">Its lot.</param>
/// <param name="Temperature">Mean temperature.</param>
/// <param name="Measured">Viscosity measured.</param>
/// <param name="Expected">Certified viscosity at that temperature.</param>
/// <param name="Error">ln(measured/expected) with its contributions.</param>
/// <param name="Limit">Largest relative error allowed then.</param>
/// <param name="Outcome">What the check said then.</param>
/// <param name="ProbabilityWithin">Probability that the error lay within the limit.</param>
/// <param name="Readings">Its readings.</param>
/// <param name="Export">Name of the export file; null where it was not made from one.</param>
/// <param name="ExportDigest">SHA-256 of that file, lower-case hexadecimal.</param>
public sealed record LoggedCheck(
    string Instrument,
    string Name,
    int Filling,
    DateTimeOffset At,
    string Fluid,
    string Lot,
    Temperature Temperature,
    Viscosity Measured,
    Viscosity Expected,
    Value Error,
    double Limit,
    CheckOutcome Outcome,
    double ProbabilityWithin,
    Items<LoggedReading> Readings,
    string? Export,
    string? ExportDigest) : LoggedEvent
{
    /// <summary>The check by decades of torque, ascending; none where torques are not known, or in entries of a program that did not judge them.</summary>
    public Items<LoggedBand> Bands { get; init; } = Items<LoggedBand>.None;

    /// <summary>The decade that holds a torque; null where the check says nothing of it.</summary>
    /// <param name="newtonMeters">The torque, N.m.</param>
    public LoggedBand? BandAt(double newtonMeters) => Bands.FirstOrDefault(band => TorqueDecade.Holds(band.Torque, newtonMeters));

    internal override string Kind => "check";

    internal override DateTimeOffset? Happened => At;

    /// <inheritdoc/>
    public override string ToString() => FormattableString.Invariant($"check {Name} of {At:yyyy-MM-dd}: {100 * (Math.Exp(Error.X) - 1):+0.00;-0.00} %, {Outcome.Words()}");
}
