namespace HemoRheo;

/// <summary>Numbers read as quantities in a notebook cell: <c>100.PerSecond()</c>, <c>37.0.DegreesCelsius()</c>.</summary>
public static class QuantityWords
{
    /// <summary>A shear rate of this many 1/s.</summary>
    public static ShearRate PerSecond(this int value) => new(value);

    /// <summary>A shear rate of this many 1/s.</summary>
    public static ShearRate PerSecond(this double value) => new(value);

    /// <summary>A temperature of this many degC.</summary>
    public static Temperature DegreesCelsius(this double value) => new(value);

    /// <summary>A viscosity of this many mPa.s.</summary>
    public static Viscosity MillipascalSeconds(this double value) => Viscosity.FromMillipascalSeconds(value);
}
