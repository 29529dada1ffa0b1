using System.Text.Encodings.Web;
using System.Text.Json;
using System.Text.Json.Nodes;

namespace DepthStress.Files.Setup;

/// <summary>The JSON Schema of the well file, made from the same declarations that read it.</summary>
public static class WellFileSchema
{
    private static readonly JsonSerializerOptions Indented = new() { WriteIndented = true, NewLine = "\n", Encoder = JavaScriptEncoder.UnsafeRelaxedJsonEscaping };

    /// <summary>The schema as JSON text.</summary>
    public static string Json()
    {
        var root = new SchemaSection();
        Bindings.All(root, new WellFileSections());
        var schema = root.Schema("A DepthStress well file");
        schema.Insert(0, "$schema", JsonValue.Create("https://json-schema.org/draft/2020-12/schema"));
        schema.Insert(1, "title", JsonValue.Create("DepthStress well file"));
        return schema.ToJsonString(Indented);
    }
}
