namespace HemoRheo;

/// <summary>Makes an instrument's history of the recordings of its checks.</summary>
internal static class InstrumentHistories
{
    internal static InstrumentHistory Of(Study study, Instrument instrument, IEnumerable<Recording> recordings, IEnumerable<Recording> empty)
    {
        var (blanks, unusable) = InstrumentTorques.Read(study, instrument, empty);
        var fillings = CheckFilling.Of(recordings);
        var read = fillings.Select(filling => CheckReading.Of(study, instrument, blanks, filling.Recording)).ToArray();
        var own = read.Select(reading => reading.Check).OfType<InstrumentCheck>().ToArray();
        var vote = CheckScatter.Of(instrument, CheckSpan.Of(instrument, own));
        var checks = own.Select(check => check.Settled(instrument, vote, study.Analysis.Level)).ToItems();
        var spans = CheckSpan.Of(instrument, checks);
        var scatter = CheckScatter.Of(instrument, spans);
        var findings = read.Select(reading => reading.Fault).OfType<Finding>()
            .Concat(fillings.Where(filling => filling.Recordings > 1).Select(ReadAgain))
            .Concat(own.GroupBy(check => check.At).Where(same => same.Select(check => check.Fit.Curve.Label.Sample).Distinct().Count() > 1).Select(AtOneTime))
            .Concat(ScatterFindings(instrument, spans, scatter))
            .Concat(unusable)
            .Concat(blanks.SelectMany(run => run.Findings));
        return new(instrument, checks, scatter is null ? [] : Periods(instrument, spans, scatter).ToItems(), findings.ToItems()) { Blanks = blanks };
    }

    internal static InstrumentHistory OfUndeclared(Study study, string name, Items<Recording> recordings)
    {
        var nothing = new Instrument(name, null, 0, 0, TimeSpan.Zero, 0, null, []);
        var declared = study.Instruments.Count == 0 ? "none" : string.Join(", ", study.Instruments.Select(instrument => instrument.Name));
        var findings = recordings.Select(recording => CalibrationFindings.InstrumentUnknown.At(
            recording.Where with { Sample = recording.Sample, Loading = recording.Loading }, $"Check '{recording.Sample}' names the instrument '{name}'; declared: {declared}."));
        return new(nothing, [], [], findings.ToItems());
    }

    private static Finding ReadAgain(CheckFilling filling)
    {
        var (check, loading) = (filling.Recording.Sample, filling.Recording.Loading);
        return CalibrationFindings.OneFilling.At(filling.Recording.Where with { Sample = check, Loading = loading }, $"{filling.Recordings} recordings of filling {loading} of check '{check}' count as one.");
    }

    private static Finding AtOneTime(IEnumerable<InstrumentCheck> checks)
    {
        var all = checks.ToArray();
        return CalibrationFindings.OneTime.At(all[^1].Fit.Curve.Label.Where, FormattableString.Invariant($"Checks {string.Join(" and ", all.Select(check => $"'{check.Name}'"))} of '{all[0].Instrument}' start at {all[0].At:yyyy-MM-dd HH:mm:ss zzz}."));
    }

    private static IEnumerable<Finding> ScatterFindings(Instrument instrument, Items<CheckSpan> spans, CheckScatter? scatter)
    {
        if (spans.Count == 0) yield break;
        if (scatter is null)
        {
            yield return CalibrationFindings.ScatterUnknown.At(Where.Nowhere, $"Instrument '{instrument.Name}' has one check a period and no declared scatter; its values cannot be corrected.");
        }
        else if (double.IsPositiveInfinity(scatter.DegreesOfFreedom))
        {
            yield return CalibrationFindings.ScatterDeclared.At(
                Where.Nowhere, FormattableString.Invariant($"Instrument '{instrument.Name}' has one check a period; the declared scatter of {100 * scatter.Size:G3} % is used."), scatter.Size);
        }
    }

    private static IEnumerable<InstrumentPeriod> Periods(Instrument instrument, Items<CheckSpan> spans, CheckScatter scatter) => spans.Select((span, i) =>
    {
        var bare = new InstrumentPeriod(
            instrument.Name, i + 1, span.Checks[0].At, span.Until, span.Checks, Value.Exact(0), scatter.Size, scatter.DegreesOfFreedom, scatter.Estimate);
        var shared = Value.Mean([.. span.Checks.Select(check => check.Error.Only(SharedByPeriod))]);
        return bare with { Correction = shared.With(scatter.OfMean(bare.Key, span.Checks.Count)) };
    });

    // The fit and the scatter of each check are what the scatter about the period's mean already shows.
    private static bool SharedByPeriod(Source source) => source.Kind is SourceKind.Certificate or SourceKind.FluidBeta or SourceKind.Thermometer or SourceKind.TorqueZero;
}
