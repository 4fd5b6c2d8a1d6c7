namespace HemoRheo;

/// <summary>How far from the estimate a limit may lie, on the working scale: 12, which is a factor of 160,000 of a positive quantity. A side that does not close by then does not close.</summary>
internal static class BelievableRange
{
    private const double Span = 12;

    /// <summary>The range. Its upper end is counted from inside the law where the estimate lies at or near the bound: there the estimate is no measure.</summary>
    public static Interval Of(FittedLaw fit, FitFunction function)
    {
        var estimate = function.Estimate(fit);
        var far = Span * function.LongStep(estimate, function.StandardError(fit));
        return new(estimate - far, Math.Max(estimate, Beside(fit, function, boundary => boundary.InsideAt(fit.Curve.Points.Min(point => point.Stress.Pascals)))?.Value ?? estimate) + far);
    }

    /// <summary>The quantity with the parameter that can be held at its bound moved to a value off it; null where the law has none or the quantity is infinite there too.</summary>
    public static ConstrainedMinimum? Beside(FittedLaw fit, FitFunction function, Func<LawBoundary, double> natural)
    {
        if (fit.Law.Boundary is not { } boundary) return null;
        var near = fit.Scaled.ToArray();
        near[boundary.Parameter] = fit.Law.Parameters[boundary.Parameter].ToScaled(natural(boundary));
        var value = function.At(near, new double[near.Length]);
        return double.IsFinite(value) ? new(value, near, 0, 0) : null;
    }
}
