namespace HemoRheo.Notebooks.Tests.Reports;

/// <summary>Invented checks: five a week apart, the fourth fails, the fifth cannot tell; and an instrument that was never checked.</summary>
internal static class FakeChecks
{
    public static readonly FindingKind Failed = new("check-failed", Severity.Fault, "A check lies beyond its limit.", "A worn bearing.", "Stop, adjust, check again; look at every sample since the last passed check.");

    public static CalibrationFluid Fluid { get; } = new("oil <5>", "=LOT", new(37), new(0.005), 0.004, 2, 0.03, 0.001, false);

    public static Items<InstrumentHistory> Histories(Study study)
    {
        var checks = new[] { 0.004, 0.009, 0.006, 0.055, 0.026 }.Select(Check).ToItems();
        var passed = checks.Take(3).ToItems();
        var period = new InstrumentPeriod("R1", 1, passed[0].At, checks[3].At, passed, Value.Mean([.. passed.Select(check => check.Error)]), 0.0035, 2, "checks R1");
        return
        [
            new(study.Instruments[0], checks, [period], checks[3].Findings),
            new(study.Instruments[1], [], [], []),
        ];
    }

    private static InstrumentCheck Check(double error, int week)
    {
        var outcome = week switch { 3 => CheckOutcome.Fails, 4 => CheckOutcome.CannotTell, _ => CheckOutcome.Passes };
        var value = new Value(error, [new(new(SourceKind.Day, $"R1/{week}"), 0.0035, "checks R1", 2), new(new(SourceKind.Certificate, "LOT"), 0.002)]);
        Items<Finding> findings = outcome == CheckOutcome.Fails ? [Failed.At(new(File: "checks/w4.csv"), "Check W4 shows 5.7 %, the limit is 3 %.", 5.7, 3)] : [];
        return new($"W{week + 1}", "R1", Fluid, FakeStudy.Start.AddDays(7 * week), new(37.02), new(0.005 * Math.Exp(error)), new(0.005), value, 0.03, outcome, outcome switch { CheckOutcome.Fails => 0.002, CheckOutcome.Passes => 0.998, _ => 0.71 }, FakeCurves.Fit(FakeCurves.Curve("W", 1, null, 0.005, 0)), findings);
    }
}
