using DepthStress.Core.Diagnostics;
using DepthStress.Core.Logs;
using DepthStress.Core.Quantities;

namespace DepthStress.Core.Pressure;

/// <summary>
/// Density at every sample that enters the overburden, with the origin of each value. A prepare stage: it sees the whole
/// curve and fills only by the user's choice.
/// </summary>
public sealed class DensityProfile
{
    /// <summary>A step between neighbouring samples this many times the mean one means that rows are missing.</summary>
    private const double RowGap = 10;

    /// <summary>What is assumed above the log is tied to the median density of its first metres: one sample may be wrong.</summary>
    private const double TieLength = 10;

    private DensityProfile(double[] values, OriginTrack origins, ShallowDensity? above, int first, int firstLogged, int end)
    {
        Above = above;
        Values = values;
        Origins = origins;
        First = first;
        FirstLogged = firstLogged;
        End = end;
    }

    /// <summary>Density, kg/m3; NaN only outside [First, End) and where a sample stays out of the integral.</summary>
    public double[] Values { get; }

    /// <summary>Where each value came from.</summary>
    public OriginTrack Origins { get; }

    /// <summary>What is assumed above the log, tied to its first values; null when nothing was chosen.</summary>
    public ShallowDensity? Above { get; }

    /// <summary>Why what is assumed above the log cannot be tied to it; null when it can.</summary>
    public FormattableString? Untied { get; private init; }

    /// <summary>First sample of the overburden integral.</summary>
    public int First { get; }

    /// <summary>First sample with a logged density that enters the integral; those between it and <see cref="First"/> have what is assumed above.</summary>
    public int FirstLogged { get; }

    /// <summary>One past the last sample of the overburden integral.</summary>
    public int End { get; }

    /// <summary>Fills the density log as chosen.</summary>
    /// <param name="density">The log.</param>
    /// <param name="tvd">True vertical depth of each sample, m.</param>
    /// <param name="usable">Samples that enter the integral.</param>
    /// <param name="solidTop">True vertical depth of the ground or mudline, m.</param>
    /// <param name="settings">The choices.</param>
    /// <param name="problems">Gets gaps left open, as errors that name the depths.</param>
    /// <returns>The profile, or null when there is no usable density at all.</returns>
    public static DensityProfile? Prepare(
        Curve density,
        ReadOnlySpan<double> tvd,
        ReadOnlySpan<bool> usable,
        double solidTop,
        OverburdenSettings settings,
        List<FormattableString> problems)
    {
        ArgumentNullException.ThrowIfNull(density);
        ArgumentNullException.ThrowIfNull(settings);
        ArgumentNullException.ThrowIfNull(problems);
        var values = (double[])density.Values.Clone();
        var known = new List<int>();
        for (var i = 0; i < values.Length; i++)
        {
            if (usable[i] && !double.IsNaN(values[i])) known.Add(i);
        }

        if (known.Count == 0) return null;
        var origins = new OriginMarks(values.Length);
        var shallow = Tied(known, values, tvd, solidTop, settings.AboveLog, out var untied);
        for (var i = 0; i < known[0]; i++)
        {
            if (usable[i]) origins.Set(values, i, shallow?.DensityAt(tvd[i] - solidTop) ?? double.NaN, SampleOrigin.Assumed);
        }

        for (var k = 1; k < known.Count; k++) Bridge(known[k - 1], known[k], values, tvd, usable, settings.Gaps, origins, problems);
        if (settings.Gaps.Value.Kind != DensityFillKind.Linear) ReportMissingRows(known[0], known[^1], tvd, usable, problems);
        var end = Continue(known[^1], values, usable, settings.BelowLog.Value, origins);
        var first = settings.AboveLog.IsSet ? usable.IndexOf(true) : known[0];
        return new DensityProfile(values, origins.Over(density.Origins), shallow, first, known[0], end) { Untied = untied };
    }

    private static ShallowDensity? Tied(
        List<int> known, double[] values, ReadOnlySpan<double> tvd, double solidTop, Setting<ShallowDensity> choice, out FormattableString? problem)
    {
        problem = null;
        if (!choice.IsSet) return null;
        var top = tvd[known[0]];
        if (!(top > solidTop)) return choice.Value; // nothing lies above the log
        var first = new List<double>();
        foreach (var i in known)
        {
            if (tvd[i] > top + TieLength) break;
            first.Add(values[i]);
        }

        return choice.Value.Tie(top - solidTop, MathNet.Numerics.Statistics.Statistics.Median(first), out problem);
    }

    private static void Bridge(
        int above, int below, double[] values, ReadOnlySpan<double> tvd, ReadOnlySpan<bool> usable,
        Setting<DensityFill> fill, OriginMarks origins, List<FormattableString> problems)
    {
        var open = false;
        for (var i = above + 1; i < below; i++)
        {
            if (!usable[i]) continue;
            open = true;
            var (value, origin) = fill.Value.Kind switch
            {
                DensityFillKind.Linear => (Line(tvd[i], tvd[above], values[above], tvd[below], values[below]), SampleOrigin.Filled),
                DensityFillKind.Hold => (values[above], SampleOrigin.Filled),
                DensityFillKind.Stated => (fill.Value.Density, SampleOrigin.Assumed),
                _ => (double.NaN, SampleOrigin.None),
            };
            origins.Set(values, i, value, origin);
        }

        if (open && fill.Value.Kind == DensityFillKind.None)
        {
            problems.Add($"density is missing from {Quantity.Length(tvd[above])} to {Quantity.Length(tvd[below])} true vertical depth, and the overburden needs it: set [overburden] gaps = \"linear\" or a density");
        }
    }

    /// <summary>The trapezoidal rule would draw a straight line across rows that are not there; only the user may choose that.</summary>
    private static void ReportMissingRows(int top, int bottom, ReadOnlySpan<double> tvd, ReadOnlySpan<bool> usable, List<FormattableString> problems)
    {
        if (bottom == top) return;
        var longest = RowGap * (tvd[bottom] - tvd[top]) / (bottom - top);
        for (var i = top; i < bottom; i++)
        {
            if (!usable[i] || !usable[i + 1] || !(tvd[i + 1] - tvd[i] > longest)) continue;
            problems.Add($"there are no samples from {Quantity.Length(tvd[i])} to {Quantity.Length(tvd[i + 1])} true vertical depth, and the overburden needs density there: set [overburden] gaps = \"linear\" or add samples");
        }
    }

    private static int Continue(int last, double[] values, ReadOnlySpan<bool> usable, DensityFill fill, OriginMarks origins)
    {
        if (fill.Kind is DensityFillKind.None or DensityFillKind.Linear) return last + 1;
        for (var i = last + 1; i < values.Length; i++)
        {
            if (!usable[i]) continue;
            if (fill.Kind == DensityFillKind.Stated) origins.Set(values, i, fill.Density, SampleOrigin.Assumed);
            else origins.Set(values, i, values[last], SampleOrigin.Extrapolated);
        }

        return values.Length;
    }

    private static double Line(double x, double x0, double y0, double x1, double y1) => y0 + ((y1 - y0) * (x - x0) / (x1 - x0));

    /// <summary>Collects the origins of filled samples while they are filled.</summary>
    private sealed class OriginMarks(int count)
    {
        private readonly Dictionary<SampleOrigin, bool[]> _marks = [];

        public void Set(double[] values, int index, double value, SampleOrigin origin)
        {
            values[index] = value;
            if (double.IsNaN(value)) return;
            if (!_marks.TryGetValue(origin, out var marks)) _marks[origin] = marks = new bool[count];
            marks[index] = true;
        }

        public OriginTrack Over(OriginTrack below) =>
            _marks.OrderBy(m => m.Key).Aggregate(below, (track, m) => track.Mark(m.Value, m.Key, "overburden density"));
    }
}
