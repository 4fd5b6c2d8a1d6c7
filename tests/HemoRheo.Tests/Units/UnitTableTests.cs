using System.Globalization;
using UnitsNet;
using UnitsNet.Units;

namespace HemoRheo.Tests.Units;

/// <summary>Every spelling against the literals of ReferenceData/units (SI brochure), and against UnitsNet's factors where it has the unit.</summary>
public sealed class UnitTableTests
{
    private static readonly string[][] Rows = [.. File.ReadLines(Repository.Reference("units", "units.csv")).Skip(1).Select(line => line.Split(',', 5))];

    public static TheoryData<string, Quantity, double, double> Literals => new(Rows.Select(row =>
        (row[0], Enum.Parse<Quantity>(row[1]), double.Parse(row[2], CultureInfo.InvariantCulture), double.Parse(row[3], CultureInfo.InvariantCulture))));

    public static TheoryData<string, Enum, Enum> Outside => new(
        ("kPa", PressureUnit.Kilopascal, PressureUnit.Pascal),
        ("mPa", PressureUnit.Millipascal, PressureUnit.Pascal),
        ("µPa", PressureUnit.Micropascal, PressureUnit.Pascal),
        ("dyn/cm²", PressureUnit.DynePerSquareCentimeter, PressureUnit.Pascal),
        ("mPa.s", DynamicViscosityUnit.MillipascalSecond, DynamicViscosityUnit.PascalSecond),
        ("µPa.s", DynamicViscosityUnit.MicropascalSecond, DynamicViscosityUnit.PascalSecond),
        ("P", DynamicViscosityUnit.Poise, DynamicViscosityUnit.PascalSecond),
        ("cP", DynamicViscosityUnit.Centipoise, DynamicViscosityUnit.PascalSecond),
        ("rpm", RotationalSpeedUnit.RevolutionPerMinute, RotationalSpeedUnit.RadianPerSecond),
        ("rps", RotationalSpeedUnit.RevolutionPerSecond, RotationalSpeedUnit.RadianPerSecond),
        ("mrad/s", RotationalSpeedUnit.MilliradianPerSecond, RotationalSpeedUnit.RadianPerSecond),
        ("cm", LengthUnit.Centimeter, LengthUnit.Meter),
        ("mm", LengthUnit.Millimeter, LengthUnit.Meter),
        ("µm", LengthUnit.Micrometer, LengthUnit.Meter),
        ("ms", DurationUnit.Millisecond, DurationUnit.Second),
        ("h", DurationUnit.Hour, DurationUnit.Second),
        ("d", DurationUnit.Day, DurationUnit.Second),
        ("%", RatioUnit.Percent, RatioUnit.DecimalFraction),
        ("g/dL", MassConcentrationUnit.GramPerDeciliter, MassConcentrationUnit.GramPerLiter),
        ("mg/dL", MassConcentrationUnit.MilligramPerDeciliter, MassConcentrationUnit.GramPerLiter),
        ("mg/mL", MassConcentrationUnit.MilligramPerMilliliter, MassConcentrationUnit.GramPerLiter));

    [Theory]
    [MemberData(nameof(Literals))]
    public void A_spelling_has_the_factor_of_its_definition(string spelling, Quantity quantity, double factor, double offset)
    {
        var unit = UnitTable.Find(spelling, quantity);

        Assert.NotNull(unit);
        Assert.Equal(factor, unit.Factor, 1e-15 * factor);
        Assert.Equal(offset, unit.Offset);
    }

    [Fact]
    public void No_spelling_of_the_table_is_unchecked()
    {
        var known = Rows.Select(row => (row[0], row[1])).ToHashSet();
        foreach (var quantity in Enum.GetValues<Quantity>())
            foreach (var spelling in UnitTable.SpellingsOf(quantity))
                Assert.Contains((spelling, quantity.ToString()), known);
    }

    /// <summary>UnitsNet has 2 pi to eleven digits.</summary>
    [Theory]
    [MemberData(nameof(Outside))]
    public void A_factor_is_that_of_an_independent_library(string spelling, Enum from, Enum to) =>
        Assert.Equal(UnitConverter.Convert(1, from, to), UnitTable.Find(spelling)!.Factor, 1e-10);

    [Theory]
    [InlineData("MPa.s")]
    [InlineData("MPA")]
    [InlineData("pa")]
    [InlineData("CP")]
    [InlineData("MN.m")]
    [InlineData("RPM")]
    [InlineData("mpa.s")]
    [InlineData("mPa .s")]
    [InlineData(" mPa.s")]
    [InlineData("N.M")]
    [InlineData("")]
    public void A_spelling_outside_the_table_has_no_unit(string spelling) => Assert.Empty(UnitTable.FindAll(spelling));

    [Fact]
    public void A_spelling_of_two_quantities_needs_the_wanted_one()
    {
        Assert.Null(UnitTable.Find("1/min"));
        Assert.Equal(1.0 / 60, UnitTable.Find("1/min", Quantity.ShearRate)!.Factor, 1e-16);
        Assert.Equal(Math.PI / 30, UnitTable.Find("1/min", Quantity.RotationalSpeed)!.Factor, 1e-16);
        Assert.Null(UnitTable.Find("K"));
        Assert.Equal(-273.15, UnitTable.Find("K", Quantity.Temperature)!.Offset);
        Assert.Equal(0, UnitTable.Find("K", Quantity.TemperatureDifference)!.Offset);
        Assert.Null(UnitTable.Find("1/s", Quantity.RotationalSpeed));
    }

    [Fact]
    public void A_temperature_in_kelvin_becomes_one_in_degrees_Celsius() => Assert.Equal(37, UnitTable.Find("K", Quantity.Temperature)!.ToSi(310.15), 1e-12);

    [Theory]
    [InlineData("MPa.s", Quantity.Viscosity, "mPa.s")]
    [InlineData("mPa.s.", Quantity.Viscosity, "mPa.s")]
    [InlineData("U/min", Quantity.RotationalSpeed, "1/min")]
    public void The_nearest_spelling_is_told(string spelling, Quantity quantity, string nearest) => Assert.Equal(nearest, UnitTable.Nearest(spelling, quantity));

    [Fact]
    public void Nothing_near_is_said_so() => Assert.Null(UnitTable.Nearest("furlong per fortnight"));
}
