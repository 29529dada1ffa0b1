using System.Security;
using DepthStress.Core.Diagnostics;

namespace DepthStress.Files.Reading;

/// <summary>Reads depth-indexed log files (CSV; LAS 1.2, 2.0 and the log data of 3.0) as they are, without converting units.</summary>
public static class LogFileReader
{
    /// <summary>
    /// Reads a log file. The form is told by the content (a first line that starts with <c>~</c> is LAS), else by the
    /// extension of the name, else it is CSV.
    /// </summary>
    /// <param name="path">Where the file is.</param>
    /// <param name="name">The file's name as the user gave it, for messages and results.</param>
    /// <param name="options">What the well file says about it.</param>
    /// <param name="diagnostics">Receives every problem found.</param>
    /// <returns>The file, or null when it cannot be used: then at least one error has been added.</returns>
    public static LogFile? Read(string path, string name, LogReadOptions options, DiagnosticBag diagnostics)
    {
        ArgumentNullException.ThrowIfNull(path);
        ArgumentNullException.ThrowIfNull(name);
        ArgumentNullException.ThrowIfNull(diagnostics);
        if (Directory.Exists(path))
        {
            diagnostics.Error(new SourcePosition(name), "found a folder, expected a log file");
            return null;
        }

        return Read(() => Open(path), name, options, diagnostics);
    }

    /// <summary>Reads a log file from a stream that can seek.</summary>
    /// <param name="open">Opens the stream, called once; the exceptions of opening a file become errors. The stream is closed.</param>
    /// <param name="name">The file's name as the user gave it, for messages and results.</param>
    /// <param name="options">What the well file says about it.</param>
    /// <param name="diagnostics">Receives every problem found.</param>
    /// <returns>The file, or null when it cannot be used: then at least one error has been added.</returns>
    public static LogFile? Read(Func<Stream> open, string name, LogReadOptions options, DiagnosticBag diagnostics)
    {
        ArgumentNullException.ThrowIfNull(open);
        ArgumentNullException.ThrowIfNull(name);
        ArgumentNullException.ThrowIfNull(options);
        ArgumentNullException.ThrowIfNull(diagnostics);
        try
        {
            using var stream = open();
            return ReadStream(stream, name, options, diagnostics);
        }
        catch (Exception problem) when (problem is IOException or UnauthorizedAccessException or SecurityException or ArgumentException { ParamName: "path" })
        {
            diagnostics.Error(new SourcePosition(name), problem switch
            {
                FileNotFoundException or DirectoryNotFoundException => "file not found",
                UnauthorizedAccessException or SecurityException => "no permission to read the file",
                ArgumentException => "found a name that cannot be a path, expected the path of a log file",
                _ => $"the file cannot be read: {TextCleaner.Clean(problem.Message)}",
            });
            return null;
        }
    }

    // The readers bring their own buffers.
    private static FileStream Open(string path) =>
        new(path, FileMode.Open, FileAccess.Read, FileShare.Read, bufferSize: 1, FileOptions.SequentialScan);

    private static LogFile? ReadStream(Stream stream, string name, LogReadOptions options, DiagnosticBag diagnostics)
    {
        if (!stream.CanSeek)
        {
            diagnostics.Error(new SourcePosition(name), "found a pipe or a device, expected a file");
            return null;
        }

        var head = new byte[FileScan.HeadSize];
        head = head[..stream.ReadAtLeast(head, head.Length, throwOnEndOfStream: false)];
        var found = TextEncoding.Detect(head);
        var encoding = options.Csv.Encoding is { } stated && !IsLas(Start(head, found), name) ? stated : found;
        if (encoding != found && found != LogEncoding.Utf8)
        {
            diagnostics.Error(new SourcePosition(name, 1, 1), $"found {TextEncoding.Name(found)}, expected {TextEncoding.Name(encoding)} as the well file says");
            return null;
        }

        if (Scan(stream, encoding, name, diagnostics) is not { } scan) return null;
        stream.Position = 0;
        using var hashing = new HashingStream(stream);
        var source = new LogSource(name, hashing, TextEncoding.AsUtf8(hashing, encoding), scan, options, diagnostics);
        if (encoding is LogEncoding.Utf16LittleEndian or LogEncoding.Utf16BigEndian && options.Csv.Encoding != encoding)
            diagnostics.Note(source.At(1), $"found {TextEncoding.Name(encoding)}, read as such");
        var file = IsLas(scan.Head, name) ? LasLogReader.Read(source) : CsvLogReader.Read(source);
        if (file is not null) SecondDepth.Report(file, source);
        return file;
    }

    private static FileScan? Scan(Stream stream, LogEncoding encoding, string name, DiagnosticBag diagnostics)
    {
        stream.Position = 0;
        var text = TextEncoding.AsUtf8(stream, encoding);
        return FileScan.Read(text, name, diagnostics);
    }

    private static byte[] Start(byte[] head, LogEncoding encoding)
    {
        var start = new byte[1024];
        using var text = new MemoryStream(head);
        return start[..TextEncoding.AsUtf8(text, encoding).ReadAtLeast(start, start.Length, throwOnEndOfStream: false)];
    }

    private static bool IsLas(ReadOnlySpan<byte> head, string name)
    {
        if (head.StartsWith((ReadOnlySpan<byte>)[0xEF, 0xBB, 0xBF])) head = head[3..];
        foreach (var range in head.SplitAny((byte)'\n', (byte)'\r'))
        {
            var line = head[range].Trim(" \t"u8);
            if (line.Length > 0 && line[0] != (byte)'#')
            {
                return line[0] == (byte)'~' || name.EndsWith(".las", StringComparison.OrdinalIgnoreCase);
            }
        }

        return name.EndsWith(".las", StringComparison.OrdinalIgnoreCase);
    }
}
