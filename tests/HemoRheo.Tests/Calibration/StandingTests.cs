using static HemoRheo.Tests.Calibration.InvestigatedInstrument;

namespace HemoRheo.Tests.Calibration;

/// <summary>Checks vouch for 8 days; the limit is 3 %.</summary>
public class StandingTests
{
    private static readonly InstrumentHistory Plain = History(Check(0, 0.4), Check(7, 0.5), Check(14, 9), Check(21, 0.3), Check(28, 0.4));

    [Fact]
    public void In_order_after_a_passed_check_that_no_failure_follows()
    {
        var standing = Plain.On(5);
        Assert.Equal(InstrumentStatus.InOrder, standing.Status);
        Assert.Equal("Passed check 'C0' of 2026-03-02, which vouches until 2026-03-10.", standing.Reason);
        Assert.Equal("R1/1", standing.Period!.Key);
        Assert.Empty(standing.Findings);
    }

    [Fact]
    public void In_doubt_between_the_last_passed_check_and_the_failed_one()
    {
        var standing = Plain.On(10);
        Assert.Equal(InstrumentStatus.InDoubt, standing.Status);
        Assert.Equal("Failed afterwards at check 'C14' of 2026-03-16; the last passed one was check 'C7' of 2026-03-09.", standing.Reason);
        Assert.Equal("R1/1", standing.Period!.Key);
        Assert.Equal(["instrument-in-doubt"], standing.Findings.Codes());
    }

    [Fact]
    public void Failed_from_the_failed_check_until_the_next_passed_one()
    {
        Assert.Equal(InstrumentStatus.InDoubt, Plain.On(13.999).Status);
        var standing = Plain.On(14);
        Assert.Equal(InstrumentStatus.Failed, standing.Status);
        Assert.Equal("Failed at check 'C14' of 2026-03-16; none has passed since.", standing.Reason);
        Assert.Equal("R1/1", standing.Period!.Key);
        Assert.Equal(InstrumentStatus.Failed, Plain.On(20.999).Status);
        Assert.Equal(InstrumentStatus.InOrder, Plain.On(21).Status);
        Assert.Equal("R1/2", Plain.On(21).Period!.Key);
    }

    [Fact]
    public void Unknown_before_the_first_check()
    {
        var standing = Plain.On(-1);
        Assert.Equal(InstrumentStatus.Unknown, standing.Status);
        Assert.Equal("No check of 'R1' lies before 2026-03-01 09:00 +01:00.", standing.Reason);
        Assert.Null(standing.Period);
        Assert.Equal(["instrument-not-checked"], standing.Findings.Codes());
    }

    [Theory]
    [InlineData(36, InstrumentStatus.InOrder)]
    [InlineData(36.01, InstrumentStatus.InDoubt)]
    public void In_doubt_when_a_check_is_overdue(double day, InstrumentStatus status)
    {
        var standing = Plain.On(day);
        Assert.Equal(status, standing.Status);
        Assert.Equal("R1/2", standing.Period!.Key);
        if (status == InstrumentStatus.InDoubt) Assert.Equal("Passed check 'C28' of 2026-03-30 8.0 days before; it vouches for 8 days.", standing.Reason);
    }

    [Fact]
    public void In_doubt_after_a_check_that_could_not_tell_until_the_next_passed_one()
    {
        var history = History(Check(0, 1.0), Check(6, 2.9), Check(7, 1.0), Check(8, 1.1), Check(9, 0.9));
        Assert.Equal(CheckOutcome.CannotTell, history.Checks[1].Outcome);
        Assert.Equal(InstrumentStatus.InOrder, history.On(5).Status);
        Assert.Equal("Could not tell at check 'C6' of 2026-03-08.", history.On(6.5).Reason);
        Assert.Equal(InstrumentStatus.InDoubt, history.On(6.5).Status);
        Assert.Equal(InstrumentStatus.InOrder, history.On(7).Status);
    }

    [Fact]
    public void A_failure_reaches_back_past_a_check_that_could_not_tell()
    {
        var history = History(Check(0, 1.7), Check(1, 1.75), Check(2, 1.7), Check(3, 2.4), Check(6, 9));
        Assert.Equal([CheckOutcome.Passes, CheckOutcome.Passes, CheckOutcome.Passes, CheckOutcome.CannotTell, CheckOutcome.Fails], history.Checks.Select(check => check.Outcome));
        Assert.Equal(InstrumentStatus.InOrder, history.On(1.5).Status);
        Assert.Equal("Failed afterwards at check 'C6' of 2026-03-08; the last passed one was check 'C2' of 2026-03-04.", history.On(2.5).Reason);
        Assert.Equal(["instrument-in-doubt", "instrument-check-unsure"], history.On(4).Findings.Codes());
    }

    [Fact]
    public void A_check_that_cannot_tell_does_not_end_a_failure()
    {
        var history = History(Check(0, 1.0), Check(1, 1.1), Check(2, 0.9), Check(3, 9), Check(6, 2.9), Check(7, 1), Check(8, 1));
        Assert.Equal(CheckOutcome.CannotTell, history.Checks[4].Outcome);
        Assert.Equal(InstrumentStatus.Failed, history.On(6.5).Status);
        Assert.Equal(InstrumentStatus.InOrder, history.On(7).Status);
    }

    [Fact]
    public void Unknown_after_an_adjustment_until_the_next_check()
    {
        var study = TestStudy.With(TestStudy.Rheometer with { Adjusted = [TestStudy.Start.AddDays(3)] });
        var history = History(study, Check(0, 0.4), Check(1, 0.5), Check(5, 1.4), Check(6, 1.5));
        Assert.Equal(InstrumentStatus.InOrder, history.On(2.9).Status);
        var standing = history.On(3);
        Assert.Equal(InstrumentStatus.Unknown, standing.Status);
        Assert.Equal("'R1' was adjusted on 2026-03-05 09:00 +01:00 and not checked since; the last check was check 'C1' of 2026-03-03.", standing.Reason);
        Assert.Null(standing.Period);
        Assert.Equal("R1/2", history.On(5).Period!.Key);
    }

    [Fact]
    public void Failed_and_adjusted_is_still_failed_but_has_no_correction()
    {
        var study = TestStudy.With(TestStudy.Rheometer with { Adjusted = [TestStudy.Start.AddDays(3)] });
        var history = History(study, Check(0, 0.4), Check(1, 0.5), Check(2, 9), Check(5, 0.4), Check(6, 0.5));
        Assert.Equal(InstrumentStatus.Failed, history.On(4).Status);
        Assert.Null(history.On(4).Period);
        Assert.Equal("R1/1", history.On(2.5).Period!.Key);
    }

    [Fact]
    public void Moments_of_other_offsets_are_the_same_moments() =>
        Assert.Equal(Plain.On(14), Plain.At(TestStudy.Start.AddDays(14).ToOffset(TimeSpan.FromHours(-7))));
}
