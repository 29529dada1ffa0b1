using DepthStress.Core.Diagnostics;

namespace DepthStress.Files.Reading;

/// <summary>The first pass over a file: refuses what is not text, and counts lines so that arrays are allocated once.</summary>
/// <param name="Bytes">Size in bytes.</param>
/// <param name="Lines">Number of lines; a guess where line ends are mixed.</param>
/// <param name="Head">The first bytes, without a byte-order mark.</param>
internal sealed record FileScan(long Bytes, long Lines, byte[] Head)
{
    private const int BufferSize = 1 << 16;
    private static readonly byte[] Utf8Mark = [0xEF, 0xBB, 0xBF];

    /// <summary>Scans a stream from its start to its end; null when it is empty or no text in UTF-8 (an error is then in the bag).</summary>
    public static FileScan? Read(Stream stream, string name, DiagnosticBag diagnostics)
    {
        var buffer = new byte[BufferSize];
        byte[] head = [];
        long bytes = 0, feeds = 0, returns = 0;
        byte last = 0;
        for (int n; (n = stream.ReadAtLeast(buffer, buffer.Length, throwOnEndOfStream: false)) > 0; bytes += n)
        {
            var block = buffer.AsSpan(0, n);
            if (bytes == 0)
            {
                if (RefuseUtf16(block, name, diagnostics)) return null;
                head = (block.StartsWith(Utf8Mark) ? block[Utf8Mark.Length..] : block).ToArray();
            }

            if (block.IndexOf((byte)0) is >= 0 and var at)
            {
                var line = Math.Max(feeds, returns) + Math.Max(block[..at].Count((byte)'\n'), block[..at].Count((byte)'\r')) + 1;
                diagnostics.Error(
                    new SourcePosition(name, (int)Math.Min(line, int.MaxValue)), "found a NUL byte (binary data), expected UTF-8 text");
                return null;
            }

            feeds += block.Count((byte)'\n');
            returns += block.Count((byte)'\r');
            last = block[^1];
        }

        if (head.AsSpan().Trim(" \t\r\n"u8).IsEmpty && bytes <= BufferSize)
        {
            diagnostics.Error(new SourcePosition(name), "found an empty file, expected a CSV or LAS log file");
            return null;
        }

        return new FileScan(bytes, Math.Max(feeds, returns) + (last is (byte)'\n' or (byte)'\r' ? 0 : 1), head);
    }

    private static bool RefuseUtf16(ReadOnlySpan<byte> block, string name, DiagnosticBag diagnostics)
    {
        var marked = block.StartsWith((ReadOnlySpan<byte>)[0xFF, 0xFE]) || block.StartsWith((ReadOnlySpan<byte>)[0xFE, 0xFF]);
        var alternating = block.Length >= 4
            && ((block[0] == 0) != (block[1] == 0)) && (block[2] == 0) == (block[0] == 0) && (block[3] == 0) == (block[1] == 0);
        if (!marked && !alternating) return false;
        diagnostics.Error(new SourcePosition(name, 1, 1), "found UTF-16 text, expected UTF-8");
        return true;
    }
}
