using DepthStress.Core.Logs;

namespace DepthStress.Files.Reading;

/// <summary>What the well file says about reading a log file.</summary>
public sealed record LogReadOptions
{
    /// <summary>
    /// Further missing-value codes for a column, by the column's name without regard to case; they add to those that
    /// always hold (-999.25, -999, -9999, an empty cell, NaN and the file's own NULL). Columns the file lacks are ignored.
    /// </summary>
    public IReadOnlyDictionary<string, MissingCodes> MissingByColumn { get; init; } = new Dictionary<string, MissingCodes>();

    /// <summary>
    /// Name of the depth column, without regard to case; null takes the first curve of a LAS file, and in a CSV file the
    /// column that has one of <see cref="DepthNames"/>.
    /// </summary>
    public string? DepthColumn { get; init; }

    /// <summary>Names of a depth column in a CSV file, in the order of preference, without regard to case.</summary>
    public IReadOnlyList<string> DepthNames { get; init; } = CurveRoles.DepthMnemonics;

    /// <summary>True when a CSV column's name may end in its unit, as in <c>md_m</c> or <c>inclination_deg</c>.</summary>
    public bool UnitSuffixes { get; init; }

    /// <summary>The form of the file, where it is CSV.</summary>
    public CsvOptions Csv { get; init; } = new();

    /// <summary>What to do with neighbouring rows of the same depth.</summary>
    public RepeatedDepth RepeatedDepth { get; init; }
}
