namespace HemoRheo.Notebooks.Tests.Reports;

/// <summary>Invented curves near a Casson law, with a deterministic ripple, and fits of them.</summary>
internal static class FakeCurves
{
    private static readonly double[] Rates = [200, 120, 80, 50, 30, 20, 12, 8, 5, 3, 2, 1.2, 0.8];

    public static FlowCurve Curve(string sample, int loading, Recording? recording, double yield, int ripple)
    {
        var points = Rates.Select((rate, i) => Point(i + 1, rate, yield, ripple, recording)).ToArray();
        var aside = recording is null ? [] : points.TakeLast(2).Select(point => new SetAside(point, [FakeStudy.LowTorque.At(new(recording.Where.File, Line: 20 + point.Number, Sample: sample, Loading: loading, Point: point.Number), "Torque 0.15 µN·m, the floor is 0.20 µN·m.", 0.15, 0.2)])).ToArray();
        return new(new(sample, loading, Ramp.Down, recording), points.SkipLast(aside.Length).ToItems(), aside.ToItems(), 24000, []);
    }

    public static FittedLaw Fit(FlowCurve curve) => curve.Fit(FlowLaw.Casson, ErrorModel.Known(0.02, new(0.0005)));

    private static FlowPoint Point(int number, double rate, double yield, int ripple, Recording? recording)
    {
        var root = Math.Sqrt(yield) + Math.Sqrt(0.0036 * rate);
        var stress = root * root * (1 + 0.015 * Math.Sin(2.3 * number + ripple));
        var reading = recording is null ? null : new Reading(number, Ramp.Down, null, null, null, rate, rate, stress, 37.02, 5.0 * number, new(recording.Where.File, Line: 20 + number, Sample: recording.Sample, Loading: recording.Loading, Point: number));
        return new(number, new(rate), new(stress), Ramp.Down, reading);
    }
}
