using static System.FormattableString;

namespace HemoRheo;

/// <summary>How far an instrument's torques can be trusted at a moment, and what that rests on: a blank run of the day, else the last one, else what the study file declares, else nothing.</summary>
/// <param name="Basis">What it rests on.</param>
/// <param name="BlankRun">Name of the blank run; null where there is none.</param>
/// <param name="Age">Time from the blank run to the moment, below zero for a run made later that day; null where there is none.</param>
/// <param name="Speeds">Zero and noise by that run: one entry, or one a speed where they depend on it; empty where there is no run.</param>
/// <param name="Corrected">Whether that zero is taken from every torque.</param>
/// <param name="DeclaredFloor">Torque floor of the study file, N.m; null where it declares none.</param>
/// <param name="DeclaredZero">Standard uncertainty of the torque zero that the study file declares, N.m, where no run of the day tells it; else 0.</param>
/// <param name="Day">The instrument's day, as sources name it.</param>
/// <param name="BlankDay">The same of the blank run; empty where there is none.</param>
public sealed record TorqueTrust(
    TorqueBasis Basis,
    string? BlankRun,
    TimeSpan? Age,
    Items<TorqueAtSpeed> Speeds,
    bool Corrected,
    double? DeclaredFloor,
    double DeclaredZero,
    string Day,
    string BlankDay)
{
    /// <summary>How many standard deviations of an empty gap's reading a torque must reach, 3: with normal noise 1 of 740 readings of nothing does (Currie 1968, Anal Chem 40:586-593, on such limits).</summary>
    public const double FloorWidth = 3;

    /// <summary>What the study file declares.</summary>
    internal static TorqueTrust OfDeclared(Instrument instrument, string day) =>
        new(instrument.TorqueFloor is null ? TorqueBasis.None : TorqueBasis.Declared, null, null, [], false, instrument.TorqueFloor, instrument.TorqueZero, day, "");

    /// <summary>
    /// The torque below which a reading is set aside, N.m: <see cref="FloorWidth"/> times noise and torque zero in quadrature, or the declared floor if that is larger; null where nothing is known.
    /// A blank run raises a declared floor and never lowers it: the declared one may know of more than an empty gap shows.
    /// </summary>
    /// <param name="radiansPerSecond">Speed; null for the worst of all speeds.</param>
    public double? Floor(double? radiansPerSecond = null)
    {
        if (At(radiansPerSecond) is not { } empty) return DeclaredFloor;
        var measured = FloorWidth * Math.Sqrt(empty.Noise * empty.Noise + ZeroSize(empty) * ZeroSize(empty) + DeclaredZero * DeclaredZero);
        return DeclaredFloor is { } declared ? Math.Max(declared, measured) : measured;
    }

    /// <summary>What is taken from a torque read at this speed, N.m: the zero where it is corrected, else 0.</summary>
    /// <param name="radiansPerSecond">Speed; null for the worst of all speeds.</param>
    public double Correction(double? radiansPerSecond) => Corrected && At(radiansPerSecond) is { } empty ? empty.Zero : 0;

    /// <summary>Zero and noise at the nearest speed of the blank run; null where there is none.</summary>
    /// <param name="radiansPerSecond">Speed; null for the worst of all speeds.</param>
    public TorqueAtSpeed? At(double? radiansPerSecond) => radiansPerSecond is { } speed
        ? Speeds.MinBy(known => known.Speed is { } at ? Math.Abs(at - speed) : 0)
        : Speeds.MaxBy(known => known.Noise * known.Noise + ZeroSize(known) * ZeroSize(known));

    /// <summary>
    /// The torque zero's contributions to a curve, in N.m: that of the blank run, and what the study file declares where the run is of another day.
    /// A zero that is not corrected enters with its size. One that depends on speed enters as a constant as large as its largest over the curve.
    /// </summary>
    /// <param name="speeds">Speeds of the curve's kept points.</param>
    internal IEnumerable<Contribution> ZeroParts(IEnumerable<double?> speeds)
    {
        if (speeds.Select(At).OfType<TorqueAtSpeed>().MaxBy(ZeroSize) is { } worst)
        {
            var size = ZeroSize(worst);
            if (size > 0) yield return new(new(SourceKind.TorqueZero, BlankDay), size, "torque zero of " + BlankDay, worst.DegreesOfFreedom * Math.Pow(size / worst.Uncertainty, 4));
        }

        if (DeclaredZero > 0) yield return new(new(SourceKind.TorqueZero, Day), DeclaredZero);
    }

    /// <inheritdoc/>
    public override string ToString()
    {
        var age = Basis == TorqueBasis.EarlierBlank && Age is { } time ? Invariant($", {time.TotalDays:F1} d old") : "";
        var floor = Floor() is { } newtonMeters ? Invariant($"{1e6 * newtonMeters:G3} uN.m") : "not known";
        return $"{Basis.Words()}{(BlankRun is null ? "" : $" {BlankRun}")}{age}: floor {floor}";
    }

    private double ZeroSize(TorqueAtSpeed empty) => Corrected ? empty.Uncertainty : Math.Sqrt(empty.Zero * empty.Zero + empty.Uncertainty * empty.Uncertainty);
}
