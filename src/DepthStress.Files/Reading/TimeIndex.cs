namespace DepthStress.Files.Reading;

/// <summary>Tells an index of time from one of depth.</summary>
internal static class TimeIndex
{
    private static readonly HashSet<string> TimeUnits = new(StringComparer.OrdinalIgnoreCase)
    {
        "s", "sec", "secs", "second", "seconds", "ms", "msec", "us", "min", "mins", "minute", "minutes", "h", "hr", "hrs", "hour", "hours",
        "d", "day", "days", "date", "datetime", "hh:mm:ss", "hhmmss", "yyyymmdd",
    };

    private static readonly HashSet<string> Names = new(StringComparer.OrdinalIgnoreCase) { "TIME", "ETIM", "DATE", "DATETIME", "TIMESTAMP", "DATE_TIME" };

    /// <summary>True where the unit, or lacking one the name, is of a time or date.</summary>
    public static bool Is(ColumnHeader column) => column.Unit is { } unit ? TimeUnits.Contains(unit) : Names.Contains(column.Name);

    /// <summary>Reports such an index; false where it is none.</summary>
    public static bool Refuse(ColumnHeader column, LogSource source)
    {
        if (!Is(column)) return false;
        source.Diagnostics.Error(column.Position, $"found the index \"{column.Name}\"{(column.Unit is { } unit ? $" in {unit}" : "")}, a time; expected a depth (logs over time are not read)");
        return true;
    }
}
