using DepthStress.Core.Diagnostics;
using DepthStress.Core.Model;

namespace DepthStress.Core.Calibration;

/// <summary>Samples that share one pair of tectonic strains, both to be estimated.</summary>
/// <param name="Zones">Numbers of the zones; empty for the whole well.</param>
public sealed record StrainGroup(IReadOnlyList<int> Zones)
{
    /// <summary>The whole well, but for zones that state strains of their own.</summary>
    public static StrainGroup Well { get; } = new([]);

    /// <summary>The groups that the settings ask for: the zones they name together, or the whole well.</summary>
    public static IReadOnlyList<StrainGroup> Of(WellSetup setup, CalibrationSettings settings)
    {
        ArgumentNullException.ThrowIfNull(setup);
        ArgumentNullException.ThrowIfNull(settings);
        if (settings.Groups.Count == 0) return [Well];
        return [.. settings.Groups.Select(g => new StrainGroup([.. g.Zones.Value.Select(name => Number(setup, name)).Where(z => z >= 0)]))];
    }

    /// <summary>True when a run of samples takes the strains of this group.</summary>
    public bool Holds(WellSetup setup, in SettingsRun run)
    {
        ArgumentNullException.ThrowIfNull(setup);
        if (StressStage.IsSalt(setup, run.Lithology)) return false;
        if (Zones.Count > 0) return Zones.Contains(run.Zone);
        var strains = run.Settings.HorizontalStress;
        return !IsOwn(strains.StrainAlongShmin.Source) && !IsOwn(strains.StrainAlongShmax.Source);
    }

    /// <summary>The zones' names, or nothing for the whole well.</summary>
    public string Name(WellSetup setup) => string.Join(", ", Zones.Select(z => setup.Zones[z].Name));

    /// <summary>The setup with strains of this group put in.</summary>
    public WellSetup With(WellSetup setup, double alongShmin, double alongShmax)
    {
        ArgumentNullException.ThrowIfNull(setup);
        var source = new SettingSource(SettingKind.Calibrated, SourcePosition.None);
        StageSettings Put(StageSettings s) => s with
        {
            HorizontalStress = s.HorizontalStress with
            {
                StrainAlongShmin = new(alongShmin, source),
                StrainAlongShmax = new(alongShmax, source),
            },
        };
        if (Zones.Count == 0) return setup with { Settings = Put(setup.Settings) };
        return setup with { Zones = [.. setup.Zones.Select((zone, k) => Zones.Contains(k) ? zone with { Overrides = Put(zone.Overrides) } : zone)] };
    }

    private static bool IsOwn(SettingSource source) => source.Kind is SettingKind.Zone or SettingKind.Lithology;

    private static int Number(WellSetup setup, string name)
    {
        for (var k = 0; k < setup.Zones.Count; k++)
        {
            if (setup.Zones[k].Name == name) return k;
        }

        return -1;
    }
}
