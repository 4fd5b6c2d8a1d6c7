namespace HemoRheo.Tests.Screening;

/// <summary>For every rule one case that trips it and one that just does not. Limits: floor 0.02 uN.m, 37 degC within 0.5 K, speed 2 %, 4 h, duplicates 1 %.</summary>
public class ScreeningRuleTests
{
    private static readonly SampleRecord Sample = TestStudy.Sample("S1");

    [Fact]
    public void A_clean_curve_is_left_as_it_is()
    {
        var curve = Curve([.. TestStudy.Rates.Select((rate, i) => TestStudy.Turned(i + 1, rate, 0.005 * rate))]);
        var screened = curve.Screened(TestStudy.Plain, Sample);
        Assert.Equal(curve, screened);
        Assert.Equal(12, screened.Points.Count);
    }

    [Theory]
    [InlineData(1.9999e-8, true)]
    [InlineData(2e-8, false)]
    public void Torque_below_the_floor(double torque, bool trips) =>
        Trips("torque-below-floor", trips, TestStudy.Turned(1, 1, 1) with { Torque = torque });

    [Theory]
    [InlineData(1.9999e-8, true)]
    [InlineData(2.0001e-8, false)]
    public void Torque_below_the_floor_is_found_from_stress_and_geometry_too(double torque, bool trips) =>
        Trips("torque-below-floor", trips, TestStudy.Reading(1, 1, torque * TestStudy.Cylinders.StressPerTorque()));

    [Theory]
    [InlineData("0", "420.5", null)]
    [InlineData("10", "0", 5)]
    public void A_reading_that_is_not_above_zero_is_told_at_its_line_and_at_no_column_of_another_field(string rate, string stress, int? column)
    {
        using var folder = StudyFolder.Valid().AddSample("S-1", "P-1");
        folder.Write("exports/b.txt", StudyFolder.Block("S-1", [("100", "420.5"), (rate, stress)]));
        var study = Study.Open(folder.StudyFile);
        var curve = study.ReadExports().Blood[0].ToCurve(study, Ramp.Down).Screened(study, null);
        var finding = Assert.Single(Assert.Single(curve.SetAside).Findings, finding => finding.Kind == RheometryFindings.NotPositive);
        Assert.Equal(("exports/b.txt", 8, column), (finding.Where.File, finding.Where.Line, finding.Where.Column));
    }

    [Fact]
    public void A_temperature_that_is_off_is_told_at_no_column_of_another_field()
    {
        using var folder = StudyFolder.Valid().AddSample("S-1", "P-1");
        folder.Write("exports/a.csv", StudyFolder.RowsHeader + StudyFolder.Row("S-1", "120", "7,5") + StudyFolder.Row("S-1", "60", "4,25", temperature: "39,0"));
        var study = Study.Open(folder.StudyFile);
        var curve = study.ReadExports().Blood[0].ToCurve(study, Ramp.Down).Screened(study, null);
        var where = Assert.Single(Assert.Single(curve.SetAside).Findings).Where;
        Assert.Equal(("exports/a.csv", 3, null), (where.File, where.Line, where.Column));
    }

    [Fact]
    public void An_undeclared_torque_floor_is_a_note_on_the_curve()
    {
        var study = TestStudy.With(TestStudy.Rheometer with { TorqueFloor = null });
        var screened = Curve(TestStudy.Reading(1, 1, 1e-9)).Screened(study, Sample);
        var finding = Assert.Single(screened.Findings);
        Assert.Equal(("torque-floor-not-declared", Severity.Note), (finding.Code, finding.Severity));
        Assert.Equal("No torque floor declared for instrument 'R1'.", finding.Message);
        Assert.Single(screened.Points);
    }

    [Fact]
    public void A_torque_that_is_not_known_is_a_warning_on_the_curve()
    {
        var curve = (TestStudy.Blood("S1", [TestStudy.Reading(1, 1, 0.1)]) with { Geometry = null }).ToCurve(TestStudy.Plain, Ramp.Down);
        Assert.Equal(["torque-not-known"], curve.Screened(TestStudy.Plain, Sample).Findings.Select(finding => finding.Code));
    }

    [Theory]
    [InlineData(37.5, false)]
    [InlineData(36.5, false)]
    [InlineData(37.51, true)]
    [InlineData(36.49, true)]
    public void Temperature_off(double temperature, bool trips)
    {
        var screened = Trips("temperature-off", trips, TestStudy.Reading(1, 1, 1, temperature));
        Assert.Equal(trips, screened.Findings.Any(finding => finding.Code == "temperature-excursion"));
    }

    [Theory]
    [InlineData(37.1, 37.0)]
    [InlineData(36.9, 37.0)]
    [InlineData(25.1, 25.0)]
    public void A_temperature_written_at_the_tolerance_is_not_beyond_it(double temperature, double asked)
    {
        var study = TestStudy.Plain with { Screening = TestStudy.Plain.Screening with { Temperature = new(asked), TemperatureTolerance = 0.1 } };
        Assert.Single(Curve(TestStudy.Reading(1, 1, 1, temperature)).Screened(study, Sample).Points);
    }

    [Fact]
    public void A_temperature_excursion_says_how_many_and_how_far()
    {
        var screened = Curve(TestStudy.Reading(1, 3, 1), TestStudy.Reading(2, 2, 1, 35.2), TestStudy.Reading(3, 1, 1, 37.9)).Screened(TestStudy.Plain, Sample);
        Assert.Equal("2 of 3 readings were beyond 0.5 K of 37 degC, at most -1.80 K away.", Assert.Single(screened.Findings).Message);
        Assert.Equal([1], screened.Points.Select(point => point.Number));
    }

    [Fact]
    public void A_temperature_that_is_not_stated_is_a_warning_and_sets_nothing_aside()
    {
        var screened = Curve(TestStudy.Reading(1, 3, 1, null), TestStudy.Reading(2, 2, 1)).Screened(TestStudy.Plain, Sample);
        Assert.Equal("1 of 2 readings state no temperature.", Assert.Single(screened.Findings).Message);
        Assert.Equal(2, screened.Points.Count);
    }

    [Theory]
    [InlineData(9.81, false)]
    [InlineData(10.19, false)]
    [InlineData(9.79, true)]
    [InlineData(10.21, true)]
    public void Speed_not_reached(double speed, bool trips) =>
        Trips("speed-not-reached", trips, TestStudy.Turned(1, 1, 1) with { Speed = speed, SetSpeed = 10 });

    [Theory]
    [InlineData(98.1, false)]
    [InlineData(97.9, true)]
    public void Shear_rate_not_reached(double rate, bool trips) =>
        Trips("speed-not-reached", trips, TestStudy.Reading(1, rate, 1) with { SetRate = 100 });

    [Theory]
    [InlineData(240, null)]
    [InlineData(241, "too-long-since-draw")]
    [InlineData(0, null)]
    [InlineData(-1, "measured-before-draw")]
    public void Too_long_since_the_draw(int minutes, string? code)
    {
        var screened = Curve(TestStudy.Reading(1, 1, 1)).Screened(TestStudy.Plain, Sample with { DrawnAt = TestStudy.Start.AddMinutes(-minutes) });
        Assert.Equal(code, screened.Findings.SingleOrDefault()?.Code);
        Assert.True(code is null || screened.Findings[0].Severity == Severity.Fault);
        Assert.Single(screened.Points);
    }

    [Fact]
    public void Too_long_since_the_draw_says_how_long() => Assert.Equal(
        "Measured 4 h 01 min after the draw; at most 4 h 00 min is allowed.",
        Curve(TestStudy.Reading(1, 1, 1)).Screened(TestStudy.Plain, Sample with { DrawnAt = TestStudy.Start.AddMinutes(-241) }).Findings[0].Message);

    [Fact]
    public void Times_of_other_offsets_are_the_same_moments()
    {
        var drawn = TestStudy.Start.AddMinutes(-239).ToOffset(TimeSpan.FromHours(-5));
        Assert.Empty(Curve(TestStudy.Reading(1, 1, 1)).Screened(TestStudy.Plain, Sample with { DrawnAt = drawn }).Findings);
    }

    [Fact]
    public void An_unknown_time_of_draw_is_a_warning_and_a_check_is_not_asked_for_one()
    {
        var curve = Curve(TestStudy.Reading(1, 1, 1));
        Assert.Equal(["time-since-draw-unknown"], curve.Screened(TestStudy.Plain, Sample with { DrawnAt = null }).Findings.Select(finding => finding.Code));
        Assert.Equal(["time-since-draw-unknown"], curve.Screened(TestStudy.Plain, null).Findings.Select(finding => finding.Code));
        Assert.Empty(TestStudy.Check("C1", TestStudy.Start, 0.005).ToCurve(TestStudy.Plain, Ramp.Down).Screened(TestStudy.Plain, null).Findings);
    }

    [Theory]
    [InlineData(100.9, true)]
    [InlineData(99.1, true)]
    [InlineData(101, false)]
    [InlineData(99, false)]
    public void Duplicate_reading(double rate, bool trips) =>
        Trips("duplicate-reading", trips, TestStudy.Reading(2, rate, 1), TestStudy.Reading(1, 100, 1));

    [Fact]
    public void A_reading_repeated_because_the_first_was_cold_is_not_a_duplicate()
    {
        var screened = Curve(TestStudy.Reading(1, 100, 1, 36), TestStudy.Reading(2, 100, 1), TestStudy.Reading(3, 100, 1)).Screened(TestStudy.Plain, Sample);
        Assert.Equal([2], screened.Points.Select(point => point.Number));
        Assert.Equal(["temperature-off", "duplicate-reading"], screened.SetAside.Select(aside => aside.Findings[0].Code));
    }

    [Theory]
    [InlineData(9.9, true)]
    [InlineData(10, false)]
    public void Out_of_time_order(double elapsed, bool trips) =>
        Trips("out-of-time-order", trips, TestStudy.Reading(2, 50, 1, elapsed: elapsed), TestStudy.Reading(1, 100, 1, elapsed: 10));

    [Theory]
    [InlineData(0, true)]
    [InlineData(-1, true)]
    [InlineData(double.NaN, true)]
    [InlineData(1e-12, false)]
    public void Rate_or_stress_not_above_zero_in_a_curve_made_from_numbers(double stress, bool trips)
    {
        var screened = FlowCurve.Of([100, 10], [1, stress]).Screened(TestStudy.Plain, null);
        Assert.Equal(trips ? 1 : 0, screened.SetAside.Count);
        Assert.Equal(trips ? 1 : 2, screened.Points.Count);
    }

    /// <summary>Blood of 5 mPa.s and 10 mPa of yield stress, in wrong units: a factor of 1000 either way.</summary>
    [Theory]
    [InlineData(1, null)]
    [InlineData(0.12, null)]
    [InlineData(1000, "above 50 mPa.s")]
    [InlineData(0.001, "below 0.5 mPa.s")]
    public void Viscosities_that_blood_cannot_show_are_a_warning_and_nothing_is_rescaled(double factor, string? words)
    {
        var curve = FlowCurve.Of(TestStudy.Rates, [.. TestStudy.Rates.Select(rate => factor * (0.01 + 0.005 * rate))]);
        var screened = curve.Screened(TestStudy.Plain, null);
        var found = screened.Findings.Where(finding => finding.Code == "implausible-viscosity").ToArray();
        Assert.Equal(words is null ? 0 : 1, found.Length);
        Assert.All(found, finding => Assert.Contains(words!, finding.Message, StringComparison.Ordinal));
        Assert.All(found, finding => Assert.Equal(Severity.Warning, finding.Severity));
        Assert.Equal(curve.Points, screened.Points);
    }

    [Fact]
    public void One_point_that_is_off_is_no_mistake_of_units() =>
        Assert.DoesNotContain(FlowCurve.Of([100, 50, 10], [0.5, 250, 0.06]).Screened(TestStudy.Plain, null).Findings, finding => finding.Code == "implausible-viscosity");

    [Fact]
    public void A_point_with_two_faults_is_set_aside_once_with_both()
    {
        var screened = Curve(TestStudy.Turned(1, 1, 1, 30) with { Torque = 1e-9 }).Screened(TestStudy.Plain, Sample);
        Assert.Equal(["torque-below-floor", "temperature-off"], Assert.Single(screened.SetAside).Findings.Select(finding => finding.Code));
    }

    [Fact]
    public void Every_kind_says_cause_cure_and_source_and_has_a_code_of_its_own()
    {
        var kinds = ScreeningRules.All.SelectMany(rule => rule.Kinds).ToArray();
        Assert.Equal(kinds.Length, kinds.Select(kind => kind.Code).Distinct().Count());
        Assert.All(kinds, kind =>
        {
            Assert.Matches("^[a-z]+(-[a-z]+)*$", kind.Code);
            Assert.All([kind.Meaning, kind.UsualCause, kind.WhatToDo, kind.Source], text => Assert.NotEmpty(text));
        });
    }

    private static FlowCurve Curve(params Reading[] readings) => TestStudy.Blood("S1", readings).ToCurve(TestStudy.Plain, Ramp.Down);

    private static FlowCurve Trips(string code, bool trips, Reading judged, params Reading[] before)
    {
        var screened = Curve([.. before, judged]).Screened(TestStudy.Plain, Sample);
        var aside = screened.SetAside.SingleOrDefault(aside => aside.Point.Number == judged.Number);
        Assert.Equal(trips, aside is not null);
        Assert.Equal(trips ? [code] : [], aside?.Findings.Select(finding => finding.Code) ?? []);
        Assert.Equal(!trips, screened.Points.Any(point => point.Number == judged.Number));
        return screened;
    }
}
