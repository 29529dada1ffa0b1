namespace DepthStress.Core.Logs;

/// <summary>How a sample between or over logged ones is made.</summary>
public enum ResampleMethod
{
    /// <summary>A straight line between the samples above and below.</summary>
    Linear,

    /// <summary>The mean over the step where it holds two or more logged samples, else as <see cref="Linear"/>.</summary>
    Mean,
}

/// <summary>One regular set of depths for all curves, anchored at whole multiples of its step.</summary>
/// <param name="Step">Distance between depths, m, above zero.</param>
/// <param name="Method">How samples are made.</param>
/// <param name="MaxGap">Logged samples further apart than this are not joined, m, above zero.</param>
public sealed record Resampling(double Step, ResampleMethod Method, double MaxGap)
{
    /// <summary>A logged sample within this share of the step of a wanted depth is taken as it is.</summary>
    public const double Coincidence = 1e-6;

    /// <summary>The whole multiples of the step from a top to a base, m; none when no multiple lies between.</summary>
    public double[] Depths(double top, double bottom)
    {
        var (first, last) = (Math.Ceiling((top / Step) - Coincidence), Math.Floor((bottom / Step) + Coincidence));
        var depths = new double[(int)Math.Max(0, last - first + 1)];
        for (var i = 0; i < depths.Length; i++) depths[i] = (first + i) * Step;
        return depths;
    }

    /// <summary>Brings a curve onto other depths; it is never continued beyond its ends, nor across a gap longer than <see cref="MaxGap"/>.</summary>
    /// <param name="depths">The curve's depths, m, strictly increasing.</param>
    /// <param name="values">The curve; NaN means missing.</param>
    /// <param name="wanted">The wanted depths, m, increasing by <see cref="Step"/>.</param>
    /// <param name="shape">What the curve is like between its samples.</param>
    /// <exception cref="ArgumentException">The curve's lengths differ.</exception>
    public Resampled Bring(ReadOnlySpan<double> depths, ReadOnlySpan<double> values, ReadOnlySpan<double> wanted, CurveShape shape)
    {
        if (values.Length != depths.Length) throw new ArgumentException("Lengths differ.", nameof(values));
        var known = new List<Known>(depths.Length);
        for (var i = 0; i < values.Length; i++)
        {
            if (double.IsFinite(values[i])) known.Add(new Known(depths[i], shape == CurveShape.Reciprocal ? 1 / values[i] : values[i], i));
        }

        var made = new double[wanted.Length];
        var changes = new SampleOrigin[wanted.Length];
        var above = -1;
        for (var i = 0; i < wanted.Length; i++)
        {
            while (above + 1 < known.Count && known[above + 1].Depth <= wanted[i] + (Coincidence * Step)) above++;
            var isMean = Method == ResampleMethod.Mean && shape != CurveShape.Steps;
            if (isMean && Mean(known, above, wanted[i]) is var (mean, bridgesInside))
            {
                (made[i], changes[i]) = (mean, bridgesInside ? SampleOrigin.Filled : SampleOrigin.Edited);
            }
            else if (above >= 0 && known[above].Depth >= wanted[i] - (Coincidence * Step))
            {
                made[i] = values[known[above].Row];
                continue;
            }
            else if (above >= 0 && above + 1 < known.Count && Joined(known[above], known[above + 1]))
            {
                var (a, b) = (known[above], known[above + 1]);
                made[i] = shape == CurveShape.Steps ? (wanted[i] - a.Depth <= b.Depth - wanted[i] ? a : b).Value : Line(a, b, wanted[i]);
                changes[i] = Bridges(a, b) ? SampleOrigin.Filled : SampleOrigin.Edited;
            }
            else
            {
                made[i] = double.NaN;
                continue;
            }

            if (shape == CurveShape.Reciprocal) made[i] = 1 / made[i];
        }

        return new Resampled(made, changes, Gaps(known));
    }

    /// <summary>The mean of the straight lines over the step around a depth; null where it holds fewer than two samples or is not wholly covered.</summary>
    private (double Mean, bool Bridges)? Mean(List<Known> known, int above, double depth)
    {
        var slack = Coincidence * Step;
        var (top, bottom) = (depth - (Step / 2), depth + (Step / 2));
        var first = above;
        while (first >= 0 && known[first].Depth > top + slack) first--;
        var last = above + 1;
        while (last < known.Count && known[last].Depth < bottom - slack) last++;
        if (first < 0 || last >= known.Count) return null;
        var held = last - first - 1 + (known[first].Depth >= top - slack ? 1 : 0) + (known[last].Depth <= bottom + slack ? 1 : 0);
        if (held < 2) return null;
        var (sum, width, bridges) = (0.0, 0.0, false);
        var (low, high) = (double.PositiveInfinity, double.NegativeInfinity);
        for (var k = first; k < last; k++)
        {
            var (a, b) = (known[k], known[k + 1]);
            if (!Joined(a, b)) return null;
            var (from, to) = (Math.Max(top, a.Depth), Math.Min(bottom, b.Depth));
            var (start, end) = (Line(a, b, from), Line(a, b, to));
            sum += (to - from) * (start + end) / 2;
            width += to - from;
            bridges |= Bridges(a, b);
            (low, high) = (Math.Min(low, Math.Min(start, end)), Math.Max(high, Math.Max(start, end)));
        }

        return (Math.Clamp(sum / width, low, high), bridges);
    }

    private static double Line(Known a, Known b, double depth)
    {
        var value = a.Value + ((depth - a.Depth) / (b.Depth - a.Depth) * (b.Value - a.Value));
        return Math.Clamp(value, Math.Min(a.Value, b.Value), Math.Max(a.Value, b.Value));
    }

    private bool Joined(Known a, Known b) => b.Depth - a.Depth <= MaxGap + DepthGrid.Tolerance;

    private static bool Bridges(Known a, Known b) => b.Row - a.Row > 1;

    private List<DepthGap> Gaps(List<Known> known)
    {
        var gaps = new List<DepthGap>();
        for (var k = 1; k < known.Count; k++)
        {
            if (!Joined(known[k - 1], known[k])) gaps.Add(new DepthGap(known[k - 1].Depth, known[k].Depth));
        }

        return gaps;
    }

    private readonly record struct Known(double Depth, double Value, int Row);
}
