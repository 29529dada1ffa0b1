using System.Globalization;
using System.Text.Json;
using DepthStress.Core.Layers;
using DepthStress.Core.Model;
using DepthStress.Core.Quantities;
using DepthStress.Files.Writing;

namespace DepthStress.Tests.Writing;

public sealed class LayersJsonTests
{
    private static JsonElement Read(UnitSystem units, EarthModel? model = null)
    {
        model ??= TinyWell.Model();
        using var document = JsonDocument.Parse(TinyWell.Text(s => LayersJson.Write(TinyWell.Layers(model), model.Setup, units, s)));
        return document.RootElement.Clone();
    }

    [Fact]
    public void The_whole_file_is_as_kept()
    {
        var model = TinyWell.Model();
        Golden.Match("layers.json", TinyWell.Text(s => LayersJson.Write(TinyWell.Layers(model), model.Setup, UnitSystem.Metric, s)));
    }

    [Fact]
    public void It_carries_caution_datum_and_depth_kinds()
    {
        var root = Read(UnitSystem.Field);
        Assert.Equal(Caution.Text, root.GetProperty("caution").GetString());
        Assert.Equal("rotary table", root.GetProperty("depth").GetProperty("datum").GetString());
        Assert.Equal("369.0945", root.GetProperty("depth").GetProperty("datum_elevation_ft").GetRawText()); // 112.5 m / 0.3048
        Assert.Equal(["md", "tvd", "tvdss"], root.GetProperty("depth").GetProperty("kinds").EnumerateObject().Select(p => p.Name));
    }

    [Theory]
    [InlineData(UnitSystem.Metric)]
    [InlineData(UnitSystem.Field)]
    public void A_layer_holds_the_names_and_numbers_of_the_csv_and_null_where_that_is_empty(UnitSystem units)
    {
        var csv = TinyWell.Text(s => LayersCsv.Write(TinyWell.Layers(TinyWell.Model()), units, s)).TrimEnd('\n').Split('\n');
        var layers = Read(units).GetProperty("layers").EnumerateArray().ToList();
        Assert.Equal(csv.Length - 1, layers.Count);
        for (var row = 0; row < layers.Count; row++)
        {
            Assert.Equal(csv[0].Split(','), layers[row].EnumerateObject().Select(p => p.Name));
            Assert.Equal(
                csv[row + 1].Split(',').Select(c => c.Length == 0 ? "null" : c),
                layers[row].EnumerateObject().Select(p => p.Value.ValueKind == JsonValueKind.String ? p.Value.GetString() : p.Value.GetRawText()));
        }

        Assert.Equal(JsonValueKind.Null, layers[0].EnumerateObject().First(p => p.Name.StartsWith("ucs", StringComparison.Ordinal)).Value.ValueKind);
    }

    [Fact]
    public void The_units_name_every_column_of_numbers()
    {
        var units = Read(UnitSystem.Metric).GetProperty("units");
        Assert.Equal(
            LayerColumns.All.OfType<NumberColumn<LayerTable>>().Select(c => c.Header(UnitSystem.Metric)),
            units.EnumerateObject().Select(p => p.Name));
        Assert.Equal("MPa", units.GetProperty("shmin_mean_mpa").GetString());
        Assert.Equal("1", units.GetProperty("biot").GetString());
    }

    [Fact]
    public void Hostile_names_come_back_without_control_characters()
    {
        var root = Read(UnitSystem.Metric, TinyWell.Model(name: "a\u0000\"b\n\\", upper: "\ud800x", lower: "=1\t+2"));
        Assert.Equal("a\"b\\", root.GetProperty("well").GetString());
        Assert.Equal(["\ufffdx", "=1+2"], root.GetProperty("layers").EnumerateArray().Select(l => l.GetProperty("zone").GetString()));
    }

    [Fact]
    public void Numbers_are_read_back_as_the_layers_hold_them()
    {
        var model = TinyWell.Model();
        var layer = TinyWell.Layers(model).Layers[0];
        var read = Read(UnitSystem.Metric, model).GetProperty("layers")[0];
        // Half of the last written digit.
        Assert.Equal(layer.TopTvd, read.GetProperty("top_tvd_m").GetDouble(), 0.5001e-4);
        Assert.Equal(layer.Profile(Core.Logs.Property.MinHorizontalStress).Mean / 1e6, read.GetProperty("shmin_mean_mpa").GetDouble(), 0.5001e-4);
        Assert.Equal(layer.Samples.ToString(CultureInfo.InvariantCulture), read.GetProperty("samples").GetRawText());
    }
}
