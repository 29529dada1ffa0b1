namespace DepthStress.Files.Reading;

/// <summary>A log file as it was read: columns of equal length, not converted.</summary>
/// <param name="Name">The file's name as the user gave it.</param>
/// <param name="Format">Its form.</param>
/// <param name="WellName">The well's name in the file (LAS only), or null.</param>
/// <param name="NullValue">The missing-value code the file states (LAS only), or null.</param>
/// <param name="Columns">The columns in the order of the file.</param>
/// <param name="DepthColumn">Index of the depth column, whose values strictly increase and are never missing.</param>
/// <param name="Rows">Number of rows.</param>
/// <param name="Bytes">Size of the file in bytes.</param>
/// <param name="Sha256">SHA-256 of the very bytes that were read, 64 lower-case hexadecimal digits.</param>
public sealed record LogFile(
    string Name,
    LogFormat Format,
    string? WellName,
    double? NullValue,
    IReadOnlyList<LogColumn> Columns,
    int DepthColumn,
    int Rows,
    long Bytes,
    string Sha256);
