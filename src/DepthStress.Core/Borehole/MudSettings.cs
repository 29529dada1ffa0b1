using DepthStress.Core.Depth;
using DepthStress.Core.Diagnostics;

namespace DepthStress.Core.Borehole;

/// <summary>The mud from a depth down to the next one.</summary>
/// <param name="Top">Depth at which this mud begins, m; NaN where it is not stated.</param>
/// <param name="Density">Its density, kg/m3; NaN where it is not stated.</param>
public readonly record struct MudInterval(double Top, double Density);

/// <summary>The mud that the hole was drilled with: at each depth, its density when the bit was there.</summary>
public sealed record MudSettings
{
    /// <summary>The muds from top to bottom.</summary>
    public Setting<IReadOnlyList<MudInterval>> Density { get; init; }

    /// <summary>The kind of depth of their tops.</summary>
    public Setting<DepthKind> DepthKind { get; init; }
}
