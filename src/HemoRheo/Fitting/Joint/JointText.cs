using System.Globalization;
using System.Text;

namespace HemoRheo;

/// <summary>Joint fits as plain text.</summary>
internal static class JointText
{
    /// <summary>A joint fit: how it ended, its parameters, whether the curves share them, and its findings; lines of at most 100 signs.</summary>
    public static string Of(JointFit fit)
    {
        var text = new StringBuilder();
        text.Append(CultureInfo.InvariantCulture, $"{fit.LawName}, {fit.Curves.Count} curves together{(fit.Usable ? "" : ", not usable")}\n{fit.Convergence.Message}\n");
        if (fit.Parameters.Count > 0)
        {
            text.Append(fit.ToTable().ToText());
            text.Append(CultureInfo.InvariantCulture, $"chi-square {fit.Fit.ChiSquare:F1} on {fit.Fit.DegreesOfFreedom} degrees of freedom\n");
        }

        if (fit.Compatibility is { } shared) text.Append(CultureInfo.InvariantCulture, $"{(shared.Contradicts ? "sharing contradicted" : "sharing not contradicted")}: {shared}\n");
        if (fit.Findings.Count > 0) text.Append(Table.Of("code", "finding").WithRows(fit.Findings, finding => [finding.Code, finding.Message]).ToText());
        return text.ToString().TrimEnd('\n');
    }

    /// <summary>A curve in words: sample and loading, or its number where these do not tell the curves apart.</summary>
    public static string Name(JointFit fit, int curve) => fit.Curves.Select(Label).Distinct().Count() == fit.Curves.Count
        ? Label(fit.Curves[curve])
        : $"curve {curve}";

    private static string Label(FlowCurve curve) => $"{curve.Label.Sample}, loading {curve.Label.Loading}";
}
