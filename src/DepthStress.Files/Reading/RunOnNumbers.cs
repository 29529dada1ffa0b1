namespace DepthStress.Files.Reading;

/// <summary>Splits negative numbers that fill their field and so touch the number before them, as in <c>12.3-4.5</c>.</summary>
internal static class RunOnNumbers
{
    /// <summary>Splits every cell that can be, if the row then has just as many cells as wanted; else changes nothing.</summary>
    public static bool TrySplit(ReadOnlySpan<byte> line, List<CellSpan> cells, int wanted)
    {
        if (cells.Count >= wanted) return false;
        var split = new List<CellSpan>();
        foreach (var cell in cells)
        {
            if (split.Count >= wanted) return false;
            var before = split.Count;
            if (Split(line, cell, split)) continue;
            split.RemoveRange(before, split.Count - before);
            split.Add(cell);
        }

        if (split.Count != wanted) return false;
        cells.Clear();
        cells.AddRange(split);
        return true;
    }

    // Each part needs a point, or is a usual missing-value code: dates such as 12-11-2020 stay whole.
    private static bool Split(ReadOnlySpan<byte> line, CellSpan cell, List<CellSpan> parts)
    {
        var (start, end) = (cell.Start, cell.Start + cell.Length);
        for (var i = start + 1; i <= end; i++)
        {
            if (i < end && (line[i] != (byte)'-' || !(line[i - 1] is >= (byte)'0' and <= (byte)'9' or (byte)'.'))) continue;
            var part = line[start..i];
            var whole = part.SequenceEqual("-999"u8) || part.SequenceEqual("-9999"u8);
            if (!(part.Contains((byte)'.') || whole) || NumberText.Read(part, out _) != part.Length) return false;
            parts.Add(new CellSpan(start, i - start));
            start = i;
        }

        return true;
    }
}
