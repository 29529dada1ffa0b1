using System.Globalization;
using DepthStress.Core.Diagnostics;

namespace DepthStress.Files.Reading;

/// <summary>Kinds of problem that may occur on every row.</summary>
internal enum RowProblem
{
    Cell,
    Count,
    Depth,
    Quote,
}

/// <summary>Lets through the first problems of each kind and counts the rest.</summary>
internal sealed class ProblemTally(DiagnosticBag diagnostics)
{
    /// <summary>How many problems of a kind are reported one by one.</summary>
    public const int Limit = 20;

    private static readonly string[] Nouns =
        ["cells that are not numbers", "rows with a wrong number of values", "rows without depth", "lines with misplaced quotes"];

    private readonly int[] _counts = new int[Nouns.Length];
    private readonly SourcePosition[] _firstHidden = new SourcePosition[Nouns.Length];

    /// <summary>True when anything was counted.</summary>
    public bool Any => _counts.AsSpan().ContainsAnyExcept(0);

    /// <summary>Counts a problem; true when it is to be reported by itself.</summary>
    public bool Admit(RowProblem kind, SourcePosition position)
    {
        var count = ++_counts[(int)kind];
        if (count == Limit + 1) _firstHidden[(int)kind] = position;
        return count <= Limit;
    }

    /// <summary>Reports how many problems of each kind were held back.</summary>
    public void Close()
    {
        for (var k = 0; k < Nouns.Length; k++)
        {
            if (_counts[k] <= Limit) continue;
            diagnostics.Error(
                _firstHidden[k], string.Create(CultureInfo.InvariantCulture, $"and {_counts[k] - Limit} more {Nouns[k]}, from here on"));
        }
    }
}
