using DepthStress.Core.Quantities;

namespace DepthStress.Files.Reading;

/// <summary>Reads the header row of a CSV file, and the unit row that may follow it.</summary>
internal static class CsvHeader
{
    /// <summary>Reads a row as names with units: <c>NAME</c>, <c>NAME[unit]</c> or <c>NAME (unit)</c>; null when it is none.</summary>
    public static List<ColumnHeader>? Read(List<HeaderCell> cells, int line, char delimiter, LogSource source)
    {
        var headers = cells.ConvertAll(cell =>
        {
            var (name, unit) = SplitUnit(cell.Text, source.Options.UnitSuffixes);
            return new ColumnHeader(name, unit, "", source.At(line, cell.Column));
        });
        if (headers.Count < 2)
        {
            source.Diagnostics.Error(source.At(line), $"found 1 column in the header row, expected at least 2 separated by {CsvDialect.Name(delimiter)}");
            return null;
        }

        if (2 * cells.Count(c => c.IsNumber) > headers.Count)
        {
            source.Diagnostics.Error(source.At(line), "found numbers in the first row, expected the names of the columns");
            return null;
        }

        ColumnHeader.MakeUnique(headers, source.Diagnostics);
        return headers;
    }

    /// <summary>Finds the depth column; -1, with an error, when there is none or it is a time.</summary>
    public static int FindDepth(List<ColumnHeader> headers, int line, LogSource source)
    {
        var depth = source.Options.DepthColumn is { } named ? ColumnHeader.FindNamed(headers, named, source) : ColumnHeader.FindDepth(headers, line, source);
        return depth >= 0 && TimeIndex.Refuse(headers[depth], source) ? -1 : depth;
    }

    /// <summary>
    /// Takes a row as a unit row where it is one: as many cells as columns, none a number, and a length unit under the
    /// depth column.
    /// </summary>
    public static bool TakeUnitRow(List<HeaderCell> cells, int line, List<ColumnHeader> headers, int depthColumn, LogSource source)
    {
        if (cells.Count != headers.Count || cells.Exists(c => c.IsNumber)) return false;
        var units = cells.ConvertAll(c => c.Text.Trim('[', ']', '(', ')'));
        if (Units.Find(units[depthColumn], Dimension.Length) is null) return false;
        for (var c = 0; c < units.Count; c++)
        {
            if (units[c].Length == 0) continue;
            if (headers[c].Unit is { } stated && !stated.Equals(units[c], StringComparison.OrdinalIgnoreCase))
            {
                source.Diagnostics.Warning(
                    source.At(line),
                    $"column \"{headers[c].Name}\": found the unit \"{units[c]}\" below \"{stated}\" in the header row, took \"{stated}\"");
                continue;
            }

            headers[c] = headers[c] with { Unit = headers[c].Unit ?? units[c] };
        }

        return true;
    }

    /// <summary>Parts a name from its unit. A number in brackets is an index and belongs to the name.</summary>
    public static (string Name, string? Unit) SplitUnit(string text, bool suffixes)
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
