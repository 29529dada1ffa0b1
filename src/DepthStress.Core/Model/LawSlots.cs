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

    /// <summary>Density where it is not logged.</summary>
    public static LawSlot Density { get; } = new(Property.Density, "[prediction] density", false, s => s.Prediction.Density);

    /// <summary>Porosity.</summary>
    public static LawSlot Porosity { get; } = new(Property.Porosity, "[porosity] porosity", false, s => s.Porosity.Porosity);

    /// <summary>Shear velocity where it is not logged.</summary>
    public static LawSlot Shear { get; } = new(Property.Vs, "[prediction] shear", false, s => s.Prediction.Shear);

    /// <summary>What is predicted where it is not logged, in the order in which it is.</summary>
    public static IReadOnlyList<LawSlot> Prediction { get; } = [Density, Shear];

    /// <summary>The rock properties; the first, porosity, is had before pore pressure, which may rest on it.</summary>
    public static IReadOnlyList<LawSlot> Rock { get; } =
    [
        Porosity,
        new(Property.YoungsStatic, "[moduli] static_youngs", true, s => s.Moduli.StaticYoungs),
        new(Property.PoissonStatic, "[moduli] static_poisson", true, s => s.Moduli.StaticPoisson),
        new(Property.Ucs, "[strength] ucs", false, s => s.Strength.Ucs),
        new(Property.FrictionAngle, "[strength] friction_angle", false, s => s.Strength.FrictionAngle),
        new(Property.TensileStrength, "[strength] tensile_strength", false, s => s.Strength.TensileStrength),
        new(Property.Toughness, "[strength] toughness", false, s => s.Strength.Toughness),
        new(Property.Brittleness, "[strength] brittleness", false, s => s.Strength.Brittleness),
        new(Property.Biot, "[biot] coefficient", true, s => s.Biot.Coefficient),
    ];

    /// <summary>Where a method of pore pressure is recorded; the choice itself is a word.</summary>
    public static LawSlot PorePressure { get; } = new(Property.PorePressure, "[pore_pressure] method", false, _ => default);

    /// <summary>Where a method of density above the log is recorded; the choice itself may be more than a law.</summary>
    public static LawSlot AboveLog { get; } = new(Property.ShallowDensity, "[overburden] above_log", false, _ => default);

    /// <summary>Where the shear stiffness in the plane of the beds is recorded; the choice itself is a word.</summary>
    public static LawSlot BedShear { get; } = new(Property.BedShearStiffness, "[anisotropy] c66", false, _ => default);

    /// <summary>Where a model of anisotropy is recorded; the choice itself is a word.</summary>
    public static LawSlot Anisotropy { get; } = new(Property.BedStiffness, "[anisotropy] model", false, _ => default);

    /// <summary>Where comparison relations are recorded; the choice itself is a list.</summary>
    public static LawSlot Comparison { get; } = new(Property.ComparisonShmin, "[horizontal_stress] compare", false, _ => default);

    /// <summary>All whose choice is a law.</summary>
    public static IReadOnlyList<LawSlot> All { get; } = [ShaleVolume, Density, Porosity, Shear, .. Rock.Skip(1)];

    /// <summary>Every place of the well file that takes an entry of the catalogue.</summary>
    public static IReadOnlyList<LawSlot> OfCatalogue { get; } = [.. All, AboveLog with { Property = Property.MeanDensityAbove }, AboveLog, PorePressure, BedShear, Anisotropy, Anisotropy with { Property = Property.CrossStiffness }, Comparison];
}
