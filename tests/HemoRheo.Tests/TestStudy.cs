namespace HemoRheo.Tests;

/// <summary>An invented study and its recordings, built by hand: change what a test is about with <c>with</c>.</summary>
internal static class TestStudy
{
    internal static readonly DateTimeOffset Start = new(2026, 3, 2, 9, 0, 0, TimeSpan.FromHours(1));

    internal static readonly double[] Rates = [300, 200, 130, 100, 50, 30, 20, 11, 5, 2.5, 1.2, 0.7];

    internal static Instrument Rheometer { get; } = new("R1", 2e-8, 0, 0.1, TimeSpan.FromDays(8), 0.03, null, []);

    internal static Geometry Cylinders { get; } = new("cylinders", 0.0125, 0.0125 * 1.0847, 0.0375, 1.10);

    /// <summary>The fluid of the worked example.</summary>
    internal static CalibrationFluid Oil { get; } = new("oil", "lot 7", new(25), new(0.00625), 0.004, 2, 0.022, 0.0003, false);

    internal static Study Plain { get; } = new(
        "invented",
        20261201,
        "",
        "study.toml",
        "",
        new(["exports"], ["checks"], "samples.csv", "people.csv", null),
        [],
        [Rheometer],
        [Cylinders],
        [Oil, Water.AsFluid()],
        [new("counter", 0.006, 0.003)],
        new(0.026, 0.004, 0.020, 0.010),
        new(0.01, 0.0003, true, null),
        new(Temperature.Body, 0.5, 0.02, TimeSpan.FromHours(4), 0.01, 0.2, 0.7),
        new(["Newtonian", "Casson", "Quemada"], "Casson", [new(1), new(10), new(100)], Ramp.Down, true, 0.95),
        new(new(0.45), StandardisingRule.PlasmaPower),
        new(false, []),
        [new("c", "controls", true), new("p", "patients", false)]);

    /// <summary>The study with another rheometer in place of its own.</summary>
    internal static Study With(Instrument instrument) => Plain with { Instruments = [instrument] };

    /// <summary>A reading of shear rate and stress.</summary>
    internal static Reading Reading(int number, double? rate, double? stress, double? temperature = 37, Ramp ramp = Ramp.Down, double? elapsed = null) =>
        new(number, ramp, null, null, null, rate, null, stress, temperature, elapsed ?? 10.0 * number, new("exports/a.csv", Line: number + 1));

    /// <summary>A reading of speed and torque that the cylinders turn into this rate and stress.</summary>
    internal static Reading Turned(int number, double rate, double stress, double? temperature = 37, Ramp ramp = Ramp.Down) => Reading(number, null, null, temperature, ramp) with
    {
        Speed = rate / Cylinders.RatePerSpeed(),
        Torque = stress / Cylinders.StressPerTorque(),
    };

    internal static Recording Blood(string sample, IEnumerable<Reading> readings, int loading = 1, DateTimeOffset? at = null) =>
        new(RecordingKind.Blood, sample, loading, "R1", "cylinders", null, at ?? Start, readings.ToItems(), new("exports/a.csv", Line: 1));

    /// <summary>A check whose readings are those of a liquid of this viscosity, without noise.</summary>
    internal static Recording Check(string name, DateTimeOffset at, double pascalSeconds, double temperature = 37, int loading = 1, string fluid = "oil") =>
        Check(name, at, Rates.Select((rate, i) => Reading(i + 1, rate, rate * pascalSeconds, temperature)), loading, fluid);

    internal static Recording Check(string name, DateTimeOffset at, IEnumerable<Reading> readings, int loading = 1, string fluid = "oil") =>
        new(RecordingKind.Check, name, loading, "R1", "cylinders", fluid, at, readings.ToItems(), new($"checks/{name}.csv", Line: 1));

    internal static StudyReadings Readings(Study study, IEnumerable<Recording>? checks = null, IEnumerable<Recording>? blood = null, IEnumerable<SampleRecord>? samples = null) =>
        new(study, [], (blood ?? []).ToItems(), (checks ?? []).ToItems(), (samples ?? []).ToItems(), [], []);

    internal static SampleRecord Sample(string sample, DateTimeOffset? drawnAt = null) =>
        new(sample, "P-" + sample, 1, drawnAt ?? Start.AddHours(-1), new(0.44), "counter", new(0.00124), Temperature.Body, "R1", null, 3.0, new("samples.csv", Line: 2));
}
