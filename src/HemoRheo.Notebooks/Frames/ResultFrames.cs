using Deedle;
using HemoRheo.Notebooks;

namespace HemoRheo;

/// <summary>Results as frames: the columns of the tables that are written beside the pages, without the caution that each row carries there; one row a value, a contribution, a point, a fit or a check.</summary>
public static class ResultFrames
{
    /// <summary>Every value of every sample, with its interval, its budget by kind of source and its verdict.</summary>
    /// <param name="result">The result of a study.</param>
    public static Frame<int, string> ValuesFrame(this StudyResult result) => ValueTables.Values(Edition(result)).Table.ToFrame();

    /// <summary>Every contribution to every value of the law that decides.</summary>
    /// <param name="result">The result of a study.</param>
    public static Frame<int, string> BudgetFrame(this StudyResult result) => ValueTables.Budget(Edition(result)).Table.ToFrame();

    /// <summary>Every point of every curve of a study, those set aside included, with the line it was read from.</summary>
    /// <param name="result">The result of a study.</param>
    public static Frame<int, string> PointsFrame(this StudyResult result) => CurveTables.Points(Edition(result)).Table.ToFrame();

    /// <summary>Every point of one curve, those set aside included.</summary>
    /// <param name="curve">The curve.</param>
    public static Frame<int, string> PointsFrame(this FlowCurve curve) => CurveView.Table(curve).ToFrame();

    /// <summary>Every parameter of every law fitted to every loading.</summary>
    /// <param name="result">The result of a study.</param>
    public static Frame<int, string> FitsFrame(this StudyResult result) => CurveTables.Fits(Edition(result)).Table.ToFrame();

    /// <summary>Every check of the study's instruments.</summary>
    /// <param name="result">The result of a study.</param>
    public static Frame<int, string> ChecksFrame(this StudyResult result) => LabTables.Checks(Edition(result)).Table.ToFrame();

    private static Edition Edition(StudyResult result) => new(result, null, RunRecord.Of(result, null), null);
}
