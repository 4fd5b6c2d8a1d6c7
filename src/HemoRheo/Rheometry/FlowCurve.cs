namespace HemoRheo;

/// <summary>A flow curve: points that are kept, points that are set aside with their reasons, and findings about the curve as a whole. Screened or not, it is one type.</summary>
/// <param name="Label">What it is of.</param>
/// <param name="Points">Kept points, by descending or ascending rate as measured.</param>
/// <param name="SetAside">Points set aside.</param>
/// <param name="StressPerTorque">Shear stress per torque of its geometry, Pa/(N.m); null where no geometry is known.</param>
/// <param name="Findings">Findings about the whole curve.</param>
public sealed record FlowCurve(CurveLabel Label, Items<FlowPoint> Points, Items<SetAside> SetAside, double? StressPerTorque, Items<Finding> Findings)
{
    /// <summary>How far its torques can be trusted; null where nobody asked, and what the study file declares then holds.</summary>
    public TorqueTrust? Torque { get; init; }

    /// <summary>A curve from numbers.</summary>
    /// <param name="perSecond">Shear rates, 1/s, above zero.</param>
    /// <param name="pascals">Shear stresses, Pa, as many as rates.</param>
    /// <param name="name">What it is of.</param>
    /// <exception cref="ArgumentException">The lists differ in length or are empty.</exception>
    public static FlowCurve Of(IReadOnlyList<double> perSecond, IReadOnlyList<double> pascals, string name = "curve")
    {
        ArgumentNullException.ThrowIfNull(perSecond);
        ArgumentNullException.ThrowIfNull(pascals);
        if (perSecond.Count != pascals.Count || perSecond.Count == 0)
        {
            throw new ArgumentException($"A curve needs as many stresses as rates, and at least one: there are {perSecond.Count} rates and {pascals.Count} stresses.", nameof(pascals));
        }

        var points = perSecond.Select((rate, i) => new FlowPoint(i + 1, new(rate), new(pascals[i]), Ramp.Unstated, null));
        return new(new(name, 1, Ramp.Unstated, null), points.ToItems(), [], null, []);
    }

    /// <summary>Mean temperature of the kept points that have one, degC; null where none has.</summary>
    public Temperature? MeanTemperature
    {
        get
        {
            var read = Points.Select(point => point.Reading?.Temperature).OfType<double>().ToArray();
            return read.Length == 0 ? null : new(read.Average());
        }
    }

    /// <summary>Lowest and highest kept rate, 1/s; null when every point is set aside.</summary>
    public Interval? KeptRates => Points.Count == 0 ? null : new(Points.Min(point => point.Rate.ReciprocalSeconds), Points.Max(point => point.Rate.ReciprocalSeconds));

    /// <summary>Torque of one of its points, N.m, as exported or from its stress; null where neither torque nor geometry is known.</summary>
    internal double? TorqueOf(FlowPoint point) => point.Reading?.Torque ?? point.Stress.Pascals / StressPerTorque;

    /// <inheritdoc/>
    public override string ToString() => $"{Label.Sample}, loading {Label.Loading}: {Points.Count} points kept, {SetAside.Count} set aside";
}
