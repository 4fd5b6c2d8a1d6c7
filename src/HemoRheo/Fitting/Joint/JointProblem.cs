namespace HemoRheo;

/// <summary>Curves that share unknowns: stress of curve l = exp(factor of l) x law of l (rate; its columns).</summary>
/// <param name="curves">The curves.</param>
/// <param name="columns">The unknowns: those of the laws, then the factors.</param>
/// <param name="firstFactor">Number of the first column of a factor; the number of columns where there are none.</param>
internal sealed class JointProblem(JointCurve[] curves, JointColumn[] columns, int firstFactor)
{
    /// <summary>The curves.</summary>
    public JointCurve[] Curves => curves;

    /// <summary>The unknowns.</summary>
    public JointColumn[] Columns => columns;

    /// <summary>Number of the first column of a factor.</summary>
    public int FirstFactor => firstFactor;

    /// <summary>How many points.</summary>
    public int Points { get; } = curves.Sum(curve => curve.Points);

    /// <summary>Measured stresses, curve after curve, Pa.</summary>
    public double[] Stresses { get; } = [.. curves.SelectMany(curve => curve.Data.Stresses)];

    /// <summary>Stresses and slopes to every column; a <see cref="PointModel"/>.</summary>
    public void Evaluate(ReadOnlySpan<double> scaled, Span<double> stresses, Span<double> slopes)
    {
        slopes.Clear();
        var from = 0;
        foreach (var curve in curves)
        {
            var (points, places, contrast) = (curve.Points, curve.Places, curve.Contrast);
            var (own, values, ownSlopes) = (new double[places.Length], new double[points], new double[points * places.Length]);
            for (var k = 0; k < own.Length; k++) own[k] = scaled[places[k]];
            curve.Evaluate(own, values, ownSlopes);
            var logFactor = 0.0;
            for (var c = 0; c < contrast.Length; c++) logFactor += contrast[c] * scaled[firstFactor + c];
            var factor = Math.Exp(logFactor);
            for (var i = 0; i < points; i++)
            {
                stresses[from + i] = factor * values[i];
                for (var k = 0; k < own.Length; k++) slopes[places[k] * Points + from + i] = factor * ownSlopes[k * points + i];
                for (var c = 0; c < contrast.Length; c++) slopes[(firstFactor + c) * Points + from + i] = contrast[c] * factor * values[i];
            }

            from += points;
        }
    }

    /// <summary>Standard deviations of the readings where the law says these stresses, Pa.</summary>
    public double[] Deviations(ReadOnlySpan<double> stresses)
    {
        var deviations = new double[stresses.Length];
        var from = 0;
        foreach (var curve in curves)
        {
            for (var i = 0; i < curve.Points; i++) deviations[from + i] = Math.Sqrt(curve.Data.VarianceOf(i, stresses[from + i]));
            from += curve.Points;
        }

        return deviations;
    }
}
