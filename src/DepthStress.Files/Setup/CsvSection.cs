using DepthStress.Core.Diagnostics;
using DepthStress.Files.Reading;

namespace DepthStress.Files.Setup;

/// <summary>How CSV files are written, as far as the well file says; the rest is detected.</summary>
public sealed record CsvSection
{
    /// <summary>The last line that can hold the header row: it is looked for in the first 64 KB.</summary>
    public const int LastHeaderLine = 65_536;

    /// <summary>The delimiter; a blank stands for runs of blanks.</summary>
    public Setting<char> Delimiter { get; init; }

    /// <summary>The decimal mark.</summary>
    public Setting<char> Decimal { get; init; }

    /// <summary>The line of the header row, from 1.</summary>
    public Setting<double> HeaderLine { get; init; }

    /// <summary>The encoding.</summary>
    public Setting<LogEncoding> Encoding { get; init; }

    /// <summary>The same for the readers.</summary>
    public CsvOptions Options() => new()
    {
        Delimiter = Delimiter.IsSet ? Delimiter.Value : null,
        Decimal = Decimal.IsSet ? Decimal.Value : null,
        HeaderLine = HeaderLine.IsSet ? (int)HeaderLine.Value : null,
        Encoding = Encoding.IsSet ? Encoding.Value : null,
    };
}
