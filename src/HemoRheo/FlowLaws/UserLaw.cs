namespace HemoRheo;

/// <summary>A user's own law.</summary>
internal abstract record UserLaw(string Name, Items<LawParameter> Parameters)
    : FlowLaw<NamedValues>(Name, new("the user", 0, "a law of the user's own"), Parameters, new(0, double.PositiveInfinity))
{
    internal override LawBoundary? Boundary => null;

    internal override bool MayHaveManyMinima => true;

    internal override NamedValues Values(IReadOnlyList<double> estimates) => new(Parameters, estimates.ToItems());

    internal override void FirstGuess(ReadOnlySpan<double> perSecond, ReadOnlySpan<double> pascals, Span<double> guess)
    {
        for (var k = 0; k < guess.Length; k++) guess[k] = Parameters[k].Start!.Value;
    }
}
