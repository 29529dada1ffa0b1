namespace DepthStress.Files.Reading;

/// <summary>What the well file says about reading a log file.</summary>
public sealed record LogReadOptions
{
    /// <summary>
    /// A further missing-value code for a column, by the column's name without regard to case; it adds to those that
    /// always hold (-999.25, -999, -9999, an empty cell, NaN and the file's own NULL). Columns the file lacks are ignored.
    /// </summary>
    public IReadOnlyDictionary<string, double> MissingByColumn { get; init; } = new Dictionary<string, double>();

    /// <summary>
    /// Name of the depth column, without regard to case; null takes the first curve of a LAS file, and in a CSV file the
    /// column whose name is a usual one for measured depth.
    /// </summary>
    public string? DepthColumn { get; init; }
}
