namespace DepthStress.Files.Reading;

/// <summary>A cell of a line.</summary>
/// <param name="Start">Where its text starts in the line, in bytes.</param>
/// <param name="Length">Length of its text, quotes and outer blanks left out.</param>
internal readonly record struct CellSpan(int Start, int Length);

/// <summary>Splits a line into cells.</summary>
internal static class RowCells
{
    /// <summary>
    /// Splits at runs of blanks and tabs (<see cref="CsvOptions.Blanks"/>), or at every delimiter; a delimiter in quotes
    /// is text, and one at the end of a line that then has a cell too many ends the last cell.
    /// </summary>
    public static void Split(ReadOnlySpan<byte> line, char delimiter, List<CellSpan> cells, int expected = int.MaxValue)
    {
        cells.Clear();
        if (delimiter == CsvOptions.Blanks) SplitBlanks(line, cells);
        else SplitStrictly(line, (byte)delimiter, cells);
        if (delimiter != CsvOptions.Blanks && cells.Count - 1 == expected && cells[^1].Length == 0) cells.RemoveAt(expected);
    }

    private static void SplitBlanks(ReadOnlySpan<byte> line, List<CellSpan> cells)
    {
        for (var i = 0; i < line.Length;)
        {
            if (IsBlank(line[i]))
            {
                i++;
                continue;
            }

            if (line[i] == (byte)'"' && line[(i + 1)..].IndexOf((byte)'"') is >= 0 and var length)
            {
                cells.Add(new CellSpan(i + 1, length));
                i += length + 2;
                continue;
            }

            var start = i;
            while (i < line.Length && !IsBlank(line[i])) i++;
            cells.Add(new CellSpan(start, i - start));
        }
    }

    private static void SplitStrictly(ReadOnlySpan<byte> line, byte delimiter, List<CellSpan> cells)
    {
        for (var start = 0; start <= line.Length;)
        {
            var text = start;
            while (text < line.Length && line[text] != delimiter && IsBlank(line[text])) text++;
            if (text < line.Length && line[text] == (byte)'"' && line[(text + 1)..].IndexOf((byte)'"') is >= 0 and var quoted)
            {
                var after = line[(text + quoted + 2)..];
                var gap = after.IndexOf(delimiter) is >= 0 and var g ? g : after.Length;
                if (after[..gap].Trim(" \t"u8).IsEmpty)
                {
                    cells.Add(new CellSpan(text + 1, quoted));
                    start = text + quoted + 2 + gap + 1;
                    continue;
                }
            }

            var end = line[text..].IndexOf(delimiter) is >= 0 and var e ? text + e : line.Length;
            cells.Add(new CellSpan(text, line[text..end].TrimEnd(" \t"u8).Length));
            start = end + 1;
        }
    }

    private static bool IsBlank(byte b) => b is (byte)' ' or (byte)'\t';
}
