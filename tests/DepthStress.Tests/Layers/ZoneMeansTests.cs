using DepthStress.Core.Depth;
using DepthStress.Core.Layers;
using DepthStress.Core.Logs;
using DepthStress.Core.Model;
using static DepthStress.Tests.Model.SmallWell;

namespace DepthStress.Tests.Layers;

/// <summary>Means of zones, all columns over the same samples.</summary>
public class ZoneMeansTests
{
    private const double G = 9.80665; // standard gravity, exact
    private const double Gap = double.NaN;

    private static Zone Of(string name, double top, double? bottom = null) => new(name, top, bottom, DepthKind.Measured, new StageSettings(), WellFile);

    private static double Mean(ZoneMeans zone, string column) => zone.Mean(DepthColumns.Get(column));

    // Shmin is missing at 300 m: Sv there must not enter either, or Shmin would be compared with the Sv of other depths.
    [Fact]
    public void Every_column_is_averaged_over_the_covered_samples_only()
    {
        var model = Run(Setup with { Zones = [Of("A", 100, 200), Of("B", 200)] }, LogsWith(Curve(Property.Vs, 2400, 2400, 2400, Gap, 2400)));
        var zones = ZoneMeans.Of(model);
        Assert.Equal([("A", 100.0, 1.0), ("B", 200.0, 2 / 3.0)], zones.Select(z => (z.Title, z.TopMd, z.Covered)));
        Assert.Equal(2500 * G * 300, Mean(zones[1], "sv"), 1); // 200 and 400 m
        Assert.Equal((model.Column(Property.MinHorizontalStress)[2] + model.Column(Property.MinHorizontalStress)[4]) / 2, Mean(zones[1], "shmin"), 1e-6);
        Assert.True(double.IsNaN(Mean(zones[1], "shmax")));
    }

    [Fact]
    public void Without_any_Shmin_all_samples_count()
    {
        var model = Run(Setup, Table(Depths, Curve(Property.Density, Same(2500))));
        var zone = Assert.Single(ZoneMeans.Of(model));
        Assert.Equal(("whole log", 0.0, 0.0), (zone.Title, zone.TopMd, zone.Covered));
        Assert.Equal(2500 * G * 200, Mean(zone, "sv"), 1);
    }

    [Fact]
    public void Samples_outside_the_zones_and_zones_without_samples_have_no_row() =>
        Assert.Equal(["B"], ZoneMeans.Of(Run(Setup with { Zones = [Of("A", 120, 180), Of("B", 200, 300)] }, LogsWith())).Select(z => z.Title));
}
