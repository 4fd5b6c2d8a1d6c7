namespace HemoRheo.Tests.Samples;

public sealed class SampleValueTests
{
    private static readonly Study Study = TestStudy.With(TestStudy.Rheometer with { TorqueFloor = 1e-10, CheckEvery = TimeSpan.FromDays(30), CheckLimit = 0.2 }) with
    {
        Screening = TestStudy.Plain.Screening with { LongestSinceDraw = TimeSpan.FromHours(8) },
    };

    private static readonly Measurand At10 = Measurand.Viscosity(10.PerSecond());

    [Fact]
    public void A_bias_that_is_not_corrected_is_a_contribution_of_its_own()
    {
        var corrected = Native(Study, Pair());
        var left = Native(Study with { Analysis = Study.Analysis with { CorrectBias = false } }, Pair());
        var bias = left.Value.Part(SourceKind.Bias)!.Value;
        Assert.Null(corrected.Value.Part(SourceKind.Bias));
        Assert.Equal(corrected.Value.X - left.Value.X, bias, 1e-12);
        Assert.InRange(bias, -0.023, -0.018);
        Assert.True(left.Value.StandardUncertainty > corrected.Value.StandardUncertainty);
    }

    [Fact]
    public void Without_replicates_and_declaration_a_value_is_shown_and_not_decided_on()
    {
        var value = Native(Study, [InventedBlood.Casson("S-1", 1, 0.41)]);
        Assert.False(value.Decidable);
        Assert.Contains(value.Findings, finding => finding.Code == "loading-scatter-unknown");
        var declared = Native(Study with { Errors = Study.Errors with { DeclaredLoading = 0.02 } }, [InventedBlood.Casson("S-1", 1, 0.41)]);
        Assert.True(declared.Decidable);
        Assert.Equal(0.02, declared.Value.Part(SourceKind.Loading)!.Value, 1e-12);
    }

    [Fact]
    public void A_rate_outside_the_kept_rates_is_extrapolated_and_not_decided_on()
    {
        var study = Study with { Analysis = Study.Analysis with { StandardRates = [new(0.5), new(10), new(1000)] } };
        var sample = Evaluate(study, Pair()).Samples[0];
        foreach (var rate in new[] { 0.5, 1000 })
        {
            var value = sample.Find("Casson", Measurand.Viscosity(rate.PerSecond()), HematocritBasis.Native)!;
            Assert.False(value.Decidable);
            Assert.Null(value.Interpolated);
            Assert.Contains(value.Findings, finding => finding.Code == "extrapolated");
        }

        Assert.True(sample.Find("Casson", At10, HematocritBasis.Native)!.Decidable);
    }

    [Fact]
    public void The_value_between_readings_stands_beside_the_fitted_one()
    {
        var value = Native(Study, Pair());
        Assert.Equal(value.Value.X, value.Interpolated!.Value, 0.02);
    }

    [Fact]
    public void A_cut_recording_is_left_out_where_another_loading_is_whole_and_never_decided_on_alone()
    {
        var fault = new FindingKind("cut", Severity.Fault, "Cut.", "Cut.", "Cut.").At(Where.Nowhere, "Cut.");
        var cut = InventedBlood.Casson("S-1", 2, 0.41, 1.5) with { Findings = [fault] };
        Recording[] others = [InventedBlood.Casson("S-2", 1, 0.44), InventedBlood.Casson("S-2", 2, 0.44, 1.02)];
        var beside = Native(Study, [InventedBlood.Casson("S-1", 1, 0.41), cut, .. others]);
        var whole = Native(Study, [InventedBlood.Casson("S-1", 1, 0.41), .. others]);
        Assert.Equal(whole.Value.X, beside.Value.X);
        Assert.True(beside.Decidable);
        Assert.Contains(beside.Findings, finding => finding.Code == "loading-left-out" && finding.Where.Loading == 2);

        var alone = Native(Study, [cut, .. others]);
        Assert.False(alone.Decidable);
        Assert.Contains(alone.Findings, finding => finding.Code == "loading-faulty");
    }

    [Fact]
    public void A_sample_without_hematocrit_has_native_values_only_and_says_so()
    {
        var sample = Evaluate(Study, Pair(), InventedBlood.Record("S-1", 0.41) with { Hematocrit = null }).Samples[0];
        Assert.Contains(sample.Findings, finding => finding.Code == "no-hematocrit");
        Assert.All(sample.Values, value => Assert.Equal(HematocritBasis.Native, value.Basis));
        Assert.NotEmpty(sample.Values);
    }

    [Fact]
    public void Plasma_measured_on_another_device_gets_no_correction_from_the_rheometer()
    {
        var own = Evaluate(Study, Pair(), InventedBlood.Record("S-1", 0.41)).Samples[0];
        var other = Evaluate(Study, Pair(), InventedBlood.Record("S-1", 0.41, plasmaInstrument: "capillary")).Samples[0];
        var measurand = Measurand.RelativeViscosity(10.PerSecond());
        var (a, b) = (own.Find("Casson", measurand, HematocritBasis.Native)!.Value, other.Find("Casson", measurand, HematocritBasis.Native)!.Value);

        // On one instrument the calibration cancels in the ratio; on two it stays.
        Assert.Equal(0, a.Part(SourceKind.Calibration)!.Value, 1e-15);
        Assert.Equal(0, a.Part(SourceKind.Certificate)!.Value, 1e-15);
        Assert.Equal(0.002, b.Part(SourceKind.Certificate)!.Value, 1e-12);
        Assert.NotEqual(a.X, b.X);
    }

    [Fact]
    public void A_hematocrit_outside_the_power_rule_is_shown_and_not_decided_on()
    {
        var value = Evaluate(Study, Pair(), InventedBlood.Record("S-1", 0.25)).Samples[0].Find("Casson", At10, HematocritBasis.StandardByPlasma)!;
        Assert.False(value.Decidable);
        Assert.Contains(value.Findings, finding => finding.Code == "outside-power-rule");
    }

    [Fact]
    public void Blood_measured_before_the_first_check_is_not_calibrated()
    {
        var early = InventedBlood.CheckTime.AddDays(-2);
        Recording[] pair = [InventedBlood.Casson("S-1", 1, 0.41, at: early), InventedBlood.Casson("S-1", 2, 0.41, 1.02, at: early)];
        var sample = Evaluate(Study, pair).Samples[0];
        Assert.Equal(InstrumentStatus.Unknown, sample.Status);
        var value = sample.Find("Casson", At10, HematocritBasis.Native)!;
        Assert.False(value.Decidable);
        Assert.Contains(value.Findings, finding => finding.Code == "not-calibrated");
        Assert.Null(value.Value.Part(SourceKind.Calibration));
    }

    [Fact]
    public void A_law_that_the_whole_study_contradicts_is_shown_and_not_decided_on()
    {
        Recording[] blood = [.. Enumerable.Range(1, 20).SelectMany(i => new[] { InventedBlood.Quemada($"S-{i:00}", 1, 0.38 + 0.006 * i), InventedBlood.Quemada($"S-{i:00}", 2, 0.38 + 0.006 * i, 1.02) })];
        var analyzed = Evaluate(TestStudy.Readings(Study, InventedBlood.Checks(), blood, blood.Select(recording => recording.Sample).Distinct().Select(sample => InventedBlood.Record(sample, 0.44))));
        Assert.False(analyzed.Pool.Laws.First(law => law.Law == "Casson").Fits);
        Assert.True(analyzed.Pool.Laws.First(law => law.Law == "Quemada").Fits);
        Assert.All(analyzed.Samples, sample => Assert.False(sample.Find("Casson", At10, HematocritBasis.Native)!.Decidable));
        Assert.Contains(analyzed.Pool.Findings, finding => finding.Code == "law-does-not-fit");
    }

    [Fact]
    public void A_yield_stress_is_said_to_be_an_extrapolation_and_carries_the_torque_zero()
    {
        var study = Study with { Instruments = [Study.Instruments[0] with { TorqueZero = 5e-8 }], Analysis = Study.Analysis with { Laws = ["Casson"] } };
        var sample = Evaluate(study, Pair()).Samples[0];
        var yieldStress = sample.Find("Casson", Measurand.CassonYieldStress, HematocritBasis.Native)!;
        Assert.Contains(yieldStress.Findings, finding => finding.Code == "yield-stress-extrapolated");
        var atHundred = sample.Find("Casson", Measurand.Viscosity(100.PerSecond()), HematocritBasis.Native)!;
        double OfItsDay(SampleValue value) => value.Value.Parts.Single(part => part.Source == new Source(SourceKind.TorqueZero, "R1/2026-03-03")).Amount;
        Assert.True(OfItsDay(yieldStress) > 20 * Math.Abs(OfItsDay(atHundred)), $"yield stress {OfItsDay(yieldStress):G3}, viscosity at 100 1/s {OfItsDay(atHundred):G3}");
    }

    [Fact]
    public void A_recording_copied_as_a_second_loading_does_not_stop_the_study()
    {
        var copied = InventedBlood.Casson("S-1", 1, 0.41);
        var analyzed = Evaluate(Study, [copied, copied with { Loading = 2 }]);
        Assert.Contains(analyzed.Pool.Findings, finding => finding.Code == "loadings-alike");
        Assert.False(analyzed.Samples[0].Find("Casson", At10, HematocritBasis.Native)!.Decidable);
    }

    [Fact]
    public void A_yield_stress_at_its_bound_is_shown_and_not_decided_on_and_spoils_no_pool()
    {
        Recording[] blood = [Thickening("S-1", 1), Thickening("S-1", 2), InventedBlood.Casson("S-2", 1, 0.44), InventedBlood.Casson("S-2", 2, 0.44, 1.02)];
        var analyzed = Evaluate(TestStudy.Readings(Study, InventedBlood.Checks(), blood, [InventedBlood.Record("S-1", 0.41), InventedBlood.Record("S-2", 0.44)]));
        var yieldStress = analyzed.Samples[0].Find("Casson", Measurand.CassonYieldStress, HematocritBasis.Native)!;
        Assert.Equal(0, yieldStress.Si);
        Assert.False(yieldStress.Decidable);
        Assert.Contains(yieldStress.Findings, finding => finding.Code == "value-at-bound");
        Assert.All(analyzed.Samples.SelectMany(sample => sample.Values).Where(value => value != yieldStress), value => Assert.True(double.IsFinite(value.Value.X) && double.IsFinite(value.Value.StandardUncertainty), value.ToString()));
        Assert.All(analyzed.Pool.Scatter.SelectMany(scatter => scatter.Columns).SelectMany(column => column.Amounts), amount => Assert.True(double.IsFinite(amount)));

        var result = analyzed.Judge(cancel: TestContext.Current.CancellationToken);
        var record = RunRecord.Of(result, analyzed.Study.Summarize(result).By("group"));
        Assert.True(RunRecord.FromJson(record.ToJson()).ComparedWith(record).Identical);
    }

    [Fact]
    public void One_check_without_scatter_says_why_it_gives_no_correction()
    {
        var analyzed = Evaluate(TestStudy.Readings(Study, InventedBlood.Checks()[..1], Pair(), [InventedBlood.Record("S-1", 0.41)]));
        var finding = Assert.Single(analyzed.Samples[0].Find("Casson", At10, HematocritBasis.Native)!.Findings.Select(finding => (finding.Code, finding.Message)).Where(finding => finding.Code == "not-calibrated").Distinct());
        Assert.Equal("Instrument 'R1' has one check a period and no declared scatter; its values cannot be corrected.", finding.Message);
    }

    [Fact]
    public void Plasma_from_an_instrument_that_nothing_vouches_for_is_not_decided_on_and_marks_what_it_enters()
    {
        var early = InventedBlood.Record("S-1", 0.41) with { PlasmaMeasuredAt = InventedBlood.CheckTime.AddDays(-1) };
        var sample = Evaluate(Study, Pair(), early).Samples[0];
        var native = sample.Find("Casson", At10, HematocritBasis.Native)!;
        Assert.True(native.Decidable);
        Assert.Equal(InstrumentStatus.InOrder, sample.StatusOf(native));
        foreach (var value in new[] { sample.Find("Casson", At10, HematocritBasis.StandardByPlasma)!, sample.Find("Casson", Measurand.RelativeViscosity(10.PerSecond()), HematocritBasis.Native)! })
        {
            Assert.False(value.Decidable);
            Assert.Contains(value.Findings, finding => finding.Code == "not-calibrated");
            Assert.Equal(InstrumentStatus.Unknown, sample.StatusOf(value));
        }

        Assert.Contains(sample.Findings, finding => finding.Code == "instrument-not-checked");
    }

    [Fact]
    public void Plasma_from_an_instrument_in_doubt_marks_the_values_it_enters_and_no_others()
    {
        var late = InventedBlood.Record("S-1", 0.41) with { PlasmaMeasuredAt = InventedBlood.CheckTime.AddDays(60) };
        var judged = Evaluate(Study, Pair(), late).Judge(cancel: TestContext.Current.CancellationToken).Samples[0];
        Assert.Equal(InstrumentStatus.InDoubt, judged.Result.PlasmaStatus);
        Assert.All(judged.Values, value => Assert.Equal(value.Value.Basis == HematocritBasis.StandardByPlasma || value.Value.Measurand is RelativeViscosityAtRate, value.Marked));
        Assert.Contains(judged.Result.Findings, finding => finding.Code == "instrument-check-overdue");
    }

    [Fact]
    public void A_yield_stress_that_the_rates_do_not_tell_is_not_decided_on_and_spoils_no_pool()
    {
        var study = Study with { Analysis = Study.Analysis with { Laws = ["Casson"] } };
        Recording[] told = [.. Pair(), InventedBlood.Casson("S-2", 1, 0.44), InventedBlood.Casson("S-2", 2, 0.44, 1.02)];
        Recording[] thin = [InventedBlood.Newtonian("S-3", 1), InventedBlood.Newtonian("S-3", 2, 1.02)];
        LoadingScatter YieldStressPool(IEnumerable<Recording> blood) =>
            Evaluate(TestStudy.Readings(study, InventedBlood.Checks(), blood, [InventedBlood.Record("S-1", 0.41), InventedBlood.Record("S-2", 0.44), InventedBlood.Record("S-3", 0.30)])).Pool.Scatter.Single(scatter => scatter.Measurands[0] == Measurand.CassonYieldStress);
        var pool = YieldStressPool([.. told, .. thin]);
        Assert.Equal(YieldStressPool(told).Columns, pool.Columns);
        Assert.Contains(pool.Findings, finding => finding.Code == "loadings-not-identified");
        var value = Evaluate(TestStudy.Readings(study, InventedBlood.Checks(), [.. told, .. thin], [InventedBlood.Record("S-3", 0.30)])).Samples[2].Find("Casson", Measurand.CassonYieldStress, HematocritBasis.Native);
        Assert.False(value?.Decidable ?? false);
    }

    [Fact]
    public void A_hematocrit_outside_those_of_the_slope_is_not_decided_on()
    {
        var study = Study with { Standard = Study.Standard with { DecideBy = StandardisingRule.StudySlope } };
        var names = Enumerable.Range(1, 30).Select(i => $"S-{i:00}").ToArray();
        double Hematocrit(int i) => i == 0 ? 0.58 : 0.36 + 0.005 * i;
        var early = InventedBlood.CheckTime.AddDays(-1);
        var blood = names.SelectMany((name, i) => new[] { InventedBlood.Casson(name, 1, Hematocrit(i), at: i == 0 ? early : null), InventedBlood.Casson(name, 2, Hematocrit(i), 1.01, at: i == 0 ? early : null) });
        var analyzed = Evaluate(TestStudy.Readings(study, InventedBlood.Checks(), blood, names.Select((name, i) => InventedBlood.Record(name, Hematocrit(i)))));
        var outside = analyzed.Samples[0].Find("Casson", At10, HematocritBasis.StandardBySlope)!;
        Assert.Contains(outside.Findings, finding => finding.Code == "outside-slope");
        var inside = analyzed.Samples[15].Find("Casson", At10, HematocritBasis.StandardBySlope)!;
        Assert.True(inside.Decidable, string.Join("; ", inside.Findings));
        Assert.NotNull(inside.Value.Part(SourceKind.Slope));
    }

    [Fact]
    public void The_order_of_recordings_changes_no_bit_of_any_value()
    {
        Recording[] blood = [.. Pair(), InventedBlood.Casson("S-2", 1, 0.44), InventedBlood.Casson("S-2", 2, 0.44, 0.99), InventedBlood.Casson("S-3", 1, 0.47)];
        SampleRecord[] records = [InventedBlood.Record("S-1", 0.41), InventedBlood.Record("S-2", 0.44), InventedBlood.Record("S-3", 0.47)];
        var forward = Evaluate(TestStudy.Readings(Study, InventedBlood.Checks(), blood, records));
        var backward = Evaluate(TestStudy.Readings(Study, InventedBlood.Checks().Reverse(), blood.GroupBy(recording => recording.Sample).Reverse().SelectMany(sample => sample), records.Reverse()));
        Assert.Equal(forward.Samples.SelectMany(sample => sample.Values.Select(value => value.Value)), backward.Samples.SelectMany(sample => sample.Values.Select(value => value.Value)));
    }

    private static Recording Thickening(string sample, int loading) =>
        TestStudy.Blood(sample, TestStudy.Rates.Select((rate, i) => TestStudy.Reading(i + 1, rate, 0.0035 * Math.Pow(rate, 1.01) * (i % 2 == 0 ? 1.002 : 0.998), 37.1)), loading, InventedBlood.BloodTime);

    private static Recording[] Pair() => [InventedBlood.Casson("S-1", 1, 0.41), InventedBlood.Casson("S-1", 2, 0.41, 1.02)];

    private static SampleValue Native(Study study, IEnumerable<Recording> blood) => Evaluate(study, blood).Samples[0].Find("Casson", At10, HematocritBasis.Native)!;

    private static AnalyzedStudy Evaluate(Study study, IEnumerable<Recording> blood, SampleRecord? record = null) =>
        Evaluate(TestStudy.Readings(study, InventedBlood.Checks(), blood, [record ?? InventedBlood.Record("S-1", 0.41)]));

    private static AnalyzedStudy Evaluate(StudyReadings readings) => readings.Study.Evaluate(readings, cancel: TestContext.Current.CancellationToken);
}
