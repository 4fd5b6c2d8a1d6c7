namespace HemoRheo;

/// <summary>How far an analysis has come.</summary>
/// <param name="Stage">What is being done, in plain words.</param>
/// <param name="Done">How many are done.</param>
/// <param name="Of">Out of how many.</param>
public sealed record AnalysisProgress(string Stage, int Done, int Of);
