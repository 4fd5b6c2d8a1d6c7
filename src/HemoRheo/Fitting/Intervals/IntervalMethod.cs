namespace HemoRheo;

/// <summary>How an interval of a fitted quantity is found. Profile likelihood is the default: it needs no random numbers, follows the law where it is curved, knows the ends of a parameter's range, and says when the curve is silent.</summary>
public enum IntervalMethod
{
    /// <summary>Estimate plus and minus a quantile times the standard error, on the fitting scale (delta method for what is derived). Quick; near a bound it means nothing, and no answer is given there.</summary>
    Wald,

    /// <summary>All values at which the weighted sum of squares, least over the other parameters, rises by no more than the squared quantile. The weights are held at the fitted stresses.</summary>
    ProfileLikelihood,

    /// <summary>Percentiles over refits to the fitted curve with noise of the error model; with an estimated scale the percentiles are moved out as Student's t asks.</summary>
    ParametricBootstrap,

    /// <summary>Percentiles over refits to the fitted curve with its own standardized residuals, corrected for leverage, centered and drawn with replacement; moved out as Student's t asks.</summary>
    ResidualBootstrap,
}
