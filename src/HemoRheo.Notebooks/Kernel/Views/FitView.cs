using System.Globalization;

namespace HemoRheo.Notebooks;

/// <summary>A fitted law: parameters with their units and standard errors, how the fit ended, whether it may be used.</summary>
internal static class FitView
{
    public static Markup Of(FittedLaw fit) => Markup.Of($"""
        {TableMarkup.Of(fit.ToTable(), $"{fit.Law.Name}, fitted to {fit.Curve}")}<p>{Ended(fit)} {Lack(fit)} Values may be taken from it: {(fit.Usable ? "yes" : "no")}. Errors are those of the fit alone.</p>
        {FindingsView.Folded(fit.Findings)}
        """);

    private static string Ended(FittedLaw fit) => $"It stopped because {Words.Of(fit.Convergence.Reason)}: {fit.Convergence.Message}.";

    private static string Lack(FittedLaw fit) => string.Create(CultureInfo.InvariantCulture, $"Chi-square {Rounding.Digits(fit.Fit.ChiSquare, 3)} of {fit.Fit.DegreesOfFreedom}")
        + (fit.Fit.Probability is { } probability ? $", probability {Rounding.Digits(probability, 2)}." : ".");
}
