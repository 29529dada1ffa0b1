using System.Security.Cryptography;
using System.Text.Json;
using System.Text.Json.Nodes;
using DepthStress.Core.Depth;
using DepthStress.Core.Diagnostics;
using DepthStress.Core.Layers;
using DepthStress.Core.Model;
using DepthStress.Core.Quantities;
using DepthStress.Files.Writing;

namespace DepthStress.Files.Results;

/// <summary>A result folder of <c>run</c>, read back as far as a comparison needs it.</summary>
/// <param name="Name">The folder as the user named it.</param>
/// <param name="Run">What run.json says.</param>
/// <param name="Depth">Depths, stresses and zones of depth.csv.</param>
/// <param name="Layers">Some columns of layers.csv.</param>
/// <param name="Hash">SHA-256 over both tables' bytes.</param>
public sealed record ResultSet(string Name, JsonObject Run, ResultCsv Depth, ResultCsv Layers, string Hash)
{
    /// <summary>The stresses that are compared, as ids of columns.</summary>
    public static IReadOnlyList<string> Stresses { get; } = ["sv", "pp", "shmin", "shmax"];

    /// <summary>The layer columns that are compared.</summary>
    public static IReadOnlyList<string> LayerNumbers { get; } = ["youngs_static", "poisson_static", "density", "pp_mean", "sv_mean", "shmin_mean", "shmax_mean"];

    /// <summary>The units of the results.</summary>
    public UnitSystem Units => Depth.Units;

    /// <summary>Name of the well.</summary>
    public string Well => Text("well");

    /// <summary>What depths count from.</summary>
    public DepthFrame Frame
    {
        get
        {
            var datum = Run["datum"] as JsonObject ?? [];
            double? Metres(string key) => datum[key] is JsonValue value && value.TryGetValue<double>(out var metres) ? metres : null;
            var name = datum["datum"] is JsonValue word && word.TryGetValue<string>(out var text) ? text : "";
            var kind = Enum.GetValues<DatumKind>().FirstOrDefault(k => k.Name() == name, DatumKind.RotaryTable);
            return new DepthFrame(kind, Metres("datum_elevation_m") ?? 0, Metres("ground_elevation_m"), Metres("water_depth_m"), Metres("water_table_depth_m"));
        }
    }

    /// <summary>Reads a folder; null, with every problem told, where it does not hold results of this version of the program.</summary>
    /// <param name="path">Full path.</param>
    /// <param name="name">The folder as the user named it.</param>
    /// <param name="diagnostics">Gets every problem.</param>
    public static ResultSet? Read(string path, string name, DiagnosticBag diagnostics)
    {
        ArgumentNullException.ThrowIfNull(path);
        ArgumentNullException.ThrowIfNull(name);
        ArgumentNullException.ThrowIfNull(diagnostics);
        if (!Directory.Exists(path)) return Refuse(diagnostics, name, File.Exists(path) ? "found a file, expected a result folder" : "folder not found");
        if (!File.Exists(Path.Combine(path, "run.json"))) return Refuse(diagnostics, name, "found no run.json, expected a result folder of \"depthstress run\"");
        string Place(string file) => $"{name.TrimEnd('/', '\\')}/{file}";
        if (ReadRun(Path.Combine(path, "run.json"), Place("run.json"), diagnostics) is not { } run) return null;
        var depth = ResultCsv.Read(Path.Combine(path, "depth.csv"), Place("depth.csv"), DepthColumns.All, ["md", "tvd", .. Stresses, "zone"], diagnostics);
        var layers = ResultCsv.Read(
            Path.Combine(path, "layers.csv"), Place("layers.csv"), LayerColumns.All, ["top_tvd", "base_tvd", "layer", .. LayerNumbers, "zone"], diagnostics);
        if (depth is null || layers is null) return null;
        if (depth.Count == 0) return Refuse(diagnostics, Place("depth.csv"), "found no rows, expected at least one sample");
        if (depth.Units != layers.Units) return Refuse(diagnostics, Place("layers.csv"), "found other units than in depth.csv, expected the files of one run");
        var hash = HashOf(path, "depth.csv") + HashOf(path, "layers.csv");
        return new ResultSet(name, run, depth, layers, hash);
    }

    private static JsonObject? ReadRun(string path, string name, DiagnosticBag diagnostics)
    {
        try
        {
            if (JsonNode.Parse(File.ReadAllText(path)) is not JsonObject run || !Is(run["program"], "DepthStress"))
                diagnostics.Error(new SourcePosition(name), "found no record of a run of this program, expected \"program\": \"DepthStress\"");
            else if (!Is(run["version"], RunJson.Version))
                diagnostics.Error(new SourcePosition(name), $"found results of version {run["version"]?.ToJsonString() ?? "unknown"}, expected {RunJson.Version}: run the well again with this version");
            else
                return run;
        }
        catch (JsonException problem)
        {
            diagnostics.Error(new SourcePosition(name, (int)(problem.LineNumber ?? 0) + 1, (int)(problem.BytePositionInLine ?? 0) + 1), "found broken JSON, expected run.json as this program writes it");
        }
        catch (Exception problem) when (problem is IOException or UnauthorizedAccessException)
        {
            diagnostics.Error(new SourcePosition(name), $"the file cannot be read: {problem.Message}");
        }

        return null;
    }

    private static string HashOf(string folder, string file)
    {
        using var stream = File.OpenRead(Path.Combine(folder, file));
        return Convert.ToHexStringLower(SHA256.HashData(stream));
    }

    private static bool Is(JsonNode? node, string word) => node is JsonValue value && value.TryGetValue<string>(out var text) && text == word;

    private string Text(string key) => Run[key] is JsonValue value && value.TryGetValue<string>(out var text) ? text : "";

    private static ResultSet? Refuse(DiagnosticBag diagnostics, string name, string problem)
    {
        diagnostics.Error(new SourcePosition(name), problem);
        return null;
    }
}
