namespace HemoRheo.Tests.Pooling;

public sealed class SlopePoolTests
{
    private static readonly Measurand At10 = Measurand.Viscosity(10.PerSecond());

    /// <summary>Source: Wells and Merrill 1962, digitised; slopes computed in R (wells-merrill-regressions.csv), all hematocrits one group and taken as exact.</summary>
    [Theory]
    [InlineData(0, 4.20639454510372)]
    [InlineData(1, 3.92227373414108)]
    [InlineData(2, 3.72168796400732)]
    [InlineData(3, 3.7142606234265)]
    public void Plain_slope_of_Wells_and_Merrill_is_that_of_R(int place, double slope)
    {
        var points = ReferenceTable.Read("hematocrit", "wells-merrill-1962-digitised.csv")
            .GroupBy(row => row["hematocrit_percent"])
            .Select(group => group.ElementAt(place))
            .Select(row => ("P" + row["hematocrit_percent"], "all", row.Number("hematocrit_percent") / 100, 0.0, Math.Log(row.Number("viscosity_mPa_s")))).ToArray();
        var pooled = SlopePool.Pool("none", At10, points);
        Assert.Equal(slope, pooled.Plain, 1e-9);
    }

    [Fact]
    public void Knowing_the_error_of_hematocrit_recovers_the_true_slope_that_the_plain_one_misses()
    {
        const double truth = 6.0, error = 0.015;
        double plain = 0, aware = 0, held = 0;
        const int studies = 400;
        for (var study = 0; study < studies; study++)
        {
            var random = new MathNet.Numerics.Random.Xoshiro256StarStar(1000 + study, false);
            double Draw(double sd) => MathNet.Numerics.Distributions.Normal.Sample(random, 0, sd);
            var points = Enumerable.Range(0, 120).Select(i =>
            {
                var hematocrit = (i % 2 == 0 ? 0.43 : 0.51) + Draw(0.03);
                return ($"P{i}", i % 2 == 0 ? "a" : "b", hematocrit + Draw(error), error, -4.4 + truth * hematocrit + 0.2 * (i % 2) + Draw(0.10));
            }).ToArray();
            var pooled = SlopePool.Pool("none", At10, points);
            plain += pooled.Plain / studies;
            aware += pooled.Slope / studies;
            var reach = MathNet.Numerics.Distributions.StudentT.InvCDF(0, 1, pooled.DegreesOfFreedom, 0.975) * pooled.StandardUncertainty;
            held += Math.Abs(pooled.Slope - truth) <= reach ? 1.0 / studies : 0;
        }

        // Reliability 0.8: the plain slope is flattened to 0.8 of the truth. The corrected one has a small upward bias of order 1/n.
        Assert.InRange(plain, 4.6, 5.0);
        Assert.InRange(aware, 5.85, 6.25);
        Assert.InRange(held, 0.95 - 3 * Math.Sqrt(0.95 * 0.05 / studies), 1);
    }

    [Fact]
    public void Hematocrit_that_hardly_varies_is_refused_in_words()
    {
        var points = Enumerable.Range(0, 30).Select(i => ($"P{i}", "a", 0.45 + 0.0001 * i, 0.006, -4.4)).ToArray();
        Assert.Equal("hematocrit is measured too coarsely to adjust", SlopePool.Pool("none", At10, points).WhyNot);
    }

    [Fact]
    public void Visits_of_one_person_are_one_person()
    {
        var points = Enumerable.Range(0, 40).Select(i => ($"P{i / 2}", "a", 0.36 + 0.008 * (i / 2), 0.001, -4.4 + 0.02 * (i / 2))).ToArray();
        Assert.Equal(20, SlopePool.Pool("none", At10, points).People);
    }

    [Fact]
    public void One_hematocrit_for_everybody_gives_numbers_all_the_same()
    {
        var pooled = SlopePool.Pool("none", At10, [.. Enumerable.Range(0, 30).Select(i => ($"P{i}", "a", 0.45, 0.006, -4.4 + 0.01 * i))]);
        Assert.Equal((0.0, 0.0, "hematocrit is measured too coarsely to adjust"), (pooled.Slope, pooled.Plain, pooled.WhyNot));
    }
}
