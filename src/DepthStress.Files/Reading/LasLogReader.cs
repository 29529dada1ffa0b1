using System.Runtime.CompilerServices;
using System.Text;
using DepthStress.Core.Diagnostics;

namespace DepthStress.Files.Reading;

/// <summary>
/// Reads logs from LAS 2.0 files that are not wrapped (Canadian Well Logging Society, LAS version 2.0: a floppy disk
/// standard for log data). Values are separated by blanks or tabs, also where a DLM line says SPACE or TAB; a cell
/// left empty between two tabs makes its row one value short, which is an error.
/// </summary>
internal static class LasLogReader
{
    /// <summary>Reads the file; null when it cannot be used.</summary>
    public static LogFile? Read(LogSource source)
    {
        var lines = new LineReader(source.Stream);
        if (new LasHeaderReader(source, lines).Read() is not { } header) return null;

        // The standard puts the index first.
        var depth = source.Options.DepthColumn is { } named ? ColumnHeader.FindNamed(header.Curves, named, source) : 0;
        if (depth < 0) return null;
        var table = new TableBuilder(source, header.Curves, depth, header.Null);
        var bad = new List<(int Index, int Start, int Length)>();
        while (lines.TryRead(out var line))
        {
            bad.Clear();
            var found = ReadRow(line, table.Row, bad);
            if (found == 0) continue;
            if (line.TrimStart(" \t"u8)[0] == (byte)'~')
            {
                source.Diagnostics.Error(source.At(lines.Line), "found a section after ~A, expected the data to come last");
                return null;
            }

            if (found != table.Row.Length) table.WrongCount(lines.Line, found);
            else if (bad.Count == 0) table.AddRow(lines.Line);
            else ReportCells(line, source.At(lines.Line), bad, table, depth);
        }

        if (lines.TooLong)
        {
            source.LineTooLong(lines.Line + 1);
            return null;
        }

        if (table.Finish(LogFormat.Las, header.Well) is not { } file) return null;
        header.Compare(table.Depth, source.Diagnostics);
        return file;
    }

    /// <summary>Reads the numbers of a line and gives how many cells it has; 0 for blank lines and comments.</summary>
    [MethodImpl(MethodImplOptions.AggressiveOptimization)]
    private static int ReadRow(ReadOnlySpan<byte> line, double[] row, List<(int Index, int Start, int Length)> bad)
    {
        var (count, i) = (0, 0);
        while (true)
        {
            while (i < line.Length && IsBlank(line[i])) i++;
            if (i == line.Length || (count == 0 && line[i] == (byte)'#')) return count;
            var length = NumberText.Read(line[i..], out var value);
            var end = i + length;
            if (length == 0 || (end < line.Length && !IsBlank(line[end])) || !double.IsFinite(value))
            {
                while (end < line.Length && !IsBlank(line[end])) end++;
                value = double.NaN;
                if (count < row.Length && !NumberText.IsMissing(line[i..end])) bad.Add((count, i, end - i));
            }

            if (count < row.Length) row[count] = value;
            count++;
            i = end;
        }
    }

    private static void ReportCells(
        ReadOnlySpan<byte> line, SourcePosition position, List<(int Index, int Start, int Length)> bad, TableBuilder table, int depth)
    {
        var depthIsBad = false;
        foreach (var (index, start, length) in bad)
        {
            depthIsBad |= index == depth;
            if (!table.Tally.Admit(RowProblem.Cell, position)) continue;
            table.BadCell(position.Line, Encoding.UTF8.GetCharCount(line[..start]) + 1, index, line.Slice(start, length));
        }

        table.SkipRow(position.Line, depthIsBad);
    }

    private static bool IsBlank(byte b) => b is (byte)' ' or (byte)'\t';
}
