using CsvHelper;

namespace DepthStress.Files.Reading;

/// <summary>Reads logs from values separated by commas, semicolons, tabs, bars or blanks.</summary>
internal static class CsvLogReader
{
    /// <summary>Reads the file; null when it cannot be used.</summary>
    public static LogFile? Read(LogSource source)
    {
        if (source.Options.Csv.Encoding == LogEncoding.Utf8 && TextEncoding.LineOfForeignBytes(source.Scan) is { } foreign)
        {
            source.Diagnostics.Error(source.At(foreign), "found bytes that are not UTF-8, expected UTF-8 as the well file says");
            return null;
        }

        if (CsvDialectFinder.Find(source) is not { } dialect) return null;
        dialect.Report(source);
        if (dialect.Delimiter == CsvOptions.Blanks) return BlankLogReader.Read(source, dialect);
        if (dialect.HeaderStart > 0) source.Text.ReadExactly(new byte[source.Scan.Mark + dialect.HeaderStart]);
        var malformed = new List<CsvMalformedRecord>();
        using var csv = CsvReader.Create(source.Text, Options(dialect.Delimiter, malformed.Add), leaveOpen: true);
        var rows = new CsvRows(source, csv, dialect, malformed);
        try
        {
            return rows.Read();
        }
        catch (CsvFormatException tooLong)
        {
            // A record beyond the limit: the only exception these options leave.
            source.LineTooLong(rows.LineOf(tooLong.LineNumber));
            return null;
        }
    }

    private static CsvReaderOptions Options(char delimiter, Action<CsvMalformedRecord> onMalformed) => new()
    {
        Separator = delimiter,
        HasHeader = false,
        AllowLineBreaksInQuotes = false,
        TrackLineNumbers = true,
        MaxRecordSize = LogSource.MaxLine,
        BufferSize = 1 << 18,
        OnMalformedRecord = onMalformed,
    };
}
