namespace SampleWell.Logging;

/// <summary>Spoils one run and keeps the list; no sample of a curve is spoiled twice, and stretches of one curve keep a distance.</summary>
internal sealed class Spoiler(LogRun run, Draws draws)
{
    private const int Distance = 12;
    private readonly Dictionary<string, bool[]> taken = run.Curves.Keys.ToDictionary(name => name, _ => new bool[run.Count]);

    /// <summary>The list so far.</summary>
    public List<DamageRecord> Records { get; } = [];

    /// <summary>The run that is spoiled.</summary>
    public LogRun Run => run;

    /// <summary>The random stream of the damage.</summary>
    public Draws Draws => draws;

    /// <summary>Finds a free stretch of <paramref name="length"/> samples between two indices that suits; -1 if there is none.</summary>
    public int Find(IReadOnlyList<string> curves, int length, int from, int to, Func<int, bool>? suits = null)
    {
        for (var attempt = 0; attempt < 400; attempt++)
        {
            var start = draws.Whole(from, Math.Max(from, to - length));
            if (start + length <= run.Count && curves.All(curve => IsFree(curve, start, length)) && (suits is null || suits(start + length / 2)))
                return start;
        }

        return -1;
    }

    /// <summary>Changes a stretch of a curve, notes it and closes it to other damage.</summary>
    public void Change(string curve, int start, int length, DamageKind kind, Func<int, double, double> change)
    {
        var values = run.Curves[curve];
        for (var i = start; i < start + length; i++)
            values[i] = change(i, values[i]);
        for (var i = Math.Max(0, start - Distance); i < Math.Min(run.Count, start + length + Distance); i++)
            taken[curve][i] = true;
        Records.Add(new DamageRecord(run.File, curve, run.Md(start), run.Md(start + length - 1), kind));
    }

    /// <summary>Takes the values of a stretch away.</summary>
    public void Erase(string curve, int start, int length, DamageKind kind) => Change(curve, start, length, kind, (_, _) => Curve.Missing);

    private bool IsFree(string curve, int start, int length)
    {
        for (var i = start; i < start + length; i++)
        {
            if (taken[curve][i])
                return false;
        }

        return true;
    }
}
