namespace HemoRheo.Tests.Cohorts;

/// <summary>Bad input gives a summary with reasons, never an exception; only misuse throws.</summary>
public sealed class BadCohortTests
{
    [Fact]
    public void A_group_with_one_person_has_no_mean_and_says_why()
    {
        var summary = TwoGroups.Of([-5.2, -5.1, -5.0], [-4.9]).Summarized();
        var measurand = Assert.Single(summary.Measurands);
        Assert.Null(measurand.Second.Mean);
        Assert.Null(measurand.Second.StandardDeviation);
        Assert.Equal("patients: a mean needs two people, 1 can be used.", measurand.Second.WhyNoMean);
        Assert.Null(measurand.Total.Difference);
        Assert.Equal(measurand.Second.WhyNoMean, measurand.Total.WhyNot);
        Assert.Contains("there are 3 and 1", measurand.Adjusted!.WhyNot!, StringComparison.Ordinal);
        Assert.Contains(summary.Findings, finding => finding.Kind == CohortFindings.GroupTooSmall);
    }

    [Fact]
    public void With_all_values_in_doubt_nothing_is_compared_and_all_are_counted_as_marked()
    {
        var analyzed = TwoGroups.Of(BuiltCohort.Spread(20), BuiltCohort.Spread(20));
        var doubtful = analyzed with { Samples = analyzed.Samples.Select(sample => sample with { Status = InstrumentStatus.InDoubt }).ToItems() };
        var measurand = Assert.Single(doubtful.Summarized().Measurands);
        Assert.Equal((20, 0, 20), (measurand.First.Samples, measurand.First.Used, measurand.First.Marked));
        Assert.Contains("20 instrument-not-in-order", measurand.First.WhyNoMean!, StringComparison.Ordinal);
    }

    [Fact]
    public void Without_a_people_table_every_sample_is_named_as_in_no_group()
    {
        var analyzed = TwoGroups.Of(BuiltCohort.Spread(3), BuiltCohort.Spread(3));
        var summary = (analyzed with { Readings = analyzed.Readings with { People = [] } }).Summarized();
        Assert.Contains(summary.Findings, finding => finding.Kind == CohortFindings.PeopleMissing);
        Assert.Equal(6, summary.Findings.Count(finding => finding.Kind == CohortFindings.SampleWithoutGroup));
        Assert.Null(Assert.Single(summary.Measurands).Total.Difference);
    }

    [Fact]
    public void A_person_of_an_undeclared_group_and_a_sample_without_a_row_are_in_no_group()
    {
        var analyzed = TwoGroups.Of(BuiltCohort.Spread(3), BuiltCohort.Spread(3))
            .With(BuiltCohort.Sample("S-x", "x", BuiltCohort.Value(-4)), "unheard of");
        analyzed = analyzed with { Samples = analyzed.Samples.With([BuiltCohort.Sample("S-y", "y", BuiltCohort.Value(-4)) with { Record = null }]) };
        var lost = analyzed.Summarized().Findings.Where(finding => finding.Kind == CohortFindings.SampleWithoutGroup).Select(finding => finding.Where.Sample);
        Assert.Equal(["S-x", "S-y"], lost);
    }

    [Fact]
    public void Values_all_alike_have_a_difference_without_a_probability()
    {
        var measurand = Assert.Single(TwoGroups.Of(Enumerable.Repeat(-5.0, 5), Enumerable.Repeat(-5.0, 5)).Summarized().Measurands);
        Assert.Equal(0, measurand.Total.Difference!.X);
        Assert.Null(measurand.Total.Probability);
    }

    [Fact]
    public void One_group_no_group_or_no_controls_are_findings()
    {
        var analyzed = TwoGroups.Of(BuiltCohort.Spread(3), BuiltCohort.Spread(3));
        Assert.Contains(Groups([new("c", "controls", true)]).Findings, finding => finding.Kind == CohortFindings.OneGroup);
        Assert.Contains(Groups([]).Findings, finding => finding.Kind == CohortFindings.OneGroup);
        Assert.Contains(Groups([new("c", "some", false), new("p", "others", false)]).Findings, finding => finding.Kind == CohortFindings.NoControlGroup);

        CohortSummary Groups(Items<Group> groups) => (analyzed with { Study = analyzed.Study with { Groups = groups } }).Summarized();
    }

    [Fact]
    public void A_study_without_samples_gives_an_empty_summary()
    {
        var summary = TwoGroups.Of(new List<double>(), []).Summarized();
        Assert.Empty(summary.Measurands);
        Assert.NotEmpty(summary.Cautions);
    }

    [Fact]
    public void An_unknown_word_and_results_of_another_study_are_misuse_and_say_what_to_do()
    {
        var result = TwoGroups.Of(BuiltCohort.Spread(3), BuiltCohort.Spread(3)).Judged();
        var unknown = Assert.Throws<ArgumentException>(() => result.Study.Summarize(result).By("residence"));
        Assert.Contains("\"residence\"", unknown.Message, StringComparison.Ordinal);
        Assert.Contains("\"group\"", unknown.Message, StringComparison.Ordinal);
        Assert.Contains("Analyze this study first", Assert.Throws<ArgumentException>(() => (result.Study with { Seed = 1 }).Summarize(result)).Message, StringComparison.Ordinal);
    }
}
