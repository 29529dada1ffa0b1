using System.Text;
using UglyToad.PdfPig.Fonts.Standard14Fonts;
using WinAnsiEncoding = UglyToad.PdfPig.Fonts.Encodings.WinAnsiEncoding;

namespace DepthStress.Report.Drawing;

/// <summary>Text in the letters of the fonts that every PDF reader brings along: those of Western Europe, the code page 1252.</summary>
internal static class PdfText
{
    private static readonly Encoding Letters = CodePagesEncodingProvider.Instance.GetEncoding(
        1252, new EncoderReplacementFallback("?"), DecoderFallback.ReplacementFallback)!;

    /// <summary>The codes of a text; a letter that the fonts do not have becomes a question mark.</summary>
    public static byte[] Codes(string text) => Letters.GetBytes(
        string.Concat(text.Normalize(NormalizationForm.FormC).EnumerateRunes().Select(r => r.IsBmp ? r.ToString() : "?")));

    /// <summary>The width of codes, in sizes of the font.</summary>
    public static double Width(ReadOnlySpan<byte> codes, Standard14Font font)
    {
        var metrics = Standard14.GetAdobeFontMetrics(font);
        var width = 0.0;
        foreach (var code in codes) width += metrics.CharacterMetrics[WinAnsiEncoding.Instance.GetName(code)].Width.X;
        return width / 1000;
    }
}
