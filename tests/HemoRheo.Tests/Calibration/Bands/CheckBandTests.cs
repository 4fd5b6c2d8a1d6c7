using static HemoRheo.Tests.Calibration.InvestigatedInstrument;

namespace HemoRheo.Tests.Calibration.Bands;

/// <summary>
/// Checks by decade of torque. With the oil of 4.8 mPa.s the readings of the tests up to 2.5 1/s lie below 1 uN.m, those up to 30 1/s below 10 uN.m.
/// </summary>
public sealed class CheckBandTests
{
    private static readonly Study Declared = TestStudy.With(TestStudy.Rheometer with { CheckScatter = 0.0043 });

    private static readonly double Oil = TestStudy.Oil.ViscosityAt(Temperature.Body).PascalSeconds;

    [Fact]
    public void Readings_are_parted_by_decade_of_torque_and_each_reading_counts_once()
    {
        var check = Assert.Single(History(Declared, Check(0, 1)).Checks);
        Assert.Equal(["0.1 to 1 uN.m", "1 to 10 uN.m", "10 to 100 uN.m"], check.Bands.Select(band => band.Range));
        Assert.Equal(12, check.Bands.Sum(band => band.Readings));
        Assert.All(check.Bands, band => Assert.Equal(Math.Log(1.01), band.Error.X, 1e-9));
        foreach (var point in check.Fit.Curve.Points)
        {
            var torque = point.Stress.Pascals / TestStudy.Cylinders.StressPerTorque();
            Assert.True(check.BandAt(torque)!.Holds(torque));
        }

        Assert.Null(check.BandAt(1e-3));
    }

    [Fact]
    public void An_instrument_right_at_high_torque_and_wrong_at_low_passes_as_a_whole_and_fails_there()
    {
        var check = Assert.Single(History(Declared, Wrong(below: 3, by: 1.10)).Checks);
        Assert.Equal(CheckOutcome.Passes, check.Outcome);
        Assert.Equal([CheckOutcome.Fails, CheckOutcome.Passes, CheckOutcome.Passes], check.Bands.Select(band => band.Outcome));
        var finding = Assert.Single(check.Findings, finding => finding.Code == "check-fails-at-some-torques");
        Assert.Equal(10, finding.Observed!.Value, 1e-6);
        Assert.Contains("+10.00 % from 0.1 to 1 uN.m", finding.Message, StringComparison.Ordinal);
        Assert.Contains("as a whole it passes", finding.Message, StringComparison.Ordinal);
    }

    [Fact]
    public void The_budget_of_a_band_is_that_of_the_check_with_fit_and_torque_zero_of_its_own_readings()
    {
        // One reading at 5 1/s and one at 100 1/s, one a decade: fit (0.01^2 + (0.0003 / stress)^2)^(1/2), torque zero 1 nN.m over the torque.
        var study = TestStudy.With(TestStudy.Rheometer with { CheckScatter = 0.0043, TorqueZero = 1e-9 });
        var check = Assert.Single(History(study, TestStudy.Check("C", TestStudy.Start, [TestStudy.Reading(1, 100, 100 * Oil), TestStudy.Reading(2, 5, 5 * Oil)])).Checks);
        Assert.Equal(2, check.Bands.Count);
        var (band, stress) = (check.Bands[0], 5 * Oil);
        Assert.Equal(Math.Sqrt(1e-4 + Math.Pow(0.0003 / stress, 2)), band.Error.Part(SourceKind.Fit)!.Value, 1e-9);
        Assert.Equal(1e-9 / (stress / TestStudy.Cylinders.StressPerTorque()), band.Error.Part(SourceKind.TorqueZero)!.Value, 1e-9);
        foreach (var kind in new[] { SourceKind.Certificate, SourceKind.FluidBeta, SourceKind.Thermometer, SourceKind.Day }) Assert.Equal(check.Error.Part(kind), band.Error.Part(kind));
        Assert.Equal(band.Error.X / (2 * band.Error.StandardUncertainty), band.NormalizedError, 1e-9);
        Assert.Equal(1 - band.ProbabilityWithin, band.Acceptance.WrongAcceptance, 1e-12);
        // A band that this coarse leaves nothing to accept; the finer one accepts at the study's level.
        Assert.Equal((null, 0.0), (band.Acceptance.Limits, band.Acceptance.LargestWrongAcceptance));
        Assert.True(check.Bands[1].Acceptance.Accepted);
        Assert.Equal(0.05, check.Bands[1].Acceptance.LargestWrongAcceptance, 1e-9);
    }

    [Fact]
    public void The_resolution_of_the_torque_widens_the_band_of_low_torque()
    {
        // A step of 0.05 uN.m: 0.05 / sqrt(12) uN.m on a single reading of 0.74 uN.m at 3.5 1/s, 1.95 % beside the rest.
        Recording Single() => TestStudy.Check("C", TestStudy.Start, [TestStudy.Reading(1, 100, 100 * Oil), TestStudy.Reading(2, 3.5, 3.5 * Oil)]);
        double Fit(double? step) => History(TestStudy.With(TestStudy.Rheometer with { CheckScatter = 0.0043, TorqueResolution = step }), Single()).Checks[0].Bands[0].Error.Part(SourceKind.Fit)!.Value;
        var torque = 3.5 * Oil / TestStudy.Cylinders.StressPerTorque();
        Assert.Equal(Math.Sqrt(Fit(null) * Fit(null) + Math.Pow(5e-8 / Math.Sqrt(12) / torque, 2)), Fit(5e-8), 1e-9);
    }

    [Fact]
    public void A_band_that_cannot_tell_is_decided_by_as_many_readings_or_fillings_as_it_asks_for()
    {
        // 1.5 % low at low torque; the readings there are few and coarse.
        var check = Assert.Single(History(Declared, Wrong(below: 3, by: 0.985)).Checks);
        var band = check.Bands[0];
        Assert.Equal(CheckOutcome.CannotTell, band.Outcome);
        var need = band.Need!;
        Outcome With(Func<Contribution, double> factor) => Verdict.Of(
            band.Error with { Parts = band.Error.Parts.Select(part => part with { Amount = part.Amount * factor(part) }).ToItems() }, new(Math.Log(0.97), Math.Log(1.03))).Outcome;
        double OfReadings(int more) => Math.Sqrt(band.Readings / (double)(band.Readings + more));
        Assert.Equal(Outcome.Within, With(part => part.Source.Kind == SourceKind.Fit ? OfReadings(need.MoreReadings!.Value) : 1));
        Assert.Equal(Outcome.Undecided, With(part => part.Source.Kind == SourceKind.Fit ? OfReadings(need.MoreReadings!.Value - 1) : 1));
        double OfFillings(int more) => 1 / Math.Sqrt(1 + more);
        Assert.Equal(Outcome.Within, With(part => part.Source.Kind is SourceKind.Fit or SourceKind.Day ? OfFillings(need.MoreFillings!.Value) : 1));
        Assert.Equal(Outcome.Undecided, With(part => part.Source.Kind is SourceKind.Fit or SourceKind.Day ? OfFillings(need.MoreFillings!.Value - 1) : 1));
        Assert.StartsWith($"To tell: {need.MoreReadings} more readings or {need.MoreFillings} more filling", need.ToString(), StringComparison.Ordinal);
    }

    [Fact]
    public void Where_the_certificate_alone_is_too_large_no_number_of_readings_would_do()
    {
        // U = 4 %, k = 2: 1.645 * 2 % is more than the 3 % of the limit.
        var study = Declared with { Fluids = [TestStudy.Oil with { RelativeExpandedUncertainty = 0.04 }] };
        var band = History(study, Check(0, 0)).Checks[0].Bands[^1];
        Assert.Equal(CheckOutcome.CannotTell, band.Outcome);
        Assert.Equal((null, null, SourceKind.Certificate), (band.Need!.MoreReadings, band.Need.MoreFillings, band.Need.Obstacle!.Value));
        Assert.Contains("no number of readings would: the part of the certificate alone is too large", band.Need.ToString(), StringComparison.Ordinal);
        // A certificate as good as it asks for decides.
        var better = Declared with { Fluids = [TestStudy.Oil with { RelativeExpandedUncertainty = band.Need.CertificateUncertainty!.Value }] };
        Assert.Equal(CheckOutcome.Passes, History(better, Check(0, 0)).Checks[0].Bands[^1].Outcome);
    }

    [Fact]
    public void At_the_limit_itself_nothing_would_do()
    {
        var band = History(Declared, Check(0, 3)).Checks[0].Bands[^1];
        Assert.Equal((null, null, null), (band.Need!.MoreReadings, band.Need.MoreFillings, band.Need.CertificateUncertainty));
        Assert.StartsWith("Neither readings nor fillings nor a better fluid would tell", band.Need.ToString(), StringComparison.Ordinal);
    }

    [Fact]
    public void Without_a_geometry_or_torques_there_are_no_bands() =>
        Assert.Empty(History(TestStudy.With(TestStudy.Rheometer with { TorqueFloor = null }), Check(0, 1) with { Geometry = null }).Checks[0].Bands);

    [Fact]
    public void With_errors_up_to_a_scale_all_bands_share_the_scale_of_the_check_and_its_degrees_of_freedom()
    {
        var study = Declared with { Errors = new(0.01, 0.0003, false, null) };
        var check = History(study, TestStudy.Check("C", TestStudy.Start, TestStudy.Rates.Select((rate, i) => TestStudy.Reading(i + 1, rate, rate * Oil * (i % 2 == 0 ? 1.01 : 0.99))))).Checks[0];
        Assert.Equal(3, check.Bands.Count);
        Assert.All(check.Bands, band => Assert.Equal(("fit of C/1", 11.0), band.Error.Parts.Where(part => part.Source.Kind == SourceKind.Fit).Select(part => (part.Estimate, part.DegreesOfFreedom)).Single()));
    }

    /// <summary>1,500 checks with every error of the budget drawn anew, of an instrument that is 3 % wrong below 1 uN.m only.</summary>
    [Fact]
    public void A_band_at_its_limit_is_passed_and_failed_in_about_5_percent_each_and_one_without_an_error_never_fails()
    {
        const int count = 1500;
        var random = new Random(31);
        double Normal() => Math.Sqrt(-2 * Math.Log(1 - random.NextDouble())) * Math.Cos(2 * Math.PI * random.NextDouble());
        // Ten readings at low torque, so that it can tell at all.
        double[] rates = [300, 200, 100, 3, 3, 3, 3, 3, 3, 3, 3, 3, 3];
        var bands = Enumerable.Range(0, count).Select(_ =>
        {
            var viscosity = 0.00625 * Math.Exp(0.002 * Normal() - (0.022 + 0.0003 * Normal()) * (12 + 0.1 * Normal()) + 0.003 * Normal());
            var readings = rates.Select((rate, i) => TestStudy.Reading(i + 1, rate, rate * viscosity * (rate < 10 ? 1.03 : 1) * (1 + 0.01 * Normal()) + 0.0003 * Normal()));
            return History(Declared, TestStudy.Check("C", TestStudy.Start, readings)).Checks[0].Bands;
        }).ToArray();
        double Share(int band, CheckOutcome outcome) => bands.Count(all => all[band].Outcome == outcome) / (double)count;
        // The share of scatter beyond the fit is that of the whole check, so a band's own is known; three standard errors of 5 %.
        var most = 3 * Math.Sqrt(0.05 * 0.95 / count);
        Assert.InRange(Share(0, CheckOutcome.Passes), 0.05 - most, 0.05 + most);
        Assert.InRange(Share(0, CheckOutcome.Fails), 0.05 - most, 0.05 + most);
        Assert.Equal(0, Share(1, CheckOutcome.Fails));
        Assert.InRange(Share(1, CheckOutcome.Passes), 0.97, 1);
    }

    /// <summary>Readings of the oil, below so many 1/s by a factor wrong.</summary>
    private static Recording Wrong(double below, double by) =>
        TestStudy.Check("C", TestStudy.Start, TestStudy.Rates.Select((rate, i) => TestStudy.Reading(i + 1, rate, rate * Oil * (rate < below ? by : 1))));
}
