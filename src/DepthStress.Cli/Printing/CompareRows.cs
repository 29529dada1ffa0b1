using System.Globalization;
using DepthStress.Core.Layers;
using DepthStress.Core.Model;
using DepthStress.Core.Quantities;
using DepthStress.Files.Results;

namespace DepthStress.Cli.Printing;

/// <summary>Rows of numbers that changed, made into text.</summary>
/// <param name="Columns">Names of the columns; true for a column of numbers.</param>
/// <param name="Rows">The rows.</param>
/// <param name="Note">What is left out; empty when nothing is.</param>
internal sealed record CompareRows(IReadOnlyList<(string Name, bool Right)> Columns, IReadOnlyList<string[]> Rows, string Note)
{
    /// <summary>So many layers find room.</summary>
    private const int MostLayers = 40;

    /// <summary>Edges this close are one, m.</summary>
    private const double SameEdge = 0.01;

    private static readonly string[] OfLayers = ["youngs_static", "poisson_static", "pp_mean", "shmin_mean", "shmax_mean"];

    /// <summary>Whether anything changed.</summary>
    public int Count => Rows.Count + Note.Length;

    /// <summary>The mean stresses of zones that changed.</summary>
    public static CompareRows Zones(ResultSet a, ResultSet b)
    {
        var rows = new List<string[]>();
        foreach (var zone in ZoneMatch.Of(a, b))
        {
            foreach (var id in ResultSet.Stresses)
            {
                if (Row(DepthColumns.Get(id), zone.Before[id], zone.After[id], a.Units, b.Units) is { } cells)
                    rows.Add([zone.Zone.Length > 0 ? zone.Zone : "whole log", .. cells]);
            }
        }

        return new([("zone", false), ("mean", false), ("unit", false), ("first", true), ("second", true), ("change", true)], rows, "");
    }

    /// <summary>The layers whose edges, constants or stresses changed, each beside the one that shares most of its depth.</summary>
    public static CompareRows Layers(ResultSet a, ResultSet b)
    {
        var length = a.Units.UnitFor(Dimension.Length).Unit;
        var changed = LayerMatch.Of(a.Layers, b.Layers).Select(m => (Match: m, Rows: Changes(a, b, m), Weight: Weight(a, b, m))).Where(m => m.Rows.Count > 0).ToList();
        var shown = changed.OrderByDescending(c => c.Weight).Take(MostLayers).Select(c => c.Match).ToHashSet();
        var note = changed.Count > MostLayers ? string.Create(CultureInfo.InvariantCulture, $"{changed.Count - MostLayers} more layers changed, by less") : "";
        List<(string, bool)> columns =
        [
            ("layer", true), ("now", true), ("zone", false), ($"tvd {length}", false), ("shared %", true), ("what", false), ("unit", false), ("first", true), ("second", true), ("change", true),
        ];
        return new(columns, [.. changed.Where(c => shown.Contains(c.Match)).SelectMany(c => c.Rows)], note);
    }

    /// <summary>The most by which rounding to the printed decimals may move a difference, SI.</summary>
    public static double Rounding<TSource>(NumberColumn<TSource> column, UnitSystem first, UnitSystem second) =>
        new[] { first, second }.Select(column.In).Sum(u => 0.51 * Math.Pow(10, -u.Decimals) * u.Unit.Factor);

    private static List<string[]> Changes(ResultSet a, ResultSet b, LayerMatch match)
    {
        var length = a.Units.UnitFor(Dimension.Length).Unit;
        string Number(ResultCsv table, int? row) => row is { } r ? table.Numbers["layer"][r].ToString("F0", CultureInfo.InvariantCulture) : "";
        string Depth(double si) => length.FromSi(si).ToString("F1", CultureInfo.InvariantCulture);
        double Value(ResultCsv table, int? row, string id) => row is { } r ? table.Numbers[id][r] : double.NaN;
        bool Moved(string edge) => !(Math.Abs(Value(a.Layers, match.Before, edge) - Value(b.Layers, match.After, edge)) < SameEdge);

        var (table, at) = match.Before is { } before ? (a.Layers, before) : (b.Layers, match.After!.Value);
        string[] head =
        [
            Number(a.Layers, match.Before), Number(b.Layers, match.After), table.Words["zone"][at],
            $"{Depth(table.Numbers["top_tvd"][at])}-{Depth(table.Numbers["base_tvd"][at])}", (100 * match.Overlap).ToString("F0", CultureInfo.InvariantCulture),
        ];
        var rows = new List<string[]>();
        if (Moved("top_tvd") || Moved("base_tvd"))
        {
            var now = match.After is { } after ? $"{Depth(b.Layers.Numbers["top_tvd"][after])}-{Depth(b.Layers.Numbers["base_tvd"][after])}" : "";
            rows.Add([.. head, "edges, tvd", length.Symbol, match.Before is null ? "" : head[3], now, ""]);
        }

        foreach (var id in OfLayers)
        {
            var column = (NumberColumn<LayerTable>)LayerColumns.All.First(c => c.Id == id);
            if (Row(column, Value(a.Layers, match.Before, id), Value(b.Layers, match.After, id), a.Units, b.Units) is { } cells) rows.Add([.. head, .. cells]);
        }

        for (var k = 1; k < rows.Count; k++) rows[k] = ["", "", "", "", "", .. rows[k][5..]];
        return rows;
    }

    private static double Weight(ResultSet a, ResultSet b, LayerMatch match) => match is { Before: { } i, After: { } j }
        ? Math.Abs(a.Layers.Numbers["shmin_mean"][i] - b.Layers.Numbers["shmin_mean"][j]) is var change && double.IsFinite(change) ? change : double.MaxValue
        : double.MaxValue;

    /// <summary>Symbol, unit, both values and the change; null where they are the same within what the files print.</summary>
    private static string[]? Row<TSource>(NumberColumn<TSource> column, double before, double after, UnitSystem first, UnitSystem second)
    {
        if (double.IsNaN(before) == double.IsNaN(after) && !(Math.Abs(after - before) > Rounding(column, first, second))) return null;
        var (unit, decimals) = column.In(first);
        var format = "F" + Math.Max(0, decimals - 2).ToString(CultureInfo.InvariantCulture);
        string Show(double si) => double.IsNaN(si) ? "" : unit.FromSi(si).ToString(format, CultureInfo.InvariantCulture);
        var change = unit.FromSi(after) - unit.FromSi(before);
        var text = double.IsNaN(change) ? "" : change.ToString(format, CultureInfo.InvariantCulture);
        if (text.Length > 0 && text.Trim('-', '0', '.').Length == 0) text = "small";
        else if (change > 0) text = "+" + text;
        return [column.Symbol, unit.Symbol, Show(before), Show(after), text];
    }
}
