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

    /// <summary>Fills pore pressure, run by run.</summary>
    public static void PorePressure(WellSetup setup, PropertyTable table, IReadOnlyList<SettingsRun> runs, List<LawUse> uses)
    {
        var plans = new Dictionary<PorePressureSettings, PorePressurePlan>(ReferenceEqualityComparer.Instance);
        var tvd = table.Read(Property.TrueVerticalDepth);
        var pressure = table.Write(Property.PorePressure);
        foreach (var run in runs)
        {
            var settings = run.Settings.PorePressure;
            if (!settings.Method.IsSet) continue;
            if (!plans.TryGetValue(settings, out var plan)) plans.Add(settings, plan = PorePressurePlan.Prepare(setup, settings));
            var depths = tvd.Slice(run.Start, run.Length);
            var result = pressure.Slice(run.Start, run.Length);
            if (plan.Law is not { } law || plan.Trend is not { } trend)
            {
                plan.Line.Fill(depths, result);
                continue;
            }

            plan.Line.Fill(depths, table.Write(Property.NormalPressure).Slice(run.Start, run.Length));
            trend.Fill(depths, setup.Frame.SolidTopTvd, table.Write(Property.NormalSlowness).Slice(run.Start, run.Length));
            uses.Add(new LawUse(LawSlots.PorePressure, law, run.Zone, run.Lithology, LawKernel.Apply(law, LawColumns.For(law, table, run), result)));
        }
    }

    /// <summary>What a pore-pressure method needs: its line, or normal pressure, trend and law.</summary>
    private sealed record PorePressurePlan(PressureLine Line, TrendLine? Trend, Law? Law)
    {
        public static PorePressurePlan Prepare(WellSetup setup, PorePressureSettings settings)
        {
            var line = PressureLine.Prepare(
                settings, setup.Frame, setup.Overburden.WaterDensity.Value, (depth, kind) => ZoneIndex.ToVertical(setup, depth, kind));
            if (settings.Method.Value != PorePressureMethod.EatonSonic) return new PorePressurePlan(line, null, null);
            var law = PressureMethods.EatonSonic;
            if (settings.Exponent.IsSet) law = law with { Coefficients = [new Coefficient("n", settings.Exponent.Value)] };
            return new PorePressurePlan(line, new TrendLine(settings.Trend.Value), law);
        }
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
