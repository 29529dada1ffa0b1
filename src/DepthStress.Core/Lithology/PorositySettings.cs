using DepthStress.Core.Catalogue;
using DepthStress.Core.Diagnostics;

namespace DepthStress.Core.Lithology;

/// <summary>How porosity follows from the logs.</summary>
public sealed record PorositySettings
{
    /// <summary>The relation.</summary>
    public Setting<Law> Porosity { get; init; }

    /// <summary>Density of the rock's matrix, kg/m3.</summary>
    public Setting<double> MatrixDensity { get; init; }

    /// <summary>Density of the pore fluid the density tool sees, kg/m3.</summary>
    public Setting<double> FluidDensity { get; init; }

    /// <summary>Compressional slowness of the rock's matrix, s/m.</summary>
    public Setting<double> MatrixSlowness { get; init; }

    /// <summary>Compressional slowness of the pore fluid, s/m.</summary>
    public Setting<double> FluidSlowness { get; init; }

    /// <summary>What sonic porosity is divided by in rock that is not compacted, a number of 1 or more.</summary>
    public Setting<double> CompactionFactor { get; init; }

    /// <summary>These settings where they were decided, else those below them.</summary>
    public PorositySettings Over(PorositySettings below)
    {
        ArgumentNullException.ThrowIfNull(below);
        return new PorositySettings
        {
            Porosity = Porosity.Over(below.Porosity),
            MatrixDensity = MatrixDensity.Over(below.MatrixDensity),
            FluidDensity = FluidDensity.Over(below.FluidDensity),
            MatrixSlowness = MatrixSlowness.Over(below.MatrixSlowness),
            FluidSlowness = FluidSlowness.Over(below.FluidSlowness),
            CompactionFactor = CompactionFactor.Over(below.CompactionFactor),
        };
    }
}
