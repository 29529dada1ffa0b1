using System.Text;
using DepthStress.Core.Model;
using DepthStress.Core.Quantities;

namespace DepthStress.Files.Writing;

/// <summary>
/// <c>results.las</c>: the columns of numbers that its lines have room for as LAS 2.0 (Canadian Well Logging Society, LAS Version 2.0), one line per sample, ASCII,
/// missing = -999.25. Mnemonics are the column ids in capitals; measured depth is DEPT, the index.
/// </summary>
public static class ResultsLas
{
    /// <summary>What stands for a missing value.</summary>
    internal const string Null = "-999.25";

    /// <summary>Writes the file.</summary>
    /// <param name="model">The model.</param>
    /// <param name="units">The units of the results.</param>
    /// <param name="destination">Gets the bytes; stays open.</param>
    public static void Write(EarthModel model, UnitSystem units, Stream destination)
    {
        ArgumentNullException.ThrowIfNull(model);
        ArgumentNullException.ThrowIfNull(destination);
        using var sink = new ByteSink(destination);
        NumberColumn<EarthModel>[] columns = [.. DepthColumns.Numbers.Where(c => c.InLas)];
        sink.Put(Encoding.ASCII.GetBytes(LasHeaderText.Of(model, columns, units)));
        var missing = Encoding.ASCII.GetBytes(Null);
        RowWriter.Rows(model, model.Count, [.. columns.Select(c => new NumberCells<EarthModel>(c, units, missing))], ' ', sink);
    }
}
