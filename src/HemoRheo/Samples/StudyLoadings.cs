namespace HemoRheo;

/// <summary>Makes the loadings of a study: curves, screening, fits, standing of the instrument.</summary>
internal static class StudyLoadings
{
    /// <summary>Every loading, in the order of the recordings, with fits that take readings as independent and without findings yet.</summary>
    public static LoadingResult[] Of(
        Study study,
        StudyReadings readings,
        IReadOnlyDictionary<string, SampleRecord> records,
        IReadOnlyDictionary<string, InstrumentHistory> histories,
        IProgress<AnalysisProgress>? progress,
        CancellationToken cancel)
    {
        var ramp = study.Analysis.Ramp;
        var other = ramp == Ramp.Down ? Ramp.Up : Ramp.Down;
        FlowCurve Screened(Recording recording, Ramp which) => recording.ToCurve(study, which, histories.GetValueOrDefault(recording.Instrument)?.TorqueAt(recording.StartedAt)).Screened(study, records.GetValueOrDefault(recording.Sample));
        var curves = readings.Blood.Select(recording => Screened(recording, ramp)).ToArray();
        ErrorModel[] errors = [.. curves.Select(curve => ReadingErrorModel.Of(study, curve))];

        var fits = new List<FittedLaw[]>();
        foreach (var law in study.Analysis.Laws.Select(FlowLaw.Named))
        {
            cancel.ThrowIfCancellationRequested();
            fits.Add(Fits.InParallel(curves, law, errors, threads: -1, cancel));
            progress?.Report(new("fitting", fits.Count * curves.Length, study.Analysis.Laws.Count * curves.Length));
        }

        var courses = histories.Values.ToDictionary(history => history.Instrument.Name, history => history.Course(readings));
        return readings.Blood.Select((recording, i) =>
        {
            var hasOther = recording.Readings.Any(reading => reading.Ramp == other);
            var standing = histories.TryGetValue(recording.Instrument, out var history)
                ? At(history, courses[recording.Instrument], curves[i], recording.StartedAt)
                : new InstrumentStanding(InstrumentStatus.Unknown, $"The study file declares no instrument {recording.Instrument}.", null, []);
            return new LoadingResult(recording, curves[i], hasOther ? Screened(recording, other) : null, fits.Select(all => all[i]).ToItems(), standing, []);
        }).ToArray();
    }

    private static InstrumentStanding At(InstrumentHistory history, InstrumentCourse course, FlowCurve curve, DateTimeOffset moment)
    {
        var standing = history.At(moment);
        return standing with { Findings = standing.Findings.With(TorqueDoubts.Of(course, curve, moment)) };
    }

    /// <summary>The same loadings with fits that know how readings are correlated, and with their findings.</summary>
    public static LoadingResult[] Knowing(Study study, PointCorrelation correlation, IEnumerable<LoadingResult> loadings) => [.. loadings.Select(loading =>
    {
        var fits = correlation.Value == 0 ? loading.Fits : loading.Fits.Select(fit => fit.WithCorrelation(correlation.Value, correlation.StandardError)).ToItems();
        var findings = loading.Recording.Findings
            .Concat(loading.Curve.Findings)
            .Concat(ReadingErrorModel.Findings(study, loading.Curve))
            .Concat(InstrumentTorques.Findings(study, loading.Curve))
            .Concat(loading.Curve.SetAside.SelectMany(aside => aside.Findings))
            .Concat(fits.Where(fit => fit.Law.Name == study.Analysis.DecideBy).SelectMany(fit => fit.Findings))
            .Concat(loading.Standing.Findings)
            .ToItems();
        return loading with { Fits = fits, Findings = findings };
    })];
}
