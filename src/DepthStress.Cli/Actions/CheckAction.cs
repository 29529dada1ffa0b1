using DepthStress.Cli.Printing;
using DepthStress.Cli.Runs;
using DepthStress.Core.Diagnostics;
using DepthStress.Files.Writing;

namespace DepthStress.Cli.Actions;

/// <summary>The command <c>check</c>: everything that <c>run</c> does, but shown instead of written.</summary>
internal static class CheckAction
{
    /// <summary>Checks one well.</summary>
    public static int Run(Terminal terminal, string path, bool strict, CancellationToken cancellation)
    {
        var diagnostics = new DiagnosticBag();
        var well = LoadedWell.Load(Path.GetFullPath(path, terminal.Folder), diagnostics, _ => { }, cancellation);
        DiagnosticPrinter.Print(terminal, diagnostics);
        if (well is null) return ExitCodes.Input;

        var units = well.File.Sections.Output.Units.Value;
        terminal.Output.WriteLine(FormattableString.Invariant($"Well {well.File.Setup.Name}: {well.Model.Count} samples from {string.Join(", ", well.Logs.Files.Select(f => f.Name))}"));
        terminal.Output.WriteLine();
        CoveragePrinter.Print(terminal, well.Logs, well.Model, units);
        terminal.Output.WriteLine();
        FeedPrinter.Print(terminal, well.Model);
        terminal.Output.WriteLine();
        foreach (var finding in well.Model.Findings) terminal.Output.WriteLine(FindingText.Of(finding, units, well.Model.Count));
        return strict && Strictness.CountWarnings(diagnostics, well.Model) > 0 ? ExitCodes.Input : ExitCodes.Done;
    }
}
