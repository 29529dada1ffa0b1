using DepthStress.Core.Calibration;
using DepthStress.Core.Quantities;

namespace DepthStress.Files.Writing;

/// <summary><c>observations.csv</c>: every column of <see cref="ObservedColumns"/> for every observation.</summary>
public static class ObservationsCsv
{
    /// <summary>Writes the table.</summary>
    /// <param name="rows">The observations beside the model.</param>
    /// <param name="units">The units of the results.</param>
    /// <param name="destination">Gets the bytes; stays open.</param>
    public static void Write(IReadOnlyList<Comparison> rows, UnitSystem units, Stream destination)
    {
        ArgumentNullException.ThrowIfNull(rows);
        ArgumentNullException.ThrowIfNull(destination);
        RowWriter.Csv(rows, rows.Count, ObservedColumns.All, units, destination);
    }
}
