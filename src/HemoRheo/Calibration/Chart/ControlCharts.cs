namespace HemoRheo;

/// <summary>Control charts of histories.</summary>
public static class ControlCharts
{
    /// <summary>The control chart of an instrument's checks in a study, one point a filling, started anew at every adjustment that the study file names.</summary>
    /// <param name="history">The instrument's history.</param>
    /// <param name="baseline">How many checks the limits rest on, at least 20.</param>
    /// <exception cref="ArgumentOutOfRangeException">A baseline of fewer than 20 checks was asked for.</exception>
    public static ControlChart ControlChart(this InstrumentHistory history, int baseline = HemoRheo.ControlChart.LeastBaseline) => HemoRheo.ControlChart.Of(
        history.Instrument.Name,
        history.Checks.Select(check => new ChartedCheck(check.Name, check.At, check.Error, $"{check.Fluid.Name}, {check.Fluid.Lot}", check.Outcome)),
        history.Instrument.Adjusted,
        baseline);
}
