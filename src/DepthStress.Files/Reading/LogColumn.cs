using DepthStress.Core.Diagnostics;

namespace DepthStress.Files.Reading;

/// <summary>One column of a log file, as it was read.</summary>
/// <param name="Name">Its name, unique in the file; control characters are removed.</param>
/// <param name="Unit">Its unit as spelled in the file, or null where the file states none.</param>
/// <param name="Description">The description in the file, or empty.</param>
/// <param name="Values">One value for each row in the unit of the file (not converted); NaN where it is missing.</param>
/// <param name="Position">Where the column is declared.</param>
/// <param name="Missing">How many cells were empty or held a missing-value code.</param>
public sealed record LogColumn(
    string Name, string? Unit, string Description, double[] Values, SourcePosition Position, int Missing);
