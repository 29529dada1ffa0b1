using System.Globalization;

namespace DepthStress.Core.Diagnostics;

/// <summary>A place in an input file. Lines and columns count from 1; 0 means "the file as a whole".</summary>
/// <param name="File">The file's name as the user gave it, or empty where no file is meant.</param>
/// <param name="Line">Line number from 1, or 0.</param>
/// <param name="Column">Column number from 1, or 0.</param>
public readonly record struct SourcePosition(string File, int Line = 0, int Column = 0)
{
    /// <summary>No place at all: the message is about results, not about an input.</summary>
    public static SourcePosition None { get; } = new("");

    /// <summary>Gives <c>file(line,column)</c>, with the parts that are known.</summary>
    public override string ToString() => (Line, Column) switch
    {
        (0, _) => File ?? "",
        (_, 0) => string.Create(CultureInfo.InvariantCulture, $"{File}({Line})"),
        _ => string.Create(CultureInfo.InvariantCulture, $"{File}({Line},{Column})"),
    };
}
