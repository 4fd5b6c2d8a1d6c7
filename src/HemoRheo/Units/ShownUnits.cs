namespace HemoRheo;

/// <summary>The units in which pages, tables and charts show quantities.</summary>
public static class ShownUnits
{
    /// <summary>mPa.s.</summary>
    public static Unit MillipascalSecond { get; } = new(Quantity.Viscosity, "mPa·s", "mPa.s", 1e-3);

    /// <summary>mPa.</summary>
    public static Unit Millipascal { get; } = new(Quantity.ShearStress, "mPa", "mPa", 1e-3);

    /// <summary>1/s.</summary>
    public static Unit PerSecond { get; } = new(Quantity.ShearRate, "1/s", "/s", 1);

    /// <summary>degC.</summary>
    public static Unit DegreeCelsius { get; } = new(Quantity.Temperature, "°C", "Cel", 1);

    /// <summary>L/L.</summary>
    public static Unit LiterPerLiter { get; } = new(Quantity.Fraction, "L/L", "L/L", 1);

    /// <summary>A plain number.</summary>
    public static Unit One { get; } = new(Quantity.Number, "1", "1", 1);
}
