namespace HemoRheo;

/// <summary>Between checks of a study and checks of a log.</summary>
public static class LoggedChecks
{
    /// <summary>A judged check as the log keeps it.</summary>
    /// <param name="check">The check.</param>
    /// <param name="readings">What it was read from; names the export's digest.</param>
    public static LoggedCheck ToLog(this InstrumentCheck check, StudyReadings readings)
    {
        var curve = check.Fit.Curve;
        var export = curve.Label.Recording?.Where.File;
        return new(
            check.Instrument,
            curve.Label.Sample,
            curve.Label.Loading,
            check.At,
            check.Fluid.Name,
            check.Fluid.Lot,
            check.Temperature,
            check.Measured,
            check.Expected,
            check.Error,
            check.Limit,
            check.Outcome,
            check.ProbabilityWithin,
            curve.Points.Select(point => Reading(point, curve, check.Expected)).ToItems(),
            export,
            readings.Files.FirstOrDefault(file => file.Path == export)?.Digest)
        {
            Bands = check.Bands.Select(Band).ToItems(),
        };
    }

    /// <summary>The control chart of a log: one point a filling, started anew at every adjustment.</summary>
    /// <param name="log">The log as it was read.</param>
    /// <param name="baseline">How many checks the limits rest on, at least 20.</param>
    /// <exception cref="ArgumentOutOfRangeException">A baseline of fewer than 20 checks was asked for.</exception>
    public static ControlChart ControlChart(this LogContents log, int baseline = HemoRheo.ControlChart.LeastBaseline) =>
        Chart(log.Instrument, log.Checks, log.Adjustments.Select(adjustment => adjustment.At), baseline);

    /// <summary>The control chart of an instrument's course: one point a filling, started anew at every adjustment.</summary>
    /// <param name="course">The course.</param>
    /// <param name="baseline">How many checks the limits rest on, at least 20.</param>
    /// <exception cref="ArgumentOutOfRangeException">A baseline of fewer than 20 checks was asked for.</exception>
    public static ControlChart ControlChart(this InstrumentCourse course, int baseline = HemoRheo.ControlChart.LeastBaseline) =>
        Chart(course.Instrument.Name, course.Checks, course.Instrument.Adjusted, baseline);

    private static ControlChart Chart(string instrument, Items<LoggedCheck> checks, IEnumerable<DateTimeOffset> adjusted, int baseline) => HemoRheo.ControlChart.Of(
        instrument,
        checks.GroupBy(check => (check.Name, check.Filling, check.Fluid, check.Lot, DateOnly.FromDateTime(check.At.DateTime))).Select(filling => OfFilling([.. filling])),
        adjusted,
        baseline);

    private static LoggedReading Reading(FlowPoint point, FlowCurve curve, Viscosity expected) =>
        new(point.Rate.ReciprocalSeconds, curve.TorqueOf(point), Math.Log(point.ApparentViscosity.PascalSeconds / expected.PascalSeconds));

    private static LoggedBand Band(CheckBand band) =>
        new(band.Torque, band.Readings, band.Error.X, band.Error.StandardUncertainty, band.Outcome, band.ProbabilityWithin);

    private static ChartedCheck OfFilling(LoggedCheck[] readings)
    {
        var worst = readings.Any(check => check.Outcome == CheckOutcome.Fails) ? CheckOutcome.Fails : readings[0].Outcome;
        return new(readings[0].Name, readings[0].At, Value.Mean([.. readings.Select(check => check.Error)]), $"{readings[0].Fluid}, {readings[0].Lot}", worst);
    }
}
