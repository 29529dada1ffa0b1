using DepthStress.Core.Logs;
using DepthStress.Core.Rock;

namespace DepthStress.Core.Model;

/// <summary>Dynamic constants from velocities, then everything that laws make of the rock.</summary>
internal static class RockStage
{
    private static readonly Property[] Elastic = [Property.YoungsStatic, Property.PoissonStatic, Property.Biot];

    /// <summary>Fills the constants and strengths of every run.</summary>
    public static void Apply(PropertyTable table, IReadOnlyList<SettingsRun> runs, List<LawUse> uses, List<Finding> findings)
    {
        if (table.Has(Property.Vp) && table.Has(Property.Vs))
        {
            var youngs = table.Write(Property.YoungsDynamic);
            var poisson = table.Write(Property.PoissonDynamic);
            var vp = table.Read(Property.Vp);
            var vs = table.Read(Property.Vs);
            var density = table.Read(Property.Density);
            foreach (var run in runs.Where(r => !r.Settings.Anisotropy.IsOn))
            {
                var (start, n) = (run.Start, run.Length);
                DynamicModuli.Fill(vp.Slice(start, n), vs.Slice(start, n), density.Slice(start, n), youngs.Slice(start, n), poisson.Slice(start, n));
            }
        }

        Laws(table, runs, LawSlots.Rock.Skip(1), uses, findings);
    }

    /// <summary>Fills what a horizontal stress needs of the rock, the dynamic constants being there: static constants and Biot's coefficient.</summary>
    public static void ApplyElastic(PropertyTable table, IReadOnlyList<SettingsRun> runs) =>
        Laws(table, runs, LawSlots.Rock.Where(s => Elastic.Contains(s.Property)), [], []);

    private static void Laws(PropertyTable table, IReadOnlyList<SettingsRun> runs, IEnumerable<LawSlot> slots, List<LawUse> uses, List<Finding> findings)
    {
        foreach (var slot in slots)
        {
            LawStage.Apply(slot, table, runs, uses);
            if (slot.Property == Property.PoissonStatic) VtiStaticStage.Moduli(table, runs, findings);
        }

        VtiStaticStage.Biot(table, runs, findings);
    }
}
