namespace SampleWell.Logging;

/// <summary>Stretches of shale that broke out into the hole: the pad tools read mud as well as rock.</summary>
internal static class Washouts
{
    private static readonly string[] Touched = ["CALI", "RHOB", "DRHO", "PEF", "NPHI", "DTC"];

    /// <summary>Makes up to <paramref name="count"/> washouts of 1.5 to 5 m, where the rock is shale.</summary>
    public static void Apply(Spoiler spoiler, Func<double, double> shaleVolume, int count)
    {
        for (var k = 0; k < count; k++)
        {
            var samples = spoiler.Draws.Whole(10, 32);
            var start = spoiler.Find(Touched, samples, 40, spoiler.Run.Count - 60, i => shaleVolume(spoiler.Run.Md(i)) > 0.8);
            if (start >= 0)
                Make(spoiler, start, samples);
        }
    }

    private static void Make(Spoiler spoiler, int start, int samples)
    {
        var draws = spoiler.Draws;
        var size = draws.Between(3.2, 5.5);
        var loss = draws.Between(0.22, 0.42);
        var rough = Noise.Curve(draws, samples, Physics.HalfFoot, 0.5, 0.16);
        // Steep ledges and a ragged floor; the pad loses the wall where the hole is largest.
        double Depth(int i) => Physics.Smooth(-0.5, 3, Math.Min(i - start, start + samples - 1 - i)) * Math.Max(0.35, 0.9 + rough[i - start]);
        spoiler.Change("CALI", start, samples, DamageKind.Washout, (i, value) => value + size * Depth(i));
        spoiler.Change("RHOB", start, samples, DamageKind.Washout, (i, value) => value - loss * Depth(i) * Depth(i));
        spoiler.Change("DRHO", start, samples, DamageKind.Washout, (i, value) => value + 0.45 * loss * Depth(i));
        spoiler.Change("PEF", start, samples, DamageKind.Washout, (i, value) => value * (1 - 0.25 * Depth(i)));
        spoiler.Change("NPHI", start, samples, DamageKind.Washout, (i, value) => value + 0.07 * Depth(i));
        spoiler.Change("DTC", start, samples, DamageKind.Washout, (i, value) => value + 1.2 * Depth(i));
    }
}
