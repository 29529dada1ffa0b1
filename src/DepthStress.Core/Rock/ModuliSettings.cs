using DepthStress.Core.Catalogue;
using DepthStress.Core.Diagnostics;

namespace DepthStress.Core.Rock;

/// <summary>How static elastic constants follow from dynamic ones.</summary>
public sealed record ModuliSettings
{
    /// <summary>The relation that gives static Young's modulus.</summary>
    public Setting<Law> StaticYoungs { get; init; }

    /// <summary>What the relation's static Young's modulus is multiplied with, as core plugs ask for it.</summary>
    public Setting<double> StaticYoungsFactor { get; init; } = Setting.Default(1.0);

    /// <summary>The choice that gives static Poisson's ratio; there is no default, because it moves the least stress most.</summary>
    public Setting<Law> StaticPoisson { get; init; }

    /// <summary>These settings where they were decided, else those below them.</summary>
    public ModuliSettings Over(ModuliSettings below)
    {
        ArgumentNullException.ThrowIfNull(below);
        return new ModuliSettings
        {
            StaticYoungs = StaticYoungs.Over(below.StaticYoungs),
            StaticYoungsFactor = StaticYoungsFactor.Over(below.StaticYoungsFactor),
            StaticPoisson = StaticPoisson.Over(below.StaticPoisson),
        };
    }
}
