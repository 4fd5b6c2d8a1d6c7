namespace HemoRheo;

/// <summary>A user's own law as a struct: the loops are those of the built-in laws.</summary>
internal sealed record StructLaw<F>(string Name, F Formula, Items<LawParameter> Parameters) : UserLaw(Name, Parameters) where F : struct, IFormula
{
    internal override Lane StressOf(Lane rate, ReadOnlySpan<Lane> natural) => Formula.Stress(rate, natural);

    internal override void StressesAndSlopes(ReadOnlySpan<Lane> rates, ReadOnlySpan<Lane> scaled, Span<Lane> stresses, Span<Lane> slopes) =>
        FormulaLoops.Run(Formula, Parameters, rates, scaled, stresses, slopes);
}
