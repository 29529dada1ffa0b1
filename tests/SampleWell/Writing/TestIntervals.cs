using SampleWell.Hidden;
using SampleWell.Logging;

namespace SampleWell.Writing;

/// <summary>Chooses where the tests of a well are made: in sound hole, never twice at one place.</summary>
internal sealed class TestIntervals(Truth truth, IReadOnlyList<DamageRecord> damage)
{
    private readonly List<(double Top, double Base)> used = [];

    /// <summary>Keeps an interval for a test whose place is given.</summary>
    public void Reserve(double top, double bottom) => used.Add((top, bottom));

    /// <summary>
    /// The interval of a formation that stands at a given rank (0 lowest, 1 highest) of a property among all its intervals of that
    /// length, away from spoiled logs and earlier tests.
    /// </summary>
    public (double Top, double Base) Ranked(int formation, double length, double rank, Func<double, double, double> property)
    {
        var (top, bottom) = truth.Plan.Span(formation);
        return Ranked(Math.Max(top, truth.Grid.Md[0]) + 3, bottom - 8, length, rank, property);
    }

    /// <summary>The same between two measured depths.</summary>
    public (double Top, double Base) Ranked(double from, double to, double length, double rank, Func<double, double, double> property)
    {
        var ordered = Starts(from, to, length).OrderBy(start => property(start, start + length)).ToList();
        var chosen = ordered[(int)Math.Round(rank * (ordered.Count - 1))];
        return Take(chosen, length);
    }

    /// <summary>Up to <paramref name="count"/> intervals between two depths whose property lies within bounds.</summary>
    public IReadOnlyList<(double Top, double Base)> Within(
        double from, double to, double length, int count, Func<double, double, bool> suits)
    {
        var found = new List<(double, double)>();
        foreach (var start in Starts(from, to, length).Where(start => suits(start, start + length)))
        {
            if (found.Count < count && IsFree(start, start + length, 10))
                found.Add(Take(start, length));
        }

        return found;
    }

    private IEnumerable<double> Starts(double from, double to, double length)
    {
        for (var start = Math.Ceiling(from); start + length <= to; start += 0.5)
        {
            if (IsFree(start, start + length, 4))
                yield return start;
        }
    }

    private (double Top, double Base) Take(double start, double length)
    {
        Reserve(start, start + length);
        return (start, start + length);
    }

    private bool IsFree(double top, double bottom, double distance) =>
        used.TrueForAll(other => bottom + distance < other.Top || top - distance > other.Base)
        && damage.All(record => bottom + 1 < record.Start || top - 1 > record.End);
}
