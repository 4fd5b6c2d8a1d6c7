namespace HemoRheo.Tests.Calibration.Blanks;

/// <summary>Recordings of an empty gap without files.</summary>
internal static class EmptyGap
{
    internal static readonly double PerTorque = TestStudy.Cylinders.StressPerTorque();

    /// <summary>A run of these torques at one slow speed, without geometry, so that there is no drag of air.</summary>
    internal static Recording Run(string name, DateTimeOffset at, params IReadOnlyList<double> newtonMeters) =>
        Run(name, at, newtonMeters.Select((torque, i) => (0.1, 10.0 * i, torque)));

    internal static Recording Run(string name, DateTimeOffset at, IEnumerable<(double Speed, double Time, double Torque)> torques) => new(
        RecordingKind.Blank, name, 1, "R1", null, null, at,
        torques.Select((one, i) => TestStudy.Reading(i + 1, null, null, elapsed: one.Time) with { Speed = one.Speed, Torque = one.Torque }).ToItems(),
        new($"blanks/{name}.csv", Line: 1));

    /// <summary>Twelve torques about a zero with a standard deviation of 1.0445 times the noise.</summary>
    internal static double[] About(double zero, double noise) => [.. Enumerable.Range(0, 12).Select(i => zero + (i % 2 == 0 ? noise : -noise))];

    internal static BlankRun Read(Study study, Recording recording) => Assert.Single(History(study, recording).Blanks);

    internal static InstrumentHistory History(Study study, params Recording[] blanks) => Assert.Single(study.CheckInstruments(TestStudy.Readings(study) with { Blanks = blanks.ToItems() }));
}
