using DepthStress.Core.Borehole;
using DepthStress.Core.Diagnostics;

namespace DepthStress.Core.Model;

/// <summary>What a leak-off pressure says of Shmin.</summary>
public enum LeakOffMeaning
{
    /// <summary>Shmin lies at or below it.</summary>
    UpperBound,

    /// <summary>Shmin is it.</summary>
    Value,
}

/// <summary>What a pressure held without leak-off says.</summary>
public enum IntegrityMeaning
{
    /// <summary>The leak-off pressure lies at or above it.</summary>
    LeakOff,

    /// <summary>Shmin lies at or above it: only where the wall is known to be cracked already.</summary>
    Shmin,
}

/// <summary>How the observations are understood, where the trade knows more than one way (common practice).</summary>
public sealed record ObservationSettings
{
    /// <summary>What leak-off pressures say.</summary>
    public Setting<LeakOffMeaning> LeakOff { get; init; } = Setting.Default(LeakOffMeaning.UpperBound);

    /// <summary>What integrity tests say.</summary>
    public Setting<IntegrityMeaning> Integrity { get; init; } = Setting.Default(IntegrityMeaning.LeakOff);

    /// <summary>
    /// Relative standard deviation of the relations that give the rock's strength, the same error for all breakdowns and breakouts;
    /// the default is at the low end of the scatter that published relations state.
    /// </summary>
    public Setting<double> StrengthError { get; init; } = Setting.Default(0.1);

    /// <summary>Whether the fluid of breakdown and reopening tests entered the rock; has no default.</summary>
    public Setting<BreakdownFluid> BreakdownFluid { get; init; }
}
