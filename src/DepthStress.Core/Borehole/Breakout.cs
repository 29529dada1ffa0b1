namespace DepthStress.Core.Borehole;

/// <summary>Breakouts in a hole of any direction: the part of the wall whose three principal stresses exceed Mohr and Coulomb's criterion.</summary>
public static class Breakout
{
    private const int Steps = 200, Halvings = 40;

    /// <summary>Full opening angle of the wider breakout, rad, 0 to pi, and the angle of its middle from the high side, rad; NaN where the wall holds or fails all round.</summary>
    /// <param name="wall">The wall.</param>
    /// <param name="ucs">Unconfined compressive strength, Pa.</param>
    /// <param name="frictionAngle">Friction angle, rad.</param>
    public static (double Width, double Middle) Width(HoleWall wall, double ucs, double frictionAngle)
    {
        var q = VerticalHole.FrictionFactor(frictionAngle);
        if (!double.IsFinite(wall.At(0).GreaterInWall + ucs + q)) return (double.NaN, double.NaN);
        return WallSearch.WidestArc(angle =>
        {
            var (greatest, _, least) = wall.At(angle).Principal;
            return greatest - (q * least) - ucs;
        });
    }

    /// <summary>
    /// The least SHmax from Shmin to a limit that gives a width, in steps of a 200th of the way; a width of 0 gives the onset. No answer where no SHmax in the range
    /// gives it.
    /// </summary>
    /// <param name="width">The width, rad, below pi.</param>
    /// <param name="wall">The wall for an SHmax, Pa.</param>
    /// <param name="shmin">Where to begin, Pa: Shmin.</param>
    /// <param name="limit">Where to end, Pa: such as the frictional limit.</param>
    /// <param name="ucs">Unconfined compressive strength, Pa.</param>
    /// <param name="frictionAngle">Friction angle, rad.</param>
    public static WallAnswer ShmaxFromWidth(double width, Func<double, HoleWall> wall, double shmin, double limit, double ucs, double frictionAngle)
    {
        ArgumentNullException.ThrowIfNull(wall);
        if (!(limit > shmin) || !double.IsFinite(limit + width)) return WallAnswer.Of(double.NaN);
        var (low, before) = (shmin, Excess(shmin));
        if (double.IsNaN(before)) return WallAnswer.Of(double.NaN);
        if (before > 0) return WallAnswer.None("the breakout is wider already with SHmax at Shmin");
        for (var k = 1; k <= Steps; k++)
        {
            var high = shmin + ((limit - shmin) * k / Steps);
            if (Excess(high) <= 0)
            {
                low = high;
                continue;
            }

            // Halving, since a width may jump where another arc becomes the widest.
            for (var half = 0; half < Halvings; half++)
            {
                var middle = (low + high) / 2;
                if (Excess(middle) > 0) high = middle;
                else low = middle;
            }

            return WallAnswer.Of(high);
        }

        return WallAnswer.None("no SHmax up to the limit gives a breakout so wide");

        // A hair below zero where the wall holds, so that the onset is a change of sign as well.
        double Excess(double shmax)
        {
            var found = Width(wall(shmax), ucs, frictionAngle).Width;
            return found > 0 ? found - width + (width == 0 ? 1e-12 : 0) : -width - 1e-12 + (double.IsNaN(found) ? double.NaN : 0);
        }
    }
}
