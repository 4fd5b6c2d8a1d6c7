namespace HemoRheo;

/// <summary>A study: everything its study file says, checked and in SI units. Opened by <c>Study.Open</c>.</summary>
/// <param name="Name">Name of the study, shown on every page.</param>
/// <param name="Seed">Seed of every random stream of the study.</param>
/// <param name="Folder">Full path of the folder the study file stands in; never written to any output.</param>
/// <param name="FileName">Name of the study file in that folder.</param>
/// <param name="Digest">SHA-256 of the study file's bytes, lower-case hexadecimal.</param>
/// <param name="Files">Where its data lie, below the folder.</param>
/// <param name="Layouts">Declared export layouts, in the order they are tried.</param>
/// <param name="Instruments">Rheometers.</param>
/// <param name="Geometries">Measuring geometries.</param>
/// <param name="Fluids">Calibration fluids with their certificates.</param>
/// <param name="Counters">Hematocrit counters.</param>
/// <param name="Blood">What is assumed of blood and plasma.</param>
/// <param name="Errors">The error model of readings.</param>
/// <param name="Screening">Limits of the screening rules.</param>
/// <param name="Analysis">Laws, standard shear rates, ramp, correction.</param>
/// <param name="Standard">The standard hematocrit.</param>
/// <param name="Reference">Where reference limits come from.</param>
/// <param name="Groups">Groups of people by code.</param>
public sealed partial record Study(
    string Name,
    long Seed,
    string Folder,
    string FileName,
    string Digest,
    StudyFiles Files,
    Items<Layout> Layouts,
    Items<Instrument> Instruments,
    Items<Geometry> Geometries,
    Items<CalibrationFluid> Fluids,
    Items<Counter> Counters,
    Blood Blood,
    ReadingErrors Errors,
    ScreeningLimits Screening,
    AnalysisSettings Analysis,
    StandardHematocrit Standard,
    ReferenceSettings Reference,
    Items<Group> Groups)
{
    /// <inheritdoc/>
    public override string ToString() => $"study {Name}: {Layouts.Count} layouts, {Instruments.Count} instruments, laws {string.Join(", ", Analysis.Laws)}, decided by {Analysis.DecideBy}";
}
