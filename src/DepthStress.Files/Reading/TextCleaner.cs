using System.Text;

namespace DepthStress.Files.Reading;

/// <summary>Turns bytes of a file into text that is safe to store and to print.</summary>
internal static class TextCleaner
{
    private const int LongestQuote = 40;
    private static readonly UTF8Encoding Strict = new(encoderShouldEmitUTF8Identifier: false, throwOnInvalidBytes: true);

    /// <summary>Removes control characters and blanks at the ends.</summary>
    public static string Clean(string text) =>
        (text.Any(char.IsControl) ? string.Concat(text.Where(c => !char.IsControl(c))) : text).Trim();

    /// <summary>Decodes UTF-8, or code page 1252 where the bytes are no UTF-8; tells which.</summary>
    public static string Decode(ReadOnlySpan<byte> bytes, ref bool foreign)
    {
        if (System.Text.Unicode.Utf8.IsValid(bytes)) return Strict.GetString(bytes);
        foreign = true;
        return TextEncoding.Windows.GetString(bytes);
    }

    /// <summary>Text of a cell for a message: cleaned, and cut where it is long.</summary>
    public static string Quote(ReadOnlySpan<byte> bytes)
    {
        var foreign = false;
        var cut = bytes.Length > 4 * LongestQuote ? bytes[..(4 * LongestQuote)] : bytes;
        var text = Clean(Decode(cut, ref foreign));
        return text.Length <= LongestQuote && cut.Length == bytes.Length ? text : $"{text[..Math.Min(text.Length, LongestQuote)]}...";
    }
}
