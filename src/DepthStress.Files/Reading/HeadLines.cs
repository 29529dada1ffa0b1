namespace DepthStress.Files.Reading;

/// <summary>A line in the head of a file.</summary>
/// <param name="Number">Its number, from 1.</param>
/// <param name="Start">Where it starts in the head.</param>
/// <param name="Length">Its length without its end.</param>
internal readonly record struct HeadLine(int Number, int Start, int Length);

/// <summary>The lines in the head of a file.</summary>
internal static class HeadLines
{
    /// <summary>Every whole line that is not blank.</summary>
    public static IEnumerable<HeadLine> Of(FileScan scan)
    {
        var head = scan.Head;
        for (int start = 0, number = 1; start < head.Length; number++)
        {
            var length = head.AsSpan(start).IndexOfAny((byte)'\n', (byte)'\r');
            if (length < 0 && !scan.IsWhole) yield break;
            if (length < 0) length = head.Length - start;
            if (!head.AsSpan(start, length).Trim(" \t"u8).IsEmpty) yield return new HeadLine(number, start, length);
            var end = start + length;
            start = end + (head.AsSpan(end).StartsWith("\r\n"u8) ? 2 : 1);
        }
    }
}
