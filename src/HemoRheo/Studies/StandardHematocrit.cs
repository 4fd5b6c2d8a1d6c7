namespace HemoRheo;

/// <summary>The hematocrit that values are moved to.</summary>
/// <param name="Hematocrit">The standard hematocrit.</param>
/// <param name="DecideBy">The rule whose standardised values are decided on.</param>
public sealed record StandardHematocrit(Hematocrit Hematocrit, StandardisingRule DecideBy);
