namespace HemoRheo;

/// <summary>Values derived from curves fitted together.</summary>
public static class JointEstimates
{
    /// <summary>Apparent viscosity of the geometric-mean loading at a rate.</summary>
    /// <param name="loadings">A usable fit of loadings.</param>
    /// <param name="at">Shear rate above zero.</param>
    /// <returns>The value with contributions of the fit and of the scatter between loadings; the instrument and the rest of the budget are not in it.</returns>
    /// <exception cref="InvalidOperationException">The fit is not usable.</exception>
    public static Estimate ApparentViscosity(this LoadingsFit loadings, ShearRate at) => loadings.Estimate(Measurand.Viscosity(at));

    /// <summary>A measurand of the geometric-mean loading.</summary>
    /// <param name="loadings">A usable fit of loadings.</param>
    /// <param name="measurand">The measurand.</param>
    /// <returns>The value with contributions of the fit and of the scatter between loadings, as far as a common factor of all stresses moves it.</returns>
    /// <exception cref="InvalidOperationException">The fit is not usable.</exception>
    /// <exception cref="ArgumentException">The measurand does not come from this law.</exception>
    public static Estimate Estimate(this LoadingsFit loadings, Measurand measurand)
    {
        ArgumentNullException.ThrowIfNull(loadings);
        Check(loadings.Joint);
        var mean = loadings.Mean();
        var gradient = GradientOf(loadings.Joint, 0, mean, measurand, out var x);
        var response = 0.0;
        for (var k = 0; k < gradient.Length; k++) response += gradient[k] * loadings.Joint.RelativeResponse[k];
        return new(measurand, FitPart(loadings.Joint, x, gradient).With(loadings.LoadingPart(response)), measurand.ReachesBeyond(mean.Curve));
    }

    /// <summary>Apparent viscosity of one curve of a joint fit at a rate, with the fit's uncertainty.</summary>
    /// <param name="fit">A usable joint fit.</param>
    /// <param name="curve">Number of the curve, from 0, in the order of <see cref="JointFit.Curves"/>.</param>
    /// <param name="at">Shear rate above zero.</param>
    /// <exception cref="InvalidOperationException">The fit is not usable.</exception>
    /// <exception cref="ArgumentOutOfRangeException">There is no curve of this number.</exception>
    public static Estimate ApparentViscosity(this JointFit fit, int curve, ShearRate at) => fit.Estimate(curve, Measurand.Viscosity(at));

    /// <summary>A measurand of one curve of a joint fit, with the fit's uncertainty; what curves share is one source in all of their values.</summary>
    /// <param name="fit">A usable joint fit.</param>
    /// <param name="curve">Number of the curve, from 0, in the order of <see cref="JointFit.Curves"/>.</param>
    /// <param name="measurand">The measurand.</param>
    /// <exception cref="InvalidOperationException">The fit is not usable.</exception>
    /// <exception cref="ArgumentException">The measurand does not come from this law, or there is no curve of this number.</exception>
    public static Estimate Estimate(this JointFit fit, int curve, Measurand measurand)
    {
        ArgumentNullException.ThrowIfNull(fit);
        Check(fit);
        if (curve < 0 || curve >= fit.Curves.Count) throw new ArgumentOutOfRangeException(nameof(curve), $"There are {fit.Curves.Count} curves, numbered from 0; there is no curve {curve}.");
        var gradient = GradientOf(fit, curve, fit.Part(curve, fit.Curves[curve]), measurand, out var x);
        return new(measurand, FitPart(fit, x, gradient), measurand.ReachesBeyond(fit.Curves[curve]));
    }

    /// <summary>Slopes of a measurand to all parameters of the joint fit.</summary>
    private static double[] GradientOf(JointFit fit, int curve, FittedLaw part, Measurand measurand, out double x)
    {
        var value = measurand.From(part) ?? throw new ArgumentException($"{measurand.Name} does not come from a fit of {part.Law.Name}.", nameof(measurand));
        var gradient = new double[fit.Scaled.Count];
        for (var k = 0; k < value.Gradient.Length; k++) gradient[fit.Place(curve, k)] += value.Gradient[k];
        x = value.X;
        return gradient;
    }

    /// <summary>The fit's part: the gradient through the columns of the covariance's Cholesky factor, which all values of the fit share.</summary>
    private static Value FitPart(JointFit fit, double x, double[] gradient)
    {
        var place = $"{fit.Samples}/0/{fit.LawName}";
        var (estimate, df) = fit.Errors[0].ScaleKnown ? ("", double.PositiveInfinity) : ($"residuals of {place}", fit.Fit.DegreesOfFreedom);
        var factor = SemidefiniteCholesky.Factor(fit.Covariance, gradient.Length);
        var parts = new List<Contribution>();
        for (var k = 0; k < gradient.Length; k++)
        {
            var amount = 0.0;
            for (var i = k; i < gradient.Length; i++) amount += gradient[i] * factor[i, k];
            if (amount != 0) parts.Add(new(new(SourceKind.Fit, $"{place}/{k}"), amount, estimate, df));
        }

        return new(x, parts.ToItems());
    }

    private static void Check(JointFit fit)
    {
        if (!fit.Usable) throw new InvalidOperationException($"The joint fit of {fit.LawName} is not usable: {fit.Convergence.Message}. Look at its findings.");
    }
}
