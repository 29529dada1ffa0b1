using DepthStress.Core.Quantities;
using static DepthStress.Core.Quantities.Dimension;

namespace DepthStress.Tests.Quantities;

public class QuantityTextTests
{
    private const string Lengths = "m, ft, in, mm, cm";

    // Tolerance: rounding of one product.
    [Theory]
    [InlineData("312.4 m", 312.4)]
    [InlineData("312.4m", 312.4)]
    [InlineData("  312.4 \t m  ", 312.4)]
    [InlineData("\u00a0312.4\u00a0m", 312.4)]
    [InlineData("+312.4 m", 312.4)]
    [InlineData("-312.4 m", -312.4)]
    [InlineData(".5 m", 0.5)]
    [InlineData("5. m", 5)]
    [InlineData("1e3 m", 1000)]
    [InlineData("1.5E-2m", 0.015)]
    [InlineData("1000 FT", 304.8)]
    [InlineData("12 in", 0.3048)]
    public void A_number_and_a_unit_are_read(string text, double metres)
    {
        Assert.True(QuantityText.TryParse(text, [Length], out var si, out _, out var problem), problem);
        Assert.Equal(metres, si, 1e-12);
        Assert.Null(problem);
    }

    [Theory]
    [InlineData("312.4", "found \"312.4\" without a unit, expected one of " + Lengths)]
    [InlineData("8.6 lb/gal", "found \"8.6 lb/gal\", a density; expected a length in one of " + Lengths)]
    [InlineData("5 deg", "found \"5 deg\", an angle; expected a length in one of " + Lengths)]
    [InlineData("5 furlong", "found the unknown unit \"furlong\" in \"5 furlong\", expected one of " + Lengths)]
    [InlineData("312,4 m", "found a comma in the number of \"312,4 m\", expected a decimal point and no group separators")]
    [InlineData("1,234.5 m", "found a comma in the number of \"1,234.5 m\", expected a decimal point and no group separators")]
    [InlineData("1 234 m", "found the unknown unit \"234 m\" in \"1 234 m\", expected one of " + Lengths)]
    [InlineData("1'234 m", "found the unknown unit \"'234 m\" in \"1'234 m\", expected one of " + Lengths)]
    [InlineData("1.234.5 m", "found \"1.234.5 m\", expected a number and a unit (" + Lengths + ")")]
    [InlineData("m", "found \"m\", expected a number and a unit (" + Lengths + ")")]
    [InlineData("", "found \"\", expected a number and a unit (" + Lengths + ")")]
    [InlineData("- 5 m", "found \"- 5 m\", expected a number and a unit (" + Lengths + ")")]
    [InlineData("--5 m", "found \"--5 m\", expected a number and a unit (" + Lengths + ")")]
    [InlineData(". m", "found \". m\", expected a number and a unit (" + Lengths + ")")]
    [InlineData("NaN m", "found \"NaN m\", expected a number and a unit (" + Lengths + ")")]
    [InlineData("1e999 m", "found \"1e999 m\", expected a number and a unit (" + Lengths + ")")]
    [InlineData("5e m", "found the unknown unit \"e m\" in \"5e m\", expected one of " + Lengths)]
    public void What_is_wrong_with_a_length_is_said(string text, string message)
    {
        Assert.False(QuantityText.TryParse(text, [Length], out var si, out var unit, out var problem));
        Assert.Equal(message, problem);
        Assert.True(double.IsNaN(si));
        Assert.Same(Units.One, unit);
    }

    [Fact]
    public void A_number_that_is_finite_only_before_its_conversion_is_refused()
    {
        Assert.False(QuantityText.TryParse("1e306 km/s", [Velocity], out var si, out _, out var problem));
        Assert.Equal("found \"1e306 km/s\", expected a smaller number", problem);
        Assert.True(double.IsNaN(si));
    }

    [Theory]
    [InlineData("abc", "found \"abc\", expected a number")]
    [InlineData("5 m", "found \"5 m\", a length; expected a pure number")]
    [InlineData("5 furlong", "found the unknown unit \"furlong\" in \"5 furlong\", expected no unit")]
    public void What_is_wrong_with_a_pure_number_is_said(string text, string message)
    {
        Assert.False(QuantityText.TryParse(text, [None], out _, out _, out var problem));
        Assert.Equal(message, problem);
    }

    [Fact]
    public void A_bare_number_is_a_pure_number_only_where_one_fits()
    {
        Assert.True(QuantityText.TryParse("0.25", [None], out var pure, out _, out _));
        Assert.Equal(0.25, pure, 0); // nothing is converted
        Assert.False(QuantityText.TryParse("0.25", [Fraction], out _, out _, out var problem));
        Assert.Equal("found \"0.25\" without a unit, expected one of v/v, %, pu", problem);
        Assert.True(QuantityText.TryParse("25 %", [Fraction], out var fraction, out _, out _));
        Assert.Equal(0.25, fraction, 1e-15); // rounding of 1/100
    }

    [Fact]
    public void A_fluid_may_be_given_by_density_or_by_gradient()
    {
        Assert.True(QuantityText.TryParseFluidDensity("8.6 lb/gal", out var density, out var unit, out _));
        Assert.Equal(1030.507, density, 5e-4); // GNU units 2.22, seven digits
        Assert.Same(Units.PoundPerGallon, unit);
        Assert.True(QuantityText.TryParseFluidDensity("9.80665 kPa/m", out var water, out unit, out _));
        Assert.Equal(1000, water, 1e-9); // standard gravity is exact; rounding only
        Assert.Same(Units.KilopascalPerMetre, unit);
        Assert.False(QuantityText.TryParseFluidDensity("3 MPa", out var none, out _, out var problem));
        Assert.True(double.IsNaN(none));
        Assert.Equal(
            "found \"3 MPa\", a pressure; expected a density or pressure gradient in one of "
            + "g/cm3, kg/m3, lb/ft3, lb/gal, sg, kPa/m, MPa/km, psi/ft, bar/m",
            problem);
    }

    [Theory]
    [InlineData("1,5")]
    [InlineData("1,234")]
    [InlineData("1 234")]
    [InlineData("1_234")]
    [InlineData("0x10")]
    [InlineData("(5)")]
    [InlineData("NaN")]
    [InlineData("Infinity")]
    [InlineData("-\u221e")]
    [InlineData("\u22125")] // a typeset minus sign
    [InlineData("5 m")]
    [InlineData("")]
    [InlineData("1e999")]
    public void What_is_not_one_plain_number_is_refused(string text) => Assert.False(QuantityText.TryNumber(text, out _));

    [Fact]
    public void Every_dimension_has_a_name_in_plain_words() =>
        Assert.All(Enum.GetValues<Dimension>(), d => Assert.Matches("^[a-z][a-z -]+$", QuantityText.Name(d)));
}
