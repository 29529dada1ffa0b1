using DepthStress.Core.Diagnostics;
using DepthStress.Core.Lithology;
using DepthStress.Core.Logs;

namespace DepthStress.Core.Model;

/// <summary>Gamma-ray index and shale volume, zone by zone, before any lithology is known.</summary>
internal static class ShaleStage
{
    /// <summary>Fills shale volume where a relation is chosen; elsewhere a logged shale volume stands.</summary>
    public static void Apply(PropertyTable table, IReadOnlyList<SettingsRun> zoneRuns, List<LawUse> uses, List<Finding> findings)
    {
        var gammaRay = table.Read(Property.GammaRay);
        var saturated = 0;
        foreach (var run in zoneRuns)
        {
            var shale = run.Settings.Shale;
            if (gammaRay.IsEmpty || !shale.Volume.IsSet || !shale.Clean.IsSet || !shale.Shale.IsSet) continue;
            saturated += GammaRayIndex.Fill(
                gammaRay.Slice(run.Start, run.Length), shale.Clean.Value, shale.Shale.Value,
                table.Write(Property.GammaRayIndex).Slice(run.Start, run.Length));
        }

        LawStage.Apply(LawSlots.ShaleVolume, table, zoneRuns, uses);
        if (saturated > 0)
        {
            findings.Add(new Finding(
                Severity.Note, $"gamma ray beyond the clean or shale line: the index was held at 0 or 1", saturated, []));
        }
    }
}
