using DepthStress.Core.Diagnostics;

namespace DepthStress.Files.Reading;

/// <summary>What a reader of one file works on.</summary>
/// <param name="Name">The file's name as the user gave it.</param>
/// <param name="File">The bytes of the file, hashed as they pass.</param>
/// <param name="Text">The same as UTF-8, from the start.</param>
/// <param name="Scan">What the first pass found.</param>
/// <param name="Options">What the well file says.</param>
/// <param name="Diagnostics">Receives the problems.</param>
internal sealed record LogSource(
    string Name, HashingStream File, Stream Text, FileScan Scan, LogReadOptions Options, DiagnosticBag Diagnostics)
{
    /// <summary>The longest line that is read, in bytes: room for 10,000 columns of 100 characters.</summary>
    public const int MaxLine = 1 << 20;

    /// <summary>The most curves that a LAS file may list.</summary>
    public const int MaxCurves = 100_000;

    /// <summary>A place in the file.</summary>
    public SourcePosition At(int line = 0, int column = 0) => new(Name, line, column);

    /// <summary>Reports a line beyond <see cref="MaxLine"/>.</summary>
    public void LineTooLong(int line) =>
        Diagnostics.Error(At(line), "found a line of more than 1 MiB, expected a line for each depth");

    /// <summary>Reports names that are no UTF-8 and were read by code page 1252.</summary>
    public void ReportForeignBytes(SourcePosition position) =>
        Diagnostics.Note(position, "found bytes that are not UTF-8, read them by code page 1252");
}
