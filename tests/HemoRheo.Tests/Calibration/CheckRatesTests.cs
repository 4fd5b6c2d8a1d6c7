using static HemoRheo.Tests.Calibration.InvestigatedInstrument;

namespace HemoRheo.Tests.Calibration;

/// <summary>
/// How often checks decide wrongly, by simulation with every error of the budget drawn anew. At level 0.95 an instrument whose error lies at the limit itself
/// is passed, and failed, in at most 5 % of checks each; one without an error is failed practically never.
/// </summary>
public class CheckRatesTests
{
    // A check scatters by 0.3 % and the 0.31 % of its fit: 0.43 % in all.
    private const int Instruments = 3000;

    // 5 % of 3,000, plus three standard errors of a proportion: sqrt(0.05 * 0.95 / 3000) = 0.0040.
    private const double Most = 0.05 + 3 * 0.0040;

    [Theory]
    [InlineData(0.03)]
    [InlineData(-0.03)]
    public void An_instrument_at_its_limit_is_passed_and_failed_in_about_5_percent_each_when_the_scatter_is_known(double relativeError)
    {
        var outcomes = Simulate(relativeError, checks: 1, declared: 0.0043, seed: 11);
        Assert.InRange(outcomes.Passed, 0.05 - 3 * 0.0040, Most);
        Assert.InRange(outcomes.Failed, 0.05 - 3 * 0.0040, Most);
    }

    [Fact]
    public void An_instrument_without_an_error_passes_and_never_fails()
    {
        var outcomes = Simulate(0, checks: 1, declared: 0.0043, seed: 12);
        Assert.InRange(outcomes.Passed, 0.99, 1);
        Assert.Equal(0, outcomes.Failed);
    }

    [Theory]
    [InlineData(3)]
    [InlineData(6)]
    public void With_the_scatter_of_its_own_few_checks_an_instrument_at_its_limit_is_passed_in_at_most_5_percent(int checks)
    {
        var outcomes = Simulate(0.03, checks, declared: null, seed: 13);
        Assert.InRange(outcomes.Passed, 0, Most);
        Assert.InRange(outcomes.Failed, 0, Most);
    }

    private static (double Passed, double Failed) Simulate(double relativeError, int checks, double? declared, int seed)
    {
        var random = new Random(seed);
        var study = TestStudy.With(TestStudy.Rheometer with { CheckScatter = declared });
        var histories = Enumerable.Range(0, Instruments).Select(_ => History(study, Recordings(random, relativeError, checks))).ToArray();
        var last = histories.Select(history => history.Checks[^1].Outcome).ToArray();
        return (last.Count(outcome => outcome == CheckOutcome.Passes) / (double)Instruments, last.Count(outcome => outcome == CheckOutcome.Fails) / (double)Instruments);
    }

    private static Recording[] Recordings(Random random, double relativeError, int checks)
    {
        var certified = 0.00625 * Math.Exp(0.002 * Normal(random));
        var coefficient = 0.022 + 0.0003 * Normal(random);
        var thermometer = 0.1 * Normal(random);
        return [.. Enumerable.Range(0, checks).Select(day =>
        {
            var viscosity = certified * Math.Exp(-coefficient * (37 + thermometer - 25)) * (1 + relativeError) * Math.Exp(0.003 * Normal(random));
            var readings = TestStudy.Rates.Select((rate, i) => TestStudy.Reading(i + 1, rate, rate * viscosity * (1 + 0.01 * Normal(random)) + 0.0003 * Normal(random)));
            return TestStudy.Check($"C{day}", TestStudy.Start.AddDays(day), readings);
        })];
    }

    private static double Normal(Random random) => Math.Sqrt(-2 * Math.Log(1 - random.NextDouble())) * Math.Cos(2 * Math.PI * random.NextDouble());
}
