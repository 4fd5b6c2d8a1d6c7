namespace HemoRheo.Notebooks.Tests;

/// <summary>The whole chain on the committed cohort, held against what is true of it.</summary>
public sealed class TruthRecoveryTests
{
    private static readonly Lazy<StudyResult> Analyzed = new(() =>
    {
        var study = Study.Open(Path.Combine(Truth.Folder, "study.toml"));
        return study.Analyze(study.ReadExports());
    });

    private static StudyResult Result => Analyzed.Value;

    [Theory]
    [InlineData(1, HematocritBasis.Native)]
    [InlineData(10, HematocritBasis.Native)]
    [InlineData(100, HematocritBasis.Native)]
    [InlineData(1, HematocritBasis.StandardByPlasma)]
    [InlineData(10, HematocritBasis.StandardByPlasma)]
    [InlineData(100, HematocritBasis.StandardByPlasma)]
    public void Intervals_of_95_percent_hold_the_truth_in_88_to_100_percent_of_samples_in_order(int rate, HematocritBasis basis)
    {
        var column = basis == HematocritBasis.Native ? "native_mPa_s" : "standard_mPa_s";
        var truth = Truth.Rows("viscosities.csv").Where(row => row["shear_rate_per_s"] == $"{rate}").ToDictionary(row => row["sample"], row => Truth.Number(row[column]));
        var held = Result.Samples
            .Where(sample => sample.Result.Status == InstrumentStatus.InOrder)
            .Select(sample => (sample.Sample, Value: sample.Result.Find("Quemada", new ViscosityAtRate(rate.PerSecond()), basis)))
            .Where(one => one.Value is { Decidable: true })
            .Select(one => one.Value!.Interval() is var interval && interval.Lower <= truth[one.Sample] && truth[one.Sample] <= interval.Upper)
            .ToArray();

        Assert.True(held.Length >= 40, $"{held.Length} samples have a value that may be decided on.");
        Assert.InRange(held.Count(one => one) / (double)held.Length, 0.88, 1);
    }

    [Theory]
    [InlineData(1)]
    [InlineData(10)]
    [InlineData(100)]
    public void The_effect_beyond_hematocrit_is_recovered_within_its_interval(int rate)
    {
        var truth = Truth.Number(Truth.Rows("effects.csv").Single(row => row["shear_rate_per_s"] == $"{rate}")["ln_ratio_altitude_to_lowland"]);
        var summary = Result.Study.Summarize(Result).By("group").Measurands
            .Single(one => one.Law == "Quemada" && one.Basis == HematocritBasis.Native && one.Measurand == new ViscosityAtRate(rate.PerSecond()));

        var difference = summary.Adjusted!.Difference;
        Assert.NotNull(difference);
        var interval = difference.Interval(0.95);
        Assert.InRange(truth, interval.Lower, interval.Upper);
        Assert.True(interval.Upper - interval.Lower < 0.25, $"The interval of the effect is {interval.Upper - interval.Lower:G3} wide on the logarithm, which tells nothing.");
    }

    [Fact]
    public void At_low_shear_the_effect_is_told_from_none()
    {
        var summary = Result.Study.Summarize(Result).By("group").Measurands
            .Single(one => one.Law == "Quemada" && one.Basis == HematocritBasis.Native && one.Measurand == new ViscosityAtRate(1.PerSecond()));

        Assert.True(summary.Adjusted!.Difference!.Interval(0.95).Lower > 0);
    }

    [Fact]
    public void Exactly_one_check_fails_and_it_is_the_one_of_the_changed_instrument()
    {
        var failed = Result.Analyzed.Histories.SelectMany(history => history.Checks).Where(check => check.Outcome == CheckOutcome.Fails);

        Assert.Equal(Truth.SamplesWith("check fails"), failed.Select(check => check.Name));
        Assert.All(
            Result.Analyzed.Histories.SelectMany(history => history.Checks).Where(check => check.Name != "C-4"),
            check => Assert.Equal(CheckOutcome.Passes, check.Outcome));
    }

    [Fact]
    public void Samples_in_doubt_and_failed_are_those_of_the_weeks_around_the_failed_check()
    {
        Assert.Equal(Truth.SamplesWith("measured between the last passed check and the failed one"), SamplesOf(InstrumentStatus.InDoubt));
        Assert.Equal(Truth.SamplesWith("measured after the failed check"), SamplesOf(InstrumentStatus.Failed));
        Assert.Empty(SamplesOf(InstrumentStatus.Unknown));
    }

    [Fact]
    public void At_least_24_controls_and_40_people_have_a_value_that_counts()
    {
        var summary = Result.Study.Summarize(Result).By("group").Measurands
            .Single(one => one.Law == "Quemada" && one.Basis == HematocritBasis.StandardByPlasma && one.Measurand == new ViscosityAtRate(1.PerSecond()));

        Assert.True(summary.First.Used >= 24, $"{summary.First.Used} controls count.");
        Assert.True(summary.First.Used + summary.Second.Used >= 40, $"{summary.First.Used + summary.Second.Used} people count.");
    }

    [Fact]
    public void The_failed_week_is_truly_off()
    {
        var errors = Truth.Rows("instrument.csv").ToLookup(row => row["recording"], row => Truth.Number(row["ln_error"]));

        Assert.All(Truth.SamplesWith("measured after the failed check"), sample => Assert.All(errors[sample], error => Assert.InRange(error, 0.04, 0.10)));
        Assert.All(SamplesOf(InstrumentStatus.InOrder), sample => Assert.All(errors[sample], error => Assert.InRange(error, -0.03, 0.03)));
    }

    [Fact]
    public void The_cut_file_is_found_and_nothing_else_of_the_files()
    {
        var faulty = Result.Analyzed.Readings.Files.Where(file => file.Findings.Any(finding => finding.Severity == Severity.Fault)).ToArray();

        Assert.Equal(["exports/blocks-2025-04-08-S-0071.txt"], faulty.Select(file => file.Path));
        Assert.Equal(Truth.SamplesWith("export file cut in the middle"), faulty.SelectMany(file => file.Findings).Select(finding => finding.Where.Sample).Distinct());
    }

    [Fact]
    public void The_temperature_excursion_sets_points_of_that_recording_aside()
    {
        var aside = Result.Samples
            .SelectMany(sample => sample.Result.Loadings)
            .Where(loading => loading.Curve.SetAside.Any(point => point.Findings.Any(finding => finding.Code == "temperature-off")));

        Assert.Equal(Truth.SamplesWith("temperature excursion"), aside.Select(loading => loading.Recording.Sample).Distinct());
    }

    [Fact]
    public void The_sample_measured_too_late_is_found()
    {
        var late = Result.Samples.Where(sample => sample.Result.Findings.Any(finding => finding.Code == "too-long-since-draw"));

        Assert.Equal(Truth.SamplesWith("measured too long after the draw"), late.Select(sample => sample.Sample));
    }

    private static IEnumerable<string> SamplesOf(InstrumentStatus status) =>
        Result.Samples.Where(sample => sample.Result.Status == status).Select(sample => sample.Sample);
}
