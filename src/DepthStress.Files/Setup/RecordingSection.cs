using System.Globalization;
using System.Text.Json.Nodes;
using DepthStress.Core.Catalogue;
using DepthStress.Core.Diagnostics;
using DepthStress.Core.Logs;
using DepthStress.Core.Pressure;
using DepthStress.Core.Quantities;
using DepthStress.Files.Reading;

namespace DepthStress.Files.Setup;

/// <summary>Writes the resolved settings as JSON: each key's value and who decided it.</summary>
internal sealed class RecordingSection : ISection
{
    /// <summary>What has been written so far.</summary>
    public JsonObject Json { get; private init; } = [];

    /// <summary>True in a zone or lithology rule, which decides only what it says itself.</summary>
    private bool OnlyStated { get; init; }

    /// <inheritdoc/>
    public SourcePosition Position => SourcePosition.None;

    /// <inheritdoc/>
    public ISection OwnedBy(SettingKind kind, string owner) => new RecordingSection { Json = Json, OnlyStated = true };

    /// <inheritdoc/>
    public SettingSource SourceOf(string key) => SettingSource.NotSet;

    /// <inheritdoc/>
    public Setting<string> Text(string key, Setting<string> current, string doc) => Add(key, current, v => v);

    /// <inheritdoc/>
    public Setting<IReadOnlyList<string>> Texts(string key, Setting<IReadOnlyList<string>> current, string doc) =>
        Add(key, current, v => new JsonArray([.. v.Select(t => (JsonNode)t)]));

    /// <inheritdoc/>
    public Setting<bool> Flag(string key, Setting<bool> current, string doc) => Add(key, current, v => v);

    /// <inheritdoc/>
    public Setting<double> Number(string key, Setting<double> current, Interval allowed, string doc) => Add(key, current, v => v);

    /// <inheritdoc/>
    public Setting<IReadOnlyList<double>> Numbers(string key, Setting<IReadOnlyList<double>> current, string doc) =>
        Add(key, current, v => new JsonArray([.. v.Select(n => (JsonNode)n)]));

    /// <inheritdoc/>
    public Setting<MissingCodes> Codes(string key, Setting<MissingCodes> current, string doc) => Add(key, current, codes =>
    {
        JsonNode[] items = [.. codes.Numbers.Select(n => (JsonNode)n), .. codes.Texts.Select(t => (JsonNode)t)];
        return items is [var one] ? one : new JsonArray(items);
    });

    /// <inheritdoc/>
    public Setting<double> Quantity(string key, Setting<double> current, Sign sign, Dimension dimension, string doc) =>
        Add(key, current, v => Show(v, dimension));

    /// <inheritdoc/>
    public Setting<IReadOnlyList<double>> Quantities(string key, Setting<IReadOnlyList<double>> current, Dimension dimension, string doc) =>
        Add(key, current, v => new JsonArray([.. v.Select(n => (JsonNode)Show(n, dimension))]));

    /// <inheritdoc/>
    public Setting<double> FluidDensity(string key, Setting<double> current, string doc) => Add(key, current, v => Show(v, Dimension.Density));

    /// <inheritdoc/>
    public Setting<T> Choice<T>(string key, Setting<T> current, IReadOnlyList<(string Word, T Value)> words, string doc) =>
        Add(key, current, v => words.First(w => Equals(w.Value, v)).Word);

    /// <inheritdoc/>
    public Setting<T> ChoiceOrQuantity<T>(
        string key, Setting<T> current, IReadOnlyList<(string Word, T Value)> words, Dimension dimension, Func<double, T> make, Func<T, double?> quantity, string doc) =>
        Add(key, current, v => quantity(v) is { } si ? Show(si, dimension) : words.First(w => Equals(w.Value, v)).Word);

    /// <inheritdoc/>
    public Setting<Law> Law(string key, Setting<Law> current, Property predicts, string doc) =>
        Add(key, current, law => law.Standing == Standing.UserGiven ? $"{law.Text} {law.Unit.Symbol}".TrimEnd() : law.Id);

    /// <inheritdoc/>
    public Setting<ShallowDensity> ShallowDensity(string key, Setting<ShallowDensity> current, string doc) => Add(key, current, v => v switch
    {
        MeanDensity mean => Show(mean.Density, Dimension.Density),
        ExponentialDensity e => $"{ShallowDensityReader.Exponential} from {Show(e.Surface, Dimension.Density)} towards {Show(e.Matrix, Dimension.Density)}",
        PointDensity points => new JsonArray([.. points.Points.Select(p => (JsonNode)$"{Show(p.Density, Dimension.Density)} at {Show(p.Depth, Dimension.Length)}")]),
        _ => v.Law!.Id,
    });

    /// <inheritdoc/>
    public T Table<T>(string key, T current, Func<ISection, T, T> bind, string doc)
    {
        if (Inner(current, bind) is { Count: > 0 } json) Json[key] = json;
        return current;
    }

    /// <inheritdoc/>
    public IReadOnlyList<T> Tables<T>(string key, IReadOnlyList<T> current, Func<ISection, T, T> bind, T empty, string doc, string? shorthand = null)
    {
        if (current.Count > 0) Json[key] = new JsonArray([.. current.Select(item => (JsonNode)Inner(item, bind))]);
        return current;
    }

    private JsonObject Inner<T>(T current, Func<ISection, T, T> bind)
    {
        var inner = new RecordingSection { OnlyStated = OnlyStated };
        bind(inner, current);
        return inner.Json;
    }

    private Setting<T> Add<T>(string key, Setting<T> current, Func<T, JsonNode> show)
    {
        if (current.IsSet && !(OnlyStated && current.Source.Kind == SettingKind.Default)) Json[key] = new JsonObject { ["value"] = show(current.Value), ["from"] = From(current.Source) };
        return current;
    }

    private static string From(SettingSource source) => source.Kind switch
    {
        SettingKind.Default => "default",
        SettingKind.Calibrated => "calibrated",
        _ => source.Position.ToString(),
    };

    private static string Show(double si, Dimension dimension)
    {
        var (unit, _) = UnitSystem.Metric.UnitFor(dimension);
        return string.Create(CultureInfo.InvariantCulture, $"{unit.FromSi(si):G12} {unit.Symbol}");
    }
}
