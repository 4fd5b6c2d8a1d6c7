namespace HemoRheo;

/// <summary>Intervals asked for as a sentence: <c>fit.Interval("yield stress", 0.95, IntervalMethod.ProfileLikelihood)</c>.</summary>
public static class IntervalWords
{
    /// <summary>The interval of a parameter, from this curve alone. What these shear rates cannot tell is left open: an interval may have one side, or none.</summary>
    /// <param name="fit">The fit.</param>
    /// <param name="parameter">The parameter's name.</param>
    /// <param name="level">Coverage, between 0 and 1.</param>
    /// <param name="method">How; see <see cref="IntervalMethod"/> for why the default is what it is.</param>
    /// <param name="draws">Seed and replicates of a bootstrap; null for the defaults.</param>
    /// <exception cref="ArgumentException">The law has no parameter of this name.</exception>
    /// <exception cref="ArgumentOutOfRangeException">The level is not between 0 and 1, or there are too few replicates.</exception>
    public static FitInterval Interval(this FittedLaw fit, string parameter, double level = 0.95, IntervalMethod method = IntervalMethod.ProfileLikelihood, BootstrapDraws? draws = null) =>
        Intervals.Of(fit, Named(fit, parameter), level, method, draws);

    /// <summary>The interval of a parameter, from this curve alone.</summary>
    /// <param name="fit">The fit.</param>
    /// <param name="parameter">The parameter.</param>
    /// <param name="level">Coverage, between 0 and 1.</param>
    /// <param name="method">How.</param>
    /// <param name="draws">Seed and replicates of a bootstrap; null for the defaults.</param>
    /// <exception cref="ArgumentException">The law has no such parameter.</exception>
    /// <exception cref="ArgumentOutOfRangeException">The level is not between 0 and 1, or there are too few replicates.</exception>
    public static FitInterval Interval(this FittedLaw fit, LawParameter parameter, double level = 0.95, IntervalMethod method = IntervalMethod.ProfileLikelihood, BootstrapDraws? draws = null)
    {
        ArgumentNullException.ThrowIfNull(parameter);
        return fit.Interval(parameter.Name, level, method, draws);
    }

    /// <summary>The profile of a parameter, and the interval in it.</summary>
    /// <param name="fit">The fit.</param>
    /// <param name="parameter">The parameter's name.</param>
    /// <param name="level">Coverage, between 0 and 1.</param>
    /// <exception cref="ArgumentException">The law has no parameter of this name.</exception>
    /// <exception cref="ArgumentOutOfRangeException">The level is not between 0 and 1.</exception>
    public static Profile Profile(this FittedLaw fit, string parameter, double level = 0.95) => Intervals.ProfileOf(fit, Named(fit, parameter), level);

    private static FitFunction Named(FittedLaw fit, string name)
    {
        ArgumentNullException.ThrowIfNull(fit);
        for (var k = 0; k < fit.Law.Parameters.Count; k++)
        {
            if (fit.Law.Parameters[k].Name == name) return FitFunction.Of(fit.Law.Parameters[k], k);
        }

        throw new ArgumentException($"{fit.Law.Name} has no parameter '{name}'; it has {string.Join(", ", fit.Law.Parameters.Select(parameter => parameter.Name))}.", nameof(name));
    }
}
