using System.Globalization;

namespace HemoRheo.Notebooks;

/// <summary>A fitted law: parameters with their units and standard errors, how the fit ended, whether it may be used.</summary>
internal static class FitView
{
    public static Table Table(FittedLaw fit) => HemoRheo.Table.Of("parameter", "symbol", "estimate", "standard error", "unit", "why no error").WithRows(fit.Parameters, Row);

    public static Markup Of(FittedLaw fit) => Markup.Of($"""
        {TableMarkup.Of(Table(fit), $"{fit.Law.Name}, fitted to {fit.Curve}")}<p>{Ended(fit)} {Lack(fit)} Values may be taken from it: {(fit.Usable ? "yes" : "no")}. Errors are those of the fit alone.</p>
        {FindingsView.Folded(fit.Findings)}
        """);

    private static Cell[] Row(FittedParameter one)
    {
        var (factor, unit) = one.Parameter.Unit switch { "Pa" => (1000.0, "mPa"), "Pa.s" or "Pa·s" => (1000.0, "mPa·s"), var other => (1.0, other) };
        var estimate = factor * one.Estimate;
        return
        [
            one.AtBound ? $"{one.Parameter.Name} (at its bound)" : one.Parameter.Name,
            one.Parameter.Symbol,
            one.StandardError is { } error and > 0 ? Cell.Rounded(estimate, factor * error) : estimate,
            one.StandardError is { } known ? Cell.Rounded(factor * known, Rounding.Uncertainty(factor * known)) : Cell.Empty,
            unit,
            one.WhyNoError,
        ];
    }

    private static string Ended(FittedLaw fit) => $"It stopped because {Words.Of(fit.Convergence.Reason)}: {fit.Convergence.Message}.";

    private static string Lack(FittedLaw fit) => string.Create(CultureInfo.InvariantCulture, $"Chi-square {Rounding.Digits(fit.Fit.ChiSquare, 3)} of {fit.Fit.DegreesOfFreedom}")
        + (fit.Fit.Probability is { } probability ? $", probability {Rounding.Digits(probability, 2)}." : ".");
}
