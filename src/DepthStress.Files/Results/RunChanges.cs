using System.Text.Encodings.Web;
using System.Text.Json;
using System.Text.Json.Nodes;
using System.Text.RegularExpressions;

namespace DepthStress.Files.Results;

/// <summary>One thing that is not the same in two runs.</summary>
/// <param name="What">Its key.</param>
/// <param name="Before">In the first run; empty where it is not there.</param>
/// <param name="After">In the second run; empty where it is not there.</param>
public sealed record RunChange(string What, string Before, string After);

/// <summary>What changed between the records of two runs.</summary>
/// <param name="Setup">Settings, key by key; who decided them does not matter.</param>
/// <param name="Inputs">Files by their hashes.</param>
/// <param name="Methods">Methods by key, zone and lithology.</param>
/// <param name="Findings">Findings that went, and that came.</param>
public sealed partial record RunChanges(
    IReadOnlyList<RunChange> Setup, IReadOnlyList<RunChange> Inputs, IReadOnlyList<RunChange> Methods, IReadOnlyList<RunChange> Findings)
{
    private static readonly JsonSerializerOptions Plain = new() { Encoder = JavaScriptEncoder.UnsafeRelaxedJsonEscaping };

    /// <summary>True when nothing changed.</summary>
    public bool None => Setup.Count + Inputs.Count + Methods.Count + Findings.Count == 0;

    /// <summary>Compares two records.</summary>
    public static RunChanges Of(ResultSet before, ResultSet after)
    {
        ArgumentNullException.ThrowIfNull(before);
        ArgumentNullException.ThrowIfNull(after);
        var sameUnits = before.Units == after.Units;
        return new RunChanges(
            Compare(Settings(before.Run), Settings(after.Run)), Compare(FilesOf(before.Run), FilesOf(after.Run)),
            Compare(Uses(before.Run), Uses(after.Run)), Compare(Found(before.Run, sameUnits), Found(after.Run, sameUnits)));
    }

    private static List<RunChange> Compare(List<(string Key, string Shown, string Value)> before, List<(string Key, string Shown, string Value)> after)
    {
        var (old, young) = (before.ToLookup(e => e.Key), after.ToLookup(e => e.Key));
        var keys = before.Select(e => e.Key).Concat(after.Select(e => e.Key)).Distinct(StringComparer.Ordinal);
        return
        [
            .. keys.Where(k => !old[k].Select(e => e.Value).SequenceEqual(young[k].Select(e => e.Value)))
                .Select(k => new RunChange(k, string.Join("; ", old[k].Select(e => e.Shown)), string.Join("; ", young[k].Select(e => e.Shown)))),
        ];
    }

    private static List<(string, string, string)> Settings(JsonObject run)
    {
        var settings = new List<(string, string, string)>();
        Walk(run["setup"], "");
        return settings;

        void Walk(JsonNode? node, string path)
        {
            switch (node)
            {
                case JsonObject leaf when leaf.ContainsKey("value") && leaf.ContainsKey("from"):
                    Add(path, leaf["value"]);
                    break;
                case JsonObject branch:
                    foreach (var (key, child) in branch) Walk(child, path.Length == 0 ? key : $"{path}.{key}");
                    break;
                case JsonArray list:
                    for (var i = 0; i < list.Count; i++) Walk(list[i], $"{path}[{Name(list[i]) ?? FormattableString.Invariant($"{i + 1}")}]");
                    break;
                case not null:
                    Add(path, node);
                    break;
            }
        }

        void Add(string path, JsonNode? value)
        {
            var text = Show(value);
            settings.Add((path, text, text));
        }
    }

    /// <summary>The name of a zone or rule, by which its settings are found in the other run.</summary>
    private static string? Name(JsonNode? node) => node is JsonObject item && item["name"] is JsonObject name && name["value"] is JsonValue value ? Show(value) : null;

    private static List<(string, string, string)> FilesOf(JsonObject run) =>
        [.. Items(run, "inputs").Select(i => (Show(i["file"]), Short(Show(i["sha256"])), Show(i["sha256"])))];

    private static string Short(string hash) => hash.Length > 12 ? $"sha256 {hash[..12]}" : hash;

    private static List<(string, string, string)> Uses(JsonObject run) =>
    [
        .. Items(run, "methods").SelectMany(m => Items(m, "where").Select(w =>
        {
            var place = string.Join(", ", new[] { Show(w["zone"]), Show(w["lithology"]) }.Where(p => p.Length > 0));
            var method = $"{Show(m["method"])}: {Show(m["formula"])}";
            return (place.Length > 0 ? $"{Show(m["key"])}, {place}" : Show(m["key"]), method, method);
        })),
    ];

    /// <summary>The findings by their words; where the units differ, numbers and units are left out of the comparison.</summary>
    private static List<(string, string, string)> Found(JsonObject run, bool sameUnits)
    {
        var findings = (run["findings"] as JsonArray ?? []).Select(Show).ToList();
        return [.. findings.Select(f => (sameUnits ? f : NumberWithUnit().Replace(f, "#"), f, sameUnits ? f : ""))];
    }

    private static IEnumerable<JsonObject> Items(JsonObject node, string key) => (node[key] as JsonArray ?? []).OfType<JsonObject>();

    private static string Show(JsonNode? node) => node switch
    {
        null => "",
        JsonValue value when value.TryGetValue<string>(out var text) => text,
        _ => node.ToJsonString(Plain),
    };

    [GeneratedRegex(@"-?\d[\d.]*( ?(MPa|GPa|Mpsi|kPa/m|psi/ft|psi|g/cm3|lb/gal|us/ft|m/s|ft/s|degC|degF|ft|m)\b)?")]
    private static partial Regex NumberWithUnit();
}
