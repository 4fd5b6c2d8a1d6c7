using static HemoRheo.Tests.Calibration.InvestigatedInstrument;

namespace HemoRheo.Tests.Samples.Review;

/// <summary>One rheometer, checked weekly; a sample a day after each check.</summary>
public sealed class ReviewTests
{
    private static readonly Study Study = TestStudy.With(TestStudy.Rheometer with { CheckScatter = 0.0043 });

    private static DateTimeOffset Day(double day) => TestStudy.Start.AddDays(day);

    [Fact]
    public void Samples_between_the_last_passed_check_and_the_next_passed_one_are_in_doubt_with_the_reason()
    {
        var review = Reviewed(28, [Check(0, 0.4), Check(7, 0.5), Check(14, 9), Check(21, 0.3)]);
        Assert.Equal(4, review.Samples);
        Assert.Equal([("S-08", InstrumentStatus.InDoubt), ("S-15", InstrumentStatus.Failed)], review.InDoubt.Select(doubt => (doubt.Sample, doubt.Status)));
        Assert.Equal("Failed at check 'C14' of 2026-03-16; none has passed since.", review.InDoubt[1].Reason);
        Assert.Equal(InstrumentStatus.InOrder, review.Standing.Status);
    }

    [Fact]
    public void What_comes_later_than_the_moment_is_not_known_yet()
    {
        var review = Reviewed(13, [Check(0, 0.4), Check(7, 0.5), Check(14, 9), Check(21, 0.3)]);
        Assert.Equal((2, 2, 0), (review.Course.Checks.Count, review.Samples, review.InDoubt.Count));
    }

    [Fact]
    public void A_change_that_the_chart_dates_puts_in_doubt_what_was_measured_since_though_every_check_passes()
    {
        var checks = Enumerable.Range(0, 26).Select(week => Check(7 * week, (week % 2 == 0 ? 0.1 : -0.1) + (week < 21 ? 0 : 1.1))).ToArray();
        var review = Reviewed(7 * 26, checks);
        Assert.All(review.Course.Checks, check => Assert.Equal(CheckOutcome.Passes, check.Outcome));
        var changes = review.Chart.Current.Changes!;
        Assert.NotEmpty(review.InDoubt);
        Assert.All(review.InDoubt, doubt => Assert.True(doubt.At >= changes.Earliest && doubt.Status == InstrumentStatus.InDoubt));
        Assert.Contains("S-148", review.InDoubt.Select(doubt => doubt.Sample));
        Assert.DoesNotContain("S-85", review.InDoubt.Select(doubt => doubt.Sample));
        Assert.StartsWith("The control chart dates a change of the instrument to 2026-07-", review.InDoubt[0].Reason, StringComparison.Ordinal);
    }

    [Fact]
    public void A_sample_with_readings_at_torques_where_the_check_failed_is_in_doubt_and_one_without_is_not()
    {
        Recording[] blood = [Blood("S-low", 8, TestStudy.Rates), Blood("S-high", 8.1, [.. TestStudy.Rates.Where(rate => rate > 20)])];
        var review = Review(9, [Check(0, 0.1), Check(1, 0.2), WrongAtLowTorque(7)], blood);
        var doubt = Assert.Single(review.InDoubt);
        Assert.Equal(("S-low", InstrumentStatus.InDoubt), (doubt.Sample, doubt.Status));
        Assert.StartsWith("Kept readings lie where the check failed: 0.1 to 1 uN.m: Failed at check 'C7' of 2026-03-09", doubt.Reason, StringComparison.Ordinal);
        Assert.Equal(InstrumentStatus.InOrder, review.Standing.Status);
        Assert.Equal([InstrumentStatus.Failed, InstrumentStatus.InOrder, InstrumentStatus.InOrder], review.ByTorque.Select(decade => decade.Standing.Status));
    }

    [Fact]
    public void A_study_says_it_of_the_sample_and_of_its_values_and_decides_as_before()
    {
        Recording[] blood = [Blood("S-01", 8, TestStudy.Rates)];
        Recording[] right = [Check(0, 0.1), Check(1, 0.2), Check(7, 0.15)];
        var before = Assert.Single(Study.Evaluate(TestStudy.Readings(Study, right, blood, [TestStudy.Sample("S-01", Day(7.9))]), cancel: TestContext.Current.CancellationToken).Samples);
        var sample = Assert.Single(Study.Evaluate(TestStudy.Readings(Study, [right[0], right[1], WrongAtLowTorque(7)], blood, [TestStudy.Sample("S-01", Day(7.9))]), cancel: TestContext.Current.CancellationToken).Samples);
        Assert.DoesNotContain("instrument-in-doubt-at-some-torques", before.Findings.Codes());
        Assert.Contains("instrument-in-doubt-at-some-torques", sample.Findings.Codes());
        Assert.All(sample.Values.Where(value => value.Basis == HematocritBasis.Native), value => Assert.Contains("instrument-in-doubt-at-some-torques", value.Findings.Codes()));
        Assert.Equal(before.Status, sample.Status);
        Assert.Equal(before.Values.Select(value => value.Decidable), sample.Values.Select(value => value.Decidable));
    }

    [Fact]
    public void With_a_log_its_checks_count_and_those_it_does_not_hold_are_named()
    {
        using var folder = new Calibration.LogFolder();
        Recording[] checks = [Check(0, 0.4), Check(7, 0.5)];
        var readings = TestStudy.Readings(Study, checks);
        var history = History(Study, checks);
        folder.Log.Append(history.Checks[0].ToLog(readings), Day(0.1), "A. Miller");
        var review = history.Review(readings, Day(8), folder.Log.Read());
        Assert.Equal(["C0"], review.Course.Checks.Select(check => check.Name));
        Assert.Equal(["C7"], review.NotInLog.Select(check => check.Name));
        Assert.Equal(2, review.Log!.Entries);
    }

    private static InstrumentReview Reviewed(double at, Recording[] checks) =>
        Review(at, checks, [.. checks.Select(check => (check.StartedAt - TestStudy.Start).TotalDays + 1).Select(day => Blood($"S-{day:00}", day, TestStudy.Rates))]);

    private static InstrumentReview Review(double at, Recording[] checks, Recording[] blood) =>
        History(Study, checks).Review(TestStudy.Readings(Study, checks, blood), Day(at));

    private static Recording Blood(string sample, double day, double[] rates) =>
        TestStudy.Blood(sample, rates.Select((rate, i) => TestStudy.Reading(i + 1, rate, Math.Pow(Math.Sqrt(0.004) + Math.Sqrt(0.0035 * rate), 2))), at: Day(day));

    private static Recording WrongAtLowTorque(int day)
    {
        var oil = TestStudy.Oil.ViscosityAt(Temperature.Body).PascalSeconds;
        return TestStudy.Check($"C{day}", Day(day), TestStudy.Rates.Select((rate, i) => TestStudy.Reading(i + 1, rate, rate * oil * (rate < 3 ? 1.1 : 1))));
    }
}
