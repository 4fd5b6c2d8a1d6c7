namespace HemoRheo.Notebooks;

/// <summary>Checks of instruments, findings, and files.</summary>
internal static class LabTables
{
    /// <summary>One row a check.</summary>
    public static StudyTable Checks(Edition edition) => new("checks.csv", "One row a check of an instrument with a calibration fluid.",
        Table.Of("check", "instrument", "started at", "fluid", "lot", "temperature", "measured", "expected", "relative error", "error lower", "error upper", "relative limit", "check outcome", "probability within", "period", "findings")
            .WithRows(edition.Results.Analyzed.Histories.SelectMany(history => history.Checks.Select(check => (history, check))), row => Check(row.history, row.check)));

    /// <summary>One row a loading: what its torques rest on. None where the study has no blank run.</summary>
    public static IEnumerable<StudyTable> Torques(Edition edition) => edition.Results.Analyzed.Histories.All(history => history.Blanks.Count == 0)
        ? []
        : [new("torques.csv", "One row a loading: the blank run or declared floor that its torques rest on.", edition.Results.Analyzed.TorqueTable())];

    /// <summary>One row a finding.</summary>
    public static StudyTable Findings(Edition edition) => new("findings.csv", "One row a finding, in the order of the pipeline.",
        Table.Of("severity", "code", "finding", "where", "sample", "loading", "point", "file", "line", "column", "observed", "limit", "usual cause", "what to do", "source")
            .WithRows(edition.Results.Findings, finding =>
            [
                Words.Of(finding.Severity), finding.Code, finding.Message, finding.Where.ToString(), finding.Where.Sample, finding.Where.Loading, finding.Where.Point, finding.Where.File, finding.Where.Line, finding.Where.Column,
                StudyTable.Number(finding.Observed), StudyTable.Number(finding.Limit), finding.Kind.UsualCause, finding.Kind.WhatToDo, finding.Kind.Source,
            ]));

    /// <summary>One row a file.</summary>
    public static StudyTable Files(Edition edition) => new("files.csv", "One row a file: what was understood of it.",
        Table.Of("file", "layout", "recordings", "readings", "findings", "finding", "digest")
            .WithRows(edition.Results.Analyzed.Readings.Files, file =>
            [
                file.Path, file.Layout, file.Recordings, file.Readings, string.Join(" ", file.Findings.Select(finding => finding.Code).Distinct()), string.Join(" ", file.Findings.Select(finding => finding.Message)), file.Digest,
            ]));

    private static Cell[] Check(InstrumentHistory history, InstrumentCheck check)
    {
        var interval = check.Error.Interval();
        var period = history.Periods.FirstOrDefault(period => period.Checks.Contains(check));
        return
        [
            check.Name, check.Instrument, check.At, check.Fluid.Name, check.Fluid.Lot, StudyTable.Number(check.Temperature.DegreesCelsius), StudyTable.Number(check.Measured.MillipascalSeconds), StudyTable.Number(check.Expected.MillipascalSeconds),
            Percent(check.Error.X), Percent(interval.Lower), Percent(interval.Upper), StudyTable.Number(100 * check.Limit), Words.Of(check.Outcome), StudyTable.Number(check.ProbabilityWithin), period?.Number,
            string.Join(" ", check.Findings.Select(finding => finding.Code).Distinct()),
        ];
    }

    private static Cell Percent(double logError) => StudyTable.Number(100 * (Math.Exp(logError) - 1));
}
