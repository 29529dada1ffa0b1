using DepthStress.Core.Catalogue;
using DepthStress.Files.Setup;

namespace DepthStress.Tests.WellFiles;

/// <summary>Methods, constants and laws of the user's own.</summary>
public sealed class WellFileLawTests
{
    [Theory]
    [InlineData(
        "\"lacy-1997-combined\"", "\"lacy-1997-combind\"",
        "well.toml(15,17): error: found the unknown method \"lacy-1997-combind\", expected static_youngs = one of lacy-1997-sandstone, lacy-1997-shale, lacy-1997-combined, ohen-2003-shale and others, see \"depthstress methods --for youngs_static\"; did you mean \"lacy-1997-combined\"?")]
    [InlineData(
        "\"lacy-1997-combined\"", "\"horsrud-2001-shale\"",
        "well.toml(15,17): error: found \"horsrud-2001-shale\", which gives unconfined compressive strength; expected static_youngs = a method for static Young's modulus: lacy-1997-sandstone, lacy-1997-shale, lacy-1997-combined, ohen-2003-shale and others, see \"depthstress methods --for youngs_static\"")]
    [InlineData(
        "coefficient = 0.8", "coefficient = \"krief-1990-biot\"",
        "well.toml(19,15): error: [biot] coefficient = \"krief-1990-biot\": its coefficients were recalled, not read in the source; set accept_unverified = true to use it")]
    public void A_method_must_be_known_and_give_what_is_asked(string old, string replacement, params string[] expected) =>
        Assert.Equal(expected, WellText.Messages(WellText.With(old, replacement)));

    [Theory]
    [InlineData(
        "coefficient = 0.8", "coefficient = 1.8",
        "well.toml(19,15): error: found the bare number 1.8, expected coefficient from 0 to 1")]
    [InlineData(
        "\"lacy-1997-combined\"", "30",
        "well.toml(15,17): error: found the bare number 30, expected static_youngs = a method id, a quantity with a unit (MPa, GPa, kPa, Pa, bar, psi, ksi, Mpsi) or a table with law = \"linear\" or \"power\"")]
    [InlineData(
        "\"lacy-1997-combined\"", "\"-3 GPa\"",
        "well.toml(15,17): error: found the text \"-3 GPa\", expected static_youngs of 0 or more")]
    [InlineData(
        "\"lacy-1997-combined\"", "\"30 m\"",
        "well.toml(15,17): error: static_youngs: found \"30 m\", a length; expected a pressure in one of MPa, GPa, kPa, Pa, bar, psi, ksi, Mpsi")]
    public void A_constant_must_be_possible(string old, string replacement, params string[] expected) =>
        Assert.Equal(expected, WellText.Messages(WellText.With(old, replacement)));

    [Fact]
    public void A_constant_poissons_ratio_must_lie_within_its_limits() => Assert.Matches(
        @"^well\.toml\(16,18\): error: found the bare number 0\.7, expected static_poisson (from -1 to 0\.5|above -1 and below 0\.5)$",
        Assert.Single(WellText.Messages(WellText.With("\"equal-to-dynamic\"", "0.7"))));

    [Fact]
    public void An_interval_without_its_ends_is_said_so()
    {
        Assert.Equal("above -1 and below 0.5", Words.Within(new Interval(Math.BitIncrement(-1.0), Math.BitDecrement(0.5))));
        Assert.Equal("from 0 to 1", Words.Within(new Interval(0, 1)));
        Assert.Equal("of 0 or more", Words.Within(Interval.NotNegative));
    }

    [Theory]
    [InlineData(
        "\"lacy-1997-combined\"", "{ law = \"linear\" }",
        "well.toml(15,17): error: static_youngs: factor is not set; expected a number")]
    [InlineData(
        "\"lacy-1997-combined\"", "{ factor = 0.7 }",
        "well.toml(15,17): error: static_youngs: law is not set; expected \"linear\" or \"power\"")]
    [InlineData(
        "\"lacy-1997-combined\"", "{ law = \"linar\", factr = 0.7 }",
        "well.toml(15,25): error: found \"linar\", expected law = one of \"linear\", \"power\"; did you mean \"linear\"?",
        "well.toml(15,17): error: static_youngs: factor is not set; expected a number",
        "well.toml(15,34): error: found the unknown key \"factr\" in static_youngs, expected one of law, factor, exponent, offset, input, input_unit, unit; did you mean \"factor\"?")]
    [InlineData(
        "\"lacy-1997-combined\"", "{ law = \"linear\", factor = 0.7, input = \"vp\" }",
        "well.toml(15,17): error: static_youngs: found a linear law from compressional velocity (velocity), expected an input of the same kind as the result (pressure), or law = \"power\" with input_unit and unit")]
    [InlineData(
        "\"lacy-1997-combined\"", "{ law = \"linear\", factor = 0.7, exponent = 3 }",
        "well.toml(15,60): error: static_youngs: found exponent, which a linear law does not have")]
    [InlineData(
        "\"lacy-1997-combined\"", "{ law = \"linear\", factor = 0.7, input = \"ucs\" }",
        "well.toml(15,57): error: static_youngs: found the input \"ucs\", which is not known yet where static Young's modulus is computed; expected one of \"vp\", \"vs\", \"density\", \"gamma_ray\", \"neutron\", \"deep_resistivity\", \"compressional_slowness\", \"shear_slowness\", \"gamma_ray_index\", \"shale_volume\", \"matrix_density\", \"fluid_density\", \"matrix_slowness\", \"fluid_slowness\", \"matrix_velocity\", \"fluid_velocity\", \"compaction_factor\", \"porosity\", \"youngs_dynamic\", \"poisson_dynamic\"")]
    [InlineData(
        "\"lacy-1997-combined\"", "{ law = \"linear\", factor = 0.7, offset = 3 }",
        "well.toml(15,58): error: found the bare number 3, expected offset = a quantity in quotes with a unit (MPa, GPa, kPa, Pa, bar, psi, ksi, Mpsi)")]
    public void A_linear_law_must_be_whole(string old, string replacement, params string[] expected) =>
        Assert.Equal(expected, WellText.Messages(WellText.With(old, replacement)));

    [Theory]
    [InlineData(
        "\"lacy-1997-combined\"", "{ law = \"power\", factor = 0.7, input = \"vp\" }",
        "well.toml(15,17): error: static_youngs: exponent is not set; expected a number",
        "well.toml(15,17): error: static_youngs: input_unit is not set; expected a unit, since the factor depends on it: m/s, km/s, ft/s",
        "well.toml(15,17): error: static_youngs: unit is not set; expected a unit, since the factor depends on it: MPa, GPa, kPa, Pa, bar, psi, ksi, Mpsi")]
    [InlineData(
        "\"lacy-1997-combined\"", "{ law = \"power\", factor = 0.1, exponent = 3, input = \"vp\", input_unit = \"psi\", unit = \"km/s\" }",
        "well.toml(15,89): error: found the unit \"psi\", expected input_unit = one of m/s, km/s, ft/s",
        "well.toml(15,103): error: found the unit \"km/s\", expected unit = one of MPa, GPa, kPa, Pa, bar, psi, ksi, Mpsi")]
    [InlineData(
        "\"lacy-1997-combined\"", "{ law = \"power\", factor = 0.1, exponent = 3, input = \"vp\", input_unit = \"km/s\", unit = \"GPa\", offset = \"3 GPa\" }",
        "well.toml(15,120): error: static_youngs: found offset, which a power law does not have")]
    public void A_power_law_must_be_whole(string old, string replacement, params string[] expected) =>
        Assert.Equal(expected, WellText.Messages(WellText.With(old, replacement)));
}
