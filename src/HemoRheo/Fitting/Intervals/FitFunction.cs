namespace HemoRheo;

/// <summary>What an interval is asked of: a parameter of a fit, or a function of its parameters, on a working scale.</summary>
/// <param name="name">Its name.</param>
/// <param name="shown">The unit it is shown in.</param>
/// <param name="range">Where it can lie, SI.</param>
/// <param name="toSi">From its working scale to the SI number; increasing.</param>
/// <param name="at">Its working value at parameters on the fitting scale.</param>
/// <param name="parameter">Number of the parameter that it is; null for another function.</param>
/// <param name="plain">Whether its working scale is the SI number itself, so that a step of 1 is no measure of anything.</param>
internal sealed class FitFunction(string name, Unit shown, Interval range, Func<double, double> toSi, ScaledFunction at, int? parameter, bool plain)
{
    public string Name => name;

    public Unit Shown => shown;

    public Interval Range => range;

    public int? Parameter => parameter;

    /// <summary>A parameter of a law, on its fitting scale.</summary>
    public static FitFunction Of(LawParameter parameter, int index) => new(
        parameter.Name,
        parameter.Shown,
        new(parameter.Lower, parameter.Upper),
        parameter.ToNatural,
        (scaled, gradient) => One(scaled, gradient, index),
        index,
        double.IsInfinity(parameter.Lower));

    /// <summary>The same under another name and unit.</summary>
    public FitFunction Named(string other, Unit unit) => new(other, unit, range, toSi, at, parameter, plain);

    public double ToSi(double working) => toSi(working);

    public double At(ReadOnlySpan<double> scaled, Span<double> gradient) => at(scaled, gradient);

    /// <summary>Its value at the estimates.</summary>
    public double Estimate(FittedLaw fit)
    {
        Span<double> gradient = stackalloc double[fit.Scaled.Count];
        return at(fit.Scaled.Span, gradient);
    }

    /// <summary>Its standard error by the delta method; NaN where the fit has no covariance.</summary>
    public double StandardError(FittedLaw fit) => fit.Covariance.Count == 0 ? double.NaN : Math.Sqrt(Variance(fit, fit.Covariance));

    /// <summary>Its variance with a covariance of the parameters.</summary>
    public double Variance(FittedLaw fit, IReadOnlyList<double> covariance)
    {
        var size = fit.Scaled.Count;
        Span<double> gradient = stackalloc double[size];
        at(fit.Scaled.Span, gradient);
        double variance = 0;
        for (var j = 0; j < size; j++)
        {
            for (var k = 0; k < size; k++) variance += gradient[j] * covariance[j * size + k] * gradient[k];
        }

        return variance;
    }

    /// <summary>A step on the working scale that is long: 1 where it is a logarithm or logit.</summary>
    public double LongStep(double working, double error) => plain ? Math.Max(Math.Abs(working), double.IsFinite(error) ? error : 1) : 1;

    private static double One(ReadOnlySpan<double> scaled, Span<double> gradient, int index)
    {
        gradient.Clear();
        gradient[index] = 1;
        return scaled[index];
    }
}
