using SampleWell.Hidden;
using static SampleWell.Writing.FixedText;

namespace SampleWell.Writing;

/// <summary>Makes the tests that the well has seen: the truth of each interval with the error of its kind of test.</summary>
/// <param name="truth">The hidden truth.</param>
/// <param name="intervals">Where tests can be made.</param>
/// <param name="noise">Seed of the errors.</param>
/// <param name="asStated">True for errors as large as their rows state; else they are somewhat smaller, as careful users state them.</param>
internal sealed class Observations(Truth truth, TestIntervals intervals, ulong noise, bool asStated = false)
{
    private const double MudAbove = 1060;
    private const double MudBelow = 1250;
    private readonly Draws draws = new(noise, "tests");
    private readonly List<Observation> rows = [];

    /// <summary>Every test, from the shoes down.</summary>
    public IReadOnlyList<Observation> All()
    {
        var plan = truth.Plan;
        LeakOff(plan.FirstMd + 0.5, "2023-05-02", "below the 13 3/8 in shoe");
        LeakOff(2105.5, "2023-07-19", "below the 9 5/8 in shoe");
        Integrity(2105.5, plan.Formations[4].Top + 30, "2023-08-01");
        Closure(1, 3, 0.90, "stiff clean sand");
        Closure(1, 3, 0.25, "shaly sand");
        Closure(2, 4, 0.70, "marl");
        Closure(3, 3, 0.20, "soft shale");
        Closure(4, 3, 0.95, "tight limestone", atSurface: true);
        Closure(4, 3, 0.15, "porous limestone", atSurface: true);
        Closure(4, 4, 0.60, "limestone");
        Closure(5, 3, 0.40, "deep shale");
        foreach (var (formation, rank, kind) in new[] { (1, 0.95, "md"), (1, 0.80, "md"), (4, 0.95, "md"), (4, 0.85, "tvd"), (5, 0.98, "md") })
            FormationPressure(formation, rank, kind);
        Breakdown(0.85);
        Breakdown(0.55);
        Breakouts();
        return rows;
    }

    /// <summary>An error of one size or, as stated, of another.</summary>
    private double Error(double size, double stated) => (asStated ? stated : size) * draws.Normal();

    private double Stiffness(double top, double bottom) => Mean(truth.StaticHorizontal, top, bottom);

    private double Mean(double[] values, double top, double bottom) => truth.Grid.Mean(values, top, bottom);

    private string Mpa(double value) => Quantity(value, 2, "MPa");

    private void Closure(int formation, double length, double rank, string note, bool atSurface = false)
    {
        var (top, bottom) = intervals.Ranked(formation, length, rank, Stiffness);
        var value = Mean(truth.Shmin, top, bottom) + Error(0.45, 0.5);
        var column = Physics.ColumnMpa(1020, truth.Plan.Path.Tvd((top + bottom) / 2));
        var shown = atSurface ? Mpa(value - column) : Mpa(value);
        rows.Add(new(top, bottom, "md", "closure", shown, atSurface ? "surface" : "downhole", atSurface ? "1.02 g/cm3" : "", "0.5 MPa", "",
            "2023-10-04", note));
    }

    private void LeakOff(double top, string date, string note)
    {
        intervals.Reserve(top, top + 4);
        var value = Mean(truth.Shmin, top, top + 4) * draws.Between(1.02, 1.06);
        var mud = top < truth.Plan.Splice ? MudAbove : MudBelow;
        var surface = value - Physics.ColumnMpa(mud, truth.Plan.Path.Tvd(top + 2));
        rows.Add(new(top, top + 4, "md", "leak-off", Mpa(surface), "surface", Quantity(mud / 1000, 2, "g/cm3"), "0.4 MPa", "", date, note));
    }

    /// <summary>Pumped to well below the lowest closure pressure of the open hole, without any sign of leak-off.</summary>
    private void Integrity(double top, double bottom, string date)
    {
        var lowest = double.MaxValue;
        for (var md = top; md < bottom; md += 0.5)
            lowest = Math.Min(lowest, truth.Grid.At(truth.Shmin, md));
        var surface = 0.93 * lowest - Physics.ColumnMpa(MudBelow, truth.Plan.Path.Tvd(top));
        rows.Add(new(top, bottom, "md", "integrity", Mpa(surface), "surface", Quantity(MudBelow / 1000, 2, "g/cm3"), "0.4 MPa", "", date,
            "open hole to the top of the limestone; stopped without leak-off"));
    }

    private void FormationPressure(int formation, double rank, string kind)
    {
        var (top, bottom) = intervals.Ranked(formation, 1, rank, (a, b) => -truth.Grid.Mean(truth.Rock.ShaleVolume, a, b));
        var value = Mean(truth.Pore, top, bottom) + Error(0.1, 0.15);
        var depths = kind == "md" ? (top, bottom) : (truth.Plan.Path.Tvd(top), truth.Plan.Path.Tvd(bottom));
        rows.Add(new(depths.Item1, depths.Item2, kind, "formation-pressure", Mpa(value), "downhole", "", "0.15 MPa", "", "2023-09-15",
            "wireline tester; good mobility"));
    }

    /// <summary>Small fracturing tests in the vertical part of the sand: both horizontal stresses and the strength of the rock.</summary>
    private void Breakdown(double rank)
    {
        var (top, bottom) = intervals.Ranked(truth.Plan.Formations[1].Top + 3, truth.Plan.Path.KickOff, 1.5, rank, Stiffness);
        var pore = Mean(truth.Pore, top, bottom);
        var value = 3 * Mean(truth.Shmin, top, bottom) - Mean(truth.Shmax, top, bottom) - pore + Mean(truth.Strength, top, bottom) / 10
            + Error(0.5, 0.6);
        rows.Add(new(top, bottom, "md", "breakdown", Mpa(value), "downhole", "", "0.6 MPa", Mpa(pore), "2023-05-20",
            "small fracturing test between packers; vertical hole"));
    }

    private void Breakouts()
    {
        var wall = new HoleWall(truth, MudAbove);
        foreach (var (top, bottom) in intervals.Within(
            truth.Grid.Md[0] + 6, truth.Plan.Path.KickOff, 1, 3, (a, b) => wall.BreakoutWidth(a, b) is > 18 and < 100))
        {
            var value = wall.BreakoutWidth(top, bottom) + Error(4, 6);
            rows.Add(new(top, bottom, "md", "breakout-width", Quantity(value, 0, "deg"), "", Quantity(MudAbove / 1000, 2, "g/cm3"), "6 deg", "",
                "2023-05-18", "acoustic image; full opening angle of one side; vertical hole"));
        }
    }
}
