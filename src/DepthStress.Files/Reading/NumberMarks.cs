using System.Text;

namespace DepthStress.Files.Reading;

/// <summary>Tells decimal marks from thousands separators. A mark that could be either is never read, but shown in both readings.</summary>
internal static class NumberMarks
{
    /// <summary>True where the cell is one finite number whose decimal mark is its only comma, with a digit behind it.</summary>
    public static bool TryParseComma(ReadOnlySpan<byte> cell, out double value)
    {
        value = double.NaN;
        cell = cell.Trim(" \t"u8);
        var comma = cell.IndexOf((byte)',');
        if (cell.Length > 64 || comma < 0 || comma == cell.Length - 1 || cell[comma + 1] is < (byte)'0' or > (byte)'9' || cell.Contains((byte)'.')) return false;
        Span<byte> copy = stackalloc byte[cell.Length];
        cell.CopyTo(copy);
        copy[comma] = (byte)'.';
        return NumberText.TryParse(copy, out value) && !double.IsNaN(value);
    }

    /// <summary>True for a sign, one to three digits that do not start with 0, and groups of a mark and three digits.</summary>
    public static bool IsGrouped(ReadOnlySpan<byte> cell, char mark) => Groups(cell, mark, out var rest) > 0 && rest.IsEmpty;

    /// <summary>What to say of a cell that is no number by the decimal mark of the file, after <c>found </c>; null where marks are not to blame.</summary>
    public static string? Problem(ReadOnlySpan<byte> cell, char decimalMark)
    {
        cell = cell.Trim(" \t"u8);
        if (cell.Length > 40) return null;
        var other = decimalMark == '.' ? ',' : '.';
        var text = Encoding.ASCII.GetString(cell);
        var groups = Groups(cell, other, out var rest);
        if (groups > 1 || (groups == 1 && !rest.IsEmpty))
        {
            var plain = text.Replace(other.ToString(), "", StringComparison.Ordinal);
            return rest.IsEmpty || (rest[0] == decimalMark && !rest[1..].ContainsAnyExceptInRange((byte)'0', (byte)'9'))
                ? $"\"{text}\" with thousands separators, expected {plain}"
                : null;
        }

        if (groups == 1)
        {
            return $"\"{text}\", which is {text.Replace(',', '.')} with a decimal {Name(other)} or {text.Remove(text.IndexOf(other, StringComparison.Ordinal), 1)} with a thousands separator; expected a decimal {Name(decimalMark)}";
        }

        var fits = other == ',' ? TryParseComma(cell, out _) : cell.Contains((byte)'.') && NumberText.TryParse(cell, out var number) && !double.IsNaN(number);
        return fits ? $"the decimal {Name(other)} in \"{text}\", expected a decimal {Name(decimalMark)}" : null;
    }

    private static string Name(char mark) => mark == ',' ? "comma" : "point";

    private static int Groups(ReadOnlySpan<byte> cell, char mark, out ReadOnlySpan<byte> rest)
    {
        rest = cell.Length > 0 && cell[0] is (byte)'-' or (byte)'+' ? cell[1..] : cell;
        var first = Digits(rest);
        if (first is 0 or > 3 || rest[0] == (byte)'0') return 0;
        rest = rest[first..];
        var groups = 0;
        for (; rest.Length >= 4 && rest[0] == mark && Digits(rest[1..]) == 3; rest = rest[4..]) groups++;
        return groups;
    }

    private static int Digits(ReadOnlySpan<byte> text)
    {
        var end = text.IndexOfAnyExceptInRange((byte)'0', (byte)'9');
        return end < 0 ? text.Length : end;
    }
}
