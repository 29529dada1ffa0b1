using DepthStress.Core.Catalogue;
using DepthStress.Core.Logs;

namespace DepthStress.Core.Model;

/// <summary>Applies the chosen law of one slot to every run, and counts how it served.</summary>
internal static class LawStage
{
    /// <summary>Fills the slot's property over the runs where a law is chosen.</summary>
    public static void Apply(LawSlot slot, PropertyTable table, IReadOnlyList<SettingsRun> runs, List<LawUse> uses)
    {
        var counts = new Dictionary<(short Zone, short Lithology), (Law Law, LawOutcome Outcome)>();
        foreach (var run in runs)
        {
            var choice = slot.Choice(run.Settings);
            if (!choice.IsSet) continue;
            var law = choice.Value;
            var outcome = LawKernel.Apply(law, LawColumns.For(law, table, run), table.Write(slot.Property).Slice(run.Start, run.Length));
            if (slot.Property == Property.YoungsStatic) Multiply(table.Write(slot.Property).Slice(run.Start, run.Length), run.Settings.Moduli.StaticYoungsFactor.Value);
            var key = (run.Zone, run.Lithology);
            counts[key] = (law, counts.TryGetValue(key, out var before) ? before.Outcome + outcome : outcome);
        }

        uses.AddRange(counts.Select(c => new LawUse(slot, c.Value.Law, c.Key.Zone, c.Key.Lithology, c.Value.Outcome)));
    }

    private static void Multiply(Span<double> values, double factor)
    {
        if (factor == 1) return;
        for (var i = 0; i < values.Length; i++) values[i] *= factor;
    }
}
