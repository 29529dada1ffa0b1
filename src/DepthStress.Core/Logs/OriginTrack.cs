namespace DepthStress.Core.Logs;

/// <summary>A run of samples [Start, End) of one origin, made by one step.</summary>
/// <param name="Start">First sample.</param>
/// <param name="End">One past the last sample.</param>
/// <param name="Origin">Where the values came from.</param>
/// <param name="Step">What put them there: a file and column, or the name of a step.</param>
public readonly record struct OriginRun(int Start, int End, SampleOrigin Origin, string Step);

/// <summary>The origins of one curve as runs of samples, in order, covering every sample.</summary>
public sealed class OriginTrack
{
    private readonly List<OriginRun> _runs;

    private OriginTrack(int count, List<OriginRun> runs)
    {
        Count = count;
        _runs = runs;
    }

    /// <summary>Number of samples.</summary>
    public int Count { get; }

    /// <summary>The runs, in order and without gaps.</summary>
    public IReadOnlyList<OriginRun> Runs => _runs;

    /// <summary>Gives every sample that has a value one origin, and the others none.</summary>
    public static OriginTrack Of(ReadOnlySpan<double> values, SampleOrigin origin, string step)
    {
        var runs = new List<OriginRun>();
        for (var i = 0; i < values.Length; i++)
        {
            if (double.IsNaN(values[i])) Append(runs, new OriginRun(i, i + 1, SampleOrigin.None, ""));
            else Append(runs, new OriginRun(i, i + 1, origin, step));
        }

        return new OriginTrack(values.Length, runs);
    }

    /// <summary>Joins runs that follow each other and cover every sample.</summary>
    /// <exception cref="ArgumentException">The runs leave a gap or overlap.</exception>
    public static OriginTrack From(IEnumerable<OriginRun> parts)
    {
        ArgumentNullException.ThrowIfNull(parts);
        var runs = new List<OriginRun>();
        var end = 0;
        foreach (var run in parts)
        {
            if (run.Start != end || run.End < run.Start) throw new ArgumentException("Runs must follow each other.", nameof(parts));
            end = run.End;
            Append(runs, run);
        }

        return new OriginTrack(end, runs);
    }

    /// <summary>A copy in which the marked samples have another origin.</summary>
    public OriginTrack Mark(ReadOnlySpan<bool> marked, SampleOrigin origin, string step)
    {
        if (marked.Length != Count) throw new ArgumentException("The marks' length differs from the track's.", nameof(marked));
        var runs = new List<OriginRun>();
        foreach (var run in _runs)
        {
            var i = run.Start;
            while (i < run.End)
            {
                var from = i;
                var mark = marked[i];
                while (i < run.End && marked[i] == mark) i++;
                Append(runs, mark ? new OriginRun(from, i, origin, step) : run with { Start = from, End = i });
            }
        }

        return new OriginTrack(Count, runs);
    }

    /// <summary>Raises each sample's origin to this track's where this one is weaker.</summary>
    /// <param name="weakest">One origin per sample, read and written.</param>
    public void Weaken(Span<SampleOrigin> weakest)
    {
        if (weakest.Length != Count) throw new ArgumentException("The origins' length differs from the track's.", nameof(weakest));
        foreach (var run in _runs)
        {
            for (var i = run.Start; i < run.End; i++)
            {
                if (run.Origin > weakest[i]) weakest[i] = run.Origin;
            }
        }
    }

    /// <summary>Number of samples of an origin.</summary>
    public int CountOf(SampleOrigin origin) => _runs.Where(r => r.Origin == origin).Sum(r => r.End - r.Start);

    private static void Append(List<OriginRun> runs, OriginRun run)
    {
        if (run.Start == run.End) return;
        if (runs.Count > 0 && runs[^1] is var last && last.End == run.Start && last.Origin == run.Origin && last.Step == run.Step)
            runs[^1] = last with { End = run.End };
        else
            runs.Add(run);
    }
}
