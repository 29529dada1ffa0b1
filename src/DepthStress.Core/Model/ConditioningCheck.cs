using DepthStress.Core.Conditioning;
using DepthStress.Core.Diagnostics;

namespace DepthStress.Core.Model;

/// <summary>Finds conditioning choices that are incomplete, name no curve, or stand where they cannot hold.</summary>
internal static class ConditioningCheck
{
    /// <summary>Reports choices of zones and lithology rules that only the well, or only the well and its zones, may make.</summary>
    public static void ReportOwners(WellSetup setup, DiagnosticBag diagnostics)
    {
        foreach (var (rule, overrides) in setup.Lithologies)
        {
            if (overrides.Conditioning != new ConditioningSettings())
                diagnostics.Error(rule.Position, $"[conditioning] is set for lithology \"{rule.Name}\", expected it in the well or a zone: logs are conditioned before lithology rules hold");
        }

        foreach (var zone in setup.Zones.Where(z => z.Overrides.Conditioning.Shifts.IsSet))
        {
            diagnostics.Error(
                zone.Overrides.Conditioning.Shifts.Source.Position, $"[conditioning] shifts is set in zone \"{zone.Name}\", expected it for the whole well only");
        }
    }

    /// <summary>Reports what is incomplete.</summary>
    public static void Report(CheckScope scope)
    {
        var settings = scope.Settings.Conditioning;
        ReportSpikes(scope, settings.Spikes);
        ReportWashout(scope, settings.Washout);
        if (!settings.Shifts.IsSet) return;
        foreach (var shift in settings.Shifts.Value) ReportName(scope, shift.Curve, settings.Shifts.Source.Position, "shifts");
        foreach (var twice in settings.Shifts.Value.GroupBy(s => s.Curve).Where(g => g.Key.Length > 0 && g.Count() > 1))
            scope.Error(settings.Shifts.Source.Position, $"[conditioning] shifts: found the curve \"{twice.Key}\" twice, expected each once");
        if (settings.Shifts.Value.Any(s => s.Curve.Length == 0))
            scope.Error(settings.Shifts.Source.Position, "[shifts] curve is not set; expected the name of a curve in each shift");
        if (settings.Shifts.Value.Any(s => double.IsNaN(s.By)))
            scope.Error(settings.Shifts.Source.Position, "[shifts] by is not set; expected a length in each shift, positive downwards");
    }

    private static void ReportSpikes(CheckScope scope, SpikeSettings spikes)
    {
        if (spikes.Curves.IsSet)
        {
            foreach (var name in spikes.Curves.Value) ReportName(scope, name, spikes.Curves.Source.Position, "spikes curves");
            if (spikes.Curves.Value.Count == 0) return;
        }

        if (!spikes.Curves.IsSet && !spikes.Window.IsSet && !spikes.Threshold.IsSet) return;
        if (!spikes.Window.IsSet) scope.Missing("[spikes] window", "the depth over which usual steps are taken, such as \"3 m\"");
        if (!spikes.Threshold.IsSet) scope.Missing("[spikes] threshold", "a number of robust standard deviations");
        if (!spikes.Curves.IsSet) scope.Missing("[spikes] curves", "the curves to filter");
    }

    private static void ReportWashout(CheckScope scope, WashoutSettings washout)
    {
        var (large, corrected) = (washout.CaliperExcess.IsSet, washout.DensityCorrection.IsSet);
        if (!large && !corrected && !washout.Rule.IsSet || washout.Rule is { IsSet: true, Value: WashoutRule.None }) return;
        if (!washout.Rule.IsSet) scope.Missing("[washout] rule", "\"either\", \"both\" or \"none\"");
        if (!large && !corrected) scope.Missing("[washout] caliper_excess", "it, density_correction, or both");
        else if (washout.Rule is { IsSet: true, Value: WashoutRule.Both } && !(large && corrected))
            scope.Error(washout.Rule.Source.Position, $"[washout] rule = \"both\" needs caliper_excess and density_correction{scope.Owner}");
    }

    private static void ReportName(CheckScope scope, string name, SourcePosition position, string key)
    {
        if (name.Length == 0 || MeasuredScale.Names.Contains(name)) return;
        scope.Error(
            position,
            $"[conditioning] {key}: found the curve \"{name}\", expected one of {string.Join(", ", MeasuredScale.Names)}{NearestName.Hint(name, MeasuredScale.Names)}");
    }
}
