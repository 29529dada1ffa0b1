namespace DepthStress.Files.Reading;

/// <summary>How the data of a LAS file are written, told from their first lines.</summary>
/// <param name="Delimiter">The delimiter.</param>
/// <param name="DecimalComma">True where the decimal mark is a comma.</param>
internal readonly record struct LasDialect(char Delimiter, bool DecimalComma)
{
    private const int MostRows = 50;

    /// <summary>
    /// Finds the dialect: the stated delimiter, unless no row fits it and some row fits another; the decimal comma where
    /// commas stand inside values, no value has a point, and not every comma could be a thousands separator.
    /// </summary>
    public static LasDialect Find(LogSource source, LasHeader header, int titleLine)
    {
        var rows = Rows(source.Scan, header.Version);
        var stated = header.Delimiter ?? CsvOptions.Blanks;
        var delimiter = stated;
        if (!header.Wrapped && rows.Count > 0 && !rows.Exists(r => Fits(r, stated, header.Curves.Count)))
        {
            foreach (var other in (ReadOnlySpan<char>)[CsvOptions.Blanks, ',', '\t'])
            {
                if (other == stated || !rows.Exists(r => Fits(r, other, header.Curves.Count))) continue;
                delimiter = other;
                source.Diagnostics.Note(source.At(titleLine), $"found {CsvDialect.Name(other)} between the values, not {(header.Delimiter is null ? "" : "the stated ")}{CsvDialect.Name(stated)}, read as such");
                break;
            }
        }

        var decimals = delimiter == ',' ? false : DecimalMark.IsComma(rows, delimiter);
        if (decimals) source.Diagnostics.Note(source.At(titleLine), "found decimal commas in the data, read as such");
        return new LasDialect(delimiter, decimals);
    }

    private static bool Fits(byte[] row, char delimiter, int columns)
    {
        var cells = new List<CellSpan>();
        RowCells.Split(row, delimiter, cells, columns);
        return cells.Count == columns && cells.TrueForAll(c => Cell.Read(row.AsSpan(c.Start, c.Length), delimiter != ',', out _) != CellKind.Bad
            || Cell.Read(row.AsSpan(c.Start, c.Length), false, out _) != CellKind.Bad);
    }

    private static List<byte[]> Rows(FileScan scan, double version)
    {
        var rows = new List<byte[]>();
        var inData = false;
        foreach (var line in HeadLines.Of(scan))
        {
            var text = scan.Head.AsSpan(line.Start, line.Length);
            var first = text.TrimStart(" \t"u8)[0];
            if (first == (byte)'#') continue;
            if (first == (byte)'~')
            {
                if (inData) break;
                var foreign = false;
                inData = LasSections.Kind(TextCleaner.Clean(TextCleaner.Decode(text, ref foreign)), version) == 'A';
            }
            else if (inData)
            {
                rows.Add(text.ToArray());
                if (rows.Count == MostRows) break;
            }
        }

        return rows;
    }
}
