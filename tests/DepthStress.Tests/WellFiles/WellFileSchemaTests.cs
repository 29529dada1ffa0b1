using System.Text.Json.Nodes;
using DepthStress.Core.Diagnostics;
using DepthStress.Core.Model;
using DepthStress.Files.Setup;
using SampleWell;
using SampleWell.Twins;

namespace DepthStress.Tests.WellFiles;

/// <summary>The schema says what the reader takes: made from the same declarations, it must cover every key that shipped files use.</summary>
public sealed class WellFileSchemaTests
{
    private static readonly JsonObject Schema = JsonNode.Parse(WellFileSchema.Json())!.AsObject();

    [Fact]
    public void The_schema_is_as_it_was() => Golden.Match("schema.json", WellFileSchema.Json() + "\n");

    [Fact]
    public void The_schema_names_its_standard()
    {
        // Source: JSON Schema draft 2020-12, "The $schema keyword".
        Assert.Equal("https://json-schema.org/draft/2020-12/schema", Schema["$schema"]!.GetValue<string>());
        Assert.Equal("object", Schema["type"]!.GetValue<string>());
    }

    [Fact]
    public void Every_key_says_what_it_is()
    {
        var keys = new List<string>();
        Walk(Schema, "", (path, schema) =>
        {
            keys.Add(path);
            Assert.False(string.IsNullOrWhiteSpace(schema["description"]?.GetValue<string>()), path);
        });
        Assert.Contains(".zones.pore_pressure.points.depth", keys);
        Assert.Contains(".logs.curves.compressional.missing", keys);
        Assert.Contains(".horizontal_stress.friction_coefficient", keys);
    }

    [Fact]
    public void The_methods_offered_for_a_key_are_those_that_give_it()
    {
        foreach (var (section, key, property) in new[]
        {
            ("moduli", "static_youngs", Core.Logs.Property.YoungsStatic), ("strength", "ucs", Core.Logs.Property.Ucs),
            ("biot", "coefficient", Core.Logs.Property.Biot), ("shale", "volume", Core.Logs.Property.ShaleVolume),
        })
        {
            var offered = Schema["properties"]![section]!["properties"]![key]!["anyOf"]![0]!["enum"]!.AsArray().Select(n => n!.GetValue<string>());
            Assert.Equal(MethodCatalogue.For(property).Select(l => l.Id), offered);
        }
    }

    [Fact]
    public void Every_key_of_the_shipped_well_is_in_the_schema() => Covers(File.ReadAllText(Path.Combine(SampleLogs.DefaultFolder, "quillback-4.toml")), 60);

    [Theory]
    [InlineData(false)]
    [InlineData(true)]
    public void Every_key_of_a_twin_is_in_the_schema(bool offshore)
    {
        using var folder = new TestFolder();
        var truth = offshore ? Twin.WriteOffshore(folder.Path, 11, 1) : Twin.Write(folder.Path, 11, 1);
        Covers(File.ReadAllText(truth.WellFile), 40);
    }

    [Fact]
    public void A_key_that_the_reader_refuses_is_not_in_the_schema()
    {
        var table = TomlTree.Parse("[well]\nnaem = \"x\"\n", "t.toml", new DiagnosticBag())!;
        Assert.Equal([".well.naem"], Missing(table, Schema, "").Where(m => m.Missing).Select(m => m.Path));
    }

    private static void Covers(string toml, int atLeast)
    {
        var table = TomlTree.Parse(toml, "t.toml", new DiagnosticBag())!;
        var keys = Missing(table, Schema, "").ToList();
        Assert.Empty(keys.Where(k => k.Missing).Select(k => k.Path));
        Assert.True(keys.Count >= atLeast, "too few keys were looked at");
    }

    /// <summary>Every key of a table, and whether the schema lacks it.</summary>
    private static IEnumerable<(string Path, bool Missing)> Missing(TomlTable table, JsonObject schema, string path)
    {
        foreach (var (key, (_, value)) in table.Items)
        {
            var here = $"{path}.{key}";
            var found = Tables(schema).Select(t => t["properties"]![key]).FirstOrDefault(p => p is not null)?.AsObject();
            yield return (here, found is null);
            if (found is null) continue;
            var tables = value is TomlArray array ? array.Items.OfType<TomlTable>() : value is TomlTable one ? [one] : [];
            foreach (var inner in tables.SelectMany(t => Missing(t, found, here))) yield return inner;
        }
    }

    /// <summary>The forms of a schema that are tables.</summary>
    private static IEnumerable<JsonObject> Tables(JsonObject schema)
    {
        if (schema["properties"] is not null) yield return schema;
        if (schema["items"] is JsonObject items)
        {
            foreach (var table in Tables(items)) yield return table;
        }

        foreach (var form in schema["anyOf"]?.AsArray() ?? [])
        {
            foreach (var table in Tables(form!.AsObject())) yield return table;
        }
    }

    private static void Walk(JsonObject schema, string path, Action<string, JsonObject> visit)
    {
        foreach (var table in Tables(schema).Where(t => t["additionalProperties"] is not null))
        {
            foreach (var (key, inner) in table["properties"]!.AsObject())
            {
                visit($"{path}.{key}", inner!.AsObject());
                Walk(inner!.AsObject(), $"{path}.{key}", visit);
            }
        }
    }
}
