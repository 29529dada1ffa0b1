using DepthStress.Core.Logs;

namespace DepthStress.Core.Conditioning;

/// <summary>
/// Finds the constant value at either end of a logging run, left by a tool that stood still while the recorder ran
/// (common practice). A run that is constant elsewhere as well, such as a bit size, is left alone.
/// </summary>
public static class ParkedTool
{
    /// <summary>The fewest equal samples that are taken for a parked tool.</summary>
    public const int FewestSamples = 4;

    /// <summary>An end counts only when it is so many times as long as any constant stretch between the ends.</summary>
    public const int TimesInterior = 2;

    /// <summary>Marks the parked ends of every spliced piece of a curve.</summary>
    /// <param name="values">The curve; NaN means missing.</param>
    /// <param name="origins">Its origins: samples of one step belong to one piece.</param>
    public static bool[] Mark(ReadOnlySpan<double> values, OriginTrack origins)
    {
        ArgumentNullException.ThrowIfNull(origins);
        if (origins.Count != values.Length) throw new ArgumentException("The origins' length differs from the curve's.", nameof(origins));
        var marks = new bool[values.Length];
        var logged = origins.Runs.Where(r => r.Origin is SampleOrigin.Measured or SampleOrigin.Spliced || r.Step == DepthShift.Name).ToArray();
        for (var first = 0; first < logged.Length;)
        {
            var last = first;
            while (last + 1 < logged.Length && logged[last + 1].Step == logged[first].Step) last++;
            MarkPiece(values, logged[first].Start, logged[last].End, marks);
            first = last + 1;
        }

        return marks;
    }

    private static void MarkPiece(ReadOnlySpan<double> values, int start, int end, bool[] marks)
    {
        var head = start + 1;
        while (head < end && values[head] == values[start]) head++;
        var tail = end - 1;
        while (tail > head && values[tail - 1] == values[end - 1]) tail--;
        var longest = 1;
        for (var i = head; i < tail;)
        {
            var from = i++;
            while (i < tail && values[i] == values[from]) i++;
            longest = Math.Max(longest, i - from);
        }

        if (head >= tail) return;
        var fewest = Math.Max(FewestSamples, TimesInterior * longest);
        if (head - start >= fewest) marks.AsSpan(start, head - start).Fill(true);
        if (end - tail >= fewest) marks.AsSpan(tail, end - tail).Fill(true);
    }
}
