using MathNet.Numerics.LinearAlgebra;
using MathNet.Numerics.LinearAlgebra.Double;
using MathNet.Numerics.Optimization;

namespace HemoRheo.Benchmarks.Speed;

/// <summary>The same fits by MathNet.Numerics' Levenberg-Marquardt: logarithmic (for r logistic) parameters, stresses and slopes written by hand over plain arrays.</summary>
/// <remarks>Stresses and slopes are divided by the standard deviations beforehand: handed over as weights they would become a full matrix, which is several times slower. Its own tolerances of 1e-15 make it run on after it has arrived; 1e-10 is where it is fastest and still ties with the lowest sum of squares.</remarks>
internal static class MathNetFits
{
    private const double Tolerance = 1e-10;

    private static readonly LevenbergMarquardtMinimizer Minimizer = new(1e-3, Tolerance, Tolerance, Tolerance, 200);

    /// <summary>Estimates of a curve on the fitting scale; not numbers where the minimizer gave up.</summary>
    public static double[] Fit(FlowLaw law, Vector<double> rates, Vector<double> standardized, double[] deviations, Vector<double> start)
    {
        try
        {
            var model = law.Name == "Casson"
                ? ObjectiveFunction.NonlinearModel((p, x) => Casson(p, x, deviations), (p, x) => CassonSlopes(p, x, deviations), rates, standardized)
                : ObjectiveFunction.NonlinearModel((p, x) => Quemada(p, x, deviations), (p, x) => QuemadaSlopes(p, x, deviations), rates, standardized);
            return ((DenseVector)Minimizer.FindMinimum(model, start).MinimizingPoint).Values;
        }
        catch (Exception thrown) when (thrown is MathNet.Numerics.NonConvergenceException or ArithmeticException or ArgumentException or InvalidOperationException)
        {
            return [.. start.Select(_ => double.NaN)];
        }
    }

    private static Vector<double> Casson(Vector<double> p, Vector<double> rates, double[] deviations)
    {
        var (root, viscosity) = (Math.Sqrt(Math.Exp(p[0])), Math.Exp(p[1]));
        var x = ((DenseVector)rates).Values;
        var answer = new double[x.Length];
        for (var i = 0; i < x.Length; i++)
        {
            var sum = root + Math.Sqrt(viscosity * x[i]);
            answer[i] = sum * sum / deviations[i];
        }

        return new DenseVector(answer);
    }

    private static Matrix<double> CassonSlopes(Vector<double> p, Vector<double> rates, double[] deviations)
    {
        var (a, viscosity) = (Math.Sqrt(Math.Exp(p[0])), Math.Exp(p[1]));
        var x = ((DenseVector)rates).Values;
        var n = x.Length;
        var answer = new double[2 * n];
        for (var i = 0; i < n; i++)
        {
            var b = Math.Sqrt(viscosity * x[i]);
            var sum = (a + b) / deviations[i];
            answer[i] = a * sum;
            answer[n + i] = b * sum;
        }

        return new DenseMatrix(n, 2, answer);
    }

    private static Vector<double> Quemada(Vector<double> p, Vector<double> rates, double[] deviations)
    {
        var (viscosity, inverse, r) = (Math.Exp(p[0]), Math.Exp(-p[1]), 1 / (1 + Math.Exp(-p[2])));
        var x = ((DenseVector)rates).Values;
        var answer = new double[x.Length];
        for (var i = 0; i < x.Length; i++)
        {
            var s = Math.Sqrt(x[i] * inverse);
            var ratio = (1 + s) / (r + s);
            answer[i] = x[i] * viscosity * ratio * ratio / deviations[i];
        }

        return new DenseVector(answer);
    }

    private static Matrix<double> QuemadaSlopes(Vector<double> p, Vector<double> rates, double[] deviations)
    {
        var (viscosity, inverse, r) = (Math.Exp(p[0]), Math.Exp(-p[1]), 1 / (1 + Math.Exp(-p[2])));
        var x = ((DenseVector)rates).Values;
        var n = x.Length;
        var answer = new double[3 * n];
        for (var i = 0; i < n; i++)
        {
            var s = Math.Sqrt(x[i] * inverse);
            var u = 1 / (r + s);
            var part = x[i] * viscosity * (1 + s) * u * u / deviations[i];
            answer[i] = part * (1 + s);
            answer[n + i] = part * (1 - r) * s * u;
            answer[2 * n + i] = -2 * r * (1 - r) * u * part * (1 + s);
        }

        return new DenseMatrix(n, 3, answer);
    }
}
