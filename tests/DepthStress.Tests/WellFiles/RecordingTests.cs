using System.Text.Json.Nodes;
using DepthStress.Files.Setup;

namespace DepthStress.Tests.WellFiles;

/// <summary>The record of a run says every setting with its value and who decided it.</summary>
public sealed class RecordingTests
{
    private static readonly string Rich = WellText.Sound
        .Exchange("method = \"hydrostatic\"\nfluid_density = \"1.03 g/cm3\"\n", "method = \"table\"\ndepth_kind = \"tvd\"\npoints = [{ depth = \"0 m\", pressure = \"0 MPa\" }, { depth = \"9842.52 ft\", pressure = \"30 MPa\" }]\n")
        .Exchange("\"lacy-1997-combined\"", "{ law = \"linear\", factor = 0.7, unit = \"GPa\" }")
        + "[logs.curves]\nshear = [{ column = \"S1\", base = \"1001 m\" }, { column = \"S2\", missing = 0 }]\n"
        + "[[zones]]\nname = \"a\"\ntop = \"1000 m\"\ndepth_kind = \"md\"\n[zones.biot]\ncoefficient = 0.7\n"
        + "[[zones]]\nname = \"b\"\ntop = \"1001 m\"\ndepth_kind = \"md\"\n";

    private static readonly JsonObject Json = Record(Rich);

    [Theory]
    [InlineData("well.name", "Testwell 1", "well.toml(2,8)")]
    [InlineData("well.datum", "rotary table", "well.toml(3,9)")]
    [InlineData("well.datum_elevation", "30 m", "well.toml(4,19)")]
    [InlineData("moduli.static_youngs", "0.7 youngs_dynamic + 0 GPa", "well.toml(15,17)")]
    [InlineData("moduli.static_poisson", "equal-to-dynamic", "well.toml(16,18)")]
    [InlineData("pore_pressure.points.1.depth", "3000.000096 m", "well.toml(27,10)")]
    [InlineData("pore_pressure.points.1.pressure", "30 MPa", "well.toml(27,10)")]
    [InlineData("overburden.above_log", "2 g/cm3", "well.toml(22,13)")]
    [InlineData("overburden.gaps", "none", "default")]
    [InlineData("output.units", "metric", "default")]
    [InlineData("logs.curves.shear.0.base", "1001 m", "well.toml(29,34)")]
    [InlineData("logs.curves.shear.1.column", "S2", "well.toml(29,57)")]
    [InlineData("zones.1.name", "b", "well.toml(37,8)")]
    public void A_setting_has_its_value_and_its_source(string path, string value, string from)
    {
        var setting = path.Split('.').Aggregate((JsonNode)Json, (node, key) =>
            node is JsonArray array ? array[int.Parse(key, System.Globalization.CultureInfo.InvariantCulture)]! : node[key]!);
        Assert.Equal((value, from), (setting["value"]!.GetValue<string>(), setting["from"]!.GetValue<string>()));
    }

    [Fact]
    public void Numbers_and_flags_stay_what_they_are()
    {
        Assert.Equal(0.6, Json["horizontal_stress"]!["friction_coefficient"]!["value"]!.GetValue<double>());
        Assert.Equal("default", Json["horizontal_stress"]!["friction_coefficient"]!["from"]!.GetValue<string>());
        Assert.False(Json["accept_unverified"]!["value"]!.GetValue<bool>());
        Assert.True(Json["survey"]!["vertical"]!["value"]!.GetValue<bool>());
        Assert.Equal(0, Json["logs"]!["curves"]!["shear"]![1]!["missing"]!["value"]!.GetValue<double>());
        Assert.Equal("""[0,-1.5,"off","N/A"]""", Missing("[0, \"off\", -1.5, \"N/A\"]").ToJsonString());
        Assert.Equal("off", Missing("\"off\"").GetValue<string>());
    }

    [Fact]
    public void A_zone_records_only_what_it_decides()
    {
        Assert.Equal(["name", "top", "depth_kind", "biot"], Json["zones"]![0]!.AsObject().Select(k => k.Key));
        Assert.Equal("well.toml(35,15)", Json["zones"]![0]!["biot"]!["coefficient"]!["from"]!.GetValue<string>());
        Assert.Equal(["name", "top", "depth_kind"], Json["zones"]![1]!.AsObject().Select(k => k.Key));
    }

    [Fact]
    public void Everything_the_file_sets_is_recorded()
    {
        var set = Rich.Split('\n').Count(l => l.Contains('=', StringComparison.Ordinal));
        var recorded = Settings(Json).Where(s => s["from"]!.GetValue<string>() != "default").Select(s => s["from"]!.GetValue<string>()[..^1].Split('(', ',')[1]);
        Assert.Equal(set, recorded.Distinct().Count()); // one key a line
    }

    private static JsonNode Missing(string value) =>
        Record(WellText.Sound + $"[logs.curves]\nshear = {{ column = \"S\", missing = {value} }}\n")["logs"]!["curves"]!["shear"]![0]!["missing"]!["value"]!;

    private static IEnumerable<JsonObject> Settings(JsonNode? node) => node switch
    {
        JsonObject o when o.ContainsKey("from") => [o],
        JsonObject o => o.SelectMany(k => Settings(k.Value)),
        JsonArray a => a.SelectMany(Settings),
        _ => [],
    };

    private static JsonObject Record(string text)
    {
        var section = new RecordingSection();
        Bindings.All(section, WellText.Sections(text).Sections);
        return section.Json;
    }
}
