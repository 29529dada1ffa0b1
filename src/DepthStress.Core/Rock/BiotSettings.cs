using DepthStress.Core.Catalogue;
using DepthStress.Core.Diagnostics;

namespace DepthStress.Core.Rock;

/// <summary>How Biot's coefficient is had.</summary>
public sealed record BiotSettings
{
    /// <summary>The relation or constant that gives Biot's coefficient.</summary>
    public Setting<Law> Coefficient { get; init; }

    /// <summary>Bulk modulus of the grains, Pa.</summary>
    public Setting<double> MineralBulkModulus { get; init; }

    /// <summary>Shear modulus of the grains, Pa.</summary>
    public Setting<double> MineralShearModulus { get; init; }

    /// <summary>Shear velocity of the matrix, m/s.</summary>
    public Setting<double> MatrixShearVelocity { get; init; }

    /// <summary>Porosity at which the grains part, v/v.</summary>
    public Setting<double> CriticalPorosity { get; init; }

    /// <summary>These settings where they were decided, else those below them.</summary>
    public BiotSettings Over(BiotSettings below)
    {
        ArgumentNullException.ThrowIfNull(below);
        return new BiotSettings
        {
            Coefficient = Coefficient.Over(below.Coefficient),
            MineralBulkModulus = MineralBulkModulus.Over(below.MineralBulkModulus),
            MineralShearModulus = MineralShearModulus.Over(below.MineralShearModulus),
            MatrixShearVelocity = MatrixShearVelocity.Over(below.MatrixShearVelocity),
            CriticalPorosity = CriticalPorosity.Over(below.CriticalPorosity),
        };
    }
}
