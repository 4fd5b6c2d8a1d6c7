namespace HemoRheo;

/// <summary>A measurand of one fit, on its working scale, with its gradient to the parameters on the fitting scale.</summary>
internal sealed class FitValue(double x, double[] gradient)
{
    public double X => x;

    public double[] Gradient => gradient;

    /// <summary>Contributions of the fit: the gradient through the columns of the covariance's Cholesky factor.</summary>
    public double[] Columns(FittedLaw fit)
    {
        var factor = SemidefiniteCholesky.Factor(fit.Covariance, gradient.Length);
        var columns = new double[gradient.Length];
        for (var k = 0; k < columns.Length; k++)
        {
            for (var i = k; i < gradient.Length; i++) columns[k] += gradient[i] * factor[i, k];
        }

        return columns;
    }

    /// <summary>Change of the measurand when a constant stress of 1 Pa is added to every reading.</summary>
    public double StressResponse(FittedLaw fit) => gradient.Select((slope, i) => slope * fit.StressResponse[i]).Sum();

    /// <summary>The value with the fit's part alone.</summary>
    public Value ToValue(FittedLaw fit)
    {
        var label = fit.Curve.Label;
        var place = $"{label.Sample}/{label.Loading}/{fit.Law.Name}";
        var (estimate, df) = fit.Errors.ScaleKnown ? ("", double.PositiveInfinity) : ($"residuals of {place}", fit.Fit.EffectiveDegreesOfFreedom);
        return new(X, Columns(fit).Select((amount, k) => new Contribution(new(SourceKind.Fit, $"{place}/{k}"), amount, estimate, df)).ToItems());
    }
}
