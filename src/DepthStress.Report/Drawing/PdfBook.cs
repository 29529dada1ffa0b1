using System.Security.Cryptography;
using UglyToad.PdfPig.Fonts.Standard14Fonts;
using UglyToad.PdfPig.Tokens;
using UglyToad.PdfPig.Writer;

namespace DepthStress.Report.Drawing;

/// <summary>Sheets as the pages of a PDF. No clock and no chance: the same sheets give the same bytes.</summary>
internal static class PdfBook
{
    private const double Version = 1.7;

    /// <summary>How the two identifiers of a document begin, which are random numbers of 32 digits.</summary>
    private static ReadOnlySpan<byte> Identifiers => "/ID [ <"u8;

    /// <summary>Writes the pages.</summary>
    /// <param name="sheets">One for each page.</param>
    /// <param name="title">The document's title; any letters.</param>
    /// <param name="destination">Gets the bytes; stays open.</param>
    public static void Write(IEnumerable<Sheet> sheets, string title, Stream destination)
    {
        using var bytes = new MemoryStream();
        using (var document = new PdfDocumentBuilder(bytes, false, PdfWriterType.Default, Version, new WesternWriter()))
        {
            document.DocumentInformation.Title = PlainText.Clean(title);
            document.DocumentInformation.Producer = "DepthStress";
            var (plain, bold) = (document.AddStandard14Font(Standard14Font.Helvetica), document.AddStandard14Font(Standard14Font.HelveticaBold));
            foreach (var sheet in sheets) sheet.DrawOn(new PdfPaper(document, plain, bold, sheet));
        }

        var written = bytes.GetBuffer().AsSpan(0, (int)bytes.Length);
        Identify(written);
        destination.Write(written);
    }

    /// <summary>Replaces both identifiers by one that the contents give.</summary>
    private static void Identify(Span<byte> document)
    {
        var place = document.LastIndexOf(Identifiers);
        if (place < 0) throw new InvalidOperationException("found no identifiers in the document, expected two of them");
        var first = place + Identifiers.Length;
        var name = Convert.ToHexString(SHA256.HashData(document[..first]).AsSpan(0, 16));
        for (var k = 0; k < name.Length; k++) document[first + k] = document[first + name.Length + "><".Length + k] = (byte)name[k];
    }

    /// <summary>Declares the fonts in the encoding of <see cref="PdfText"/>, where the builder has one without ø, ü and °.</summary>
    private sealed class WesternWriter : TokenWriter
    {
        protected override void WriteName(NameToken name, Stream outputStream) =>
            base.WriteName(name == NameToken.StandardEncoding ? NameToken.WinAnsiEncoding : name, outputStream);
    }
}
