using CsCheck;
using DepthStress.Core.Borehole;

namespace DepthStress.Tests.Borehole;

/// <summary>Breakouts: Barton, Zoback and Burns 1988, Geophys. Res. Lett. 15:467-470, and closed forms (self-computed).</summary>
public sealed class BreakoutReferenceTests
{
    private const double SixDigits = 0.51; // MPa are given with six decimals

    private static readonly double Angle = Math.Atan(0.6);

    private static double Rad(double degrees) => degrees * Math.PI / 180;

    [Theory]
    [InlineData(0, 71.5)]
    [InlineData(30, 73.461524)]
    [InlineData(60, 81.5)]
    [InlineData(90, 111.5)]
    public void SHmax_from_a_width(double width, double expected)
    {
        // Both forms agree without support.
        var barton = VerticalHole.ShmaxFromWidthUnconfined(Rad(width), 51.5e6, 31.5e6, 31.5e6, 100e6, 0);
        Assert.Equal(expected * 1e6, barton.Value, SixDigits);
        var supported = VerticalHole.ShmaxFromWidth(Rad(width), 51.5e6, 31.5e6, 31.5e6, 100e6, Angle, 0);
        Assert.Equal(expected * 1e6, supported.Value, SixDigits);
        // Hoop stress at the edge is the strength.
        var edge = Kirsch.At(0, barton.Value - 31.5e6, 20e6, 0.25, 0, (Math.PI - Rad(width)) / 2, 1);
        Assert.Equal(100e6, edge.Hoop, 1.0); // 15 digits of numbers of 1e8, differences of them
    }

    [Fact]
    public void The_forms_part_where_the_mud_supports_the_wall()
    {
        var (with, without) = (
            VerticalHole.ShmaxFromWidth(Rad(40), 51.5e6, 31.5e6, 35e6, 100e6, Angle, 0).Value,
            VerticalHole.ShmaxFromWidthUnconfined(Rad(40), 51.5e6, 31.5e6, 35e6, 100e6, 0).Value);
        Assert.True(with > without + 1e6);
    }

    [Fact]
    public void Width_and_onset_of_a_worked_case()
    {
        Assert.Equal(Rad(69.3145), VerticalHole.BreakoutWidth(40e6, 55e6, 25e6, 30e6, 35e6, Angle, 0).Value, Rad(5.1e-5)); // four decimals
        Assert.Equal(34.710085e6, VerticalHole.OnsetPressure(40e6, 55e6, 25e6, 35e6, Angle, 0).Value, SixDigits);
        Assert.Equal(0, VerticalHole.BreakoutWidth(40e6, 55e6, 25e6, 34.8e6, 35e6, Angle, 0).Value);
        Assert.Equal(Math.PI, VerticalHole.BreakoutWidth(40e6, 55e6, 25e6, 10e6, 5e6, Angle, 0).Value);
        var wall = HoleWall.Of(new(60e6, 55e6, 40e6, 0), 25e6, 30e6, 0.25, 0, 0);
        var (width, middle) = Breakout.Width(wall, 35e6, Angle);
        Assert.Equal(Rad(69.3145), width, Rad(5.1e-5));
        Assert.Equal(Math.PI / 2, middle, 1e-9); // across SHmax, edges found to 1e-12
    }

    [Fact]
    public void A_width_of_120_deg_says_nothing() =>
        Assert.Equal("a breakout of 120 deg or more says nothing of SHmax", VerticalHole.ShmaxFromWidth(Rad(120), 51.5e6, 31.5e6, 31.5e6, 100e6, Angle, 0).Reason);

    [Fact]
    public void Width_and_SHmax_lead_back_to_each_other() => Gen.Select(Gen.Double[1, 110], Gen.Double[30, 80], Gen.Double[0, 8], Gen.Double[0.3, 0.9]).Sample((width, ucs, support, friction) =>
    {
        const double Pore = 30e6, Shmin = 45e6;
        var angle = Math.Atan(friction);
        var shmax = VerticalHole.ShmaxFromWidth(Rad(width), Shmin, Pore, Pore + (support * 1e6), ucs * 1e6, angle, 0.1);
        // Where the horizontal stresses are equal the wall fails all round or not at all.
        if (!shmax.IsKnown || shmax.Value - Shmin < 1e3) return;
        var back = VerticalHole.BreakoutWidth(Shmin, shmax.Value, Pore, Pore + (support * 1e6), ucs * 1e6, angle, 0.1);
        Assert.Equal(Rad(width), back.Value, 1e-6); // arccosine near its ends loses half the digits
    });

    [Theory]
    [InlineData(40, 60, 45)]
    [InlineData(20, 10, 45)]
    [InlineData(70, 0, 60)]
    public void SHmax_is_found_again_in_a_hole_of_any_direction(double inclination, double azimuth, double ucs)
    {
        HoleWall Wall(double shmax) => HoleWall.Of(new(60e6, shmax, 42e6, 0), 25e6, 28e6, 0.25, Rad(inclination), Rad(azimuth));
        var width = Breakout.Width(Wall(60e6), ucs * 1e6, Angle).Width;
        Assert.InRange(width, 0.1, 3);
        var shmax = Breakout.ShmaxFromWidth(width, Wall, 42e6, 100e6, ucs * 1e6, Angle);
        Assert.True(shmax.IsKnown, shmax.Reason);
        Assert.Equal(width, Breakout.Width(Wall(shmax.Value), ucs * 1e6, Angle).Width, 1e-6); // edges are found to 1e-9
    }

    [Fact]
    public void The_onset_in_a_vertical_hole_is_the_closed_one()
    {
        HoleWall Wall(double shmax) => HoleWall.Of(new(60e6, shmax, 40e6, 0), 25e6, 30e6, 0.25, 0, 0);
        var closed = VerticalHole.ShmaxFromWidth(0, 40e6, 25e6, 30e6, 35e6, Angle, 0);
        var found = Breakout.ShmaxFromWidth(0, Wall, 40e6, 100e6, 35e6, Angle);
        Assert.Equal(closed.Value, found.Value, 10e3); // an arc just begun is narrower than can be seen
        Assert.Equal("no SHmax up to the limit gives a breakout so wide", Breakout.ShmaxFromWidth(1, Wall, 40e6, 41e6, 90e6, Angle).Reason);
    }
}
