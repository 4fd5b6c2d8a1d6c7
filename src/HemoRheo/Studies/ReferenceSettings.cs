namespace HemoRheo;

/// <summary>Where reference limits come from.</summary>
/// <param name="FromControls">True: from the study's controls, where there are enough; false: from declared limits alone.</param>
/// <param name="Declared">Declared limits with their source, used for measurands the controls do not settle.</param>
public sealed record ReferenceSettings(bool FromControls, Items<DeclaredLimits> Declared);
