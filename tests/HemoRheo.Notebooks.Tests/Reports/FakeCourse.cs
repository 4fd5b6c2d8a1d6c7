namespace HemoRheo.Notebooks.Tests.Reports;

/// <summary>An invented instrument checked weekly: steady for 22 weeks, then it drifts; right at high torque, failed at low at its last check.</summary>
internal static class FakeCourse
{
    private static readonly double[] Pattern = [0.002, -0.003, 0.001, 0.004, -0.002, -0.004, 0.003, -0.001];

    public static DateTimeOffset Start { get; } = new(2031, 3, 3, 9, 0, 0, TimeSpan.FromHours(1));

    public static InstrumentCourse Course { get; } = new(new("R1 <i>", 2e-7, 2e-8, 0.05, TimeSpan.FromDays(8), 0.03, null, []), Enumerable.Range(0, 32).Select(Check).ToItems());

    public static InstrumentReview Review { get; } = Of(Course);

    /// <summary>A review on the day after the last check, with samples in doubt for many reasons.</summary>
    public static InstrumentReview Of(InstrumentCourse course)
    {
        var at = Start.AddDays(7 * 31 + 1);
        var doubts = Enumerable.Range(0, 90).Select(i => new SampleInDoubt(FakeStudy.Names[i % FakeStudy.Names.Length] + i, 1, at.AddHours(i - 200), i < 40 ? InstrumentStatus.InDoubt : InstrumentStatus.Failed, $"Failed afterwards at check 'W-{i / 10}' of 2031-09-01; the last passed one was check 'V' of 2031-08-25."));
        return new("Invented & <b>bold</b>", course, at, course.At(at), course.ControlChart(), 240, doubts.ToItems(), new(33, new string('e', 64), null), []);
    }

    private static LoggedCheck Check(int week)
    {
        var error = Pattern[week % Pattern.Length] + Math.Max(0, week - 22) * 0.0009;
        var value = new Value(error, [new(new(SourceKind.Day, $"R1/{week}"), 0.0035, "checks R1", 25), new(new(SourceKind.Certificate, "LOT"), 0.002)]);
        var low = week == 31 ? CheckOutcome.Fails : CheckOutcome.Passes;
        return new("R1 <i>", $"W-{week + 1}", 1, Start.AddDays(7 * week), "oil <5>", "=LOT", new(37), new(0.005 * Math.Exp(error)), new(0.005), value, 0.03, CheckOutcome.Passes, 0.98, [], null, null)
        {
            Bands = [new(new(1e-7, 1e-6), 3, error, 0.01, low, 0.4), new(new(1e-6, 1e-5), 4, error, 0.006, CheckOutcome.CannotTell, 0.9), new(new(1e-5, 1e-4), 5, error, 0.004, CheckOutcome.Passes, 0.98)],
        };
    }
}
