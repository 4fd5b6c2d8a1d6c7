namespace HemoRheo.Notebooks;

/// <summary>One line of a budget.</summary>
/// <param name="Name">The kind of source, and what it belongs to.</param>
/// <param name="Amount">Signed where it is one source, else the root of the sum of squares; on the working scale.</param>
/// <param name="DegreesOfFreedom">Effective degrees of freedom of its parts together.</param>
/// <param name="Shared">Whether samples share it.</param>
internal sealed record BudgetLine(string Name, double Amount, double DegreesOfFreedom, bool Shared);
