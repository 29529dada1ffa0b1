using System.Globalization;
using DepthStress.Core.Logs;
using DepthStress.Core.Quantities;
using DepthStress.Files.Ingest;
using Spectre.Console;

namespace DepthStress.Cli.Printing;

/// <summary>Prints what each curve covers.</summary>
internal static class CoveragePrinter
{
    /// <summary>Prints one row per role that has a curve, and names the roles without one.</summary>
    public static void Print(Terminal terminal, IngestedLogs ingested, UnitSystem units)
    {
        var table = new Table().Border(TableBorder.Simple);
        var length = units.UnitFor(Dimension.Length).Unit;
        table.AddColumns("role", "column", "unit");
        foreach (var title in (ReadOnlySpan<string>)[$"top, {length} md", $"base, {length} md", "present, %"])
            table.AddColumn(new TableColumn(title).RightAligned());
        foreach (var curve in ingested.Logs.Curves)
        {
            var columns = ingested.Roles.First(r => r.Role == curve.Role).Columns;
            var first = Array.FindIndex(curve.Values, v => !double.IsNaN(v));
            var last = Array.FindLastIndex(curve.Values, v => !double.IsNaN(v));
            var present = curve.Values.Count(v => !double.IsNaN(v));
            table.AddRow(
                curve.Role.Id,
                Markup.Escape(Source(ingested, columns)),
                Markup.Escape(string.Join(", ", columns.Select(c => c.Source is { Unit.IsSet: true } s ? s.Unit.Value : c.Column.Unit ?? "").Distinct())),
                Depth(ingested, first, length),
                Depth(ingested, last, length),
                (100.0 * present / curve.Values.Length).ToString("F1", CultureInfo.InvariantCulture));
        }

        terminal.Tables().Write(table);
        var missing = CurveRoles.All.Where(r => ingested.Logs[r.Property] is null).Select(r => r.Id);
        terminal.Output.WriteLine($"no curve for: {string.Join(", ", missing)}");
    }

    private static string Source(IngestedLogs ingested, IReadOnlyList<ColumnChoice> columns) => string.Join(
        "\n", columns.Select(c => ingested.Files.Count == 1 ? c.Column.Name : $"{c.Column.Name} in {Path.GetFileName(c.File.Name)}"));

    private static string Depth(IngestedLogs ingested, int index, Unit unit) =>
        index < 0 ? "" : unit.FromSi(ingested.Logs.Depths[index]).ToString("F2", CultureInfo.InvariantCulture);
}
