namespace SampleWell.Logging;

/// <summary>Values that cannot be rock: skipped sonic cycles, knocks on the density pad, electrical noise.</summary>
internal static class Spikes
{
    /// <summary>Scatters spikes over a run.</summary>
    public static void Apply(Spoiler spoiler)
    {
        Scatter(spoiler, "DTC", 5, 3, draws => value => value + draws.Between(28, 60));
        Scatter(spoiler, "DTC", 2, 1, draws => value => value - draws.Between(22, 32));
        Scatter(spoiler, "DTS", 5, 3, draws => value => value + draws.Between(45, 90));
        Scatter(spoiler, "RHOB", 3, 2, draws => value => value - draws.Between(0.30, 0.55));
        Scatter(spoiler, "GR", 2, 1, draws => value => value + draws.Between(90, 160));
        Scatter(spoiler, "RD", 3, 2, draws => value => value * draws.Between(6, 20));
        Scatter(spoiler, "PEF", 2, 2, draws => value => value + draws.Between(3, 5));
    }

    private static void Scatter(Spoiler spoiler, string curve, int count, int longest, Func<Draws, Func<double, double>> kind)
    {
        for (var k = 0; k < count; k++)
        {
            var samples = spoiler.Draws.Whole(1, longest);
            var start = spoiler.Find([curve], samples, 40, spoiler.Run.Count - 60);
            if (start < 0)
                continue;
            var spike = kind(spoiler.Draws);
            spoiler.Change(curve, start, samples, DamageKind.Spike, (_, value) => spike(value));
        }
    }
}
