namespace DepthStress.Files.Reading;

/// <summary>What the well file says about the form of CSV files; what it does not say is detected.</summary>
public sealed record CsvOptions
{
    /// <summary>Runs of blanks and tabs as delimiter.</summary>
    public const char Blanks = ' ';

    /// <summary>The delimiter: <c>,</c> <c>;</c> a tab, <c>|</c> or <see cref="Blanks"/>; null detects it.</summary>
    public char? Delimiter { get; init; }

    /// <summary>The decimal mark, <c>.</c> or <c>,</c>; null detects it.</summary>
    public char? Decimal { get; init; }

    /// <summary>The line of the header row, from 1; null detects it.</summary>
    public int? HeaderLine { get; init; }

    /// <summary>The encoding; null detects it.</summary>
    public LogEncoding? Encoding { get; init; }
}
