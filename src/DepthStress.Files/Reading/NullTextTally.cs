using System.Globalization;
using DepthStress.Core.Diagnostics;

namespace DepthStress.Files.Reading;

/// <summary>Counts the words for no value in each column.</summary>
internal sealed class NullTextTally(List<ColumnHeader> headers)
{
    private readonly SortedDictionary<int, (int Count, string First, SourcePosition Position)> _columns = [];

    /// <summary>Counts a word; true for the first of its column, which <see cref="Place"/> then describes.</summary>
    public bool Count(int column)
    {
        var known = _columns.TryGetValue(column, out var seen);
        _columns[column] = seen with { Count = seen.Count + 1 };
        return !known;
    }

    /// <summary>Says what the first word of a column was and where.</summary>
    public void Place(int column, SourcePosition position, ReadOnlySpan<byte> text) =>
        _columns[column] = _columns[column] with { First = TextCleaner.Quote(text), Position = position };

    /// <summary>Warns of each column that has such words.</summary>
    public void Report(DiagnosticBag diagnostics)
    {
        foreach (var (column, (count, first, position)) in _columns)
        {
            diagnostics.Warning(position, string.Create(
                CultureInfo.InvariantCulture,
                $"column \"{headers[column].Name}\": found \"{first}\"{(count == 1 ? "" : string.Create(CultureInfo.InvariantCulture, $" and the like in {count} rows"))}, read as missing"));
        }
    }
}
