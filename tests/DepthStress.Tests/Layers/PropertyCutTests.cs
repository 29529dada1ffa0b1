using DepthStress.Core.Catalogue;
using DepthStress.Core.Depth;
using DepthStress.Core.Diagnostics;
using DepthStress.Core.Layers;
using DepthStress.Core.Logs;
using DepthStress.Core.Model;
using DepthStress.Core.Quantities;
using DepthStress.Core.Rock;
using static DepthStress.Tests.Model.SmallWell;

namespace DepthStress.Tests.Layers;

/// <summary>Cutting where properties change, on an invented well of 401 samples, 0.5 m apart: stiff from 80 to 130 m, soft elsewhere.</summary>
public class PropertyCutTests
{
    private const int Samples = 401;

    private static readonly LayerSettings Change = new() { Cut = Chosen(LayerCut.ChangeOfProperties) };

    private static double[] DepthsOf(int count) => [.. Enumerable.Range(0, count).Select(i => 0.5 * i)];

    /// <summary>Up to one per cent of scatter: the far digits of a sine look like chance.</summary>
    private static double Scatter(int i, double factor)
    {
        var digits = 43758.5 * Math.Sin(factor * (i + 1));
        return 1 + (0.02 * (digits - Math.Floor(digits) - 0.5));
    }

    private static LogTable Logs(Func<double, double> vp, int count = Samples, Func<double, bool>? gap = null) => Table(
        DepthsOf(count),
        Curve(Property.Vp, [.. DepthsOf(count).Select((z, i) => vp(z) * Scatter(i, 1.3))]),
        Curve(Property.Vs, [.. DepthsOf(count).Select((z, i) => gap?.Invoke(z) == true ? double.NaN : 0.6 * vp(z) * Scatter(i, 0.7))]),
        Curve(Property.Density, Same(2500, count)));

    private static double Stiff(double z) => z is >= 80 and < 130 ? 5000 : 4000;

    private static Zone Zone(string name, double top) => new(name, top, null, DepthKind.Measured, new StageSettings(), WellFile);

    private static EarthModel Model(params Zone[] zones) => Run(Setup with { Zones = zones }, Logs(Stiff));

    private static double[] Tops(LayerTable table) => [.. table.Layers.Select(l => l.TopTvd)];

    private static string[] Errors(EarthModel model, LayerSettings settings)
    {
        var diagnostics = new DiagnosticBag();
        Assert.Null(LayerBuilder.Build(model, settings, diagnostics));
        return [.. diagnostics.Items.Select(d => d.ToString())];
    }

    private static string[] Texts(LayerTable table) => [.. table.Findings.Select(f => UnitSystem.Metric.Show(f.Text))];

    [Fact]
    public void Boundaries_lie_where_the_moduli_change()
    {
        var table = Layered(Model(), Change);
        Assert.Equal([0, 79.75, 129.75], Tops(table)); // halfway between the samples
        Assert.Contains("[layers]: 3 layers, cut where youngs_static, poisson_static, shmin change", Texts(table));
    }

    [Fact]
    public void Zone_tops_and_boundaries_of_the_users_own_stay()
    {
        Assert.Equal([0, 49.75, 79.75, 129.75], Tops(Layered(Model(Zone("A", 0), Zone("B", 50)), Change)));
        var own = Change with { Boundaries = Chosen<IReadOnlyList<double>>([160, 20]), DepthKind = Chosen(DepthKind.Measured) };
        Assert.Equal([0, 19.75, 79.75, 129.75, 159.75], Tops(Layered(Model(), own)));
        Assert.Equal([0, 19.75, 159.75], Tops(Layered(Model(), own with { Cut = Chosen(LayerCut.Zones) })));
    }

    [Fact]
    public void A_boundary_outside_the_samples_is_refused() => Assert.Equal(
        ["well.toml(5,1): error: [layers]: found the boundary 250.0 m, expected depths that the samples of a layer lie on both sides of"],
        Errors(Model(), Change with { Boundaries = Chosen<IReadOnlyList<double>>([20, 250]), DepthKind = Chosen(DepthKind.Measured) }));

    // Shmin doubles from 100 to 200 m here; by its mean alone it would be chopped.
    [Fact]
    public void A_stress_that_grows_with_depth_is_not_chopped()
    {
        var model = Run(Setup, Logs(_ => 4000));
        var shmin = model.Column(Property.MinHorizontalStress);
        Assert.InRange(shmin[400] / shmin[200], 1.9, 2.1);
        Assert.Single(Layered(model, Change with { Curves = Chosen<IReadOnlyList<string>>(["shmin"]) }).Layers);
    }

    [Fact]
    public void A_wanted_count_is_met_where_the_misfit_falls_most()
    {
        Assert.Equal([0, 79.75, 129.75], Tops(Layered(Model(), Change with { Count = Chosen(3.0) })));
        Assert.Equal([0, 49.75, 79.75, 129.75], Tops(Layered(Model(Zone("A", 0), Zone("B", 50)), Change with { Count = Chosen(4.0) })));
        Assert.Equal(17, Layered(Model(Zone("A", 0), Zone("B", 50)), Change with { Count = Chosen(17.0) }).Layers.Count);
    }

    [Fact]
    public void A_count_that_cannot_be_had_is_refused_with_what_can()
    {
        var zones = Model(Zone("A", 0), Zone("B", 50), Zone("C", 100));
        Assert.Equal(
            ["well.toml(5,1): error: [layers]: found count = 2, expected at least 3: every zone, and every part of one between boundaries of your own, is a layer"],
            Errors(zones, Change with { Count = Chosen(2.0) }));
        Assert.Equal(
            ["well.toml(5,1): error: [layers]: found count = 2, expected at least 3: every zone, and every part of one between boundaries of your own, is a layer"],
            Errors(zones, new LayerSettings { Cut = Chosen(LayerCut.EqualThickness), Count = Chosen(2.0) }));
        // Edges lie at quarter metres: of 20.25 m and nine times 20 m the last would be 19.75 m thick.
        Assert.Equal(
            ["well.toml(5,1): error: [layers]: found count = 30, expected at most 9: that is what samples and least thickness allow"],
            Errors(Model(), Change with { Count = Chosen(30.0), MinThickness = Chosen(20.0) }));
        Assert.Equal(
            ["well.toml(5,1): error: [layers]: found count = 3, expected at least 5: fewer layers are thicker than max_thickness"],
            Errors(Model(), Change with { Count = Chosen(3.0), MaxThickness = Chosen(45.0) }));
        Assert.Equal(
            ["well.toml(5,1): error: [layers]: found count = 9, expected at most 5: that is what the samples allow"],
            Errors(Run(), new LayerSettings { Cut = Chosen(LayerCut.EqualThickness), Count = Chosen(9.0) }));
    }

    [Fact]
    public void Equal_layers_share_a_count_by_thickness()
    {
        var table = Layered(Model(Zone("A", 0), Zone("B", 50)), new LayerSettings { Cut = Chosen(LayerCut.EqualThickness), Count = Chosen(4.0) });
        Assert.Equal([0, 49.75, 99.75, 149.75], Tops(table));
    }

    [Theory]
    [InlineData(10, 20)]
    [InlineData(60, 130)]
    [InlineData(15, 45)]
    public void Layers_keep_the_limits_of_thickness(double least, double most)
    {
        var layers = Layered(Model(), Change with { MinThickness = Chosen(least), MaxThickness = Chosen(most) }).Layers;
        Assert.All(layers, l => Assert.InRange(l.BaseTvd - l.TopTvd, least - 1e-6, most + 1e-6)); // the room for rounding is 1e-9 of the limit
        Assert.Equal(200, layers.Sum(l => l.BaseTvd - l.TopTvd), 1e-9);
    }

    // Cells of 50, 100, 100, 100 and 50 m: a first layer of 150 m leaves 250 m, of which 200 m leave 50 m.
    [Fact]
    public void Samples_too_far_apart_for_the_limits_are_refused() => Assert.Equal(
        ["well.toml(5,1): error: [layers]: found samples too far apart between 0.0 m and 400.0 m measured depth for layers from 110.0 m to 230.0 m, expected limits further apart"],
        Errors(Run(), Change with { MinThickness = Chosen(110.0), MaxThickness = Chosen(230.0), Curves = Chosen<IReadOnlyList<string>>(["sv"]) }));

    [Fact]
    public void A_zone_thinner_than_the_least_thickness_stays_one_layer_and_is_said()
    {
        var table = Layered(Model(Zone("A", 0), Zone("B", 100), Zone("C", 104)), Change with { MinThickness = Chosen(10.0) });
        Assert.Equal([0, 79.75, 99.75, 103.75, 129.75], Tops(table));
        var finding = Assert.Single(table.Findings, f => UnitSystem.Metric.Show(f.Text).Contains("thinner than the least thickness", StringComparison.Ordinal));
        Assert.Equal((8, new DepthRange(100, 103.5)), (finding.Samples, finding.Where[0]));
    }

    // B is 4 m of stiff rock: it differs less from the stiff rock above it in A than from the soft rock below in C.
    [Fact]
    public void A_thin_layer_joins_the_neighbour_that_differs_less()
    {
        var settings = Change with { MinThickness = Chosen(10.0), ThinLayers = Chosen(ThinLayers.Merge) };
        var table = Layered(Model(Zone("A", 0), Zone("B", 126), Zone("C", 130)), settings);
        Assert.Equal([0, 79.75, 129.75], Tops(table));
        Assert.Equal(["A", "A", "C"], table.Layers.Select(l => l.Zone));
        Assert.Contains("[layers]: 1 layers too thin to stand alone joined the neighbour that differs less", Texts(table));
    }

    [Fact]
    public void Layers_do_not_join_across_a_boundary_of_the_users_own_nor_beyond_the_greatest_thickness()
    {
        var model = Model(Zone("A", 0), Zone("B", 126), Zone("C", 130));
        var settings = Change with { MinThickness = Chosen(10.0), ThinLayers = Chosen(ThinLayers.Merge) };
        var own = settings with { Boundaries = Chosen<IReadOnlyList<double>>([126]), DepthKind = Chosen(DepthKind.Measured) };
        Assert.Equal([0, 79.75, 125.75], Tops(Layered(model, own)));
        var most = Layered(model, settings with { MaxThickness = Chosen(48.0) });
        Assert.Contains(125.75, Tops(most));
        Assert.All(most.Layers, l => Assert.InRange(l.BaseTvd - l.TopTvd, 0, 48.0001)); // the room for rounding
    }

    [Fact]
    public void Missing_samples_carry_no_cost_and_their_share_is_shown()
    {
        var model = Run(Setup, Logs(Stiff, gap: z => z is >= 90 and < 100));
        var table = Layered(model, Change);
        Assert.Equal([0, 79.75, 129.75], Tops(table));
        Assert.Equal([0, 0.2, 0], table.Layers.Select(l => l.Missing), (a, b) => Math.Abs(a - b) < 1e-12); // 20 of 100 half metres
        Assert.Equal(
            ["well.toml(5,1): error: [layers]: found layer 2 from 79.8 m to 129.8 m measured depth with 20.0 % of its thickness without static moduli or Shmin, expected at most 15.0 %; fill or predict the logs, or cut thicker layers"],
            Errors(model, Change with { LargestMissingShare = Chosen(0.15) }));
        Assert.Equal(3, Layered(model, Change with { LargestMissingShare = Chosen(0.2000001) }).Layers.Count);
    }

    [Fact]
    public void A_curve_without_values_is_refused_when_named_and_said_when_not()
    {
        Assert.Equal(
            ["well.toml(5,1): error: [layers]: found the curve \"shmax\" without any value, expected curves that the run gives"],
            Errors(Model(), Change with { Curves = Chosen<IReadOnlyList<string>>(["youngs_static", "shmax"]) }));
        var blind = Run(Setup, Table(DepthsOf(Samples), Curve(Property.Vp, Same(4000, Samples)), Curve(Property.Density, Same(2500, Samples))));
        Assert.Equal(
            ["well.toml(1,1): error: [layers]: none of youngs_static, poisson_static, shmin has values, expected one to cut layers by; name others in curves"],
            Errors(blind, Change));
    }

    [Fact]
    public void Zones_without_samples_are_said()
    {
        var model = Run(Setup with { Zones = [Zone("A", 0), Zone("B", 210), Zone("C", 290)] }, LogsWith());
        Assert.Equal(["zone B has no samples: it gives no layer"], Texts(Layered(model, new LayerSettings())));
    }

    [Fact]
    public void Long_logs_are_averaged_first_and_it_is_said()
    {
        double[] own = [.. Enumerable.Range(1, 20).Select(k => 500.0 * k)];
        var table = Layered(
            Run(Setup, Logs(z => z < 5200.5 ? 4000 : 4100, 20_003)),
            Change with { MinThickness = Chosen(5.0), Boundaries = Chosen<IReadOnlyList<double>>(own), DepthKind = Chosen(DepthKind.Measured) });
        var inside = Assert.Single(Tops(table), t => t > 0 && !own.Contains(t + 0.25));
        Assert.Contains(inside, (double[])[5199.75, 5200.75]); // the change at 5200.25 m lies inside a cell
        Assert.Contains("[layers]: to find changes, every 2 neighbouring samples were averaged into one cell, so boundaries lie between those cells", Texts(table));
    }

    private static EarthModel Switched(double factor, Func<double, double> vp) => Run(
        Setup with
        {
            Zones =
            [
                Zone("A", 0),
                Zone("B", 80) with { Overrides = new StageSettings { Moduli = new ModuliSettings { StaticYoungs = Chosen(UserLaw.Linear(Property.YoungsStatic, Units.Gigapascal, DynamicModulus, factor, 0)) } } },
            ],
        },
        Logs(vp));

    [Fact]
    public void A_change_of_a_constant_is_what_the_user_says_of_the_rock()
    {
        var below = Zone("B", 80) with { Overrides = new StageSettings { Moduli = new ModuliSettings { StaticPoisson = Chosen(ConstantPoisson(0.35)) } } };
        var above = Zone("A", 0) with { Overrides = new StageSettings { Moduli = new ModuliSettings { StaticPoisson = Chosen(ConstantPoisson(0.2)) } } };
        Assert.Empty(Artefacts(Run(Setup with { Zones = [above, below] }, Logs(_ => 4000))));
    }

    private static IEnumerable<string> Artefacts(EarthModel model) => Texts(Layered(model, Change)).Where(t => t.Contains("artefact", StringComparison.Ordinal));

    // The zone above takes half the dynamic modulus. The stiff rock has (5/4)^2 = 1.56 times the modulus: of a step from 0.5 to
    // 0.8 x 1.56 = 1.25, the law makes 0.38 and the rock 0.37; from 0.5 to 0.6 x 1.56 the law makes 0.13 and the rock 0.31.
    [Fact]
    public void A_boundary_that_a_change_of_law_makes_is_called_an_artefact()
    {
        Assert.Single(Artefacts(Switched(0.8, _ => 4000)));
        Assert.Single(Artefacts(Switched(0.85, z => z < 80 ? 4000 : 5000)));
        Assert.Empty(Artefacts(Switched(0.6, z => z < 80 ? 4000 : 5000)));
        Assert.Empty(Artefacts(Switched(0.5, _ => 4000)));
    }
}
