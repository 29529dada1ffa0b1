using System.Runtime.CompilerServices;
using CsvHelper;

namespace DepthStress.Files.Reading;

/// <summary>Reads logs from comma-separated values.</summary>
internal static class CsvLogReader
{
    /// <summary>Reads the file; null when it cannot be used.</summary>
    public static LogFile? Read(LogSource source)
    {
        if (CsvDelimiter.Problem(source.Scan.Head) is { } problem)
        {
            source.Diagnostics.Error(source.At(1), problem);
            return null;
        }

        var malformed = new List<CsvMalformedRecord>();
        using var csv = CsvReader.Create(source.Stream, Options(malformed.Add), leaveOpen: true);
        try
        {
            return Read(source, csv, malformed);
        }
        catch (CsvFormatException tooLong)
        {
            // A record beyond the limit: the only exception these options leave.
            source.LineTooLong((int)tooLong.LineNumber);
            return null;
        }
    }

    private static LogFile? Read(LogSource source, CsvReader csv, List<CsvMalformedRecord> malformed)
    {
        if (!csv.Read())
        {
            source.Diagnostics.Error(source.At(), "found no header row, expected the names of the columns");
            return null;
        }

        if (malformed.Count > 0)
        {
            source.Diagnostics.Error(source.At((int)malformed[0].LineNumber), QuoteText(malformed[0].Reason));
            return null;
        }

        if (CsvHeader.Read(csv, source) is not { } headers) return null;
        var depth = source.Options.DepthColumn is { } named
            ? ColumnHeader.FindNamed(headers, named, source)
            : ColumnHeader.FindDepth(headers, source);
        if (depth < 0) return null;
        var more = csv.Read();
        if (more && malformed.Count == 0 && CsvHeader.TakeUnitRow(csv, headers, depth, source)) more = csv.Read();
        var table = new TableBuilder(source, headers, depth, nullValue: null);
        for (; more; more = csv.Read()) ReadRow(source, csv, table, depth, malformed);
        return table.Finish(LogFormat.Csv, wellName: null);
    }

    [MethodImpl(MethodImplOptions.AggressiveOptimization)]
    private static void ReadRow(LogSource source, CsvReader csv, TableBuilder table, int depth, List<CsvMalformedRecord> malformed)
    {
        var line = (int)csv.LineNumber;
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
            if (csv.FieldCount > 1 || !csv.GetSpan(0).Trim(" \t"u8).IsEmpty) table.WrongCount(line, csv.FieldCount);
            return;
        }

        var (good, depthIsBad) = (true, false);
        for (var c = 0; c < row.Length; c++)
        {
            if (NumberText.TryParse(csv.GetSpan(c), out row[c])) continue;
            good = false;
            depthIsBad |= c == depth;
            if (table.Tally.Admit(RowProblem.Cell, source.At(line))) table.BadCell(line, ColumnOf(csv, c), c, csv.GetSpan(c));
        }

        if (good) table.AddRow(line);
        else table.SkipRow(line, depthIsBad);
    }

    private static int ColumnOf(CsvReader csv, int index)
    {
        var column = 1;
        for (var c = 0; c < index; c++) column += CsvHeader.RawLength(csv, c) + 1;
        return column;
    }

    private static string QuoteText(CsvMalformedReason reason) => reason switch
    {
        CsvMalformedReason.TextAfterClosingQuote => "found text after a closing quote, expected ',' or the end of the line",
        CsvMalformedReason.StrayQuote => "found a quote inside a value, expected quotes only around a whole value",
        _ => "found a quote that is not closed on its line, expected a closing quote",
    };

    private static CsvReaderOptions Options(Action<CsvMalformedRecord> onMalformed) => new()
    {
        Separator = ',',
        HasHeader = false,
        AllowLineBreaksInQuotes = false,
        TrackLineNumbers = true,
        MaxRecordSize = LogSource.MaxLine,
        BufferSize = 1 << 18,
        OnMalformedRecord = onMalformed,
    };
}
