using DepthStress.Core.Diagnostics;

namespace DepthStress.Core.Pressure;

/// <summary>How a missing density is replaced.</summary>
public enum DensityFillKind
{
    /// <summary>It is not: a gap is an error.</summary>
    None,

    /// <summary>By a straight line across the gap.</summary>
    Linear,

    /// <summary>By the last logged value.</summary>
    Hold,

    /// <summary>By a stated density.</summary>
    Stated,
}

/// <summary>A chosen replacement for missing density.</summary>
/// <param name="Kind">How.</param>
/// <param name="Density">The stated density, kg/m3; NaN for the other kinds.</param>
public readonly record struct DensityFill(DensityFillKind Kind, double Density = double.NaN);

/// <summary>How the vertical stress is had where density is not logged.</summary>
public sealed record OverburdenSettings
{
    /// <summary>What is assumed for density from the ground or mudline to the first logged value; there is no default.</summary>
    public Setting<ShallowDensity> AboveLog { get; init; }

    /// <summary>What bridges gaps inside the log.</summary>
    public Setting<DensityFill> Gaps { get; init; } = Setting.Default(new DensityFill(DensityFillKind.None));

    /// <summary>What continues the log below its last density.</summary>
    public Setting<DensityFill> BelowLog { get; init; } = Setting.Default(new DensityFill(DensityFillKind.None));

    /// <summary>Density of sea water, kg/m3; the default is common practice.</summary>
    public Setting<double> WaterDensity { get; init; } = Setting.Default(1030.0);
}
