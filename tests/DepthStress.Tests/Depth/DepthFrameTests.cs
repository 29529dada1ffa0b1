using DepthStress.Core.Depth;

namespace DepthStress.Tests.Depth;

public class DepthFrameTests
{
    private static readonly DepthFrame Onshore = new(DatumKind.RotaryTable, 260, 250, null, 12);
    private static readonly DepthFrame Offshore = new(DatumKind.RotaryTable, 25, null, 140, null);

    // Whole metres throughout: sums are exact.
    [Fact]
    public void Onshore_depths_count_from_the_ground_and_the_water_table()
    {
        Assert.False(Onshore.IsOffshore);
        Assert.Equal(10, Onshore.SurfaceTvd, 0);
        Assert.Equal(10, Onshore.SolidTopTvd, 0);
        Assert.Equal(22, Onshore.HydrostaticTopTvd, 0);
        Assert.Equal(260, Onshore.SeaLevelTvd, 0);
        Assert.Equal(-250, Onshore.ToSubsea(10), 0);
        Assert.Equal(10, (Onshore with { WaterTableDepth = null }).HydrostaticTopTvd, 0);
    }

    [Fact]
    public void Offshore_depths_count_from_the_sea_surface_and_the_mudline()
    {
        Assert.True(Offshore.IsOffshore);
        Assert.Equal(25, Offshore.SurfaceTvd, 0);
        Assert.Equal(165, Offshore.SolidTopTvd, 0);
        Assert.Equal(25, Offshore.HydrostaticTopTvd, 0);
        Assert.Equal(140, Offshore.ToSubsea(165), 0);
    }

    [Theory]
    [InlineData(DepthReference.Datum, 0, 0)]
    [InlineData(DepthReference.Ground, 10, double.NaN)]
    [InlineData(DepthReference.SeaSurface, double.NaN, 25)]
    [InlineData(DepthReference.Mudline, double.NaN, 165)]
    public void A_reference_lies_where_the_well_has_it(DepthReference reference, double onshore, double offshore)
    {
        Assert.Equal(onshore, Onshore.TvdOf(reference), 0);
        Assert.Equal(offshore, Offshore.TvdOf(reference), 0);
        Assert.Equal(!double.IsNaN(onshore), Onshore.Has(reference));
        Assert.Equal(!double.IsNaN(offshore), Offshore.Has(reference));
    }

    [Fact]
    public void An_unknown_reference_is_a_fault() => Assert.Throws<ArgumentOutOfRangeException>(() => Onshore.TvdOf((DepthReference)9));

    [Fact]
    public void Subsea_depth_converts_there_and_back_and_keeps_missing_values()
    {
        Assert.Equal(1234, Onshore.FromSubsea(Onshore.ToSubsea(1234)), 0);
        Assert.True(double.IsNaN(Onshore.ToSubsea(double.NaN)));
        Assert.True(double.IsNaN(Onshore.FromSubsea(double.NaN)));
    }

    public static TheoryData<DepthFrame> Sound => new()
    {
        Onshore,
        Offshore,
        Onshore with { WaterTableDepth = null },
        new(DatumKind.Ground, 250, 250, null, 0),
        new(DatumKind.Ground, -400, -400, null, 0), // ground below sea level
        new(DatumKind.SeaLevel, 0, 250, null, 30), // depths above sea level are negative
        new(DatumKind.SeaLevel, 0, null, 140, null),
    };

    [Theory]
    [MemberData(nameof(Sound))]
    public void A_sound_frame_has_no_problem(DepthFrame frame) => Assert.Empty(DepthFrame.Validate(frame));

    public static TheoryData<DepthFrame, string> Faulty => new()
    {
        { Onshore with { GroundElevation = null }, "found neither a ground elevation nor a water depth, expected one of them" },
        { Onshore with { WaterDepth = 5 }, "found both a ground elevation and a water depth, expected one of them" },
        { Onshore with { GroundElevation = 260.5 }, "found a ground elevation of 260.5 m, expected at most the datum elevation of 260 m" },
        { Onshore with { Datum = DatumKind.Ground }, "found a ground elevation of 250 m, expected the datum elevation of 260 m because the datum is the ground" },
        { Onshore with { Datum = DatumKind.SeaLevel }, "found a datum elevation of 260 m, expected 0 m because the datum is sea level" },
        { Onshore with { WaterTableDepth = -2 }, "found a water table depth of -2 m, expected 0 m or more below ground" },
        { Offshore with { WaterDepth = -140 }, "found a water depth of -140 m, expected 0 m or more" },
        { Offshore with { DatumElevation = -25 }, "found a datum elevation of -25 m, expected 0 m or more in a well with a water depth" },
        { Offshore with { Datum = DatumKind.Ground }, "found the ground as datum of a well with a water depth, expected the rotary table or sea level" },
        { Offshore with { WaterTableDepth = 3 }, "found a water table depth of 3 m with a water depth, expected it onshore only" },
        { Onshore with { DatumElevation = double.NaN }, "found a datum elevation of NaN, expected a finite number" },
        { Onshore with { GroundElevation = double.PositiveInfinity }, "found a ground elevation of Infinity, expected a finite number" },
        { Offshore with { WaterDepth = double.NaN }, "found a water depth of NaN, expected a finite number" },
        { Onshore with { WaterTableDepth = double.NaN }, "found a water table depth of NaN, expected a finite number" },
    };

    [Theory]
    [MemberData(nameof(Faulty))]
    public void What_is_wrong_with_a_frame_is_said(DepthFrame frame, string problem) => Assert.Equal([problem], DepthFrame.Validate(frame));

    [Fact]
    public void Every_problem_is_reported_in_one_go() =>
        Assert.Equal(3, DepthFrame.Validate(Onshore with { GroundElevation = 300, WaterTableDepth = -1, WaterDepth = -2 }).Count);
}
