using DepthStress.Core.Quantities;
using static DepthStress.Core.Quantities.Dimension;

namespace DepthStress.Tests.Quantities;

public class UnitsTests
{
    /// <summary>The symbols that the well file promises to read.</summary>
    private const string Promised =
        "us/ft us/m m/s km/s ft/s g/cm3 kg/m3 lb/ft3 psi ksi Mpsi kPa MPa GPa bar m ft in mm gAPI ohm.m degC degF degC/100m "
        + "degF/100ft lb/gal sg psi/ft kPa/m MPa/km bar/m v/v % pu deg mD MPa.m0.5 psi.in0.5 microstrain";

    public static TheoryData<string> PromisedSymbols => new(Promised.Split(' '));

    [Theory]
    [MemberData(nameof(PromisedSymbols))]
    public void Every_promised_symbol_is_found_and_converts_there_and_back(string symbol)
    {
        var unit = Units.Find(symbol);
        Assert.NotNull(unit);
        Assert.Equal(symbol, unit.Symbol);
        Assert.Same(unit, Units.Find(symbol, unit.Dimension));
        Assert.Equal(85.25, unit.FromSi(unit.ToSi(85.25)), 1e-12 * 500); // rounding; the Fahrenheit offset is some hundred
    }

    [Fact]
    public void No_spelling_means_two_units_of_one_dimension()
    {
        foreach (var group in Units.All.GroupBy(u => u.Dimension))
        {
            var spellings = group.SelectMany(u => u.Aliases.Append(u.Symbol).Distinct(StringComparer.OrdinalIgnoreCase)).ToList();
            Assert.Equal(spellings.Distinct(StringComparer.OrdinalIgnoreCase), spellings);
        }
    }

    [Fact]
    public void No_symbol_or_column_suffix_is_used_twice()
    {
        Assert.Equal(Units.All.Count, Units.All.Select(u => u.Symbol).Distinct(StringComparer.Ordinal).Count());
        var suffixes = Units.All.Select(u => u.Suffix).Where(s => s.Length > 0).ToList();
        Assert.Equal(suffixes.Distinct(StringComparer.Ordinal), suffixes);
    }

    [Fact]
    public void No_alias_repeats_its_own_symbol() =>
        Assert.All(Units.All, u => Assert.DoesNotContain(u.Symbol, u.Aliases, StringComparer.OrdinalIgnoreCase));

    [Fact]
    public void Every_dimension_has_a_unit_and_every_unit_field_is_in_the_table()
    {
        Assert.All(Enum.GetValues<Dimension>(), d => Assert.NotEmpty(Units.Of(d)));
        var fields = typeof(Units).GetFields().Where(f => f.FieldType == typeof(Unit)).Select(f => (Unit)f.GetValue(null)!);
        Assert.Equal(fields.Select(u => u.Symbol).Order(StringComparer.Ordinal), Units.All.Select(u => u.Symbol).Order(StringComparer.Ordinal));
    }

    [Theory]
    [InlineData("F", Length, "ft")]
    [InlineData("F", Temperature, "degF")]
    [InlineData("C", Temperature, "degC")]
    [InlineData("md", Permeability, "mD")]
    [InlineData("MD", Permeability, "mD")]
    [InlineData("mpsi", Dimension.Pressure, "Mpsi")]
    [InlineData("MPSI", Dimension.Pressure, "Mpsi")]
    [InlineData("mpa", Dimension.Pressure, "MPa")]
    [InlineData("KPA", Dimension.Pressure, "kPa")]
    [InlineData("PU", Fraction, "pu")]
    [InlineData("V/V", Fraction, "v/v")]
    [InlineData("M", Length, "m")]
    [InlineData("MM", Length, "mm")]
    [InlineData("M/M", Strain, "m/m")]
    [InlineData("K", Temperature, "K")]
    [InlineData("G/C3", Density, "g/cm3")]
    [InlineData("K/M3", Density, "kg/m3")]
    [InlineData("US/F", Slowness, "us/ft")]
    [InlineData("\u00b5s/ft", Slowness, "us/ft")] // micro sign
    [InlineData("\u03bcs/ft", Slowness, "us/ft")] // Greek letter mu
    [InlineData("GAPI", GammaRay, "gAPI")]
    [InlineData("ohmm", Resistivity, "ohm.m")]
    [InlineData("ppg", Density, "lb/gal")]
    [InlineData("  ft ", Length, "ft")]
    public void A_usual_spelling_is_found_within_its_dimension(string spelling, Dimension dimension, string symbol) =>
        Assert.Equal(symbol, Units.Find(spelling, dimension)?.Symbol);

    [Theory]
    [InlineData("m", Dimension.Pressure)]
    [InlineData("mD", Length)]
    [InlineData("F", Density)]
    [InlineData("", Length)]
    [InlineData("furlong", Length)]
    public void A_unit_of_another_dimension_or_none_is_not_found(string spelling, Dimension dimension) =>
        Assert.Null(Units.Find(spelling, dimension));

    [Fact]
    public void An_exact_symbol_in_a_later_dimension_goes_before_a_loose_spelling_in_an_earlier_one()
    {
        Assert.Equal("K", Units.Find("K", Density, Temperature)?.Symbol);
        Assert.Equal("m/m", Units.Find("m/m", Fraction, Strain)?.Symbol);
        Assert.Equal("v/v", Units.Find("1", Fraction)?.Symbol);
        Assert.Equal("ft", Units.Find("F", Length, Temperature)?.Symbol);
    }

    [Fact]
    public void Spans_convert_as_single_values_do()
    {
        double[] values = [-40, 0, 98.6, double.NaN];
        var expected = values.Select(Units.Fahrenheit.ToSi).ToArray();
        Units.Fahrenheit.ToSi(values.AsSpan());
        Assert.Equal(expected, values);
        var back = values.Select(Units.Fahrenheit.FromSi).ToArray();
        Units.Fahrenheit.FromSi(values.AsSpan());
        Assert.Equal(back, values);
    }
}
