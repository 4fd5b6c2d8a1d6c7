namespace HemoRheo.Notebooks.Tests;

/// <summary>One small notebook.</summary>
public sealed class ProbeNotebook() : HeadlessNotebook(jupyter => jupyter.Execute("probe", Cells))
{
    public const int Loading = 0;
    public const int Versions = 1;
    public const int Curve = 2;
    public const int CurveChart = 3;
    public const int Frame = 4;
    public const int OwnChart = 5;
    public const int HostileName = 6;
    public const int LoadedAgain = 7;

    private static readonly string[] Cells =
    [
        "#r \"nuget:HemoRheo.Notebooks\"",
        "using HemoRheo;\nConsole.WriteLine(typeof(FlowCurve).Assembly.ManifestModule.ModuleVersionId);\nConsole.WriteLine(typeof(InteractiveChart).Assembly.ManifestModule.ModuleVersionId);",
        "double[] rates = [100, 30, 10, 3, 1];\ndouble[] stresses = [0.48, 0.175, 0.077, 0.036, 0.02];\nvar curve = FlowCurve.Of(perSecond: rates, pascals: stresses);\ncurve",
        "curve.Chart()",
        "curve.PointsFrame()",
        "Plotly.NET.CSharp.Chart.Point<double, double, string>(rates, stresses)",
        "FlowCurve.Of(rates, stresses, \"<script>alert('x')</script>\").ViscosityChart()",
        "#r \"nuget:HemoRheo.Notebooks\"",
    ];
}
