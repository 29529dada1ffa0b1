namespace SampleWell;

/// <summary>Random curves that are smooth along the hole, as rock and tools are.</summary>
internal static class Noise
{
    /// <summary>
    /// A curve of standard deviation about <paramref name="deviation"/> whose values resemble each other over
    /// <paramref name="length"/>: cubic steps between random knots that distance apart.
    /// </summary>
    public static double[] Curve(Draws draws, int count, double step, double length, double deviation)
    {
        var curve = new double[count];
        var from = draws.Normal();
        var to = draws.Normal();
        var knot = 0;
        for (var i = 0; i < count; i++)
        {
            var place = i * step / length;
            for (; place >= knot + 1; knot++)
                (from, to) = (to, draws.Normal());
            // The mean square of the blend over a step is 0.743, hence the factor.
            curve[i] = 1.16 * deviation * (from + (to - from) * Physics.Smooth(0, 1, place - knot));
        }

        return curve;
    }

    /// <summary>What a tool of the given vertical resolution sees: three running means in turn, together about that long.</summary>
    public static double[] Resolve(double[] values, double step, double resolution)
    {
        var half = Math.Max(1, (int)Math.Round(resolution / step / 4));
        return RunningMean(RunningMean(RunningMean(values, half), half), half);
    }

    private static double[] RunningMean(double[] values, int half)
    {
        var means = new double[values.Length];
        for (var i = 0; i < values.Length; i++)
        {
            var first = Math.Max(0, i - half);
            var last = Math.Min(values.Length - 1, i + half);
            var sum = 0.0;
            for (var k = first; k <= last; k++)
                sum += values[k];
            means[i] = sum / (last - first + 1);
        }

        return means;
    }
}
