namespace HemoRheo.Tests.Architecture;

/// <summary>A folder of src/HemoRheo.</summary>
/// <param name="Name">Its name.</param>
/// <param name="MayUse">The rooms whose types it may mention, beside its own.</param>
/// <param name="Never">What it never does, in words.</param>
internal sealed record Room(string Name, IReadOnlyList<string> MayUse, string Never);
