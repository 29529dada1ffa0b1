using DepthStress.Cli.Printing;
using DepthStress.Core.Catalogue;
using DepthStress.Core.Diagnostics;
using DepthStress.Core.Logs;
using DepthStress.Core.Model;

namespace DepthStress.Cli.Actions;

/// <summary>The command <c>methods</c>.</summary>
internal static class MethodsAction
{
    /// <summary>The words for what a method can give; the key of the well file, such as static_youngs, is understood as well.</summary>
    public static IReadOnlyList<string> Results { get; } = [.. LawSlots.OfCatalogue.Select(s => PropertyNames.Name(s.Property))];

    /// <summary>The words for rocks.</summary>
    public static IReadOnlyList<string> Rocks { get; } = [.. MethodWords.Rocks.Select(r => r.Word)];

    /// <summary>Lists the catalogue or what of it gives a property or is made for a rock, or shows one entry.</summary>
    public static int Run(Terminal terminal, string? id, string? result, string? rock)
    {
        if (id is not null) return result is null && rock is null ? Show(terminal, id) : Wrong(terminal, "found a method ID beside --for or --rock, expected one or the other");
        var slot = LawSlots.OfCatalogue.FirstOrDefault(s => PropertyNames.Name(s.Property) == result || s.Key.EndsWith($" {result}", StringComparison.Ordinal));
        if (result is not null && slot is null) return Wrong(terminal, Unknown("--for", result, Results));
        if (rock is not null && !Rocks.Contains(rock)) return Wrong(terminal, Unknown("--rock", rock, Rocks));

        var kind = rock is null ? default : MethodWords.Rocks.First(r => r.Word == rock).Rock;
        List<Law> laws = [.. MethodCatalogue.All.Where(l => (result is null || l.Predicts == slot!.Property) && l.Rocks.HasFlag(kind))];
        if (laws.Count == 0) terminal.Output.WriteLine($"no method for {result} of {rock}");
        else MethodPrinter.List(terminal, laws);
        return ExitCodes.Done;
    }

    private static int Show(Terminal terminal, string id)
    {
        if (MethodCatalogue.Find(id) is not { } law)
            return Wrong(terminal, $"found the unknown method \"{id}\", expected one of the list that \"depthstress methods\" prints{NearestName.Hint(id, MethodCatalogue.All.Select(l => l.Id))}");
        MethodPrinter.Show(terminal, law);
        return ExitCodes.Done;
    }

    private static string Unknown(string option, string found, IReadOnlyList<string> words) =>
        $"found \"{found}\", expected {option} one of {string.Join(", ", words)}{NearestName.Hint(found, words)}";

    private static int Wrong(Terminal terminal, string problem)
    {
        terminal.Error.WriteLine($"error: {problem}");
        return ExitCodes.Usage;
    }
}
