namespace DepthStress.Tests.WellFiles;

/// <summary>Zones must follow each other and be whole.</summary>
public sealed class WellFileZoneTests
{
    [Theory]
    [InlineData(
        "[[zones]]\nname = \"a\"\ntop = \"1010 m\"\ndepth_kind = \"md\"\n[[zones]]\nname = \"b\"\ntop = \"1005 m\"\ndepth_kind = \"md\"\n",
        "well.toml(31,3): error: zone \"b\" starts at 1005.0 m measured depth, expected below zone \"a\" at 1010.0 m")]
    [InlineData(
        "[[zones]]\nname = \"a\"\ntop = \"1000 m\"\ndepth_kind = \"md\"\nbase = \"1012 m\"\n[[zones]]\nname = \"b\"\ntop = \"1010 m\"\ndepth_kind = \"md\"\n",
        "well.toml(32,3): error: zone \"b\" starts at 1010.0 m measured depth, inside zone \"a\" that ends at 1012.0 m")]
    [InlineData(
        "[[zones]]\nname = \"a\"\ntop = \"1000 m\"\ndepth_kind = \"md\"\n[[zones]]\nname = \"A\"\ntop = \"1010 m\"\ndepth_kind = \"md\"\n",
        "well.toml(31,3): error: found a second zone named \"A\", expected each name once")]
    [InlineData(
        "[[zones]]\nname = \"a\"\ntop = \"1000 m\"\ndepth_kind = \"md\"\nbase = \"900 m\"\n",
        "well.toml(27,3): error: zone \"a\" ends above its top")]
    public void Zones_out_of_order_overlapping_or_named_twice_are_errors(string added, params string[] expected) =>
        Assert.Equal(expected, WellText.Messages(WellText.Sound + added));

    [Theory]
    [InlineData(
        "[[zones]]\n",
        "well.toml(27,3): error: [[zones]] name is not set",
        "well.toml(27,3): error: [[zones]] top is not set",
        "well.toml(27,3): error: [[zones]] depth_kind is not set; expected \"md\", \"tvd\" or \"tvdss\"")]
    [InlineData(
        "[[zones]]\nname = \"a\"\ntop = \"1000 m\"\n",
        "well.toml(27,3): error: [[zones]] depth_kind is not set; expected \"md\", \"tvd\" or \"tvdss\"")]
    [InlineData(
        "[[zones]]\nname = \"a\"\ntop = 1000\ndepth_kind = \"md\"\n",
        "well.toml(29,7): error: found the bare number 1000, expected top = a quantity in quotes with a unit (m, ft, in, mm, cm)")]
    public void A_zone_needs_name_top_and_kind_of_depth(string added, params string[] expected) =>
        Assert.Equal(expected, WellText.Messages(WellText.Sound + added));
}
