using DepthStress.Core.Diagnostics;

namespace DepthStress.Core.Layers;

/// <summary>What is said when a wanted number of layers cannot be had.</summary>
internal static class WantedCount
{
    /// <summary>True when the count leaves every stretch a layer; else it is reported.</summary>
    public static bool CoversStretches(int stretches, LayerSettings settings, DiagnosticBag diagnostics)
    {
        if (settings.Count.Value >= stretches) return true;
        diagnostics.Error(
            settings.Count.Source.Position,
            FormattableString.Invariant($"[layers]: found count = {settings.Count.Value}, expected at least {stretches}: every zone, and every part of one between boundaries of your own, is a layer"));
        return false;
    }

    /// <summary>Reports a count that is too great.</summary>
    public static void TooMany(LayerSettings settings, int most, string limit, DiagnosticBag diagnostics) => diagnostics.Error(
        settings.Count.Source.Position,
        FormattableString.Invariant($"[layers]: found count = {settings.Count.Value}, expected at most {most}: that is what {limit} allow"));

    /// <summary>Reports a count that is too small for the greatest thickness.</summary>
    public static void TooFew(LayerSettings settings, int least, DiagnosticBag diagnostics) => diagnostics.Error(
        settings.Count.Source.Position,
        FormattableString.Invariant($"[layers]: found count = {settings.Count.Value}, expected at least {least}: fewer layers are thicker than max_thickness"));

    /// <summary>Reports a count whose layers break a limit of thickness.</summary>
    public static void Breaks(LayerSettings settings, string how, string want, DiagnosticBag diagnostics) => diagnostics.Error(
        settings.Count.Source.Position,
        FormattableString.Invariant($"[layers]: found count = {settings.Count.Value}, which makes equal layers {how}, expected {want} of them or another limit"));
}
