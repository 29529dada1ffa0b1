using System.Text;

namespace DepthStress.Files.Writing;

/// <summary>Replaces a text file so that a reader finds the old or the new one, never a part.</summary>
public static class WholeFile
{
    /// <summary>Writes the text beside the file and moves it into its place; the file keeps its rights.</summary>
    /// <param name="path">A file that is there; a link is followed.</param>
    /// <param name="text">What it shall hold, as UTF-8; a byte-order mark at its head is kept.</param>
    public static void Replace(string path, string text)
    {
        ArgumentNullException.ThrowIfNull(path);
        var target = new FileInfo(path).ResolveLinkTarget(returnFinalTarget: true)?.FullName ?? path;
        var mark = HasMark(target);
        var beside = Path.Combine(Path.GetDirectoryName(Path.GetFullPath(target))!, $".{Path.GetFileName(target)}.depthstress-new");
        try
        {
            using (var stream = File.Create(beside))
            {
                if (mark) stream.Write(Encoding.UTF8.Preamble);
                stream.Write(new UTF8Encoding(false).GetBytes(text.TrimStart('\uFEFF')));
                stream.Flush(flushToDisk: true);
            }

            if (!OperatingSystem.IsWindows()) File.SetUnixFileMode(beside, File.GetUnixFileMode(target));
            File.Move(beside, target, overwrite: true);
        }
        finally
        {
            File.Delete(beside);
        }
    }

    private static bool HasMark(string path)
    {
        Span<byte> head = stackalloc byte[3];
        using var stream = File.OpenRead(path);
        return stream.ReadAtLeast(head, 3, throwOnEndOfStream: false) == 3 && head.SequenceEqual(Encoding.UTF8.Preamble);
    }
}
