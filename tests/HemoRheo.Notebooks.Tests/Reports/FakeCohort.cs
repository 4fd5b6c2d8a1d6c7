namespace HemoRheo.Notebooks.Tests.Reports;

/// <summary>An invented summary of two groups, one comparison of which could not be had.</summary>
internal static class FakeCohort
{
    public static CohortSummary Summary { get; } = new(
        FakeStudy.Study.Name, "group",
        [.. new[] { HematocritBasis.Native, HematocritBasis.StandardByPlasma }.SelectMany(basis => FakeValues.Rates.Select((rate, i) => One(rate, basis, i)))],
        [.. FakeValues.Rates.SelectMany(rate => new[] { new OutcomeCount("controls", rate, HematocritBasis.StandardByPlasma, 0, 3, 0, 1, 1, 0), new OutcomeCount("residents", rate, HematocritBasis.StandardByPlasma, 0, 2, 1, 0, 0, 2) })],
        ["Six comparisons were made; with 5 % each, one in four such studies shows a difference that is not there."],
        []);

    private static MeasurandSummary One(ViscosityAtRate rate, HematocritBasis basis, int i) => new(
        rate, "Casson", basis,
        new("controls", 6, 4, [new("too-long-since-draw", 1)], 0, Mean(Math.Log(0.0132) - 0.6 * i), 0.1, null, 5, 5, [new("too-long-since-draw", 1)]),
        i == 2 ? new("residents", 3, 1, [], 2, null, null, "One person is too few for a mean.", 3, 1, [new("instrument-not-in-order", 2)]) : new("residents", 5, 3, [], 2, Mean(Math.Log(0.0141) - 0.6 * i), 0.12, null, 5, 3, [new("instrument-not-in-order", 2)]),
        i == 2 ? new("total", null, null, "Welch", "One person is too few for a comparison.") : new("total", Mean(0.066), 0.13, "Welch 1947 on log values, shared parts added in quadrature", null),
        basis == HematocritBasis.Native ? new("adjusted for hematocrit", i == 2 ? null : Mean(0.021), i == 2 ? null : 0.58, "Fuller 1987, within groups, error-aware", i == 2 ? "Hematocrit is measured too coarsely to adjust." : null) : null);

    private static Value Mean(double x) => new(x, [new(new(SourceKind.People, "controls"), 0.03, "people", 4), new(new(SourceKind.Calibration, "R1/1"), 0.002)]);
}
