using DepthStress.Core.Depth;
using DepthStress.Core.Diagnostics;

namespace DepthStress.Core.Pressure;

/// <summary>What a fluid column hangs on.</summary>
public enum FluidAnchor
{
    /// <summary>The water below the deepest contact is hydrostatic.</summary>
    Hydrostatic,

    /// <summary>The pressure at the deepest contact, and below it, is that of the table of points.</summary>
    Table,

    /// <summary>The pressure is known at one depth.</summary>
    Point,
}

/// <summary>Fluids in the pores and the depths at which they meet.</summary>
public sealed record FluidSettings
{
    /// <summary>Density of gas in place, kg/m3.</summary>
    public Setting<double> GasDensity { get; init; }

    /// <summary>Density of oil in place, kg/m3.</summary>
    public Setting<double> OilDensity { get; init; }

    /// <summary>Density of formation water, kg/m3.</summary>
    public Setting<double> WaterDensity { get; init; }

    /// <summary>Depth where gas lies on oil, m.</summary>
    public Setting<double> GasOilContact { get; init; }

    /// <summary>Depth where oil lies on water, m.</summary>
    public Setting<double> OilWaterContact { get; init; }

    /// <summary>Depth where gas lies on water, m.</summary>
    public Setting<double> GasWaterContact { get; init; }

    /// <summary>The kind of these depths.</summary>
    public Setting<DepthKind> DepthKind { get; init; }

    /// <summary>What the column hangs on; there is no default.</summary>
    public Setting<FluidAnchor> Anchor { get; init; }

    /// <summary>Depth of the known pressure, m.</summary>
    public Setting<double> AnchorDepth { get; init; }

    /// <summary>The known pressure, Pa.</summary>
    public Setting<double> AnchorPressure { get; init; }

    /// <summary>These settings where they were decided, else those below them.</summary>
    public FluidSettings Over(FluidSettings below)
    {
        ArgumentNullException.ThrowIfNull(below);
        return new FluidSettings
        {
            GasDensity = GasDensity.Over(below.GasDensity),
            OilDensity = OilDensity.Over(below.OilDensity),
            WaterDensity = WaterDensity.Over(below.WaterDensity),
            GasOilContact = GasOilContact.Over(below.GasOilContact),
            OilWaterContact = OilWaterContact.Over(below.OilWaterContact),
            GasWaterContact = GasWaterContact.Over(below.GasWaterContact),
            DepthKind = DepthKind.Over(below.DepthKind),
            Anchor = Anchor.Over(below.Anchor),
            AnchorDepth = AnchorDepth.Over(below.AnchorDepth),
            AnchorPressure = AnchorPressure.Over(below.AnchorPressure),
        };
    }
}
