using static HemoRheo.Tests.Calibration.Blanks.EmptyGap;

namespace HemoRheo.Tests.Calibration.Blanks;

/// <summary>A blank run's zero and noise in fits and budgets.</summary>
public sealed class BlankInBudgetTests
{
    private static readonly double Noise = 0.0003 / PerTorque;
    private static readonly Study Study = TestStudy.With(TestStudy.Rheometer with { TorqueFloor = 1e-12 }) with { Errors = new(0.01, 0.0003, true, null) };
    private static readonly Study Corrects = Study with { Instruments = [Study.Instruments[0] with { CorrectTorqueZero = true }] };

    [Fact]
    public void A_corrected_zero_leaves_no_trace_in_the_value()
    {
        var clean = Yield(Study, 0, []);
        var corrected = Yield(Corrects, 4e-8, [Run("B", TestStudy.Start, About(4e-8, 1e-9))]);
        Assert.Equal(clean.X, corrected.X, 1e-9);
        Assert.NotEqual(clean.X, Yield(Study, 4e-8, []).X, 1e-2);
    }

    [Fact]
    public void Its_part_is_the_change_when_the_zero_is_raised_by_its_standard_uncertainty()
    {
        const double step = 1e-3;
        var blank = Run("B", TestStudy.Start, About(0, Noise));
        var value = Yield(Corrects, 0, [blank]);
        var part = value.Parts.Single(part => part.Source == new Source(SourceKind.TorqueZero, "R1/2026-03-02"));
        var u = Read(Corrects, blank).ZeroUncertainty;
        Assert.Equal((Yield(Corrects, step * u, [blank]).X - value.X) / step, part.Amount, 2e-3 * part.Amount);
        Assert.Equal(11, part.DegreesOfFreedom, 1e-9);
    }

    [Fact]
    public void A_zero_that_is_not_corrected_enters_with_its_size()
    {
        var (u, zero) = (Noise * Math.Sqrt(12.0 / 11 / 12), 2e-8);
        var corrected = Part(Yield(Corrects, 0, [Run("B", TestStudy.Start, About(0, Noise))]));
        var blank = Run("B", TestStudy.Start, About(zero, Noise));
        Assert.Equal(corrected * Math.Sqrt(zero * zero + u * u) / u, Part(Yield(Study, 0, [blank])), 1e-6);
    }

    [Fact]
    public void Checks_of_the_day_carry_the_same_source()
    {
        var check = TestStudy.Check("C", TestStudy.Start.AddHours(1), TestStudy.Rates.Select((rate, i) => TestStudy.Turned(i + 1, rate, 0.0048 * rate)));
        var history = Assert.Single(Study.CheckInstruments(TestStudy.Readings(Study, [check]) with { Blanks = [Run("B", TestStudy.Start, About(1e-8, 1e-9))] }));
        Assert.Contains(Assert.Single(history.Checks).Error.Parts, part => part.Source == new Source(SourceKind.TorqueZero, "R1/2026-03-02") && part.Amount > 0);
    }

    [Fact]
    public void The_noise_of_the_run_is_the_floor_of_the_errors_where_it_is_larger()
    {
        double Floor(double noise) => Loading(Study, 0, [Run("B", TestStudy.Start, About(0, noise))]).Fits[0].Errors.Floor.Pascals;
        Assert.Equal(0.0003, Floor(Noise / 2));
        Assert.Equal(0.0006 * Math.Sqrt(12.0 / 11), Floor(2 * Noise), 1e-12);
    }

    [Fact]
    public void Readings_that_an_empty_gap_could_give_are_set_aside()
    {
        // Noise 0.9 mPa: floor 3 sqrt(1 + 1/12) 0.94 mPa = 2.9 mPa above zero; a zero of 6 mPa, not corrected, raises it to 18 mPa. The lowest readings are 14.1, 17.9 and 26.1 mPa.
        Assert.Empty(Loading(Study, 0, [Run("B", TestStudy.Start, About(0, 3 * Noise))]).Curve.SetAside);
        var aside = Loading(Study, 0, [Run("B", TestStudy.Start, About(20 * Noise, 3 * Noise))]).Curve.SetAside;
        Assert.All(aside, one => Assert.Contains("by blank run 'B'", Assert.Single(one.Findings, finding => finding.Code == "torque-below-floor").Message, StringComparison.Ordinal));
        Assert.Equal([11, 12], aside.Select(one => one.Point.Number).Order());
    }

    [Theory]
    [InlineData(true)]
    [InlineData(false)]
    public void The_yield_stress_of_simulated_days_lies_in_its_interval(bool corrects)
    {
        // Each day a zero of its own (1 mPa), a blank run of three readings, and one curve; 95 % of 1000 intervals, within three standard deviations of that count; a zero that is not corrected enters with its size, so never less.
        const int days = 1000;
        var study = corrects ? Corrects : Study;
        var (curves, errors) = (new List<FlowCurve>(), new List<ErrorModel>());
        for (var k = 0; k < days; k++)
        {
            var stream = RandomStream.Of(20261201, "days with blank runs", k);
            var zero = 0.001 / PerTorque * stream.Normal();
            var history = History(study, Run("B", TestStudy.Start, [.. Enumerable.Range(0, 3).Select(_ => zero + Noise * stream.Normal())]));
            var readings = TestStudy.Rates.Select((rate, i) => TestStudy.Turned(i + 1, rate, Casson(rate) * (1 + 0.01 * stream.Normal()) + zero * PerTorque + 0.0003 * stream.Normal()));
            var curve = TestStudy.Blood("S", readings).ToCurve(study, Ramp.Down, history.TorqueAt(TestStudy.Start));
            curves.Add(curve);
            errors.Add(ReadingErrorModel.Of(study, curve));
        }

        var fits = Fits.InParallel(curves, FlowLaw.Casson, errors, threads: 1, TestContext.Current.CancellationToken);
        var values = fits.Select(fit => LoadingValue.Of(study, new(fit.Curve.Label.Recording!, fit.Curve, null, [fit], new(InstrumentStatus.Unknown, "", null, []), []), fit, Measurand.CassonYieldStress.From(fit)!)).ToArray();
        var covered = values.Count(value => value.Interval().Contains(Math.Log(0.005)));
        Assert.InRange(covered, 930, corrects ? 975 : 1000);
        if (corrects) Assert.InRange(values.Count(value => value.Only(source => source.Kind != SourceKind.TorqueZero).Interval().Contains(Math.Log(0.005))), 0, 925);
    }

    private static double Casson(double rate) => FlowLaw.Casson.Stress(rate.PerSecond(), 0.005, 0.0033).Pascals;

    private static double Part(Value value) => value.Part(SourceKind.TorqueZero)!.Value;

    private static Value Yield(Study study, double zero, Items<Recording> blanks)
    {
        var loading = Loading(study, zero, blanks);
        var fit = loading.Fits.Single(fit => fit.Law == FlowLaw.Casson);
        return LoadingValue.Of(study, loading, fit, Measurand.CassonYieldStress.From(fit)!);
    }

    private static LoadingResult Loading(Study study, double zero, Items<Recording> blanks)
    {
        var readings = TestStudy.Rates.Select((rate, i) => TestStudy.Turned(i + 1, rate, Casson(rate) + zero * PerTorque));
        var read = TestStudy.Readings(study, null, [TestStudy.Blood("S-1", readings, at: TestStudy.Start.AddHours(3))], [TestStudy.Sample("S-1", TestStudy.Start)]) with { Blanks = blanks };
        return study.Evaluate(read, cancel: TestContext.Current.CancellationToken).Samples[0].Loadings[0];
    }
}
