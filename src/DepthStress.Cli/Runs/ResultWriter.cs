using System.Collections.Concurrent;
using System.Runtime.ExceptionServices;
using DepthStress.Core.Calibration;
using DepthStress.Core.Diagnostics;
using DepthStress.Core.Layers;
using DepthStress.Core.Model;
using DepthStress.Files.Writing;
using DepthStress.Report;

namespace DepthStress.Cli.Runs;

/// <summary>Writes every result of a well into one folder, whole or not at all.</summary>
internal static class ResultWriter
{
    /// <summary>The folder beside the well file.</summary>
    public static string DefaultFolder(string wellFile) =>
        Path.Combine(Path.GetDirectoryName(wellFile)!, Path.GetFileNameWithoutExtension(wellFile) + "-results");

    /// <summary>Writes the results; on any failure or interruption the earlier ones stay as they were.</summary>
    public static void Write(LoadedWell well, DiagnosticBag diagnostics, string folder, Action<string> stage, CancellationToken cancellation)
    {
        var (file, logs, model, pictures) = well;
        var units = file.Sections.Output.Units.Value;
        var (layers, layerSettings) = (well.Layers, file.Sections.Layers);
        var column = SolverColumn.Of(layers, layerSettings.Deck.Value);
        var solved = column is null ? null : ColumnCheck.Of(column);
        var drawn = new DrawnPictures(model, layers, layerSettings, pictures);
        List<(string Name, Action<Stream> Write)> results =
        [
            ("depth.csv", s => DepthCsv.Write(model, units, s)),
            ("results.las", s => ResultsLas.Write(model, units, s)),
            ("report.html", s => ReportPage.Write(ReportParts.Of(well, drawn, solved, diagnostics), s)),
            ("layers.csv", s => LayersCsv.Write(layers, units, s)),
            ("layers.json", s => LayersJson.Write(layers, file.Setup, units, s)),
            ("layers-solver.csv", s => SolverCsv.Write(layers, s)),
            ("layers.vtu", s => LayersVtu.Write(layers, layerSettings, s)),
            ("tracks.svg", s => s.Write(drawn.Tracks)),
            ("stress.svg", s => s.Write(drawn.Stress)),
            ("layers.svg", s => s.Write(drawn.Layers)),
            ("polygon.svg", s => s.Write(drawn.Polygon)),
            ("README.txt", s => ResultGuide.Write(file.Setup, units, s, ComparisonColumns.Of(model))),
            ("run.json", s => RunJson.Write(file, logs, model, diagnostics, well.Core, layers, solved, s)),
        ];

        if (file.Sections.Output.Pdf.Value) results.Add(("pictures.pdf", drawn.WritePdf));
        if (well.Spread is { } spread) results.Add(("spread.csv", s => SpreadCsv.Write(SpreadRow.Of(model, spread), units, s)));
        if (column is not null)
        {
            results.Add(("column.inp", s => DeckWriter.Write(column, layerSettings, file.Setup, DeckStart.FromLoads, s)));
            results.Add(("column-balanced.inp", s => DeckWriter.Write(column, layerSettings, file.Setup, DeckStart.Balanced, s)));
        }

        if (model.Comparisons.Count > 0) results.Add(("comparison.csv", s => ComparisonCsv.Write(model, units, s)));
        if (well.Observed.Count > 0) results.Add(("observations.csv", s => ObservationsCsv.Write(well.Observed, units, s)));
        if (well.Core is { } core) results.Add(("core.csv", s => CoreCsv.Write(core, units, s)));

        using var target = ResultFolder.Begin(folder);
        try
        {
            // Each file is made from the finished model alone, so their order does not matter; the longest stand first, one at a time for each core.
            Parallel.ForEach(Partitioner.Create(results, EnumerablePartitionerOptions.NoBuffering), new ParallelOptions { CancellationToken = cancellation }, result =>
            {
                stage($"writing {result.Name}");
                using var stream = target.Create(result.Name);
                result.Write(stream);
            });
        }
        catch (AggregateException e)
        {
            ExceptionDispatchInfo.Throw(e.InnerExceptions[0]);
        }

        cancellation.ThrowIfCancellationRequested();
        target.Commit();
    }
}
