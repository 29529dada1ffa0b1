using DepthStress.Core.Catalogue;
using DepthStress.Core.Model;

namespace DepthStress.Cli.Printing;

/// <summary>Prints which methods a well's curves and settings could feed, and what the others lack.</summary>
internal static class FeedPrinter
{
    private const int Column = 4;

    /// <summary>Prints a paragraph per place where a method is chosen.</summary>
    public static void Print(Terminal terminal, EarthModel model)
    {
        terminal.Output.WriteLine($"methods that these curves and settings can feed (> chosen, {MethodWords.RecalledMark} recalled):");
        foreach (var slot in LawSlots.All)
        {
            var chosen = model.LawUses.Where(u => u.Slot == slot).Select(u => u.Law).Distinct().ToList();
            var laws = MethodCatalogue.For(slot.Property).Select(l => (Law: l, Missing: MethodNeeds.Missing(l, model))).ToList();
            terminal.Output.WriteLine($"  {slot.Key}");
            var fed = chosen.Where(l => l.Standing == Standing.UserGiven).Select(l => l.Id).Distinct().Select(id => $">{id} (your own)")
                .Concat(chosen.Exists(l => l.Standing == Standing.Trained) ? [">trained (on this well)"] : [])
                .Concat(laws.Where(l => l.Missing.Count == 0).Select(l => Name(l.Law, chosen))).ToList();
            HangingText.Write(terminal, "", Column, fed.Count > 0 ? string.Join(", ", fed) : "none");
            var lacking = laws.Where(l => l.Missing.Count > 0).GroupBy(l => string.Join(" and ", l.Missing)).OrderByDescending(g => g.Count()).ToList();
            if (lacking.Count > 0)
                HangingText.Write(terminal, "", Column, string.Join("; ", lacking.Select(g => FormattableString.Invariant($"{g.Count()} more with {g.Key}"))));
        }
    }

    private static string Name(Law law, List<Law> chosen) =>
        (chosen.Contains(law) ? ">" : "") + law.Id + (law.Standing == Standing.FromMemory ? MethodWords.RecalledMark : "");
}
