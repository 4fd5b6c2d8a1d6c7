namespace HemoRheo;

/// <summary>The kept points of a curve as numbers, or why they cannot be fitted.</summary>
/// <param name="rates">Shear rates, 1/s.</param>
/// <param name="stresses">Shear stresses, Pa.</param>
/// <param name="fault">Why they cannot be fitted; null where they can.</param>
internal sealed class CurveData(double[] rates, double[] stresses, Finding? fault)
{
    private const double SameRate = 1e-6;

    /// <summary>Shear rates, 1/s.</summary>
    public double[] Rates { get; } = rates;

    /// <summary>Shear stresses, Pa.</summary>
    public double[] Stresses { get; } = stresses;

    /// <summary>Why they cannot be fitted; null where they can.</summary>
    public Finding? Fault { get; } = fault;

    /// <summary>Lowest stress, Pa.</summary>
    public double LowestStress { get; } = stresses.Length == 0 ? 0 : stresses.Min();

    public static CurveData Of(FlowCurve curve, FlowLaw law)
    {
        var rates = curve.Points.Select(point => point.Rate.ReciprocalSeconds).ToArray();
        var stresses = curve.Points.Select(point => point.Stress.Pascals).ToArray();
        return new(rates, stresses, FindFault(curve, law, rates, stresses));
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
