using DepthStress.Core.Depth;
using DepthStress.Core.Diagnostics;

namespace DepthStress.Core.Pressure;

/// <summary>How pore pressure is had.</summary>
public enum PorePressureMethod
{
    /// <summary>The weight of fluid from sea level or the water table down.</summary>
    Hydrostatic,

    /// <summary>A gradient below a stated reference.</summary>
    Gradient,

    /// <summary>Straight lines between given points.</summary>
    Table,

    /// <summary>Eaton's relation for sonic slowness against a given normal trend.</summary>
    EatonSonic,
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

    /// <summary>The normal trend of slowness, from top to bottom.</summary>
    public Setting<IReadOnlyList<TrendPoint>> Trend { get; init; }

    /// <summary>The exponent of a trend method; the published one when it is not set.</summary>
    public Setting<double> Exponent { get; init; }

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
        };
    }
}
