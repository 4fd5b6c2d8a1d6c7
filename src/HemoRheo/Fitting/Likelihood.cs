namespace HemoRheo;

/// <summary>The likelihood of a fit. Variances are taken at the fitted stress, so their logarithms differ from law to law and belong in it.</summary>
/// <remarks>Source: Burnham and Anderson 2002, Model Selection and Multimodel Inference, 2nd edition, sections 2.2 and 2.4 (AIC and AICc).</remarks>
internal static class Likelihood
{
    private const double LogTwoPi = 1.8378770664093454836;

    /// <summary>
    /// -2 log likelihood of normal errors; where the scale is not known, at its most likely size, chi-square over points.
    /// For correlated readings at the least generalized sum of squares, one linear step from the fit.
    /// </summary>
    /// <param name="fit">A fit that ended with estimates.</param>
    public static double MinusTwiceLog(FittedLaw fit)
    {
        Span<double> slopes = stackalloc double[fit.Scaled.Count];
        var logs = 0.0;
        foreach (var point in fit.Curve.Points) logs += Math.Log(fit.Errors.VarianceAt(fit.Law.StressAt(point.Rate.ReciprocalSeconds, fit.Scaled.Span, slopes)));
        double n = fit.Residuals.Count;
        var (squares, logDeterminant) = fit.Correlation > 0 && WeightedDesign.Of(fit) is { } design ? design.Generalized(fit.Residuals, fit.Correlation) : (fit.Fit.ChiSquare, 0);
        return n * LogTwoPi + logs + logDeterminant + (fit.Errors.ScaleKnown ? squares : n * (1 + Math.Log(squares / n)));
    }

    /// <summary>Parameters that the data had to give: those of the law, and the scale of the errors where it is not known. One that ended at its bound counts too.</summary>
    public static int Counted(FlowLaw law, ErrorModel errors) => law.Parameters.Count + (errors.ScaleKnown ? 0 : 1);

    /// <summary>AICc = -2 log likelihood + 2k + 2k(k + 1)/(n - k - 1); null where there are too few points for it.</summary>
    /// <param name="minusTwiceLog">-2 log likelihood.</param>
    /// <param name="counted">k.</param>
    /// <param name="points">n.</param>
    public static double? CorrectedCriterion(double minusTwiceLog, int counted, int points) =>
        points > counted + 1 ? minusTwiceLog + 2 * counted + 2.0 * counted * (counted + 1) / (points - counted - 1) : null;
}
