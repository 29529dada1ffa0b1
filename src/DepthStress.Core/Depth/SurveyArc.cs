namespace DepthStress.Core.Depth;

/// <summary>
/// The circular arc between two survey stations (minimum curvature).
/// Dogleg <c>b</c> is the angle between the two headings; along <c>s</c> of the length <c>L</c> the heading is
/// <c>t(s) = cos(b s/L) t1 + sin(b s/L) n</c>, with <c>n</c> the unit normal of <c>t1</c> in the plane of the arc, and the
/// displacement is <c>(s/2) (t1 + t(s)) RF(b s/L)</c>, <c>RF(b) = tan(b/2) / (b/2)</c>.
/// Source: Taylor &amp; Mason 1972; Sawaryn &amp; Thorogood 2005, SPE Drilling &amp; Completion 20:24-36.
/// </summary>
internal readonly record struct SurveyArc(Heading Start, Heading Normal, double Dogleg, double Length)
{
    /// <summary>Below this angle (rad) the ratio factor is its series: the next term, b^4/120, is under 1e-18.</summary>
    private const double SmallAngle = 1e-4;

    public static SurveyArc Between(Heading start, Heading end, double length)
    {
        var dogleg = Angle(start, end);
        if (dogleg == 0) return Straight(start, length);
        var normal = (1 / Math.Sin(dogleg) * (end - start)) + (Math.Tan(dogleg / 2) * start);
        return new(start, normal, dogleg, length);
    }

    public static SurveyArc Straight(Heading start, double length) => new(start, default, 0, length);

    /// <summary>Angle between two headings, rad, by arc tangent: exact for small angles, where an arc cosine is not.</summary>
    public static double Angle(Heading a, Heading b) => 2 * Math.Atan2((b - a).Length, (a + b).Length);

    /// <summary>Length of the arc over the length of the broken line of its two half headings.</summary>
    public static double RatioFactor(double dogleg) =>
        dogleg < SmallAngle ? 1 + (dogleg * dogleg / 12) : 2 / dogleg * Math.Tan(dogleg / 2);

    public Heading HeadingAt(double along)
    {
        if (Dogleg == 0) return Start;
        var (sine, cosine) = Math.SinCos(Dogleg * along / Length);
        return (cosine * Start) + (sine * Normal);
    }

    public Heading Displacement(double along) => Displacement(along, HeadingAt(along));

    /// <summary>The displacement where the heading there is known already.</summary>
    public Heading Displacement(double along, Heading heading) =>
        along / 2 * (Dogleg == 0 ? 1 : RatioFactor(Dogleg * along / Length)) * (Start + heading);

    /// <summary>
    /// Where the arc first reaches that much depth below its start, m along it; NaN when it does not.
    /// Up to the deepest point of the arc "not there yet" turns into "there" only once, so bisection finds it.
    /// </summary>
    public double AlongAtDepth(double depth)
    {
        if (depth <= 0) return 0;
        var (low, high) = (0.0, DeepestAlong());
        if (!(Displacement(high).Down >= depth)) return double.NaN;
        while (true)
        {
            var middle = low + ((high - low) / 2);
            if (middle <= low || middle >= high) return high;
            if (Displacement(middle).Down >= depth) high = middle;
            else low = middle;
        }
    }

    /// <summary>Where the arc turns from downwards to upwards, or else its end: from there on it gets no deeper.</summary>
    private double DeepestAlong()
    {
        var turn = Heading.Normalised(Math.Atan2(Normal.Down, Start.Down) + (Math.PI / 2));
        return turn < Dogleg ? turn / Dogleg * Length : Length;
    }
}
