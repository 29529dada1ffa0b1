using DepthStress.Core.Depth;
using DepthStress.Core.Diagnostics;

namespace DepthStress.Core.Borehole;

/// <summary>The casing strings, by their lowest points.</summary>
public sealed record CasingSettings
{
    /// <summary>Depths of the shoes, m; NaN where one is not stated.</summary>
    public Setting<IReadOnlyList<double>> Shoes { get; init; }

    /// <summary>The kind of these depths.</summary>
    public Setting<DepthKind> DepthKind { get; init; }
}
