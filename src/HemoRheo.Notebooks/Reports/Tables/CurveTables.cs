namespace HemoRheo.Notebooks;

/// <summary>Every point, every fit, and the evidence for the laws.</summary>
internal static class CurveTables
{
    /// <summary>One row a point of a curve, kept or set aside.</summary>
    public static StudyTable Points(Edition edition) => new("points.csv", "One row a point of a flow curve, kept or set aside, with the line it was read from.",
        Table.Of("sample", "loading", "ramp", "point", "kept", "set aside because", "shear rate", "shear stress", "viscosity", "temperature", "file", "line")
            .WithRows(Loadings(edition).SelectMany(loading => new[] { loading.Result.Curve, loading.Result.OtherRamp }.OfType<FlowCurve>().SelectMany(curve => Points(loading.Sample, curve))), row => row));

    /// <summary>One row a fitted parameter.</summary>
    public static StudyTable Fits(Edition edition) => new("fits.csv", "One row a parameter of a law fitted to a loading.",
        Table.Of("sample", "loading", "law", "parameter", "symbol", "estimate", "unit", "standard error", "why no error", "at bound", "stop reason", "chi-square", "degrees of freedom", "probability", "usable", "fits")
            .WithRows(Loadings(edition).SelectMany(loading => loading.Result.Fits.SelectMany(fit => fit.Parameters.Select(parameter => (loading.Sample, loading.Result.Recording.Loading, fit, parameter)))), row =>
            [
                row.Sample, row.Loading, row.fit.Law.Name, row.parameter.Parameter.Name, row.parameter.Parameter.Symbol, StudyTable.Number(row.parameter.Estimate), row.parameter.Parameter.Unit,
                StudyTable.Number(row.parameter.StandardError), row.parameter.WhyNoError, row.parameter.AtBound, Words.Of(row.fit.Convergence.Reason),
                StudyTable.Number(row.fit.Fit.ChiSquare), row.fit.Fit.DegreesOfFreedom, StudyTable.Number(row.fit.Fit.Probability), row.fit.Usable, FitJudgment.Of(edition, row.fit),
            ]));

    /// <summary>One row a law.</summary>
    public static StudyTable Laws(Edition edition) => new("laws.csv", "One row a law: what all curves of the study together say of it.",
        Table.Of("law", "decides", "curves", "chi-square", "degrees of freedom", "probability", "pattern probability", "fits", "standing", "AIC", "difference", "difference error", "weight", "reason")
            .WithRows(edition.Results.Analyzed.Pool.Laws, law =>
            [
                law.Law, law.Law == edition.Law, law.Curves, StudyTable.Number(law.ChiSquare), law.DegreesOfFreedom, StudyTable.Number(law.Probability), StudyTable.Number(law.PatternProbability), law.Fits, .. Compared(edition.Results.Analyzed.Pool.Comparison.Laws.FirstOrDefault(compared => compared.Law == law.Law)), law.Words,
            ]));

    private static Cell[] Compared(PooledLaw? law) => [law?.Standing.Words(), StudyTable.Number(law?.Criterion), StudyTable.Number(law?.Difference), StudyTable.Number(law?.DifferenceError), StudyTable.Number(law?.Weight)];

    private static IEnumerable<(string Sample, LoadingResult Result)> Loadings(Edition edition) => edition.Results.Samples.SelectMany(sample => sample.Result.Loadings.Select(loading => (sample.Sample, loading)));

    private static IEnumerable<Cell[]> Points(string sample, FlowCurve curve) => curve.Points.Select(point => Point(sample, curve, point, []))
        .Concat(curve.SetAside.Select(aside => Point(sample, curve, aside.Point, aside.Findings)));

    private static Cell[] Point(string sample, FlowCurve curve, FlowPoint point, Items<Finding> why) =>
    [
        sample, curve.Label.Loading, Words.Of(point.Ramp), point.Number, why.Count == 0, string.Join(" ", why.Select(finding => finding.Code).Distinct()), StudyTable.Number(point.Rate.ReciprocalSeconds),
        StudyTable.Number(point.Stress.Millipascals), StudyTable.Number(point.ApparentViscosity.MillipascalSeconds), StudyTable.Number(point.Reading?.Temperature), point.Reading?.Where.File, point.Reading?.Where.Line,
    ];
}
