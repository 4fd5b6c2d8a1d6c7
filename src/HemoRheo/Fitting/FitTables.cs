namespace HemoRheo;

/// <summary>Fits as tables, in three shapes: one row a parameter, one row a fit, one row a point.</summary>
public static class FitTables
{
    /// <summary>One row a parameter. Errors are those of the fit alone.</summary>
    /// <param name="fit">The fit.</param>
    public static Table ToTable(this FittedLaw fit) => Table.Of("parameter", "symbol", "estimate", "standard error", "unit", "why no error").WithRows(fit.Parameters, parameter =>
    [
        parameter.AtBound ? $"{parameter.Parameter.Name} (at its bound)" : parameter.Parameter.Name,
        parameter.Parameter.Symbol,
        Estimate(parameter),
        ShownError(parameter) is { } error ? Cell.Rounded(error, Rounding.Uncertainty(error)) : Cell.Empty,
        parameter.Parameter.Shown.Symbol,
        parameter.WhyNoError,
    ]);

    /// <summary>One row a fit, of whatever laws and curves.</summary>
    /// <param name="fits">The fits.</param>
    public static Table ToTable(this IEnumerable<FittedLaw> fits) => Table.Of("sample", "loading", "law", "points", "estimates", "chi-square", "degrees of freedom", "probability", "usable").WithRows(fits, fit =>
    [
        fit.Curve.Label.Sample,
        fit.Curve.Label.Loading,
        fit.Law.Name,
        fit.Curve.Points.Count,
        string.Join(", ", fit.Parameters.Select(Words)),
        Finite(fit.Fit.ChiSquare),
        fit.Fit.DegreesOfFreedom,
        fit.Fit.Probability is { } probability ? Cell.Rounded(probability, Rounding.Digits(probability, 2)) : Cell.Empty,
        fit.Usable,
    ]);

    /// <summary>One row a point of the fitted curve, kept or set aside, by descending shear rate: what was read, what the law says, and the residual in standard deviations.</summary>
    /// <param name="fit">The fit.</param>
    public static Table PointsToTable(this FittedLaw fit)
    {
        double[] estimates = [.. fit.Parameters.Select(parameter => parameter.Estimate)];
        var kept = fit.Curve.Points.Select((point, i) => (Point: point, Residual: i < fit.Residuals.Count ? fit.Residuals[i] : (double?)null, Why: ""));
        var aside = fit.Curve.SetAside.Select(one => (one.Point, Residual: (double?)null, Why: string.Join(" ", one.Findings.Select(finding => finding.Code).Distinct())));
        return Table.Of("point", "shear rate", "shear stress", "fitted stress", "viscosity", "residual", "kept", "set aside because").WithRows(
            kept.Concat(aside).OrderByDescending(row => row.Point.Rate.ReciprocalSeconds).ThenBy(row => row.Point.Number), row =>
            [
                row.Point.Number,
                Finite(row.Point.Rate.ReciprocalSeconds),
                Finite(row.Point.Stress.Millipascals),
                estimates.Length > 0 && row.Point.Rate.ReciprocalSeconds >= 0 ? Finite(fit.Law.Stress(row.Point.Rate, estimates).Millipascals) : Cell.Empty,
                Finite(row.Point.ApparentViscosity.MillipascalSeconds),
                row.Residual is { } residual && double.IsFinite(residual) ? Cell.Rounded(residual, residual.ToString("F2", System.Globalization.CultureInfo.InvariantCulture)) : Cell.Empty,
                row.Why.Length == 0,
                row.Why,
            ]);
    }

    private static Cell Finite(double number) => double.IsNaN(number) ? Cell.Empty : number;

    private static Cell Estimate(FittedParameter parameter)
    {
        var estimate = parameter.Parameter.Shown.FromSi(parameter.Estimate);
        return double.IsNaN(estimate) ? Cell.Empty : ShownError(parameter) is { } error and > 0 ? Cell.Rounded(estimate, error) : estimate;
    }

    private static double? ShownError(FittedParameter parameter) => parameter.StandardError is { } error && double.IsFinite(error) ? parameter.Parameter.Shown.FromSi(error) : null;

    private static string Words(FittedParameter parameter)
    {
        var unit = parameter.Parameter.Shown == ShownUnits.One ? "" : $" {parameter.Parameter.Shown.Symbol}";
        var error = ShownError(parameter) is { } known and > 0 ? $" (u {Rounding.Uncertainty(known)})" : "";
        return $"{parameter.Parameter.Name} {Estimate(parameter)}{error}{unit}";
    }
}
