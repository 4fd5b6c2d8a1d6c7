namespace HemoRheo.Tests.Numerics;

/// <summary>The models of the certified problems, as their files state them.</summary>
internal static class CertifiedFormulas
{
    /// <summary>Solves a problem through the public entry with its defaults.</summary>
    public static LeastSquaresSolution Fit(CertifiedProblem problem, IEnumerable<double> start) => problem.Name switch
    {
        "Misra1a" or "BoxBOD" => Fit<Saturation>(problem, start),
        "Misra1b" => Fit<InverseSquare>(problem, start),
        "Misra1c" => Fit<InverseRoot>(problem, start),
        "Misra1d" => Fit<Hyperbola>(problem, start),
        "Chwirut1" or "Chwirut2" => Fit<DecayOverLine>(problem, start),
        "Lanczos1" or "Lanczos2" or "Lanczos3" => Fit<ThreeDecays>(problem, start),
        "Gauss1" or "Gauss2" or "Gauss3" => Fit<DecayAndTwoPeaks>(problem, start),
        "DanWood" => Fit<Power>(problem, start),
        "Kirby2" => Fit<QuadraticOverQuadratic>(problem, start),
        "Hahn1" or "Thurber" => Fit<CubicOverCubic>(problem, start),
        "Nelson" => Fit<TwoPredictors>(problem, start),
        "MGH17" => Fit<LevelAndTwoDecays>(problem, start),
        "Roszman1" => Fit<ArcTangent>(problem, start),
        "ENSO" => Fit<ThreeCycles>(problem, start),
        "MGH09" => Fit<LinearOverQuadratic>(problem, start),
        "Rat42" => Fit<Logistic>(problem, start),
        "Rat43" => Fit<Richards>(problem, start),
        "MGH10" => Fit<ExponentialOfInverse>(problem, start),
        "Eckerle4" => Fit<Peak>(problem, start),
        "Bennett5" => Fit<ShiftedPower>(problem, start),
        _ => throw new ArgumentException($"No formula for {problem.Name}.", nameof(problem)),
    };

    private static LeastSquaresSolution Fit<F>(CertifiedProblem problem, IEnumerable<double> start) where F : struct, IModelFormula =>
        LeastSquares.Fit(default(F), problem.Y, [.. start], problem.Predictors);

    private readonly struct Saturation : IModelFormula
    {
        public T Value<T>(ReadOnlySpan<T> x, ReadOnlySpan<T> p) where T : struct, ILawNumber<T> => p[0] * (1 - T.Exp(-p[1] * x[0]));
    }

    private readonly struct InverseSquare : IModelFormula
    {
        public T Value<T>(ReadOnlySpan<T> x, ReadOnlySpan<T> p) where T : struct, ILawNumber<T> => p[0] * (1 - 1 / T.Square(1 + p[1] * x[0] / 2));
    }

    private readonly struct InverseRoot : IModelFormula
    {
        public T Value<T>(ReadOnlySpan<T> x, ReadOnlySpan<T> p) where T : struct, ILawNumber<T> => p[0] * (1 - 1 / T.Sqrt(1 + 2 * p[1] * x[0]));
    }

    private readonly struct Hyperbola : IModelFormula
    {
        public T Value<T>(ReadOnlySpan<T> x, ReadOnlySpan<T> p) where T : struct, ILawNumber<T> => p[0] * p[1] * x[0] / (1 + p[1] * x[0]);
    }

    private readonly struct DecayOverLine : IModelFormula
    {
        public T Value<T>(ReadOnlySpan<T> x, ReadOnlySpan<T> p) where T : struct, ILawNumber<T> => T.Exp(-p[0] * x[0]) / (p[1] + p[2] * x[0]);
    }

    private readonly struct ThreeDecays : IModelFormula
    {
        public T Value<T>(ReadOnlySpan<T> x, ReadOnlySpan<T> p) where T : struct, ILawNumber<T> =>
            p[0] * T.Exp(-p[1] * x[0]) + p[2] * T.Exp(-p[3] * x[0]) + p[4] * T.Exp(-p[5] * x[0]);
    }

    private readonly struct DecayAndTwoPeaks : IModelFormula
    {
        public T Value<T>(ReadOnlySpan<T> x, ReadOnlySpan<T> p) where T : struct, ILawNumber<T> =>
            p[0] * T.Exp(-p[1] * x[0]) + p[2] * T.Exp(-T.Square((x[0] - p[3]) / p[4])) + p[5] * T.Exp(-T.Square((x[0] - p[6]) / p[7]));
    }

    private readonly struct Power : IModelFormula
    {
        public T Value<T>(ReadOnlySpan<T> x, ReadOnlySpan<T> p) where T : struct, ILawNumber<T> => p[0] * T.Pow(x[0], p[1]);
    }

    private readonly struct QuadraticOverQuadratic : IModelFormula
    {
        public T Value<T>(ReadOnlySpan<T> x, ReadOnlySpan<T> p) where T : struct, ILawNumber<T> =>
            (p[0] + x[0] * (p[1] + x[0] * p[2])) / (1 + x[0] * (p[3] + x[0] * p[4]));
    }

    private readonly struct CubicOverCubic : IModelFormula
    {
        public T Value<T>(ReadOnlySpan<T> x, ReadOnlySpan<T> p) where T : struct, ILawNumber<T> =>
            (p[0] + x[0] * (p[1] + x[0] * (p[2] + x[0] * p[3]))) / (1 + x[0] * (p[4] + x[0] * (p[5] + x[0] * p[6])));
    }

    private readonly struct TwoPredictors : IModelFormula
    {
        public T Value<T>(ReadOnlySpan<T> x, ReadOnlySpan<T> p) where T : struct, ILawNumber<T> => p[0] - p[1] * x[0] * T.Exp(-p[2] * x[1]);
    }

    private readonly struct LevelAndTwoDecays : IModelFormula
    {
        public T Value<T>(ReadOnlySpan<T> x, ReadOnlySpan<T> p) where T : struct, ILawNumber<T> => p[0] + p[1] * T.Exp(-x[0] * p[3]) + p[2] * T.Exp(-x[0] * p[4]);
    }

    private readonly struct ArcTangent : IModelFormula
    {
        public T Value<T>(ReadOnlySpan<T> x, ReadOnlySpan<T> p) where T : struct, ILawNumber<T> => p[0] - p[1] * x[0] - T.Atan(p[2] / (x[0] - p[3])) / Math.PI;
    }

    private readonly struct ThreeCycles : IModelFormula
    {
        public T Value<T>(ReadOnlySpan<T> x, ReadOnlySpan<T> p) where T : struct, ILawNumber<T>
        {
            var turn = 2 * Math.PI * x[0];
            return p[0] + p[1] * T.Cos(turn / 12) + p[2] * T.Sin(turn / 12)
                + p[4] * T.Cos(turn / p[3]) + p[5] * T.Sin(turn / p[3])
                + p[7] * T.Cos(turn / p[6]) + p[8] * T.Sin(turn / p[6]);
        }
    }

    private readonly struct LinearOverQuadratic : IModelFormula
    {
        public T Value<T>(ReadOnlySpan<T> x, ReadOnlySpan<T> p) where T : struct, ILawNumber<T> =>
            p[0] * (T.Square(x[0]) + x[0] * p[1]) / (T.Square(x[0]) + x[0] * p[2] + p[3]);
    }

    private readonly struct Logistic : IModelFormula
    {
        public T Value<T>(ReadOnlySpan<T> x, ReadOnlySpan<T> p) where T : struct, ILawNumber<T> => p[0] / (1 + T.Exp(p[1] - p[2] * x[0]));
    }

    private readonly struct Richards : IModelFormula
    {
        public T Value<T>(ReadOnlySpan<T> x, ReadOnlySpan<T> p) where T : struct, ILawNumber<T> =>
            p[0] / T.Pow(1 + T.Exp(p[1] - p[2] * x[0]), 1 / p[3]);
    }

    private readonly struct ExponentialOfInverse : IModelFormula
    {
        public T Value<T>(ReadOnlySpan<T> x, ReadOnlySpan<T> p) where T : struct, ILawNumber<T> => p[0] * T.Exp(p[1] / (x[0] + p[2]));
    }

    private readonly struct Peak : IModelFormula
    {
        public T Value<T>(ReadOnlySpan<T> x, ReadOnlySpan<T> p) where T : struct, ILawNumber<T> => p[0] / p[1] * T.Exp(-0.5 * T.Square((x[0] - p[2]) / p[1]));
    }

    private readonly struct ShiftedPower : IModelFormula
    {
        public T Value<T>(ReadOnlySpan<T> x, ReadOnlySpan<T> p) where T : struct, ILawNumber<T> => p[0] * T.Pow(p[1] + x[0], -1 / p[2]);
    }
}
