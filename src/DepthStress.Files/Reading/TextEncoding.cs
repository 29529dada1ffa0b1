using System.Text;

namespace DepthStress.Files.Reading;

/// <summary>Tells the encoding of a file from its first bytes, and turns it into UTF-8.</summary>
internal static class TextEncoding
{
    /// <summary>Code page 1252.</summary>
    public static Encoding Windows { get; } = CodePagesEncodingProvider.Instance.GetEncoding(1252)!;

    /// <summary>
    /// The encoding that a mark states, or that zero bytes betray (every other byte of Western text in UTF-16 is zero);
    /// else UTF-8. Code page 1252 cannot be told from the first bytes: names that are no UTF-8 are decoded by it.
    /// </summary>
    public static LogEncoding Detect(ReadOnlySpan<byte> head)
    {
        if (head.StartsWith((ReadOnlySpan<byte>)[0xFF, 0xFE])) return LogEncoding.Utf16LittleEndian;
        if (head.StartsWith((ReadOnlySpan<byte>)[0xFE, 0xFF])) return LogEncoding.Utf16BigEndian;
        if (head.Length < 4 || !head.Contains((byte)0)) return LogEncoding.Utf8;
        var pairs = head.Length / 2;
        var (high, low) = (0, 0);
        for (var i = 0; i + 1 < head.Length; i += 2)
        {
            if (head[i] == 0) high++;
            if (head[i + 1] == 0) low++;
        }

        if (2 * low > pairs && 20 * high < pairs) return LogEncoding.Utf16LittleEndian;
        return 2 * high > pairs && 20 * low < pairs ? LogEncoding.Utf16BigEndian : LogEncoding.Utf8;
    }

    /// <summary>The stream itself where it is UTF-8, else one that gives it as UTF-8. The inner stream stays open.</summary>
    public static Stream AsUtf8(Stream stream, LogEncoding encoding) => encoding switch
    {
        LogEncoding.Utf8 => stream,
        LogEncoding.Utf16LittleEndian => Transcode(stream, Encoding.Unicode),
        LogEncoding.Utf16BigEndian => Transcode(stream, Encoding.BigEndianUnicode),
        _ => Transcode(stream, Windows),
    };

    /// <summary>The first line in the head that is no UTF-8, or null.</summary>
    public static int? LineOfForeignBytes(FileScan scan)
    {
        foreach (var line in HeadLines.Of(scan))
        {
            if (!System.Text.Unicode.Utf8.IsValid(scan.Head.AsSpan(line.Start, line.Length))) return line.Number;
        }

        return null;
    }

    /// <summary>The encoding's name in messages.</summary>
    public static string Name(LogEncoding encoding) => encoding switch
    {
        LogEncoding.Utf8 => "UTF-8",
        LogEncoding.Utf16LittleEndian => "UTF-16 (low byte first)",
        LogEncoding.Utf16BigEndian => "UTF-16 (high byte first)",
        _ => "code page 1252",
    };

    private static Stream Transcode(Stream stream, Encoding encoding) =>
        Encoding.CreateTranscodingStream(stream, encoding, new UTF8Encoding(encoderShouldEmitUTF8Identifier: false), leaveOpen: true);
}
