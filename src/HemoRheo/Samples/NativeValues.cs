namespace HemoRheo;

/// <summary>Native values of a sample: its loadings combined for one set of measurands.</summary>
internal static class NativeValues
{
    private const double FarthestLowestRate = 10;

    /// <summary>Whether a loading may be used without a reservation.</summary>
    public static bool Sound(LoadingResult loading, FittedLaw fit) =>
        fit.Usable && !loading.Recording.HasFault && loading.Curve.Findings.All(finding => finding.Severity != Severity.Fault) && loading.Curve.MeanTemperature is not null;

    /// <summary>One value a measurand, where any loading has a usable fit.</summary>
    public static IEnumerable<SampleValue> Of(Study study, string sample, IReadOnlyList<LoadingResult> loadings, MeasurandSet set, LawEvidence evidence)
    {
        var usable = loadings.Select(loading => (Loading: loading, Fit: loading.Fits.First(fit => fit.Law == set.Law))).Where(item => item.Fit.Usable).ToArray();
        var sound = usable.Where(item => Sound(item.Loading, item.Fit)).ToArray();
        var chosen = sound.Length > 0 ? sound : usable;
        if (chosen.Length == 0) yield break;

        for (var i = 0; i < set.Measurands.Count; i++)
        {
            var measurand = set.Measurands[i];
            var inside = measurand is ViscosityAtRate viscosity ? chosen.Where(item => item.Loading.Curve.Covers(viscosity.Rate)).ToArray() : chosen;
            var used = inside.Length > 0 ? inside : chosen;
            var value = Combined(study, sample, set, i, used);
            var findings = Findings(study, sample, set, measurand, evidence, used, sound.Length > 0, inside.Length > 0)
                .Concat(LeftOut(sample, measurand, loadings, chosen, used))
                .Concat(AtBound(sample, measurand, value)).ToItems();
            yield return new(
                measurand, set.Law.Name, HematocritBasis.Native,
                value,
                measurand is ViscosityAtRate at ? Interpolated(study, at.Rate, used.Select(item => item.Loading)) : null,
                findings.All(finding => finding.Severity != Severity.Fault && finding.Kind != SampleFindings.ShownBeside),
                findings);
        }
    }

    private static IEnumerable<Finding> LeftOut(
        string sample, Measurand measurand, IEnumerable<LoadingResult> loadings,
        IReadOnlyList<(LoadingResult Loading, FittedLaw Fit)> chosen, IReadOnlyList<(LoadingResult Loading, FittedLaw Fit)> used) => loadings
        .Where(loading => used.All(item => !ReferenceEquals(item.Loading, loading)))
        .Select(loading => SampleFindings.LoadingLeftOut.At(
            new(Sample: sample, Loading: loading.Recording.Loading),
            chosen.Any(item => ReferenceEquals(item.Loading, loading)) ? $"It does not reach the rate of {measurand.Name}, another loading does." : "Another loading is free of faults and gives the values alone."));

    private static IEnumerable<Finding> AtBound(string sample, Measurand measurand, Value value) => double.IsFinite(value.X)
        ? []
        : [SampleFindings.ValueAtBound.At(new(Sample: sample), $"{measurand.Name} is {measurand.ToSi(value.X).ToString(System.Globalization.CultureInfo.InvariantCulture)}: a loading's fit holds it at its bound.")];

    private static Value Combined(Study study, string sample, MeasurandSet set, int index, IReadOnlyList<(LoadingResult Loading, FittedLaw Fit)> used)
    {
        var between = set.Scatter.Columns.Sum(column => column.Amounts[index] * column.Amounts[index]);
        var values = used.Select(item => (item.Loading, Value: LoadingValue.Of(study, item.Loading, item.Fit, set.Measurands[index].From(item.Fit)!))).ToArray();
        var weights = values.Select(item => 1 / (between + item.Value.Parts.Where(part => part.Source.Kind == SourceKind.Fit).Sum(part => part.Amount * part.Amount))).ToArray();
        var total = weights.Sum();
        return Value.Combine(values.Select((item, l) => (weights[l] / total, item.Value with
        {
            Parts = item.Value.Parts.With(set.Scatter.Columns.Select((column, k) => new Contribution(
                new(SourceKind.Loading, $"{sample}/{item.Loading.Recording.Loading}/{set.Key}/{k}"),
                column.Amounts[index], $"loadings, {set.Key}", column.DegreesOfFreedom))),
        })));
    }

    private static double? Interpolated(Study study, ShearRate rate, IEnumerable<LoadingResult> loadings)
    {
        var read = loadings.Select(loading => loading.Curve.LogViscosityBetweenReadings(rate) + LoadingValue.Shift(study, loading).X).OfType<double>().ToArray();
        return read.Length == 0 ? null : read.Average();
    }

    private static IEnumerable<Finding> Findings(
        Study study, string sample, MeasurandSet set, Measurand measurand, LawEvidence evidence,
        IReadOnlyList<(LoadingResult Loading, FittedLaw Fit)> used, bool anySound, bool inside)
    {
        var where = new Where(Sample: sample);
        var lowest = used.Min(item => item.Loading.Curve.KeptRates!.Value.Lower);
        if (!anySound) yield return SampleFindings.LoadingFaulty.At(where, "No loading is free of faults; the value is shown and not decided on.");
        if (!inside) yield return SampleFindings.Extrapolated.At(where, $"{measurand.Name} lies outside the kept shear rates.", (measurand as ViscosityAtRate)?.Rate.ReciprocalSeconds);
        if (measurand is ViscosityAtRate && set.Law.Name != study.Analysis.DecideBy) yield return SampleFindings.ShownBeside.At(where, $"The study decides by {study.Analysis.DecideBy}.");
        if (evidence.Unfit is { } unfit) yield return unfit.At(where, evidence.Words);
        if (set.Scatter.Columns.Count == 0) yield return PoolingFindings.LoadingUnknown.At(where, "The scatter between loadings is not known.");
        if (measurand == Measurand.CassonYieldStress)
        {
            yield return SampleFindings.YieldStressExtrapolated.At(where, string.Create(System.Globalization.CultureInfo.InvariantCulture, $"Extrapolated from {lowest:G3} 1/s to zero rate."), lowest);
            if (lowest > FarthestLowestRate) yield return SampleFindings.YieldStressTooFar.At(where, string.Create(System.Globalization.CultureInfo.InvariantCulture, $"The lowest kept shear rate is {lowest:G3} 1/s."), lowest, FarthestLowestRate);
        }

        foreach (var (loading, fit) in used)
        {
            var place = where with { Loading = loading.Recording.Loading };
            foreach (var unjudged in loading.Curve.Findings.Where(finding => finding.Kind == RheometryFindings.NoTorqueFloor)) yield return unjudged;
            if (loading.Standing.Period is null) yield return SampleFindings.NotCalibrated.At(place, SampleFindings.WhyNotCalibrated(loading.Standing));
            foreach (var doubt in loading.Standing.Findings.Where(finding => finding.Kind == CalibrationFindings.TorquesInDoubt)) yield return doubt;
            if (loading.Curve.MeanTemperature is null) yield return SampleFindings.NoTemperature.At(place, "No kept reading carries a temperature.");
            var uncertainty = Math.Sqrt(measurand.From(fit)!.Columns(fit).Sum(column => column * column));
            if (uncertainty > FitValueSet.FarthestUncertainty)
            {
                yield return SampleFindings.NotIdentified.At(place, string.Create(System.Globalization.CultureInfo.InvariantCulture, $"{measurand.Name}: the fit knows it to a factor of {Math.Exp(uncertainty):G3}."), uncertainty, FitValueSet.FarthestUncertainty);
            }

            if (fit.Fit is { Contradicts: true, Probability: { } p })
            {
                yield return SampleFindings.CurveDoesNotFit.At(place, string.Create(System.Globalization.CultureInfo.InvariantCulture, $"{set.Law.Name}: chi-square {fit.Fit.ChiSquare:F1} on {fit.Fit.DegreesOfFreedom} degrees of freedom, p = {p:G2}."), p, LackOfFit.SmallestProbability);
            }
        }
    }
}
