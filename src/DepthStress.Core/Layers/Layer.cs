using DepthStress.Core.Logs;
using DepthStress.Core.Model;

namespace DepthStress.Core.Layers;

/// <summary>A value at the top, at the base and on average over a layer.</summary>
/// <param name="Top">At the first sample that has one.</param>
/// <param name="Base">At the last sample that has one.</param>
/// <param name="Mean">Mean over true vertical thickness.</param>
/// <param name="Depth">True vertical depth that the mean stands for: the mean depth of the samples that have a value, m.</param>
public readonly record struct LayerProfile(double Top, double Base, double Mean, double Depth)
{
    /// <summary>No value.</summary>
    public static LayerProfile None { get; } = new(double.NaN, double.NaN, double.NaN, double.NaN);
}

/// <summary>One layer: its geometry, and its properties averaged over true vertical thickness, in SI.</summary>
public sealed record Layer
{
    /// <summary>Number of the layer from 1, from top to bottom.</summary>
    public required int Number { get; init; }

    /// <summary>Measured depth of the top, m.</summary>
    public required double TopMd { get; init; }

    /// <summary>Measured depth of the base, m.</summary>
    public required double BaseMd { get; init; }

    /// <summary>True vertical depth of the top, m.</summary>
    public required double TopTvd { get; init; }

    /// <summary>True vertical depth of the base, m.</summary>
    public required double BaseTvd { get; init; }

    /// <summary>Name of the zone; empty when there are no zones.</summary>
    public required string Zone { get; init; }

    /// <summary>The lithology of most of its thickness; empty when no rule holds.</summary>
    public required string Lithology { get; init; }

    /// <summary>Number of samples that enter the means.</summary>
    public required int Samples { get; init; }

    /// <summary>Share of its thickness that has no Shmin or one that does not rest on measured logs alone, 0 to 1.</summary>
    public required double NotMeasured { get; init; }

    /// <summary>Share of its thickness without static moduli or Shmin, 0 to 1; NaN when it is not known.</summary>
    public double Missing { get; init; } = double.NaN;

    /// <summary>How far the horizontal stresses at log scale lie from a straight line over the layer.</summary>
    public IReadOnlyDictionary<Property, StressMisfit> Misfits { get; init; } = new Dictionary<Property, StressMisfit>();

    /// <summary>True vertical thickness of the nearest stress barrier above, m; NaN when there is none or nobody knows.</summary>
    public double BarrierAbove { get; init; } = double.NaN;

    /// <summary>True vertical thickness of the nearest stress barrier below, m; NaN when there is none or nobody knows.</summary>
    public double BarrierBelow { get; init; } = double.NaN;

    /// <summary>Means over true vertical thickness by property; NaN when no sample has a value.</summary>
    public required IReadOnlyDictionary<Property, double> Means { get; init; }

    /// <summary>Stresses and pore pressure, total, compression positive.</summary>
    public required IReadOnlyDictionary<Property, LayerProfile> Profiles { get; init; }

    /// <summary>Mean Shmin of the layer above minus this one's, Pa; NaN at the top.</summary>
    public double ContrastAbove { get; init; } = double.NaN;

    /// <summary>Mean Shmin of the layer below minus this one's, Pa; NaN at the bottom.</summary>
    public double ContrastBelow { get; init; } = double.NaN;

    /// <summary>The layer as a solver takes it; null where it has no values or none that are stable.</summary>
    public LayerMedium? Medium { get; init; }

    /// <summary>Least unconfined compressive strength of its samples, Pa; NaN when no sample has one.</summary>
    public double LeastUcs { get; init; } = double.NaN;

    /// <summary>Mean of a property; NaN when there is none.</summary>
    public double Mean(Property property) => Means.GetValueOrDefault(property, double.NaN);

    /// <summary>Top, base and mean of a stress; NaN when there is none.</summary>
    public LayerProfile Profile(Property property) => Profiles.TryGetValue(property, out var profile) ? profile : LayerProfile.None;

    /// <summary>Misfit of a stress; NaN when it has none.</summary>
    public StressMisfit Misfit(Property property) => Misfits.TryGetValue(property, out var misfit) ? misfit : StressMisfit.None;
}

/// <summary>The layers of a well, from top to bottom.</summary>
/// <param name="Layers">The layers.</param>
public sealed record LayerTable(IReadOnlyList<Layer> Layers)
{
    /// <summary>What a reader should know about the cut.</summary>
    public IReadOnlyList<Finding> Findings { get; init; } = [];

    /// <summary>The lateral strains that a solver imposes on all of them.</summary>
    public FarField Strains { get; init; }
}
