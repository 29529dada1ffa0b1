using DepthStress.Core.Catalogue;
using DepthStress.Core.Diagnostics;

namespace DepthStress.Core.Lithology;

/// <summary>How shale volume follows from gamma radiation.</summary>
public sealed record ShaleSettings
{
    /// <summary>The relation between gamma-ray index and shale volume.</summary>
    public Setting<Law> Volume { get; init; }

    /// <summary>Gamma radiation of clean rock, gAPI.</summary>
    public Setting<double> Clean { get; init; }

    /// <summary>Gamma radiation of shale, gAPI.</summary>
    public Setting<double> Shale { get; init; }

    /// <summary>These settings where they were decided, else those below them.</summary>
    public ShaleSettings Over(ShaleSettings below)
    {
        ArgumentNullException.ThrowIfNull(below);
        return new ShaleSettings
        {
            Volume = Volume.Over(below.Volume),
            Clean = Clean.Over(below.Clean),
            Shale = Shale.Over(below.Shale),
        };
    }
}
