using DepthStress.Core.Diagnostics;

namespace DepthStress.Core.Stress;

/// <summary>Where the temperature of the rock comes from.</summary>
public enum TemperatureSource
{
    /// <summary>The temperature log.</summary>
    Log,

    /// <summary>A straight line from the ground or mudline down.</summary>
    Gradient,
}

/// <summary>The temperature of the rock, for thermal stress.</summary>
public sealed record TemperatureSettings
{
    /// <summary>Where it comes from.</summary>
    public Setting<TemperatureSource> Source { get; init; }

    /// <summary>Temperature at the ground or mudline, K.</summary>
    public Setting<double> Surface { get; init; }

    /// <summary>Rise with true vertical depth, K/m.</summary>
    public Setting<double> Gradient { get; init; }

    /// <summary>The temperature at which the rock had no thermal stress, K: warmer rock gains horizontal stress.</summary>
    public Setting<double> Reference { get; init; }

    /// <summary>These settings where they were decided, else those below them.</summary>
    public TemperatureSettings Over(TemperatureSettings below)
    {
        ArgumentNullException.ThrowIfNull(below);
        return new TemperatureSettings
        {
            Source = Source.Over(below.Source),
            Surface = Surface.Over(below.Surface),
            Gradient = Gradient.Over(below.Gradient),
            Reference = Reference.Over(below.Reference),
        };
    }
}
