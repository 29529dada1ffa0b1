using System.Globalization;
using DepthStress.Core.Model;
using DepthStress.Core.Quantities;
using DepthStress.Files.Results;
using DepthStress.Report;
using Spectre.Console;

namespace DepthStress.Cli.Printing;

/// <summary>Prints what changed between two result folders.</summary>
internal static class ComparePrinter
{
    private const int KeyColumn = 4;

    /// <summary>Prints every change, in the units of the first; one line where nothing changed.</summary>
    public static void Print(Terminal terminal, ResultSet a, ResultSet b, RunChanges changes, IReadOnlyList<ProfilePairCurve> stresses)
    {
        var output = terminal.Output;
        var heads = Heads(a, b).ToList();
        var (zones, layers) = (CompareRows.Zones(a, b), CompareRows.Layers(a, b));
        var profile = stresses.Select(s => Profile(a, b.Units, s)).OfType<string>().ToList();
        if (heads.Count == 0 && changes.None && zones.Count + layers.Count + profile.Count == 0)
        {
            output.WriteLine(a.Hash == b.Hash
                ? $"Nothing differs between {a.Name} and {b.Name}."
                : $"Setup, inputs, methods, findings and stresses are the same in {a.Name} and {b.Name}; other columns of depth.csv or layers.csv differ.");
            return;
        }

        output.WriteLine($"{a.Name} (first) and {b.Name} (second), well {a.Well}, {(a.Units == UnitSystem.Metric ? "metric" : "field")} units");
        foreach (var head in heads) output.WriteLine(head);
        output.WriteLine();
        Lines(terminal, "Setup", changes.Setup);
        Lines(terminal, "Inputs", changes.Inputs);
        Lines(terminal, "Methods", changes.Methods);
        Findings(terminal, changes.Findings);
        Section(terminal, "Mean stress by zone", zones);
        Section(terminal, "Layers", layers);
        if (profile.Count == 0) return;
        output.WriteLine($"Profile, at the depths of the first{(ProfileMatch.SameDepths(a.Depth, b.Depth) ? "" : "; the second by straight lines between its depths, never across gaps")}:");
        foreach (var line in profile) output.WriteLine("  " + line);
        output.WriteLine();
    }

    private static IEnumerable<string> Heads(ResultSet a, ResultSet b)
    {
        if (a.Well != b.Well) yield return $"warning: found two wells, {a.Well} and {b.Well}";
        if (a.Frame != b.Frame) yield return "warning: the datum or the surfaces of the well differ; depths are compared as they stand, each below its own datum";
        if (a.Units != b.Units) yield return "note: the second is in other units and was converted; findings are compared without their numbers, and numbers within rounding";
        if (!ProfileMatch.SameDepths(a.Depth, b.Depth)) yield return FormattableString.Invariant($"note: the depths differ: {a.Depth.Count} samples in the first, {b.Depth.Count} in the second");
    }

    private static void Lines(Terminal terminal, string title, IReadOnlyList<RunChange> changes)
    {
        if (changes.Count == 0) return;
        terminal.Output.WriteLine($"{title}:");
        foreach (var change in changes) HangingText.Write(terminal, "", KeyColumn, $"{change.What}: {Value(change.Before)} -> {Value(change.After)}");
        terminal.Output.WriteLine();
    }

    private static string Value(string text) => text.Length > 0 ? text : "(not there)";

    private static void Findings(Terminal terminal, IReadOnlyList<RunChange> changes)
    {
        if (changes.Count == 0) return;
        terminal.Output.WriteLine("Findings (- went, + came):");
        foreach (var change in changes)
        {
            if (change.Before.Length > 0) terminal.Output.WriteLine($"  - {change.Before}");
            if (change.After.Length > 0) terminal.Output.WriteLine($"  + {change.After}");
        }

        terminal.Output.WriteLine();
    }

    private static void Section(Terminal terminal, string title, CompareRows rows)
    {
        if (rows.Count == 0) return;
        terminal.Output.WriteLine($"{title}:");
        if (rows.Rows.Count > 0)
        {
            var table = new Table().Border(TableBorder.Simple);
            foreach (var (name, right) in rows.Columns) table.AddColumn(right ? new TableColumn(Markup.Escape(name)).RightAligned() : new TableColumn(Markup.Escape(name)));
            foreach (var column in table.Columns) column.NoWrap().Padding(0, 0, 1, 0);
            foreach (var row in rows.Rows) table.AddRow([.. row.Select(Markup.Escape)]);
            terminal.Tables().Write(table);
        }

        if (rows.Note.Length > 0) terminal.Output.WriteLine($"  {rows.Note}");
        terminal.Output.WriteLine();
    }

    /// <summary>How far a stress moved along the well; null where it did not.</summary>
    private static string? Profile(ResultSet a, UnitSystem other, ProfilePairCurve stress)
    {
        var column = DepthColumns.Get(stress.Column);
        var (unit, decimals) = (column.In(a.Units).Unit, Math.Max(0, column.In(a.Units).Decimals - 2));
        var known = Enumerable.Range(0, stress.Difference.Length).Where(i => !double.IsNaN(stress.Difference[i])).ToList();
        var (before, after) = (stress.Before.Count(v => !double.IsNaN(v)), stress.After.Count(v => !double.IsNaN(v)));
        string Show(double si, string format) => unit.FromSi(si).ToString(format + decimals.ToString(CultureInfo.InvariantCulture), CultureInfo.InvariantCulture);
        if (known.Count == 0)
            return before + after == 0 ? null : string.Create(CultureInfo.InvariantCulture, $"{column.Symbol}: at {before} depths in the first, at {after} in the second, at none in both");
        var worst = known.MaxBy(i => Math.Abs(stress.Difference[i]));
        var lost = before - known.Count;
        if (Math.Abs(stress.Difference[worst]) <= CompareRows.Rounding(column, a.Units, other) && lost == 0 && before == after) return null;
        var (length, places) = a.Units.UnitFor(Dimension.Length);
        var depth = length.FromSi(a.Depth.Numbers["md"][worst]).ToString("F" + places.ToString(CultureInfo.InvariantCulture), CultureInfo.InvariantCulture);
        var (mean, greatest) = (known.Average(i => stress.Difference[i]), stress.Difference[worst]);
        return string.Create(
            CultureInfo.InvariantCulture,
            $"{column.Symbol}: mean change {Sign(mean)}{Show(Math.Abs(mean), "F")} {unit}, greatest {Sign(greatest)}{Show(Math.Abs(greatest), "F")} {unit} at {depth} {length} md, over {known.Count} depths; {before} depths in the first and {after} in the second have it");
    }

    private static string Sign(double value) => value < 0 ? "-" : "+";
}
