using DepthStress.Core.Depth;
using DepthStress.Core.Diagnostics;

namespace DepthStress.Core.Layers;

/// <summary>How the profile is cut into layers.</summary>
public enum LayerCut
{
    /// <summary>One layer per zone, split into nearly equal parts where it would be too thick.</summary>
    Zones,

    /// <summary>Layers as equal in thickness as zones and samples allow.</summary>
    EqualThickness,

    /// <summary>Where the properties change.</summary>
    ChangeOfProperties,
}

/// <summary>What becomes of layers that zones leave too thin.</summary>
public enum ThinLayers
{
    /// <summary>They stay.</summary>
    Keep,

    /// <summary>They join the neighbour that differs less.</summary>
    Merge,
}

/// <summary>How the profile is cut into layers, and what is looked for in them. Zone tops are always boundaries, unless a thin layer is merged away.</summary>
public sealed record LayerSettings
{
    /// <summary>Where boundaries lie.</summary>
    public Setting<LayerCut> Cut { get; init; } = Setting.Default(LayerCut.Zones);

    /// <summary>The wanted number of layers; not set means as many as it takes. A whole number.</summary>
    public Setting<double> Count { get; init; }

    /// <summary>The least true vertical thickness of a layer, m.</summary>
    public Setting<double> MinThickness { get; init; }

    /// <summary>The greatest true vertical thickness of a layer, m; not set means any.</summary>
    public Setting<double> MaxThickness { get; init; }

    /// <summary>What becomes of layers that are thinner than the least thickness because zones are.</summary>
    public Setting<ThinLayers> ThinLayers { get; init; } = Setting.Default(Layers.ThinLayers.Keep);

    /// <summary>Depths where the user wants a boundary, m, of the kind <see cref="DepthKind"/>.</summary>
    public Setting<IReadOnlyList<double>> Boundaries { get; init; }

    /// <summary>The kind of depth of <see cref="Boundaries"/>.</summary>
    public Setting<DepthKind> DepthKind { get; init; }

    /// <summary>Change of properties: the curves that are looked at, by the ids of <see cref="CutCurves"/>.</summary>
    public Setting<IReadOnlyList<string>> Curves { get; init; } = Setting.Default<IReadOnlyList<string>>(["youngs_static", "poisson_static", "shmin"]);

    /// <summary>
    /// Change of properties: the true vertical thickness over which the tools average, m. Samples closer than that are not
    /// independent. The default is common practice for sonic and density tools.
    /// </summary>
    public Setting<double> Resolution { get; init; } = Setting.Default(0.6);

    /// <summary>
    /// Change of properties: how much clearer than scatter a change must be. 1 is the Bayesian information criterion with one
    /// sample per <see cref="Resolution"/>; 2 asks for twice the evidence.
    /// </summary>
    public Setting<double> Contrast { get; init; } = Setting.Default(1.0);

    /// <summary>The greatest share of a layer's thickness that may be without static moduli or Shmin, 0 to 1; not set means any.</summary>
    public Setting<double> LargestMissingShare { get; init; }

    /// <summary>How much a layer's mean Shmin must exceed a target's at equal depth to count as a barrier, Pa; the default is common practice.</summary>
    public Setting<double> BarrierContrast { get; init; } = Setting.Default(1e6);

    /// <summary>Which rock the solver's deck is made of.</summary>
    public Setting<SolverRock> Deck { get; init; } = Setting.Default(SolverRock.Isotropic);

    /// <summary>Elements of the deck along SHmax; a whole number from 1 on.</summary>
    public Setting<double> ElementsAlongShmax { get; init; } = Setting.Default(1.0);

    /// <summary>Elements of the deck along Shmin; a whole number from 1 on.</summary>
    public Setting<double> ElementsAlongShmin { get; init; } = Setting.Default(1.0);

    /// <summary>Width of the deck along both horizontal axes, m.</summary>
    public Setting<double> Extent { get; init; } = Setting.Default(100.0);

    /// <summary>The least and the greatest thickness; where changes decide, no layer is thinner than what the tools resolve.</summary>
    public ThicknessLimits Limits => new(
        MinThickness.IsSet ? MinThickness.Value : Cut.Value == LayerCut.ChangeOfProperties ? Resolution.Value : 0,
        MaxThickness.IsSet ? MaxThickness.Value : double.PositiveInfinity);
}
