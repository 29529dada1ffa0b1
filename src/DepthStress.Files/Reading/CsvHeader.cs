using System.Text;
using CsvHelper;
using DepthStress.Core.Quantities;

namespace DepthStress.Files.Reading;

/// <summary>Reads the header row of a CSV file, and the unit row that may follow it.</summary>
internal static class CsvHeader
{
    /// <summary>Reads the record at hand as names with units: <c>NAME</c>, <c>NAME[unit]</c> or <c>NAME (unit)</c>; null when it is none.</summary>
    public static List<ColumnHeader>? Read(CsvReader csv, LogSource source)
    {
        var headers = new List<ColumnHeader>(csv.FieldCount);
        var (latin, numbers) = (false, 0);
        var line = (int)csv.LineNumber;
        for (int c = 0, column = 1; c < csv.FieldCount; column += RawLength(csv, c) + 1, c++)
        {
            var cell = csv.GetSpan(c);
            if (!cell.IsEmpty && NumberText.TryParse(cell, out _)) numbers++;
            var (name, unit) = SplitUnit(TextCleaner.Clean(TextCleaner.Decode(cell, ref latin)), source.Options.UnitSuffixes);
            headers.Add(new ColumnHeader(name, unit, "", source.At(line, column)));
        }

        if (latin) source.Diagnostics.Note(source.At(line), "found bytes that are not UTF-8, read them as Latin-1");
        if (headers.Count < 2)
        {
            source.Diagnostics.Error(source.At(line), "found 1 column in the header row, expected at least 2 separated by ','");
            return null;
        }

        if (2 * numbers > headers.Count)
        {
            source.Diagnostics.Error(source.At(line), "found numbers in the first row, expected the names of the columns");
            return null;
        }

        ColumnHeader.MakeUnique(headers, source.Diagnostics);
        return headers;
    }

    /// <summary>
    /// Takes the record at hand as a unit row where it is one: as many cells as columns, none a number, and a length
    /// unit under the depth column.
    /// </summary>
    public static bool TakeUnitRow(CsvReader csv, List<ColumnHeader> headers, int depthColumn, LogSource source)
    {
        if (csv.FieldCount != headers.Count) return false;
        var units = new string[headers.Count];
        var latin = false;
        for (var c = 0; c < units.Length; c++)
        {
            var cell = csv.GetSpan(c);
            if (!cell.IsEmpty && NumberText.TryParse(cell, out _)) return false;
            units[c] = TextCleaner.Clean(TextCleaner.Decode(cell, ref latin)).Trim('[', ']', '(', ')');
        }

        if (Units.Find(units[depthColumn], Dimension.Length) is null) return false;
        for (var c = 0; c < units.Length; c++)
        {
            if (units[c].Length == 0) continue;
            if (headers[c].Unit is { } stated && !stated.Equals(units[c], StringComparison.OrdinalIgnoreCase))
            {
                source.Diagnostics.Warning(
                    source.At((int)csv.LineNumber),
                    $"column \"{headers[c].Name}\": found the unit \"{units[c]}\" below \"{stated}\" in the header row, took \"{stated}\"");
                continue;
            }

            headers[c] = headers[c] with { Unit = headers[c].Unit ?? units[c] };
        }

        return true;
    }

    /// <summary>Length of a cell in the file in characters, quotes and blanks included.</summary>
    public static int RawLength(CsvReader csv, int index) => Encoding.UTF8.GetCharCount(csv.GetRawSpan(index));

    // A number in brackets is an index and belongs to the name.
    private static (string Name, string? Unit) SplitUnit(string text, bool suffixes)
    {
        if (suffixes && Units.All.FirstOrDefault(u => u.Suffix.Length > 0 && text.EndsWith("_" + u.Suffix, StringComparison.OrdinalIgnoreCase)) is { } suffixed)
            return (text[..^(suffixed.Suffix.Length + 1)], suffixed.Symbol);
        var open = text.Length > 0 && text[^1] is ']' or ')' ? text.LastIndexOf(text[^1] == ']' ? '[' : '(') : -1;
        if (open <= 0) return (text, null);
        var unit = text[(open + 1)..^1].Trim();
        if (unit.Length > 0 && unit.All(char.IsAsciiDigit)) return (text, null);
        return (text[..open].Trim(), unit.Length > 0 ? unit : null);
    }
}
