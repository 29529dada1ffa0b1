using DepthStress.Core.Catalogue;
using DepthStress.Core.Logs;
using DepthStress.Core.Model;

namespace DepthStress.Cli.Printing;

/// <summary>Prints the method catalogue, or one method of it.</summary>
internal static class MethodPrinter
{
    private const int FormulaColumn = 38;

    private const int FieldColumn = 11;

    /// <summary>Prints a line per method, grouped by what it gives and by rock, with what the symbols mean.</summary>
    public static void List(Terminal terminal, IReadOnlyList<Law> laws)
    {
        foreach (var group in laws.GroupBy(l => l.Predicts))
        {
            terminal.Output.WriteLine($"{PropertyNames.Title(group.Key)}: {Key(group.Key)}, --for {PropertyNames.Name(group.Key)}");
            foreach (var rock in group.GroupBy(l => l.Rocks))
            {
                terminal.Output.WriteLine($"  {MethodWords.Of(rock.Key)}");
                foreach (var law in rock) Line(terminal, law);
            }

            var symbols = group.SelectMany(l => l.Inputs).Select(i => $"{i.Symbol} {PropertyNames.Title(i.Property)}").Distinct();
            HangingText.Write(terminal, "  symbols:", FieldColumn, string.Join("; ", symbols));
            terminal.Output.WriteLine();
        }

        var recalled = laws.Count(l => l.Standing == Standing.FromMemory);
        var marks = recalled == 0 ? "" : FormattableString.Invariant($"; {MethodWords.RecalledMark} {recalled} with coefficients recalled, not read: they need accept_unverified = true");
        HangingText.Write(terminal, "", 0, FormattableString.Invariant($"{laws.Count} methods{marks}. One method whole: depthstress methods ID"));
    }

    /// <summary>Prints one method whole.</summary>
    public static void Show(Terminal terminal, Law law)
    {
        void Field(string name, string text) => HangingText.Write(terminal, name, FieldColumn, text);
        terminal.Output.WriteLine(law.Id);
        HangingText.Write(terminal, "", 0, law.Title);
        terminal.Output.WriteLine();
        Field("gives", $"{PropertyNames.Title(law.Predicts)}, {MethodWords.Of(law.Unit)}{Missing(law)}");
        Field("choose", $"{Key(law.Predicts)} = \"{law.Id}\"");
        Field("rock", MethodWords.Of(law.Rocks));
        Field("formula", law.Text);
        foreach (var input in law.Inputs) Field(input == law.Inputs[0] ? "from" : "", MethodWords.Of(input) + Limits(input));
        if (law.Coefficients.Count > 0) Field("with", string.Join(", ", law.Coefficients.Select(Text)));
        Field("valid for", law.Validity);
        Field("source", law.Source);
        Field("standing", MethodWords.Of(law.Standing));
        if (law.Example is not { } example) return;
        var inputs = law.Inputs.Zip(example.Inputs, (i, x) => $"{i.Symbol} = {MethodWords.Quantity(x, i.Unit)}");
        Field("example", $"{string.Join(", ", inputs)} gives {MethodWords.Quantity(example.Result, law.Unit)}");
        Field("", $"{MethodWords.Of(example.Basis)}: {example.Source}");
    }

    private static void Line(Terminal terminal, Law law)
    {
        var units = law.Inputs.Where(i => i.Unit.Symbol.Length > 0).Select(i => $"{i.Symbol}{HangingText.Tie}{i.Unit.Symbol}");
        if (law.Unit.Symbol.Length > 0) units = units.Prepend(law.Unit.Symbol);
        var mark = law.Standing == Standing.FromMemory ? MethodWords.RecalledMark : ' ';
        HangingText.Write(terminal, $"  {mark} {law.Id}", FormulaColumn, $"{law.Text} [{string.Join("; ", units)}]".Replace(" []", "", StringComparison.Ordinal));
    }

    private static string Key(Property property) => LawSlots.OfCatalogue.First(s => s.Property == property).Key;

    private static string Text(Coefficient c)
    {
        var scatter = c.Scatter is { } s ? FormattableString.Invariant($" +/- {s}") : "";
        return $"{c.Symbol} = {c.Number}{scatter} {c.Unit}".TrimEnd();
    }

    private static string Missing(Law law) =>
        MethodWords.Outside(law.ResultDomain) is { } where ? $"; missing {where}" : "";

    private static string Limits(LawInput input)
    {
        var domain = MethodWords.Outside(input.Domain) is { } where ? $"; no result {where}" : "";
        return input.Range == Interval.All ? domain : $"{domain}; fitted from {MethodWords.Within(input.Range)}";
    }
}
