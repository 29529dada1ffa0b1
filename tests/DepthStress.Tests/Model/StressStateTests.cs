using DepthStress.Core.Depth;
using DepthStress.Core.Logs;
using DepthStress.Core.Model;

namespace DepthStress.Tests.Model;

public class StressStateTests
{
    private static Zone Zone(string name, double top, bool target) =>
        new(name, top, null, DepthKind.Measured, new StageSettings(), SmallWell.WellFile) { Target = target };

    private static EarthModel With(Zone[] zones, params Curve[] replaced) =>
        SmallWell.Run(SmallWell.Setup with { Zones = zones }, SmallWell.LogsWith(replaced));

    private static double[] Depths(EarthModel model) => [.. StressState.Chosen(model).Select(s => s.MeasuredDepth)];

    [Fact]
    public void Without_targets_the_middle_of_the_profile_is_shown() => Assert.Equal([200], Depths(With([])));

    [Fact]
    public void Each_target_zone_is_shown_at_its_middle()
    {
        Assert.Equal([0, 300], Depths(With([Zone("a", 0, true), Zone("b", 100, false), Zone("c", 200, true)])));
        Assert.Equal(["a", "c"], StressState.Chosen(With([Zone("a", 0, true), Zone("b", 100, false), Zone("c", 200, true)])).Select(s => s.Zone));
    }

    [Fact]
    public void Where_the_middle_has_no_Shmin_the_nearest_sample_with_one_stands_for_it() =>
        Assert.Equal([300], Depths(With([], SmallWell.Curve(Property.Vp, 4000, double.NaN, double.NaN, 4000, 4000))));

    [Fact]
    public void A_target_zone_without_samples_is_left_out() =>
        Assert.Equal([200], Depths(With([Zone("a", 0, false), Zone("deep", 900, true)])));

    [Fact]
    public void A_named_depth_is_met_by_its_nearest_sample_and_only_within_the_log()
    {
        var model = With([]);
        Assert.Equal(100, StressState.At(model, 130, DepthKind.Measured)!.MeasuredDepth);
        Assert.Equal(200, StressState.At(model, 160, DepthKind.TrueVerticalSubsea)!.MeasuredDepth);
        Assert.Null(StressState.At(model, 400.1, DepthKind.Measured));
        Assert.Null(StressState.At(model, -0.1, DepthKind.TrueVertical));
        Assert.Equal(0.6, StressState.At(model, 130, DepthKind.Measured)!.Friction);
    }
}
