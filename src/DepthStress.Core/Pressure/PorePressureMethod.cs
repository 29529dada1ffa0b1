using DepthStress.Core.Catalogue;
using DepthStress.Core.Logs;

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

    /// <summary>Columns of gas, oil and water with their contacts.</summary>
    FluidLine,

    /// <summary>Eaton's relation for sonic slowness against a normal trend.</summary>
    EatonSonic,

    /// <summary>Eaton's relation for resistivity against a normal trend.</summary>
    EatonResistivity,

    /// <summary>Bowers's relation of velocity and effective stress, on loading.</summary>
    BowersLoading,

    /// <summary>Bowers's relation of velocity and effective stress, on unloading.</summary>
    BowersUnloading,

    /// <summary>Zhang's relation for porosity.</summary>
    ZhangPorosity,

    /// <summary>Zhang's relation for sonic slowness.</summary>
    ZhangSonic,

    /// <summary>The depth at which normally compacted shale has the same slowness.</summary>
    EquivalentDepth,

    /// <summary>Porosity as an exponential of effective stress.</summary>
    CompactionPorosity,
}

/// <summary>What a normal trend is a trend of.</summary>
public enum TrendQuantity
{
    /// <summary>Compressional slowness.</summary>
    Slowness,

    /// <summary>Deep resistivity.</summary>
    Resistivity,

    /// <summary>Porosity.</summary>
    Porosity,
}

/// <summary>A method that tells the pressure of shale from a log.</summary>
/// <param name="Method">The choice.</param>
/// <param name="Law">Its entry of the catalogue.</param>
/// <param name="Log">The log it starts from.</param>
/// <param name="Trend">The normal trend it needs, or null.</param>
public sealed record ShaleMethod(PorePressureMethod Method, Law Law, Property Log, TrendQuantity? Trend)
{
    /// <summary>Every one, in the order of the catalogue.</summary>
    public static IReadOnlyList<ShaleMethod> All { get; } =
    [
        new(PorePressureMethod.EatonSonic, EatonMethods.Sonic, Property.CompressionalSlowness, TrendQuantity.Slowness),
        new(PorePressureMethod.EatonResistivity, EatonMethods.Resistivity, Property.DeepResistivity, TrendQuantity.Resistivity),
        new(PorePressureMethod.BowersLoading, BowersMethods.Loading, Property.Vp, null),
        new(PorePressureMethod.BowersUnloading, BowersMethods.Unloading, Property.Vp, null),
        new(PorePressureMethod.ZhangPorosity, CompactionMethods.ZhangPorosity, Property.Porosity, TrendQuantity.Porosity),
        new(PorePressureMethod.ZhangSonic, CompactionMethods.ZhangSonic, Property.CompressionalSlowness, TrendQuantity.Slowness),
        new(PorePressureMethod.EquivalentDepth, CompactionMethods.EquivalentDepth, Property.CompressionalSlowness, TrendQuantity.Slowness),
        new(PorePressureMethod.CompactionPorosity, CompactionMethods.CompactionPorosity, Property.Porosity, null),
    ];

    /// <summary>The shale method of a choice, or null when the choice needs no log.</summary>
    public static ShaleMethod? Of(PorePressureMethod method) => All.FirstOrDefault(m => m.Method == method);

    /// <summary>True when it starts from the pressure that is normal at the depth.</summary>
    public bool NeedsNormalPressure => Method == PorePressureMethod.EquivalentDepth || Law.Inputs.Any(i => i.Property == Property.NormalPressure);
}
