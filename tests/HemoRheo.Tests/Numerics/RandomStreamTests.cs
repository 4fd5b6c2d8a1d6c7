namespace HemoRheo.Tests.Numerics;

/// <summary>The stream's bits never change, and a stream depends on its key alone.</summary>
public class RandomStreamTests
{
    /// <summary>First outputs for the state 1, 2, 3, 4, as the tests of the Rust crate rand_xoshiro list them (from the authors' C program).</summary>
    [Fact]
    public void The_generator_gives_the_numbers_of_its_authors()
    {
        var stream = new RandomStream(1, 2, 3, 4);
        ulong[] expected = [11520, 0, 1509978240, 1215971899390074240, 1216172134540287360, 607988272756665600];
        Assert.Equal(expected, expected.Select(_ => stream.Next()));
    }

    /// <summary>First outputs for the seed 1234567, as Rosetta Code lists them (pseudo-random numbers, SplitMix64).</summary>
    [Fact]
    public void The_seeding_gives_the_numbers_of_its_authors()
    {
        ulong state = 1234567;
        ulong[] expected = [6457827717110365317, 3203168211198807973, 9817491932198370423, 4593380528125082431, 16408922859458223821];
        Assert.Equal(expected, expected.Select(_ => RandomStream.SplitMix(ref state)));
    }

    [Fact]
    public void Every_part_of_the_key_matters_and_nothing_else()
    {
        static ulong First(long seed, string sample, int replicate) => RandomStream.Of(seed, sample, replicate).Next();
        Assert.Equal(First(7, "S-01", 2), First(7, "S-01", 2));
        ulong[] different = [First(7, "S-01", 2), First(8, "S-01", 2), First(7, "S-02", 2), First(7, "S-01", 3), First(7, "S-0", 12), First(-7, "S-01", 2), First(7, "", 2)];
        Assert.Equal(different.Length, different.Distinct().Count());
    }

    /// <summary>Limits are five standard errors of the exact moments: 1/2 and 1/12; 0, 1, 0 and 3.</summary>
    [Fact]
    public void Numbers_have_the_moments_of_their_distributions()
    {
        const int count = 200_000;
        var stream = RandomStream.Of(20261201, "moments", 1);
        double[] uniform = [.. Enumerable.Range(0, count).Select(_ => stream.Uniform())];
        double[] normal = [.. Enumerable.Range(0, count).Select(_ => stream.Normal())];
        Assert.Equal(0.5, uniform.Average(), 5 * Math.Sqrt(1.0 / 12 / count));
        Assert.Equal(1.0 / 12, uniform.Average(u => (u - 0.5) * (u - 0.5)), 5 * Math.Sqrt(1.0 / 180 / count));
        Assert.All(uniform, u => Assert.True(u is > 0 and < 1));
        Assert.Equal(0, normal.Average(), 5 * Math.Sqrt(1.0 / count));
        Assert.Equal(1, normal.Average(z => z * z), 5 * Math.Sqrt(2.0 / count));
        Assert.Equal(0, normal.Average(z => z * z * z), 5 * Math.Sqrt(15.0 / count));
        Assert.Equal(3, normal.Average(z => z * z * z * z), 5 * Math.Sqrt(96.0 / count));
    }
}
