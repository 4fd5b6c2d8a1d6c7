using CsCheck;

namespace HemoRheo.Tests.Screening;

public class ScreeningPropertyTests
{
    private static readonly Gen<double?> Odd = Gen.Double[-1, 400].Select(Gen.Int[0, 9], (number, dice) => dice switch
    {
        0 => (double?)null,
        1 => 0,
        2 => double.NaN,
        3 => 100,
        _ => number,
    });

    private static readonly Gen<Reading[]> Readings = Gen.Select(Odd, Odd, Odd, Odd, Gen.Double[35, 39], Gen.Double[0, 300], Gen.Int[0, 3])
        .Select(t => (Rate: t.Item1, Stress: t.Item2, Speed: t.Item3, Torque: t.Item4, Temperature: t.Item5, Elapsed: t.Item6, Ramp: t.Item7))
        .Array[0, 20]
        .Select(rows => rows.Select((row, i) => new Reading(
            i + 1, row.Ramp == 0 ? Ramp.Up : row.Ramp == 1 ? Ramp.Unstated : Ramp.Down, row.Speed, 100, row.Torque * 1e-7, row.Rate, null, row.Stress, row.Temperature, row.Elapsed, new("exports/a.csv", Line: i + 2))).ToArray());

    [Fact]
    public void Kept_and_set_aside_together_are_all_readings_of_the_ramps() => Readings.Sample(
        readings =>
        {
            var recording = TestStudy.Blood("S1", readings);
            var seen = new[] { Ramp.Down, Ramp.Up }
                .Select(ramp => recording.ToCurve(TestStudy.Plain, ramp).Screened(TestStudy.Plain, TestStudy.Sample("S1")))
                .SelectMany(curve => curve.Points.Concat(curve.SetAside.Select(aside => aside.Point)))
                .Select(point => point.Reading)
                .OrderBy(reading => reading!.Number);
            return seen.SequenceEqual(readings);
        },
        iter: 2000);

    [Fact]
    public void Every_point_set_aside_has_a_fault_and_every_kept_point_is_above_zero() => Readings.Sample(
        readings =>
        {
            var curve = TestStudy.Blood("S1", readings).ToCurve(TestStudy.Plain, Ramp.Down).Screened(TestStudy.Plain, TestStudy.Sample("S1"));
            return curve.SetAside.All(aside => aside.Findings.Count > 0 && aside.Findings.All(finding => finding.Severity == Severity.Fault && finding.Where.Point == aside.Point.Number))
                && curve.Points.All(point => point.Rate.ReciprocalSeconds > 0 && point.Stress.Pascals > 0);
        },
        iter: 2000);

    [Fact]
    public void Screening_a_screened_curve_changes_nothing() => Readings.Sample(
        readings =>
        {
            var once = TestStudy.Blood("S1", readings).ToCurve(TestStudy.Plain, Ramp.Down).Screened(TestStudy.Plain, TestStudy.Sample("S1"));
            return once.Screened(TestStudy.Plain, TestStudy.Sample("S1")).Equals(once);
        },
        iter: 2000);
}
