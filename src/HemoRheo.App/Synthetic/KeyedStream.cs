namespace HemoRheo.App.Synthetic;

/// <summary>Random numbers that depend on a seed and a key alone, so that one sample's numbers do not move when another is added.</summary>
internal sealed class KeyedStream
{
    private ulong state;
    private double? spare;

    public KeyedStream(long seed, params ReadOnlySpan<string> key)
    {
        state = Mix((ulong)seed + 0x9E3779B97F4A7C15);
        foreach (var word in key)
        {
            foreach (var letter in word) state = Mix(state ^ letter);
            state = Mix(state ^ 0x10000);
        }
    }

    /// <summary>A number between 0 and 1, both excluded.</summary>
    public double Uniform() => ((Next() >> 12) + 0.5) * (1.0 / (1UL << 52));

    /// <summary>A number between two others.</summary>
    public double Uniform(double from, double to) => from + (to - from) * Uniform();

    /// <summary>A standard normal number (Box and Muller 1958).</summary>
    public double Normal()
    {
        if (spare is { } kept)
        {
            spare = null;
            return kept;
        }
        var radius = Math.Sqrt(-2 * Math.Log(Uniform()));
        var (sine, cosine) = Math.SinCos(2 * Math.PI * Uniform());
        spare = radius * sine;
        return radius * cosine;
    }

    private ulong Next() => Mix(state += 0x9E3779B97F4A7C15);

    // SplitMix64 (Steele, Lea and Flood 2014).
    private static ulong Mix(ulong z)
    {
        z = (z ^ (z >> 30)) * 0xBF58476D1CE4E5B9;
        z = (z ^ (z >> 27)) * 0x94D049BB133111EB;
        return z ^ (z >> 31);
    }
}
