using DepthStress.Files.Setup;

namespace DepthStress.Tests.WellFiles;

/// <summary>Writing estimates into a well file: nothing else may change.</summary>
public sealed class WellFileEditorTests
{
    private static WellFileEdit Strain(string value, int zone = -1) => new(zone, "horizontal_stress", "strain_along_shmin", value);

    [Theory]
    // The value is replaced in its place; comments, blanks and order stay.
    [InlineData(
        "# top\n[horizontal_stress]\nstrain_along_shmin   =  \"150 microstrain\"  # guess\nb = 1\n",
        "# top\n[horizontal_stress]\nstrain_along_shmin   =  \"9 microstrain\"  # guess\nb = 1\n")]
    [InlineData("horizontal_stress.strain_along_shmin = '1'\n[a]\n", "horizontal_stress.strain_along_shmin = \"9 microstrain\"\n[a]\n")]
    [InlineData("horizontal_stress = { strain_along_shmin = \"1\", b = 2 } # c\n", "horizontal_stress = { strain_along_shmin = \"9 microstrain\", b = 2 } # c\n")]
    // A key that is not there goes below the last key of its section.
    [InlineData("[horizontal_stress]\nb = 1 # c\n\n[x]\n", "[horizontal_stress]\nb = 1 # c\nstrain_along_shmin = \"9 microstrain\"\n\n[x]\n")]
    [InlineData("[horizontal_stress]", "[horizontal_stress]\nstrain_along_shmin = \"9 microstrain\"\n")]
    [InlineData("[horizontal_stress]\r\nb = 1\r\n", "[horizontal_stress]\r\nb = 1\r\nstrain_along_shmin = \"9 microstrain\"\r\n")]
    [InlineData("horizontal_stress = {}\n", "horizontal_stress = { strain_along_shmin = \"9 microstrain\" }\n")]
    [InlineData("horizontal_stress = { b = 2 }\n", "horizontal_stress = { b = 2, strain_along_shmin = \"9 microstrain\" }\n")]
    [InlineData("horizontal_stress.b = 2 # c\n[x]\n", "horizontal_stress.b = 2 # c\nhorizontal_stress.strain_along_shmin = \"9 microstrain\"\n[x]\n")]
    // A section that is not there goes to the end.
    [InlineData("[x]\na = 1\n", "[x]\na = 1\n\n[horizontal_stress]\nstrain_along_shmin = \"9 microstrain\"\n")]
    [InlineData("[x]\na = 1", "[x]\na = 1\n\n[horizontal_stress]\nstrain_along_shmin = \"9 microstrain\"\n")]
    // The zones' own values are not the well's.
    [InlineData(
        "[[zones]]\nname = \"a\"\n[zones.horizontal_stress]\nstrain_along_shmin = \"1\"\n[horizontal_stress]\nstrain_along_shmin = \"2\"\n",
        "[[zones]]\nname = \"a\"\n[zones.horizontal_stress]\nstrain_along_shmin = \"1\"\n[horizontal_stress]\nstrain_along_shmin = \"9 microstrain\"\n")]
    public void A_value_of_the_well(string text, string expected) =>
        Assert.Equal(expected, WellFileEditor.Apply(text, [Strain("\"9 microstrain\"")]));

    [Theory]
    [InlineData(
        "[[zones]]\nname = \"a\"\n[[zones]]\nname = \"b\" # c\n[zones.moduli]\nx = 1\n\n# next\n[horizontal_stress]\nstrain_along_shmin = \"2\"\n",
        "[[zones]]\nname = \"a\"\n[[zones]]\nname = \"b\" # c\n[zones.moduli]\nx = 1\n[zones.horizontal_stress]\nstrain_along_shmin = \"9\"\n\n# next\n[horizontal_stress]\nstrain_along_shmin = \"2\"\n")]
    [InlineData(
        "[[zones]]\nname = \"a\"\nhorizontal_stress = { strain_along_shmin = \"1\" }\n[[zones]]\nname = \"b\"\nhorizontal_stress = { strain_along_shmin = \"1\" }\n",
        "[[zones]]\nname = \"a\"\nhorizontal_stress = { strain_along_shmin = \"1\" }\n[[zones]]\nname = \"b\"\nhorizontal_stress = { strain_along_shmin = \"9\" }\n")]
    [InlineData(
        "[[zones]]\nname = \"a\"\n[[zones]]\nname = \"b\"\nhorizontal_stress.x = 1\n[zones.moduli]\n",
        "[[zones]]\nname = \"a\"\n[[zones]]\nname = \"b\"\nhorizontal_stress.x = 1\nhorizontal_stress.strain_along_shmin = \"9\"\n[zones.moduli]\n")]
    public void A_value_of_the_second_zone(string text, string expected) =>
        Assert.Equal(expected, WellFileEditor.Apply(text, [Strain("\"9\"", 1)]));

    [Fact]
    public void Several_values_and_sections_inside_sections()
    {
        var text = WellFileEditor.Apply(
            "[pore_pressure]\nexponent = 3\n[pore_pressure.trend]\nrate = 1\n",
            [new(-1, "pore_pressure.trend", "rate", "2"), new(-1, "pore_pressure", "exponent", "2.6"), new(-1, "pore_pressure.trend", "start", "5")]);
        Assert.Equal("[pore_pressure]\nexponent = 2.6\n[pore_pressure.trend]\nrate = 2\nstart = 5\n", text);
    }

    [Fact]
    public void Text_that_is_not_TOML_or_lacks_the_zone_is_refused()
    {
        Assert.Throws<ArgumentException>(() => WellFileEditor.Apply("a = \n", [Strain("1")]));
        Assert.Throws<ArgumentException>(() => WellFileEditor.Apply("[[zones]]\nname = \"a\"\n", [Strain("1", 1)]));
    }
}
