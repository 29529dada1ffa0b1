using DepthStress.Core.Diagnostics;
using DepthStress.Core.Layers;
using DepthStress.Core.Model;
using DepthStress.Files.Ingest;
using DepthStress.Files.Setup;
using DepthStress.Files.Writing;
using static DepthStress.Tests.Model.SmallWell;

namespace DepthStress.Tests.Solver;

/// <summary>The sample well's layers and column.</summary>
internal static class SampleColumn
{
    private static readonly Lazy<(EarthModel Model, LayerSettings Settings, LayerTable Table)> Well = new(() =>
    {
        var diagnostics = new DiagnosticBag();
        var file = WellFileReader.Read(Path.Combine(Golden.RepoRoot, "sample-logs", "quillback-4.toml"), diagnostics)!;
        var model = Chain.Run(file.Setup, LogIngest.Read(file, diagnostics)!.Logs, diagnostics)!;
        return (model, file.Sections.Layers, LayerBuilder.Build(model, file.Sections.Layers, diagnostics)!);
    });

    public static EarthModel Model => Well.Value.Model;

    public static LayerTable Table => Well.Value.Table;

    public static LayerSettings Settings(SolverRock rock, int nx = 1, int ny = 1) => Well.Value.Settings with
    {
        Deck = Chosen(rock),
        ElementsAlongShmax = Chosen((double)nx),
        ElementsAlongShmin = Chosen((double)ny),
    };

    /// <summary>The deck of a layer table as text.</summary>
    public static string Deck(LayerTable table, WellSetup setup, LayerSettings settings, DeckStart start)
    {
        using var stream = new MemoryStream();
        DeckWriter.Write(SolverColumn.Of(table, settings.Deck.Value)!, settings, setup, start, stream);
        return System.Text.Encoding.UTF8.GetString(stream.ToArray());
    }
}
