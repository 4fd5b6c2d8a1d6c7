namespace HemoRheo.Tests.Cohorts;

public sealed class GroupComparisonTests
{
    /// <summary>Student's sleep data, the second drug as the controls: R's t.test gives first less second (tests/ReferenceData/group-comparison).</summary>
    [Fact]
    public void The_total_difference_of_the_sleep_data_is_Welchs_as_R_gives_it()
    {
        var sleep = ReferenceTable.Read("group-comparison", "sleep.csv");
        var expected = ReferenceTable.Read("group-comparison", "sleep-welch.r.csv").ToDictionary(row => row["quantity"], row => row.Number("value"));
        var analyzed = TwoGroups.Of(sleep.Where(row => row["group"] == "2").Select(row => row.Number("extra")), sleep.Where(row => row["group"] == "1").Select(row => row.Number("extra")));
        var total = Assert.Single(analyzed.Summarized().Measurands).Total;
        Assert.Equal(expected["mean difference"], total.Difference!.X, 1e-12);
        Assert.Equal(expected["se"], total.Difference.StandardUncertainty, 1e-12);
        Assert.Equal(expected["df"], total.Difference.DegreesOfFreedom, 1e-10);
        Assert.Equal(expected["p"], total.Probability!.Value, 1e-10);
        Assert.Equal(expected["95 % low"], total.Difference.Interval().Lower, 1e-8);
        Assert.Equal(expected["95 % high"], total.Difference.Interval().Upper, 1e-8);
    }

    [Theory]
    [MemberData(nameof(ErrorAwareDifferenceTests.Cases), MemberType = typeof(ErrorAwareDifferenceTests))]
    public void Total_and_adjusted_differences_of_a_cohort_agree_with_SciPy(string name)
    {
        var expected = ReferenceTable.Read("group-comparison", "adjusted-expected.scipy.csv").Single(row => row["case"] == name);
        var measurand = Assert.Single(TwoGroups.Case(name, expected.Number("hematocrit_u")).Summarized().Measurands);
        var total = measurand.Total.Difference!;
        Assert.Equal(expected.Number("welch_t"), total.X / total.StandardUncertainty, 1e-9);
        Near(expected.Number("welch_p"), measurand.Total.Probability!.Value, 1e-6);
        var adjusted = measurand.Adjusted!.Difference!;
        Near(expected.Number("difference"), adjusted.X, 1e-9);
        Near(expected.Number("standard_error"), adjusted.StandardUncertainty, 1e-9);
        Near(expected.Number("degrees_of_freedom"), adjusted.DegreesOfFreedom, 1e-9);
        Near(expected.Number("p"), measurand.Adjusted.Probability!.Value, 1e-6);
    }

    [Fact]
    public void A_mean_keeps_shared_parts_and_holds_individual_ones_in_the_scatter_of_people()
    {
        double[] logs = [-5.2, -5.1, -5.0, -4.9];
        var group = Assert.Single(TwoGroups.Of(logs, logs, BuiltCohort.Calibration(-0.05)).Summarized().Measurands).First;
        // s of -5.2 .. -4.9 in steps of 0.1 is 0.1 sqrt(5/3).
        Assert.Equal(0.12909944487358055, group.StandardDeviation!.Value, 1e-14);
        Assert.Equal(-0.05, group.Mean!.Part(SourceKind.Calibration)!.Value, 1e-15);
        Assert.Equal(0.12909944487358055 / 2, group.Mean.Part(SourceKind.People)!.Value, 1e-14);
        Assert.Null(group.Mean.Part(SourceKind.Fit));
        Assert.Equal(3, group.Mean.Parts.Single(part => part.Source.Kind == SourceKind.People).DegreesOfFreedom);
    }

    [Fact]
    public void What_both_groups_share_cancels_and_what_each_period_has_of_its_own_stays()
    {
        double[] logs = [-5.2, -5.1, -5.0, -4.9];
        var analyzed = TwoGroups.Of(logs, logs, BuiltCohort.Calibration(-0.05));
        var same = Assert.Single(analyzed.Summarized().Measurands).Total.Difference!;
        Assert.Equal(0.12909944487358055 / Math.Sqrt(2), same.StandardUncertainty, 1e-14);
        Assert.Equal(6, same.DegreesOfFreedom, 1e-9);
        var second = analyzed.Samples.Select(sample => sample.Sample.StartsWith("S-p", StringComparison.Ordinal) ? sample with { Values = [BuiltCohort.Value(sample.Values[0].Value.X, BuiltCohort.Calibration(-0.05, "R1/2"))] } : sample);
        var apart = Assert.Single((analyzed with { Samples = second.ToItems() }).Summarized().Measurands).Total.Difference!;
        Assert.Equal(Math.Sqrt(0.1 * 0.1 * 5 / 6 + 2 * 0.05 * 0.05), apart.StandardUncertainty, 1e-14);
    }

    [Fact]
    public void Visits_of_a_person_count_as_one_person()
    {
        double[] logs = [-5.2, -5.1, -5.0, -4.9];
        var analyzed = TwoGroups.Of(logs, logs);
        var visits = analyzed.Samples.SelectMany(sample => new[] { -0.01, 0.01 }.Select((shift, visit) => sample with { Sample = $"{sample.Sample}/{visit}", Values = [BuiltCohort.Value(sample.Values[0].Value.X + shift)] }));
        var group = Assert.Single((analyzed with { Samples = visits.ToItems() }).Summarized().Measurands).First;
        Assert.Equal((8, 4), (group.Samples, group.Used));
        Assert.Equal(0.12909944487358055, group.StandardDeviation!.Value, 1e-13);
    }

    [Fact]
    public void Every_sample_is_used_set_aside_by_reason_or_marked()
    {
        double[] logs = [-5.2, -5.1, -5.0, -4.9];
        var analyzed = TwoGroups.Of(logs, logs)
            .With(BuiltCohort.Sample("S-x", "x", BuiltCohort.Value(-4) with { Decidable = false }))
            .With(BuiltCohort.Sample("S-y", "y", BuiltCohort.Value(-4)) with { Status = InstrumentStatus.InDoubt })
            .With(BuiltCohort.Sample("S-z", "z"));
        var summary = analyzed.Summarized();
        var group = Assert.Single(summary.Measurands).Second;
        Assert.Equal((7, 4, 1), (group.Samples, group.Used, group.Marked));
        Assert.Equal([new("value-missing", 1), new CountedReason("value-not-decidable", 1)], group.SetAside);
        Assert.Equal(-5.05, group.Mean!.X, 1e-12);
    }

    [Fact]
    public void Outcomes_are_counted_by_group_with_marked_ones_apart()
    {
        var analyzed = TwoGroups.Of(BuiltCohort.Spread(30), [-4.0, -6.0, -5.1])
            .With(BuiltCohort.Sample("S-x", "x", BuiltCohort.Value(-4) with { Decidable = false }))
            .With(BuiltCohort.Sample("S-y", "y", BuiltCohort.Value(-4)) with { Status = InstrumentStatus.InDoubt });
        var patients = analyzed.Summarized().Outcomes.Single(count => count.Label == "patients");
        Assert.Equal(new("patients", BuiltCohort.At10, HematocritBasis.Native, 1, 1, 1, 0, 1, 1), patients);
        var controls = analyzed.Summarized().Outcomes.Single(count => count.Label == "controls");
        Assert.Equal(30, controls.Below + controls.Within + controls.Above + controls.Undecided);
    }

    [Fact]
    public void Only_native_values_are_adjusted()
    {
        var analyzed = TwoGroups.Of(BuiltCohort.Spread(8), BuiltCohort.Spread(8));
        var standard = analyzed.Samples.Select(sample => sample with { Values = sample.Values.With([sample.Values[0] with { Basis = HematocritBasis.StandardByPlasma }]) });
        var measurands = (analyzed with { Samples = standard.ToItems() }).Summarized().Measurands;
        Assert.NotNull(measurands[0].Adjusted);
        Assert.Equal(HematocritBasis.StandardByPlasma, measurands[1].Basis);
        Assert.Null(measurands[1].Adjusted);
    }

    [Fact]
    public void Every_group_beside_the_controls_has_its_own_comparison()
    {
        double[] logs = [-5.2, -5.1, -5.0, -4.9];
        var analyzed = TwoGroups.Of(logs, logs);
        var third = analyzed with
        {
            Study = analyzed.Study with { Groups = [new("p", "patients", false), new("c", "controls", true), new("q", "others", false)] },
            Samples = analyzed.Samples.With([BuiltCohort.Sample("S-q1", "q1", BuiltCohort.Value(-5)), BuiltCohort.Sample("S-q2", "q2", BuiltCohort.Value(-4))]),
            Readings = analyzed.Readings with { People = analyzed.Readings.People.With([BuiltCohort.Person("q1", "q"), BuiltCohort.Person("q2", "q")]) },
        };
        Assert.Equal([("controls", "patients"), ("controls", "others")], third.Summarized().Measurands.Select(measurand => (measurand.First.Label, measurand.Second.Label)));
    }

    [Fact]
    public void Cautions_speak_of_total_and_adjusted_many_comparisons_small_groups_and_research_use()
    {
        var cautions = string.Join(" ", TwoGroups.Case("equal groups", 0.008).Summarized().Cautions);
        Assert.Contains("Research use only", cautions, StringComparison.Ordinal);
        Assert.Contains("answer different questions", cautions, StringComparison.Ordinal);
        Assert.Contains("2 differences are shown", cautions, StringComparison.Ordinal);
        Assert.DoesNotContain("Small groups", cautions, StringComparison.Ordinal);
        Assert.Contains("the smallest has 3 people", string.Join(" ", TwoGroups.Of([-5.0, -5.1, -5.3], [-4.0, -4.2, -4.3, -4.1]).Summarized().Cautions), StringComparison.Ordinal);
    }

    private static void Near(double expected, double actual, double relative) => Assert.Equal(expected, actual, relative * Math.Abs(expected) + 1e-14);
}
