namespace HemoRheo;

/// <summary>Applies the rules of the chart to one standardized check after the other. Nothing is forgotten after a signal.</summary>
internal sealed class ChartWatch
{
    private double _before;
    private double _beforeThat;
    private int _checks;

    /// <summary>The weighted average after the last check, in standard deviations of one check from the center.</summary>
    internal double Average { get; private set; }

    /// <summary>Its limit.</summary>
    internal double AverageReach => WeightedAverage.Reach(_checks, ControlChart.Weight, ControlChart.WeightedWidth);

    /// <summary>Which rules the next check breaks.</summary>
    /// <param name="z">The check in standard deviations from the center.</param>
    internal ChartSigns Next(double z)
    {
        _checks++;
        Average = WeightedAverage.Next(Average, z, ControlChart.Weight);
        var twoOfThree = Both(z, _before) || Both(z, _beforeThat);
        (_before, _beforeThat) = (z, _before);
        return new(Math.Abs(z) > ControlChart.Width, twoOfThree, Math.Abs(Average) > AverageReach);
    }

    private static bool Both(double a, double b) => Math.Min(a, b) > ControlChart.WarningWidth || Math.Max(a, b) < -ControlChart.WarningWidth;
}
