using DepthStress.Core.Depth;
using DepthStress.Core.Model;
using static DepthStress.Tests.Model.SmallWell;

namespace DepthStress.Tests.Model;

public class ZoneIndexTests
{
    private static Zone Of(string name, double top, double? bottom = null, DepthKind kind = DepthKind.Measured) =>
        new(name, top, bottom, kind, new StageSettings(), WellFile);

    private static short[] Fill(WellSetup setup, params double[] depths)
    {
        var index = new short[depths.Length];
        ZoneIndex.Fill(setup, depths, index);
        return index;
    }

    private static WellSetup With(params Zone[] zones) => Setup with { Zones = zones };

    [Fact]
    public void A_sample_on_a_top_belongs_to_the_zone_below_it() =>
        Assert.Equal([-1, 0, 0, 1, 1], Fill(With(Of("A", 100), Of("B", 300)), Depths));

    [Fact]
    public void A_base_ends_a_zone_and_belongs_to_nobody() =>
        Assert.Equal([-1, 0, -1, 1, 1], Fill(With(Of("A", 100, 200), Of("B", 300)), Depths));

    [Fact]
    public void Depths_below_sea_level_count_from_the_sea()
    {
        var setup = With(Of("A", 75, null, DepthKind.TrueVerticalSubsea)) with { Frame = Sea };
        Assert.Equal([-1, 0], Fill(setup, 99.9, 100));
    }

    // Vertical to 100 m, then 60 deg from 100 m on: 200 m tvd lies at 100 + 100 / cos(60 deg) = 300 m md (the arc is left out by
    // putting the turn into one metre: within half a metre).
    [Fact]
    public void True_vertical_tops_follow_the_hole()
    {
        var setup = With(Of("A", 200, null, DepthKind.TrueVertical)) with
        {
            Trajectory = Bent(new(0, 0, 0), new(99.5, 0, 0), new(100.5, Math.PI / 3, 0), new(1000, Math.PI / 3, 0)),
        };
        Assert.Equal(300, ZoneIndex.ToMeasured(setup, 200, DepthKind.TrueVertical), 0.5);
        Assert.Equal(200, ZoneIndex.ToVertical(setup, 300, DepthKind.Measured), 0.25);
        Assert.Equal([-1, 0], Fill(setup, 299, 301));
    }

    [Fact]
    public void A_zone_below_the_deepest_point_of_the_hole_has_no_samples()
    {
        var setup = With(Of("A", 50), Of("B", 500, null, DepthKind.TrueVertical)) with
        {
            Trajectory = Bent(new(0, 0, 0), new(100, Math.PI / 2, 0), new(1000, Math.PI / 2, 0)),
        };
        Assert.True(double.IsNaN(ZoneIndex.ToMeasured(setup, 500, DepthKind.TrueVertical)));
        Assert.Equal([-1, 0, 0], Fill(setup, 0, 50, 900));
    }

    [Fact]
    public void Without_zones_no_sample_has_one() => Assert.Equal([-1, -1], Fill(Setup, 0, 1));

    [Fact]
    public void A_table_depth_of_any_kind_turns_vertical()
    {
        var setup = Setup with { Frame = Sea };
        Assert.Equal(100, ZoneIndex.ToVertical(setup, 100, DepthKind.Measured));
        Assert.Equal(100, ZoneIndex.ToVertical(setup, 100, DepthKind.TrueVertical));
        Assert.Equal(125, ZoneIndex.ToVertical(setup, 100, DepthKind.TrueVerticalSubsea));
    }
}
