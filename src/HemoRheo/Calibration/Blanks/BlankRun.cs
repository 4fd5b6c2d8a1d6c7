namespace HemoRheo;

/// <summary>An empty gap turned: the torque zero of an instrument and its noise.</summary>
/// <param name="Name">Name of the run.</param>
/// <param name="Instrument">Name of the instrument.</param>
/// <param name="At">When.</param>
/// <param name="Zero">Mean torque less the drag of air, N.m.</param>
/// <param name="ZeroUncertainty">Standard uncertainty of that, N.m: noise, resolution and drift within the run.</param>
/// <param name="DegreesOfFreedom">Degrees of freedom of the noise.</param>
/// <param name="Noise">Standard deviation of one reading, N.m, all speeds pooled.</param>
/// <param name="ZeroBySpeed">Whether the zero depends on speed: an analysis of variance between speeds, at 0.01.</param>
/// <param name="NoiseBySpeed">Whether the noise depends on speed: Bartlett's test (Bartlett 1937), at 0.01.</param>
/// <param name="Drift">Change of the torque over the run, N.m, where a line in time is significant at 0.01; else 0.</param>
/// <param name="Speeds">The run by speed, ascending.</param>
/// <param name="Torques">Zero and noise as they are used: one entry, or one a speed where either depends on it.</param>
/// <param name="Recording">What it was read from.</param>
/// <param name="Findings">Findings about it.</param>
public sealed record BlankRun(
    string Name,
    string Instrument,
    DateTimeOffset At,
    double Zero,
    double ZeroUncertainty,
    double DegreesOfFreedom,
    double Noise,
    bool ZeroBySpeed,
    bool NoiseBySpeed,
    double Drift,
    Items<BlankSpeed> Speeds,
    Items<TorqueAtSpeed> Torques,
    Recording Recording,
    Items<Finding> Findings)
{
    /// <summary>Fewest readings by which noise and zero are known well enough to be used without a warning.</summary>
    public const int FewestReadings = 10;

    /// <summary>The local date of the run.</summary>
    public DateOnly Day => DateOnly.FromDateTime(At.DateTime);

    /// <summary>The run as an instrument's log keeps it.</summary>
    public LoggedBlankRun ToLog() => new(At, Recording.Geometry, Speeds.Select(speed => new LoggedBlankReading(speed.Speed, speed.Zero, speed.Noise, speed.Readings)).ToItems());

    /// <inheritdoc/>
    public override string ToString() => string.Create(
        System.Globalization.CultureInfo.InvariantCulture,
        $"blank run {Name} of {Instrument}, {Day:yyyy-MM-dd}: zero {1e9 * Zero:G3} ± {1e9 * ZeroUncertainty:G2} nN.m, noise {1e9 * Noise:G3} nN.m, {Speeds.Sum(speed => speed.Readings)} readings at {Speeds.Count} speeds");
}
