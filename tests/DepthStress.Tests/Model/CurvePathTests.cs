using DepthStress.Core.Diagnostics;
using DepthStress.Core.Logs;
using DepthStress.Core.Model;
using DepthStress.Core.Pressure;
using DepthStress.Core.Quantities;
using static DepthStress.Tests.Model.SmallWell;

namespace DepthStress.Tests.Model;

/// <summary>A path that follows a depth curve of the logs, and depth curves held against the path.</summary>
public sealed class CurvePathTests
{
    private const double Rounding = 1e-9; // at some hundred metres

    /// <summary>Every 20 m from 20 m to 400 m: vertical to 200 m, then 60 deg from the vertical.</summary>
    private static readonly double[] Md = [.. Enumerable.Range(1, 20).Select(i => 20.0 * i)];

    private static WellSetup Setup { get; } =
        SmallWell.Setup with { Overburden = new OverburdenSettings { AboveLog = Chosen(ShallowDensity.Mean(2000.0)) } };

    private static double[] Bends => [.. Md.Select(md => md <= 200 ? md : 200 + ((md - 200) / 2))];

    private static LogTable Logs(double[] md, params Curve[] curves) => Table(
        md, [Curve(Property.Vp, Same(4000, md.Length)), Curve(Property.Vs, Same(2400, md.Length)), Curve(Property.Density, Same(2500, md.Length)), .. curves]);

    private static WellSetup Following(Property property, WellSetup? setup = null) => (setup ?? Setup) with { PathCurve = Chosen(property) };

    private static string[] Problems(double[] md, double[] tvd) =>
        Errors(Following(Property.LoggedVerticalDepth), Logs(md, Curve(Property.LoggedVerticalDepth, tvd)));

    [Fact]
    public void The_path_follows_true_vertical_depth()
    {
        var model = Run(Following(Property.LoggedVerticalDepth), Logs(Md, Curve(Property.LoggedVerticalDepth, Bends)));
        Assert.All(Bends.Zip(model.Column(Property.TrueVerticalDepth)), p => Assert.Equal(p.First, p.Second, Rounding));
        Assert.Equal(60, model.Column(Property.Inclination)[15] * 180 / Math.PI, Rounding);
        Assert.Equal(240, model.Setup.Trajectory.MeasuredDepthAt(220), Rounding);
        Assert.Contains(
            "the path of the hole follows the curve test, read as true vertical depth below the datum; above its first value at 20.0 m measured depth the hole is taken as straight from the datum",
            model.Texts());
    }

    [Theory]
    [InlineData(-1, "height above sea level, negative below it")]
    [InlineData(1, "depth below sea level, positive downwards")]
    public void A_vertical_position_may_count_either_way_from_sea_level(int sign, string reading)
    {
        // The datum lies 25 m above the sea.
        var position = Array.ConvertAll(Bends, tvd => sign * (tvd - 25));
        var model = Run(Following(Property.LoggedVerticalPosition, Setup with { Frame = Sea }), Logs(Md, Curve(Property.LoggedVerticalPosition, position)));
        Assert.All(Bends.Zip(model.Column(Property.TrueVerticalDepth)), p => Assert.Equal(p.First, p.Second, Rounding));
        Assert.Contains(model.Texts(), t => t.Contains($"read as {reading};", StringComparison.Ordinal));
    }

    [Fact]
    public void High_above_the_sea_the_sign_is_the_one_that_keeps_the_hole_below_its_datum()
    {
        var frame = new Core.Depth.DepthFrame(Core.Depth.DatumKind.Ground, 900, 900, null, null);
        var model = Run(
            Following(Property.LoggedVerticalPosition, Setup with { Frame = frame }),
            Logs(Md, Curve(Property.LoggedVerticalPosition, Array.ConvertAll(Bends, tvd => 900 - tvd))));
        Assert.All(Bends.Zip(model.Column(Property.TrueVerticalDepth)), p => Assert.Equal(p.First, p.Second, Rounding));
    }

    [Fact]
    public void Gaps_are_bridged_by_a_straight_line()
    {
        double[] curve = [.. Bends];
        curve[13] = double.NaN; // at 280 m
        var model = Run(Following(Property.LoggedVerticalDepth), Logs(Md, Curve(Property.LoggedVerticalDepth, curve)));
        Assert.Equal(Bends[13], model.Column(Property.TrueVerticalDepth)[13], Rounding);
    }

    [Fact]
    public void Rounding_of_depths_does_not_become_inclination()
    {
        double[] md = [.. Enumerable.Range(1, 1000).Select(i => 0.15 * i)];
        var model = Run(Following(Property.LoggedVerticalDepth), Logs(md, Curve(Property.LoggedVerticalDepth, Array.ConvertAll(md, d => Math.Round(d, 2)))));
        Assert.All(model.Column(Property.Inclination), angle => Assert.InRange(angle * 180 / Math.PI, 0, 3)); // arc cosine of 1 - 0.01 m / 10 m is 2.6 deg
    }

    [Fact]
    public void A_curve_that_is_not_there_is_named() => Assert.Equal(
        ["well.toml(5,1): error: [survey] curve = \"true_vertical_depth\": found no such curve in the log files, expected one with a usual name, or its column in [logs.curves]: true_vertical_depth = \"...\""],
        Errors(Following(Property.LoggedVerticalDepth), Logs(Md)));

    [Fact]
    public void A_curve_that_no_hole_can_have_is_an_error_that_names_the_depth()
    {
        const string start = "well.toml(5,1): error: the curve test (true vertical depth below the datum): ";
        var feet = Array.ConvertAll(Bends, tvd => tvd / 0.3048);
        Assert.Equal([start + "found a true vertical depth of 65.62 m at 20.00 m measured depth, expected it above zero and no deeper than along the hole; are the datum elevation and the unit right?"], Problems(Md, feet));
        var jump = Bends;
        for (var i = 15; i < jump.Length; i++) jump[i] += 11;
        Assert.Equal([start + "found 21.00 m more true vertical depth from 300.00 m to 320.00 m measured depth, expected no more than along the hole"], Problems(Md, jump));
        double[] gap = [.. Bends];
        gap[3] = gap[4] = double.NaN;
        Assert.Equal([start + "found no value between 60.00 m and 120.00 m measured depth, expected gaps of at most 50 m"], Problems(Md, gap));
        Assert.Equal([start + "found no value below the datum, expected one at least"], Problems(Md, Same(double.NaN, Md.Length)));
    }

    [Fact]
    public void Zones_are_held_against_the_path_of_the_curve()
    {
        var setup = Following(Property.LoggedVerticalDepth) with { Zones = [new("deep", 250, null, Core.Depth.DepthKind.TrueVertical, new(), WellFile)] };
        var model = Run(setup, Logs(Md, Curve(Property.LoggedVerticalDepth, Bends)));
        Assert.Equal(14, Array.FindIndex(model.Zones, z => z == 0)); // 250 m down is 300 m along
        double[] level = [.. Md.Select(md => Math.Min(md, 200))];
        Assert.Equal(["well.toml(1,1): error: the hole never reaches the top of zone \"deep\""], Errors(setup, Logs(Md, Curve(Property.LoggedVerticalDepth, level))));
    }

    [Fact]
    public void A_depth_curve_that_differs_from_the_path_is_found_with_its_largest_difference()
    {
        var finding = Assert.Single(Run(Setup, Logs(Md, Curve(Property.LoggedVerticalDepth, Bends))).Findings, f => f.Severity == Severity.Warning && f.Text.Format.StartsWith("the curve", StringComparison.Ordinal));
        Assert.Equal(
            "the curve test, read as true vertical depth below the datum, differs from the path of the hole by up to 100.0 m, at 400.0 m measured depth",
            UnitSystem.Metric.Show(finding.Text));
        Assert.Equal((10, new DepthRange(220, 400)), (finding.Samples, Assert.Single(finding.Where)));
    }

    [Theory]
    [InlineData(0.69, false)]
    [InlineData(0.71, true)] // 0.5 m and a thousandth of 200 m
    public void Differences_within_half_a_metre_and_a_thousandth_are_let_pass(double difference, bool found)
    {
        double[] curve = [.. Md];
        curve[9] += difference;
        var texts = Run(Setup, Logs(Md, Curve(Property.LoggedVerticalDepth, curve))).Texts();
        Assert.Equal(found, texts.Contains($"the curve test, read as true vertical depth below the datum, differs from the path of the hole by up to 0.7 m, at 200.0 m measured depth"));
    }

    [Fact]
    public void The_other_depth_curve_is_held_against_the_path_of_the_first()
    {
        var logs = Logs(Md, Curve(Property.LoggedVerticalDepth, Bends), Curve(Property.LoggedVerticalPosition, Array.ConvertAll(Bends, tvd => 4 - tvd)));
        Assert.Contains(
            "the curve test, read as height above sea level, negative below it, differs from the path of the hole by up to 4.0 m, at 20.0 m measured depth",
            Run(Following(Property.LoggedVerticalDepth), logs).Texts());
    }
}
