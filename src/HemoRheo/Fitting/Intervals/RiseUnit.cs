namespace HemoRheo;

/// <summary>The unit in which a rise of the sum of squares is measured, so that near the estimate its root is the distance in standard errors.</summary>
/// <remarks>For correlated readings the sum of squares keeps its independent weights and is scaled to the standard error that knows of the correlation. Source: Chandler and Bate 2007, Biometrika 94:167-183.</remarks>
internal static class RiseUnit
{
    /// <summary>Variance of the errors over that of the error model: 1 where sizes are known, else from the residuals.</summary>
    public static double Scale(FittedLaw fit) => fit.Errors.ScaleKnown ? 1 : fit.Fit.ChiSquare / fit.Fit.Expected;

    public static double Of(FittedLaw fit, FitFunction function, HeldWeights held)
    {
        if (fit.Correlation == 0 || fit.Covariance.Count == 0) return Scale(fit);
        var independent = Independent(fit, held);
        var ratio = function.Variance(fit, fit.Covariance) / function.Variance(fit, independent);
        if (double.IsFinite(ratio) && ratio > 0) return ratio;
        var size = fit.Scaled.Count;
        return Enumerable.Range(0, size).Where(k => independent[k * size + k] > 0).Max(k => fit.Covariance[k * size + k] / independent[k * size + k]);
    }

    /// <summary>Covariance for independent readings of the error model's size, row by row; zero rows for a parameter that is held.</summary>
    private static double[] Independent(FittedLaw fit, HeldWeights held)
    {
        var size = fit.Scaled.Count;
        var slopes = new double[held.Points * size];
        held.At(fit.Scaled.Span, new double[held.Points], slopes);
        int[] free = [.. Enumerable.Range(0, size).Where(k => !double.IsInfinity(fit.Scaled[k]))];
        var qr = new HouseholderQr(held.Points, free.Length);
        for (var j = 0; j < free.Length; j++) slopes.AsSpan(free[j] * held.Points, held.Points).CopyTo(qr.Matrix.AsSpan(j * held.Points));
        qr.Factor();
        var inverse = qr.InverseOfNormal();
        var covariance = new double[size * size];
        for (var j = 0; j < free.Length; j++)
        {
            for (var k = 0; k < free.Length; k++) covariance[free[j] * size + free[k]] = inverse[j * free.Length + k];
        }

        return covariance;
    }
}
