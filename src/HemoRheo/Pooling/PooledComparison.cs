namespace HemoRheo;

/// <summary>The laws of a study compared on all its curves together.</summary>
/// <param name="Laws">The laws, the one that decides first.</param>
/// <param name="Words">The answer in words.</param>
/// <remarks>
/// Parameters that ended at a bound are not counted, since each curve has its own. Where the sizes of the errors are known, the correction of AICc for few points, which belongs to their estimation, is left out:
/// summed over many curves it would favor the simple law. Where readings are correlated, the likelihood knows it.
/// Sources: Akaike 1974, IEEE Trans Automat Contr 19:716-723; Hurvich and Tsai 1989, Biometrika 76:297-307; standard error of a difference: Vuong 1989, Econometrica 57:307-333.
/// </remarks>
public sealed record PooledComparison(Items<PooledLaw> Laws, string Words)
{
    /// <summary>Difference of AIC above which laws are parted, if it is also beyond chance: "essentially no support" in Burnham and Anderson 2002, page 70.</summary>
    public const double Parting = 10;

    /// <summary>The law that is left; null where none or several are, or there is only one.</summary>
    public string? Preferred => Laws.FirstOrDefault(law => law.Standing == LawStanding.Preferred)?.Law;

    /// <summary>Laws that the curves together cannot part; none, or two and more.</summary>
    public Items<string> NotParted => Laws.Where(law => law.Standing == LawStanding.NotParted).Select(law => law.Law).ToItems();

    /// <inheritdoc/>
    public override string ToString() => Words;
}
