namespace SampleWell.Logging;

/// <summary>Spoils the two runs of a well the way real logs are spoiled, and says what was spoiled.</summary>
internal static class Damage
{
    private static readonly string[] Sonic = ["DTC", "DTS"];
    private static readonly string[] Nuclear = ["RHOB", "DRHO", "PEF"];

    /// <summary>Spoils both runs in place.</summary>
    /// <param name="upper">The run of the larger bit.</param>
    /// <param name="lower">The run of the smaller bit, which starts in the rat hole of the larger one.</param>
    /// <param name="ratHoleEnd">Measured depth where the larger hole ends, m.</param>
    /// <param name="shaleVolume">True shale volume by measured depth.</param>
    /// <param name="seed">Seed of the well.</param>
    public static List<DamageRecord> Apply(LogRun upper, LogRun lower, double ratHoleEnd, Func<double, double> shaleVolume, ulong seed)
    {
        var first = new Spoiler(upper, new Draws(seed, "damage upper"));
        Park(first, ("GR", 14), ("DTC", 11), ("DTS", 11), ("RHOB", 16), ("DRHO", 16), ("PEF", 16), ("NPHI", 18), ("RD", 10));
        first.Erase("DTS", 0, 16, DamageKind.Gap);
        first.Erase("NPHI", 0, 9, DamageKind.Gap);
        var shear = first.Find(["DTS"], 590, first.Run.Index(1800), first.Run.Index(2070));
        first.Erase("DTS", shear, 590, DamageKind.MissingShear);
        Common(first, shaleVolume, washouts: 6);

        var second = new Spoiler(lower, new Draws(seed, "damage lower"));
        Park(second, ("GR", 26), ("DTC", 20), ("DTS", 20), ("CALI", 24), ("NPHI", 23), ("RD", 15));
        second.Change("CALI", 0, second.Run.Index(ratHoleEnd), DamageKind.RatHole, (_, value) => value);
        second.Change("RD", 0, 14, DamageKind.Parked, (_, _) => 0.217);
        Common(second, shaleVolume, washouts: 7);
        return [.. first.Records, .. second.Records];
    }

    /// <summary>The curves stand at one value over the last samples, each for its own count: the tools sit at different heights.</summary>
    private static void Park(Spoiler spoiler, params (string Curve, int Length)[] curves)
    {
        foreach (var (curve, length) in curves)
        {
            var start = spoiler.Run.Count - length;
            var value = spoiler.Run.Curves[curve][start];
            spoiler.Change(curve, start, length, DamageKind.Parked, (_, _) => value);
        }
    }

    private static void Common(Spoiler spoiler, Func<double, double> shaleVolume, int washouts)
    {
        Washouts.Apply(spoiler, shaleVolume, washouts);
        Gaps.Apply(spoiler, Sonic, 29, 1);
        Gaps.Apply(spoiler, Nuclear, 22, 1);
        Gaps.Apply(spoiler, ["GR"], 18, 2);
        Gaps.Apply(spoiler, ["NPHI"], 25, 1);
        Gaps.Apply(spoiler, ["RD"], 20, 1);
        Gaps.Nulls(spoiler, ["GR", "DTC", "DTS", "DTS", "RHOB", "NPHI", "NPHI", "PEF", "CALI"]);
        Spikes.Apply(spoiler);
    }
}
