using System.Text;

namespace DepthStress.Files.Reading;

/// <summary>Reads logs from a table whose columns are parted by runs of blanks.</summary>
internal static class BlankLogReader
{
    /// <summary>Reads the file; null when it cannot be used.</summary>
    public static LogFile? Read(LogSource source, CsvDialect dialect)
    {
        var lines = new LineReader(source.Text);
        var (depth, unitRowMayCome) = (-1, false);
        List<ColumnHeader>? headers = null;
        TableBuilder? table = null;
        LasCells? cells = null;
        while (lines.TryRead(out var line))
        {
            if (lines.Line < dialect.HeaderLine || line.Trim(" \t"u8).IsEmpty) continue;
            if (headers is null)
            {
                headers = CsvHeader.Read(HeaderCells(line, lines.Line, source), lines.Line, dialect.Delimiter, source);
                if (headers is null || (depth = CsvHeader.FindDepth(headers, lines.Line, source)) < 0) return null;
                unitRowMayCome = true;
                continue;
            }

            if (unitRowMayCome)
            {
                unitRowMayCome = false;
                if (CsvHeader.TakeUnitRow(HeaderCells(line, lines.Line, source), lines.Line, headers, depth, source)) continue;
            }

            if (table is null || cells is null)
            {
                table = new TableBuilder(source, headers, depth, nullValue: null, dialect.DecimalComma);
                cells = new LasCells(source, table, new LasDialect(CsvOptions.Blanks, dialect.DecimalComma), depth);
            }

            cells.AddRow(line, lines.Line);
        }

        if (lines.TooLong)
        {
            source.LineTooLong(lines.Line + 1);
            return null;
        }

        if (headers is null)
        {
            source.Diagnostics.Error(source.At(), "found no header row, expected the names of the columns");
            return null;
        }

        table ??= new TableBuilder(source, headers, depth, nullValue: null, dialect.DecimalComma);
        var file = table.Finish(LogFormat.Csv, wellName: null);
        if (file is not null) cells?.ReportRunOns();
        return file;
    }

    private static List<HeaderCell> HeaderCells(ReadOnlySpan<byte> line, int number, LogSource source)
    {
        var spans = new List<CellSpan>();
        RowCells.Split(line, CsvOptions.Blanks, spans);
        var (cells, foreign) = (new List<HeaderCell>(spans.Count), false);
        foreach (var span in spans)
        {
            cells.Add(HeaderCell.Of(line.Slice(span.Start, span.Length), Encoding.UTF8.GetCharCount(line[..span.Start]) + 1, ref foreign));
        }

        if (foreign) source.ReportForeignBytes(source.At(number));
        return cells;
    }
}
