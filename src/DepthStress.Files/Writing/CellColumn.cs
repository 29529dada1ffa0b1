using System.Text;
using DepthStress.Core.Model;
using DepthStress.Core.Quantities;

namespace DepthStress.Files.Writing;

/// <summary>One column of a table being written: loaded chunk by chunk, written cell by cell.</summary>
/// <typeparam name="TSource">What the table is made from.</typeparam>
internal abstract class CellColumn<TSource>
{
    /// <summary>Rows loaded at a time.</summary>
    public const int Chunk = 1024;

    /// <summary>Reads rows [start, start + count).</summary>
    public abstract void Load(TSource source, int start, int count);

    /// <summary>Writes the cell of a loaded row, counted from the chunk's start.</summary>
    public abstract void Put(int row, ByteSink sink);
}

/// <summary>Numbers in the column's unit with the column's decimals.</summary>
internal sealed class NumberCells<TSource>(NumberColumn<TSource> column, UnitSystem units, byte[] missing) : CellColumn<TSource>
{
    private readonly double[] _values = new double[Chunk];
    private readonly int _decimals = column.In(units).Decimals;

    public override void Load(TSource source, int start, int count) => column.Fill(source, start, units, _values.AsSpan(0, count));

    public override void Put(int row, ByteSink sink)
    {
        var value = _values[row];
        if (double.IsFinite(value)) sink.Put(value, _decimals);
        else sink.Put(missing);
    }
}

/// <summary>Words as CSV fields; each distinct word is made into bytes once.</summary>
internal sealed class TextCells<TSource>(TextColumn<TSource> column) : CellColumn<TSource>
{
    private readonly string[] _words = new string[Chunk];
    private readonly Dictionary<string, byte[]> _known = new(StringComparer.Ordinal);
    private string? _last;
    private byte[] _bytes = [];

    public override void Load(TSource source, int start, int count) => column.Read(source, start, _words.AsSpan(0, count));

    public override void Put(int row, ByteSink sink)
    {
        var word = _words[row];
        if (!ReferenceEquals(word, _last))
        {
            _last = word;
            if (!_known.TryGetValue(word, out _bytes!)) _known.Add(word, _bytes = Encoding.UTF8.GetBytes(CellText.Csv(word)));
        }

        sink.Put(_bytes);
    }
}
