using DepthStress.Core.Diagnostics;

namespace DepthStress.Core.Layers;

/// <summary>Finds layer settings that contradict each other, ask for what there is not, or have no effect.</summary>
public static class LayerCheck
{
    /// <summary>Reports every problem that can be seen without logs.</summary>
    public static void Report(LayerSettings settings, DiagnosticBag diagnostics)
    {
        ArgumentNullException.ThrowIfNull(settings);
        ArgumentNullException.ThrowIfNull(diagnostics);
        var cut = settings.Cut.Value;
        var merge = settings.ThinLayers.Value == ThinLayers.Merge;
        void Error(SettingSource source, string text) => diagnostics.Error(source.Position, "[layers]: " + text);
        void Idle<T>(Setting<T> setting, string key, bool effect, string why)
        {
            if (!effect && setting.Source.Kind is not (SettingKind.NotSet or SettingKind.Default))
                diagnostics.Warning(setting.Source.Position, $"[layers]: {key} has no effect {why}");
        }

        if (settings.Count.IsSet && settings.Count.Value != Math.Floor(settings.Count.Value))
            Error(settings.Count.Source, "found a fraction, expected count = a whole number");
        foreach (var (number, key) in (ReadOnlySpan<(Setting<double>, string)>)[(settings.ElementsAlongShmax, "nx"), (settings.ElementsAlongShmin, "ny")])
        {
            if (number.Value != Math.Floor(number.Value)) Error(number.Source, $"found a fraction, expected {key} = a whole number");
        }

        if (settings.Count.IsSet && cut == LayerCut.Zones)
            Error(settings.Count.Source, "found count with one layer per zone, expected cut = \"equal thickness\" or \"change of properties\" beside it");
        if (settings.Count.IsSet && merge)
            Error(settings.Count.Source, "found count beside thin_layers = \"merge\", expected one of them: merging changes the count");
        if (cut == LayerCut.EqualThickness && !settings.Count.IsSet && !settings.MaxThickness.IsSet)
            Error(settings.Cut.Source, "found cut = \"equal thickness\" alone, expected count or max_thickness beside it");
        if (settings.MaxThickness.IsSet && settings.MaxThickness.Value < 2 * settings.Limits.Least)
        {
            Error(
                settings.MaxThickness.Source,
                $"found max_thickness below twice the least thickness ({(settings.MinThickness.IsSet ? "min_thickness" : "resolution, as min_thickness is not set")}), expected room for every thickness between");
        }

        if (merge && cut != LayerCut.ChangeOfProperties && !settings.MinThickness.IsSet)
            Error(settings.ThinLayers.Source, "found thin_layers = \"merge\" alone, expected min_thickness beside it");
        if (settings.Boundaries.IsSet && !settings.DepthKind.IsSet)
            Error(settings.Boundaries.Source, "found boundaries without depth_kind, expected \"md\", \"tvd\" or \"tvdss\"");

        CheckCurves(settings.Curves, diagnostics);
        if (diagnostics.HasErrors) return; // what has no effect cannot be told while something is wrong
        var change = cut == LayerCut.ChangeOfProperties;
        Idle(settings.DepthKind, "depth_kind", settings.Boundaries.IsSet, "without boundaries");
        Idle(settings.Resolution, "resolution", change, "unless cut = \"change of properties\"");
        Idle(settings.Contrast, "contrast", change && !settings.Count.IsSet, change ? "beside count" : "unless cut = \"change of properties\"");
        Idle(settings.Curves, "curves", change || merge, "unless cut = \"change of properties\" or thin_layers = \"merge\"");
        Idle(settings.MinThickness, "min_thickness", change || merge || settings.Count.IsSet, "with this cut unless thin_layers = \"merge\" or count is set");
    }

    private static void CheckCurves(Setting<IReadOnlyList<string>> curves, DiagnosticBag diagnostics)
    {
        var known = CutCurves.All.Select(c => c.Id).ToList();
        if (curves.Value.Count == 0) diagnostics.Error(curves.Source.Position, $"[layers]: found no curves, expected some of {string.Join(", ", known)}");
        foreach (var id in curves.Value.Where(id => !known.Contains(id)))
            diagnostics.Error(curves.Source.Position, $"[layers]: found the unknown curve \"{id}\", expected some of {string.Join(", ", known)}{NearestName.Hint(id, known)}");
        foreach (var twice in curves.Value.GroupBy(c => c, StringComparer.Ordinal).Where(g => g.Count() > 1))
            diagnostics.Error(curves.Source.Position, $"[layers]: found the curve \"{twice.Key}\" twice, expected each once");
    }
}
