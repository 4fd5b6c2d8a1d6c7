namespace HemoRheo;

/// <summary>A law over one curve for the general path: four points at a time.</summary>
/// <param name="law">The law.</param>
/// <param name="rates">Shear rates, 1/s.</param>
internal sealed class LawOnPoints(FlowLaw law, double[] rates)
{
    /// <summary>Stresses and slopes with respect to the scaled parameters; a <see cref="PointModel"/>.</summary>
    public void Evaluate(ReadOnlySpan<double> scaled, Span<double> stresses, Span<double> slopes)
    {
        var groups = (rates.Length + Lane.Count - 1) / Lane.Count;
        var (x, at, values, lanes) = (new Lane[groups], new Lane[scaled.Length], new Lane[groups], new Lane[groups * scaled.Length]);
        for (var g = 0; g < groups; g++) x[g] = new(Rate(g, 0), Rate(g, 1), Rate(g, 2), Rate(g, 3));
        for (var k = 0; k < at.Length; k++) at[k] = new(scaled[k]);
        law.StressesAndSlopes(x, at, values, lanes);
        for (var i = 0; i < rates.Length; i++)
        {
            var (group, lane) = (i / Lane.Count, i % Lane.Count);
            stresses[i] = values[group][lane];
            for (var k = 0; k < at.Length; k++) slopes[k * rates.Length + i] = lanes[k * groups + group][lane];
        }
    }

    private double Rate(int group, int lane) => rates[Math.Min(group * Lane.Count + lane, rates.Length - 1)];
}
