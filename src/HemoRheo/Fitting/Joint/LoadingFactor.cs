namespace HemoRheo;

/// <summary>How much thicker one loading reads than the geometric mean of its loadings, the same at all rates.</summary>
/// <param name="Curve">What the loading is.</param>
/// <param name="Factor">Its factor; the product of all factors is 1.</param>
/// <param name="RelativeStandardError">Its relative standard error from the fit; null where the fit has none.</param>
public sealed record LoadingFactor(CurveLabel Curve, double Factor, double? RelativeStandardError)
{
    /// <summary>As a parameter: fitted as a logarithm.</summary>
    internal static LawParameter Parameter { get; } = new("loading factor", "f", "1");
}
