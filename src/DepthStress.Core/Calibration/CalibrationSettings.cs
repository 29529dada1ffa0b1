using DepthStress.Core.Diagnostics;

namespace DepthStress.Core.Calibration;

/// <summary>What a calibration may change.</summary>
public enum FreeParameter
{
    /// <summary>The two tectonic strains, from stress observations.</summary>
    Strains,

    /// <summary>The exponent of a trend method, from measured formation pressures.</summary>
    PressureExponent,

    /// <summary>The parameters of the normal trend, from measured formation pressures.</summary>
    NormalTrend,

    /// <summary>The factor on static Young's modulus, from core alone.</summary>
    StaticModulusFactor,
}

/// <summary>What is held while the strains are estimated, because the data do not determine both.</summary>
public enum HeldStrain
{
    /// <summary>Nothing: both are estimated.</summary>
    None,

    /// <summary>The strain along Shmin as the well file states it.</summary>
    AlongShmin,

    /// <summary>The strain along SHmax as the well file states it.</summary>
    AlongShmax,

    /// <summary>The difference of the two as the well file states it.</summary>
    Difference,
}

/// <summary>Zones whose strains are estimated together, apart from other groups.</summary>
public sealed record ZoneGroup
{
    /// <summary>The names of the zones.</summary>
    public Setting<IReadOnlyList<string>> Zones { get; init; }

    /// <summary>Where the group stands.</summary>
    public SourcePosition Position { get; init; }
}

/// <summary>The choices of a calibration.</summary>
public sealed record CalibrationSettings
{
    /// <summary>The words for what may change.</summary>
    public static IReadOnlyList<(string Word, FreeParameter Parameter)> Words { get; } =
    [
        ("strains", FreeParameter.Strains), ("pressure_exponent", FreeParameter.PressureExponent),
        ("normal_trend", FreeParameter.NormalTrend), ("static_modulus_factor", FreeParameter.StaticModulusFactor),
    ];

    /// <summary>What may change, as words; the strains alone unless stated.</summary>
    public Setting<IReadOnlyList<string>> Free { get; init; } = Setting.Default<IReadOnlyList<string>>(["strains"]);

    /// <summary>Groups of zones with strains of their own; none means one pair for the well.</summary>
    public IReadOnlyList<ZoneGroup> Groups { get; init; } = [];

    /// <summary>What is held.</summary>
    public Setting<HeldStrain> Hold { get; init; } = Setting.Default(HeldStrain.None);

    /// <summary>True when observations far off shall weigh less (Huber).</summary>
    public Setting<bool> Robust { get; init; } = Setting.Default(false);

    /// <summary>True when a parameter may change.</summary>
    public bool Frees(FreeParameter parameter) => Free.Value.Any(word => Words.Any(w => w.Word == word && w.Parameter == parameter));
}
