using System.Text.Json.Nodes;
using DepthStress.Core.Quantities;
using DepthStress.Files.Writing;

namespace DepthStress.Tests.Writing;

public sealed class LayersSchemaTests
{
    private static readonly JsonNode Schema = JsonNode.Parse(LayersSchema.Json())!;

    private static JsonObject Layers(UnitSystem units)
    {
        var model = TinyWell.Model();
        return JsonNode.Parse(TinyWell.Text(s => LayersJson.Write(TinyWell.Layers(model), model.Setup, units, s)))!.AsObject();
    }

    [Fact]
    public void The_schema_is_as_it_was() => Golden.Match("layers-schema.json", LayersSchema.Json() + "\n");

    [Theory]
    [InlineData(UnitSystem.Metric)]
    [InlineData(UnitSystem.Field)]
    public void Written_layers_fit(UnitSystem units) => Assert.Empty(SchemaFit.Problems(Schema, Layers(units)));

    [Fact]
    public void Every_missing_renamed_or_wrong_member_is_seen()
    {
        foreach (var key in Layers(UnitSystem.Metric).Select(p => p.Key).ToList())
        {
            var file = Layers(UnitSystem.Metric);
            file.Remove(key);
            Assert.NotEmpty(SchemaFit.Problems(Schema, file));
            file[key] = true;
            Assert.NotEmpty(SchemaFit.Problems(Schema, file));
        }

        foreach (var key in Layers(UnitSystem.Metric)["layers"]![0]!.AsObject().Select(p => p.Key).ToList())
        {
            var file = Layers(UnitSystem.Metric);
            var layer = file["layers"]![0]!.AsObject();
            var value = layer[key]?.DeepClone();
            layer.Remove(key);
            Assert.NotEmpty(SchemaFit.Problems(Schema, file));
            layer[key + "_x"] = value;
            Assert.NotEmpty(SchemaFit.Problems(Schema, file));
            layer.Remove(key + "_x");
            layer[key] = new JsonArray();
            Assert.NotEmpty(SchemaFit.Problems(Schema, file));
        }
    }
}
