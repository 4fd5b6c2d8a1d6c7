namespace HemoRheo.Notebooks;

/// <summary>One row of a strip: a name, the range its values are held against, and the values.</summary>
/// <param name="Name">Name of the row.</param>
/// <param name="Range">The range; null where there is none.</param>
/// <param name="Values">The values, all of one measurand.</param>
internal sealed record StripRow(string Name, ReferenceRange? Range, Items<JudgedValue> Values);
