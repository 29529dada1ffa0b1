using DepthStress.Core.Model;
using DepthStress.Core.Quantities;
using DepthStress.Files.Writing;

namespace DepthStress.Cli.Printing;

/// <summary>Prints a line per zone with a change of pore pressure.</summary>
internal static class DepletionPrinter
{
    /// <summary>Prints the lines; nothing when no zone states a change.</summary>
    public static void Print(Terminal terminal, EarthModel model, UnitSystem units)
    {
        var results = DepletionResult.Of(model);
        foreach (var result in results) terminal.Output.WriteLine(DepletionText.Line(result, model, units));
        if (results.Count > 0) terminal.Output.WriteLine();
    }
}
