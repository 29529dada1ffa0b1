namespace DepthStress.Core.Conditioning;

/// <summary>
/// Finds samples beside a gap that were averaged with a missing-value code far below the curve (-999.25 and its like) when the
/// curve was resampled: they fall off from their inner neighbours by more than the curve ever steps in sound rock nearby.
/// </summary>
public static class NullSmear
{
    /// <summary>How many robust standard deviations of the steps nearby a sample must fall off.</summary>
    public const double Threshold = 8;

    /// <summary>Samples on the sound side whose steps are compared.</summary>
    private const int Reach = 40;

    /// <summary>The fewest steps that can be compared.</summary>
    private const int FewestSteps = 4;

    /// <summary>Marks smeared samples.</summary>
    /// <param name="values">The curve as the tool measured it (slowness, not velocity); NaN means missing.</param>
    public static bool[] Mark(ReadOnlySpan<double> values)
    {
        var marks = new bool[values.Length];
        var current = values.ToArray();
        Span<double> steps = stackalloc double[Reach];
        for (var found = true; found;)
        {
            found = false;
            var usual = UsualStep(current);
            for (var i = 0; i < current.Length; i++)
            {
                if (double.IsNaN(current[i])) continue;
                var inward = i > 0 && double.IsNaN(current[i - 1]) ? 1 : i + 1 < current.Length && double.IsNaN(current[i + 1]) ? -1 : 0;
                if (inward == 0 || !FallsOff(current, i, inward, steps, usual)) continue;
                marks[i] = found = true;
            }

            for (var i = 0; i < current.Length; i++)
            {
                if (marks[i]) current[i] = double.NaN;
            }
        }

        return marks;
    }

    private static bool FallsOff(ReadOnlySpan<double> values, int edge, int inward, Span<double> steps, double usual)
    {
        var count = 0;
        var previous = double.NaN;
        for (var i = edge + inward; i >= 0 && i < values.Length && Math.Abs(i - edge) <= Reach && !double.IsNaN(values[i]); i += inward)
        {
            if (!double.IsNaN(previous)) steps[count++] = Math.Abs(values[i] - previous);
            previous = values[i];
        }

        if (count < FewestSteps) return false;
        var (first, second) = (values[edge + inward], values[edge + (2 * inward)]);
        var fall = Math.Min(first - values[edge], (2 * first) - second - values[edge]);
        var greatest = steps[..count].ToArray().Max();
        var (median, scale) = RobustScale.Of(steps[..count]);
        return fall > Math.Max(Math.Max(greatest, usual), median + (Threshold * scale));
    }

    /// <summary>The step that ninety-nine in a hundred samples away from the gaps do not exceed.</summary>
    private static double UsualStep(ReadOnlySpan<double> values)
    {
        var steps = new List<double>(values.Length);
        for (var i = 2; i + 1 < values.Length; i++)
        {
            var step = Math.Abs(values[i] - values[i - 1]);
            if (!double.IsNaN(step + values[i - 2] + values[i + 1])) steps.Add(step);
        }

        if (steps.Count == 0) return double.PositiveInfinity;
        steps.Sort();
        return steps[(int)(0.99 * (steps.Count - 1))];
    }
}
