namespace HemoRheo.Tests.Numerics;

/// <summary>The models of the certified problems, as their files state them.</summary>
internal static class CertifiedFormulas
{
    public static PointModel Of(string name, double[] x) => name switch
    {
        "Misra1a" or "BoxBOD" => new FormulaModel<Saturation>(default, x).Evaluate,
        "Thurber" => new FormulaModel<CubicOverCubic>(default, x).Evaluate,
        "MGH09" => new FormulaModel<LinearOverQuadratic>(default, x).Evaluate,
        "Rat43" => new FormulaModel<Richards>(default, x).Evaluate,
        _ => throw new ArgumentException($"No formula for {name}.", nameof(name)),
    };

    private readonly struct Saturation : IModelFormula
    {
        public T Value<T>(ReadOnlySpan<T> x, ReadOnlySpan<T> p) where T : struct, ILawNumber<T> => p[0] * (1 - T.Exp(-p[1] * x[0]));
    }

    private readonly struct CubicOverCubic : IModelFormula
    {
        public T Value<T>(ReadOnlySpan<T> x, ReadOnlySpan<T> p) where T : struct, ILawNumber<T> =>
            (p[0] + x[0] * (p[1] + x[0] * (p[2] + x[0] * p[3]))) / (1 + x[0] * (p[4] + x[0] * (p[5] + x[0] * p[6])));
    }

    private readonly struct LinearOverQuadratic : IModelFormula
    {
        public T Value<T>(ReadOnlySpan<T> x, ReadOnlySpan<T> p) where T : struct, ILawNumber<T> =>
            p[0] * (T.Square(x[0]) + x[0] * p[1]) / (T.Square(x[0]) + x[0] * p[2] + p[3]);
    }

    private readonly struct Richards : IModelFormula
    {
        public T Value<T>(ReadOnlySpan<T> x, ReadOnlySpan<T> p) where T : struct, ILawNumber<T> =>
            p[0] / T.Pow(1 + T.Exp(p[1] - p[2] * x[0]), 1 / p[3]);
    }
}
