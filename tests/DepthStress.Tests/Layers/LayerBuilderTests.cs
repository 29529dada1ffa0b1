using DepthStress.Core.Depth;
using DepthStress.Core.Layers;
using DepthStress.Core.Lithology;
using DepthStress.Core.Logs;
using DepthStress.Core.Model;
using DepthStress.Core.Pressure;
using static DepthStress.Tests.Model.SmallWell;

namespace DepthStress.Tests.Layers;

public class LayerBuilderTests
{
    private const double Gap = double.NaN;

    private static Zone Of(string name, double top, double? bottom = null) =>
        new(name, top, bottom, DepthKind.Measured, new StageSettings(), WellFile);

    private static WellSetup Zoned(params Zone[] zones) => Setup with { Zones = zones };

    private static IReadOnlyList<Layer> Build(EarthModel model, LayerSettings? settings = null) =>
        Layered(model, settings ?? new LayerSettings()).Layers;

    private static (double, double)[] Tops(IEnumerable<Layer> layers) => [.. layers.Select(l => (l.TopTvd, l.BaseTvd))];

    [Fact]
    public void Without_zones_there_is_one_layer_from_the_first_to_the_last_sample()
    {
        var layer = Assert.Single(Build(Run()));
        Assert.Equal((1, 0, 400, 5), (layer.Number, layer.TopTvd, layer.BaseTvd, layer.Samples));
        Assert.Equal("", layer.Zone);
    }

    [Fact]
    public void Zones_that_touch_meet_halfway_between_their_samples()
    {
        var layers = Build(Run(Zoned(Of("A", 0), Of("B", 200)), LogsWith()));
        Assert.Equal([(0, 150), (150, 400)], Tops(layers));
        Assert.Equal(["A", "B"], layers.Select(l => l.Zone));
        Assert.Equal([2, 3], layers.Select(l => l.Samples));
        Assert.Equal([1, 2], layers.Select(l => l.Number));
    }

    [Fact]
    public void Samples_outside_every_zone_enter_no_layer()
    {
        var layers = Build(Run(Zoned(Of("A", 0, 200), Of("B", 300)), LogsWith()));
        Assert.Equal([(0, 100), (300, 400)], Tops(layers));
    }

    // Thickness of the five samples: 50, 100, 100, 100, 50 m. Density 2000 and 2600 at the ends, 2200 between.
    [Fact]
    public void Means_are_weighted_by_true_vertical_thickness()
    {
        var layer = Assert.Single(Build(Run(Curve(Property.Density, 2000, 2200, 2200, 2200, 2600))));
        Assert.Equal(((50 * 2000.0) + (300 * 2200.0) + (50 * 2600.0)) / 400, layer.Mean(Property.Density), 1e-9);
    }

    [Fact]
    public void A_missing_value_leaves_the_mean_to_the_others()
    {
        var layer = Assert.Single(Build(Run(Curve(Property.Vs, 2400, Gap, 2400, 2400, 2400))));
        Assert.Equal(17.55e9, layer.Mean(Property.YoungsStatic), 1);
        Assert.True(double.IsNaN(layer.Mean(Property.Porosity)));
        Assert.Equal(LayerProfile.None, layer.Profile(Property.Ucs));
    }

    [Fact]
    public void Stresses_are_given_at_the_first_and_last_sample_that_has_one()
    {
        var layer = Assert.Single(Build(Run(Curve(Property.Vs, Gap, 2400, 2400, 2400, Gap))));
        var model = Run();
        var profile = layer.Profile(Property.MinHorizontalStress);
        Assert.Equal(model.Column(Property.MinHorizontalStress)[1], profile.Top, 1e-6);
        Assert.Equal(model.Column(Property.MinHorizontalStress)[3], profile.Base, 1e-6);
        Assert.Equal(model.Column(Property.MinHorizontalStress)[2], profile.Mean, 1e-6);
        Assert.Equal(0, layer.Profile(Property.VerticalStress).Top);
        Assert.True(double.IsNaN(layer.Profile(Property.MaxHorizontalStress).Mean));
    }

    [Fact]
    public void Contrasts_of_neighbours_are_opposite_and_end_at_the_outside()
    {
        var layers = Build(Run(Zoned(Of("A", 0), Of("B", 200), Of("C", 400)), LogsWith()));
        Assert.True(double.IsNaN(layers[0].ContrastAbove));
        Assert.True(double.IsNaN(layers[^1].ContrastBelow));
        for (var k = 1; k < layers.Count; k++)
        {
            Assert.Equal(-layers[k].ContrastAbove, layers[k - 1].ContrastBelow);
            Assert.True(layers[k - 1].ContrastBelow > 0); // Shmin grows with depth here
        }
    }

    [Fact]
    public void Thickness_without_horizontal_stress_is_not_measured() =>
        Assert.Equal(0.25, Assert.Single(Build(Run(Curve(Property.Vs, 2400, double.NaN, 2400, 2400, 2400)))).NotMeasured, 1e-12);

    [Fact]
    public void The_share_not_measured_is_a_share_of_thickness()
    {
        var setup = Setup with { Overburden = new OverburdenSettings { Gaps = Chosen(new DensityFill(DensityFillKind.Linear)) } };
        var logs = LogsWith(Curve(Property.Density, 2500, Gap, 2500, 2500, 2500));
        Assert.Equal(0.25, Assert.Single(Build(Run(setup, logs))).NotMeasured, 1e-12);
        Assert.Equal(0, Assert.Single(Build(Run())).NotMeasured);
    }

    [Fact]
    public void The_lithology_is_that_of_most_of_the_thickness()
    {
        static LithologyChoice Choice(string name, double facies) =>
            new(new LithologyRule(name, null, null, null, [facies], WellFile), new StageSettings());
        var setup = Setup with { Lithologies = [Choice("sand", 1), Choice("marl", 2)] };
        Assert.Equal("marl", Assert.Single(Build(Run(setup, LogsWith(Curve(Property.Facies, 1, 2, 2, 3, 1))))).Lithology); // two samples each, but half cells at the ends
        Assert.Equal("", Assert.Single(Build(Run(setup, LogsWith(Curve(Property.Facies, 3, 3, 3, 2, 1))))).Lithology);
    }

    // The hole climbs to and fro: vertical to 100 m, level at 200 m, down again at 300 m. The level sample stands in no layer,
    // whether it lies inside a zone, at its end or at its start.
    [Theory]
    [InlineData(150)]
    [InlineData(250)]
    public void Samples_left_out_leave_no_gap_between_layers(double border)
    {
        var trajectory = Bent(new(0, 0, 0), new(100, 0, 0), new(200, Math.PI / 2, 0), new(300, 0, 0), new(400, 0, 0));
        var layers = Build(Run(Zoned(Of("A", 0), Of("B", border)) with { Trajectory = trajectory }, LogsWith()));
        var middle = 100 + (200 / Math.PI); // halfway from 100 to 100 + 400/pi
        Assert.Equal([(0, middle), (middle, 200 + (400 / Math.PI))], Tops(layers), (a, b) => Math.Abs(a.Item1 - b.Item1) + Math.Abs(a.Item2 - b.Item2) < 1e-9);
        Assert.Equal(layers[0].BaseMd, layers[1].TopMd);
        Assert.Equal([2, 2], layers.Select(l => l.Samples));
    }

    [Fact]
    public void A_hole_that_climbs_at_a_split_keeps_every_thickness_positive()
    {
        var trajectory = Bent(new(0, 0, 0), new(100, 0, 0), new(150, 100 * Math.PI / 180, 0), new(250, 100 * Math.PI / 180, 0), new(300, 0, 0), new(500, 0, 0));
        double[] depths = [.. Enumerable.Range(0, 51).Select(i => 10.0 * i)];
        var n = depths.Length;
        var model = Run(
            Setup with { Trajectory = trajectory },
            Table(depths, Curve(Property.Vp, Same(4000, n)), Curve(Property.Vs, Same(2400, n)), Curve(Property.Density, Same(2500, n))));
        Assert.Contains(false, model.Usable);
        for (var most = 5; most < 200; most += 5)
        {
            var layers = Build(model, AtMost(most));
            Assert.All(layers, l => Assert.True(l.BaseTvd > l.TopTvd && l.BaseMd > l.TopMd));
            for (var k = 1; k < layers.Count; k++) Assert.Equal(layers[k - 1].BaseTvd, layers[k].TopTvd);
        }
    }

    [Theory]
    [InlineData(1000, new[] { 400.0 })]
    [InlineData(400, new[] { 400.0 })]
    [InlineData(250, new[] { 150.0, 400.0 })]
    [InlineData(210, new[] { 150.0, 250.0, 400.0 })]
    [InlineData(100, new[] { 50.0, 150.0, 250.0, 350.0, 400.0 })]
    [InlineData(1, new[] { 50.0, 150.0, 250.0, 350.0, 400.0 })]
    public void A_zone_thicker_than_allowed_is_split(double most, double[] bases) =>
        Assert.Equal(bases, Build(Run(), AtMost(most)).Select(l => l.BaseTvd));

    [Fact]
    public void A_zone_without_samples_gives_no_layer() =>
        Assert.Equal(["A", "C"], Build(Run(Zoned(Of("A", 0), Of("B", 210), Of("C", 290)), LogsWith())).Select(l => l.Zone));

    [Fact]
    public void Measured_edges_follow_the_hole()
    {
        var setup = Zoned(Of("A", 0), Of("B", 300)) with { Trajectory = Bent(new(0, Math.PI / 3, 0), new(1000, Math.PI / 3, 0)) };
        var layers = Build(Run(setup, LogsWith()));
        Assert.Equal(125, layers[0].BaseTvd, 1e-9); // 250 m at 60 deg
        Assert.Equal(250, layers[0].BaseMd, 1e-9);
        Assert.Equal(layers[0].BaseMd, layers[1].TopMd);
    }
}
