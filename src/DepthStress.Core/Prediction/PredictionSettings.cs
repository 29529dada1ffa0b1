using DepthStress.Core.Catalogue;
using DepthStress.Core.Diagnostics;

namespace DepthStress.Core.Prediction;

/// <summary>How shear velocity and density are had where they are not logged; what is not set stays missing.</summary>
public sealed record PredictionSettings
{
    /// <summary>The relation that gives shear velocity.</summary>
    public Setting<Law> Shear { get; init; }

    /// <summary>The relation that gives bulk density.</summary>
    public Setting<Law> Density { get; init; }

    /// <summary>These settings where they were decided, else those below them.</summary>
    public PredictionSettings Over(PredictionSettings below)
    {
        ArgumentNullException.ThrowIfNull(below);
        return new PredictionSettings { Shear = Shear.Over(below.Shear), Density = Density.Over(below.Density) };
    }
}
