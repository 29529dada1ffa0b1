using DepthStress.Core.Catalogue;
using DepthStress.Core.Diagnostics;

namespace DepthStress.Core.Rock;

/// <summary>How Biot's coefficient is had.</summary>
public sealed record BiotSettings
{
    /// <summary>The relation or constant that gives Biot's coefficient.</summary>
    public Setting<Law> Coefficient { get; init; }

    /// <summary>These settings where they were decided, else those below them.</summary>
    public BiotSettings Over(BiotSettings below)
    {
        ArgumentNullException.ThrowIfNull(below);
        return new BiotSettings
        {
            Coefficient = Coefficient.Over(below.Coefficient),
        };
    }
}
