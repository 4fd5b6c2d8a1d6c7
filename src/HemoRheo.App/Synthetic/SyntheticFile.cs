namespace HemoRheo.App.Synthetic;

/// <summary>One file of the synthetic cohort.</summary>
/// <param name="Path">Path below the cohort's folder, with forward slashes.</param>
/// <param name="Text">Its text, written as UTF-8 without a byte order mark.</param>
internal sealed record SyntheticFile(string Path, string Text);
