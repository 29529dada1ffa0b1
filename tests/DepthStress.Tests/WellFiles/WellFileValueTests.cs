namespace DepthStress.Tests.WellFiles;

/// <summary>What the reader says of keys and values it cannot take; every problem with its place.</summary>
public sealed class WellFileValueTests
{
    [Theory]
    [InlineData(
        "datum_elevation", "datum_elevatoin",
        "well.toml(4,1): error: found the unknown key \"datum_elevatoin\" in [well], expected one of name, datum, datum_elevation, ground_elevation, water_depth, water_table_depth; did you mean \"datum_elevation\"?",
        "well.toml: error: [well] datum_elevation is not set; expected the datum's height above mean sea level")]
    [InlineData(
        "[biot]", "[bito]",
        "well.toml(18,2): error: found the unknown section [bito], expected one of accept_unverified, well, logs, survey, zones, lithology, conditioning, shale, prediction, porosity, anisotropy, moduli, strength, biot, pore_pressure, fluids, temperature, horizontal_stress, overburden, calibration, mud, casing, observations, core, layers, output; did you mean \"biot\"?",
        "well.toml: error: [biot] coefficient is not set; expected a value or a method: krief-1990-biot, consolidated-rock-biot, lee-2003-unconsolidated, nur-1998-critical-porosity and others, see \"depthstress methods --for biot\"")]
    [InlineData(
        "\"rotary table\"", "\"rotary tabel\"",
        "well.toml(3,9): error: found \"rotary tabel\", expected datum = one of \"rotary table\", \"ground\", \"sea level\"; did you mean \"rotary table\"?")]
    [InlineData(
        "above_log = \"2.0 g/cm3\"", "above_log = \"2.0 g/cm3\"\ngaps = \"linar\"",
        "well.toml(23,8): error: found \"linar\", expected gaps = one of \"none\", \"linear\", \"hold\"; did you mean \"linear\"?")]
    [InlineData(
        "[survey]", "[logs.curves]\ncompresional = \"DTC\"\n[survey]",
        "well.toml(12,1): error: found the unknown key \"compresional\" in [logs.curves], expected one of depth, compressional, shear, fast_shear, slow_shear, stoneley, density, gamma_ray, caliper, bit_size, density_correction, neutron, photoelectric, deep_resistivity, medium_resistivity, shallow_resistivity, temperature, porosity, shale_volume, facies, true_vertical_depth, vertical_position; did you mean \"compressional\"?")]
    public void Unknown_names_come_with_the_nearest_known_one(string old, string replacement, params string[] expected) =>
        Assert.Equal(expected, WellText.Messages(WellText.With(old, replacement)));

    [Theory]
    [InlineData(
        "\"30 m\"", "30",
        "well.toml(4,19): error: found the bare number 30, expected datum_elevation = a quantity in quotes with a unit (m, ft, in, mm, cm)")]
    [InlineData(
        "\"30 m\"", "\"30\"",
        "well.toml(4,19): error: datum_elevation: found \"30\" without a unit, expected one of m, ft, in, mm, cm")]
    [InlineData(
        "\"30 m\"", "\"30 psi\"",
        "well.toml(4,19): error: datum_elevation: found \"30 psi\", a pressure; expected a length in one of m, ft, in, mm, cm")]
    [InlineData(
        "\"30 m\"", "\"30,5 m\"",
        "well.toml(4,19): error: datum_elevation: found a comma in the number of \"30,5 m\", expected a decimal point and no group separators")]
    [InlineData(
        "\"30 m\"", "\"30 mtr\"",
        "well.toml(4,19): error: datum_elevation: found the unknown unit \"mtr\" in \"30 mtr\", expected one of m, ft, in, mm, cm")]
    [InlineData(
        "\"1.03 g/cm3\"", "1.03",
        "well.toml(26,17): error: found the bare number 1.03, expected fluid_density = a quantity in quotes with a unit (g/cm3, kg/m3, lb/ft3, lb/gal, sg, kPa/m, MPa/km, psi/ft, bar/m)")]
    [InlineData(
        "\"1.03 g/cm3\"", "\"1.03 psi\"",
        "well.toml(26,17): error: fluid_density: found \"1.03 psi\", a pressure; expected a density or pressure gradient in one of g/cm3, kg/m3, lb/ft3, lb/gal, sg, kPa/m, MPa/km, psi/ft, bar/m")]
    [InlineData(
        "\"1.03 g/cm3\"", "\"-1.03 g/cm3\"",
        "well.toml(26,17): error: found the text \"-1.03 g/cm3\", expected fluid_density above zero")]
    [InlineData(
        "above_log = \"2.0 g/cm3\"", "above_log = \"2.0 g/cm3\"\ngaps = 2",
        "well.toml(23,8): error: found the bare number 2, expected gaps = one of \"none\", \"linear\", \"hold\"")]
    [InlineData(
        "above_log = \"2.0 g/cm3\"", "above_log = \"2.0 g/cm3\"\ngaps = \"-2 g/cm3\"",
        "well.toml(23,8): error: found the text \"-2 g/cm3\", expected gaps above zero")]
    public void A_quantity_needs_a_number_with_a_point_and_a_fitting_unit(string old, string replacement, params string[] expected) =>
        Assert.Equal(expected, WellText.Messages(WellText.With(old, replacement)));

    [Theory]
    [InlineData(
        "name = \"Testwell 1\"", "name = 5",
        "well.toml(2,8): error: found the bare number 5, expected name = a text in quotes")]
    [InlineData(
        "name = \"Testwell 1\"", "name = 2020-01-01",
        "well.toml(2,8): error: found a date, expected name = a text in quotes")]
    [InlineData(
        "name = \"Testwell 1\"", "name = { a = 1 }",
        "well.toml(2,8): error: found a table, expected name = a text in quotes")]
    [InlineData(
        "vertical = true", "vertical = \"yes\"",
        "well.toml(12,12): error: found the text \"yes\", expected vertical = true or false")]
    [InlineData(
        "coefficient = 0.8", "coefficient = true",
        "well.toml(19,15): error: found true, expected coefficient = a method id, a number or a table with law = \"linear\" or \"power\"")]
    [InlineData(
        "coefficient = 0.8", "coefficient = nan",
        "well.toml(19,15): error: found the bare number nan, expected coefficient from 0 to 1")]
    [InlineData(
        "files = [\"logs.csv\"]", "files = [3]",
        "well.toml(9,9): error: found a list, expected files = a list of texts in quotes")]
    [InlineData(
        "[survey]", "[logs.curves]\nshear = 3\n[survey]",
        "well.toml(12,9): error: found the bare number 3, expected shear = a column name, a table, or a list of tables")]
    public void A_value_of_the_wrong_type_is_named(string old, string replacement, params string[] expected) =>
        Assert.Equal(expected, WellText.Messages(WellText.With(old, replacement)));

    [Theory]
    [InlineData(
        "[layers]\nmax_thickness = \"0 m\"\n",
        "well.toml(28,17): error: found the text \"0 m\", expected max_thickness above zero")]
    [InlineData(
        "[horizontal_stress]\nfriction_coefficient = -0.6\n",
        "well.toml(28,24): error: found the bare number -0.6, expected friction_coefficient from 0 to 2")]
    [InlineData(
        "[[lithology]]\nname = \"s\"\nshale_volume_max = 1.3\n",
        "well.toml(29,20): error: found the bare number 1.3, expected shale_volume_max from 0 to 1")]
    [InlineData(
        "[[lithology]]\nname = \"s\"\nshale_volume_min = 0.5\nshale_volume_max = 0.3\n",
        "well.toml(29,20): error: found shale_volume_min above shale_volume_max, expected a range that something can lie in")]
    [InlineData(
        "[[lithology]]\nname = \"s\"\n",
        "well.toml(27,3): error: [[lithology]] has no rule; expected a cut-off such as shale_volume_max, or facies")]
    [InlineData(
        "[[lithology]]\nshale_volume_max = 0.3\n",
        "well.toml(27,3): error: [[lithology]] name is not set")]
    public void Ranges_hold(string added, params string[] expected) =>
        Assert.Equal(expected, WellText.Messages(WellText.Sound + added));

    [Theory]
    [InlineData(
        "[output]\nunits = \"a\\nerror: b\"\n",
        "well.toml(28,9): error: found a control character or a line break inside a text, expected plain text",
        "well.toml(28,9): error: found \"aerror: b\", expected units = one of \"metric\", \"field\"")]
    [InlineData(
        "[[zones]]\nname = \"\\u001b[31mred\"\ntop = \"1000 m\"\ndepth_kind = \"md\"\n",
        "well.toml(28,8): error: found a control character or a line break inside a text, expected plain text")]
    public void A_text_that_would_break_messages_and_results_is_refused(string added, params string[] expected) =>
        Assert.Equal(expected, WellText.Messages(WellText.Sound + added));
}
