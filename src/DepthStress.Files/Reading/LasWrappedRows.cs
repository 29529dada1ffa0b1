using System.Globalization;

namespace DepthStress.Files.Reading;

/// <summary>
/// Reads the data of a wrapped LAS file: the depth on a line of its own, the other values on as many lines as they take.
/// Where the first depth shares its line, all may, and only the count of values tells the rows apart.
/// </summary>
internal sealed class LasWrappedRows(LogSource source, LineReader lines, LasHeader header, LasCells cells)
{
    private int _count, _firstLine;
    private bool _good, _lost;
    private bool? _alone;

    /// <summary>Reads all rows; false where the file cannot be used.</summary>
    public bool Read()
    {
        while (lines.TryRead(out var line))
        {
            var text = line.TrimStart(" \t"u8);
            if (text.IsEmpty || text[0] == (byte)'#') continue;
            if (text[0] == (byte)'~')
            {
                Close();
                return LasLogReader.PassTrailers(source, lines, line, header.Version);
            }

            Take(line);
        }

        if (!lines.TooLong) Close();
        return true;
    }

    private void Take(ReadOnlySpan<byte> line)
    {
        var table = cells.Table;
        if (_count == 0) (_firstLine, _good) = (lines.Line, true);
        var found = cells.AddPart(line, lines.Line, _count);
        if (_count == 0)
        {
            var alone = Math.Abs(found) == 1;
            if (_alone is null && !alone && table.Row.Length > 1) source.Diagnostics.Note(source.At(lines.Line), "found other values on the line of a depth, expected the depth alone; rows are told apart by their number of values");
            _alone ??= alone;
            if (_alone.Value && !alone)
            {
                // After a row of a wrong length: say so once, then wait for the next depth.
                if (!_lost && table.Tally.Admit(RowProblem.Count, source.At(lines.Line)))
                {
                    source.Diagnostics.Error(source.At(lines.Line), string.Create(
                        CultureInfo.InvariantCulture, $"found {Math.Abs(found)} values where a depth step starts, expected the depth alone (a value is missing above, or one is too many)"));
                }

                _lost = true;
                return;
            }
        }

        _lost = false;
        _good &= found > 0;
        _count += Math.Abs(found);
        if (_count < table.Row.Length) return;
        table.LinesPerRow = lines.Line - _firstLine + 1;
        if (_count > table.Row.Length) table.WrongCount(_firstLine, _count);
        else if (_good) table.AddRow(_firstLine);
        else table.Depth.Skip();
        _count = 0;
    }

    private void Close()
    {
        if (_count > 0) cells.Table.WrongCount(_firstLine, _count);
        _count = 0;
    }
}
