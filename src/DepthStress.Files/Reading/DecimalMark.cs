namespace DepthStress.Files.Reading;

/// <summary>Tells whether the decimal mark of a file is a comma.</summary>
internal static class DecimalMark
{
    /// <summary>
    /// True where some cells are numbers with a comma, none has a point, and at least one comma cannot be a thousands
    /// separator. Where all could be, the answer is no: the cells are then errors that show both readings.
    /// </summary>
    public static bool IsComma(IEnumerable<byte[]> rows, char delimiter)
    {
        var sure = false;
        var cells = new List<CellSpan>();
        foreach (var row in rows)
        {
            RowCells.Split(row, delimiter, cells);
            foreach (var span in cells)
            {
                var cell = row.AsSpan(span.Start, span.Length);
                if (cell.Contains((byte)'.') && NumberText.TryParse(cell, out _)) return false;
                sure |= NumberMarks.TryParseComma(cell, out _) && !NumberMarks.IsGrouped(cell, ',');
            }
        }

        return sure;
    }
}
