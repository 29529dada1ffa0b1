using DepthStress.Cli.Printing;
using DepthStress.Core.Diagnostics;
using DepthStress.Core.Model;

namespace DepthStress.Cli.Actions;

/// <summary>The command <c>methods</c>.</summary>
internal static class MethodsAction
{
    /// <summary>Lists the catalogue, or shows one entry.</summary>
    public static int Run(Terminal terminal, string? id)
    {
        if (id is null)
        {
            MethodPrinter.List(terminal, MethodCatalogue.All);
            return ExitCodes.Done;
        }

        if (MethodCatalogue.Find(id) is { } law)
        {
            MethodPrinter.Show(terminal, law);
            return ExitCodes.Done;
        }

        terminal.Error.WriteLine($"error: found the unknown method \"{id}\", expected one of the list that \"depthstress methods\" prints{NearestName.Hint(id, MethodCatalogue.All.Select(l => l.Id))}");
        return ExitCodes.Usage;
    }
}
