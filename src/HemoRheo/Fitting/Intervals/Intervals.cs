namespace HemoRheo;

/// <summary>Intervals of whatever is a function of a fit, by any method.</summary>
internal static class Intervals
{
    public static FitInterval Of(FittedLaw fit, FitFunction function, double level, IntervalMethod method, BootstrapDraws? draws)
    {
        Check(level);
        draws ??= new();
        if (draws.Replicates < BootstrapDraws.FewestReplicates)
        {
            throw new ArgumentOutOfRangeException(nameof(draws), $"{draws.Replicates} replicates say nothing of the tails; at least {BootstrapDraws.FewestReplicates} are needed.");
        }

        try
        {
            return method switch
            {
                IntervalMethod.Wald => WaldInterval.Of(fit, function, level),
                IntervalMethod.ProfileLikelihood => ProfileSearch.Of(fit, function, level).Interval,
                _ => BootstrapInterval.Of(fit, function, level, method, draws),
            };
        }
        catch (Exception thrown) when (fit.Law is UserLaw)
        {
            return IntervalAnswer.None(fit, function, level, method, Throws(thrown));
        }
    }

    public static Profile ProfileOf(FittedLaw fit, FitFunction function, double level)
    {
        Check(level);
        try
        {
            return ProfileSearch.Of(fit, function, level);
        }
        catch (Exception thrown) when (fit.Law is UserLaw)
        {
            return new(IntervalAnswer.None(fit, function, level, IntervalMethod.ProfileLikelihood, Throws(thrown)), IntervalAnswer.Quantile(fit, level), []);
        }
    }

    private static string Throws(Exception thrown) => $"the formula of the law throws: {thrown.Message}";

    private static void Check(double level)
    {
        if (!(level > 0 && level < 1)) throw new ArgumentOutOfRangeException(nameof(level), level, "A level of coverage lies between 0 and 1, for example 0.95.");
    }
}
