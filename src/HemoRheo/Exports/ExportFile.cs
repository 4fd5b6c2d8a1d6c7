namespace HemoRheo;

/// <summary>What was understood of one file.</summary>
/// <param name="Path">Path below the study's folder, with forward slashes.</param>
/// <param name="Digest">SHA-256 of its bytes, lower-case hexadecimal.</param>
/// <param name="Layout">Name of the layout that read it, or "samples table", "people table", "check table"; null when none did.</param>
/// <param name="Recordings">Number of recordings read from it.</param>
/// <param name="Readings">Number of readings read from it.</param>
/// <param name="Findings">What is wrong with it. A file that was refused gave no recordings; the findings say why.</param>
public sealed record ExportFile(string Path, string Digest, string? Layout, int Recordings, int Readings, Items<Finding> Findings);
