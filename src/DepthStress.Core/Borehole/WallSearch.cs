using MathNet.Numerics.RootFinding;

namespace DepthStress.Core.Borehole;

/// <summary>Looks around the wall of a hole; stresses repeat after half a turn.</summary>
internal static class WallSearch
{
    private const int Points = 360;
    private const double Step = Math.PI / Points;

    /// <summary>The angle from 0 to pi where a smooth quantity is least, within 1e-8 rad.</summary>
    public static double Least(Func<double, double> quantity)
    {
        var best = Enumerable.Range(0, Points).MinBy(k => quantity(k * Step));
        var (low, high) = ((best - 1) * Step, (best + 1) * Step);
        // Golden sections: each keeps 0.618 of the interval.
        var golden = (Math.Sqrt(5) - 1) / 2;
        while (high - low > 1e-8)
        {
            var (a, b) = (high - (golden * (high - low)), low + (golden * (high - low)));
            if (quantity(a) <= quantity(b)) high = b;
            else low = a;
        }

        return (low + high) / 2;
    }

    /// <summary>The widest arc where a quantity is above zero: its width from 0 to pi and its middle, rad; NaN in the middle where there is none or no end.</summary>
    public static (double Width, double Middle) WidestArc(Func<double, double> quantity)
    {
        var above = Enumerable.Range(0, Points).Select(k => quantity(k * Step) > 0).ToArray();
        if (above.All(a => a)) return (Math.PI, double.NaN);
        // A narrow arc may lie between two points: its summit decides.
        var summit = Least(x => -quantity(x));
        if (!above.Any(a => a))
        {
            if (!(quantity(summit) > 0)) return (0, double.NaN);
            return (Edge(summit, summit + Step) - Edge(summit - Step, summit), summit);
        }

        var best = (Width: 0.0, Middle: double.NaN);
        for (var start = 0; start < Points; start++)
        {
            if (!above[start] || above[(start + Points - 1) % Points]) continue;
            var end = start;
            while (above[(end + 1) % Points]) end++;
            var (from, to) = (Edge((start - 1) * Step, start * Step), Edge(end * Step, (end + 1) * Step));
            if (to - from > best.Width) best = (to - from, (from + to) / 2);
        }

        return best;

        double Edge(double from, double to)
        {
            return Brent.TryFindRoot(x => quantity(x), from, to, 1e-12, 100, out var root) ? root : (from + to) / 2;
        }
    }
}
