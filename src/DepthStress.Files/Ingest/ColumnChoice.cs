using DepthStress.Core.Logs;
using DepthStress.Files.Reading;
using DepthStress.Files.Setup;

namespace DepthStress.Files.Ingest;

/// <summary>A column of a file that serves a role.</summary>
/// <param name="File">The file.</param>
/// <param name="Column">The column.</param>
/// <param name="Source">The well file's words about it; null when it was found by its usual name.</param>
public sealed record ColumnChoice(LogFile File, LogColumn Column, CurveSource? Source);

/// <summary>The columns that serve a role, from top to bottom.</summary>
/// <param name="Role">The role.</param>
/// <param name="Columns">Its columns.</param>
public sealed record RoleChoice(CurveRole Role, IReadOnlyList<ColumnChoice> Columns)
{
    /// <summary>True when the well file named the columns.</summary>
    public bool Stated => Columns[0].Source is not null;
}
