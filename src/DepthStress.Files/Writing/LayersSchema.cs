using System.Text.Encodings.Web;
using System.Text.Json;
using System.Text.Json.Nodes;
using DepthStress.Core.Layers;
using DepthStress.Core.Model;
using DepthStress.Core.Quantities;

namespace DepthStress.Files.Writing;

/// <summary>The JSON Schema of <c>layers.json</c>, made from the same columns as the file: one form for each unit system.</summary>
public static class LayersSchema
{
    private static readonly JsonSerializerOptions Options = new() { WriteIndented = true, NewLine = "\n", Encoder = JavaScriptEncoder.UnsafeRelaxedJsonEscaping };

    /// <summary>The schema as text.</summary>
    public static string Json() => new JsonObject
    {
        ["$schema"] = "https://json-schema.org/draft/2020-12/schema",
        ["title"] = "Layers of a DepthStress run",
        ["oneOf"] = new JsonArray(File(UnitSystem.Metric), File(UnitSystem.Field)),
    }.ToJsonString(Options);

    private static JsonObject File(UnitSystem units)
    {
        var numbers = LayerColumns.All.OfType<NumberColumn<LayerTable>>().ToList();
        return Table(units == UnitSystem.Metric ? "in metric units" : "in field units",
        [
            ("caution", Text("what the numbers are not for")),
            ("well", Text("the well's name")),
            ("depth", Depth(units)),
            ("stress", Text("what stresses mean", "total, compression positive")),
            ("unit_system", Text("the units of the file", units == UnitSystem.Metric ? "metric" : "field")),
            ("units", Table("unit symbol of each column of numbers", numbers.Select(c => (c.Header(units), Text(c.Title, Symbol(c, units)))))),
            ("layers", new JsonObject { ["type"] = "array", ["description"] = "the layers from top to bottom", ["items"] = Table("a layer", LayerColumns.All.Select(c => Column(c, units))) }),
        ]);
    }

    private static JsonObject Depth(UnitSystem units)
    {
        var suffix = DepthStatement.Length(units).Unit.Suffix;
        var depth = Table("datum and kinds of depth",
        [
            ("datum", Text("what measured depth counts from")),
            ("kinds", Table("what each kind of depth is", DepthStatement.Kinds.Select(k => (k.Name, Text("its meaning", k.Meaning))))),
        ]);
        depth["patternProperties"] = new JsonObject { [$"^[a-z_]+_{suffix}$"] = new JsonObject { ["type"] = "number", ["description"] = "height or depth of a surface" } };
        return depth;
    }

    private static (string, JsonObject) Column(Column<LayerTable> column, UnitSystem units) => column is NumberColumn<LayerTable> number
        ? (number.Header(units), OrNull("number", $"{column.Title}, {Symbol(number, units)}"))
        : (column.Id, OrNull("string", column.Title));

    private static string Symbol(NumberColumn<LayerTable> column, UnitSystem units) => column.In(units).Unit.Symbol is { Length: > 0 } symbol ? symbol : "1";

    private static JsonObject OrNull(string type, string doc) => new() { ["type"] = new JsonArray(type, "null"), ["description"] = doc };

    private static JsonObject Text(string doc, string? only = null)
    {
        var text = new JsonObject { ["type"] = "string", ["description"] = doc };
        if (only is not null) text["const"] = only;
        return text;
    }

    private static JsonObject Table(string doc, IEnumerable<(string Name, JsonObject Schema)> properties)
    {
        var all = properties.ToList();
        return new JsonObject
        {
            ["type"] = "object",
            ["description"] = doc,
            ["additionalProperties"] = false,
            ["required"] = new JsonArray([.. all.Select(p => (JsonNode)p.Name)]),
            ["properties"] = new JsonObject(all.Select(p => KeyValuePair.Create(p.Name, (JsonNode?)p.Schema))),
        };
    }
}
