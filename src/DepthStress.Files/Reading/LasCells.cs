using System.Buffers;
using System.Globalization;
using System.Text;

namespace DepthStress.Files.Reading;

/// <summary>Reads the cells of LAS lines that are not plain numbers between blanks.</summary>
internal sealed class LasCells(LogSource source, TableBuilder table, LasDialect dialect, int depth)
{
    private static readonly SearchValues<byte> NumberBytes = SearchValues.Create("+-.0123456789"u8);
    private readonly List<CellSpan> _cells = [];
    private int _runOns, _firstRunOn;
    private string _runOn = "";

    /// <summary>The table that is filled.</summary>
    public TableBuilder Table => table;

    /// <summary>True where the plain way of reading fits the dialect.</summary>
    public bool IsPlain => dialect is { Delimiter: CsvOptions.Blanks, DecimalComma: false };

    /// <summary>Reads a whole row from one line and adds it, or reports why not.</summary>
    public void AddRow(ReadOnlySpan<byte> line, int number)
    {
        var wanted = table.Row.Length;
        RowCells.Split(line, dialect.Delimiter, _cells, wanted);
        if (_cells.Count < wanted && RunOnNumbers.TrySplit(line, _cells, wanted) && _runOns++ == 0)
            (_firstRunOn, _runOn) = (number, TextCleaner.Quote(line.Trim(" \t"u8)));
        if (_cells.Count != wanted)
        {
            table.WrongCount(number, _cells.Count, Hint(line));
            return;
        }

        var (good, depthIsGood) = (true, true);
        for (var c = 0; c < wanted; c++)
        {
            if (Read(line, number, _cells[c], c)) continue;
            good = false;
            depthIsGood &= c != depth;
        }

        if (good) table.AddRow(number);
        else table.SkipRow(number, !depthIsGood);
    }

    /// <summary>Reads the cells of one line of a wrapped row, from a column on; gives how many there are, negative where one is bad.</summary>
    public int AddPart(ReadOnlySpan<byte> line, int number, int column)
    {
        RowCells.Split(line, dialect.Delimiter, _cells, table.Row.Length - column);
        var good = true;
        for (var c = 0; c < _cells.Count && column + c < table.Row.Length; c++) good &= Read(line, number, _cells[c], column + c);
        return good ? _cells.Count : -_cells.Count;
    }

    /// <summary>Warns of numbers that were split.</summary>
    public void ReportRunOns()
    {
        if (_runOns == 0) return;
        source.Diagnostics.Warning(source.At(_firstRunOn), string.Create(
            CultureInfo.InvariantCulture, $"found numbers that run together in {_runOns} {(_runOns == 1 ? "row" : "rows")}, split before the minus sign (\"{_runOn}\")"));
    }

    private bool Read(ReadOnlySpan<byte> line, int number, CellSpan span, int column)
    {
        var cell = line.Slice(span.Start, span.Length);
        switch (table.ReadCell(cell, column))
        {
            case CellKind.Bad:
                if (table.Tally.Admit(RowProblem.Cell, source.At(number))) table.BadCell(number, Place(line, span), column, cell);
                return false;
            case CellKind.NullText when table.NullTexts.Count(column):
                table.NullTexts.Place(column, source.At(number, Place(line, span)), cell);
                return true;
            default:
                return true;
        }
    }

    private static int Place(ReadOnlySpan<byte> line, CellSpan span) => Encoding.UTF8.GetCharCount(line[..span.Start]) + 1;

    private string Hint(ReadOnlySpan<byte> line)
    {
        foreach (var span in _cells)
        {
            var cell = line.Slice(span.Start, span.Length);
            if (_cells.Count < table.Row.Length && cell.Count((byte)'.') == 2 && !cell.ContainsAnyExcept(NumberBytes))
                return $"; \"{TextCleaner.Quote(cell)}\" may be two numbers that run together, which cannot be told apart";
        }

        return "";
    }
}
