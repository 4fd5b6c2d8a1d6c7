namespace HemoRheo.App.Synthetic;

/// <summary>The rheometer and the lab as they truly are: what the samples of a period, a day or the whole study share.</summary>
internal sealed class TrueInstrument
{
    private readonly long seed;
    private readonly double firstBias;
    private readonly double biasAfterAdjustment;

    public TrueInstrument(long seed)
    {
        this.seed = seed;
        var shared = RandomStream.Of(seed, "shared", 1);
        firstBias = TrueSizes.LargestBias * (2 * shared.Uniform() - 1);
        biasAfterAdjustment = TrueSizes.LargestBias * (2 * shared.Uniform() - 1);
        ThermometerError = TrueSizes.Thermometer * shared.Normal();
        BloodPerKelvin = TrueSizes.BloodPerKelvin + TrueSizes.BloodPerKelvinUncertainty * shared.Normal();
        FluidPerKelvin = TrueSizes.FluidPerKelvin + TrueSizes.FluidPerKelvinUncertainty * shared.Normal();
        FluidViscosity = TrueSizes.CertifiedPascalSeconds * Math.Exp(TrueSizes.CertificateUncertainty / TrueSizes.CertificateCoverage * shared.Normal());
        CounterError = TrueSizes.HematocritShared * shared.Normal();
    }

    /// <summary>True temperature less that read, K.</summary>
    public double ThermometerError { get; }

    /// <summary>True temperature coefficient of blood, 1/K.</summary>
    public double BloodPerKelvin { get; }

    /// <summary>True temperature coefficient of the calibration fluid, 1/K.</summary>
    public double FluidPerKelvin { get; }

    /// <summary>True viscosity of the calibration fluid at its certificate's temperature, Pa.s.</summary>
    public double FluidViscosity { get; }

    /// <summary>Error that all hematocrits of the counter share, L/L.</summary>
    public double CounterError { get; }

    /// <summary>The instrument's relative error (logarithm) at a moment.</summary>
    public double BiasAt(DateTimeOffset moment) =>
        moment >= CohortPlan.AdjustedAt ? biasAfterAdjustment : moment >= CohortPlan.ChangedAt ? firstBias + TrueSizes.Change : firstBias;

    /// <summary>What a day adds to it.</summary>
    public double DayError(DateTimeOffset moment) => TrueSizes.Day * Of("day", moment).Normal();

    /// <summary>Torque zero of a day, N.m.</summary>
    public double TorqueZero(DateTimeOffset moment) => TrueSizes.TorqueZero * Of("torque zero", moment).Normal();

    private RandomStream Of(string what, DateTimeOffset moment) => RandomStream.Of(seed, $"{what} of {Written.Day(moment)}", 1);
}
