using DepthStress.Core.Catalogue;
using DepthStress.Core.Diagnostics;
using DepthStress.Core.Logs;
using DepthStress.Core.Pressure;
using DepthStress.Core.Quantities;

namespace DepthStress.Core.Model;

/// <summary>Overburden and pore pressure.</summary>
internal static class PressureStage
{
    /// <summary>Fills vertical stress and the density it used; gives the density's origins, or null when there is none.</summary>
    /// <param name="setup">The setup.</param>
    /// <param name="density">The density log, or null.</param>
    /// <param name="table">The columns.</param>
    /// <param name="usable">Samples that enter the integral.</param>
    /// <param name="diagnostics">Gets errors that name unfilled intervals.</param>
    /// <param name="findings">Gets what rests on assumptions.</param>
    /// <param name="uses">Gets the relation used above the log.</param>
    public static OriginTrack? Overburden(
        WellSetup setup, Curve? density, PropertyTable table, bool[] usable, DiagnosticBag diagnostics, List<Finding> findings, List<LawUse> uses)
    {
        var settings = setup.Overburden;
        var tvd = table.Read(Property.TrueVerticalDepth);
        var problems = new List<FormattableString>();
        if (density is null || DensityProfile.Prepare(density, tvd, usable, setup.Frame.SolidTopTvd, settings, problems) is not { } profile)
        {
            diagnostics.Error(setup.Position, "no bulk density at any depth, expected a density curve: the overburden needs it");
            return null;
        }

        var frame = setup.Frame;
        var (firstDepth, depth) = (tvd[profile.First], tvd[profile.First] - frame.SolidTopTvd);
        if (!(depth <= 0) && profile.Above is null)
        {
            problems.Add($"density is not logged from {Quantity.Length(frame.SolidTopTvd)} (ground or mudline) to {Quantity.Length(firstDepth)} true vertical depth, and the overburden needs it: set [overburden] above_log");
        }

        foreach (var problem in problems) diagnostics.Error(setup.Position, UnitSystem.Metric.Show(problem));
        if (profile.Untied is { } untied) diagnostics.Error(settings.AboveLog.Source.Position, UnitSystem.Metric.Show(untied));
        if (problems.Count > 0 || profile.Untied is not null) return null;

        table.Adopt(Property.Density, profile.Values);
        var above = depth <= 0 ? 0 : profile.Above!.MassAbove(depth);
        var carry = Pressure.Overburden.Start(
            frame.WaterDepth ?? 0, settings.WaterDensity.Value, above, firstDepth, profile.Values[profile.First]);
        var stress = table.Write(Property.VerticalStress);
        Pressure.Overburden.Scan(tvd, Used(profile, usable), stress, ref carry);
        Pressure.Overburden.FillUnloggedShare(stress, Logged(profile.Origins), above * Constants.StandardGravity, table.Write(Property.UnloggedShare));
        if (profile.Above is { } assumed && tvd[profile.FirstLogged] > frame.SolidTopTvd)
        {
            findings.Add(Finding.General(
                Severity.Note,
                $"the vertical stress of {Quantity.Pressure(stress[profile.FirstLogged])} at {Quantity.Length(tvd[profile.FirstLogged])} true vertical depth rests on {assumed.Words} above the log"));
            if (assumed.Law is { } law) uses.Add(new LawUse(LawSlots.AboveLog, law, ZoneIndex.None, ZoneIndex.None, new LawOutcome(profile.FirstLogged + 1, 0, 0, 0)));
        }

        return profile.Origins;
    }

    /// <summary>
    /// Fills pore pressure: shale and plain lines run by run, then sands, then shifts to measured pressures. It depends on the settings of
    /// the runs and on earlier columns alone, and may be called again with other settings.
    /// </summary>
    /// <param name="setup">The setup.</param>
    /// <param name="table">The columns.</param>
    /// <param name="runs">Samples that share their settings.</param>
    /// <param name="uses">Gets how the laws served.</param>
    /// <returns>The trends that were fitted, what a reader should know, and what makes the input unusable.</returns>
    public static PressureOutcome PorePressure(WellSetup setup, PropertyTable table, IReadOnlyList<SettingsRun> runs, List<LawUse> uses)
    {
        var outcome = new PressureOutcome();
        table.Write(Property.PorePressure).Fill(double.NaN);
        var shale = ShaleSamples.Mark(setup, table, runs, outcome);
        var plans = PressurePlans.Prepare(setup, table, runs, shale, outcome);
        if (outcome.Problems.Count > 0) return outcome;
        foreach (var run in runs)
        {
            if (plans.TryGetValue(run.Settings, out var plan)) plan.Fill(setup, table, run, shale, uses);
        }

        LeastPressure.Apply(table, runs, shale, outcome);
        SandStage.Fill(setup, table, runs, plans, shale, outcome);
        TestShift.Apply(setup, table, runs, outcome);
        return outcome;
    }

    private static bool[] Logged(OriginTrack origins)
    {
        var logged = new bool[origins.Count];
        foreach (var run in origins.Runs)
            Array.Fill(logged, run.Origin is SampleOrigin.Measured or SampleOrigin.Spliced or SampleOrigin.Edited, run.Start, run.End - run.Start);
        return logged;
    }

    /// <summary>The profile's density, missing where a sample stays out of the integral.</summary>
    private static double[] Used(DensityProfile profile, bool[] usable)
    {
        if (Array.TrueForAll(usable, u => u)) return profile.Values;
        var used = (double[])profile.Values.Clone();
        for (var i = 0; i < used.Length; i++)
        {
            if (!usable[i]) used[i] = double.NaN;
        }

        return used;
    }
}
