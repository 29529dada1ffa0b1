using CsCheck;
using DepthStress.Core.Depth;
using static DepthStress.Tests.Depth.Surveys;

namespace DepthStress.Tests.Depth;

public class TieInTests
{
    private const double Rounding = 1e-9; // at some kilometres

    /// <summary>A point of the hole whose straight line from the datum is at most 66 deg steep.</summary>
    private static readonly Gen<TieIn> AnyTieIn = Gen.Select(Gen.Double[10, 2000], Gen.Double[0.4, 1], (md, share) => new TieIn(md, md * share));

    // 1500 m along, 1200 m down: 900 m out (3-4-5 triangle).
    [Fact]
    public void Above_the_tie_in_the_hole_is_straight_from_the_datum()
    {
        var path = Tied(new(1500, 1200), Station(1500, 30, 90), Station(1600, 30, 90));
        var half = path.At(750);
        Assert.Equal(600, half.TrueVerticalDepth, Rounding);
        Assert.Equal(450, half.East, Rounding);
        Assert.Equal(0.8, Math.Cos(half.Inclination), 1e-12); // rounding
        var tie = path.At(1500);
        Assert.Equal(1200, tie.TrueVerticalDepth, 0); // as given
        Assert.Equal(900, tie.East, Rounding);
        Assert.Equal(1200 + (100 * Math.Sqrt(0.75)), path.At(1600).TrueVerticalDepth, Rounding); // 100 cos 30 deg
        Assert.Equal(950, path.At(1600).East, Rounding);
        Assert.Equal(-5, path.At(-5).TrueVerticalDepth, 0); // above the datum: vertical
    }

    [Fact]
    public void A_first_station_below_the_tie_in_is_reached_in_its_own_direction()
    {
        var path = Tied(new(1000, 900), Station(1200, 60, 0), Station(1300, 60, 0));
        Assert.Equal(900, path.At(1000).TrueVerticalDepth, 0); // as given
        Assert.Equal(950, path.At(1100).TrueVerticalDepth, Rounding); // 100 cos 60 deg
        Assert.Equal(1000, path.At(1200).TrueVerticalDepth, Rounding);
        Assert.Equal(1050, path.At(1300).TrueVerticalDepth, Rounding);
    }

    [Fact]
    public void A_vertical_tie_in_changes_nothing() =>
        Surveys.Descending.Sample(stations =>
        {
            var (plain, tied) = (Path(stations), Tied(new(stations[0].MeasuredDepth, stations[0].MeasuredDepth), stations));
            for (var md = 0.0; md < plain.LastStation + 50; md += 7.3)
                Assert.Equal(plain.At(md).TrueVerticalDepth, tied.At(md).TrueVerticalDepth, Rounding);
        });

    [Fact]
    public void Depth_leads_back_to_measured_depth_and_filling_gives_the_single_points() =>
        Gen.Select(Surveys.Descending, AnyTieIn, Gen.Double[0, 1].Array[1, 30]).Sample((stations, tieIn, shares) =>
        {
            var path = Tied(tieIn, Array.ConvertAll(stations, s => s with { MeasuredDepth = s.MeasuredDepth + tieIn.MeasuredDepth }));
            var md = Array.ConvertAll(shares, s => s * (path.LastStation + 100));
            foreach (var depth in md) Assert.Equal(depth, path.MeasuredDepthAt(path.At(depth).TrueVerticalDepth), 1e-8); // rounding over cos 75 deg
            FillEqualsAt(path, md);
        });

    [Fact]
    public void A_station_above_the_tie_in_is_a_problem()
    {
        List<(int Station, string Problem)> problems = [];
        Assert.False(Trajectory.TryCreate([Station(1200, 5, 0)], new TieIn(1500, 1480), out _, problems, []));
        Assert.Equal([(0, "found measured depth 1200 m above the tie-in at 1500 m, expected none above it")], problems);
    }

    [Theory]
    [InlineData(1500, 1500.1)]
    [InlineData(1500, 0)]
    [InlineData(double.NaN, 5)]
    [InlineData(double.PositiveInfinity, 5)]
    public void A_tie_in_that_no_hole_can_have_is_refused(double md, double tvd) =>
        Assert.Throws<ArgumentException>("tieIn", () => Trajectory.TryCreate([Station(2000, 5, 0)], new TieIn(md, tvd), out _, [], []));

    [Fact]
    public void A_slanted_first_station_needs_no_note_with_a_tie_in()
    {
        List<(int Station, string Note)> notes = [];
        Assert.True(Trajectory.TryCreate([Station(100, 30, 0)], new TieIn(100, 95), out _, [], notes));
        Assert.Empty(notes);
    }
}
