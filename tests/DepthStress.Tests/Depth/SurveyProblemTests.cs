using DepthStress.Core.Depth;
using static DepthStress.Tests.Depth.Surveys;

namespace DepthStress.Tests.Depth;

public class SurveyProblemTests
{
    private static readonly SurveyStation Top = Station(0, 0, 0);

    public static TheoryData<SurveyStation[], int, string> Faulty => new()
    {
        { [], 0, "found no survey station, expected one at least" },
        { [Top, Station(30, -1, 0)], 1, "found an inclination of -1 deg, expected 0 to 180 deg" },
        { [Top, Station(30, 180.5, 5), Station(60, 150, 5)], 1, "found an inclination of 180.5 deg, expected 0 to 180 deg" },
        { [Station(30.48, 0, 0), Station(30.48, 1, 0)], 1, "found measured depth 30.48 m equal to that of the station before (30.48 m), expected a greater one" },
        { [Station(60.96, 0, 0), Station(30.48, 1, 0)], 1, "found measured depth 30.48 m above that of the station before (60.96 m), expected a greater one" },
        { [Top, new(double.NaN, 0, 0)], 1, "found the measured depth NaN, expected a finite number" },
        { [Top, new(30, double.NaN, 0)], 1, "found the inclination NaN, expected a finite number" },
        { [Top, new(30, 0, double.PositiveInfinity)], 1, "found the azimuth Infinity, expected a finite number" },
        { [Station(-30, 0, 0), Top], 0, "found a measured depth of -30 m, expected 0 m or more" },
        { [Station(0, 90, 0), Station(30, 90, 180)], 1, "found a hole that turns back on itself since the station before, expected a turn of less than 180 deg" },
        { [Top, Station(30, 180, 77)], 1, "found a hole that turns back on itself since the station before, expected a turn of less than 180 deg" },
    };

    [Theory]
    [MemberData(nameof(Faulty))]
    public void What_is_wrong_is_said_with_the_station(SurveyStation[] stations, int station, string text)
    {
        List<(int Station, string Problem)> problems = [];
        List<(int Station, string Note)> notes = [];
        Assert.False(Trajectory.TryCreate(stations, out var trajectory, problems, notes));
        Assert.Null(trajectory);
        Assert.Equal([(station, text)], problems);
        Assert.Empty(notes);
    }

    [Fact]
    public void Every_problem_is_reported_in_one_go()
    {
        List<(int Station, string Problem)> problems = [];
        Assert.False(Trajectory.TryCreate([Station(10, -1, 0), Station(10, 5, 0), Station(5, 200, double.NaN)], out _, problems, []));
        Assert.Equal([0, 1, 2, 2, 2], problems.Select(p => p.Station));
    }

    [Fact]
    public void Earlier_entries_of_the_lists_are_left_alone()
    {
        List<(int Station, string Problem)> problems = [(7, "of another survey")];
        Assert.True(Trajectory.TryCreate([Top], out _, problems, []));
        Assert.Equal([(7, "of another survey")], problems);
    }

    [Fact]
    public void A_slanted_first_station_below_the_datum_is_noted()
    {
        List<(int Station, string Note)> notes = [];
        Assert.True(Trajectory.TryCreate([Station(100, 1.5, 0)], out _, [], notes));
        Assert.Equal(
            [(0, "found an inclination of 1.5 deg at the first station, measured depth 100 m, below a hole that is taken as vertical")], notes);
        notes.Clear();
        Assert.True(Trajectory.TryCreate([Station(100, 0.9, 0)], out _, [], notes));
        Assert.True(Trajectory.TryCreate([Station(0, 30, 0)], out _, [], notes));
        Assert.Empty(notes);
    }
}
