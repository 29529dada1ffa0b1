using System.Globalization;

namespace DepthStress.Core.Model;

/// <summary>The columns of the comparison table: the depths, then one column for each comparison curve.</summary>
public static class ComparisonColumns
{
    private static readonly string[] Depths = ["md", "tvd", "tvdss"];

    /// <summary>The columns; empty when the model has no comparison curve.</summary>
    public static IReadOnlyList<Column<EarthModel>> Of(EarthModel model)
    {
        ArgumentNullException.ThrowIfNull(model);
        return model.Comparisons.Count == 0 ? [] : [.. Depths.Select(DepthColumns.Get), .. model.Comparisons.Select(Of)];
    }

    /// <summary>The column of one curve.</summary>
    public static NumberColumn<EarthModel> Of(ComparisonCurve curve)
    {
        ArgumentNullException.ThrowIfNull(curve);
        var ratios = string.Join(" and ", curve.Ratios.Select(r => r.ToString("G6", CultureInfo.InvariantCulture)));
        var (metric, field) = ColumnUnits.Stresses;
        return new(
            curve.Law.Id.Replace('-', '_'), curve.Law.Title + (ratios.Length > 0 ? $", ratio {ratios}" : ""), curve.Law.Id, metric, field,
            $"comparison only: {curve.Law.Text}", (_, start, destination) => curve.Values.AsSpan(start, destination.Length).CopyTo(destination));
    }
}
