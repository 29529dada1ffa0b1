using DepthStress.Core.Quantities;
using static DepthStress.Core.Quantities.Dimension;

namespace DepthStress.Tests.Quantities;

/// <summary>
/// The factor of every unit against literals that were not computed here. Sources:
/// "SP 811": the factor that NIST Special Publication 811 (2008), Appendix B.8, prints with seven digits or as exact; the
/// one of psi was read there, the others are from memory.
/// "units 2.22": printed by the definitions file and program of GNU units 2.22.
/// "SI prefix": definition of the prefixes, exact. "trivial": the unit is its own base unit.
/// </summary>
public class UnitsReferenceTests
{
    public static TheoryData<string, Dimension, double, string> Factors => new()
    {
        { "us/ft", Slowness, 3.280839895e-06, "units 2.22" },
        { "us/m", Slowness, 1.000000e-06, "SI prefix" },
        { "m/s", Velocity, 1.000000, "trivial" },
        { "km/s", Velocity, 1000.000, "SI prefix" },
        { "ft/s", Velocity, 3.048000e-01, "SP 811, exact" },
        { "g/cm3", Density, 1.000000e+03, "SP 811, exact" },
        { "kg/m3", Density, 1.000000, "trivial" },
        { "lb/ft3", Density, 16.018463374, "units 2.22" },
        { "lb/gal", Density, 119.82642732, "units 2.22" },
        { "sg", Density, 1000.000, "common practice: counted from 1000 kg/m3" },
        { "psi", Dimension.Pressure, 6894.7572932, "units 2.22" },
        { "ksi", Dimension.Pressure, 6894757.2932, "units 2.22" },
        { "Mpsi", Dimension.Pressure, 6894757293.2, "units 2.22" },
        { "Pa", Dimension.Pressure, 1.000000, "trivial" },
        { "kPa", Dimension.Pressure, 1.000000e+03, "SI prefix" },
        { "MPa", Dimension.Pressure, 1.000000e+06, "SI prefix" },
        { "GPa", Dimension.Pressure, 1.000000e+09, "SI prefix" },
        { "bar", Dimension.Pressure, 1.000000e+05, "SP 811, exact" },
        { "m", Length, 1.000000, "trivial" },
        { "ft", Length, 3.048000e-01, "SP 811, exact" },
        { "in", Length, 2.540000e-02, "SP 811, exact" },
        { "mm", Length, 1.000000e-03, "SI prefix" },
        { "cm", Length, 1.000000e-02, "SI prefix" },
        { "gAPI", GammaRay, 1.000000, "trivial" },
        { "b/e", Photoelectric, 1.000000, "trivial" },
        { "ohm.m", Resistivity, 1.000000, "trivial" },
        { "K", Temperature, 1.000000, "trivial" },
        { "degC/100m", TemperatureGradient, 1.000000e-02, "units 2.22" },
        { "degF/100ft", TemperatureGradient, 0.018226888306, "units 2.22" },
        { "psi/ft", PressureGradient, 22620.594794, "units 2.22" },
        { "kPa/m", PressureGradient, 1.000000e+03, "SI prefix" },
        { "MPa/km", PressureGradient, 1.000000e+03, "SI prefix" },
        { "bar/m", PressureGradient, 1.000000e+05, "units 2.22" },
        { "v/v", Fraction, 1.000000, "trivial" },
        { "%", Fraction, 1.000000e-02, "SP 811, exact" },
        { "pu", Fraction, 1.000000e-02, "common practice: one percent of the bulk volume" },
        { "deg", Angle, 0.017453292520, "units 2.22" },
        { "rad", Angle, 1.000000, "trivial" },
        { "mD", Permeability, 9.8692326672e-16, "units 2.22, which builds it from the standard atmosphere" },
        { "MPa.m0.5", Toughness, 1.000000e+06, "SI prefix" },
        { "psi.in0.5", Toughness, 1098.8434941, "root of the 1207457.0245 Pa2.m that units 2.22 prints for psi2.in" },
        { "microstrain", Strain, 1.000000e-06, "SI prefix" },
        { "m/m", Strain, 1.000000, "trivial" },
        { "1/K", ThermalExpansion, 1.000000, "trivial" },
        { "1/degF", ThermalExpansion, 1.800000, "a degree Fahrenheit is 5/9 K, SP 811 B.8" },
    };

    // Tolerance: the sources above carry ten digits or are exact.
    [Theory]
    [MemberData(nameof(Factors))]
    public void One_of_the_unit_is_the_published_number_of_SI_units(string symbol, Dimension dimension, double factor, string source)
    {
        var unit = Units.Find(symbol, dimension);
        Assert.True(unit is not null, $"{symbol} is not found ({source})");
        Assert.Equal(symbol, unit.Symbol);
        Assert.Equal(1, unit.ToSi(1) / factor, 5e-10);
        Assert.Equal(1, unit.FromSi(factor), 5e-10);
    }

    // Tolerance: half a unit of the seventh digit printed.
    [Theory]
    [InlineData("psi", 6.894757e+03, 5e-4)] // SP 811 B.8, read
    [InlineData("ksi", 6.894757e+06, 5e-1)] // SP 811 B.8, from memory
    [InlineData("lb/gal", 1.198264e+02, 5e-5)] // SP 811 B.8, from memory
    [InlineData("lb/ft3", 1.601846e+01, 5e-6)] // SP 811 B.8, from memory
    [InlineData("deg", 1.745329e-02, 5e-9)] // SP 811 B.8, from memory
    [InlineData("mD", 9.869233e-16, 5e-22)] // SP 811 B.8, darcy, from memory
    public void One_of_the_unit_is_the_number_that_SP_811_prints(string symbol, double factor, double tolerance) =>
        Assert.Equal(factor, Units.Find(symbol)!.ToSi(1), tolerance);

    // Fixed points by definition of the scales. Tolerance: rounding of 5/9 at some hundred kelvin.
    [Theory]
    [InlineData("degC", 0, 273.15)]
    [InlineData("degC", 25, 298.15)]
    [InlineData("degF", 32, 273.15)]
    [InlineData("degF", 212, 373.15)]
    [InlineData("degF", -459.67, 0)]
    [InlineData("degF", -40, 233.15)]
    public void Temperatures_keep_the_fixed_points_of_their_scales(string symbol, double value, double kelvin)
    {
        var unit = Units.Find(symbol, Temperature)!;
        Assert.Equal(kelvin, unit.ToSi(value), 1e-12 * 300);
        Assert.Equal(value, unit.FromSi(kelvin), 1e-12 * 300);
    }

    [Fact]
    public void Every_unit_has_a_published_factor_or_fixed_points()
    {
        var covered = Factors.Select(row => (string)row[0]).Concat(["degC", "degF", ""]);
        Assert.Equal(covered.Order(StringComparer.Ordinal), Units.All.Select(u => u.Symbol).Order(StringComparer.Ordinal));
    }

    // 0.465 psi/ft as density: 1072.5963075 kg/m3, and 8.6 lb/gal: 1030.5072749 kg/m3, both by units 2.22.
    // Tolerance: half a unit of the tenth digit.
    [Theory]
    [InlineData("8.6 lb/gal", 1030.5072749)]
    [InlineData("0.465 psi/ft", 1072.5963075)]
    public void Fluid_density_is_read_as_density_or_as_gradient(string text, double density)
    {
        Assert.True(QuantityText.TryParseFluidDensity(text, out var si, out _, out _));
        Assert.Equal(density, si, 5e-7);
    }
}
