namespace HemoRheo;

/// <summary>What a built-in law brings beside its formula.</summary>
/// <typeparam name="TValues">The law's numbers, with units.</typeparam>
internal interface ILawFormula<TValues> : IFormula
{
    /// <summary>A deterministic start for a fit, from a linearised form of the law.</summary>
    /// <param name="perSecond">Shear rates, above zero, 1/s.</param>
    /// <param name="pascals">Shear stresses, above zero, Pa.</param>
    /// <param name="guess">Receives the parameters on their natural scale, inside their bounds.</param>
    static abstract void Guess(ReadOnlySpan<double> perSecond, ReadOnlySpan<double> pascals, Span<double> guess);

    /// <summary>The law's numbers, with units.</summary>
    static abstract TValues Values(IReadOnlyList<double> estimates);
}
