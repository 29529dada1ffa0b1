using DepthStress.Core.Diagnostics;
using DepthStress.Core.Model;

namespace DepthStress.Core.Layers;

/// <summary>Cuts the samples that enter layers, as the settings say.</summary>
internal static class LayerCutter
{
    /// <summary>The layers from top to bottom; null when they cannot be cut so, which is then reported.</summary>
    public static List<LayerBounds>? Of(EarthModel model, SampleCells cells, LayerSettings settings, DiagnosticBag diagnostics, List<Finding> findings)
    {
        var errors = diagnostics.Items.Count(d => d.Severity == Severity.Error);
        var own = Stretches.Own(model, settings, diagnostics);
        var stretches = Stretches.Of(model, own, findings);
        var merge = settings.ThinLayers.Value == ThinLayers.Merge;
        var curves = settings.Cut.Value == LayerCut.ChangeOfProperties || merge ? CutCurves.Chosen(model, settings, diagnostics, findings) : [];
        if (diagnostics.Items.Count(d => d.Severity == Severity.Error) > errors) return null;
        var layers = settings.Cut.Value switch
        {
            LayerCut.ChangeOfProperties => PropertyCut.Of(model, cells, stretches, curves, settings, diagnostics, findings),
            LayerCut.EqualThickness when settings.Count.IsSet => EqualCut.Counted(model, cells, stretches, settings, diagnostics),
            _ => EqualCut.AtMost(model, cells, stretches, settings.Limits),
        };
        if (layers is null) return null;
        if (merge) ThinMerge.Apply(model, cells, layers, own, curves, settings.Limits, findings);
        else Keep(model, cells, layers, settings, findings);
        if (settings.Cut.Value == LayerCut.ChangeOfProperties) findings.AddRange(LawSwitches.At(model, cells, layers, settings.Resolution.Value));
        return layers;
    }

    private static void Keep(EarthModel model, SampleCells cells, List<LayerBounds> layers, LayerSettings settings, List<Finding> findings)
    {
        var thin = layers.Where(l => !settings.Limits.IsThickEnough(l.Thickness(cells))).ToList();
        if (thin.Count == 0 || settings.Limits.Least == 0) return;
        var marked = new bool[model.Count];
        foreach (var layer in thin) Array.Fill(marked, true, layer.Start, layer.End - layer.Start);
        findings.Add(Finding.About(
            Severity.Note, $"[layers]: layers that zones or boundaries of your own leave thinner than the least thickness; thin_layers = \"merge\" joins them to a neighbour",
            model.Values.Read(Logs.Property.MeasuredDepth), marked)!);
    }
}
