namespace HemoRheo.Notebooks.Tests.Reports;

/// <summary>Invented samples: the third too old, the last two from the time of the failed check, the tenth without a record.</summary>
internal static class FakeSamples
{
    public static SampleResult Sample(string name, int place, InstrumentHistory history)
    {
        var late = place == 2;
        var status = place switch { 8 => InstrumentStatus.InDoubt, 9 => InstrumentStatus.Failed, _ => InstrumentStatus.InOrder };
        var standing = new InstrumentStanding(status, status == InstrumentStatus.InOrder ? "Check W2 of 2031-03-10 passed." : "Check W4 of 2031-03-24 failed.", status == InstrumentStatus.InOrder ? history.Periods[0] : null, []);
        var at = FakeStudy.Start.AddDays(status switch { InstrumentStatus.InDoubt => 18, InstrumentStatus.Failed => 23, _ => 8 + place });
        var record = place == 9 ? null : new SampleRecord(name, $"P-{place + 1:000}", 1, at.AddHours(-2), new(0.40 + 0.01 * place), "counter A", new(0.00125), new(37), "R1", at, null, new("samples.csv", Line: place + 2));
        var loadings = Enumerable.Range(1, place % 2 == 0 ? 2 : 1).Select(number => Loading(name, number, at.AddMinutes(20 * number), standing, place)).ToItems();
        Items<Finding> findings = late ? [FakeStudy.Late.At(new(Sample: name), "6.5 h since the draw, the limit is 4 h.", 6.5, 4)] : [FakeStudy.Warm.At(new(Sample: name, Loading: 1), "36.6 °C, asked for 37.0 °C ± 0.3 °C.", 36.6, 0.3)];
        return new(name, record, loadings, FakeValues.Of(name, place, late ? findings : []), status, findings.With(loadings.SelectMany(loading => loading.Findings)));
    }

    private static LoadingResult Loading(string name, int number, DateTimeOffset at, InstrumentStanding standing, int place)
    {
        var file = new Where("exports/r1.csv", Line: 20);
        var blank = new Recording(RecordingKind.Blood, name, number, "R1", "cup", null, at, [], file);
        var curve = FakeCurves.Curve(name, number, blank, 0.004 + 0.0003 * place, number);
        var recording = blank with { Readings = curve.Points.Select(point => point.Reading!).Concat(curve.SetAside.Select(aside => aside.Point.Reading!)).ToItems() };
        return new(recording, curve, null, [FakeCurves.Fit(curve)], standing, curve.SetAside.SelectMany(aside => aside.Findings).ToItems());
    }
}
