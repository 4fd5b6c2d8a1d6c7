namespace HemoRheo.Tests.Cohorts;

public sealed class HematocritAdjustmentTests
{
    [Fact]
    public void A_bias_of_one_counter_for_all_leaves_no_part_and_two_counters_leave_each_their_own()
    {
        var analyzed = TwoGroups.Case("equal groups", 0.008);
        var same = Adjusted(analyzed);
        Assert.Null(same.Difference!.Part(SourceKind.Counter));
        var study = analyzed.Study with { Counters = [new("counter", 0.008, 0.003), new("spun", 0.008, 0.004)] };
        var two = analyzed.Samples.Select(sample => sample.Sample.StartsWith("S-p", StringComparison.Ordinal) ? sample.WithHematocrit(sample.Record!.Hematocrit!.Value.LiterPerLiter, "spun") : sample);
        var apart = Adjusted(analyzed with { Study = study, Samples = two.ToItems() }).Difference!;
        var parts = apart.Parts.Where(part => part.Source.Kind == SourceKind.Counter).ToDictionary(part => part.Source.Of, part => part.Amount);
        // Slope 5.69915815975588 by the script of the reference data: -b (shares of second less first) u.
        Assert.Equal(5.69915815975588 * 0.003, parts["counter"], 1e-10);
        Assert.Equal(-5.69915815975588 * 0.004, parts["spun"], 1e-10);
    }

    [Fact]
    public void Shared_parts_of_the_values_enter_as_in_the_total_difference()
    {
        var analyzed = TwoGroups.Case("equal groups", 0.008);
        var second = analyzed.Samples.Select(sample => sample with
        {
            Values = [BuiltCohort.Value(sample.Values[0].Value.X, BuiltCohort.Calibration(-0.02, sample.Sample.StartsWith("S-p", StringComparison.Ordinal) ? "R1/2" : "R1/1"))],
        });
        var adjusted = Adjusted(analyzed with { Samples = second.ToItems() }).Difference!;
        Assert.Equal(Math.Sqrt(Math.Pow(0.0419498231170961, 2) + 2 * 0.02 * 0.02), adjusted.StandardUncertainty, 1e-12);
    }

    [Fact]
    public void Two_visits_halve_the_variance_of_a_persons_hematocrit()
    {
        var analyzed = TwoGroups.Case("equal groups", 0.008 * Math.Sqrt(2));
        var visits = analyzed.Samples.SelectMany(sample => new[] { sample with { Sample = sample.Sample + "/1" }, sample with { Sample = sample.Sample + "/2" } });
        var adjusted = Adjusted(analyzed with { Samples = visits.ToItems() }).Difference!;
        Assert.Equal(-0.00061205871833292, adjusted.X, 1e-12);
        Assert.Equal(0.0419498231170961, adjusted.StandardUncertainty, 1e-12);
    }

    [Fact]
    public void People_without_a_hematocrit_or_a_known_counter_are_left_out_and_counted_in_the_method()
    {
        var analyzed = TwoGroups.Case("equal groups", 0.008);
        var some = analyzed.Samples
            .With([BuiltCohort.Sample("S-x", "x", BuiltCohort.Value(-4)).WithHematocrit(null), BuiltCohort.Sample("S-y", "y", BuiltCohort.Value(-4)).WithHematocrit(0.4, "unheard of")]);
        var people = analyzed.Readings.People.With([BuiltCohort.Person("x", "c"), BuiltCohort.Person("y", "p")]);
        var measurand = Assert.Single((analyzed with { Samples = some, Readings = analyzed.Readings with { People = people } }).Summarized().Measurands);
        Assert.Equal(25, measurand.First.Used);
        Assert.Equal(-0.00061205871833292, measurand.Adjusted!.Difference!.X, 1e-12);
        Assert.Contains("24 and 24 people (1 and 1 left out", measurand.Adjusted.Method, StringComparison.Ordinal);
    }

    [Fact]
    public void A_hematocrit_that_is_constant_or_too_coarse_is_refused_in_the_agreed_words()
    {
        foreach (var analyzed in new[] { TwoGroups.Of(BuiltCohort.Spread(10), BuiltCohort.Spread(10)), TwoGroups.Case("equal groups", 0.025) })
        {
            var summary = analyzed.Summarized();
            var adjusted = Assert.Single(summary.Measurands).Adjusted!;
            Assert.Equal("hematocrit is measured too coarsely to adjust", adjusted.WhyNot);
            Assert.Null(adjusted.Difference);
            Assert.Null(adjusted.Probability);
            Assert.Contains(summary.Findings, finding => finding.Kind == CohortFindings.NotAdjusted);
            Assert.NotNull(Assert.Single(summary.Measurands).Total.Difference);
        }
    }

    [Fact]
    public void Groups_whose_slopes_differ_are_a_finding_and_groups_whose_slopes_do_not_are_none()
    {
        static IEnumerable<(double, double)> Line(double slope) => Enumerable.Range(0, 30).Select(i => (-5 + slope * 0.004 * (i - 15) + 0.02 * Math.Sin(7 * i), 0.44 + 0.004 * (i - 15)));
        Assert.Contains(TwoGroups.Of(Line(4), Line(8)).Summarized().Findings, finding => finding.Kind == CohortFindings.UnequalSlopes && finding.Observed > 3 && finding.Limit == 3);
        Assert.DoesNotContain(TwoGroups.Of(Line(6), Line(6.2)).Summarized().Findings, finding => finding.Kind == CohortFindings.UnequalSlopes);
    }

    private static GroupDifference Adjusted(AnalyzedStudy analyzed) => Assert.Single(analyzed.Summarized().Measurands).Adjusted!;
}
