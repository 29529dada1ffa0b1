using System.Globalization;
using System.Text;
using OxyPlot;

namespace DepthStress.Report.Drawing;

/// <summary>Names from outside, made fit for a picture: any text comes out as text.</summary>
internal static class PlainText
{
    /// <summary>How much wider than Arial the fonts are that a viewer may put in its place.</summary>
    private const double WidestFont = 1.17;

    /// <summary>The same for bold type.</summary>
    private const double WidestBoldFont = 1.25;

    /// <summary>The measurer gives points, 1/72 inch, for a size in 1/96 inch.</summary>
    private const double FromPoints = 96.0 / 72;

    private static readonly PdfRenderContext Measurer = new(1, 1, OxyColors.Undefined);
    private static readonly Lock Gate = new();

    /// <summary>The measurer that the drawing context asks for.</summary>
    public static IRenderContext Context => Measurer;

    /// <summary>The text with a space for every run of control characters and blanks, and without halves of surrogate pairs or marks that turn the direction of writing.</summary>
    public static string Clean(string text)
    {
        var clean = new StringBuilder(text.Length);
        foreach (var rune in text.EnumerateRunes())
        {
            var blank = Rune.IsControl(rune) || Rune.IsWhiteSpace(rune);
            if (blank && (clean.Length == 0 || clean[^1] == ' ')) continue;
            if (blank) clean.Append(' ');
            else if (rune.Value is not (0xFFFD or 0xFFFE or 0xFFFF) && Rune.GetUnicodeCategory(rune) != UnicodeCategory.Format) clean.Append(rune.ToString());
        }

        return clean.ToString().TrimEnd();
    }

    /// <summary>Width of clean text, with room for fonts wider than Arial.</summary>
    public static double Width(string text, double size, bool bold)
    {
        if (text.Length == 0) return 0;
        var latin = string.Create(text.Length, text, static (span, source) =>
        {
            for (var i = 0; i < span.Length; i++) span[i] = source[i] is >= ' ' and <= '~' ? source[i] : 'W';
        });
        lock (Gate) return Measurer.MeasureText(latin, "Arial", size, bold ? 700 : 400).Width * FromPoints * (bold ? WidestBoldFont : WidestFont);
    }

    /// <summary>The text, its end replaced by an ellipsis when it is wider than allowed.</summary>
    public static string Shorten(string text, double size, bool bold, double width)
    {
        if (Width(text, size, bold) <= width) return text;
        var runes = text.EnumerateRunes().ToList();
        while (runes.Count > 0)
        {
            runes.RemoveAt(runes.Count - 1);
            var shorter = string.Concat(runes.Select(r => r.ToString())).TrimEnd() + "\u2026";
            if (Width(shorter, size, bold) <= width) return shorter;
        }

        return "";
    }

    /// <summary>The text cut at blanks into lines of at most a width; what does not fit into the last line is shortened.</summary>
    public static IReadOnlyList<string> Wrap(string text, double size, bool bold, double width, int lines)
    {
        var wrapped = new List<string>();
        foreach (var word in text.Split(' ', StringSplitOptions.RemoveEmptyEntries))
        {
            var joined = wrapped.Count > 0 ? wrapped[^1] + " " + word : word;
            if (wrapped.Count > 0 && (wrapped.Count == lines || Width(joined, size, bold) <= width)) wrapped[^1] = joined;
            else wrapped.Add(word);
        }

        return [.. wrapped.Select(line => Shorten(line, size, bold, width))];
    }
}
