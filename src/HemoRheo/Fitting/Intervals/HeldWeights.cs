namespace HemoRheo;

/// <summary>The weighted sum of squares of a curve with its weights held at the fitted stresses: its least value is the fit.</summary>
internal sealed class HeldWeights
{
    private readonly PointModel _model;
    private readonly double[] _read;

    public HeldWeights(FittedLaw fit)
    {
        double[] rates = [.. fit.Curve.Points.Select(point => point.Rate.ReciprocalSeconds)];
        _read = [.. fit.Curve.Points.Select(point => point.Stress.Pascals)];
        _model = new LawOnPoints(fit.Law, rates).Evaluate;
        (Fitted, Deviations) = (new double[_read.Length], new double[_read.Length]);
        _model(fit.Scaled.Span, Fitted, new double[fit.Scaled.Count * _read.Length]);
        for (var i = 0; i < _read.Length; i++) Deviations[i] = Math.Sqrt(fit.Errors.VarianceAt(Fitted[i]));
    }

    /// <summary>Fitted stresses, Pa.</summary>
    public double[] Fitted { get; }

    /// <summary>Standard deviations of the readings by the error model, Pa, at the fitted stresses.</summary>
    public double[] Deviations { get; }

    public int Points => _read.Length;

    /// <summary>The sum of squares.</summary>
    /// <param name="scaled">Parameters on the fitting scale.</param>
    /// <param name="residuals">Receives residuals over their standard deviations.</param>
    /// <param name="slopes">Receives slopes of the stresses over the same: slope k of point i at k * points + i.</param>
    public double At(ReadOnlySpan<double> scaled, Span<double> residuals, Span<double> slopes)
    {
        _model(scaled, residuals, slopes);
        double sum = 0;
        for (var i = 0; i < _read.Length; i++)
        {
            residuals[i] = (_read[i] - residuals[i]) / Deviations[i];
            sum += residuals[i] * residuals[i];
            for (var k = 0; k < scaled.Length; k++) slopes[k * _read.Length + i] /= Deviations[i];
        }

        return sum;
    }
}
