using DepthStress.Core.Catalogue;
using DepthStress.Core.Diagnostics;
using DepthStress.Core.Logs;

namespace DepthStress.Core.Model;

/// <summary>A place in the settings where a law is chosen.</summary>
/// <param name="Property">What the law gives.</param>
/// <param name="Key">The key in the well file.</param>
/// <param name="Required">True when the stress profile cannot do without it.</param>
/// <param name="Choice">Reads the choice from the settings.</param>
public sealed record LawSlot(Property Property, string Key, bool Required, Func<StageSettings, Setting<Law>> Choice);

/// <summary>Every place where a law is chosen, in the order in which the chain applies them.</summary>
public static class LawSlots
{
    /// <summary>Shale volume, which the lithology rules need before everything else.</summary>
    public static LawSlot ShaleVolume { get; } = new(Property.ShaleVolume, "[shale] volume", false, s => s.Shale.Volume);

    /// <summary>The rock properties.</summary>
    public static IReadOnlyList<LawSlot> Rock { get; } =
    [
        new(Property.Porosity, "[porosity] porosity", false, s => s.Porosity.Porosity),
        new(Property.YoungsStatic, "[moduli] static_youngs", true, s => s.Moduli.StaticYoungs),
        new(Property.PoissonStatic, "[moduli] static_poisson", true, s => s.Moduli.StaticPoisson),
        new(Property.Ucs, "[strength] ucs", false, s => s.Strength.Ucs),
        new(Property.FrictionAngle, "[strength] friction_angle", false, s => s.Strength.FrictionAngle),
        new(Property.TensileStrength, "[strength] tensile_strength", false, s => s.Strength.TensileStrength),
        new(Property.Biot, "[biot] coefficient", true, s => s.Biot.Coefficient),
    ];

    /// <summary>Where a method of pore pressure is recorded; the choice itself is a word.</summary>
    public static LawSlot PorePressure { get; } = new(Property.PorePressure, "[pore_pressure] method", false, _ => default);

    /// <summary>Where a method of density above the log is recorded; the choice itself may be more than a law.</summary>
    public static LawSlot AboveLog { get; } = new(Property.ShallowDensity, "[overburden] above_log", false, _ => default);

    /// <summary>All whose choice is a law.</summary>
    public static IReadOnlyList<LawSlot> All { get; } = [ShaleVolume, .. Rock];

    /// <summary>Every place of the well file that takes an entry of the catalogue.</summary>
    public static IReadOnlyList<LawSlot> OfCatalogue { get; } = [.. All, AboveLog with { Property = Property.MeanDensityAbove }, AboveLog, PorePressure];
}
