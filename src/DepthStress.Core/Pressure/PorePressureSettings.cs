using DepthStress.Core.Depth;
using DepthStress.Core.Diagnostics;

namespace DepthStress.Core.Pressure;

/// <summary>What rock that is not shale takes where the method tells the pressure of shale.</summary>
public enum SandPressure
{
    /// <summary>A straight line in depth between the shale above and below it.</summary>
    Shale,

    /// <summary>The table of points.</summary>
    Table,

    /// <summary>The fluid column.</summary>
    FluidLine,
}

/// <summary>One point of a pore-pressure table.</summary>
/// <param name="Depth">Depth, m, of the kind the table states.</param>
/// <param name="Pressure">Pore pressure, Pa.</param>
public readonly record struct PressurePoint(double Depth, double Pressure);

/// <summary>The choices for pore pressure.</summary>
public sealed record PorePressureSettings
{
    /// <summary>The method; there is no default.</summary>
    public Setting<PorePressureMethod> Method { get; init; }

    /// <summary>Density of the pore fluid for the hydrostatic and the trend methods, kg/m3.</summary>
    public Setting<double> FluidDensity { get; init; }

    /// <summary>Fluid density that gives the gradient, kg/m3.</summary>
    public Setting<double> Gradient { get; init; }

    /// <summary>What the gradient counts from.</summary>
    public Setting<DepthReference> Reference { get; init; }

    /// <summary>The table, in increasing depth.</summary>
    public Setting<IReadOnlyList<PressurePoint>> Points { get; init; }

    /// <summary>The kind of depth the table states.</summary>
    public Setting<DepthKind> DepthKind { get; init; }

    /// <summary>The normal trend of slowness as points, from top to bottom.</summary>
    public Setting<IReadOnlyList<TrendPoint>> Trend { get; init; }

    /// <summary>The exponent of Eaton's methods; the published one when it is not set.</summary>
    public Setting<double> Exponent { get; init; }

    /// <summary>An exponential normal trend, given or to be fitted.</summary>
    public NormalTrendSettings NormalTrend { get; init; } = new();

    /// <summary>Samples of at least this shale volume are shale.</summary>
    public Setting<double> ShaleCutoff { get; init; }

    /// <summary>Names of the lithology rules that are shale.</summary>
    public Setting<IReadOnlyList<string>> ShaleLithologies { get; init; }

    /// <summary>What rock that is not shale takes; there is no default.</summary>
    public Setting<SandPressure> Sands { get; init; }

    /// <summary>Height of the window, m, over which shale pressures are averaged before sands are drawn between them.</summary>
    public Setting<double> SandWindow { get; init; }

    /// <summary>True when shale takes the normal pressure where its method gives less.</summary>
    public Setting<bool> AtLeastNormal { get; init; } = Setting.Default(false);

    /// <summary>True when each zone's pressure is shifted to its measured formation pressures.</summary>
    public Setting<bool> HonourTests { get; init; } = Setting.Default(false);

    /// <summary>Factor A of velocity against effective stress, ft/s/psi^B.</summary>
    public Setting<double> BowersFactor { get; init; }

    /// <summary>Exponent B of velocity against effective stress.</summary>
    public Setting<double> BowersExponent { get; init; }

    /// <summary>Unloading exponent U, 1 or more.</summary>
    public Setting<double> BowersUnloading { get; init; }

    /// <summary>Velocity where unloading began, m/s.</summary>
    public Setting<double> BowersMaxVelocity { get; init; }

    /// <summary>Effective stress that reduces porosity by a factor e, Pa.</summary>
    public Setting<double> CompactionStress { get; init; }

    /// <summary>These settings where they were decided, else those below them.</summary>
    public PorePressureSettings Over(PorePressureSettings below)
    {
        ArgumentNullException.ThrowIfNull(below);
        return new PorePressureSettings
        {
            Method = Method.Over(below.Method),
            FluidDensity = FluidDensity.Over(below.FluidDensity),
            Gradient = Gradient.Over(below.Gradient),
            Reference = Reference.Over(below.Reference),
            Points = Points.Over(below.Points),
            DepthKind = DepthKind.Over(below.DepthKind),
            Trend = Trend.Over(below.Trend),
            Exponent = Exponent.Over(below.Exponent),
            NormalTrend = NormalTrend.Over(below.NormalTrend),
            ShaleCutoff = ShaleCutoff.Over(below.ShaleCutoff),
            ShaleLithologies = ShaleLithologies.Over(below.ShaleLithologies),
            Sands = Sands.Over(below.Sands),
            SandWindow = SandWindow.Over(below.SandWindow),
            AtLeastNormal = AtLeastNormal.Over(below.AtLeastNormal),
            HonourTests = HonourTests.Over(below.HonourTests),
            BowersFactor = BowersFactor.Over(below.BowersFactor),
            BowersExponent = BowersExponent.Over(below.BowersExponent),
            BowersUnloading = BowersUnloading.Over(below.BowersUnloading),
            BowersMaxVelocity = BowersMaxVelocity.Over(below.BowersMaxVelocity),
            CompactionStress = CompactionStress.Over(below.CompactionStress),
        };
    }
}
