using MathNet.Numerics.Distributions;

namespace HemoRheo;

/// <summary>What the torques of an empty gap say: zero, noise, whether they depend on speed, drift.</summary>
/// <param name="torques">Two or more torques.</param>
/// <param name="resolution">Step in which the instrument gives torques, N.m; 0 where not known.</param>
internal sealed class BlankStatistics(IReadOnlyList<BlankTorque> torques, double resolution)
{
    /// <summary>Probability below which a dependence or drift is taken as real.</summary>
    internal const double Significance = 0.01;

    private const double SameSpeed = 0.01;

    private readonly BlankTorque[][] _speeds = Groups(torques);

    /// <summary>The torques by speed, ascending; speeds within 1 % are one.</summary>
    public IReadOnlyList<BlankTorque[]> Speeds => _speeds;

    public double Zero { get; } = torques.Average(torque => torque.NewtonMeters);

    /// <summary>Variance within speeds and its degrees of freedom.</summary>
    public (double Variance, int Degrees) Within => Pooled(_speeds);

    /// <summary>Variance that a step of the display hides.</summary>
    public double StepVariance => resolution * resolution / 12;

    public bool ZeroBySpeed => ZeroProbability < Significance;

    public bool NoiseBySpeed => NoiseProbability < Significance;

    /// <summary>Probability of means by speed that differ this much, were the zero the same at all (analysis of variance).</summary>
    internal double ZeroProbability
    {
        get
        {
            var (within, degrees) = Within;
            if (_speeds.Length < 2 || degrees < 1) return 1;
            var between = _speeds.Sum(speed => speed.Length * Square(Mean(speed) - Zero)) / (_speeds.Length - 1);
            var noise = Math.Max(within, StepVariance);
            if (between == 0) return 1;
            return noise == 0 ? 0 : 1 - FisherSnedecor.CDF(_speeds.Length - 1, degrees, between / noise);
        }
    }

    /// <summary>Probability of scatters by speed that differ this much, were the noise the same at all (Bartlett 1937). Speeds of three or more readings are asked.</summary>
    internal double NoiseProbability
    {
        get
        {
            var read = _speeds.Where(speed => speed.Length > 2).ToArray();
            if (read.Length < 2) return 1;
            var variances = read.Select(speed => Math.Max(Pooled([speed]).Variance, StepVariance)).ToArray();
            if (variances.Any(variance => variance == 0)) return 1;
            var degrees = read.Select(speed => speed.Length - 1.0).ToArray();
            var all = degrees.Sum();
            var pooled = degrees.Zip(variances, (df, variance) => df * variance).Sum() / all;
            var scale = 1 + (degrees.Sum(df => 1 / df) - 1 / all) / (3 * (read.Length - 1));
            var statistic = (all * Math.Log(pooled) - degrees.Zip(variances, (df, variance) => df * Math.Log(variance)).Sum()) / scale;
            return statistic > 0 ? 1 - ChiSquared.CDF(read.Length - 1, statistic) : 1;
        }
    }

    /// <summary>Change over the run by a line in time common to the groups whose means are taken apart; 0 where it is not significant.</summary>
    public double Drift(bool bySpeed)
    {
        var groups = bySpeed ? _speeds : [.. new[] { torques.ToArray() }];
        var degrees = torques.Count - groups.Length - 1;
        var (xx, xy, yy) = (0.0, 0.0, 0.0);
        foreach (var group in groups)
        {
            var (time, mean) = (group.Average(torque => torque.Time), Mean(group));
            xx += group.Sum(torque => Square(torque.Time - time));
            xy += group.Sum(torque => (torque.Time - time) * (torque.NewtonMeters - mean));
            yy += group.Sum(torque => Square(torque.NewtonMeters - mean));
        }

        if (degrees < 1 || xx == 0) return 0;
        var slope = xy / xx;
        var noise = Math.Max((yy - slope * xy) / degrees, StepVariance) / xx;
        var line = new Value(Math.Abs(slope), [new(new(SourceKind.TorqueZero, ""), Math.Sqrt(noise), "", degrees)]);
        return 2 * line.ProbabilityBelow(0) < Significance ? slope * (torques.Max(torque => torque.Time) - torques.Min(torque => torque.Time)) : 0;
    }

    internal static double Mean(BlankTorque[] group) => group.Average(torque => torque.NewtonMeters);

    internal static (double Variance, int Degrees) Pooled(IReadOnlyList<BlankTorque[]> groups)
    {
        var degrees = groups.Sum(group => group.Length - 1);
        return (degrees == 0 ? 0 : groups.Sum(group => group.Sum(torque => Square(torque.NewtonMeters - Mean(group)))) / degrees, degrees);
    }

    private static BlankTorque[][] Groups(IReadOnlyList<BlankTorque> torques)
    {
        var groups = new List<List<BlankTorque>>();
        foreach (var torque in torques.OrderBy(torque => torque.Speed))
        {
            if (groups.Count > 0 && torque.Speed - groups[^1][0].Speed <= SameSpeed * Math.Abs(torque.Speed)) groups[^1].Add(torque);
            else groups.Add([torque]);
        }

        return [.. groups.Select(group => group.ToArray())];
    }

    private static double Square(double x) => x * x;
}
