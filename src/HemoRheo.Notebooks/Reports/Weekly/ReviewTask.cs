namespace HemoRheo.Notebooks;

/// <summary>What one person must do about an instrument.</summary>
/// <param name="Who">Who: whoever measures, manages the laboratory, or judges the samples.</param>
/// <param name="What">What.</param>
/// <param name="Urgent">Whether something is wrong; false for what is done anyway.</param>
internal sealed record ReviewTask(string Who, string What, bool Urgent);
