namespace HemoRheo.Tests.Calibration;

/// <summary>Histories of one rheometer checked with the oil of the tests, by the relative error of each check.</summary>
internal static class InvestigatedInstrument
{
    /// <summary>A check on a day (9:00 local), showing this relative error at 37 degC.</summary>
    internal static Recording Check(int day, double percent, int loading = 1, string? name = null) =>
        TestStudy.Check(name ?? $"C{day}", TestStudy.Start.AddDays(day), TestStudy.Oil.ViscosityAt(Temperature.Body).PascalSeconds * (1 + percent / 100), loading: loading);

    internal static InstrumentHistory History(Study study, params Recording[] checks) => Assert.Single(study.CheckInstruments(TestStudy.Readings(study, checks)));

    internal static InstrumentHistory History(params Recording[] checks) => History(TestStudy.Plain, checks);

    internal static InstrumentStanding On(this InstrumentHistory history, double day) => history.At(TestStudy.Start.AddDays(day));

    internal static IEnumerable<string> Codes(this IEnumerable<Finding> findings) => findings.Select(finding => finding.Code);
}
