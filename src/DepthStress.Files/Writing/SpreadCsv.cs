using DepthStress.Core.Calibration;
using DepthStress.Core.Quantities;

namespace DepthStress.Files.Writing;

/// <summary><c>spread.csv</c>: every column of <see cref="SpreadColumns"/> for every combination of choices.</summary>
public static class SpreadCsv
{
    /// <summary>Writes the table.</summary>
    /// <param name="rows">The combinations.</param>
    /// <param name="units">The units of the results.</param>
    /// <param name="destination">Gets the bytes; stays open.</param>
    public static void Write(IReadOnlyList<SpreadRow> rows, UnitSystem units, Stream destination)
    {
        ArgumentNullException.ThrowIfNull(rows);
        ArgumentNullException.ThrowIfNull(destination);
        RowWriter.Csv(rows, rows.Count, SpreadColumns.All, units, destination);
    }
}
