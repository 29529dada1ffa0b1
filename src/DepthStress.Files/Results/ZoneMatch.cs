namespace DepthStress.Files.Results;

/// <summary>Mean stresses of a zone in two results.</summary>
/// <param name="Zone">Its name; empty where the well has no zones.</param>
/// <param name="Before">Means by the ids of <see cref="ResultSet.Stresses"/>, Pa; NaN where there are none.</param>
/// <param name="After">The same in the second result.</param>
public sealed record ZoneMatch(string Zone, IReadOnlyDictionary<string, double> Before, IReadOnlyDictionary<string, double> After)
{
    /// <summary>The zones of both, in the order of the first, then those of the second alone.</summary>
    public static IReadOnlyList<ZoneMatch> Of(ResultSet before, ResultSet after)
    {
        ArgumentNullException.ThrowIfNull(before);
        ArgumentNullException.ThrowIfNull(after);
        var zones = before.Depth.Words["zone"].Concat(after.Depth.Words["zone"]).Distinct(StringComparer.Ordinal).ToList();
        if (zones.Count > 1) zones.Remove("");
        return [.. zones.Select(z => new ZoneMatch(z, Means(before.Depth, z), Means(after.Depth, z)))];
    }

    /// <summary>Means over the samples that have a Shmin, over all where none has one: as the summary of a run has them.</summary>
    private static Dictionary<string, double> Means(ResultCsv depth, string zone)
    {
        var (zones, shmin) = (depth.Words["zone"], depth.Numbers["shmin"]);
        var inside = Enumerable.Range(0, depth.Count).Where(i => zones[i] == zone).ToList();
        var covered = inside.Where(i => !double.IsNaN(shmin[i])).ToList();
        if (covered.Count == 0) covered = inside;
        return ResultSet.Stresses.ToDictionary(s => s, s => covered.Select(i => depth.Numbers[s][i]).Where(v => !double.IsNaN(v)).DefaultIfEmpty(double.NaN).Average());
    }
}
