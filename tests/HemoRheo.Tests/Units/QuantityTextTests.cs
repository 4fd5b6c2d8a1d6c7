namespace HemoRheo.Tests.Units;

public sealed class QuantityTextTests
{
    [Theory]
    [InlineData("12.5 mm", Quantity.Length, 0.0125)]
    [InlineData("0.5 µN.m", Quantity.Torque, 5e-7)]
    [InlineData("0.5 μN·m", Quantity.Torque, 5e-7)]
    [InlineData("37 °C", Quantity.Temperature, 37)]
    [InlineData("310.15 K", Quantity.Temperature, 37)]
    [InlineData("8 d", Quantity.Time, 691200)]
    [InlineData("2%", Quantity.Fraction, 0.02)]
    [InlineData("2.2 %/K", Quantity.PerKelvin, 0.022)]
    [InlineData("1 1/s", Quantity.ShearRate, 1)]
    [InlineData("1e-3 Pa", Quantity.ShearStress, 1e-3)]
    [InlineData("−5 °C", Quantity.Temperature, -5)]
    public void Reads_number_and_unit(string text, Quantity quantity, double si) => Assert.Equal(si, QuantityText.Read(text, quantity), 1e-12 * Math.Abs(si));

    [Theory]
    [InlineData("12,5 mm", Quantity.Length, "decimal comma")]
    [InlineData("12.5", Quantity.Length, "no unit")]
    [InlineData("mm", Quantity.Length, "number")]
    [InlineData("", Quantity.Length, "number")]
    [InlineData("5 MPa.s", Quantity.Viscosity, "mPa.s")]
    [InlineData("5 mm", Quantity.Viscosity, "mm")]
    [InlineData("1e999 mm", Quantity.Length, "number")]
    [InlineData("1.2.3 mm", Quantity.Length, "number")]
    public void Refuses_by_name(string text, Quantity quantity, string says) => Assert.Contains(says, Assert.Throws<FormatException>(() => QuantityText.Read(text, quantity)).Message, StringComparison.Ordinal);
}
