using System.Globalization;
using System.Text.Encodings.Web;
using System.Text.Unicode;
using DepthStress.Report.Drawing;

namespace DepthStress.Report.Page;

/// <summary>Pieces of the page. Whatever comes from outside goes through <see cref="Text"/> and stays text.</summary>
internal static class Html
{
    private static readonly HtmlEncoder Encoder = HtmlEncoder.Create(UnicodeRanges.All);

    /// <summary>A text, its control characters gone and its markup made harmless; fit for attributes too.</summary>
    public static string Text(string text) => Encoder.Encode(PlainText.Clean(text));

    /// <summary>A number for an attribute, read back exactly.</summary>
    public static string Number(double value) => double.IsFinite(value) ? value.ToString("R", CultureInfo.InvariantCulture) : "";

    /// <summary>A paragraph of text.</summary>
    public static string Paragraph(string text, string kind = "") =>
        kind.Length == 0 ? $"<p>{Text(text)}</p>\n" : $"<p class=\"{kind}\">{Text(text)}</p>\n";

    /// <summary>A list of texts; a sentence where it is empty.</summary>
    public static string List(IReadOnlyList<string> items, string none) =>
        items.Count == 0 ? Paragraph(none) : $"<ul>\n{string.Concat(items.Select(i => $"<li>{Text(i)}</li>\n"))}</ul>\n";
}
