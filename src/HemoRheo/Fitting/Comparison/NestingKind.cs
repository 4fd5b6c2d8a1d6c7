namespace HemoRheo;

/// <summary>Where a simple law lies in a more general one.</summary>
public enum NestingKind
{
    /// <summary>Inside the range of its parameters: the likelihood ratio follows chi-square.</summary>
    Inside,

    /// <summary>At the bound of one parameter: an even mixture of chi-square with all and with one fewer degrees of freedom.</summary>
    AtBound,

    /// <summary>Where other parameters of the general law mean nothing: no chi-square holds, so no probability is stated.</summary>
    OthersMeaningless,
}
