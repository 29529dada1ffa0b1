using DepthStress.Core.Catalogue;
using DepthStress.Core.Layers;
using DepthStress.Core.Quantities;

namespace DepthStress.Files.Setup;

/// <summary>Declares the keys of the [layers] section.</summary>
internal static class LayerBindings
{
    private static readonly (string, LayerCut)[] Cuts =
        [("zones", LayerCut.Zones), ("equal thickness", LayerCut.EqualThickness), ("change of properties", LayerCut.ChangeOfProperties)];

    private static readonly (string, ThinLayers)[] Thin = [("keep", ThinLayers.Keep), ("merge", ThinLayers.Merge)];

    private static readonly (string, SolverRock)[] Decks = [("isotropic", SolverRock.Isotropic), ("layered", SolverRock.Layered)];

    private static readonly Interval Elements = new(1, 20);

    private static readonly Interval Counts = new(1, 1000);

    private static readonly Interval Contrasts = new(0.01, 1000);

    private static readonly Interval FractionRange = new(0, 1);

    /// <summary>All of them.</summary>
    public static LayerSettings All(ISection s, LayerSettings l) => l with
    {
        Cut = s.Choice("cut", l.Cut, Cuts, "where boundaries lie besides zone tops: nowhere, at equal thickness, or where properties change"),
        Count = s.Number("count", l.Count, Counts, "equal thickness and change of properties: the wanted number of layers in all"),
        MinThickness = s.Quantity("min_thickness", l.MinThickness, Sign.Positive, Dimension.Length, "least true vertical thickness of a layer; where properties decide and it is not set, the resolution"),
        MaxThickness = s.Quantity("max_thickness", l.MaxThickness, Sign.Positive, Dimension.Length, "greatest true vertical thickness of a layer"),
        ThinLayers = s.Choice("thin_layers", l.ThinLayers, Thin, "layers thinner than min_thickness because zones are: they stay, or join the neighbour that differs less"),
        Boundaries = s.Quantities("boundaries", l.Boundaries, Dimension.Length, "further boundaries of your own"),
        DepthKind = s.Choice("depth_kind", l.DepthKind, Bindings.DepthKinds, "the kind of depth of boundaries"),
        Curves = s.Texts("curves", l.Curves, "change of properties: the curves that are looked at, named like result columns without the unit"),
        Resolution = s.Quantity("resolution", l.Resolution, Sign.Positive, Dimension.Length, "change of properties: thickness over which the tools average; samples closer together are not independent"),
        Contrast = s.Number("contrast", l.Contrast, Contrasts, "change of properties: how clear a change must be; 1 is what chance rarely makes, more gives fewer layers"),
        LargestMissingShare = s.Number("largest_missing_share", l.LargestMissingShare, FractionRange, "greatest share of a layer's thickness that may lack static moduli or Shmin"),
        BarrierContrast = s.Quantity("barrier_contrast", l.BarrierContrast, Sign.Positive, Dimension.Pressure, "how much a layer's Shmin must exceed a target's to count as a barrier"),
        Deck = s.Choice("deck", l.Deck, Decks, "the rock of the solver's deck: the isotropic pair of each layer, or layered rock alike in every direction along its beds"),
        ElementsAlongShmax = s.Number("nx", l.ElementsAlongShmax, Elements, "elements of the deck along SHmax, axis 1"),
        ElementsAlongShmin = s.Number("ny", l.ElementsAlongShmin, Elements, "elements of the deck along Shmin, axis 2"),
        Extent = s.Quantity("extent", l.Extent, Sign.Positive, Dimension.Length, "width of the deck along both horizontal axes"),
    };
}
