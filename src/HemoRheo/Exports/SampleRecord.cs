namespace HemoRheo;

/// <summary>One row of the samples table. Null where the table says nothing.</summary>
/// <param name="Sample">Pseudonym of the sample.</param>
/// <param name="Person">Pseudonym of the person, from the table or, where it has none, from the exports.</param>
/// <param name="Visit">Number of the visit, from the table or, where it has none, from the exports; 1 where neither says.</param>
/// <param name="DrawnAt">When the blood was drawn.</param>
/// <param name="Hematocrit">Hematocrit.</param>
/// <param name="Counter">Name of the hematocrit counter.</param>
/// <param name="PlasmaViscosity">Plasma viscosity.</param>
/// <param name="PlasmaTemperature">Temperature it was measured at.</param>
/// <param name="PlasmaInstrument">What measured it: a rheometer of the study, whose checks then correct it, or another device, which gets no correction.</param>
/// <param name="PlasmaMeasuredAt">When plasma viscosity was measured; null: with the blood.</param>
/// <param name="Fibrinogen">Fibrinogen, g/L.</param>
/// <param name="Where">Line of the samples table.</param>
public sealed record SampleRecord(
    string Sample,
    string Person,
    int Visit,
    DateTimeOffset? DrawnAt,
    Hematocrit? Hematocrit,
    string? Counter,
    Viscosity? PlasmaViscosity,
    Temperature? PlasmaTemperature,
    string? PlasmaInstrument,
    DateTimeOffset? PlasmaMeasuredAt,
    double? Fibrinogen,
    Where Where);
