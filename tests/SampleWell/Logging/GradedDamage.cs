using SampleWell.Hidden;

namespace SampleWell.Logging;

/// <summary>One spoilt stretch of one curve, with its size in the unit that <see cref="GradedDamage"/> states for the kind.</summary>
/// <param name="Curve">Column name.</param>
/// <param name="First">Index of the first sample.</param>
/// <param name="Count">Number of samples.</param>
/// <param name="Kind">What happened.</param>
/// <param name="Size">How bad it is.</param>
public sealed record GradedRecord(string Curve, int First, int Count, DamageKind Kind, double Size);

/// <summary>A run before and after it was spoilt.</summary>
/// <param name="Clean">What sound tools read.</param>
/// <param name="Spoilt">What was logged.</param>
/// <param name="Damage">What was spoilt.</param>
public sealed record GradedRun(LogRun Clean, LogRun Spoilt, IReadOnlyList<GradedRecord> Damage);

/// <summary>
/// Spoils a run for scoring. Every size is drawn evenly on a logarithmic scale, from what nobody can see to what nobody can miss:
/// spikes of 1 to 3 samples, up or down, by 0.5 to 60 us/ft (compressional), 1 to 90 us/ft (shear), 0.01 to 0.55 g/cm3, 3 to 160 gAPI;
/// edges of gaps that hold a share of 0.0005 to 0.8 of the missing-value code, beside edges that are sound; ends parked for 2 to 30 samples;
/// washouts of 0.3 to 6 in whose density reads 0.06 to 0.10 g/cm3 low per inch.
/// </summary>
public static class GradedDamage
{
    private static readonly (string Name, double Least, double Greatest)[] SpikeSizes =
        [("DTC", 0.5, 60), ("DTS", 1, 90), ("RHOB", 0.01, 0.55), ("GR", 3, 160)];

    private static readonly string[] Parked = ["GR", "DTC", "DTS", "RHOB", "NPHI"];

    /// <summary>Makes and spoils both runs of a drawn well.</summary>
    public static IReadOnlyList<GradedRun> Make(ulong seed)
    {
        var (truth, upper, lower) = SampleLogs.Record(WellPlans.Drawn(seed));
        return [Spoil(truth, upper, seed), Spoil(truth, lower, seed)];
    }

    private static GradedRun Spoil(Truth truth, LogRun clean, ulong seed)
    {
        var run = clean with { Curves = clean.Curves.ToDictionary(curve => curve.Key, curve => (double[])curve.Value.Clone()) };
        var spoiler = new Spoiler(run, new Draws(seed, "graded " + run.File));
        var records = new List<GradedRecord>();
        foreach (var curve in Parked)
        {
            Park(spoiler, records, curve, atEnd: false);
            Park(spoiler, records, curve, atEnd: true);
        }

        for (var k = 0; k < 10; k++)
            WashOut(spoiler, records, index => truth.Grid.At(truth.Rock.ShaleVolume, run.Md(index)) > 0.7);
        foreach (var (name, least, greatest) in SpikeSizes)
        {
            for (var k = 0; k < 8; k++)
                MakeGap(spoiler, records, name);
            for (var k = 0; k < 12; k++)
                MakeSpike(spoiler, records, name, Graded(spoiler.Draws, least, greatest));
        }

        return new GradedRun(clean, run, records);
    }

    private static double Graded(Draws draws, double least, double greatest) => least * Math.Pow(greatest / least, draws.Uniform());

    private static void Park(Spoiler spoiler, List<GradedRecord> records, string curve, bool atEnd)
    {
        var length = (int)Math.Round(Graded(spoiler.Draws, 2, 30));
        var start = atEnd ? spoiler.Run.Count - length : 0;
        var value = spoiler.Run.Curves[curve][atEnd ? start : length - 1];
        spoiler.Change(curve, start, length, DamageKind.Parked, (_, _) => value);
        records.Add(new GradedRecord(curve, start, length, DamageKind.Parked, length));
    }

    private static void MakeSpike(Spoiler spoiler, List<GradedRecord> records, string curve, double size)
    {
        var length = spoiler.Draws.Whole(1, 3);
        var start = spoiler.Find([curve], length, 40, spoiler.Run.Count - 60);
        if (start < 0)
            return;
        var change = spoiler.Draws.Uniform() < 0.5 ? -size : size;
        if (spoiler.Run.Curves[curve][start] + change <= 0)
            change = size;
        spoiler.Change(curve, start, length, DamageKind.Spike, (_, value) => value + change);
        records.Add(new GradedRecord(curve, start, length, DamageKind.Spike, size));
    }

    private static void MakeGap(Spoiler spoiler, List<GradedRecord> records, string curve)
    {
        var samples = spoiler.Draws.Whole(3, 30);
        var start = spoiler.Find([curve], samples + 2, 40, spoiler.Run.Count - 60);
        if (start < 0)
            return;
        spoiler.Erase(curve, start + 1, samples, DamageKind.Gap);
        foreach (var edge in new[] { start, start + samples + 1 })
        {
            var share = Graded(spoiler.Draws, 0.0005, 0.8);
            if (spoiler.Draws.Uniform() < 0.5)
                continue;
            spoiler.Change(curve, edge, 1, DamageKind.NullSmear, (_, value) => (1 - share) * value + share * Curve.Missing);
            records.Add(new GradedRecord(curve, edge, 1, DamageKind.NullSmear, share));
        }
    }

    private static void WashOut(Spoiler spoiler, List<GradedRecord> records, Func<int, bool> suits)
    {
        var draws = spoiler.Draws;
        var samples = draws.Whole(10, 32);
        var start = spoiler.Find(["CALI", "RHOB", "DRHO"], samples, 40, spoiler.Run.Count - 60, suits);
        if (start < 0)
            return;
        var size = Graded(draws, 0.3, 6);
        var loss = size * draws.Between(0.06, 0.10);
        var rough = Noise.Curve(draws, samples, Physics.HalfFoot, 0.5, 0.16);
        double Depth(int i) => Physics.Smooth(-0.5, 3, Math.Min(i - start, start + samples - 1 - i)) * Math.Max(0.35, 0.9 + rough[i - start]);
        spoiler.Change("CALI", start, samples, DamageKind.Washout, (i, value) => value + size * Depth(i));
        spoiler.Change("RHOB", start, samples, DamageKind.Washout, (i, value) => value - loss * Depth(i) * Depth(i));
        spoiler.Change("DRHO", start, samples, DamageKind.Washout, (i, value) => value + 0.45 * loss * Depth(i));
        records.Add(new GradedRecord("RHOB", start, samples, DamageKind.Washout, size));
    }
}
