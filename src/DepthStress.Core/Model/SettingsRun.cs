namespace DepthStress.Core.Model;

/// <summary>Samples [Start, End) that share their settings.</summary>
/// <param name="Start">First sample.</param>
/// <param name="End">One past the last sample.</param>
/// <param name="Zone">Index of the zone, or -1.</param>
/// <param name="Lithology">Index of the lithology rule, or -1.</param>
/// <param name="Settings">The resolved settings.</param>
public readonly record struct SettingsRun(int Start, int End, short Zone, short Lithology, StageSettings Settings)
{
    /// <summary>Number of samples.</summary>
    public int Length => End - Start;

    /// <summary>Cuts samples into runs of one zone and one lithology, each with its settings resolved once.</summary>
    public static IReadOnlyList<SettingsRun> Resolve(WellSetup setup, ReadOnlySpan<short> zones, ReadOnlySpan<short> lithologies)
    {
        ArgumentNullException.ThrowIfNull(setup);
        var resolved = new Dictionary<(short, short), StageSettings>();
        var runs = new List<SettingsRun>();
        for (var start = 0; start < zones.Length;)
        {
            var (zone, lithology) = (zones[start], lithologies[start]);
            var end = start + 1;
            while (end < zones.Length && zones[end] == zone && lithologies[end] == lithology) end++;
            if (!resolved.TryGetValue((zone, lithology), out var settings))
            {
                settings = zone < 0 ? setup.Settings : setup.Zones[zone].Overrides.Over(setup.Settings);
                if (lithology >= 0) settings = setup.Lithologies[lithology].Overrides.Over(settings);
                // Salt has no beds that matter: its stresses are equal.
                if (StressStage.IsSalt(setup, lithology)) settings = settings with { Anisotropy = new() };
                resolved.Add((zone, lithology), settings);
            }

            runs.Add(new SettingsRun(start, end, zone, lithology, settings));
            start = end;
        }

        return runs;
    }
}
