using DepthStress.Core.Depth;
using DepthStress.Core.Diagnostics;

namespace DepthStress.Core.Model;

/// <summary>What was observed in the hole.</summary>
public enum ObservationKind
{
    /// <summary>Fracture closure pressure.</summary>
    Closure,

    /// <summary>Pressure at which an earlier fracture opened again.</summary>
    Reopening,

    /// <summary>Pressure just after pumping stopped.</summary>
    ShutIn,

    /// <summary>Leak-off pressure.</summary>
    LeakOff,

    /// <summary>Pressure held without leak-off.</summary>
    Integrity,

    /// <summary>Circulating pressure at which a fracture took mud.</summary>
    Losses,

    /// <summary>Pressure at which the hole wall broke down.</summary>
    Breakdown,

    /// <summary>Opening angle of a breakout.</summary>
    BreakoutWidth,

    /// <summary>An interval looked at and found without breakouts.</summary>
    NoBreakout,

    /// <summary>Pore pressure measured by a tester.</summary>
    FormationPressure,
}

/// <summary>One observation, as its row states it, in SI.</summary>
public sealed record Observation
{
    /// <summary>Where the row stands.</summary>
    public SourcePosition Position { get; init; }

    /// <summary>Depth of the top of the interval, m, of the stated kind.</summary>
    public required double Top { get; init; }

    /// <summary>Depth of its base, m; not above the top.</summary>
    public required double Base { get; init; }

    /// <summary>The kind of these depths.</summary>
    public required DepthKind DepthKind { get; init; }

    /// <summary>What was observed.</summary>
    public required ObservationKind Kind { get; init; }

    /// <summary>The pressure, Pa, where it was read, or the full opening angle of one side of a breakout, rad; zero for none.</summary>
    public required double Value { get; init; }

    /// <summary>True when the pressure was read at the surface and lacks the column of fluid in the hole.</summary>
    public bool AtSurface { get; init; }

    /// <summary>
    /// True when the pressure is stated as the density of a fluid, kg/m3, that would reach it from the datum, and its standard
    /// deviation likewise; <see cref="ObservedInterval"/> makes a pressure of it.
    /// </summary>
    public bool AsDensity { get; init; }

    /// <summary>Density of the fluid in the hole, kg/m3; null where the row states none.</summary>
    public double? FluidDensity { get; init; }

    /// <summary>Standard deviation of the value, in its unit; positive.</summary>
    public required double Sigma { get; init; }

    /// <summary>Pore pressure measured with it, Pa; null where the model's serves.</summary>
    public double? PorePressure { get; init; }

    /// <summary>The day, as written.</summary>
    public string Date { get; init; } = "";

    /// <summary>The row's note.</summary>
    public string Note { get; init; } = "";
}
