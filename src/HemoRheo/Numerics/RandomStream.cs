using System.Numerics;

namespace HemoRheo;

/// <summary>A stream of random numbers that depends on its key alone: study seed, sample, replicate. Its bits never change.</summary>
/// <remarks>Sources: Blackman and Vigna 2021, ACM Transactions on Mathematical Software 47:36 (xoshiro256**); Steele, Lea and Flood 2014, OOPSLA (SplitMix64, for the seed); Marsaglia and Bray 1964, SIAM Review 6:260 (normal numbers).</remarks>
internal sealed class RandomStream
{
    private const ulong Golden = 0x9E3779B97F4A7C15;

    private ulong _s0;
    private ulong _s1;
    private ulong _s2;
    private ulong _s3;
    private double? _spare;

    public RandomStream(ulong s0, ulong s1, ulong s2, ulong s3) => (_s0, _s1, _s2, _s3) = (s0, s1, s2, s3);

    /// <summary>The stream of one replicate of one sample of one study.</summary>
    public static RandomStream Of(long seed, string sample, int replicate)
    {
        var key = Mix((ulong)seed + Golden);
        foreach (var letter in sample) key = Mix((key ^ letter) + Golden);
        key = Mix((key ^ 0x10000UL) + (ulong)replicate * Golden);
        return new(SplitMix(ref key), SplitMix(ref key), SplitMix(ref key), SplitMix(ref key));
    }

    /// <summary>The next 64 bits.</summary>
    public ulong Next()
    {
        var answer = BitOperations.RotateLeft(_s1 * 5, 7) * 9;
        var t = _s1 << 17;
        _s2 ^= _s0;
        _s3 ^= _s1;
        _s1 ^= _s2;
        _s0 ^= _s3;
        _s2 ^= t;
        _s3 = BitOperations.RotateLeft(_s3, 45);
        return answer;
    }

    /// <summary>A number between 0 and 1, both excluded.</summary>
    public double Uniform() => ((Next() >> 12) + 0.5) * (1.0 / (1UL << 52));

    /// <summary>A standard normal number.</summary>
    public double Normal()
    {
        if (_spare is { } kept)
        {
            _spare = null;
            return kept;
        }

        while (true)
        {
            var (u, v) = (2 * Uniform() - 1, 2 * Uniform() - 1);
            var s = u * u + v * v;
            if (s >= 1 || s == 0) continue;
            var factor = Math.Sqrt(-2 * Math.Log(s) / s);
            _spare = v * factor;
            return u * factor;
        }
    }

    /// <summary>The next number of SplitMix64.</summary>
    internal static ulong SplitMix(ref ulong state) => Mix(state += Golden);

    private static ulong Mix(ulong z)
    {
        z = (z ^ z >> 30) * 0xBF58476D1CE4E5B9;
        z = (z ^ z >> 27) * 0x94D049BB133111EB;
        return z ^ z >> 31;
    }
}
