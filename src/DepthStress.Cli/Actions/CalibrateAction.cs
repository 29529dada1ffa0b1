using System.Text;
using DepthStress.Cli.Printing;
using DepthStress.Cli.Runs;
using DepthStress.Core.Calibration;
using DepthStress.Core.Diagnostics;
using DepthStress.Core.Model;
using DepthStress.Files.Setup;
using DepthStress.Files.Writing;

namespace DepthStress.Cli.Actions;

/// <summary>The command <c>calibrate</c>: estimates, shows them, and writes them into the well file when asked to.</summary>
internal static class CalibrateAction
{
    /// <summary>Calibrates one well.</summary>
    public static async Task<int> RunAsync(Terminal terminal, string path, bool apply, string? folder, CancellationToken cancellation)
    {
        var code = ExitCodes.Done;
        await Stages.ShowAsync(terminal, stage =>
        {
            code = Run(terminal, Path.GetFullPath(path, terminal.Folder), apply, folder, stage, cancellation);
            return Task.CompletedTask;
        });
        return code;
    }

    private static int Run(Terminal terminal, string path, bool apply, string? given, Action<string> stage, CancellationToken cancellation)
    {
        var diagnostics = new DiagnosticBag();
        var well = LoadedWell.Load(path, diagnostics, stage, cancellation);
        var result = well is null ? null : Estimate(well, diagnostics, stage);
        if (well is null || result is null)
        {
            DiagnosticPrinter.Print(terminal, diagnostics);
            return ExitCodes.Input;
        }

        cancellation.ThrowIfCancellationRequested();
        var folder = given is null ? CalibrationWriter.DefaultFolder(path) : Path.GetFullPath(given, terminal.Folder);
        try
        {
            CalibrationWriter.Write(well, result, folder, stage, cancellation);
        }
        catch (Exception e) when (e is ResultFolderException or IOException or UnauthorizedAccessException)
        {
            diagnostics.Error(new SourcePosition(folder), $"the results cannot be written ({e.Message}); earlier results are as they were");
            DiagnosticPrinter.Print(terminal, diagnostics);
            return ExitCodes.Input;
        }

        DiagnosticPrinter.Print(terminal, diagnostics);
        CalibrationPrinter.Print(terminal, well, result);
        terminal.Output.WriteLine($"Results: {Path.GetRelativePath(terminal.Folder, folder)}");
        var code = apply ? Apply(terminal, well, result) : ExitCodes.Done;
        terminal.Output.WriteLine(Caution.Text);
        return code;
    }

    private static CalibrationResult? Estimate(LoadedWell well, DiagnosticBag diagnostics, Action<string> stage)
    {
        stage("estimating");
        return WellCalibration.Run(
            well.Model, well.File.Sections.Calibration, setup => Chain.Run(setup, well.Logs.Logs, diagnostics), diagnostics);
    }

    private static int Apply(Terminal terminal, LoadedWell well, CalibrationResult result)
    {
        var (file, hold) = (well.File, well.File.Sections.Calibration.Hold);
        if (result.Strains.Any(s => !s.Separated) && hold.Source.Kind == SettingKind.Default)
        {
            terminal.Error.WriteLine(new Diagnostic(
                Severity.Error, new SourcePosition(file.Name),
                "found strains that the observations do not separate, expected [calibration] hold = \"difference\", \"strain_along_shmin\" or \"strain_along_shmax\" to keep one as it is, or \"none\" to accept both; nothing was applied"));
            return ExitCodes.Input;
        }

        var text = File.ReadAllText(file.Path, new UTF8Encoding(false, true));
        var edits = CalibrationEdits.Of(result);
        var changed = WellFileEditor.Apply(text, edits);
        if (changed == text)
        {
            terminal.Output.WriteLine($"Applied: {file.Name} holds these estimates already.");
            return ExitCodes.Done;
        }

        WholeFile.Replace(file.Path, changed);
        terminal.Output.WriteLine($"Applied to {file.Name}: {string.Join(", ", edits.Select(e => $"{e.Key} = {e.Value.Trim('"')}"))}");
        return ExitCodes.Done;
    }
}
