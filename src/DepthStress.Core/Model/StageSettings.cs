using DepthStress.Core.Conditioning;
using DepthStress.Core.Lithology;
using DepthStress.Core.Prediction;
using DepthStress.Core.Pressure;
using DepthStress.Core.Rock;
using DepthStress.Core.Stress;

namespace DepthStress.Core.Model;

/// <summary>Everything that a zone or a lithology rule may decide for its samples.</summary>
public sealed record StageSettings
{
    /// <summary>Log conditioning; a lithology rule cannot decide it.</summary>
    public ConditioningSettings Conditioning { get; init; } = new();

    /// <summary>Shale volume.</summary>
    public ShaleSettings Shale { get; init; } = new();

    /// <summary>Shear velocity and density where they are not logged.</summary>
    public PredictionSettings Prediction { get; init; } = new();

    /// <summary>Porosity.</summary>
    public PorositySettings Porosity { get; init; } = new();

    /// <summary>Anisotropy.</summary>
    public AnisotropySettings Anisotropy { get; init; } = new();

    /// <summary>Static elastic constants.</summary>
    public ModuliSettings Moduli { get; init; } = new();

    /// <summary>Strength.</summary>
    public StrengthSettings Strength { get; init; } = new();

    /// <summary>Biot's coefficient.</summary>
    public BiotSettings Biot { get; init; } = new();

    /// <summary>Pore pressure.</summary>
    public PorePressureSettings PorePressure { get; init; } = new();

    /// <summary>Fluids and their contacts.</summary>
    public FluidSettings Fluids { get; init; } = new();

    /// <summary>Temperature.</summary>
    public TemperatureSettings Temperature { get; init; } = new();

    /// <summary>Horizontal stresses.</summary>
    public HorizontalStressSettings HorizontalStress { get; init; } = new();

    /// <summary>These settings where they were decided, else those below them.</summary>
    public StageSettings Over(StageSettings below)
    {
        ArgumentNullException.ThrowIfNull(below);
        return new StageSettings
        {
            Conditioning = Conditioning.Over(below.Conditioning),
            Shale = Shale.Over(below.Shale),
            Prediction = Prediction.Over(below.Prediction),
            Porosity = Porosity.Over(below.Porosity),
            Anisotropy = Anisotropy.Over(below.Anisotropy),
            Moduli = Moduli.Over(below.Moduli),
            Strength = Strength.Over(below.Strength),
            Biot = Biot.Over(below.Biot),
            PorePressure = PorePressure.Over(below.PorePressure),
            Fluids = Fluids.Over(below.Fluids),
            Temperature = Temperature.Over(below.Temperature),
            HorizontalStress = HorizontalStress.Over(below.HorizontalStress),
        };
    }
}
