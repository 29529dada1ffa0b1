using System.Globalization;
using DepthStress.Core.Catalogue;
using DepthStress.Core.Logs;
using Spectre.Console;

namespace DepthStress.Cli.Printing;

/// <summary>Prints the method catalogue.</summary>
internal static class MethodPrinter
{
    /// <summary>Prints a line per method, grouped by what it gives.</summary>
    public static void List(Terminal terminal, IReadOnlyList<Law> laws)
    {
        foreach (var group in laws.GroupBy(l => l.Predicts))
        {
            terminal.Output.WriteLine(PropertyNames.Title(group.Key));
            foreach (var law in group) terminal.Output.WriteLine($"  {law.Id,-28} {law.Text}  [{law.Unit.Symbol}]{(law.Standing == Standing.FromMemory ? "  (recalled)" : "")}");
        }
    }

    /// <summary>Prints one method whole.</summary>
    public static void Show(Terminal terminal, Law law)
    {
        var grid = new Grid().AddColumn(new GridColumn().NoWrap().PadRight(3)).AddColumn();
        void Row(string name, string text) => grid.AddRow(new Text(name), new Text(text));
        Row("method", law.Id);
        Row("", law.Title);
        Row("gives", $"{PropertyNames.Title(law.Predicts)}, {Unit(law.Unit.Symbol)}");
        Row("rock", law.Rocks == RockKinds.Any ? "any" : law.Rocks.ToString().ToLowerInvariant());
        Row("formula", law.Text);
        foreach (var input in law.Inputs) Row(input == law.Inputs[0] ? "from" : "", $"{input.Symbol}: {PropertyNames.Title(input.Property)}, {Unit(input.Unit.Symbol)}{Limits(input)}");
        foreach (var c in law.Coefficients)
            Row(c == law.Coefficients[0] ? "with" : "", string.Create(CultureInfo.InvariantCulture, $"{c.Symbol} = {c.Value} {c.Unit}").TrimEnd());
        Row("valid for", law.Validity);
        Row("source", law.Source);
        Row("standing", law.Standing switch
        {
            Standing.Confirmed => "coefficients read in the source named",
            Standing.Identity => "identity or definition",
            _ => "coefficients recalled, not read: needs accept_unverified = true",
        });
        if (law.Example is { } example)
        {
            var inputs = law.Inputs.Zip(example.Inputs, (i, x) => string.Create(CultureInfo.InvariantCulture, $"{i.Symbol} = {x} {i.Unit.Symbol}").TrimEnd());
            Row("example", string.Create(CultureInfo.InvariantCulture, $"{string.Join(", ", inputs)} gives {example.Result} {law.Unit.Symbol}").TrimEnd());
            Row("", $"{Basis(example.Basis)}: {example.Source}");
        }

        terminal.Tables().Write(grid);
    }

    private static string Unit(string symbol) => symbol.Length == 0 ? "no unit" : symbol;

    private static string Basis(ExampleBasis basis) => basis switch
    {
        ExampleBasis.Printed => "printed",
        ExampleBasis.Identity => "identity",
        _ => "self-computed",
    };

    private static string Limits(LawInput input)
    {
        var limits = input.Domain == Interval.All || input.Domain == Interval.NotNegative ? "" : $"; no result outside {Text(input.Domain)}";
        return input.Range == Interval.All ? limits : $"{limits}; fitted in {Text(input.Range)}";
    }

    private static string Text(Interval interval) => string.Create(CultureInfo.InvariantCulture, $"{interval.Low} to {interval.High}");
}
