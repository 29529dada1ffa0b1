using CsCheck;
using DepthStress.Core.Depth;
using DepthStress.Core.Layers;
using DepthStress.Core.Logs;
using DepthStress.Core.Model;
using static DepthStress.Tests.Model.SmallWell;

namespace DepthStress.Tests.Layers;

public class LayerProperties
{
    private static readonly Gen<EarthModel> Models =
        Gen.Select(Gen.Double[0.1, 3].Array[4, 60], Gen.Double[2000, 2900].Array[61], Gen.Double[0, 1].Array[3], Gen.Bool).Select((steps, density, tops, zoned) =>
        {
            var depths = new double[steps.Length + 1];
            for (var i = 0; i < steps.Length; i++) depths[i + 1] = depths[i] + steps[i];
            var n = depths.Length;
            var zones = tops.Order().Select((t, k) => new Zone($"Z{(char)('A' + k)}", k == 0 ? 0 : t * depths[^1], null, DepthKind.Measured, new StageSettings(), WellFile));
            return Run(
                Setup with { Zones = zoned ? [.. zones] : [] },
                Table(depths, Curve(Property.Vp, Same(4000, n)), Curve(Property.Vs, Same(2400, n)), Curve(Property.Density, density[..n])));
        });

    private static readonly Gen<(EarthModel Model, LayerSettings Settings, double Most)> Cases =
        Gen.Select(Models, Gen.Double[0.2, 40]).Select((model, most) => (model, AtMost(most), most));

    private static double LongestCell(EarthModel model)
    {
        var tvd = model.Column(Property.TrueVerticalDepth);
        return Enumerable.Range(0, tvd.Length).Max(i => 0.5 * (tvd[Math.Min(i + 1, tvd.Length - 1)] - tvd[Math.Max(i - 1, 0)]));
    }

    [Fact]
    public void Layers_tile_the_column_and_hold_every_sample_once() => Cases.Sample(c =>
    {
        var layers = Layered(c.Model, c.Settings).Layers;
        Assert.Equal(c.Model.Column(Property.TrueVerticalDepth)[0], layers[0].TopTvd);
        Assert.Equal(c.Model.Column(Property.TrueVerticalDepth)[^1], layers[^1].BaseTvd);
        for (var k = 1; k < layers.Count; k++)
        {
            Assert.Equal(layers[k - 1].BaseTvd, layers[k].TopTvd);
            Assert.Equal(layers[k - 1].BaseMd, layers[k].TopMd);
            Assert.Equal(-layers[k].ContrastAbove, layers[k - 1].ContrastBelow);
        }

        Assert.Equal(c.Model.Count, layers.Sum(l => l.Samples));
        Assert.Equal(Enumerable.Range(1, layers.Count), layers.Select(l => l.Number));
    });

    [Fact]
    public void No_layer_of_several_samples_is_thicker_than_allowed() => Cases.Sample(c =>
    {
        foreach (var layer in Layered(c.Model, c.Settings).Layers)
            Assert.True(layer.Samples == 1 || layer.BaseTvd - layer.TopTvd <= c.Most * (1 + 1e-9));
    });

    // Where samples are dense against the limit, the number of layers is what the thickness asks for, or little more.
    [Fact]
    public void Layers_are_not_cut_needlessly() => Cases.Sample(c =>
    {
        var cell = LongestCell(c.Model);
        if (c.Most <= 2 * cell) return;
        foreach (var zone in Layered(c.Model, c.Settings).Layers.GroupBy(l => l.Zone))
        {
            var thickness = zone.Last().BaseTvd - zone.First().TopTvd;
            Assert.InRange(zone.Count(), 1, Math.Max(1, Math.Ceiling(thickness / (c.Most - cell))));
        }
    });

    // Identity of means; the sums run in another order: 1e-12.
    [Fact]
    public void The_mean_of_the_layers_is_the_mean_of_the_whole() => Cases.Sample(c =>
    {
        var layers = Layered(c.Model, c.Settings).Layers;
        var whole = Layered(c.Model with { Setup = c.Model.Setup with { Zones = [] }, Zones = [.. Enumerable.Repeat(ZoneIndex.None, c.Model.Count)] }, new LayerSettings()).Layers[0];
        foreach (var property in new[] { Property.Density, Property.VerticalStress, Property.MinHorizontalStress })
        {
            double Value(Layer l) => property == Property.Density ? l.Mean(property) : l.Profile(property).Mean;
            var sum = layers.Where(l => l.BaseTvd > l.TopTvd).Sum(l => Value(l) * (l.BaseTvd - l.TopTvd));
            Assert.Equal(Value(whole), sum / (whole.BaseTvd - whole.TopTvd), 1e-12 * Math.Abs(Value(whole)) * 10);
        }
    });
}
