namespace HemoRheo;

/// <summary>The record of a run.</summary>
/// <param name="Study">Name of the study.</param>
/// <param name="Seed">Its seed.</param>
/// <param name="Settings">Digest of the study file.</param>
/// <param name="Versions">Versions the numbers depend on: this library, its numerical packages, the runtime, the processor architecture.</param>
/// <param name="Inputs">Digest of every input file, by path.</param>
/// <param name="Results">Every reported number by name, round-trip text.</param>
/// <param name="ResultDigest">SHA-256 over the names and texts of all results, lower-case hexadecimal.</param>
/// <param name="Feeds">Which input files feed which sample: the sample's pseudonym and a path, nearest file first.</param>
public sealed partial record RunRecord(
    string Study,
    long Seed,
    string Settings,
    Items<NamedText> Versions,
    Items<NamedText> Inputs,
    Items<NamedText> Results,
    string ResultDigest,
    Items<NamedText> Feeds);
