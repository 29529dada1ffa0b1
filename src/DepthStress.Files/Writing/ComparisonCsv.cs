using DepthStress.Core.Model;
using DepthStress.Core.Quantities;

namespace DepthStress.Files.Writing;

/// <summary>
/// <c>comparison.csv</c>: the depths and, column by column, what other relations would give for the least horizontal stress.
/// Apart from the model's results on purpose. The guide beside it says what the columns are (<see cref="ResultGuide"/>).
/// </summary>
public static class ComparisonCsv
{
    /// <summary>Writes the table; the model has at least one comparison curve.</summary>
    /// <param name="model">The model.</param>
    /// <param name="units">The units of the results.</param>
    /// <param name="destination">Gets the bytes; stays open.</param>
    public static void Write(EarthModel model, UnitSystem units, Stream destination)
    {
        ArgumentNullException.ThrowIfNull(model);
        ArgumentNullException.ThrowIfNull(destination);
        RowWriter.Csv(model, model.Count, ComparisonColumns.Of(model), units, destination);
    }
}
