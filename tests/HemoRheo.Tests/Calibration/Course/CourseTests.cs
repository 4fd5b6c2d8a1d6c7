using HemoRheo.Benchmarks.SimulatedCharts;
using static HemoRheo.Tests.Calibration.InvestigatedInstrument;

namespace HemoRheo.Tests.Calibration.Course;

/// <summary>Checks vouch for 8 days. At 0.1 to 1 uN.m the second of three weekly checks fails, as a whole all pass.</summary>
public sealed class CourseTests : IDisposable
{
    private const double Low = 5e-7;
    private const double High = 5e-6;

    private readonly LogFolder _folder = new();

    private static DateTimeOffset Start => TestStudy.Start;

    private static InstrumentCourse Course { get; } = new(TestStudy.Rheometer, [Check(0, CheckOutcome.Passes), Check(7, CheckOutcome.Fails), Check(14, CheckOutcome.Passes)]);

    public void Dispose() => _folder.Dispose();

    [Theory]
    [InlineData(3, InstrumentStatus.InDoubt)]
    [InlineData(7, InstrumentStatus.Failed)]
    [InlineData(13.9, InstrumentStatus.Failed)]
    [InlineData(14, InstrumentStatus.InOrder)]
    [InlineData(-1, InstrumentStatus.Unknown)]
    public void It_can_be_wrong_at_low_torque_while_it_is_right_as_a_whole(double day, InstrumentStatus low)
    {
        var moment = Start.AddDays(day);
        Assert.Equal(low, Course.At(moment, Low).Status);
        Assert.Equal(day < 0 ? InstrumentStatus.Unknown : InstrumentStatus.InOrder, Course.At(moment, High).Status);
        Assert.Equal(day < 0 ? InstrumentStatus.Unknown : InstrumentStatus.InOrder, Course.At(moment).Status);
    }

    [Fact]
    public void The_reason_and_the_finding_name_the_torques()
    {
        var standing = Course.At(Start.AddDays(3), Low);
        Assert.Equal("0.1 to 1 uN.m: Failed afterwards at check 'C7' of 2026-03-09; the last passed one was check 'C0' of 2026-03-02.", standing.Reason);
        Assert.Equal(standing.Reason, Assert.Single(standing.Findings).Message);
    }

    [Fact]
    public void Torques_at_which_no_check_has_readings_are_unknown() => Assert.Equal(InstrumentStatus.Unknown, Course.At(Start.AddDays(3), 1e-4).Status);

    [Fact]
    public void By_torque_every_decade_has_its_standing() =>
        Assert.Equal([("0.1 to 1 uN.m", InstrumentStatus.Failed), ("1 to 10 uN.m", InstrumentStatus.InOrder)], Course.ByTorque(Start.AddDays(8)).Select(decade => (decade.Range, decade.Standing.Status)));

    [Fact]
    public void A_history_says_the_same_as_its_course_and_keeps_its_period()
    {
        var study = TestStudy.With(TestStudy.Rheometer with { CheckScatter = 0.0043 });
        Recording[] checks = [InvestigatedInstrument.Check(0, 0.1), InvestigatedInstrument.Check(1, 0.2), WrongAtLowTorque(7)];
        var history = History(study, checks);
        var course = history.Course(TestStudy.Readings(study, checks));
        foreach (var day in new[] { 0.5, 3, 8, 20 })
        {
            var moment = Start.AddDays(day);
            Assert.Equal(history.At(moment).Status, course.At(moment).Status);
            Assert.Equal(history.At(moment, Low).Status, course.At(moment, Low).Status);
            Assert.Equal(history.At(moment).Period, history.At(moment, Low).Period);
        }

        Assert.Equal(InstrumentStatus.InOrder, history.At(Start.AddDays(8)).Status);
        Assert.Equal(InstrumentStatus.Failed, history.At(Start.AddDays(8), Low).Status);
        Assert.Equal(InstrumentStatus.InOrder, history.At(Start.AddDays(8), High).Status);
    }

    [Fact]
    public void The_log_keeps_what_a_check_said_by_torque()
    {
        _folder.Log.Append(Course.Checks[1], Start.AddDays(8), "A. Miller");
        var read = Assert.Single(_folder.Log.Read().Checks);
        Assert.Equal(Course.Checks[1], read);
        Assert.Equal(CheckOutcome.Fails, read.BandAt(Low)!.Outcome);
    }

    [Fact]
    public void The_course_of_a_log_has_its_corrections_and_the_adjustments_of_log_and_study()
    {
        _folder.Check(1);
        _folder.Check(2);
        _folder.Log.Append(new LoggedCorrection(2, "bubble seen", null), Start.AddDays(3), "B. Jones");
        _folder.Log.Append(new LoggedAdjustment(Start.AddDays(4), "gap set"), Start.AddDays(4), "B. Jones");
        var contents = _folder.Log.Read();
        var course = contents.Course(TestStudy.Rheometer with { Adjusted = [Start.AddDays(9), Start.AddDays(4)] });
        Assert.Equal(["C2"], course.Checks.Select(check => check.Name));
        Assert.Equal([Start.AddDays(4), Start.AddDays(9)], course.Instrument.Adjusted);
        Assert.Equal(InstrumentStatus.Unknown, course.At(Start.AddDays(5)).Status);
        Assert.Contains("not of 'R2'", Assert.Throws<ArgumentException>(() => contents.Course(TestStudy.Rheometer with { Name = "R2" })).Message, StringComparison.Ordinal);
    }

    [Fact]
    public void The_log_holds_a_check_by_its_export_or_by_its_readings_even_when_it_was_withdrawn()
    {
        var check = InventedLoggedCheck.Of("C1", Start, 0.001);
        _folder.Log.Append(check, Start, "A. Miller");
        _folder.Log.Append(new LoggedCorrection(2, "bubble seen", null), Start, "B. Jones");
        var contents = _folder.Log.Read();
        Assert.True(contents.Holds(check));
        Assert.True(contents.Holds(check with { ExportDigest = "of the export with one more check in it" }));
        Assert.False(contents.Holds(check with { At = Start.AddDays(1) }));
        Assert.False(contents.HoldsOtherwise(check with { At = Start.AddDays(1) }));
        var changed = InventedLoggedCheck.Of("C1", Start, 0.002) with { ExportDigest = "changed" };
        Assert.False(contents.Holds(changed));
        Assert.True(contents.HoldsOtherwise(changed));
    }

    private static LoggedCheck Check(int day, CheckOutcome low) => InventedLoggedCheck.Of($"C{day}", Start.AddDays(day), 0.001) with
    {
        Bands = [new(new(1e-7, 1e-6), 4, low == CheckOutcome.Fails ? 0.1 : 0.001, 0.005, low, low == CheckOutcome.Fails ? 0.001 : 0.999), new(new(1e-6, 1e-5), 8, 0.001, 0.004, CheckOutcome.Passes, 0.999)],
    };

    private static Recording WrongAtLowTorque(int day)
    {
        var oil = TestStudy.Oil.ViscosityAt(Temperature.Body).PascalSeconds;
        return TestStudy.Check($"C{day}", Start.AddDays(day), TestStudy.Rates.Select((rate, i) => TestStudy.Reading(i + 1, rate, rate * oil * (rate < 3 ? 1.1 : 1))));
    }
}
