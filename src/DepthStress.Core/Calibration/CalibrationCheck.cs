using DepthStress.Core.Diagnostics;
using DepthStress.Core.Model;

namespace DepthStress.Core.Calibration;

/// <summary>Finds choices of a calibration that are not sound or do not go together.</summary>
public static class CalibrationCheck
{
    /// <summary>Reports every problem.</summary>
    public static void Report(CalibrationSettings settings, WellSetup setup, DiagnosticBag diagnostics)
    {
        ArgumentNullException.ThrowIfNull(settings);
        ArgumentNullException.ThrowIfNull(setup);
        ArgumentNullException.ThrowIfNull(diagnostics);
        var words = CalibrationSettings.Words.Select(w => w.Word).ToList();
        foreach (var word in settings.Free.Value.Where(word => !words.Contains(word)))
            diagnostics.Error(settings.Free.Source.Position, $"found the unknown parameter \"{word}\", expected some of {string.Join(", ", words)}{NearestName.Hint(word, words)}");
        var taken = new HashSet<string>(StringComparer.Ordinal);
        var zones = setup.Zones.Select(z => z.Name).ToList();
        foreach (var group in settings.Groups)
        {
            if (!group.Zones.IsSet || group.Zones.Value.Count == 0) diagnostics.Error(group.Position, "[calibration] groups: expected zones = names of zones");
            foreach (var zone in group.Zones.IsSet ? group.Zones.Value : [])
            {
                if (!zones.Contains(zone)) diagnostics.Error(group.Zones.Source.Position, $"found the unknown zone \"{zone}\", expected some of {string.Join(", ", zones)}{NearestName.Hint(zone, zones)}");
                else if (!taken.Add(zone)) diagnostics.Error(group.Zones.Source.Position, $"found the zone \"{zone}\" in two groups, expected it in one");
            }
        }
    }
}
