namespace SampleWell.Logging;

/// <summary>Stretches and single samples without values.</summary>
internal static class Gaps
{
    /// <summary>Erases stretches of about <paramref name="length"/> samples; a curve resampled there has a smeared sample at each end.</summary>
    public static void Apply(Spoiler spoiler, string[] curves, int length, int count)
    {
        for (var k = 0; k < count; k++)
        {
            var samples = length + spoiler.Draws.Whole(-5, 5);
            var start = spoiler.Find(curves, samples + 2, 40, spoiler.Run.Count - 60);
            if (start < 0)
                continue;
            foreach (var curve in curves)
            {
                spoiler.Erase(curve, start + 1, samples, DamageKind.Gap);
                Smear(spoiler, curve, start);
                Smear(spoiler, curve, start + samples + 1);
            }
        }
    }

    /// <summary>Erases one or two samples of each curve named.</summary>
    public static void Nulls(Spoiler spoiler, string[] curves)
    {
        foreach (var curve in curves)
        {
            var samples = spoiler.Draws.Whole(1, 2);
            var start = spoiler.Find([curve], samples, 40, spoiler.Run.Count - 60);
            if (start >= 0)
                spoiler.Erase(curve, start, samples, DamageKind.Null);
        }
    }

    private static void Smear(Spoiler spoiler, string curve, int index)
    {
        var share = spoiler.Draws.Between(0.25, 0.8);
        spoiler.Change(curve, index, 1, DamageKind.NullSmear, (_, value) => share * value + (1 - share) * Curve.Missing);
    }
}
