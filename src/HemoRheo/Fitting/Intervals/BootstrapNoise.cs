namespace HemoRheo;

/// <summary>Redraws the stresses of a curve around its fit.</summary>
/// <param name="fitted">Fitted stresses, Pa.</param>
/// <param name="deviations">Standard deviations of the readings, Pa.</param>
/// <param name="correlations">Correlation of each reading with the one before it.</param>
/// <param name="errors">Standardized errors to draw from with replacement; null for normal ones.</param>
internal sealed class BootstrapNoise(double[] fitted, double[] deviations, double[] correlations, double[]? errors)
{
    /// <summary>A point that rules its own fitted value has no residual to speak of.</summary>
    private const double LeastFreedom = 1e-8;

    public static BootstrapNoise Of(FittedLaw fit, IntervalMethod method)
    {
        var held = new HeldWeights(fit);
        var scale = Math.Sqrt(RiseUnit.Scale(fit));
        double[] correlations = [.. fit.Curve.Points.Select((point, i) => i == 0 ? 0 : Math.Pow(fit.Correlation, Math.Abs(point.Number - fit.Curve.Points[i - 1].Number)))];
        return method == IntervalMethod.ResidualBootstrap
            ? new(held.Fitted, held.Deviations, correlations, Errors(fit, held, scale))
            : new(held.Fitted, [.. held.Deviations.Select(deviation => deviation * scale)], correlations, null);
    }

    public void Draw(RandomStream stream, Span<double> stresses)
    {
        double last = 0;
        for (var i = 0; i < fitted.Length; i++)
        {
            last = errors is null ? correlations[i] * last + Math.Sqrt(1 - correlations[i] * correlations[i]) * stream.Normal() : errors[(int)(stream.Uniform() * errors.Length)];
            stresses[i] = fitted[i] + deviations[i] * last;
        }
    }

    /// <summary>Standardized residuals over the root of 1 - leverage, centered.</summary>
    private static double[] Errors(FittedLaw fit, HeldWeights held, double scale)
    {
        var size = fit.Scaled.Count;
        var (residuals, slopes) = (new double[held.Points], new double[held.Points * size]);
        held.At(fit.Scaled.Span, residuals, slopes);
        for (var i = 0; i < residuals.Length; i++)
        {
            double leverage = 0;
            for (var j = 0; j < size; j++)
            {
                for (var k = 0; k < size; k++) leverage += slopes[j * held.Points + i] * fit.Covariance[j * size + k] * slopes[k * held.Points + i] / (scale * scale);
            }

            residuals[i] = leverage < 1 - LeastFreedom ? residuals[i] / Math.Sqrt(1 - leverage) : 0;
        }

        var mean = residuals.Average();
        return [.. residuals.Select(residual => residual - mean)];
    }
}
