using System.Globalization;
using System.Runtime.CompilerServices;

namespace DepthStress.Files.Reading;

/// <summary>Follows the depth from row to row: it must be there and strictly increase.</summary>
internal sealed class DepthTrack(LogSource source, ProblemTally tally)
{
    private int _rows, _rises, _repeats, _falls, _firstRepeat, _firstFall;
    private double _repeatAt, _fallFrom, _fallTo;

    /// <summary>First depth, NaN before any row.</summary>
    public double First { get; private set; } = double.NaN;

    /// <summary>Last depth, NaN before any row.</summary>
    public double Last { get; private set; } = double.NaN;

    /// <summary>Smallest step downwards.</summary>
    public double MinStep { get; private set; } = double.PositiveInfinity;

    /// <summary>Largest step downwards.</summary>
    public double MaxStep { get; private set; }

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
        else if (step > 0)
        {
            _rises++;
            MinStep = Math.Min(MinStep, step);
            MaxStep = Math.Max(MaxStep, step);
        }
        else if (step == 0)
        {
            if (_repeats++ == 0) (_firstRepeat, _repeatAt) = (line, depth);
        }
        else if (_falls++ == 0)
        {
            (_firstFall, _fallFrom, _fallTo) = (line, Last, depth);
        }

        Last = depth;
    }

    /// <summary>Counts a row whose depth cell could not be read (already reported).</summary>
    public void Skip() => _rows++;

    /// <summary>Reports depths that repeat or decrease; true when there were none.</summary>
    public bool Close()
    {
        var invariant = CultureInfo.InvariantCulture;
        if (_repeats > 0)
        {
            source.Diagnostics.Error(source.At(_firstRepeat), string.Create(
                invariant, $"depth repeats in {Count(_repeats)}, first {_repeatAt}, expected increasing"));
        }

        if (_falls > 0)
        {
            source.Diagnostics.Error(source.At(_firstFall), _rises == 0
                ? string.Create(invariant, $"depth decreases, expected increasing (from {First} to {Last})")
                : string.Create(invariant, $"depth decreases in {Count(_falls)}, first from {_fallFrom} to {_fallTo}, expected increasing"));
        }

        return _repeats + _falls == 0;
    }

    private static string Count(int rows) => rows == 1 ? "1 row" : string.Create(CultureInfo.InvariantCulture, $"{rows} rows");
}
