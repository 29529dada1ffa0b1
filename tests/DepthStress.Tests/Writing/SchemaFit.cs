using System.Text.Json;
using System.Text.Json.Nodes;
using System.Text.RegularExpressions;

namespace DepthStress.Tests.Writing;

/// <summary>
/// The keywords of JSON Schema draft 2020-12 that the schema of layers uses, by the wording of the standard (Validation 6.1, 6.5;
/// Core 10.2, 10.3); a keyword it does not know is a problem, so that none is passed over.
/// </summary>
internal static class SchemaFit
{
    public static List<string> Problems(JsonNode schema, JsonNode? value, string path = "$")
    {
        var problems = new List<string>();
        foreach (var (keyword, rule) in schema.AsObject())
        {
            problems.AddRange(keyword switch
            {
                "$schema" or "title" or "description" => [],
                "type" => (rule is JsonArray types ? types.Any(t => Is(t!, value)) : Is(rule!, value)) ? [] : [$"{path}: not {rule!.ToJsonString()}"],
                "const" => JsonNode.DeepEquals(rule, value) ? [] : [$"{path}: not {rule!.ToJsonString()}"],
                "oneOf" => rule!.AsArray().Select(s => Problems(s!, value, path)).ToList() is var all && all.Count(p => p.Count == 0) == 1 ? [] : [$"{path}: not one form", .. all.MinBy(p => p.Count)!],
                "required" => value is JsonObject o ? rule!.AsArray().Select(n => n!.GetValue<string>()).Where(n => !o.ContainsKey(n)).Select(n => $"{path}: no {n}") : [],
                "properties" => value is JsonObject o ? rule!.AsObject().Where(p => o.ContainsKey(p.Key)).SelectMany(p => Problems(p.Value!, o[p.Key], $"{path}.{p.Key}")) : [],
                "patternProperties" => value is JsonObject o ? rule!.AsObject().SelectMany(p => o.Where(v => Regex.IsMatch(v.Key, p.Key)).SelectMany(v => Problems(p.Value!, v.Value, $"{path}.{v.Key}"))) : [],
                "additionalProperties" => value is JsonObject o ? o.Where(v => !Known(schema, v.Key)).Select(v => $"{path}: unknown {v.Key}") : [],
                "items" => value is JsonArray a ? a.SelectMany((v, k) => Problems(rule!, v, FormattableString.Invariant($"{path}[{k}]"))) : [],
                _ => [$"{path}: keyword {keyword}"],
            });
        }

        return problems;
    }

    private static bool Known(JsonNode schema, string key) =>
        schema["properties"]?.AsObject().ContainsKey(key) == true || schema["patternProperties"]?.AsObject().Any(p => Regex.IsMatch(key, p.Key)) == true;

    private static bool Is(JsonNode type, JsonNode? value) => (type.GetValue<string>(), value?.GetValueKind() ?? JsonValueKind.Null) is
        ("null", JsonValueKind.Null) or ("number", JsonValueKind.Number) or ("string", JsonValueKind.String) or ("object", JsonValueKind.Object) or ("array", JsonValueKind.Array);
}
