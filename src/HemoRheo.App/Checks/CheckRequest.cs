namespace HemoRheo.App;

/// <summary>Which instrument is asked about.</summary>
/// <param name="StudyFile">Full path of the study file.</param>
/// <param name="Instrument">Name of the instrument; null where the study has one only.</param>
/// <param name="Log">Full path of its log; null for the one beside the study file.</param>
internal sealed record CheckRequest(string StudyFile, string? Instrument, string? Log);
