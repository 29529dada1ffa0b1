using System.Text.Json.Nodes;
using DepthStress.Core.Catalogue;
using DepthStress.Core.Diagnostics;
using DepthStress.Core.Logs;
using DepthStress.Core.Model;
using DepthStress.Core.Prediction;
using DepthStress.Core.Pressure;
using DepthStress.Core.Quantities;
using DepthStress.Files.Reading;

namespace DepthStress.Files.Setup;

/// <summary>Collects the keys that bindings declare as a JSON Schema.</summary>
internal sealed class SchemaSection : ISection
{
    private readonly JsonObject _properties = [];

    /// <inheritdoc/>
    public SourcePosition Position => SourcePosition.None;

    /// <summary>The schema of this table.</summary>
    public JsonObject Schema(string doc) => new()
    {
        ["type"] = "object",
        ["description"] = doc,
        ["additionalProperties"] = false,
        ["properties"] = _properties,
    };

    /// <inheritdoc/>
    public ISection OwnedBy(SettingKind kind, string owner) => this;

    /// <inheritdoc/>
    public SettingSource SourceOf(string key) => SettingSource.NotSet;

    /// <inheritdoc/>
    public Setting<string> Text(string key, Setting<string> current, string doc) => Add(key, current, Of("string", doc));

    /// <inheritdoc/>
    public Setting<IReadOnlyList<string>> Texts(string key, Setting<IReadOnlyList<string>> current, string doc) =>
        Add(key, current, OneOrMany(doc, new JsonObject { ["type"] = "string" }));

    /// <inheritdoc/>
    public Setting<bool> Flag(string key, Setting<bool> current, string doc) => Add(key, current, Of("boolean", doc));

    /// <inheritdoc/>
    public Setting<double> Number(string key, Setting<double> current, Interval allowed, string doc)
    {
        var schema = Of("number", doc);
        if (double.IsFinite(allowed.Low)) schema["minimum"] = allowed.Low;
        if (double.IsFinite(allowed.High)) schema["maximum"] = allowed.High;
        return Add(key, current, schema);
    }

    /// <inheritdoc/>
    public Setting<IReadOnlyList<double>> Numbers(string key, Setting<IReadOnlyList<double>> current, string doc) =>
        Add(key, current, OneOrMany(doc, new JsonObject { ["type"] = "number" }));

    /// <inheritdoc/>
    public Setting<MissingCodes> Codes(string key, Setting<MissingCodes> current, string doc) =>
        Add(key, current, OneOrMany(doc, new JsonObject { ["type"] = List(["number", "string"]) }));

    /// <inheritdoc/>
    public Setting<double> Quantity(string key, Setting<double> current, Sign sign, Dimension dimension, string doc) =>
        Add(key, current, QuantitySchema(doc, dimension));

    /// <inheritdoc/>
    public Setting<IReadOnlyList<double>> Quantities(string key, Setting<IReadOnlyList<double>> current, Dimension dimension, string doc) =>
        Add(key, current, OneOrMany(doc, QuantitySchema(doc, dimension)));

    /// <inheritdoc/>
    public Setting<double> FluidDensity(string key, Setting<double> current, string doc) =>
        Add(key, current, QuantitySchema(doc, Dimension.Density, Dimension.PressureGradient));

    /// <inheritdoc/>
    public Setting<T> Choice<T>(string key, Setting<T> current, IReadOnlyList<(string Word, T Value)> words, string doc)
    {
        var schema = Of("string", doc);
        schema["enum"] = List(words.Select(w => w.Word));
        return Add(key, current, schema);
    }

    /// <inheritdoc/>
    public Setting<T> ChoiceOrQuantity<T>(
        string key, Setting<T> current, IReadOnlyList<(string Word, T Value)> words, Dimension dimension, Func<double, T> make, Func<T, double?> quantity, string doc) =>
        Add(key, current, new JsonObject
        {
            ["description"] = doc,
            ["anyOf"] = new JsonArray(
                new JsonObject { ["enum"] = List(words.Select(w => w.Word)) },
                QuantitySchema("or a quantity", dimension)),
        });

    /// <inheritdoc/>
    public Setting<Law> Law(string key, Setting<Law> current, Property predicts, string doc)
    {
        var dimension = PropertyNames.Dimension(predicts);
        JsonNode constant = dimension is Dimension.None or Dimension.Fraction
            ? new JsonObject { ["type"] = "number" }
            : QuantitySchema("one value", dimension);
        var parts = new SchemaSection();
        LawReader.Parts(parts, predicts);
        var own = parts.Schema("a relation with coefficients of your own");
        own["required"] = List(["law", "factor"]);
        return Add(key, current, new JsonObject
        {
            ["description"] = doc,
            ["anyOf"] = new JsonArray(new JsonObject { ["enum"] = List(MethodCatalogue.For(predicts).Select(l => l.Id).Prepend(TrainedRelation.For(predicts)?.Id).OfType<string>()) }, constant, own),
        });
    }

    /// <inheritdoc/>
    public Setting<ShallowDensity> ShallowDensity(string key, Setting<ShallowDensity> current, string doc)
    {
        var exponential = new SchemaSection();
        exponential.Choice("method", default, [(ShallowDensityReader.Exponential, 0)], "the shape of the curve");
        exponential.Quantity("surface_density", default, Sign.Positive, Dimension.Density, "density at the ground or mudline");
        exponential.Quantity("matrix_density", default, Sign.Positive, Dimension.Density, "density that great depth tends to");
        var point = new SchemaSection();
        point.Quantity("depth", default, Sign.NotNegative, Dimension.Length, "depth below the ground or mudline");
        point.Quantity("density", default, Sign.Positive, Dimension.Density, "density there");
        return Add(key, current, new JsonObject
        {
            ["description"] = doc,
            ["anyOf"] = new JsonArray(
                QuantitySchema("a mean density", Dimension.Density),
                new JsonObject { ["enum"] = List(ShallowDensityReader.Laws.Select(l => l.Id)) },
                exponential.Schema("an exponential that meets the first logged density"),
                new JsonObject { ["type"] = "array", ["items"] = point.Schema("a density at a depth") }),
        });
    }

    /// <inheritdoc/>
    public T Table<T>(string key, T current, Func<ISection, T, T> bind, string doc)
    {
        var inner = new SchemaSection();
        bind(inner, current);
        _properties[key] = inner.Schema(doc);
        return current;
    }

    /// <inheritdoc/>
    public IReadOnlyList<T> Tables<T>(string key, IReadOnlyList<T> current, Func<ISection, T, T> bind, T empty, string doc, string? shorthand = null)
    {
        var inner = new SchemaSection();
        bind(inner, empty);
        var table = inner.Schema(doc);
        _properties[key] = shorthand is null
            ? new JsonObject { ["type"] = "array", ["description"] = doc, ["items"] = table }
            : new JsonObject
            {
                ["description"] = doc,
                ["anyOf"] = new JsonArray(
                    new JsonObject { ["type"] = "string", ["description"] = $"the {shorthand}'s name" },
                    table.DeepClone(),
                    new JsonObject
                    {
                        ["type"] = "array",
                        ["items"] = new JsonObject { ["anyOf"] = new JsonArray(new JsonObject { ["type"] = "string" }, table) },
                    }),
            };
        return current;
    }

    private Setting<T> Add<T>(string key, Setting<T> current, JsonObject schema)
    {
        _properties[key] = schema;
        return current;
    }

    private static JsonObject Of(string type, string doc) => new() { ["type"] = type, ["description"] = doc };

    private static JsonObject OneOrMany(string doc, JsonObject item) => new()
    {
        ["description"] = doc,
        ["anyOf"] = new JsonArray(item.DeepClone(), new JsonObject { ["type"] = "array", ["items"] = item }),
    };

    private static JsonObject QuantitySchema(string doc, params ReadOnlySpan<Dimension> dimensions)
    {
        var schema = Of("string", $"{doc}; a quantity with a unit: {Units.Symbols(dimensions)}");
        schema["pattern"] = "^\\s*[-+]?[0-9.]";
        return schema;
    }

    private static JsonArray List(IEnumerable<string> words) => new([.. words.Select(w => (JsonNode)w)]);
}
