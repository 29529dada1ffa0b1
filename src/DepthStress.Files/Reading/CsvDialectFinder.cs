namespace DepthStress.Files.Reading;

/// <summary>Detects from its head how a CSV file is written, where the well file does not say.</summary>
internal static class CsvDialectFinder
{
    private const int MostLines = 200;
    private const string Delimiters = ",;\t| ";

    /// <summary>
    /// The header row is the first line that names a depth column and is followed by rows of as many cells that are mostly
    /// numbers; lacking one, the first line, and the delimiter that is most frequent in it. Null, with an error, where the
    /// stated header line is not in the head.
    /// </summary>
    public static CsvDialect? Find(LogSource source)
    {
        var (scan, options) = (source.Scan, source.Options.Csv);
        var lines = HeadLines.Of(scan).Take(options.HeaderLine is null ? MostLines : int.MaxValue).ToList();
        var first = 0;
        if (options.HeaderLine is { } stated)
        {
            first = lines.FindIndex(l => l.Number == stated);
            if (first < 0)
            {
                source.Diagnostics.Error(source.At(stated), "found no header row, expected the names of the columns in this line, within the first 64 KB, as the well file says");
                return null;
            }
        }

        if (lines.Count == 0) return new CsvDialect(options.Delimiter ?? ',', options.Decimal == ',', 1, 0);
        var delimiters = options.Delimiter is { } only ? only.ToString() : Delimiters;
        var last = options.HeaderLine is null ? lines.Count - 1 : first;
        for (var at = first; at <= last; at++)
        {
            foreach (var delimiter in delimiters)
            {
                if (NamesDepth(scan, lines[at], delimiter, source) && IsFollowedByRows(scan, lines, at, delimiter)) return Make(source, lines, at, delimiter);
            }
        }

        foreach (var delimiter in delimiters)
        {
            if (NamesDepth(scan, lines[first], delimiter, source)) return Make(source, lines, first, delimiter);
        }

        return Make(source, lines, first, options.Delimiter ?? MostFrequent(Text(scan, lines[first])));
    }

    private static CsvDialect Make(LogSource source, List<HeadLine> lines, int at, char delimiter)
    {
        var rows = lines.Skip(at + 1).Take(MostLines).Select(l => Text(source.Scan, l).ToArray());
        var comma = source.Options.Csv.Decimal is { } stated ? stated == ',' : delimiter != ',' && DecimalMark.IsComma(rows, delimiter);
        return new CsvDialect(delimiter, comma, lines[at].Number, at > 0 ? lines[at].Start : 0);
    }

    private static bool NamesDepth(FileScan scan, HeadLine line, char delimiter, LogSource source)
    {
        var cells = new List<CellSpan>();
        var text = Text(scan, line);
        RowCells.Split(text, delimiter, cells);
        if (cells.Count < 2) return false;
        var foreign = false;
        foreach (var cell in cells)
        {
            var name = CsvHeader.SplitUnit(TextCleaner.Clean(TextCleaner.Decode(text.Slice(cell.Start, cell.Length), ref foreign)), source.Options.UnitSuffixes).Name;
            if (ColumnHeader.IsDepth(name, source.Options)) return true;
        }

        return false;
    }

    private static bool IsFollowedByRows(FileScan scan, List<HeadLine> lines, int at, char delimiter)
    {
        var cells = new List<CellSpan>();
        RowCells.Split(Text(scan, lines[at]), delimiter, cells);
        var columns = cells.Count;
        for (var next = at + 1; next < lines.Count && next <= at + 3; next++)
        {
            var row = Text(scan, lines[next]);
            RowCells.Split(row, delimiter, cells, columns);
            if (cells.Count != columns) continue;
            var (numbers, empty) = (0, 0);
            foreach (var span in cells)
            {
                var cell = row.Slice(span.Start, span.Length);
                if (cell.IsEmpty) empty++;
                else if (NumberText.TryParse(cell, out _) || NumberMarks.TryParseComma(cell, out _) || NullText.Is(cell)) numbers++;
            }

            if (numbers > 0 && 2 * numbers >= columns - empty) return true;
        }

        return false;
    }

    private static char MostFrequent(ReadOnlySpan<byte> line)
    {
        var cells = new List<CellSpan>();
        var (best, most) = (',', 1);
        foreach (var delimiter in Delimiters)
        {
            // Blanks are frequent in names: they count only where there is no other delimiter.
            if (delimiter == CsvOptions.Blanks && most > 1) break;
            RowCells.Split(line, delimiter, cells);
            if (cells.Count > most) (best, most) = (delimiter, cells.Count);
        }

        return best;
    }

    private static ReadOnlySpan<byte> Text(FileScan scan, HeadLine line) => scan.Head.AsSpan(line.Start, line.Length);
}
