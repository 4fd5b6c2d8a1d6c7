using MathNet.Numerics.Distributions;
using MathNet.Numerics.Random;

namespace HemoRheo.Benchmarks;

/// <summary>
/// A study with known truth, drawn from the measurement model: Casson blood, plasma rule, error sizes of the worked example.
/// The model is written here from its definition and shares no code with the library.
/// </summary>
internal sealed class SimulatedStudy
{
    public static readonly double[] Rates = [300, 200, 130, 100, 50, 30, 20, 11, 5, 2.5, 1.2, 0.7];
    public static readonly double[] StandardRates = [1, 10, 100];

    private const double Relative = 0.01, Floor = 0.0003, LoadingScatter = 0.02;
    private const double Certified = 0.00625, CertifiedAt = 25, CertificateU = 0.002, FluidBeta = 0.022, FluidBetaU = 0.0003;
    private const double BloodBeta = 0.026, BloodBetaU = 0.004, PlasmaBeta = 0.020, ThermometerU = 0.10;
    private const double HematocritU = 0.006, CounterU = 0.003, PlasmaU = 0.010, Standard = 0.45;
    private const double InstrumentScatter = 0.015, DayScatter = 0.003, CheckScatter = 0.003;
    private const int Checks = 8;

    private static readonly DateTimeOffset Start = new(2026, 3, 2, 9, 0, 0, TimeSpan.FromHours(1));

    private readonly Random _random;

    private SimulatedStudy(int number) => _random = new Xoshiro256StarStar(20261201 + 7919 * number, false);

    public List<SimulatedSample> Samples { get; } = [];

    public List<(string Name, DateTimeOffset At, double PascalSeconds, double Celsius)> CheckReadings { get; } = [];

    /// <summary>Study number <paramref name="number"/>, always the same.</summary>
    public static SimulatedStudy Draw(int number, int samples = 10, int loadedTwice = 5)
    {
        var study = new SimulatedStudy(number);
        study.Measure(samples, loadedTwice);
        return study;
    }

    private void Measure(int samples, int loadedTwice)
    {
        var thermometer = Draw(ThermometerU);
        var certificate = Draw(CertificateU);
        var fluidBeta = FluidBeta + Draw(FluidBetaU);
        var bloodBeta = BloodBeta + Draw(BloodBetaU);
        var counter = Draw(CounterU);
        var instrument = Draw(InstrumentScatter);
        var days = Enumerable.Range(0, Checks).Select(_ => Draw(DayScatter)).ToArray();
        for (var d = 0; d < Checks; d++)
        {
            var celsius = Printed(37 + Draw(0.05), 3);
            var truth = Certified * Math.Exp(certificate - fluidBeta * (celsius + thermometer - CertifiedAt));
            CheckReadings.Add(($"check-{d + 1}", Start.AddDays(d), truth * Math.Exp(instrument + days[d] + Draw(CheckScatter)), celsius));
        }

        for (var i = 0; i < samples; i++)
        {
            var day = i % Checks;
            var hematocrit = 0.36 + 0.16 * _random.NextDouble();
            var yieldStress = Math.Exp(Math.Log(0.005) + 9 * (hematocrit - 0.43) + Draw(0.25));
            var cassonViscosity = Math.Exp(Math.Log(0.0033) + 2.4 * (hematocrit - 0.43) + Draw(0.07));
            var plasma = 0.00124 * Math.Exp(Draw(0.04));
            var loadings = new List<(double[], double)>();
            for (var l = 0; l < (i < loadedTwice ? 2 : 1); l++)
            {
                var celsius = Printed(37 + Draw(0.15), 3);
                var shift = Math.Exp(instrument + days[day] + Draw(LoadingScatter) - bloodBeta * (celsius + thermometer - 37));
                loadings.Add(([.. Rates.Select(rate => Casson(rate, yieldStress, cassonViscosity) * shift * (1 + Draw(Relative)) + Draw(Floor))], celsius));
            }

            var plasmaCelsius = Printed(37 + Draw(0.10), 3);
            var measuredPlasma = plasma * Math.Exp(instrument + days[day] + Draw(PlasmaU) - PlasmaBeta * (plasmaCelsius + thermometer - 37));
            var truths = new Dictionary<(double, bool), double>();
            foreach (var rate in StandardRates)
            {
                var native = Math.Log(Casson(rate, yieldStress, cassonViscosity) / rate);
                truths[(rate, false)] = native;
                truths[(rate, true)] = Math.Log(plasma) + Standard / hematocrit * (native - Math.Log(plasma));
            }

            Samples.Add(new($"A-{i + 1:000}", Start.AddDays(day).AddMinutes(30 + 20 * i), hematocrit + counter + Draw(HematocritU), measuredPlasma, plasmaCelsius, loadings, truths));
        }
    }

    private double Draw(double standardDeviation) => Normal.Sample(_random, 0, standardDeviation);

    private static double Printed(double x, int digits) => Math.Round(x, digits);

    private static double Casson(double rate, double yieldStress, double viscosity)
    {
        var root = Math.Sqrt(yieldStress) + Math.Sqrt(viscosity * rate);
        return root * root;
    }
}
