namespace HemoRheo.App.Synthetic;

/// <summary>
/// The simulated measurement: stress read = tau(rate) exp(loading + instrument + day - beta (T - 37)) + zero + noise.
/// Upward ramps read a little lower at low shear rates, since the aggregates of red cells are still growing again.
/// </summary>
internal sealed class Bench(long seed, TrueInstrument instrument)
{
    private const int PreShearSeconds = 30;
    private const int StepSeconds = 15;
    private const double FewerAggregates = 0.04;

    private static readonly double[] BloodRates = [300, 180, 100, 60, 35, 20, 12, 7, 4, 2.5, 1.5, 1, 0.7];
    private static readonly double[] FluidRates = [300, 180, 100, 60, 35, 20, 12];

    /// <summary>Measures one loading of a blood sample.</summary>
    public SimulatedRecording Measure(PlannedSample sample, TrueBlood blood, int loading)
    {
        var moment = sample.StartedAt[loading - 1];
        var stream = RandomStream.Of(seed, $"loading of {sample.Sample}", loading);
        var error = TrueSizes.Loading * stream.Normal() + instrument.BiasAt(moment) + instrument.DayError(moment);
        var warms = sample.Fault == PlantedFault.TemperatureExcursion && loading == 1;
        double Stress(double rate, bool up, double temperature) =>
            blood.StressAt(rate) * Math.Exp(error - instrument.BloodPerKelvin * (temperature - 37) - (up ? FewerAggregates / (1 + rate) : 0));
        return new(sample.Sample, loading, null, moment, Readings(stream, BloodRates, moment, warms, Stress));
    }

    /// <summary>Measures the calibration fluid.</summary>
    public SimulatedRecording Check(int week)
    {
        var moment = CohortPlan.CheckAt(week);
        var name = CheckName(week);
        var stream = RandomStream.Of(seed, $"check {name}", 1);
        var error = TrueSizes.CheckFilling * stream.Normal() + instrument.BiasAt(moment) + instrument.DayError(moment);
        double Stress(double rate, bool up, double temperature) =>
            rate * instrument.FluidViscosity * Math.Exp(error - instrument.FluidPerKelvin * (temperature - TrueSizes.CertifiedAt));
        return new(name, 1, CohortPlan.Fluid, moment, Readings(stream, FluidRates, moment, false, Stress));
    }

    /// <summary>Name of a week's check.</summary>
    public static string CheckName(int week) => $"C-{week}";

    private List<SimulatedReading> Readings(RandomStream stream, double[] rates, DateTimeOffset moment, bool warms, Func<double, bool, double, double> stressAt)
    {
        var zero = instrument.TorqueZero(moment) * TrueSizes.StressPerTorque;
        var settled = 37 + 0.08 * stream.Normal();
        var readings = new List<SimulatedReading>();
        for (var i = 0; i < 2 * rates.Length; i++)
        {
            var up = i >= rates.Length;
            var set = up ? rates[2 * rates.Length - 1 - i] : rates[i];
            var rate = set * (1 + 0.001 * stream.Normal());
            var temperature = settled + 0.015 * stream.Normal() + (warms ? Warming(i) : 0);
            var stress = stressAt(rate, up, temperature + instrument.ThermometerError);
            var read = stress * (1 + TrueSizes.Relative * stream.Normal()) + zero + TrueSizes.FloorPascals * stream.Normal();
            readings.Add(new(up, PreShearSeconds + StepSeconds * (i + 1), temperature, set, rate, read));
        }
        return readings;
    }

    // Readings 4 to 9 of the downward ramp are read while the bath is up to 1.4 K too warm.
    private static double Warming(int reading) => 1.4 * Math.Exp(-(reading - 5.5) * (reading - 5.5) / 8);
}
