namespace HemoRheo;

/// <summary>A density that is a straight line in temperature.</summary>
/// <param name="AtZero">Where the line meets 0 degC, kg/m3.</param>
/// <param name="PerKelvin">Its slope, kg/(m3 K).</param>
internal sealed record DensityLine(double AtZero, double PerKelvin)
{
    /// <summary>The line through the rows that state a density; flat where one does; null where none does.</summary>
    public static DensityLine? Of(Certificate certificate)
    {
        var rows = certificate.Rows.Where(row => row.Density is not null).ToArray();
        if (rows.Length == 0) return null;
        var (t, d) = (rows.Average(row => row.At.DegreesCelsius), rows.Average(row => row.Density!.Value));
        var spread = rows.Sum(row => (row.At.DegreesCelsius - t) * (row.At.DegreesCelsius - t));
        var slope = spread > 0 ? rows.Sum(row => (row.At.DegreesCelsius - t) * (row.Density!.Value - d)) / spread : 0;
        return new(d - slope * t, slope);
    }

    /// <summary>Density at a temperature in K, kg/m3.</summary>
    public double At(double kelvins) => AtZero + PerKelvin * (kelvins - 273.15);
}
