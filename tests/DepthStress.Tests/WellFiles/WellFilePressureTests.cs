namespace DepthStress.Tests.WellFiles;

/// <summary>Pore pressure and tectonic strains.</summary>
public sealed class WellFilePressureTests
{
    [Theory]
    [InlineData(
        "method = \"hydrostatic\"\nfluid_density = \"1.03 g/cm3\"\n", "method = \"table\"\ndepth_kind = \"tvd\"\npoints = [{ depth = \"1 m\", pressure = \"1 MPa\" }]\n",
        "well.toml(27,10): error: [pore_pressure] points: found one point, expected two or more")]
    [InlineData(
        "method = \"hydrostatic\"\nfluid_density = \"1.03 g/cm3\"\n", "method = \"table\"\ndepth_kind = \"tvd\"\npoints = [{ depth = \"100 m\", pressure = \"1 MPa\" }, { depth = \"190 m\" }]\n",
        "well.toml(27,10): error: [pore_pressure] points: expected each point with depth and pressure")]
    [InlineData(
        "method = \"hydrostatic\"\nfluid_density = \"1.03 g/cm3\"\n", "method = \"table\"\ndepth_kind = \"tvd\"\npoints = [{ depth = \"100 m\", pressure = \"1 MPa\" }, { depth = \"190 m\", pressure = 3 }]\n",
        "well.toml(27,82): error: found the bare number 3, expected pressure = a quantity in quotes with a unit (MPa, GPa, kPa, Pa, bar, psi, ksi, Mpsi)")]
    [InlineData(
        "method = \"hydrostatic\"\nfluid_density = \"1.03 g/cm3\"\n", "method = \"table\"\ndepth_kind = \"tvd\"\npoints = []\n",
        "well.toml: error: [pore_pressure] points is not set; expected a table of depth and pressure")]
    [InlineData(
        "method = \"hydrostatic\"\nfluid_density = \"1.03 g/cm3\"\n", "method = \"table\"\ndepth_kind = \"tvd\"\npoints = [\"a\"]\n",
        "well.toml(27,11): error: found the text \"a\", expected [[pore_pressure.points]]")]
    [InlineData(
        "method = \"hydrostatic\"\nfluid_density = \"1.03 g/cm3\"\n", "method = \"table\"\n",
        "well.toml: error: [pore_pressure] points is not set; expected a table of depth and pressure",
        "well.toml: error: [pore_pressure] depth_kind is not set; expected md, tvd or tvdss")]
    public void A_pressure_table_needs_two_whole_points(string old, string replacement, params string[] expected) =>
        Assert.Equal(expected, WellText.Messages(WellText.With(old, replacement)));

    [Theory]
    [InlineData(
        "method = \"hydrostatic\"\nfluid_density = \"1.03 g/cm3\"\n", "",
        "well.toml: error: [pore_pressure] method is not set; expected hydrostatic, gradient, table, fluid line, eaton-1975-sonic, eaton-1975-resistivity, bowers-1995-loading, bowers-1995-unloading and others, see \"depthstress methods --for pp\"")]
    [InlineData(
        "method = \"hydrostatic\"\nfluid_density = \"1.03 g/cm3\"\n", "method = \"hydrostatic\"\n",
        "well.toml: error: [pore_pressure] fluid_density is not set; expected such as \"1.03 g/cm3\"")]
    [InlineData(
        "method = \"hydrostatic\"\nfluid_density = \"1.03 g/cm3\"\n", "method = \"gradient\"\n",
        "well.toml: error: [pore_pressure] gradient is not set; expected such as \"10.5 kPa/m\"",
        "well.toml: error: [pore_pressure] reference is not set; expected rotary table, ground, sea surface or mudline")]
    [InlineData(
        "method = \"hydrostatic\"\nfluid_density = \"1.03 g/cm3\"\n", "method = \"gradient\"\ngradient = \"10 kPa/m\"\nreference = \"mudline\"\n",
        "well.toml(27,13): error: found a reference that an onshore well does not have, expected rotary table or ground")]
    public void A_method_needs_its_numbers(string old, string replacement, params string[] expected) =>
        Assert.Equal(expected, WellText.Messages(WellText.With(old, replacement)));

    [Theory]
    [InlineData(
        "[horizontal_stress]\nstrain_along_shmin = \"10 microstrain\"\n",
        "well.toml: error: [horizontal_stress] strain_along_shmax is not set; expected both strains or neither")]
    [InlineData(
        "[horizontal_stress]\nstrain_along_shmax = \"10 microstrain\"\n",
        "well.toml: error: [horizontal_stress] strain_along_shmin is not set; expected both strains or neither")]
    [InlineData(
        "[horizontal_stress]\nstrain_along_shmin = \"100 microstrain\"\nstrain_along_shmax = \"10 microstrain\"\n",
        "well.toml(29,22): error: strain_along_shmax is below strain_along_shmin: exchange them and turn shmax_azimuth by 90 deg")]
    public void Strains_come_in_pairs_and_in_order(string added, params string[] expected) =>
        Assert.Equal(expected, WellText.Messages(WellText.Sound + added));

    [Fact]
    public void Points_must_get_deeper()
    {
        var message = Assert.Single(WellText.Messages(WellText.With(
            "method = \"hydrostatic\"\nfluid_density = \"1.03 g/cm3\"\n",
            "method = \"table\"\ndepth_kind = \"tvd\"\npoints = [{ depth = \"100 m\", pressure = \"1 MPa\" }, { depth = \"90 m\", pressure = \"2 MPa\" }]\n")));
        Assert.StartsWith("well.toml(27,10): error: [pore_pressure] points", message, StringComparison.Ordinal);
        Assert.Contains("increas", message, StringComparison.Ordinal);
    }
}
