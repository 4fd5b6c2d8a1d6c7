namespace HemoRheo.Tests.Samples;

/// <summary>Recordings of invented blood without files: each stress is the law's, off by a small fixed pattern of its sample and loading so that fits have residuals.</summary>
internal static class InventedBlood
{
    internal static readonly DateTimeOffset CheckTime = TestStudy.Start;
    internal static readonly DateTimeOffset BloodTime = TestStudy.Start.AddDays(1);

    private static readonly double[] Pattern = [0.004, -0.007, 0.002, 0.006, -0.003, 0.001, -0.005, 0.008, -0.002, -0.006, 0.003, 0.005];

    internal static Recording Casson(string sample, int loading, double hematocrit, double factor = 1, double addedPascals = 0, double celsius = 37.1, DateTimeOffset? at = null) =>
        Of(sample, loading, rate => FlowLaw.Casson.Stress(rate.PerSecond(), 0.005 * Math.Exp(9 * (hematocrit - 0.43)), 0.0033 * Math.Exp(2.4 * (hematocrit - 0.43))).Pascals, factor, addedPascals, celsius, at);

    internal static Recording Quemada(string sample, int loading, double hematocrit, double factor = 1) =>
        Of(sample, loading, rate => FlowLaw.Quemada.Stress(rate.PerSecond(), 0.0031 * Math.Exp(2 * (hematocrit - 0.43)), 2.5, 0.2).Pascals, factor, 0, 37.1, null);

    internal static Recording Newtonian(string sample, int loading, double factor = 1) => Of(sample, loading, rate => 0.003 * rate, factor, 0, 37.1, null);

    private static Recording Of(string sample, int loading, Func<double, double> stress, double factor, double added, double celsius, DateTimeOffset? at) => TestStudy.Blood(
        sample,
        TestStudy.Rates.Select((rate, i) => TestStudy.Reading(i + 1, rate, stress(rate) * factor * (1 + Pattern[(i + 5 * loading + 7 * sample[^1] + 4 * sample[^2]) % Pattern.Length] * (sample[^1] % 2 == loading % 2 ? 1 : -1)) + added, celsius)),
        loading,
        at ?? BloodTime);

    internal static SampleRecord Record(string sample, double hematocrit, double plasma = 0.00124, string plasmaInstrument = "R1") =>
        TestStudy.Sample(sample, BloodTime.AddHours(-1)) with { Hematocrit = new(hematocrit), PlasmaViscosity = new(plasma), PlasmaTemperature = new(36.9), PlasmaInstrument = plasmaInstrument, PlasmaMeasuredAt = BloodTime };

    /// <summary>Three checks of the fluid, the instrument reading about 2 % high, on days before the blood is measured.</summary>
    internal static Recording[] Checks(double addedPascals = 0, double addedKelvins = 0) =>
    [
        .. new[] { 0.021, 0.018, 0.023 }.Select((error, i) => TestStudy.Check(
            $"C-{i + 1}", CheckTime.AddHours(i),
            TestStudy.Rates.Select((rate, k) => TestStudy.Reading(k + 1, rate, rate * 0.00625 * Math.Exp(-0.022 * 12 + error) + addedPascals, 37.0 + addedKelvins)))),
    ];
}
