namespace HemoRheo.Tests.Samples;

/// <summary>
/// A contribution is the change of the value when its input, as used, is raised by one standard uncertainty. Here every input is raised by a small part of it,
/// the whole study is analyzed again, and the change is held against the contribution.
/// </summary>
public sealed class ContributionTests
{
    private const double Step = 1e-3;

    private static readonly Study Study = TestStudy.With(TestStudy.Rheometer with { TorqueZero = 2e-8, TorqueFloor = 1e-10, CheckEvery = TimeSpan.FromDays(30), CheckLimit = 0.2 }) with
    {
        Analysis = TestStudy.Plain.Analysis with { Laws = ["Casson"] },
        Screening = TestStudy.Plain.Screening with { LongestSinceDraw = TimeSpan.FromHours(8) },
    };

    private static readonly Inputs AsMeasured = new(Study, 0, 0, 0, 0.41, 0.00124);

    public static TheoryData<string> Kinds => ["certificate", "fluid beta", "thermometer", "blood beta", "torque zero of the blood's day", "torque zero of the checks' day", "hematocrit", "counter", "plasma"];

    [Theory]
    [MemberData(nameof(Kinds))]
    public void A_contribution_is_the_change_when_its_input_is_raised(string kind)
    {
        var (raised, source) = Raised(kind);
        foreach (var basis in new[] { HematocritBasis.Native, HematocritBasis.StandardByPlasma })
        {
            foreach (var rate in Study.Analysis.StandardRates)
            {
                var value = Evaluate(AsMeasured, rate, basis);
                var expected = (Evaluate(raised, rate, basis).X - value.X) / Step;
                var amount = value.Parts.Where(part => source(part.Source)).Sum(part => part.Amount);
                Assert.True(Math.Abs(expected - amount) <= 2e-3 * Math.Abs(expected) + 1e-9, $"{kind}, {basis}, {rate}: changes by {expected:G6}, contribution {amount:G6}");
            }
        }
    }

    private static (Inputs Raised, Func<Source, bool> Source) Raised(string kind)
    {
        var fluid = TestStudy.Oil;
        var perTorque = TestStudy.Cylinders.StressPerTorque();
        var counter = Study.Counters[0];
        return kind switch
        {
            "certificate" => (AsMeasured with { Study = With(fluid with { Certified = new(fluid.Certified.PascalSeconds * Math.Exp(Step * fluid.RelativeExpandedUncertainty / fluid.CoverageFactor)) }) }, source => source.Kind == SourceKind.Certificate),
            "fluid beta" => (AsMeasured with { Study = With(fluid with { PerKelvin = fluid.PerKelvin + Step * fluid.PerKelvinUncertainty }) }, source => source.Kind == SourceKind.FluidBeta),
            "thermometer" => (AsMeasured with { AllKelvins = Step * Study.Instruments[0].Thermometer }, source => source.Kind == SourceKind.Thermometer),
            "blood beta" => (AsMeasured with { Study = Study with { Blood = Study.Blood with { PerKelvin = Study.Blood.PerKelvin + Step * Study.Blood.PerKelvinUncertainty } } }, source => source.Kind == SourceKind.BloodBeta),
            "torque zero of the blood's day" => (AsMeasured with { BloodPascals = Step * Study.Instruments[0].TorqueZero * perTorque }, source => source == new Source(SourceKind.TorqueZero, "R1/2026-03-03")),
            "torque zero of the checks' day" => (AsMeasured with { CheckPascals = Step * Study.Instruments[0].TorqueZero * perTorque }, source => source == new Source(SourceKind.TorqueZero, "R1/2026-03-02")),
            "hematocrit" => (AsMeasured with { Hematocrit = AsMeasured.Hematocrit + Step * counter.Uncertainty }, source => source.Kind == SourceKind.Hematocrit),
            "counter" => (AsMeasured with { Hematocrit = AsMeasured.Hematocrit + Step * counter.SharedUncertainty }, source => source.Kind == SourceKind.Counter),
            "plasma" => (AsMeasured with { Plasma = AsMeasured.Plasma * Math.Exp(Step * Study.Blood.PlasmaUncertainty) }, source => source.Kind == SourceKind.Plasma),
            _ => throw new ArgumentOutOfRangeException(nameof(kind)),
        };
    }

    private static Study With(CalibrationFluid fluid) => Study with { Fluids = [fluid] };

    private static Value Evaluate(Inputs inputs, ShearRate rate, HematocritBasis basis)
    {
        var record = InventedBlood.Record("S-1", inputs.Hematocrit, inputs.Plasma) with { PlasmaTemperature = new(36.9 + inputs.AllKelvins) };
        Recording[] blood =
        [
            InventedBlood.Casson("S-1", 1, 0.41, 1.00, inputs.BloodPascals, 37.1 + inputs.AllKelvins),
            InventedBlood.Casson("S-1", 2, 0.41, 1.02, inputs.BloodPascals, 37.1 + inputs.AllKelvins),
        ];
        var readings = TestStudy.Readings(inputs.Study, InventedBlood.Checks(inputs.CheckPascals, inputs.AllKelvins), blood, [record]);
        return inputs.Study.Evaluate(readings).Samples[0].Find("Casson", Measurand.Viscosity(rate), basis)!.Value;
    }

    private sealed record Inputs(Study Study, double AllKelvins, double BloodPascals, double CheckPascals, double Hematocrit, double Plasma);
}
