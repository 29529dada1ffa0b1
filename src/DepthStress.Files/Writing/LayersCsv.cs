using DepthStress.Core.Layers;
using DepthStress.Core.Quantities;

namespace DepthStress.Files.Writing;

/// <summary>
/// <c>layers.csv</c>: every column of <see cref="LayerColumns"/> for every layer. The file is a plain table with one header line;
/// datum, depth kinds and caution stand in the guide beside it (<see cref="ResultGuide"/>).
/// </summary>
public static class LayersCsv
{
    /// <summary>Writes the table.</summary>
    /// <param name="table">The layers.</param>
    /// <param name="units">The units of the results.</param>
    /// <param name="destination">Gets the bytes; stays open.</param>
    public static void Write(LayerTable table, UnitSystem units, Stream destination)
    {
        ArgumentNullException.ThrowIfNull(table);
        ArgumentNullException.ThrowIfNull(destination);
        RowWriter.Csv(table, table.Layers.Count, LayerColumns.All, units, destination);
    }
}
