using DepthStress.Core.Catalogue;
using DepthStress.Core.Diagnostics;

namespace DepthStress.Core.Lithology;

/// <summary>A rule that names a sample's lithology: every cut-off that is given must hold.</summary>
/// <param name="Name">The lithology's name.</param>
/// <param name="ShaleVolume">Shale volume, v/v, or null when it does not matter.</param>
/// <param name="Density">Bulk density, kg/m3, or null.</param>
/// <param name="Photoelectric">Photoelectric factor, b/e, or null.</param>
/// <param name="Facies">Facies codes, or empty.</param>
/// <param name="Position">Where the rule stands in the well file.</param>
public sealed record LithologyRule(
    string Name,
    Interval? ShaleVolume,
    Interval? Density,
    Interval? Photoelectric,
    IReadOnlyList<double> Facies,
    SourcePosition Position)
{
    /// <summary>True for salt, which flows until all stresses are equal.</summary>
    public bool Salt { get; init; }

    /// <summary>True when the sample meets every cut-off; a missing value meets none.</summary>
    public bool Holds(double shaleVolume, double density, double photoelectric, double facies) =>
        (ShaleVolume is not { } v || v.Contains(shaleVolume))
        && (Density is not { } d || d.Contains(density))
        && (Photoelectric is not { } p || p.Contains(photoelectric))
        && (Facies.Count == 0 || Facies.Contains(facies));
}
