using DepthStress.Core.Layers;
using DepthStress.Core.Logs;
using DepthStress.Core.Model;
using DepthStress.Core.Quantities;
using DepthStress.Report;

namespace DepthStress.Tests.Report;

public class LayersPictureTests
{
    private static readonly EarthModel Model = PictureModels.Full(1500, zones:
    [
        PictureModels.Zone("apricot shale", 900), PictureModels.Zone("bracken sand", 1420) with { Target = true }, PictureModels.Zone("dapple shale", 1630),
    ]);

    [Fact]
    public void Titles_name_the_well_the_layers_the_datum_and_the_units()
    {
        var sheet = LayersPicture.Draw(Model, PictureModels.Layers(Model, 150), new LayerSettings(), UnitSystem.Field);
        var texts = sheet.Texts.Select(t => t.Text).ToList();
        var count = PictureModels.Layers(Model, 150).Layers.Count;
        Assert.Contains(FormattableString.Invariant($"Example 1 \u00b7 {count} layers over the profile"), texts);
        foreach (var expected in new[] { "True vertical depth below rotary table, ft", "Static Young's modulus, Mpsi", "Static Poisson's ratio", "Bulk density, g/cm3", "Total stress and pore pressure, psi", "1", "target zone" })
            Assert.Contains(expected, texts);
        Assert.Contains(texts, t => t.StartsWith("Target bracken sand: barrier above ", StringComparison.Ordinal));
        Assert.Contains("licensed engineer", string.Join(" ", texts), StringComparison.Ordinal);
    }

    [Fact]
    public void A_layer_keeps_its_mean_over_its_thickness_and_its_stress_goes_from_top_to_base()
    {
        var table = PictureModels.Layers(Model, 150);
        var density = LayerCurves.Panels.SelectMany(p => p.Curves).Single(c => c.Property == Property.Density);
        var steps = LayerCurves.Trace(table, density, UnitSystem.Metric)!;
        var points = Assert.Single(steps.Lines); // no layer is missing, so the steps are joined
        Assert.Equal(2 * table.Layers.Count, points.Count);
        var shmin = LayerCurves.Trace(table, LayerCurves.Panels[^1].Curves.Single(c => c.Property == Property.MinHorizontalStress), UnitSystem.Metric)!;
        var stressed = table.Layers.Where(l => double.IsFinite(l.Profile(Property.MinHorizontalStress).Top)).ToList();
        Assert.Equal(stressed.Count, shmin.Lines.Count);
        for (var k = 0; k < table.Layers.Count; k++)
        {
            Assert.Equal(table.Layers[k].TopTvd, points[2 * k].Depth, 1e-9); // a copy
            Assert.Equal(table.Layers[k].BaseTvd, points[(2 * k) + 1].Depth, 1e-9); // a copy
            Assert.Equal(table.Layers[k].Mean(Property.Density) / 1000, points[2 * k].Value, 1e-9); // g/cm3, rounding of one division
            Assert.Equal(points[2 * k].Value, points[(2 * k) + 1].Value);
        }

        for (var k = 0; k < stressed.Count; k++)
        {
            Assert.Equal(stressed[k].Profile(Property.MinHorizontalStress).Top / 1e6, shmin.Lines[k][0].Value, 1e-9); // MPa, rounding of one division
            Assert.Equal(stressed[k].Profile(Property.MinHorizontalStress).Base / 1e6, shmin.Lines[k][1].Value, 1e-9); // MPa, rounding of one division
        }
    }

    [Fact]
    public void Steps_are_not_joined_across_a_layer_without_a_value()
    {
        var table = PictureModels.Layers(Model, 150);
        var youngs = LayerCurves.Panels[0].Curves[0];
        var known = table.Layers.Select(l => double.IsFinite(l.Mean(Property.YoungsStatic))).ToList();
        Assert.Contains(false, known);
        var pieces = Enumerable.Range(0, known.Count).Count(k => known[k] && (k == 0 || !known[k - 1]));
        Assert.Equal(pieces, LayerCurves.Trace(table, youngs, UnitSystem.Metric)!.Lines.Count);
    }

    [Fact]
    public void Many_layers_are_numbered_as_far_as_there_is_room()
    {
        var table = PictureModels.Layers(Model, 12);
        Assert.True(table.Layers.Count > 150);
        var sheet = LayersPicture.Draw(Model, table, new LayerSettings(), UnitSystem.Metric);
        Assert.InRange(sheet.Texts.Count(t => t.Box.Right < 120 && t.Box.Left > 92 && int.TryParse(t.Text, out _)), 30, 70);
    }

    [Fact]
    public void A_well_without_layers_still_gets_its_page()
    {
        var sheet = LayersPicture.Draw(Model, new LayerTable([]), new LayerSettings(), UnitSystem.Metric);
        Assert.Contains(sheet.Texts, t => t.Text == "Example 1 \u00b7 0 layers over the profile");
    }
}
