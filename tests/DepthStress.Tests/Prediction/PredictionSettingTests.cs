using System.Text.Json.Nodes;
using DepthStress.Core.Prediction;
using DepthStress.Files.Setup;
using DepthStress.Tests.WellFiles;

namespace DepthStress.Tests.Prediction;

/// <summary>The [prediction] section of the well file.</summary>
public class PredictionSettingTests
{
    private const string Choices = "trained, castagna-1985-mudrock, castagna-1993-sandstone, castagna-1993-shale and others, see \"depthstress methods --for vs\"";

    private static string With(string lines) => WellText.Sound + "[prediction]\n" + lines + "\n";

    private static int Line => WellText.Sound.Split('\n').Length + 1;

    [Theory]
    [InlineData("shear = \"traind\"", $"found the unknown method \"traind\", expected shear = one of {Choices}; did you mean \"trained\"?")]
    [InlineData("shear = \"gardner-1974\"", $"found \"gardner-1974\", which gives bulk density; expected shear = a method for shear velocity: {Choices}")]
    [InlineData("shear = \"greenberg-castagna-1992\"", "[prediction] shear = \"greenberg-castagna-1992\": its coefficients were recalled, not read in the source; set accept_unverified = true to use it")]
    [InlineData("shear = 1500", "found the bare number 1500, expected shear = a method id, a quantity with a unit (m/s, km/s, ft/s) or a table with law = \"linear\" or \"power\"")]
    public void A_choice_must_be_known_and_give_what_is_asked(string line, string expected) =>
        Assert.Equal([FormattableString.Invariant($"well.toml({Line},9): error: {expected}")], WellText.Messages(With(line)));

    [Fact]
    public void A_relation_that_needs_a_parameter_says_which()
    {
        var messages = WellText.Messages(With("shear = \"dvorkin-2008\""));
        Assert.Contains(messages, m => m.EndsWith("[prediction] shear = \"dvorkin-2008\" needs [biot] matrix_shear_velocity", StringComparison.Ordinal));
        Assert.Contains(messages, m => m.EndsWith("[prediction] shear = \"dvorkin-2008\" needs [porosity] matrix_density", StringComparison.Ordinal));
    }

    [Fact]
    public void Trained_a_constant_and_a_law_of_ones_own_are_read()
    {
        var settings = WellText.Sections(With("shear = \"trained\"\ndensity = \"2.3 g/cm3\"")).Setup.Settings.Prediction;
        Assert.True(TrainedRelation.Is(settings.Shear.Value));
        Assert.Equal("constant", settings.Density.Value.Id);
        settings = WellText.Sections(With("shear = { law = \"linear\", input = \"vp\", factor = 0.8, offset = \"-0.9 km/s\" }")).Setup.Settings.Prediction;
        Assert.Equal("linear", settings.Shear.Value.Id);
    }

    [Fact]
    public void A_zone_overrides_the_well()
    {
        var zone = new PredictionSettings { Shear = new(TrainedRelation.For(Core.Logs.Property.Vs)!, new(Core.Diagnostics.SettingKind.Zone, default)) };
        var well = WellText.Sections(With("shear = \"castagna-1985-mudrock\"\ndensity = \"gardner-1974\"")).Setup.Settings.Prediction;
        Assert.True(TrainedRelation.Is(zone.Over(well).Shear.Value));
        Assert.Equal("gardner-1974", zone.Over(well).Density.Value.Id);
    }

    [Fact]
    public void The_schema_offers_trained()
    {
        var shear = JsonNode.Parse(WellFileSchema.Json())!["properties"]!["prediction"]!["properties"]!["shear"]!;
        Assert.Equal("trained", shear["anyOf"]![0]!["enum"]![0]!.GetValue<string>());
    }
}
