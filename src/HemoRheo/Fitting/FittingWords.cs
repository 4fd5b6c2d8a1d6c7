namespace HemoRheo;

/// <summary>Fits said as a sentence: <c>curve.Fit(FlowLaw.Casson)</c>.</summary>
public static class FittingWords
{
    /// <summary>Fits a flow law to the kept points of a curve by weighted least squares, the weights taken at the fitted stress.</summary>
    /// <param name="curve">The curve.</param>
    /// <param name="law">The law.</param>
    /// <param name="errors">The error model; null for <see cref="ErrorModel.Default"/>.</param>
    /// <returns>The fit. Data that cannot be fitted give an unusable fit with a finding, never an exception.</returns>
    public static FittedLaw Fit(this FlowCurve curve, FlowLaw law, ErrorModel? errors = null)
    {
        ArgumentNullException.ThrowIfNull(curve);
        return Fits.OfAll([curve], law, errors ?? ErrorModel.Default)[0];
    }

    /// <summary>Fits a flow law to the kept points of a curve by weighted least squares, the weights taken at the fitted stress.</summary>
    /// <typeparam name="TValues">The law's numbers, with units.</typeparam>
    /// <param name="curve">The curve.</param>
    /// <param name="law">The law.</param>
    /// <param name="errors">The error model; null for <see cref="ErrorModel.Default"/>.</param>
    /// <returns>The fit. Data that cannot be fitted give an unusable fit with a finding, never an exception.</returns>
    public static FittedLaw<TValues> Fit<TValues>(this FlowCurve curve, FlowLaw<TValues> law, ErrorModel? errors = null) => new(curve.Fit((FlowLaw)law, errors), law);
}
