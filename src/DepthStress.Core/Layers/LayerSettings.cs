using DepthStress.Core.Diagnostics;

namespace DepthStress.Core.Layers;

/// <summary>How the profile is cut into layers: one per zone, split where it would be thicker than allowed.</summary>
public sealed record LayerSettings
{
    /// <summary>The greatest true vertical thickness of a layer, m; not set means whole zones.</summary>
    public Setting<double> MaxThickness { get; init; }

    /// <summary>How much a layer's mean Shmin must exceed a target's at equal depth to count as a barrier, Pa; the default is common practice.</summary>
    public Setting<double> BarrierContrast { get; init; } = Setting.Default(1e6);
}
