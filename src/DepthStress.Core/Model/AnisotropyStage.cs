using DepthStress.Core.Logs;
using DepthStress.Core.Rock;

namespace DepthStress.Core.Model;

/// <summary>
/// Velocities across the beds from those along the hole, and the dynamic constants of layered rock, where a model of
/// anisotropy is chosen. Before pore pressure, so that everything after it rests on the same velocities.
/// </summary>
internal static class AnisotropyStage
{
    /// <summary>The name of the step in origins.</summary>
    public const string Step = "velocity across the beds";

    /// <summary>Fills the velocities and dynamic constants of the runs that have a model.</summary>
    /// <returns>The logs, with the velocities that were changed.</returns>
    public static LogTable Apply(
        WellSetup setup, LogTable logs, PropertyTable table, IReadOnlyList<SettingsRun> runs, List<LawUse> uses, List<Finding> findings)
    {
        if (!runs.Any(r => r.Settings.Anisotropy.IsOn) || !table.Has(Property.Vp) || !table.Has(Property.Vs)) return logs;
        var (vp, vs) = (table.Read(Property.Vp).ToArray(), table.Read(Property.Vs).ToArray());
        var tally = new AnisotropyTally(setup, table, vp, vs);
        foreach (var run in runs.Where(r => r.Settings.Anisotropy.IsOn)) Fill(run, table, vp, vs, tally);
        tally.Report(logs, runs, uses, findings);
        if (!tally.Changed.AsSpan().Contains(true)) return logs;
        table.Adopt(Property.Vp, vp);
        table.Adopt(Property.Vs, vs);
        return logs.With(new[] { (Property.Vp, vp), (Property.Vs, vs) }
            .Select(c => (Curve: logs[c.Item1], Values: c.Item2)).Where(c => c.Curve is not null)
            .Select(c => c.Curve! with { Values = c.Values, Origins = Edited(c.Curve.Origins, tally.Changed) }));
    }

    private static void Fill(SettingsRun run, PropertyTable table, double[] vp, double[] vs, AnisotropyTally tally)
    {
        var settings = run.Settings.Anisotropy;
        var source = new AnisotropySource(table, settings);
        var density = table.Read(Property.Density);
        var angle = table.Read(Property.BeddingAngle);
        var vertical = table.Write(Property.YoungsDynamic);
        var horizontal = table.Write(Property.YoungsDynamicHorizontal);
        var poisson = table.Write(Property.PoissonDynamic);
        var poissonHorizontal = table.Write(Property.PoissonDynamicHorizontal);
        var bedShear = table.Write(Property.BedShearStiffness);
        for (var i = run.Start; i < run.End; i++)
        {
            if (double.IsNaN(vp[i]) || double.IsNaN(vs[i]) || double.IsNaN(density[i])) continue;
            var (p, s) = (vp[i], vs[i]);
            var lack = source.At(i, out var closure);
            if (lack == AnisotropyLack.None && settings.AlongHole.Value)
            {
                (p, s) = VerticalVelocity.Of(p, s, settings.ShearWave.Value, angle[i], closure.Over(density[i]));
                if (double.IsNaN(p)) lack = AnisotropyLack.NoVertical;
            }

            var stiffness = default(VtiStiffness);
            if (lack == AnisotropyLack.None)
            {
                stiffness = closure.Of(density[i] * p * p, DynamicModuli.Shear(s, density[i]));
                if (!stiffness.IsStable) lack = AnisotropyLack.Unstable;
            }

            tally.Add(run, i, lack);
            if (lack == AnisotropyLack.None)
            {
                tally.Changed[i] = p != vp[i] || s != vs[i];
                (vp[i], vs[i], bedShear[i]) = (p, s, stiffness.C66);
                var constants = VtiConstants.Of(stiffness);
                (vertical[i], horizontal[i]) = (constants.Vertical, constants.Horizontal);
                (poisson[i], poissonHorizontal[i]) = (constants.PoissonVertical, constants.PoissonHorizontal);
            }
            else if (settings.IsotropicOutside.Value)
            {
                vertical[i] = horizontal[i] = DynamicModuli.Youngs(p = vp[i], s = vs[i], density[i]);
                poisson[i] = poissonHorizontal[i] = DynamicModuli.Poisson(p, s);
            }
        }
    }

    /// <summary>Logged values that were changed are edited; weaker origins stay.</summary>
    private static OriginTrack Edited(OriginTrack origins, bool[] changed)
    {
        var before = new SampleOrigin[changed.Length];
        origins.Weaken(before);
        return origins.Mark([.. changed.Select((c, i) => c && before[i] < SampleOrigin.Edited)], SampleOrigin.Edited, Step);
    }
}
