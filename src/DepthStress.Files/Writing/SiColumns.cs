using DepthStress.Core.Layers;
using DepthStress.Core.Model;
using DepthStress.Core.Quantities;

namespace DepthStress.Files.Writing;

/// <summary>Layer columns as other programs take them: SI, every digit.</summary>
internal static class SiColumns
{
    /// <summary>The column's name with its SI unit.</summary>
    public static string Name(NumberColumn<LayerTable> column) => Suffix(column.Metric.Unit.Dimension) is { Length: > 0 } suffix ? $"{column.Id}_{suffix}" : column.Id;

    /// <summary>The values of every layer.</summary>
    public static double[] Values(NumberColumn<LayerTable> column, LayerTable table)
    {
        var values = new double[table.Layers.Count];
        column.Read(table, 0, values);
        return values;
    }

    private static string Suffix(Dimension dimension) => dimension switch
    {
        Dimension.Length => "m",
        Dimension.Density => "kg_m3",
        Dimension.Pressure => "pa",
        Dimension.Angle => "rad",
        Dimension.Temperature => "k",
        Dimension.Toughness => "pa_m0_5",
        Dimension.None or Dimension.Fraction => "",
        _ => throw new ArgumentOutOfRangeException(nameof(dimension), dimension, "expected a dimension that layers have"),
    };
}
