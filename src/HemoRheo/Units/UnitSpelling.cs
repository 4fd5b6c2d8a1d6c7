namespace HemoRheo;

/// <summary>One row of the unit table.</summary>
/// <param name="Spelling">A spelling, after signs are made one.</param>
/// <param name="Unit">Its unit.</param>
internal readonly record struct UnitSpelling(string Spelling, Unit Unit);
