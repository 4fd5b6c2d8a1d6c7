namespace HemoRheo.Tests.Calibration.Blanks;

/// <summary>Zero, noise and the tests of them against tests/ReferenceData/blank-runs (SciPy).</summary>
public sealed class BlankStatisticsTests
{
    [Theory]
    [InlineData("plain", false, false, false)]
    [InlineData("zero", true, false, false)]
    [InlineData("noise", false, true, false)]
    [InlineData("drift", true, false, true)]
    public void Agree_with_SciPy(string name, bool zero, bool noise, bool drifts)
    {
        var torques = Torques(name).Select(row => new BlankTorque(row.Speed, row.Torque, row.Time)).ToArray();
        var expected = ReferenceTable.Read("blank-runs", "expected.csv").Single(row => row["run"] == name);
        var statistics = new BlankStatistics(torques, 0);
        Close(expected.Number("mean"), statistics.Zero);
        Close(expected.Number("deviation"), Math.Sqrt(BlankStatistics.Pooled([torques]).Variance));
        Close(expected.Number("p_zero"), statistics.ZeroProbability, 1e-12);
        Close(expected.Number("p_noise"), statistics.NoiseProbability, 1e-12);
        Close(expected.Number("p_change") < 0.01 ? expected.Number("change") : 0, statistics.Drift(bySpeed: false));
        Close(expected.Number("p_change_by_speed") < 0.01 ? expected.Number("change_by_speed") : 0, statistics.Drift(bySpeed: true));

        var run = EmptyGap.Read(TestStudy.Plain, EmptyGap.Run(name, TestStudy.Start, Torques(name)));
        Assert.Equal((zero, noise, drifts), (run.ZeroBySpeed, run.NoiseBySpeed, run.Drift != 0));
        Assert.Equal(zero || noise ? 3 : 1, run.Torques.Count);
        Assert.Equal([8, 8, 8], run.Speeds.Select(speed => speed.Readings));
    }

    [Fact]
    public void Dependence_is_found_by_chance_about_as_often_as_it_says()
    {
        const int runs = 1000;
        var (zero, noise, drift) = (0, 0, 0);
        for (var k = 0; k < runs; k++)
        {
            var stream = RandomStream.Of(20261201, "quiet empty gap", k);
            var statistics = new BlankStatistics([.. Enumerable.Range(0, 24).Select(i => new BlankTorque(1 + i / 6, 1e-9 * stream.Normal(), i))], 0);
            if (statistics.ZeroBySpeed) zero++;
            if (statistics.NoiseBySpeed) noise++;
            if (statistics.Drift(false) != 0) drift++;
        }

        // One in a hundred, within four standard deviations of a count of 10.
        Assert.InRange(zero, 1, 23);
        Assert.InRange(noise, 1, 23);
        Assert.InRange(drift, 1, 23);
    }

    private static IEnumerable<(double Speed, double Time, double Torque)> Torques(string name) =>
        ReferenceTable.Read("blank-runs", "torques.csv").Where(row => row["run"] == name).Select(row => (row.Number("speed"), row.Number("time"), row.Number("torque")));

    private static void Close(double expected, double actual, double least = 1e-18) => Assert.True(Math.Abs(expected - actual) <= 1e-7 * Math.Abs(expected) + least, $"{expected:G9}, {actual:G9}");
}
