namespace HemoRheo;

/// <summary>What is added to a value's budget because the study's curves cannot tell which of several laws they follow.</summary>
/// <param name="Law">Name of the law whose values it belongs to.</param>
/// <param name="Measurand">The measurand.</param>
/// <param name="Amount">Signed contribution on the working scale, toward the other laws: half the range of the laws' mean values over the square root of 3.</param>
/// <param name="Samples">Samples the mean values are of.</param>
/// <remarks>Misfit of a law has one sign, so this is one amount and one source for all values of the law in the study. A rectangular distribution over the range: JCGM 100:2008 (GUM), 4.3.7.</remarks>
public sealed record LawSpread(string Law, Measurand Measurand, double Amount, int Samples)
{
    /// <summary>The contribution to every value of the law.</summary>
    internal Contribution Part => new(new(SourceKind.Law, Law), Amount);
}
