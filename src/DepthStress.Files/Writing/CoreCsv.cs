using DepthStress.Core.Calibration;
using DepthStress.Core.Quantities;

namespace DepthStress.Files.Writing;

/// <summary>
/// <c>core.csv</c>: every plug beside the model at its depth. The guide beside it says what the columns are
/// (<see cref="ResultGuide"/>).
/// </summary>
public static class CoreCsv
{
    /// <summary>Writes the table.</summary>
    /// <param name="core">The comparison.</param>
    /// <param name="units">The units of the results.</param>
    /// <param name="destination">Gets the bytes; stays open.</param>
    public static void Write(CoreComparison core, UnitSystem units, Stream destination)
    {
        ArgumentNullException.ThrowIfNull(core);
        ArgumentNullException.ThrowIfNull(destination);
        RowWriter.Csv(core, core.Rows.Count, CoreColumns.All, units, destination);
    }
}
