namespace HemoRheo.Tests.Screening;

/// <summary>
/// How often clean curves trip the rules that look at noisy numbers. Expected rates are normal tail probabilities from tables:
/// beyond 3.33 standard deviations on both sides 0.00087 (P(Z &gt; 3.33) = 0.00043), beyond 4 standard deviations 0.000063 (P(Z &gt; 4) = 0.0000317).
/// </summary>
public class FalseAlarmTests
{
    private const int Curves = 4000;

    [Fact]
    public void A_bath_steady_to_0_15_K_trips_a_tolerance_of_0_5_K_in_0_09_percent_of_readings()
    {
        // 48,000 readings: 41.8 expected, Poisson, within 3 standard deviations 22 to 62.
        Assert.InRange(Alarms("temperature-off", new Random(1), (reading, noise) => reading with { Temperature = 37 + 0.15 * noise }), 22, 62);
    }

    [Fact]
    public void A_speed_steady_to_half_a_percent_trips_a_tolerance_of_2_percent_in_0_006_percent_of_readings()
    {
        // 48,000 readings: 3.0 expected, Poisson, 99.9 % of the time at most 10.
        Assert.InRange(Alarms("speed-not-reached", new Random(2), (reading, noise) => reading with { SetSpeed = reading.Speed, Speed = reading.Speed * (1 + 0.005 * noise) }), 0, 10);
    }

    [Fact]
    public void Steps_at_least_30_percent_apart_are_never_duplicates_when_speeds_are_steady_to_half_a_percent()
    {
        Assert.Equal(0, Alarms("duplicate-reading", new Random(3), (reading, noise) => reading with { Speed = reading.Speed * (1 + 0.005 * noise) }));
    }

    [Fact]
    public void Plasma_in_the_cylinders_is_above_the_torque_floor_at_10_per_second()
    {
        // 1.2 mPa.s at 10 1/s: 12 mPa, which the cylinders turn into 0.53 uN.m, 26 times the floor.
        Assert.Equal(0, Alarms("torque-below-floor", new Random(4), (reading, noise) => reading with { Torque = reading.Torque * 0.24 * (1 + 0.05 * noise) }, lowest: 10));
    }

    private static int Alarms(string code, Random random, Func<Reading, double, Reading> noisy, double lowest = 0)
    {
        var rates = TestStudy.Rates.Where(rate => rate >= lowest).ToArray();
        return Enumerable.Range(0, Curves).Sum(_ =>
        {
            var readings = rates.Select((rate, i) => noisy(TestStudy.Turned(i + 1, rate, 0.005 * rate), Normal(random)));
            var screened = TestStudy.Blood("S1", readings).ToCurve(TestStudy.Plain, Ramp.Down).Screened(TestStudy.Plain, TestStudy.Sample("S1"));
            return screened.SetAside.Count(aside => aside.Findings.Any(finding => finding.Code == code));
        });
    }

    private static double Normal(Random random) => Math.Sqrt(-2 * Math.Log(1 - random.NextDouble())) * Math.Cos(2 * Math.PI * random.NextDouble());
}
