namespace HemoRheo.App.Synthetic;

/// <summary>
/// How invented people differ. Centers at hematocrit 0.45 lie near the Quemada coefficients of Cokelet 1987
/// (viscosity at infinite shear 3.4 mPa.s, critical rate 4.8 1/s, r 0.19 for a plasma of 1.24 mPa.s); hematocrits
/// lie in the usual ranges of men (0.40 to 0.54) and women (0.36 to 0.48), those of the second group higher.
/// </summary>
internal static class TruePopulation
{
    /// <summary>Hematocrit at which the centers below are given, L/L.</summary>
    public const double Center = 0.45;

    /// <summary>Rise of hematocrit in the second group, L/L.</summary>
    public const double HematocritRise = 0.040;

    /// <summary>What the second group has beyond its hematocrit: a change of logit r, which acts at low shear rates.</summary>
    public const double GroupLogitRatio = -0.30;

    /// <summary>The blood of a person at a first visit.</summary>
    public static TrueBlood Draw(RandomStream stream, bool man, bool second)
    {
        var hematocrit = Math.Clamp((man ? 0.462 : 0.418) + (second ? HematocritRise : 0) + 0.022 * stream.Normal(), man ? 0.40 : 0.36, man ? 0.56 : 0.53);
        var fibrinogen = Math.Clamp(2.9 + 0.45 * stream.Normal(), 2.0, 4.0);
        var plasma = Math.Clamp(0.001265 * Math.Exp(0.030 * (fibrinogen - 2.9) + 0.030 * stream.Normal()), 0.00116, 0.00140);
        var infinite = plasma * 2.75 * Math.Exp(2.0 * (hematocrit - Center) + 0.030 * stream.Normal());
        var critical = 4.8 * Math.Exp(7.5 * (hematocrit - Center) + 0.12 * stream.Normal());
        var logit = Logit(0.19) - 0.15 * (fibrinogen - 2.9) + 0.08 * stream.Normal();
        var blood = new TrueBlood(hematocrit, plasma, fibrinogen, infinite, critical, Logistic(logit));
        return second ? WithGroupEffect(blood) : blood;
    }

    /// <summary>The blood of the same person some weeks later.</summary>
    public static TrueBlood Later(TrueBlood blood, RandomStream stream) => blood with
    {
        Hematocrit = blood.Hematocrit + 0.005 * stream.Normal(),
        InfiniteShear = blood.InfiniteShear * Math.Exp(0.015 * stream.Normal()),
        CriticalRate = blood.CriticalRate * Math.Exp(0.05 * stream.Normal()),
    };

    /// <summary>The same blood with what belongs to the second group alone.</summary>
    public static TrueBlood WithGroupEffect(TrueBlood blood) => blood with { Ratio = Logistic(Logit(blood.Ratio) + GroupLogitRatio) };

    /// <summary>The same blood without what belongs to the second group alone.</summary>
    public static TrueBlood WithoutGroupEffect(TrueBlood blood) => blood with { Ratio = Logistic(Logit(blood.Ratio) - GroupLogitRatio) };

    private static double Logit(double p) => Math.Log(p / (1 - p));

    private static double Logistic(double x) => 1 / (1 + Math.Exp(-x));
}
