using static System.FormattableString;

namespace HemoRheo;

/// <summary>What the recording of an empty gap gives: a blank run, or the finding that says why it gives none.</summary>
/// <param name="Run">The run; null where the recording gives none.</param>
/// <param name="Fault">Why it gives none; null where it gives one.</param>
internal sealed record BlankReading(BlankRun? Run, Finding? Fault)
{
    /// <summary>The zero is the mean of all torques, or of those at a speed where it depends on speed; its uncertainty is that of the mean, with drift over the run (evenly spread) and a step that hides the noise.</summary>
    internal static BlankReading Of(Study study, Instrument instrument, Recording recording)
    {
        var where = recording.Where with { Sample = recording.Sample, Loading = recording.Loading };
        if (recording.HasFault)
        {
            return new(null, CalibrationFindings.BlankUnusable.At(where, $"Blank run '{recording.Sample}': {recording.Findings.First(finding => finding.Severity == Severity.Fault && finding.Where.Point is null).Message}"));
        }

        var torques = Torques(study, recording);
        if (torques.Count < 2) return new(null, CalibrationFindings.BlankUnusable.At(where, $"Blank run '{recording.Sample}' has {torques.Count} of {recording.Readings.Count} readings with torque and speed; two or more are needed, and shear stresses need a geometry."));
        var statistics = new BlankStatistics(torques, instrument.TorqueResolution ?? 0);
        var (zeroBySpeed, noiseBySpeed) = (statistics.ZeroBySpeed, statistics.NoiseBySpeed);
        var drift = statistics.Drift(zeroBySpeed);
        var (variance, degrees) = zeroBySpeed ? statistics.Within : BlankStatistics.Pooled([[.. torques]]);
        double Noise(BlankTorque[] speed) => Size(noiseBySpeed && speed.Length > 2 ? BlankStatistics.Pooled([speed]).Variance : variance);
        double Size(double squared) => Math.Sqrt(Math.Max(squared, statistics.StepVariance));
        double Uncertainty(double noise, int readings) => Math.Sqrt(noise * noise / readings + (noise * noise < 3 * statistics.StepVariance ? statistics.StepVariance : 0) + drift * drift / 12);

        var noise = Size(variance);
        var uncertainty = Uncertainty(noise, torques.Count);
        Items<TorqueAtSpeed> used = zeroBySpeed || noiseBySpeed
            ? statistics.Speeds.Select(speed => new TorqueAtSpeed(
                speed[speed.Length / 2].Speed,
                zeroBySpeed ? BlankStatistics.Mean(speed) : statistics.Zero,
                zeroBySpeed ? Uncertainty(Noise(speed), speed.Length) : uncertainty,
                zeroBySpeed && noiseBySpeed && speed.Length > 2 ? speed.Length - 1 : degrees,
                Noise(speed))).ToItems()
            : [new(null, statistics.Zero, uncertainty, degrees, noise)];
        var speeds = statistics.Speeds.Select(speed => new BlankSpeed(
            speed[speed.Length / 2].Speed, BlankStatistics.Mean(speed), speed.Length > 1 ? Math.Sqrt(BlankStatistics.Pooled([speed]).Variance) : noise, speed.Length)).ToItems();
        var run = new BlankRun(recording.Sample, instrument.Name, recording.StartedAt, statistics.Zero, uncertainty, degrees, noise, zeroBySpeed, noiseBySpeed, drift, speeds, used, recording, []);
        return new(run with { Findings = recording.Findings.Concat(Findings(instrument, run, where)).ToItems() }, null);
    }

    private static List<BlankTorque> Torques(Study study, Recording recording)
    {
        var geometry = study.Geometries.FirstOrDefault(known => known.Name == recording.Geometry);
        var timed = recording.Readings.All(reading => reading.Elapsed is not null) && recording.Readings.Select(reading => reading.Elapsed).Distinct().Count() > 1;
        var torques = new List<BlankTorque>();
        foreach (var reading in recording.Readings)
        {
            if ((reading.Torque ?? reading.Stress / geometry?.StressPerTorque()) is not { } torque || (reading.Speed ?? reading.Rate / geometry?.RatePerSpeed()) is not { } speed) continue;
            var temperature = reading.Temperature is { } read ? Temperature.FromDegreesCelsius(read) : study.Screening.Temperature;
            var drag = geometry is null ? 0 : AirInGap.Torque(geometry, speed, temperature);
            torques.Add(new(speed, torque - drag, timed ? reading.Elapsed!.Value : reading.Number));
        }

        return torques;
    }

    private static IEnumerable<Finding> Findings(Instrument instrument, BlankRun run, Where where)
    {
        var readings = run.Speeds.Sum(speed => speed.Readings);
        if (readings < BlankRun.FewestReadings)
        {
            yield return CalibrationFindings.BlankTooFew.At(where, $"Blank run '{run.Name}' has {readings} readings; {BlankRun.FewestReadings} or more tell the noise to about a quarter.", readings, BlankRun.FewestReadings);
        }

        if (run.ZeroBySpeed || run.NoiseBySpeed)
        {
            var what = run.ZeroBySpeed ? run.NoiseBySpeed ? "zero and noise depend" : "the zero depends" : "the noise depends";
            yield return CalibrationFindings.BlankBySpeed.At(where, $"Blank run '{run.Name}': {what} on speed and are taken by speed.");
        }

        if (run.Drift != 0)
        {
            yield return CalibrationFindings.BlankDrifts.At(where, Invariant($"Blank run '{run.Name}': the torque changes by {1e9 * run.Drift:+0.0;-0.0} nN.m over the run."), 1e9 * run.Drift);
        }

        var zero = run.Torques.MaxBy(torque => Math.Abs(torque.Zero))!;
        if (Math.Abs(zero.Zero) > StudentQuantile.At(zero.DegreesOfFreedom, 1 - BlankStatistics.Significance / 2) * zero.Uncertainty)
        {
            yield return CalibrationFindings.BlankZero.At(where, Invariant($"Blank run '{run.Name}' reads {1e9 * zero.Zero:+0.0;-0.0} nN.m with a standard uncertainty of {1e9 * zero.Uncertainty:F1} nN.m; {(instrument.CorrectTorqueZero ? "it is taken from every torque" : "its size is part of the uncertainty")}."), 1e9 * zero.Zero);
        }

        if (instrument.TorqueFloor is { } floor && Math.Abs(zero.Zero) > floor)
        {
            yield return CalibrationFindings.BlankZeroBeyondFloor.At(where, Invariant($"Blank run '{run.Name}' reads {1e9 * zero.Zero:+0.0;-0.0} nN.m, the torque floor of '{instrument.Name}' is {1e9 * floor:F1} nN.m."), 1e9 * zero.Zero, 1e9 * floor);
        }
    }
}
