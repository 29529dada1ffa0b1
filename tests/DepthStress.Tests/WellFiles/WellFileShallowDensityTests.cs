using DepthStress.Core.Pressure;

namespace DepthStress.Tests.WellFiles;

/// <summary>What may stand for density above the log, and what may not.</summary>
public sealed class WellFileShallowDensityTests
{
    private const string Old = "above_log = \"2.0 g/cm3\"";

    private static ShallowDensity Read(string value) => WellText.Sections(WellText.With(Old, $"above_log = {value}")).Setup.Overburden.AboveLog.Value;

    [Fact]
    public void A_mean_density() => Assert.Equal(new MeanDensity(2150), Read("\"2.15 g/cm3\""));

    [Fact]
    public void A_method_for_the_mean_or_for_the_density_itself()
    {
        Assert.Equal("traugott-1997", Assert.IsType<MeanDensityLaw>(Read("\"traugott-1997\"")).Relation.Id);
        Assert.Equal("miller-gulf", Assert.IsType<LocalDensityLaw>(Read("\"miller-gulf\"")).Relation.Id);
    }

    [Fact]
    public void An_exponential() => Assert.Equal(
        new ExponentialDensity(1900, 2700),
        Read("{ method = \"exponential\", surface_density = \"1.9 g/cm3\", matrix_density = \"2700 kg/m3\" }"));

    [Fact]
    public void Points() => Assert.Equal(
        [new DensityPoint(0, 1800), new DensityPoint(300, 2200)],
        Assert.IsType<PointDensity>(Read("[{ depth = \"0 m\", density = \"1.8 g/cm3\" }, { depth = \"300 m\", density = \"2.2 g/cm3\" }]")).Points);

    [Theory]
    [InlineData("2.0", "(22,13): error: found the bare number 2.0, expected above_log = a mean density with a unit (g/cm3, kg/m3, lb/ft3, lb/gal, sg), a method id, a table or a list of points")]
    [InlineData("\"2.0 m\"", "(22,13): error: above_log: found \"2.0 m\", a length; expected a density in one of g/cm3, kg/m3, lb/ft3, lb/gal, sg")]
    [InlineData("\"-2.0 g/cm3\"", "(22,13): error: found the text \"-2.0 g/cm3\", expected above_log above zero")]
    [InlineData("\"0 g/cm3\"", "(22,13): error: found the text \"0 g/cm3\", expected above_log above zero")]
    [InlineData("\"traugot-1997\"", "(22,13): error: found the unknown method \"traugot-1997\", expected above_log = one of traugott-1997, barker-wood-1997, miller-gulf; did you mean \"traugott-1997\"?")]
    [InlineData("\"krief-1990-biot\"", "(22,13): error: found the unknown method \"krief-1990-biot\", expected above_log = one of traugott-1997, barker-wood-1997, miller-gulf")]
    [InlineData("\"\"", "(22,13): error: found the unknown method \"\", expected above_log = one of traugott-1997, barker-wood-1997, miller-gulf")]
    [InlineData("{ method = \"exponential\" }", "(22,13): error: above_log: expected method = \"exponential\", surface_density and matrix_density")]
    [InlineData(
        "{ method = \"exponentiel\", surface_density = \"1.9 g/cm3\", matrix_density = \"2.7 g/cm3\" }",
        "(22,24): error: found \"exponentiel\", expected method = one of \"exponential\"; did you mean \"exponential\"?")]
    [InlineData(
        "{ method = \"exponential\", surface_density = \"2.7 g/cm3\", matrix_density = \"2.7 g/cm3\" }",
        "(22,13): error: above_log: expected surface_density below matrix_density")]
    [InlineData(
        "{ method = \"exponential\", surface_density = \"1.9 g/cm3\", matrix_density = 2.7 }",
        "(22,87): error: found the bare number 2.7, expected matrix_density = a quantity in quotes with a unit (g/cm3, kg/m3, lb/ft3, lb/gal, sg)")]
    [InlineData(
        "{ method = \"exponential\", surface_density = \"1.9 g/cm3\", matrix_density = \"2.7 g/cm3\", rate = 1 }",
        "(22,100): error: found the unknown key \"rate\" in above_log, expected one of method, surface_density, matrix_density")]
    [InlineData("[]", "(22,13): error: above_log: found no points")]
    [InlineData("[1.8, 2.2]", "(22,14): error: found the bare number 1.8, expected above_log = a list of { depth, density }")]
    [InlineData(
        "[{ depth = \"10 m\", density = \"1.8 g/cm3\" }, { depth = \"10 m\", density = \"2.2 g/cm3\" }]",
        "(22,57): error: above_log: expected each point with depth below ground or mudline and density, from top to bottom")]
    [InlineData(
        "[{ depth = \"10 m\" }]",
        "(22,14): error: above_log: expected each point with depth below ground or mudline and density, from top to bottom")]
    [InlineData("[{ depth = \"-1 m\", density = \"1.8 g/cm3\" }]", "(22,24): error: found the text \"-1 m\", expected depth not below zero")]
    public void Everything_else_is_refused_once_where_it_stands(string value, string message) =>
        Assert.Equal([$"well.toml{message}"], WellText.Messages(WellText.With(Old, $"above_log = {value}")));
}
