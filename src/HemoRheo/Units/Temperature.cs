namespace HemoRheo;

/// <summary>A temperature, kept in degrees Celsius.</summary>
/// <param name="DegreesCelsius">The temperature in degC.</param>
public readonly record struct Temperature(double DegreesCelsius)
{
    /// <summary>The temperature of the body, 37 degC, to which values of blood are moved.</summary>
    public static Temperature Body { get; } = new(37);

    /// <summary>The temperature in K.</summary>
    public double Kelvins => DegreesCelsius + 273.15;

    /// <summary>A temperature from its number in degC.</summary>
    public static Temperature FromDegreesCelsius(double value) => new(value);

    /// <summary>A temperature from its number in K.</summary>
    public static Temperature FromKelvins(double value) => new(value - 273.15);

    /// <inheritdoc/>
    public override string ToString() => string.Create(System.Globalization.CultureInfo.InvariantCulture, $"{DegreesCelsius:G6} degC");
}
