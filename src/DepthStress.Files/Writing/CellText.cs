using System.Text;

namespace DepthStress.Files.Writing;

/// <summary>Names from the well file made safe for result files.</summary>
internal static class CellText
{
    /// <summary>
    /// The text without control characters and line or paragraph separators; halves of surrogate pairs become U+FFFD.
    /// </summary>
    public static string Clean(string text)
    {
        var clean = new StringBuilder(text.Length);
        foreach (var rune in text.EnumerateRunes())
        {
            if (!Rune.IsControl(rune) && rune.Value is not (0x2028 or 0x2029)) clean.Append(rune.ToString());
        }

        return clean.ToString();
    }

    /// <summary>The clean text in ASCII: every other character becomes a question mark.</summary>
    public static string Ascii(string text)
    {
        var ascii = new StringBuilder(text.Length);
        foreach (var rune in Clean(text).EnumerateRunes()) ascii.Append(rune.IsAscii ? (char)rune.Value : '?');
        return ascii.ToString().Trim();
    }

    /// <summary>
    /// The clean text as a field of a CSV file: quoted as RFC 4180 asks; a text that a spreadsheet would run as a formula
    /// (<c>=</c>, <c>+</c>, <c>-</c> or <c>@</c> first) gets an apostrophe in front.
    /// </summary>
    public static string Csv(string text)
    {
        var clean = Clean(text);
        if (clean.AsSpan().TrimStart() is { Length: > 0 } start && start[0] is '=' or '+' or '-' or '@') clean = "'" + clean;
        return clean.AsSpan().ContainsAny(",\"") || clean.AsSpan().Trim().Length != clean.Length
            ? $"\"{clean.Replace("\"", "\"\"", StringComparison.Ordinal)}\""
            : clean;
    }
}
