namespace DepthStress.Core.Conditioning;

/// <summary>
/// Finds spikes by Hampel's identifier (median and scaled median absolute deviation over a depth window; Hampel 1974,
/// doi:10.1080/01621459.1974.10482962) on the steps from sample to sample: a spike enters and leaves by a step that stands out,
/// in opposite directions, and the levels before and after agree. A bed boundary leaves no such pair, and a bed thicker than
/// the tool's resolution enters and leaves over several samples.
/// </summary>
public static class SpikeFilter
{
    /// <summary>The longest spike, samples.</summary>
    public const int LongestRun = 3;

    /// <summary>Levels before and after agree within this share of the spike, and the steps beside it are below this share.</summary>
    public const double Agreement = 0.5;

    private const int FewestSteps = 6;

    /// <summary>Marks spikes.</summary>
    /// <param name="depths">Measured depths, m, strictly increasing.</param>
    /// <param name="values">The curve as the tool measured it (slowness, not velocity); NaN means missing.</param>
    /// <param name="window">Depth window around a sample, m.</param>
    /// <param name="threshold">How many robust standard deviations the steps must stand out.</param>
    /// <exception cref="ArgumentException">Lengths differ.</exception>
    public static bool[] Mark(ReadOnlySpan<double> depths, ReadOnlySpan<double> values, double window, double threshold)
    {
        if (depths.Length != values.Length) throw new ArgumentException("Lengths differ.", nameof(values));
        var marks = new bool[values.Length];
        var current = values.ToArray();
        while (Pass(depths, current, window, threshold, marks))
        {
            for (var i = 0; i < current.Length; i++)
            {
                if (marks[i]) current[i] = double.NaN;
            }
        }

        return marks;
    }

    private static bool Pass(ReadOnlySpan<double> depths, double[] values, double window, double threshold, bool[] marks)
    {
        var steps = new double[Math.Max(0, values.Length - 1)];
        for (var i = 0; i < steps.Length; i++) steps[i] = values[i + 1] - values[i];
        var floor = RobustScale.Of(steps.Where(s => !double.IsNaN(s)).ToArray()).Scale;
        var found = false;
        var (top, bottom) = (0, 0);
        var near = new List<double>();
        for (var i = 1; i < values.Length - 1; i++)
        {
            while (depths[top] < depths[i] - (0.5 * window)) top++;
            while (bottom < steps.Length && depths[bottom + 1] <= depths[i] + (0.5 * window)) bottom++;
            var length = RunLength(values, i);
            if (length == 0 || marks[i]) continue;
            near.Clear();
            for (var k = top; k < bottom; k++)
            {
                if (!double.IsNaN(steps[k])) near.Add(steps[k]);
            }

            if (near.Count < FewestSteps) continue;
            var (median, scale) = RobustScale.Of(System.Runtime.InteropServices.CollectionsMarshal.AsSpan(near));
            var size = Math.Min(Math.Abs(steps[i - 1] - median), Math.Abs(steps[i + length - 1] - median));
            if (!(size > threshold * Math.Max(scale, floor))) continue;
            marks.AsSpan(i, length).Fill(true);
            found = true;
        }

        return found;
    }

    /// <summary>Length of the run from a sample on that enters and leaves by opposite steps and returns to its level; zero when there is none.</summary>
    private static int RunLength(double[] values, int start)
    {
        var before = values[start - 1];
        var entry = values[start] - before;
        if (double.IsNaN(entry) || entry == 0) return 0;
        var sign = Math.Sign(entry);
        for (var length = 1; length <= LongestRun && start + length < values.Length; length++)
        {
            var after = values[start + length];
            var exit = values[start + length - 1] - after;
            var size = Math.Min(sign * entry, sign * exit);
            if (double.IsNaN(after)) return 0;
            if (size > 0 && Math.Abs(after - before) <= Agreement * size && StandsOut(values, start, length, sign, size)) return length;
        }

        return 0;
    }

    private static bool StandsOut(double[] values, int start, int length, int sign, double size)
    {
        var (before, after) = (values[start - 1], values[start + length]);
        var level = sign > 0 ? Math.Max(before, after) : Math.Min(before, after);
        for (var i = start; i < start + length; i++)
        {
            if (sign * (values[i] - level) < Agreement * size) return false;
        }

        var quietBefore = start < 2 || !(Math.Abs(before - values[start - 2]) > Agreement * size);
        var quietAfter = start + length + 1 >= values.Length || !(Math.Abs(after - values[start + length + 1]) > Agreement * size);
        return quietBefore && quietAfter;
    }
}
