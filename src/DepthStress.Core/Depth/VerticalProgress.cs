namespace DepthStress.Core.Depth;

/// <summary>
/// Which samples lie on the part of the hole that keeps going down. Sums over true vertical depth, such as the overburden,
/// need rising depths; near-horizontal and climbing parts would count the same rock again (common practice).
/// </summary>
public static class VerticalProgress
{
    /// <summary>The usual greatest inclination of a usable sample, 80 deg in rad (common practice).</summary>
    public const double DefaultMaxInclination = 80 * Math.PI / 180;

    /// <summary>
    /// Marks a sample as usable when its inclination is at most the limit and it lies deeper than every usable sample before it.
    /// A sample whose depth or inclination is NaN is not usable.
    /// </summary>
    /// <param name="tvd">True vertical depths in the order of measured depth, m.</param>
    /// <param name="inclination">Inclinations, rad.</param>
    /// <param name="maxInclination">The limit, rad.</param>
    /// <param name="usable">Gets the marks.</param>
    /// <returns>How many samples were left out.</returns>
    /// <exception cref="ArgumentException">The lengths differ.</exception>
    public static int Mask(ReadOnlySpan<double> tvd, ReadOnlySpan<double> inclination, double maxInclination, Span<bool> usable)
    {
        if (inclination.Length != tvd.Length) throw new ArgumentException("its length differs from that of tvd", nameof(inclination));
        if (usable.Length != tvd.Length) throw new ArgumentException("its length differs from that of tvd", nameof(usable));
        var (deepest, leftOut) = (double.NegativeInfinity, 0);
        for (var i = 0; i < tvd.Length; i++)
        {
            usable[i] = tvd[i] > deepest && inclination[i] <= maxInclination;
            if (usable[i]) deepest = tvd[i];
            else leftOut++;
        }

        return leftOut;
    }
}
