using System.Text;
using DepthStress.Core.Model;
using DepthStress.Core.Quantities;

namespace DepthStress.Files.Writing;

/// <summary>Writes tables row by row from columns that are read chunk by chunk.</summary>
internal static class RowWriter
{
    /// <summary>Writes every row, its cells parted by one separator, each row ended by a line feed.</summary>
    public static void Rows<TSource>(TSource source, int rows, CellColumn<TSource>[] columns, char separator, ByteSink sink)
    {
        for (var start = 0; start < rows; start += CellColumn<TSource>.Chunk)
        {
            var count = Math.Min(CellColumn<TSource>.Chunk, rows - start);
            foreach (var column in columns) column.Load(source, start, count);
            for (var row = 0; row < count; row++)
            {
                for (var c = 0; c < columns.Length; c++)
                {
                    if (c > 0) sink.Put((byte)separator);
                    columns[c].Put(row, sink);
                }

                sink.Put((byte)'\n');
            }
        }
    }

    /// <summary>
    /// Writes a CSV table (RFC 4180, UTF-8 without a byte-order mark, line feeds): one header line of names with units, then the
    /// rows; missing is empty.
    /// </summary>
    public static void Csv<TSource>(
        TSource source, int rows, IReadOnlyList<Column<TSource>> columns, UnitSystem units, Stream destination)
    {
        using var sink = new ByteSink(destination);
        sink.Put(Encoding.UTF8.GetBytes(string.Join(',', columns.Select(c => c.NameIn(units))) + "\n"));
        Rows(source, rows, [.. columns.Select(c => Cells(c, units))], ',', sink);
    }

    /// <summary>The column's name in result tables: with its unit where it has one.</summary>
    public static string NameIn<TSource>(this Column<TSource> column, UnitSystem units) =>
        column is NumberColumn<TSource> number ? number.Header(units) : column.Id;

    private static CellColumn<TSource> Cells<TSource>(Column<TSource> column, UnitSystem units) => column switch
    {
        NumberColumn<TSource> number => new NumberCells<TSource>(number, units, []),
        TextColumn<TSource> text => new TextCells<TSource>(text),
        _ => throw new ArgumentException($"found a column \"{column.Id}\" of unknown kind, expected numbers or words", nameof(column)),
    };
}
