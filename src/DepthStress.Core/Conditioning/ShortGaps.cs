namespace DepthStress.Core.Conditioning;

/// <summary>Bridges short gaps by a straight line between the samples at their edges; longer ones and the ends stay missing.</summary>
public static class ShortGaps
{
    /// <summary>Gives the curve with its short gaps bridged, and which samples were.</summary>
    /// <param name="depths">Measured depths, m, strictly increasing.</param>
    /// <param name="values">The curve as the tool measured it (slowness, not velocity); NaN means missing.</param>
    /// <param name="longest">Per sample, the longest distance between the edges of its gap that may be bridged, m; 0 for none. The
    /// smallest one inside a gap decides.</param>
    /// <exception cref="ArgumentException">Lengths differ.</exception>
    public static (double[] Values, bool[] Filled) Fill(ReadOnlySpan<double> depths, ReadOnlySpan<double> values, ReadOnlySpan<double> longest)
    {
        if (values.Length != depths.Length || longest.Length != depths.Length) throw new ArgumentException("Lengths differ.", nameof(values));
        var filled = new bool[values.Length];
        var bridged = values.ToArray();
        var last = -1;
        for (var i = 0; i < values.Length; i++)
        {
            if (double.IsNaN(values[i])) continue;
            if (last >= 0 && i - last > 1 && depths[i] - depths[last] <= Least(longest[(last + 1)..i]) + Logs.DepthGrid.Tolerance)
            {
                for (var k = last + 1; k < i; k++)
                {
                    var share = (depths[k] - depths[last]) / (depths[i] - depths[last]);
                    bridged[k] = values[last] + (share * (values[i] - values[last]));
                    filled[k] = true;
                }
            }

            last = i;
        }

        return (bridged, filled);
    }

    private static double Least(ReadOnlySpan<double> limits)
    {
        var least = limits[0];
        foreach (var limit in limits) least = Math.Min(least, limit);
        // With no limit at all nothing is bridged, not even neighbours closer than the tolerance.
        return least > 0 ? least : double.NegativeInfinity;
    }
}
