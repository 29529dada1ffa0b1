using DepthStress.Core.Diagnostics;

namespace DepthStress.Cli.Printing;

/// <summary>Prints messages to the error writer, one per line.</summary>
internal static class DiagnosticPrinter
{
    /// <summary>Prints every message in the order it was found.</summary>
    public static void Print(Terminal terminal, DiagnosticBag diagnostics)
    {
        foreach (var diagnostic in diagnostics.Items) terminal.Error.WriteLine(diagnostic);
    }
}
