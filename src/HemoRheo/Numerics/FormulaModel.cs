namespace HemoRheo;

/// <summary>A formula over its points, four points at a time, with exact slopes in as many passes of five as it has parameters.</summary>
/// <param name="formula">The formula.</param>
/// <param name="predictors">One list a predictor, point by point.</param>
internal sealed class FormulaModel<F>(F formula, params double[][] predictors) where F : struct, IModelFormula
{
    /// <summary>Values and slopes; a <see cref="PointModel"/>.</summary>
    public void Evaluate(ReadOnlySpan<double> parameters, Span<double> values, Span<double> slopes)
    {
        var x = new LaneDual[predictors.Length];
        var p = new LaneDual[parameters.Length];
        var points = values.Length;
        for (var from = 0; from < points; from += Lane.Count)
        {
            for (var j = 0; j < x.Length; j++) x[j] = new(Read(predictors[j], from));
            for (var pass = 0; pass < p.Length; pass += LaneDual.Slopes)
            {
                for (var k = 0; k < p.Length; k++) p[k] = LaneDual.Seed(new(parameters[k]), k - pass, new(1.0));
                var value = formula.Value<LaneDual>(x, p);
                for (var i = from; i < Math.Min(points, from + Lane.Count); i++)
                {
                    values[i] = value.Value[i - from];
                    for (var k = pass; k < Math.Min(p.Length, pass + LaneDual.Slopes); k++) slopes[k * points + i] = value.Slope(k - pass)[i - from];
                }
            }
        }
    }

    private static Lane Read(double[] list, int from) => new(list[from], At(list, from + 1), At(list, from + 2), At(list, from + 3));

    private static double At(double[] list, int i) => list[Math.Min(i, list.Length - 1)];
}
