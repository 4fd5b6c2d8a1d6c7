namespace HemoRheo;

/// <summary>The kept points of a curve as numbers, or why they cannot be fitted.</summary>
/// <param name="rates">Shear rates, 1/s.</param>
/// <param name="stresses">Shear stresses, Pa.</param>
/// <param name="errors">Their error model.</param>
/// <param name="fault">Why they cannot be fitted; null where they can.</param>
internal sealed class CurveData(double[] rates, double[] stresses, ErrorModel errors, Finding? fault = null)
{
    private const double SameRate = 1e-6;

    /// <summary>Shear rates, 1/s.</summary>
    public double[] Rates { get; } = rates;

    /// <summary>Shear stresses, Pa.</summary>
    public double[] Stresses { get; } = stresses;

    /// <summary>The error model: one curve's geometry may set a floor of its own.</summary>
    public ErrorModel Errors { get; } = errors;

    /// <summary>Standard deviation of each point, Pa, where weights are fixed beforehand; null where they follow from the fitted stress.</summary>
    public double[]? Deviations { get; init; }

    /// <summary>Why they cannot be fitted; null where they can.</summary>
    public Finding? Fault { get; } = fault;

    /// <summary>Lowest stress, Pa.</summary>
    public double LowestStress { get; } = stresses.Length == 0 ? 0 : stresses.Min();

    /// <summary>Variance of a point, Pa^2, where the law says a stress.</summary>
    public double VarianceOf(int point, double stress)
    {
        if (Deviations is { } given) return given[point] * given[point];
        var (relative, floor) = (Errors.Relative * stress, Errors.Floor.Pascals);
        return relative * relative + floor * floor;
    }

    public static CurveData Of(FlowCurve curve, FlowLaw law, ErrorModel errors)
    {
        var rates = curve.Points.Select(point => point.Rate.ReciprocalSeconds).ToArray();
        var stresses = curve.Points.Select(point => point.Stress.Pascals).ToArray();
        return new(rates, stresses, errors, FindFault(curve, law, rates, stresses));
    }

    private static Finding? FindFault(FlowCurve curve, FlowLaw law, double[] rates, double[] stresses)
    {
        for (var i = 0; i < rates.Length; i++)
        {
            if (rates[i] > 0 && double.IsFinite(rates[i]) && stresses[i] > 0 && double.IsFinite(stresses[i])) continue;
            var point = curve.Points[i];
            return FittingFindings.NotPositive.At(curve.Label.Where with { Point = point.Number }, $"Point {point.Number}: rate {point.Rate}, stress {point.Stress}; both must be finite and above zero.");
        }

        var different = Different(rates);
        var needed = law.Parameters.Count;
        return different >= needed ? null : FittingFindings.TooFewPoints.At(
            curve.Label.Where,
            $"{rates.Length} points at {different} different rates; {law.Name} has {needed} parameters.",
            different,
            needed);
    }

    private static int Different(double[] rates)
    {
        var count = 0;
        double last = 0;
        foreach (var rate in rates.Order())
        {
            if (rate <= last * (1 + SameRate)) continue;
            count++;
            last = rate;
        }

        return count;
    }
}
