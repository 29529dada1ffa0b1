namespace DepthStress.Tests.WellFiles;

/// <summary>Datum, ground, sea and water table must go together.</summary>
public sealed class WellFileReferenceLevelTests
{
    [Theory]
    [InlineData(
        "water_table_depth = \"10 m\"", "water_depth = \"100 m\"",
        "well.toml(6,15): error: found both ground_elevation and water_depth, expected the first in a well on land or the second in a well at sea")]
    [InlineData(
        "ground_elevation = \"25 m\"\nwater_table_depth = \"10 m\"\n", "",
        "well.toml: error: [well] has neither ground_elevation (onshore) nor water_depth (offshore); expected one of them")]
    [InlineData(
        "ground_elevation = \"25 m\"", "water_depth = \"100 m\"",
        "well.toml(6,21): error: [well]: found a water table depth of 10 m with a water depth, expected it onshore only")]
    [InlineData(
        "\"rotary table\"", "\"ground\"",
        "well.toml(5,20): error: [well]: found a ground elevation of 25 m, expected the datum elevation of 30 m because the datum is the ground")]
    [InlineData(
        "ground_elevation = \"25 m\"", "ground_elevation = \"35 m\"",
        "well.toml(5,20): error: [well]: found a ground elevation of 35 m, expected at most the datum elevation of 30 m")]
    [InlineData(
        "ground_elevation = \"25 m\"\nwater_table_depth = \"10 m\"", "water_depth = \"-100 m\"",
        "well.toml(5,15): error: found the text \"-100 m\", expected water_depth not below zero")]
    [InlineData(
        "\"rotary table\"", "\"sea level\"",
        "well.toml(4,19): error: [well]: found a datum elevation of 30 m, expected 0 m because the datum is sea level")]
    [InlineData(
        "water_table_depth = \"10 m\"\n", "",
        "well.toml: note: [well] water_table_depth is not set: the water table is taken at the ground")]
    public void Levels_that_contradict_each_other_are_named_at_their_key(string old, string replacement, params string[] expected) =>
        Assert.Equal(expected, WellText.Messages(WellText.With(old, replacement)));
}
