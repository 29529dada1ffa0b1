using DepthStress.Core.Depth;
using DepthStress.Core.Quantities;

namespace DepthStress.Report;

/// <summary>What a picture shows and in which units.</summary>
/// <param name="Units">The units of every scale.</param>
/// <param name="Tracks">Ids of <see cref="TrackTable"/> in the order to draw them; null means every track that has a curve.</param>
/// <param name="Scales">The user's scales of single curves, by the id of their column, in its unit; null means none.</param>
/// <param name="Depths">The depths of the stress polygons, m, and their kind; null means that the picture chooses.</param>
public sealed record PictureOptions(
    UnitSystem Units, IReadOnlyList<string>? Tracks = null, IReadOnlyDictionary<string, CurveScale>? Scales = null,
    IReadOnlyList<(double Depth, DepthKind Kind)>? Depths = null);
