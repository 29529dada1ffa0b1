using System.Text;

namespace DepthStress.Files.Reading;

/// <summary>Words that loggers and spreadsheets put where there is no value.</summary>
internal static class NullText
{
    private static readonly byte[][] Words =
    [
        .. new[] { "ERR", "ERROR", "NULL", "(NULL)", "NONE", "NA", "N/A", "#N/A", "#NUM!", "#VALUE!", "#DIV/0!", "#REF!" }.Select(Encoding.ASCII.GetBytes),
    ];

    /// <summary>True for such a word in any case, for dashes alone, and for a C library's print of an undefined number (-1.#IND).</summary>
    public static bool Is(ReadOnlySpan<byte> cell)
    {
        if (cell.IsEmpty || cell.Length > 16) return false;
        if (!cell.ContainsAnyExcept((byte)'-')) return true;
        foreach (var word in Words)
        {
            if (Ascii.EqualsIgnoreCase(cell, word)) return true;
        }

        if (cell[0] == (byte)'-') cell = cell[1..];
        if (!cell.StartsWith("1.#"u8)) return false;
        cell = cell[3..].TrimEnd((byte)'0');
        return Ascii.EqualsIgnoreCase(cell, "IND"u8) || Ascii.EqualsIgnoreCase(cell, "QNAN"u8) || Ascii.EqualsIgnoreCase(cell, "SNAN"u8);
    }
}
