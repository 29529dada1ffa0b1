using DepthStress.Core.Catalogue;
using DepthStress.Core.Diagnostics;

namespace DepthStress.Core.Rock;

/// <summary>How static elastic constants follow from dynamic ones.</summary>
public sealed record ModuliSettings
{
    /// <summary>The relation that gives static Young's modulus.</summary>
    public Setting<Law> StaticYoungs { get; init; }

    /// <summary>The choice that gives static Poisson's ratio; there is no default, because it moves the least stress most.</summary>
    public Setting<Law> StaticPoisson { get; init; }

    /// <summary>These settings where they were decided, else those below them.</summary>
    public ModuliSettings Over(ModuliSettings below)
    {
        ArgumentNullException.ThrowIfNull(below);
        return new ModuliSettings
        {
            StaticYoungs = StaticYoungs.Over(below.StaticYoungs),
            StaticPoisson = StaticPoisson.Over(below.StaticPoisson),
        };
    }
}
