namespace HemoRheo.Tests.Rheometry;

public class RecordingToCurveTests
{
    [Fact]
    public void A_ramp_without_readings_is_named_in_plain_words()
    {
        var recording = TestStudy.Blood("S1", [TestStudy.Reading(1, 100, 0.4, ramp: Ramp.Up)]);
        var finding = Assert.Single(recording.ToCurve(TestStudy.Plain, Ramp.Down).Findings, finding => finding.Kind == RheometryFindings.NoReadings);
        Assert.Equal("None of 1 readings belongs to the downward ramp, which is analyzed.", finding.Message);
    }

    [Fact]
    public void Speed_and_torque_become_rate_and_stress_of_the_geometry()
    {
        // tests/ReferenceData/rheometry: 10 rad/s and 2.1587688254384e-5 N.m in the ISO 3219 cylinders, a liquid of 4 mPa.s.
        var reading = TestStudy.Reading(1, null, null) with { Speed = 10, Torque = 2.1587688254384e-5 };
        var curve = TestStudy.Blood("S1", [reading]).ToCurve(TestStudy.Plain, Ramp.Down);
        var point = Assert.Single(curve.Points);
        Assert.Equal(123.26690116313, point.Rate.ReciprocalSeconds, 1e-9);
        Assert.Equal(0.49306760465253, point.Stress.Pascals, 1e-12);
        Assert.Equal(0.004, point.ApparentViscosity.PascalSeconds, 1e-14);
        Assert.Equal(reading, point.Reading);
        Assert.Empty(curve.Findings);
    }

    [Fact]
    public void Rate_and_stress_stay_as_exported_and_the_geometry_gives_stress_per_torque()
    {
        var curve = TestStudy.Blood("S1", [TestStudy.Reading(1, 100, 0.45)]).ToCurve(TestStudy.Plain, Ramp.Down);
        Assert.Equal(new(100), curve.Points[0].Rate);
        Assert.Equal(new(0.45), curve.Points[0].Stress);
        Assert.Equal(0.49306760465253 / 2.1587688254384e-5, curve.StressPerTorque!.Value, 1e-7);
    }

    [Fact]
    public void Without_a_named_geometry_rate_and_stress_serve_and_stress_per_torque_is_unknown()
    {
        var recording = TestStudy.Blood("S1", [TestStudy.Reading(1, 100, 0.45)]) with { Geometry = null };
        var curve = recording.ToCurve(TestStudy.Plain, Ramp.Down);
        Assert.Single(curve.Points);
        Assert.Null(curve.StressPerTorque);
        Assert.Empty(curve.Findings);
    }

    [Fact]
    public void Up_and_down_are_kept_apart_and_unstated_belongs_to_the_analyzed_ramp()
    {
        var recording = TestStudy.Blood("S1", [TestStudy.Reading(1, 1, 0.02, ramp: Ramp.Up), TestStudy.Reading(2, 2, 0.02, ramp: Ramp.Down), TestStudy.Reading(3, 3, 0.02, ramp: Ramp.Unstated)]);
        Assert.Equal([2, 3], recording.ToCurve(TestStudy.Plain, Ramp.Down).Points.Select(point => point.Number));
        Assert.Equal([1], recording.ToCurve(TestStudy.Plain, Ramp.Up).Points.Select(point => point.Number));
        var upward = TestStudy.Plain with { Analysis = TestStudy.Plain.Analysis with { Ramp = Ramp.Up } };
        Assert.Equal([1, 3], recording.ToCurve(upward, Ramp.Up).Points.Select(point => point.Number));
    }

    [Theory]
    [InlineData(null, 0.4, "reading-incomplete")]
    [InlineData(100.0, null, "reading-incomplete")]
    [InlineData(0.0, 0.4, "rate-or-stress-not-positive")]
    [InlineData(-1.0, 0.4, "rate-or-stress-not-positive")]
    [InlineData(100.0, 0.0, "rate-or-stress-not-positive")]
    [InlineData(100.0, -0.1, "rate-or-stress-not-positive")]
    [InlineData(double.NaN, 0.4, "rate-or-stress-not-positive")]
    [InlineData(100.0, double.PositiveInfinity, "rate-or-stress-not-positive")]
    public void A_reading_that_gives_no_point_is_set_aside_with_its_line(double? rate, double? stress, string code)
    {
        var curve = TestStudy.Blood("S1", [TestStudy.Reading(1, 200, 0.8), TestStudy.Reading(2, rate, stress)]).ToCurve(TestStudy.Plain, Ramp.Down);
        Assert.Single(curve.Points);
        var aside = Assert.Single(curve.SetAside);
        var finding = Assert.Single(aside.Findings);
        Assert.Equal(code, finding.Code);
        Assert.Equal(Severity.Fault, finding.Severity);
        Assert.Equal(new Where("exports/a.csv", null, 3, null, "S1", 1, 2), finding.Where);
    }

    [Fact]
    public void The_smallest_positive_reading_is_kept() =>
        Assert.Single(TestStudy.Blood("S1", [TestStudy.Reading(1, 1e-9, 1e-9)]).ToCurve(TestStudy.Plain, Ramp.Down).Points);

    [Fact]
    public void Speed_and_torque_without_a_geometry_say_so()
    {
        var recording = TestStudy.Blood("S1", [TestStudy.Turned(1, 100, 0.4)]) with { Geometry = null };
        var aside = Assert.Single(recording.ToCurve(TestStudy.Plain, Ramp.Down).SetAside);
        Assert.Equal("Reading 1 gives speed and torque, but its recording names no geometry.", aside.Findings[0].Message);
    }

    [Fact]
    public void An_undeclared_geometry_is_a_fault_and_keeps_no_point()
    {
        var recording = TestStudy.Blood("S1", [TestStudy.Reading(1, 100, 0.4), TestStudy.Turned(2, 50, 0.3)]) with { Geometry = "plates" };
        var curve = recording.ToCurve(TestStudy.Plain, Ramp.Down);
        Assert.Empty(curve.Points);
        Assert.Equal(2, curve.SetAside.Count);
        var finding = Assert.Single(curve.Findings);
        Assert.Equal(Severity.Fault, finding.Severity);
        Assert.Equal("Geometry 'plates' is not declared; declared: cylinders.", finding.Message);
    }

    [Theory]
    [InlineData(1.2, 0)]
    [InlineData(1.21, 1)]
    public void A_gap_wider_than_the_standard_allows_is_a_finding(double ratio, int findings)
    {
        var study = TestStudy.Plain with { Geometries = [TestStudy.Cylinders with { InnerRadius = 0.01, OuterRadius = 0.01 * ratio }] };
        var curve = TestStudy.Blood("S1", [TestStudy.Reading(1, 100, 0.4)]).ToCurve(study, Ramp.Down);
        Assert.Equal(findings, curve.Findings.Count(finding => finding.Code == "gap-wide"));
        Assert.Single(curve.Points);
    }

    [Fact]
    public void A_recording_without_readings_of_the_analyzed_ramp_is_a_fault_and_of_the_other_ramp_is_not()
    {
        var recording = TestStudy.Blood("S1", [TestStudy.Reading(1, 100, 0.4, ramp: Ramp.Up)]);
        Assert.Equal("ramp-without-readings", Assert.Single(recording.ToCurve(TestStudy.Plain, Ramp.Down).Findings).Code);
        var downOnly = TestStudy.Blood("S1", [TestStudy.Reading(1, 100, 0.4)]);
        Assert.Empty(downOnly.ToCurve(TestStudy.Plain, Ramp.Up).Findings);
    }
}
