using System.Globalization;

namespace DepthStress.Files.Reading;

/// <summary>
/// Reads logs from LAS files (Canadian Well Logging Society, LAS version 2.0: a floppy disk standard for log data): 2.0,
/// 1.2 as found, and the log data of 3.0 where they are written like 2.0.
/// </summary>
internal static class LasLogReader
{
    /// <summary>Reads the file; null when it cannot be used.</summary>
    public static LogFile? Read(LogSource source)
    {
        var lines = new LineReader(source.Text);
        if (new LasHeaderReader(source, lines).Read() is not { } header) return null;

        // The standard puts the index first.
        var depth = source.Options.DepthColumn is { } named ? ColumnHeader.FindNamed(header.Curves, named, source) : 0;
        if (depth < 0 || TimeIndex.Refuse(header.Curves[depth], source)) return null;
        var dialect = LasDialect.Find(source, header, lines.Line);
        var table = new TableBuilder(source, header.Curves, depth, header.Null, dialect.DecimalComma);
        var cells = new LasCells(source, table, dialect, depth);
        var sound = header.Wrapped
            ? new LasWrappedRows(source, lines, header, cells).Read()
            : new LasRows(source, lines, header, cells).Read();
        if (lines.TooLong)
        {
            source.LineTooLong(lines.Line + 1);
            return null;
        }

        if (!sound || table.Finish(LogFormat.Las, header.Well) is not { } file) return null;
        cells.ReportRunOns();
        header.Compare(table.Depth, source.Diagnostics);
        return file;
    }

    /// <summary>Passes over the sections after the data; false, with an error, at one that the data would have needed.</summary>
    public static bool PassTrailers(LogSource source, LineReader lines, ReadOnlySpan<byte> title, double version)
    {
        var passed = 0;
        do
        {
            if (title.TrimStart(" \t"u8) is not [(byte)'~', ..]) continue;
            var foreign = false;
            var text = TextCleaner.Clean(TextCleaner.Decode(title, ref foreign));
            var position = source.At(lines.Line);
            switch (LasSections.Kind(text, version))
            {
                case 'A' when version >= 3:
                    source.Diagnostics.Error(position, "found a second section of log data, expected one (several sets in one LAS 3.0 file are not read)");
                    return false;
                case 'V' or 'W' or 'C' or 'A':
                    source.Diagnostics.Error(position, $"found \"{TextCleaner.Quote(title)}\" after the data, expected the data to come last");
                    return false;
                default:
                    if (++passed <= ProblemTally.Limit) source.Diagnostics.Note(position, $"section \"{TextCleaner.Quote(title)}\" after the data is not read");
                    break;
            }
        }
        while (lines.TryRead(out title));
        if (passed > ProblemTally.Limit) source.Diagnostics.Note(source.At(), string.Create(CultureInfo.InvariantCulture, $"and {passed - ProblemTally.Limit} more sections are not read"));
        return true;
    }
}
