using DepthStress.Cli.Printing;
using DepthStress.Core.Depth;
using DepthStress.Core.Layers;
using DepthStress.Core.Logs;
using DepthStress.Core.Model;
using DepthStress.Core.Quantities;
using static DepthStress.Tests.Model.SmallWell;

namespace DepthStress.Tests.Layers;

/// <summary>Stress barriers around targets, on invented layers from 0 to 400 m below the ground.</summary>
public class StressBarrierTests
{
    private const double Gap = double.NaN;

    /// <summary>Shmin gradient of the target, Pa/m.</summary>
    private const double Usual = 15e3;

    private static readonly LayerSettings OneMegapascal = new();

    /// <summary>A layer whose mean Shmin lies so much above the usual gradient at its middle.</summary>
    private static Layer Of(string zone, double top, double bottom, double extra, double notMeasured = 0)
    {
        var middle = 0.5 * (top + bottom);
        var shmin = (Usual * middle) + extra;
        return new Layer
        {
            Number = 1,
            TopMd = top,
            BaseMd = bottom,
            TopTvd = top,
            BaseTvd = bottom,
            Zone = zone,
            Lithology = "",
            Samples = 2,
            NotMeasured = notMeasured,
            Means = new Dictionary<Property, double>(),
            Profiles = new Dictionary<Property, LayerProfile>
            {
                [Property.MinHorizontalStress] = double.IsNaN(extra) ? LayerProfile.None : new LayerProfile(shmin, shmin, shmin, middle),
            },
        };
    }

    private static IReadOnlyList<StressTarget> Find(string[] targets, params Layer[] layers)
    {
        var zones = layers.Select(l => l.Zone).Distinct().Select(z =>
            new Zone(z, layers.First(l => l.Zone == z).TopTvd, null, DepthKind.Measured, new StageSettings(), WellFile) { Target = targets.Contains(z) });
        return StressTarget.Find(Run(Setup with { Zones = [.. zones] }, LogsWith()), new LayerTable(layers), OneMegapascal);
    }

    private static StressTarget One(params Layer[] layers) => Assert.Single(Find(["target"], layers));

    [Fact]
    public void The_nearest_layer_with_enough_more_is_the_barrier()
    {
        var target = One(
            Of("far", 0, 50, 9e6), Of("lid", 50, 100, 2e6, 0.25), Of("soft", 100, 150, 0.9e6), Of("target", 150, 250, 0),
            Of("weak", 250, 300, 0.5e6), Of("floor", 300, 360, 3e6), Of("deep", 360, 400, 0.99e6));
        Assert.Equal(Usual * 200, target.Shmin, 1e-6);
        Assert.Equal(["far", "lid"], target.Above!.Zones); // what lies behind and holds too belongs to it
        Assert.Equal((0, 100, 100, 50), (target.Above.TopMd, target.Above.BaseMd, target.Above.Thickness, target.Above.Distance));
        Assert.Equal((9e6 + 2e6) / 2, target.Above.Contrast, 1e-6);
        Assert.Equal(0.125, target.Above.NotMeasured, 1e-12);
        Assert.Equal(["floor"], target.Below!.Zones);
        Assert.Equal((300, 360, 60, 50), (target.Below.TopMd, target.Below.BaseMd, target.Below.Thickness, target.Below.Distance));
        Assert.Equal(3e6, target.Below.Contrast, 1e-6);
        Assert.False(target.AboveUnknown || target.BelowUnknown);
    }

    [Fact]
    public void A_contrast_of_just_the_wanted_size_counts()
    {
        Assert.NotNull(One(Of("target", 0, 200, 0), Of("floor", 200, 400, 1e6 + 1)).Below);
        Assert.Null(One(Of("target", 0, 200, 0), Of("floor", 200, 400, 1e6 - 1)).Below);
    }

    // Shmin grows by 15 kPa per metre: the layer below has 3 MPa more, and none of it is contrast.
    [Fact]
    public void Depth_alone_makes_no_barrier()
    {
        var target = One(Of("upper", 0, 100, 0), Of("target", 100, 200, 0), Of("lower", 200, 400, 0));
        Assert.Equal((null, null), (target.Above, target.Below));
        Assert.False(target.AboveUnknown || target.BelowUnknown);
    }

    // A layer that has Shmin in its lowest metres only has a mean from down there, not from its middle.
    [Fact]
    public void A_layer_half_without_stress_is_judged_where_its_stress_is()
    {
        double[] depths = [.. Enumerable.Range(0, 401)];
        var shear = depths.Select(z => z is >= 200 and < 395 ? Gap : 2400).ToArray();
        Zone Zone(string name, double top) => new(name, top, null, DepthKind.Measured, new StageSettings(), WellFile) { Target = name == "target" };
        var model = Run(
            Setup with { Zones = [Zone("target", 0), Zone("lower", 200)] },
            Table(depths, Curve(Property.Vp, Same(4000, 401)), Curve(Property.Vs, shear), Curve(Property.Density, Same(2500, 401))));
        var layers = Layered(model, OneMegapascal);
        Assert.Equal(397.3, layers.Layers[1].Profile(Property.MinHorizontalStress).Depth, 0.05); // five samples and half a one of 395 to 400 m
        var target = Assert.Single(StressTarget.Find(model, layers, OneMegapascal));
        Assert.Null(target.Below); // by its middle at 300 m it would have 1.2 MPa more
    }

    [Fact]
    public void A_layer_without_stress_ends_the_search_and_leaves_the_question_open()
    {
        var target = One(Of("lid", 0, 50, 9e6), Of("blind", 50, 100, Gap), Of("target", 100, 200, 0), Of("floor", 200, 300, 2e6), Of("dark", 300, 350, Gap), Of("deep", 350, 400, 2e6));
        Assert.Null(target.Above);
        Assert.True(target.AboveUnknown);
        Assert.Equal(["floor"], target.Below!.Zones); // what lies behind the gap does not belong to it
        Assert.False(target.BelowUnknown);
    }

    [Fact]
    public void Rock_that_lies_in_no_layer_ends_the_search_too()
    {
        var target = One(Of("lid", 0, 50, 9e6), Of("target", 100, 200, 0), Of("floor", 200, 250, 2e6), Of("deep", 300, 400, 2e6));
        Assert.Null(target.Above);
        Assert.True(target.AboveUnknown);
        Assert.Equal((200, 250), (target.Below!.TopMd, target.Below.BaseMd));
    }

    [Fact]
    public void A_log_that_goes_on_beyond_the_layers_leaves_the_question_open()
    {
        var target = One(Of("target", 100, 200, 0));
        Assert.Equal((null, null, true, true), (target.Above, target.Below, target.AboveUnknown, target.BelowUnknown));
    }

    [Fact]
    public void A_target_at_an_end_of_the_log_has_nothing_beyond()
    {
        var top = One(Of("target", 0, 100, 0), Of("floor", 100, 400, 2e6));
        Assert.Equal((null, false), (top.Above, top.AboveUnknown));
        Assert.Equal(0, top.Below!.Distance);
        Assert.Equal(["floor"], top.Below.Zones);
        var bottom = One(Of("lid", 0, 100, 2e6), Of("target", 100, 400, 0));
        Assert.Equal((null, false), (bottom.Below, bottom.BelowUnknown));
        Assert.Equal(0, bottom.Above!.Distance);
        Assert.Equal(["lid"], bottom.Above.Zones);
    }

    [Fact]
    public void A_target_without_stress_says_nothing()
    {
        var target = One(Of("lid", 0, 100, 2e6), Of("target", 100, 200, Gap), Of("floor", 200, 400, 2e6));
        Assert.True(double.IsNaN(target.Shmin));
        Assert.Equal((null, null), (target.Above, target.Below));
        Assert.Equal("Target target: no Shmin inside it, so nothing can be said about barriers.", BarrierPrinter.Line(target, UnitSystem.Metric, OneMegapascal));
    }

    [Fact]
    public void A_target_of_several_layers_looks_from_its_outer_edges()
    {
        var target = One(Of("lid", 0, 100, 2e6), Of("target", 100, 200, 0), Of("target", 200, 300, 0), Of("floor", 300, 400, 2e6));
        Assert.Equal((0, 0), (target.Above!.Distance, target.Below!.Distance));
    }

    // The second target is a barrier of the first; none of them is asked for itself.
    [Fact]
    public void Two_targets_are_looked_at_one_by_one()
    {
        var targets = Find(["a", "c"], Of("a", 0, 100, 0), Of("b", 100, 200, 0), Of("c", 200, 400, 3e6));
        Assert.Equal(["a", "c"], targets.Select(t => t.Zone));
        Assert.Equal(["c"], targets[0].Below!.Zones);
        Assert.Equal((null, null), (targets[1].Above, targets[1].Below));
        Assert.Empty(Find([], Of("a", 0, 400, 0)));
    }

    [Fact]
    public void The_line_says_it_in_either_unit_system()
    {
        var target = One(Of("lid", 0, 100, 2.5e6, 0.25), Of("soft", 100, 150, 0), Of("target", 150, 250, 0), Of("floor", 250, 400, 0));
        Assert.Equal(
            "Target target, mean Shmin 3.00 MPa: barrier above lid (0.0-100.0 m md, 50.0 m away), 2.50 MPa more at equal depth over 100.0 m tvd, 75 % of it on measured logs; below none in the log (no layer with 1.00 MPa more at equal depth).",
            BarrierPrinter.Line(target, UnitSystem.Metric, OneMegapascal));
        Assert.Equal(
            "Target target, mean Shmin 435 psi: barrier above lid (0.0-328.1 ft md, 164.0 ft away), 363 psi more at equal depth over 328.1 ft tvd, 75 % of it on measured logs; below none in the log (no layer with 145 psi more at equal depth).",
            BarrierPrinter.Line(target, UnitSystem.Field, OneMegapascal));
        Assert.Equal(
            "Target target, mean Shmin 3.00 MPa: barrier above unknown (rock without a layer or Shmin comes before any layer with 1.00 MPa more at equal depth); below floor (250.0-400.0 m md), 2.00 MPa more at equal depth over 150.0 m tvd, 100 % of it on measured logs.",
            BarrierPrinter.Line(One(Of("lid", 0, 150, Gap), Of("target", 150, 250, 0), Of("floor", 250, 400, 2e6)), UnitSystem.Metric, OneMegapascal));
    }
}
