using System.Globalization;
using System.Text;
using CsvHelper;
using DepthStress.Core.Diagnostics;
using DepthStress.Core.Model;
using DepthStress.Core.Quantities;
using DepthStress.Files.Reading;

namespace DepthStress.Files.Results;

/// <summary>Some columns of a result table, read back: numbers in SI, NaN where a cell is empty.</summary>
/// <param name="Units">The units the file is in, told by the names of its columns.</param>
/// <param name="Count">Number of rows.</param>
/// <param name="Numbers">Columns of numbers by their id without a unit.</param>
/// <param name="Words">Columns of words by their id.</param>
public sealed record ResultCsv(UnitSystem Units, int Count, IReadOnlyDictionary<string, double[]> Numbers, IReadOnlyDictionary<string, string[]> Words)
{
    /// <summary>Reads the wanted columns; null, with errors, where the file is not what the program writes.</summary>
    /// <param name="path">Full path.</param>
    /// <param name="name">The file as the user named it.</param>
    /// <param name="table">Every column the program writes into this file.</param>
    /// <param name="wanted">Ids of the columns to read; the first one is a depth that tells the unit system.</param>
    /// <param name="diagnostics">Gets every problem.</param>
    public static ResultCsv? Read<TSource>(
        string path, string name, IReadOnlyList<Column<TSource>> table, IReadOnlyList<string> wanted, DiagnosticBag diagnostics)
    {
        ArgumentNullException.ThrowIfNull(table);
        ArgumentNullException.ThrowIfNull(wanted);
        ArgumentNullException.ThrowIfNull(diagnostics);
        try
        {
            var malformed = new List<CsvMalformedRecord>();
            using var file = File.OpenRead(path);
            using var csv = CsvReader.Create(file, Options(malformed.Add), leaveOpen: true);
            if (!csv.Read()) return Refuse(diagnostics, name, 1, "found an empty file, expected a result table");
            var header = Enumerable.Range(0, csv.FieldCount).Select(i => Encoding.UTF8.GetString(csv.GetSpan(i))).ToArray();
            var columns = wanted.Select(id => table.First(c => c.Id == id)).ToList();
            var units = header.Contains(((NumberColumn<TSource>)columns[0]).Header(UnitSystem.Field)) ? UnitSystem.Field : UnitSystem.Metric;
            var names = columns.Select(c => c is NumberColumn<TSource> number ? number.Header(units) : c.Id).ToList();
            var missing = names.Where(n => !header.Contains(n)).ToList();
            if (missing.Count > 0) return Refuse(diagnostics, name, 1, $"found no column {string.Join(", ", missing)}, expected a table as this program writes it");
            return ReadRows(csv, name, columns, [.. names.Select(n => Array.IndexOf(header, n))], header.Length, units, malformed, diagnostics);
        }
        catch (CsvFormatException problem)
        {
            return Refuse(diagnostics, name, (int)problem.LineNumber, "found a line that is too long, expected a table as this program writes it");
        }
        catch (Exception problem) when (problem is IOException or UnauthorizedAccessException)
        {
            return Refuse(diagnostics, name, 0, problem is FileNotFoundException or DirectoryNotFoundException ? "file not found" : $"the file cannot be read: {problem.Message}");
        }
    }

    private static CsvReaderOptions Options(Action<CsvMalformedRecord> onMalformed) => new()
    {
        Separator = ',',
        HasHeader = false,
        AllowLineBreaksInQuotes = false,
        TrackLineNumbers = true,
        MaxRecordSize = 1 << 20,
        OnMalformedRecord = onMalformed,
    };

    private static ResultCsv? ReadRows<TSource>(
        CsvReader csv, string name, List<Column<TSource>> columns, int[] at, int width, UnitSystem units, List<CsvMalformedRecord> malformed, DiagnosticBag diagnostics)
    {
        var numbers = columns.OfType<NumberColumn<TSource>>().ToDictionary(c => c.Id, _ => new List<double>());
        var words = columns.OfType<TextColumn<TSource>>().ToDictionary(c => c.Id, _ => new List<string>());
        var rows = 0;
        for (; csv.Read(); rows++)
        {
            var line = (int)csv.LineNumber;
            if (malformed.Count > 0 || csv.FieldCount != width)
                return Refuse(diagnostics, name, line, string.Create(CultureInfo.InvariantCulture, $"found a row of {csv.FieldCount} cells, expected {width} as in the header row"));
            for (var c = 0; c < columns.Count; c++)
            {
                var cell = csv.GetSpan(at[c]);
                if (columns[c] is not NumberColumn<TSource> number) words[columns[c].Id].Add(Word(cell, words[columns[c].Id]));
                else if (cell.IsEmpty) numbers[number.Id].Add(double.NaN);
                else if (NumberText.TryParse(cell, out var value) && double.IsFinite(value)) numbers[number.Id].Add(number.In(units).Unit.ToSi(value));
                else return Refuse(diagnostics, name, line, $"column {number.Header(units)}: found \"{Encoding.UTF8.GetString(cell)}\", expected a number or nothing");
            }
        }

        return new ResultCsv(units, rows, numbers.ToDictionary(n => n.Key, n => n.Value.ToArray()), words.ToDictionary(w => w.Key, w => w.Value.ToArray()));
    }

    /// <summary>The cell as text; the row's above where it says the same.</summary>
    private static string Word(ReadOnlySpan<byte> cell, List<string> above)
    {
        var word = Encoding.UTF8.GetString(cell);
        return above.Count > 0 && above[^1] == word ? above[^1] : word;
    }

    private static ResultCsv? Refuse(DiagnosticBag diagnostics, string name, int line, string problem)
    {
        diagnostics.Error(new SourcePosition(name, line), problem);
        return null;
    }
}
