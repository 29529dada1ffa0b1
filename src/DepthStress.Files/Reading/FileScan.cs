using DepthStress.Core.Diagnostics;

namespace DepthStress.Files.Reading;

/// <summary>The first pass over the text of a file: refuses what is no text, and counts lines so that arrays are allocated once.</summary>
/// <param name="Bytes">Size of the text in bytes of UTF-8.</param>
/// <param name="Lines">Number of lines; a guess where line ends are mixed.</param>
/// <param name="Head">The first bytes, without a byte-order mark.</param>
/// <param name="Mark">Length of the byte-order mark.</param>
internal sealed record FileScan(long Bytes, long Lines, byte[] Head, int Mark)
{
    /// <summary>How many bytes everything is detected from.</summary>
    public const int HeadSize = 1 << 16;

    private static ReadOnlySpan<byte> Utf8Mark => [0xEF, 0xBB, 0xBF];

    /// <summary>True where the head is the whole file.</summary>
    public bool IsWhole => Head.Length + Mark == Bytes;

    /// <summary>Scans a stream of UTF-8 to its end; null when it is empty or holds NUL bytes (an error is then in the bag).</summary>
    public static FileScan? Read(Stream stream, string name, DiagnosticBag diagnostics)
    {
        var buffer = new byte[HeadSize];
        byte[] head = [];
        var mark = 0;
        long bytes = 0, feeds = 0, returns = 0;
        byte last = 0;
        for (int n; (n = stream.ReadAtLeast(buffer, buffer.Length, throwOnEndOfStream: false)) > 0; bytes += n)
        {
            var block = buffer.AsSpan(0, n);
            if (bytes == 0)
            {
                mark = block.StartsWith(Utf8Mark) ? Utf8Mark.Length : 0;
                head = block[mark..].ToArray();
            }

            if (block.IndexOf((byte)0) is >= 0 and var at)
            {
                var line = Math.Max(feeds, returns) + Math.Max(block[..at].Count((byte)'\n'), block[..at].Count((byte)'\r')) + 1;
                diagnostics.Error(new SourcePosition(name, (int)Math.Min(line, int.MaxValue)), "found a NUL byte (binary data), expected text");
                return null;
            }

            feeds += block.Count((byte)'\n');
            returns += block.Count((byte)'\r');
            last = block[^1];
        }

        if (head.AsSpan().Trim(" \t\r\n"u8).IsEmpty && bytes <= HeadSize)
        {
            diagnostics.Error(new SourcePosition(name), "found an empty file, expected a CSV or LAS log file");
            return null;
        }

        return new FileScan(bytes, Math.Max(feeds, returns) + (last is (byte)'\n' or (byte)'\r' ? 0 : 1), head, mark);
    }
}
