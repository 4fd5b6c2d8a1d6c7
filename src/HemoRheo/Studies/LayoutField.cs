namespace HemoRheo;

/// <summary>One column or key of a layout.</summary>
/// <param name="Meaning">What it holds.</param>
/// <param name="Header">The header text or key exactly as the file writes it.</param>
/// <param name="Unit">Its unit; null for fields without one (names, numbers of loadings, times).</param>
/// <param name="PerReading">True for a column of the readings, false for a key line of a block.</param>
public sealed record LayoutField(FieldMeaning Meaning, string Header, Unit? Unit, bool PerReading);
