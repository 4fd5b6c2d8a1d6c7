namespace HemoRheo;

/// <summary>Where a bootstrap takes its random numbers from, and how often it refits.</summary>
/// <param name="Seed">Seed; a study's own seed makes its numbers its own.</param>
/// <param name="Replicates">Refits; at least 100.</param>
public sealed record BootstrapDraws(long Seed = BootstrapDraws.DefaultSeed, int Replicates = 2000)
{
    internal const long DefaultSeed = 20261201;

    internal const int FewestReplicates = 100;
}
