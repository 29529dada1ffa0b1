using System.Globalization;
using DepthStress.Core.Logs;
using DepthStress.Core.Model;
using DepthStress.Core.Quantities;
using DepthStress.Files.Ingest;
using Spectre.Console;

namespace DepthStress.Cli.Printing;

/// <summary>Prints what each curve covers, where its values came from, and whether curves that should agree do.</summary>
internal static class CoveragePrinter
{
    /// <summary>Prints one row per role that has a curve, names the roles without one, then the plausibility statements.</summary>
    public static void Print(Terminal terminal, IngestedLogs ingested, EarthModel model, UnitSystem units)
    {
        var table = new Table().Border(TableBorder.Simple);
        var length = units.UnitFor(Dimension.Length).Unit;
        table.AddColumns("role", "column", "unit");
        foreach (var title in (ReadOnlySpan<string>)[$"top md\n{length}", $"base md\n{length}", "present\n%", "gaps\n", $"longest\n{length}"])
            table.AddColumn(new TableColumn(title).RightAligned());
        table.AddColumn("origins, %");
        foreach (var column in table.Columns) column.Padding(0, 0, 1, 0);
        foreach (var quality in CurveQuality.Of(model))
        {
            // A curve that is wholly predicted has no column.
            var columns = ingested.Roles.FirstOrDefault(r => r.Role == quality.Role)?.Columns ?? [];
            table.AddRow(
                quality.Role.Id,
                Markup.Escape(Source(ingested, columns)),
                Markup.Escape(string.Join(", ", columns.Select(c => c.Source is { Unit.IsSet: true } s ? s.Unit.Value : c.Column.Unit ?? "").Distinct())),
                Length(quality.Top, length),
                Length(quality.Base, length),
                Percent(quality.Present),
                quality.Gaps.ToString(CultureInfo.InvariantCulture),
                quality.Gaps == 0 ? "" : Length(quality.LongestGap, length),
                Origins(quality, model.Count));
        }

        terminal.Tables().Write(table);
        var missing = CurveRoles.All.Where(r => ingested.Logs[r.Property] is null).Select(r => r.Id);
        terminal.Output.WriteLine($"no curve for: {string.Join(", ", missing)}");
        foreach (var statement in Plausibility.Of(model)) terminal.Output.WriteLine(units.Show(statement));
    }

    private static string Source(IngestedLogs ingested, IReadOnlyList<ColumnChoice> columns) => string.Join(
        "\n", columns.Select(c => ingested.Files.Count == 1 ? c.Column.Name : $"{c.Column.Name} in {Path.GetFileName(c.File.Name)}"));

    private static string Origins(CurveQuality quality, int samples) => string.Join("\n", quality.Origins
        .GroupBy(o => o.Origin)
        .OrderBy(g => g.Key)
        .Select(g => $"{g.Key.Name()} {Percent(g.Sum(o => o.Samples) / (double)samples)}"));

    private static string Percent(double share) => (100 * share).ToString("F1", CultureInfo.InvariantCulture);

    private static string Length(double si, Unit unit) => double.IsNaN(si) ? "" : unit.FromSi(si).ToString("F1", CultureInfo.InvariantCulture);
}
