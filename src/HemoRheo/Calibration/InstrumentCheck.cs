namespace HemoRheo;

/// <summary>One check of an instrument with a calibration fluid.</summary>
/// <param name="Name">Name of the check.</param>
/// <param name="Instrument">Name of the instrument.</param>
/// <param name="Fluid">The fluid.</param>
/// <param name="At">When.</param>
/// <param name="Temperature">Mean temperature of the readings.</param>
/// <param name="Measured">Viscosity measured.</param>
/// <param name="Expected">Certified viscosity, moved to that temperature.</param>
/// <param name="Error">ln(measured/expected) with its contributions by source.</param>
/// <param name="Limit">Largest relative error allowed.</param>
/// <param name="Outcome">What it says.</param>
/// <param name="ProbabilityWithin">Probability that the error lies within the limit.</param>
/// <param name="Fit">The Newtonian fit of its readings.</param>
/// <param name="Findings">Findings.</param>
public sealed record InstrumentCheck(
    string Name,
    string Instrument,
    CalibrationFluid Fluid,
    DateTimeOffset At,
    Temperature Temperature,
    Viscosity Measured,
    Viscosity Expected,
    Value Error,
    double Limit,
    CheckOutcome Outcome,
    double ProbabilityWithin,
    FittedLaw Fit,
    Items<Finding> Findings)
{
    /// <summary>The check by decades of torque, ascending; empty where torques are not known. The outcome above is that of the whole check.</summary>
    public Items<CheckBand> Bands { get; init; } = Items<CheckBand>.None;

    /// <summary>The decade that holds a torque; null where the check has no readings there and says nothing of it.</summary>
    /// <param name="newtonMeters">The torque, N.m.</param>
    public CheckBand? BandAt(double newtonMeters) => Bands.FirstOrDefault(band => band.Holds(newtonMeters));

    /// <summary>The local date of the check.</summary>
    public DateOnly Day => DateOnly.FromDateTime(At.DateTime);

    /// <inheritdoc/>
    public override string ToString() => FormattableString.Invariant($"check {Name} of {Instrument}, {Day:yyyy-MM-dd}: {100 * (Math.Exp(Error.X) - 1):+0.00;-0.00} %, {Outcome.Words()}");
}
