namespace HemoRheo;

/// <summary>A column that a table of the study may have.</summary>
/// <param name="Name">Its header, without the unit.</param>
/// <param name="Quantity">What it holds, with the unit in the header; null for words, whole numbers and times.</param>
/// <param name="Required">Whether the table is of no use without it.</param>
internal sealed record TableColumn(string Name, Quantity? Quantity = null, bool Required = false);
