using System.Runtime.CompilerServices;
using System.Text;
using CsvHelper;

namespace DepthStress.Files.Reading;

/// <summary>Reads the rows of a CSV file whose cells are parted by a delimiter.</summary>
internal sealed class CsvRows(LogSource source, CsvReader csv, CsvDialect dialect, List<CsvMalformedRecord> malformed)
{
    /// <summary>The line in the file of a line that the CSV reader counts.</summary>
    public int LineOf(long line) => (int)line + (dialect.HeaderStart > 0 ? dialect.HeaderLine - 1 : 0);

    /// <summary>Reads the file; null when it cannot be used.</summary>
    public LogFile? Read()
    {
        if (!csv.Read())
        {
            source.Diagnostics.Error(source.At(), "found no header row, expected the names of the columns");
            return null;
        }

        var line = LineOf(csv.LineNumber);
        if (malformed.Count > 0)
        {
            source.Diagnostics.Error(source.At(line), QuoteText(malformed[0].Reason));
            return null;
        }

        if (CsvHeader.Read(HeaderCells(), line, dialect.Delimiter, source) is not { } headers) return null;
        var depth = CsvHeader.FindDepth(headers, line, source);
        if (depth < 0) return null;
        var more = csv.Read();
        var unitRow = more && malformed.Count == 0 && csv.FieldCount == headers.Count
            && CsvHeader.TakeUnitRow(HeaderCells(), LineOf(csv.LineNumber), headers, depth, source);
        if (unitRow) more = csv.Read();
        var table = new TableBuilder(source, headers, depth, nullValue: null, dialect.DecimalComma);
        for (; more; more = csv.Read()) ReadRow(table, depth);
        return table.Finish(LogFormat.Csv, wellName: null);
    }

    [MethodImpl(MethodImplOptions.AggressiveOptimization)]
    private void ReadRow(TableBuilder table, int depth)
    {
        var line = LineOf(csv.LineNumber);
        if (malformed.Count > 0)
        {
            table.Depth.Skip();
            if (table.Tally.Admit(RowProblem.Quote, source.At(line))) source.Diagnostics.Error(source.At(line), QuoteText(malformed[0].Reason));
            malformed.Clear();
            return;
        }

        var row = table.Row;
        if (csv.FieldCount != row.Length)
        {
            if (csv.FieldCount > 1 || !csv.GetSpan(0).Trim(" \t"u8).IsEmpty) table.WrongCount(line, csv.FieldCount, CommaHint(row.Length));
            return;
        }

        var (good, depthIsBad, comma) = (true, false, dialect.DecimalComma);
        for (var c = 0; c < row.Length; c++)
        {
            if ((!comma && NumberText.TryParse(csv.GetSpan(c), out row[c])) || ReadOdd(table, line, c)) continue;
            good = false;
            depthIsBad |= c == depth;
        }

        if (good) table.AddRow(line);
        else table.SkipRow(line, depthIsBad);
    }

    private bool ReadOdd(TableBuilder table, int line, int column)
    {
        var cell = csv.GetSpan(column);
        var kind = table.ReadCell(cell, column);
        if (kind == CellKind.NullText && table.NullTexts.Count(column)) table.NullTexts.Place(column, source.At(line, PlaceOf(column)), cell);
        if (kind == CellKind.Bad && table.Tally.Admit(RowProblem.Cell, source.At(line))) table.BadCell(line, PlaceOf(column), column, cell);
        return kind != CellKind.Bad;
    }

    private List<HeaderCell> HeaderCells()
    {
        var cells = new List<HeaderCell>(csv.FieldCount);
        var foreign = false;
        for (int c = 0, column = 1; c < csv.FieldCount; column += RawLength(c) + 1, c++) cells.Add(HeaderCell.Of(csv.GetSpan(c), column, ref foreign));
        if (foreign) source.ReportForeignBytes(source.At(LineOf(csv.LineNumber)));
        return cells;
    }

    // Whole numbers side by side in a row with too many cells may be a number with a decimal comma.
    private string CommaHint(int expected)
    {
        if (dialect.Delimiter != ',' || csv.FieldCount <= expected) return "";
        for (var c = 0; c + 1 < csv.FieldCount; c++)
        {
            var left = csv.GetSpan(c);
            var right = csv.GetSpan(c + 1);
            if (left.IsEmpty || right.IsEmpty || left.Length > 12 || right.Length > 12 || !IsWhole(left[0] == (byte)'-' ? left[1..] : left) || !IsWhole(right)) continue;
            var (whole, fraction) = (Encoding.ASCII.GetString(left), Encoding.ASCII.GetString(right));
            return $"; \"{whole},{fraction}\" is two values where ',' is the delimiter, or {whole}.{fraction} where it is the decimal mark";
        }

        return "";
    }

    private static bool IsWhole(ReadOnlySpan<byte> cell) => !cell.IsEmpty && !cell.ContainsAnyExceptInRange((byte)'0', (byte)'9');

    private int PlaceOf(int index)
    {
        var column = 1;
        for (var c = 0; c < index; c++) column += RawLength(c) + 1;
        return column;
    }

    private int RawLength(int index) => Encoding.UTF8.GetCharCount(csv.GetRawSpan(index));

    private string QuoteText(CsvMalformedReason reason) => reason switch
    {
        CsvMalformedReason.TextAfterClosingQuote => $"found text after a closing quote, expected {CsvDialect.Name(dialect.Delimiter)} or the end of the line",
        CsvMalformedReason.StrayQuote => "found a quote inside a value, expected quotes only around a whole value",
        _ => "found a quote that is not closed on its line, expected a closing quote",
    };
}
