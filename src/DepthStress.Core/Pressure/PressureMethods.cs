using DepthStress.Core.Catalogue;

namespace DepthStress.Core.Pressure;

/// <summary>Catalogue entries that give pore pressure.</summary>
public static class PressureMethods
{
    /// <summary>The entries.</summary>
    public static IReadOnlyList<Law> All { get; } = [.. ShaleMethod.All.Select(m => m.Law)];
}
