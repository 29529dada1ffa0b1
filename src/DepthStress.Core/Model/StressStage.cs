using DepthStress.Core.Logs;

namespace DepthStress.Core.Model;

/// <summary>Horizontal stresses and what they rest on.</summary>
internal static class StressStage
{
    /// <summary>The log curves that a horizontal stress rests on.</summary>
    private static readonly Property[] StressCurves = [Property.Vp, Property.Vs, Property.Density];

    /// <summary>
    /// The model with the horizontal stresses of another setup that differs in the settings for these alone. Its findings are those
    /// of the first model: they are not looked for again.
    /// </summary>
    public static EarthModel Again(EarthModel model, WellSetup setup)
    {
        var table = model.Values.Sharing(Property.MinHorizontalStress, Property.MaxHorizontalStress);
        var runs = SettingsRun.Resolve(setup, model.Zones, model.Lithologies);
        Apply(setup, table, runs);
        return model with { Setup = setup, Values = table, Runs = runs };
    }

    /// <summary>True when a lithology is salt, whose stresses are all equal.</summary>
    public static bool IsSalt(WellSetup setup, int lithology) => lithology >= 0 && setup.Lithologies[lithology].Rule.Salt;

    /// <summary>
    /// Fills the horizontal stresses, run by run; SHmax stays missing where no strain constrains it, and salt is isotropic.
    /// </summary>
    public static void Apply(WellSetup setup, PropertyTable table, IReadOnlyList<SettingsRun> runs)
    {
        var shmin = table.Write(Property.MinHorizontalStress);
        var shmax = table.Write(Property.MaxHorizontalStress);
        foreach (var run in runs)
        {
            var (start, n) = (run.Start, run.Length);
            if (IsSalt(setup, run.Lithology))
            {
                table.Read(Property.VerticalStress).Slice(start, n).CopyTo(shmin.Slice(start, n));
                table.Read(Property.VerticalStress).Slice(start, n).CopyTo(shmax.Slice(start, n));
                continue;
            }

            HorizontalStress.Fill(
                table, run.Settings, start, n, run.Settings.HorizontalStress.BothStrains(), shmin.Slice(start, n), shmax.Slice(start, n));
        }
    }

    /// <summary>The weakest origin of the curves each sample's stresses rest on; density alone where only Sv is there or a ratio gives the others.</summary>
    public static SampleOrigin[] Basis(WellSetup setup, LogTable logs, OriginTrack density, PropertyTable table, IReadOnlyList<SettingsRun> runs, ReadOnlySpan<short> lithologies)
    {
        var basis = new SampleOrigin[table.Count];
        density.Weaken(basis);
        var vertical = (SampleOrigin[])basis.Clone();
        foreach (var property in StressCurves)
        {
            if (property != Property.Density) logs[property]?.Origins.Weaken(basis);
        }

        var sv = table.Read(Property.VerticalStress);
        var shmin = table.Read(Property.MinHorizontalStress);
        foreach (var run in runs.Where(r => r.Settings.HorizontalStress.ByRatio)) vertical.AsSpan(run.Start, run.Length).CopyTo(basis.AsSpan(run.Start));
        for (var i = 0; i < basis.Length; i++)
        {
            if (double.IsNaN(sv[i])) basis[i] = SampleOrigin.None;
            else if (double.IsNaN(shmin[i]) || IsSalt(setup, lithologies[i])) basis[i] = vertical[i];
        }

        return basis;
    }
}
