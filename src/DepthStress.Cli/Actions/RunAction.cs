using DepthStress.Cli.Printing;
using DepthStress.Cli.Runs;
using DepthStress.Core.Calibration;
using DepthStress.Core.Diagnostics;
using DepthStress.Files.Writing;

namespace DepthStress.Cli.Actions;

/// <summary>The command <c>run</c>: the main job, for one or several wells.</summary>
internal static class RunAction
{
    /// <summary>Runs every well; the worst outcome decides the exit code, and no well stops another.</summary>
    public static async Task<int> RunAsync(Terminal terminal, string[] paths, RunOptions options, CancellationToken cancellation)
    {
        var jobs = options.Jobs > 0 ? options.Jobs : Environment.ProcessorCount;
        var outcomes = new WellOutcome[paths.Length];
        await Stages.ShowAsync(terminal, async stage =>
        {
            var parallel = new ParallelOptions { MaxDegreeOfParallelism = jobs, CancellationToken = cancellation };
            await Parallel.ForAsync(0, paths.Length, parallel, (k, stop) =>
            {
                outcomes[k] = RunOne(Path.GetFullPath(paths[k], terminal.Folder), options, terminal, stage, stop);
                return ValueTask.CompletedTask;
            });
        });

        var code = ExitCodes.Done;
        foreach (var (outcome, path) in outcomes.Zip(paths))
        {
            if (paths.Length > 1 && outcome.Diagnostics.Items.Count > 0) await terminal.Error.WriteLineAsync($"{path}:");
            DiagnosticPrinter.Print(terminal, outcome.Diagnostics);
            if (outcome.Well is { } well) SummaryPrinter.Print(terminal, well, outcome.Folder);
            code = Math.Max(code, outcome.Code);
        }

        return code;
    }

    private static WellOutcome RunOne(string path, RunOptions options, Terminal terminal, Action<string> stage, CancellationToken cancellation)
    {
        var diagnostics = new DiagnosticBag();
        if (LoadedWell.Load(path, diagnostics, stage, cancellation) is not { } well) return new WellOutcome(diagnostics, null, null, ExitCodes.Input);
        if (options.Strict && Strictness.CountWarnings(diagnostics, well.Model) is var warnings and > 0)
        {
            diagnostics.Error(new SourcePosition(well.File.Name), FormattableString.Invariant($"found {warnings} {(warnings == 1 ? "warning" : "warnings")}, expected none with --strict; nothing was written"));
            return new WellOutcome(diagnostics, well, null, ExitCodes.Input);
        }

        if (options.Spread)
        {
            stage("trying every choice");
            well = well with { Spread = ChoiceSpread.Of(well.Model) };
        }

        var folder = options.Out is { } given ? Path.GetFullPath(given, terminal.Folder) : ResultWriter.DefaultFolder(path);
        try
        {
            ResultWriter.Write(well, diagnostics, folder, stage, cancellation);
        }
        catch (ResultFolderException e)
        {
            diagnostics.Error(new SourcePosition(folder), e.Message);
            return new WellOutcome(diagnostics, null, null, ExitCodes.Input);
        }
        catch (Exception e) when (e is IOException or UnauthorizedAccessException)
        {
            diagnostics.Error(new SourcePosition(folder), $"the results cannot be written ({e.Message}); earlier results are as they were");
            return new WellOutcome(diagnostics, null, null, ExitCodes.Input);
        }

        return new WellOutcome(diagnostics, well, folder, ExitCodes.Done);
    }

    private sealed record WellOutcome(DiagnosticBag Diagnostics, LoadedWell? Well, string? Folder, int Code);
}
