using System.Runtime.CompilerServices;

namespace DepthStress.Files.Reading;

/// <summary>Reads the data of a LAS file that has one line for each depth.</summary>
internal sealed class LasRows(LogSource source, LineReader lines, LasHeader header, LasCells cells)
{
    private const int Odd = -1;

    /// <summary>Reads all rows; false where the file cannot be used.</summary>
    public bool Read()
    {
        var table = cells.Table;
        var plain = cells.IsPlain;
        while (lines.TryRead(out var line))
        {
            var found = plain ? ReadPlain(line, table.Row) : Odd;
            if (found == table.Row.Length)
            {
                table.AddRow(lines.Line);
                continue;
            }

            var text = line.TrimStart(" \t"u8);
            if (text.IsEmpty || text[0] == (byte)'#') continue;
            if (text[0] == (byte)'~') return LasLogReader.PassTrailers(source, lines, line, header.Version);
            cells.AddRow(line, lines.Line);
        }

        return true;
    }

    /// <summary>Reads the numbers between blanks and gives how many there are; <see cref="Odd"/> where anything else is in the line.</summary>
    [MethodImpl(MethodImplOptions.AggressiveOptimization)]
    private static int ReadPlain(ReadOnlySpan<byte> line, double[] row)
    {
        var (count, i) = (0, 0);
        while (true)
        {
            while (i < line.Length && IsBlank(line[i])) i++;
            if (i == line.Length) return count;
            var length = NumberText.Read(line[i..], out var value);
            i += length;
            if (length == 0 || count == row.Length || (i < line.Length && !IsBlank(line[i])) || !double.IsFinite(value)) return Odd;
            row[count++] = value;
        }
    }

    private static bool IsBlank(byte b) => b is (byte)' ' or (byte)'\t';
}
