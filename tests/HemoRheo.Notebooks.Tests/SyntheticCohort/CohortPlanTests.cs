using HemoRheo.App.Synthetic;

namespace HemoRheo.Notebooks.Tests;

/// <summary>What the issue asks of the first synthetic data, counted on the plan and on the truth of many seeds.</summary>
public sealed class CohortPlanTests
{
    private static readonly IReadOnlyList<PlannedSample> Samples = CohortPlan.Samples(SyntheticCohort.RepositorySeed);

    [Fact]
    public void There_are_eighty_people_of_whom_forty_eight_are_controls()
    {
        var people = Samples.DistinctBy(sample => sample.Person).ToArray();

        Assert.Equal(80, people.Length);
        Assert.Equal(48, people.Count(person => !person.Second));
    }

    [Fact]
    public void At_least_a_third_of_the_people_have_a_sample_loaded_twice() =>
        Assert.True(Samples.Where(sample => sample.StartedAt.Count == 2).DistinctBy(sample => sample.Person).Count() * 3 >= 80);

    [Fact]
    public void At_least_24_controls_and_40_people_stay_in_order_whatever_the_faults_put_in_doubt()
    {
        var inOrder = Samples
            .Where(sample => sample.Week is not (CohortPlan.FailedWeek or CohortPlan.FailedWeek - 1) && sample.Fault == PlantedFault.None)
            .DistinctBy(sample => sample.Person)
            .ToArray();

        Assert.True(inOrder.Length >= 40, $"{inOrder.Length} people stay in order.");
        Assert.True(inOrder.Count(person => !person.Second) >= 24, $"{inOrder.Count(person => !person.Second)} controls stay in order.");
    }

    [Fact]
    public void No_two_fillings_of_the_gap_overlap()
    {
        var starts = Samples.SelectMany(sample => sample.StartedAt).Concat(Enumerable.Range(1, CohortPlan.Weeks).Select(CohortPlan.CheckAt)).Order().ToArray();

        Assert.All(starts.Zip(starts.Skip(1)), pair => Assert.True(pair.Second - pair.First >= TimeSpan.FromMinutes(15)));
    }

    [Fact]
    public void The_clock_goes_over_to_summer_time_within_the_study() =>
        Assert.Equal([1, 2], Samples.Select(sample => sample.StartedAt[0].Offset.Hours).Distinct());

    [Theory]
    [InlineData(2)]
    [InlineData(3)]
    [InlineData(SyntheticCohort.RepositorySeed)]
    public void Numbers_are_believable(long seed)
    {
        // Plausibility only: hematocrit of men 0.40 to 0.54 and women 0.36 to 0.48 L/L, plasma 1.16 to 1.40 mPa.s (usual laboratory ranges);
        // at 0.45 L/L and 37 degC 15 to 25 mPa.s at 1 1/s, 7 to 10 at 10 1/s, 4.5 to 5.5 at 100 1/s (order of magnitude of the curves of Chien and of Merrill).
        var blood = Enumerable.Range(0, 400).Select(i => TruePopulation.Draw(RandomStream.Of(seed, $"person {i}", 1), man: i % 2 == 0, second: false)).ToArray();

        Assert.All(blood, one => Assert.InRange(one.Hematocrit, 0.36, 0.54));
        Assert.All(blood, one => Assert.InRange(one.Plasma, 0.00116, 0.00140));
        var near = blood.Where(one => Math.Abs(one.Hematocrit - 0.45) < 0.01).ToArray();
        Assert.NotEmpty(near);
        Assert.All(near, one => Assert.InRange(1000 * one.ViscosityAt(1), 13, 27));
        Assert.InRange(near.Average(one => 1000 * one.ViscosityAt(1)), 15, 25);
        Assert.InRange(near.Average(one => 1000 * one.ViscosityAt(10)), 7, 10);
        Assert.InRange(near.Average(one => 1000 * one.ViscosityAt(100)), 4.5, 5.5);
    }

    [Fact]
    public void The_study_file_opens_and_declares_the_true_sizes()
    {
        var study = Study.Open(Path.Combine(Repository.Root, "synthetic-cohort", "study.toml"));

        Assert.Equal(0.01, study.Errors.Relative, 12);
        Assert.Equal(0.0002, study.Errors.Floor, 12);
        Assert.Equal(0.006, study.Counters[0].Uncertainty, 12);
        Assert.Equal(3e-9, study.Instruments[0].TorqueZero, 15);
        Assert.Equal("Quemada", study.Analysis.DecideBy);
    }
}
