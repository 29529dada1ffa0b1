using System.Globalization;
using System.Runtime.CompilerServices;

namespace DepthStress.Files.Reading;

/// <summary>Follows the depth from row to row: it must be there, and increase or decrease throughout.</summary>
internal sealed class DepthTrack(LogSource source, ProblemTally tally)
{
    private int _rows, _repeats, _firstRepeat;
    private Turn _rises, _falls;
    private double _repeatAt;

    /// <summary>First depth, NaN before any row.</summary>
    public double First { get; private set; } = double.NaN;

    /// <summary>Last depth, NaN before any row.</summary>
    public double Last { get; private set; } = double.NaN;

    /// <summary>Smallest step, without sign.</summary>
    public double MinStep { get; private set; } = double.PositiveInfinity;

    /// <summary>Largest step, without sign.</summary>
    public double MaxStep { get; private set; }

    /// <summary>True when the depth decreased from row to row.</summary>
    public bool Descends => _falls.Count > 0 && _rises.Count == 0;

    /// <summary>True when a depth repeated.</summary>
    public bool Repeats => _repeats > 0;

    /// <summary>Takes the depth of the next row; NaN is missing.</summary>
    [MethodImpl(MethodImplOptions.AggressiveOptimization)]
    public void Add(double depth, int line)
    {
        _rows++;
        if (double.IsNaN(depth))
        {
            if (!tally.Admit(RowProblem.Depth, source.At(line))) return;
            source.Diagnostics.Error(
                source.At(line), string.Create(CultureInfo.InvariantCulture, $"found no depth in data row {_rows}, expected a number"));
            return;
        }

        var step = depth - Last;
        if (double.IsNaN(Last))
        {
            First = depth;
        }
        else if (step == 0)
        {
            if (_repeats++ == 0) (_firstRepeat, _repeatAt) = (line, depth);
        }
        else
        {
            MinStep = Math.Min(MinStep, Math.Abs(step));
            MaxStep = Math.Max(MaxStep, Math.Abs(step));
            ref var turn = ref step > 0 ? ref _rises : ref _falls;
            if (turn.Count++ == 0) (turn.Line, turn.From, turn.To) = (line, Last, depth);
        }

        Last = depth;
    }

    /// <summary>Counts a row whose depth cell could not be read (already reported).</summary>
    public void Skip() => _rows++;

    /// <summary>Reports depths that repeat (by what the well file wants of them), turn or decrease; false when the file cannot be used.</summary>
    public bool Close(RepeatedDepth repeated)
    {
        if (_repeats > 0) ReportRepeats(repeated);
        if (_rises.Count > 0 && _falls.Count > 0)
        {
            // What the fewer rows do is what is wrong.
            var (wrong, does, expected) = _rises.Count >= _falls.Count ? (_falls, "decreases", "increasing") : (_rises, "increases", "decreasing as in the other rows");
            source.Diagnostics.Error(source.At(wrong.Line), string.Create(
                CultureInfo.InvariantCulture, $"depth {does} in {Count(wrong.Count)}, first from {wrong.From} to {wrong.To}, expected {expected}"));
            return false;
        }

        return _repeats == 0 || repeated != RepeatedDepth.Error;
    }

    /// <summary>Says that the rows are turned round, where they are.</summary>
    public void ReportDescent()
    {
        if (!Descends) return;
        source.Diagnostics.Note(source.At(_falls.Line), string.Create(
            CultureInfo.InvariantCulture, $"depth decreases throughout (from {First} to {Last}), the rows are turned round"));
    }

    private void ReportRepeats(RepeatedDepth repeated)
    {
        var text = string.Create(CultureInfo.InvariantCulture, $"depth repeats in {Count(_repeats)}, first {_repeatAt}");
        var position = source.At(_firstRepeat);
        if (repeated == RepeatedDepth.Error) source.Diagnostics.Error(position, $"{text}, expected {(Descends ? "decreasing" : "increasing")} (or repeated_depth = \"first\" or \"mean\" in [logs])");
        else source.Diagnostics.Note(position, repeated == RepeatedDepth.First ? $"{text}; the first row of each depth is kept" : $"{text}; each depth takes the mean of its rows");
    }

    private static string Count(int rows) => rows == 1 ? "1 row" : string.Create(CultureInfo.InvariantCulture, $"{rows} rows");

    private struct Turn
    {
        public int Count, Line;
        public double From, To;
    }
}
