using DepthStress.Core.Layers;
using DepthStress.Core.Logs;
using DepthStress.Core.Model;
using DepthStress.Core.Quantities;
using DepthStress.Report.Drawing;

namespace DepthStress.Report;

/// <summary>What the layer picture shows of a property: the profile's curve and the layers' lines.</summary>
/// <param name="Property">The property.</param>
/// <param name="Curve">How the profile is drawn.</param>
/// <param name="Sloping">True where a layer goes from a top to a base value, false where it keeps its mean.</param>
internal sealed record LayerCurve(Property Property, CurveDefinition Curve, bool Sloping);

/// <summary>The panels of the layer picture as data, and the layers' own lines.</summary>
internal static class LayerCurves
{
    /// <summary>Width of a layer's line.</summary>
    public const double Bold = 1.7;

    private const double Thin = 0.45;

    /// <summary>The panels from left to right, with their shares of the width.</summary>
    public static IReadOnlyList<(string Title, double Share, IReadOnlyList<LayerCurve> Curves)> Panels { get; } =
    [
        ("Static Young's modulus", 1, [Constant(Property.YoungsStatic, "youngs_static", Palette.Ink, new(0, 200, 4, ScaleFit.RightEnd), new(0, 30, 4, ScaleFit.RightEnd))]),
        ("Static Poisson's ratio", 1, [Constant(Property.PoissonStatic, "poisson_static", Palette.Teal, new(0, 0.5, 5), new(0, 0.5, 5))]),
        ("Bulk density", 1, [Constant(Property.Density, "density", Palette.Plum, new(0, 8, 4, ScaleFit.BothEnds), new(0, 8, 4, ScaleFit.BothEnds))]),
        ("Total stress and pore pressure", 2.1,
        [
            Stress(Property.PorePressure, "pp"), Stress(Property.MaxHorizontalStress, "shmax"),
            Stress(Property.MinHorizontalStress, "shmin"), Stress(Property.VerticalStress, "sv"),
        ]),
    ];

    /// <summary>The lines of the layers in a picture's units; null when no layer has a value.</summary>
    public static CurveTrace? Trace(LayerTable table, LayerCurve curve, UnitSystem units)
    {
        var (unit, length) = (curve.Curve.Column.In(units).Unit, units.UnitFor(Dimension.Length).Unit);
        var lines = new List<List<LogPoint>>();
        var above = double.NaN;
        foreach (var layer in table.Layers)
        {
            var (top, bottom) = (length.FromSi(layer.TopTvd), length.FromSi(layer.BaseTvd));
            var profile = layer.Profile(curve.Property);
            var (first, last) = curve.Sloping ? (profile.Top, profile.Base) : (layer.Mean(curve.Property), layer.Mean(curve.Property));
            if (double.IsFinite(first) && double.IsFinite(last))
            {
                if (curve.Sloping || top != above) lines.Add([]);
                lines[^1].Add(new LogPoint(top, unit.FromSi(first)));
                lines[^1].Add(new LogPoint(bottom, unit.FromSi(last)));
                above = bottom;
            }
            else
            {
                above = double.NaN;
            }
        }

        var pen = new CurvePen(curve.Curve.Pen.Colour, Bold);
        // The scale follows the profile behind the layers, which is counted against it.
        return lines.Count == 0 ? null : new CurveTrace(curve.Curve with { Pen = pen }, lines, new ScaleTally(curve.Curve.Scale(units)));
    }

    /// <summary>How the profile behind the layers is drawn: thin and light.</summary>
    public static CurveDefinition Behind(CurveDefinition curve) => curve with { Pen = new CurvePen(Palette.Light(curve.Pen.Colour), Thin) };

    private static LayerCurve Constant(Property property, string id, int colour, CurveScale metric, CurveScale field) =>
        new(property, new CurveDefinition(DepthColumns.Get(id), DepthColumns.Get(id).Symbol, new CurvePen(colour), metric, field), false);

    private static LayerCurve Stress(Property property, string id) =>
        new(property, TrackTable.StressPanels.Stress.Curves.First(c => c.Column.Id == id), true);
}
