using System.Security.Cryptography;
using System.Text;
using DepthStress.Core.Diagnostics;

namespace DepthStress.Files.Reading;

/// <summary>A cell as text, with its place.</summary>
/// <param name="Text">Its text without quotes and outer blanks.</param>
/// <param name="Position">Where it starts.</param>
internal readonly record struct TextCell(string Text, SourcePosition Position);

/// <summary>A small CSV file of words and quantities, kept as text.</summary>
/// <param name="Name">The file as the user named it.</param>
/// <param name="Sha256">SHA-256 of its bytes.</param>
/// <param name="Delimiter">What parts its cells.</param>
/// <param name="Header">The cells of the header row; empty where no line has the looked-for names.</param>
/// <param name="Rows">The rows below it, each as long as the header.</param>
internal sealed record TextTable(string Name, string Sha256, char Delimiter, TextCell[] Header, IReadOnlyList<TextCell[]> Rows)
{
    private const int MostBytes = 16 << 20;
    private const int MostLinesAbove = 200;
    private const string Delimiters = ",;\t|";

    /// <summary>
    /// Reads the file; null, with an error, where it cannot be read. The header is the first line with the most looked-for names,
    /// with the delimiter that gives them; rows of another length are errors.
    /// </summary>
    /// <param name="path">Full path.</param>
    /// <param name="name">The file as the user named it.</param>
    /// <param name="csv">How CSV files are written, as far as stated.</param>
    /// <param name="isName">True for a cell that names a column.</param>
    /// <param name="diagnostics">Gets every problem.</param>
    public static TextTable? Read(string path, string name, CsvOptions csv, Func<string, bool> isName, DiagnosticBag diagnostics)
    {
        byte[] bytes;
        try
        {
            if (Directory.Exists(path)) return Refuse("found a folder, expected a CSV file");
            if (new FileInfo(path) is { Exists: true, Length: > MostBytes }) return Refuse("found more than 16 MiB, expected a table of observations or of core plugs");
            bytes = File.ReadAllBytes(path);
        }
        catch (Exception problem) when (problem is IOException or UnauthorizedAccessException)
        {
            return Refuse(problem is FileNotFoundException or DirectoryNotFoundException ? "file not found" : $"the file cannot be read: {TextCleaner.Clean(problem.Message)}");
        }

        using var whole = new MemoryStream();
        using (var text = new MemoryStream(bytes)) TextEncoding.AsUtf8(text, csv.Encoding ?? TextEncoding.Detect(bytes)).CopyTo(whole);
        var utf8 = whole.ToArray();
        if (utf8.AsSpan().Contains((byte)0)) return Refuse("found a NUL byte (binary data), expected text");
        var mark = utf8.AsSpan().StartsWith((ReadOnlySpan<byte>)[0xEF, 0xBB, 0xBF]) ? 3 : 0;
        var lines = HeadLines.Of(new FileScan(utf8.Length, 0, utf8[mark..], mark)).ToList();
        var hash = Convert.ToHexStringLower(SHA256.HashData(bytes));

        var (at, delimiter, most) = (-1, ',', 0);
        for (var i = 0; i < Math.Min(lines.Count, MostLinesAbove); i++)
        {
            foreach (var candidate in csv.Delimiter is { } stated and not CsvOptions.Blanks ? [stated] : Delimiters.ToCharArray())
            {
                var names = Split(i, candidate).Count(c => isName(c.Text));
                if (names > most) (at, delimiter, most) = (i, candidate, names);
            }
        }

        if (at < 0) return new(name, hash, delimiter, [], []);
        var header = Split(at, delimiter);
        var rows = new List<TextCell[]>();
        for (var i = at + 1; i < lines.Count; i++)
        {
            var row = Split(i, delimiter, header.Length);
            if (row.All(c => c.Text.Length == 0)) continue;
            if (row.Length == header.Length) rows.Add(row);
            else diagnostics.Error(new SourcePosition(name, lines[i].Number), FormattableString.Invariant($"found {row.Length} cells, expected {header.Length} as in the header row; a cell that holds {CsvDialect.Name(delimiter)} stands in quotes"));
        }

        return new(name, hash, delimiter, header, rows);

        TextTable? Refuse(string problem)
        {
            diagnostics.Error(new SourcePosition(name), problem);
            return null;
        }

        TextCell[] Split(int index, char by, int expected = int.MaxValue)
        {
            var spans = new List<CellSpan>();
            var line = utf8.AsSpan(mark + lines[index].Start, lines[index].Length);
            RowCells.Split(line, by, spans, expected);
            var cells = new TextCell[spans.Count];
            var foreign = false;
            for (var c = 0; c < cells.Length; c++)
            {
                var column = Encoding.UTF8.GetCharCount(line[..spans[c].Start]) + 1;
                cells[c] = new(TextCleaner.Clean(TextCleaner.Decode(line.Slice(spans[c].Start, spans[c].Length), ref foreign)), new SourcePosition(name, lines[index].Number, column));
            }

            return cells;
        }
    }
}
