using DepthStress.Core.Model;
using DepthStress.Core.Quantities;

namespace DepthStress.Files.Writing;

/// <summary>
/// <c>depth.csv</c>: every column of <see cref="DepthColumns"/> at every sample. The file is a plain table with one header line;
/// datum, depth kinds and caution stand in the guide beside it (<see cref="ResultGuide"/>).
/// </summary>
public static class DepthCsv
{
    /// <summary>Writes the table.</summary>
    /// <param name="model">The model.</param>
    /// <param name="units">The units of the results.</param>
    /// <param name="destination">Gets the bytes; stays open.</param>
    public static void Write(EarthModel model, UnitSystem units, Stream destination)
    {
        ArgumentNullException.ThrowIfNull(model);
        ArgumentNullException.ThrowIfNull(destination);
        RowWriter.Csv(model, model.Count, DepthColumns.All, units, destination);
    }
}
