using DepthStress.Core.Logs;
using DepthStress.Core.Model;
using DepthStress.Core.Quantities;

namespace DepthStress.Report;

/// <summary>One track of a depth picture, as data.</summary>
/// <param name="Id">Its name in the well file.</param>
/// <param name="Title">What it shows, in plain words.</param>
/// <param name="Curves">Its curves in drawing order; those without a value are left out.</param>
public sealed record TrackDefinition(string Id, string Title, IReadOnlyList<CurveDefinition> Curves)
{
    /// <summary>The same track with the user's scales for its curves.</summary>
    public TrackDefinition With(IReadOnlyDictionary<string, CurveScale>? scales) => scales is null
        ? this
        : this with { Curves = [.. Curves.Select(c => scales.TryGetValue(c.Column.Id, out var s) ? c with { Metric = s, Field = s } : c)] };
}

/// <summary>One curve of a track.</summary>
/// <param name="Column">Where its values and units come from.</param>
/// <param name="Label">Its short name in the track's header.</param>
/// <param name="Pen">How its line looks.</param>
/// <param name="Metric">Its scale in metric units.</param>
/// <param name="Field">Its scale in field units.</param>
/// <param name="Ribbon">The log curve whose origins are shown in a narrow strip beside the track; null for none.</param>
public sealed record CurveDefinition(
    NumberColumn<EarthModel> Column, string Label, CurvePen Pen, CurveScale Metric, CurveScale Field, Property? Ribbon = null)
{
    /// <summary>Its scale in a unit system.</summary>
    public CurveScale Scale(UnitSystem units) => units == UnitSystem.Metric ? Metric : Field;
}

/// <summary>How a line looks.</summary>
/// <param name="Colour">Red, green and blue as 0xRRGGBB.</param>
/// <param name="Width">Width, 1/96 inch.</param>
/// <param name="Dash">Lengths of dashes and spaces in line widths; null for a solid line.</param>
public sealed record CurvePen(int Colour, double Width = 0.8, IReadOnlyList<double>? Dash = null);

/// <summary>How a scale follows the data.</summary>
public enum ScaleFit
{
    /// <summary>Not at all.</summary>
    Fixed,

    /// <summary>Its right end is the round number above the greatest value; curves of a track that do so share it.</summary>
    RightEnd,

    /// <summary>Both ends are round numbers around the values; curves of a track that do so share them.</summary>
    BothEnds,
}

/// <summary>The values at a track's left and right edge, in the unit of the column; left may be the greater one.</summary>
/// <param name="Left">Value at the left edge; the least it can be when it follows the data.</param>
/// <param name="Right">Value at the right edge; the greatest it can be when it follows the data.</param>
/// <param name="Divisions">Number of equal parts that grid lines cut it into.</param>
/// <param name="Fit">How it follows the data.</param>
public readonly record struct CurveScale(double Left, double Right, int Divisions = 4, ScaleFit Fit = ScaleFit.Fixed)
{
    /// <summary>The lesser end.</summary>
    public double Low => Math.Min(Left, Right);

    /// <summary>The greater end.</summary>
    public double High => Math.Max(Left, Right);
}
