using System.Reflection;
using System.Runtime.InteropServices;

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
    Items<NamedText> Feeds)
{
    /// <summary>The record of these results. It holds no clock time and no machine's name: the same inputs, settings and versions give the same record.</summary>
    /// <param name="results">Results of the study.</param>
    /// <param name="summary">Its cohort summary; null where none was made.</param>
    public static RunRecord Of(StudyResult results, CohortSummary? summary)
    {
        var study = results.Study;
        var numbers = RunResults.Of(results, summary).ToItems();
        var inputs = results.Analyzed.Readings.Files.Select(file => new NamedText(file.Path, file.Digest))
            .Concat(study.Fluids.Select(fluid => fluid.Certificate).OfType<Certificate>().Select(certificate => new NamedText(certificate.File, certificate.Digest)).Distinct())
            .ToItems();
        return new(study.Name, study.Seed, study.Digest, VersionsNow(), inputs, numbers, ResultDigests.Of(numbers), RunFeeds.Of(results.Analyzed).ToItems());
    }

    /// <summary>The record as indented JSON text, ending with a line break. Reading it back gives an equal record.</summary>
    public string ToJson() => RunRecordJson.Write(this);

    /// <summary>A record from its JSON text.</summary>
    /// <param name="json">The text.</param>
    /// <exception cref="FormatException">The text is not a record of a run, was written by a newer version, or was changed by hand; the message says which and what to do.</exception>
    public static RunRecord FromJson(string json) => RunRecordJson.Read(json);

    /// <summary>What differs from an earlier run, each changed number with its nearest cause.</summary>
    /// <param name="earlier">The earlier run.</param>
    public RunComparison ComparedWith(RunRecord earlier) => RunComparing.Of(earlier, this);

    /// <inheritdoc/>
    public override string ToString() => $"run of {Study}: {Inputs.Count} inputs, {Results.Count} results, digest {ResultDigest[..Math.Min(12, ResultDigest.Length)]}";

    private static Items<NamedText> VersionsNow() =>
    [
        new("HemoRheo", VersionOf(typeof(RunRecord).Assembly)),
        new("MathNet.Numerics", VersionOf(typeof(MathNet.Numerics.Constants).Assembly)),
        new("runtime", RuntimeInformation.FrameworkDescription),
        new("architecture", RuntimeInformation.ProcessArchitecture.ToString()),
    ];

    private static string VersionOf(Assembly assembly) =>
        assembly.GetCustomAttribute<AssemblyInformationalVersionAttribute>()?.InformationalVersion ?? assembly.GetName().Version?.ToString() ?? "unknown";
}
