using DepthStress.Cli.Printing;
using DepthStress.Core.Diagnostics;
using DepthStress.Files.Reading;
using DepthStress.Files.Setup;

namespace DepthStress.Cli.Actions;

/// <summary>The command <c>init</c>.</summary>
internal static class InitAction
{
    /// <summary>Writes a starter well file into the current folder; never over an existing one unless forced.</summary>
    public static int Run(Terminal terminal, string logFile, bool force)
    {
        var diagnostics = new DiagnosticBag();
        var path = Path.GetFullPath(logFile, terminal.Folder);
        var name = Path.GetRelativePath(terminal.Folder, path).Replace(Path.DirectorySeparatorChar, '/');
        if (Path.GetExtension(path).Equals(".toml", StringComparison.OrdinalIgnoreCase))
        {
            terminal.Error.WriteLine($"{name}: error: found a well file, expected a log file (CSV or LAS 2.0); to run a well file: depthstress run {name}");
            return ExitCodes.Input;
        }

        var log = LogFileReader.Read(path, name, new LogReadOptions(), diagnostics);
        DiagnosticPrinter.Print(terminal, diagnostics);
        if (log is null || diagnostics.HasErrors) return ExitCodes.Input;

        var target = Path.Combine(terminal.Folder, Path.GetFileNameWithoutExtension(path) + ".toml");
        try
        {
            using var stream = new FileStream(target, force ? FileMode.Create : FileMode.CreateNew, FileAccess.Write);
            using var writer = new StreamWriter(stream);
            writer.Write(StarterFile.For(log));
        }
        catch (IOException) when (!force && File.Exists(target))
        {
            terminal.Error.WriteLine($"error: found {Path.GetFileName(target)} already there; use --force to replace it");
            return ExitCodes.Input;
        }
        catch (Exception e) when (e is IOException or UnauthorizedAccessException)
        {
            terminal.Error.WriteLine($"error: cannot write {Path.GetFileName(target)}: {e.Message}");
            return ExitCodes.Input;
        }

        terminal.Output.WriteLine($"Wrote {Path.GetFileName(target)}. Fill in the lines marked <-, then run: depthstress check {Path.GetFileName(target)}");
        return ExitCodes.Done;
    }
}
