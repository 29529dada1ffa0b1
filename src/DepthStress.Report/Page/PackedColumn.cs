using System.Buffers.Binary;
using DepthStress.Core.Model;
using DepthStress.Core.Quantities;

namespace DepthStress.Report.Page;

/// <summary>
/// A column as the page carries it: the printed digits of each row as little-endian whole numbers. Where rows are bins, the
/// least and the greatest of each bin, so that no extreme is lost.
/// </summary>
/// <param name="Column">The column.</param>
/// <param name="Wide">True when the digits do not fit into 32 bits; they are then stored as doubles, missing as NaN.</param>
/// <param name="Low">The digits, or the least of each bin.</param>
/// <param name="High">The greatest of each bin; null where rows are samples.</param>
internal sealed record PackedColumn(NumberColumn<EarthModel> Column, bool Wide, byte[] Low, byte[]? High)
{
    /// <summary>Stands for a missing value in 32 bits.</summary>
    public const int Missing = int.MinValue;

    private const int Chunk = 4096;

    /// <summary>Packs a column; null when it has no value.</summary>
    public static PackedColumn? Of(EarthModel model, NumberColumn<EarthModel> column, UnitSystem units, Bins bins)
    {
        var (low, high) = (new double[bins.Rows], new double[bins.Rows]);
        Array.Fill(low, double.NaN);
        Array.Fill(high, double.NaN);
        var values = new double[Math.Min(Chunk, model.Count)];
        for (var start = 0; start < model.Count; start += Chunk)
        {
            var n = Math.Min(Chunk, model.Count - start);
            column.Fill(model, start, units, values.AsSpan(0, n));
            for (var i = 0; i < n; i++)
            {
                var (value, row) = (values[i], (start + i) / bins.PerRow);
                if (!double.IsFinite(value)) continue;
                if (!(value >= low[row])) low[row] = value;
                if (!(value <= high[row])) high[row] = value;
            }
        }

        // Rounding keeps order, so the least value has the least digits.
        var wide = Round(low) | Round(high);
        return Array.TrueForAll(low, double.IsNaN) ? null : new PackedColumn(column, wide, Bytes(low, wide), bins.PerRow > 1 ? Bytes(high, wide) : null);

        bool Round(double[] row)
        {
            var beyond = false;
            for (var i = 0; i < row.Length; i++)
            {
                row[i] = ScaledDigits.Of(row[i], column.In(units).Decimals);
                beyond |= Math.Abs(row[i]) > int.MaxValue;
            }

            return beyond;
        }
    }

    private static byte[] Bytes(double[] digits, bool wide)
    {
        var size = wide ? sizeof(double) : sizeof(int);
        var bytes = new byte[digits.Length * size];
        for (var i = 0; i < digits.Length; i++)
        {
            var place = bytes.AsSpan(i * size);
            if (wide) BinaryPrimitives.WriteDoubleLittleEndian(place, digits[i]);
            else BinaryPrimitives.WriteInt32LittleEndian(place, double.IsNaN(digits[i]) ? Missing : (int)digits[i]);
        }

        return bytes;
    }
}
