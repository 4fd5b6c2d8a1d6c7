namespace HemoRheo;

/// <summary>Bases of hematocrit as reports print them.</summary>
public static class HematocritBasisWords
{
    /// <summary>The basis in plain words.</summary>
    public static string Words(this HematocritBasis basis) => basis switch
    {
        HematocritBasis.Native => "native hematocrit",
        HematocritBasis.StandardByPlasma => "standard hematocrit, plasma rule",
        HematocritBasis.StandardBySlope => "standard hematocrit, slope rule",
        _ => throw new ArgumentOutOfRangeException(nameof(basis)),
    };
}
