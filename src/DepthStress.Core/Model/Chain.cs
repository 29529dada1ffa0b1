using DepthStress.Core.Diagnostics;
using DepthStress.Core.Lithology;
using DepthStress.Core.Logs;

namespace DepthStress.Core.Model;

/// <summary>
/// The ordered stages from logs to stresses: conditioning, depth, shale and lithology, missing density and shear,
/// overburden, anisotropy, pore pressure, rock, temperature, horizontal stress. One code path for every kind of run.
/// </summary>
public static class Chain
{
    /// <summary>Runs every stage.</summary>
    /// <param name="setup">The well's setup, already checked.</param>
    /// <param name="logs">The logs in SI.</param>
    /// <param name="diagnostics">Gets what makes the input unusable.</param>
    /// <returns>The model, or null when the input cannot be used; the reason is then among the diagnostics.</returns>
    public static EarthModel? Run(WellSetup setup, LogTable logs, DiagnosticBag diagnostics)
    {
        ArgumentNullException.ThrowIfNull(setup);
        ArgumentNullException.ThrowIfNull(logs);
        ArgumentNullException.ThrowIfNull(diagnostics);
        var findings = new List<Finding>();
        var uses = new List<LawUse>();

        if (CurvePath.Resolve(setup, logs, diagnostics, findings) is not { } resolved) return null;
        setup = resolved;
        var zones = new short[logs.Count];
        ZoneIndex.Fill(setup, logs.Depths, zones);
        logs = ConditioningStage.Apply(setup, logs, zones, findings);
        var table = Adopt(logs);
        var usable = DepthStage.Apply(setup, table, findings);
        findings.AddRange(DepthCrossCheck.Of(setup, logs, table));
        var lithologies = new short[logs.Count];
        Array.Fill(lithologies, LithologyIndex.None);
        var runs = SettingsRun.Resolve(setup, zones, lithologies);
        ShaleStage.Apply(table, runs, uses, findings);
        if (setup.Lithologies.Count > 0)
        {
            LithologyIndex.Fill([.. setup.Lithologies.Select(l => l.Rule)], table, lithologies);
            runs = SettingsRun.Resolve(setup, zones, lithologies);
        }

        (logs, var predictions) = PredictionStage.Apply(setup, logs, table, runs, uses, findings);
        if (PressureStage.Overburden(setup, logs[Property.Density], table, usable, diagnostics, findings, uses) is not { } densityOrigins) return null;
        logs = AnisotropyStage.Apply(setup, logs, table, runs, uses, findings);
        LawColumns.Derive(table, runs);
        LawStage.Apply(LawSlots.Porosity, table, runs, uses);
        var pressure = PressureStage.PorePressure(setup, table, runs, uses);
        if (!pressure.Report(diagnostics, setup.Position)) return null;
        findings.AddRange(pressure.Findings);
        RockStage.Apply(table, runs, uses, findings);
        TemperatureStage.Apply(setup, table, runs);
        StressStage.Apply(setup, table, runs);
        var comparisons = ComparisonStage.Apply(setup, table, runs, uses);

        var model = new EarthModel
        {
            Setup = setup,
            Logs = logs,
            Values = table,
            Usable = usable,
            Zones = zones,
            Lithologies = lithologies,
            Runs = runs,
            DensityOrigins = densityOrigins,
            StressBasis = StressStage.Basis(setup, logs, densityOrigins, table, runs, lithologies),
            LawUses = uses,
            Predictions = predictions,
            Trends = pressure.Trends,
            Comparisons = comparisons,
            Findings = findings,
        };
        return model with { Findings = FindingRules.Sort(findings.Concat(FindingRules.All.SelectMany(rule => rule(model)))) };
    }

    private static PropertyTable Adopt(LogTable logs)
    {
        var table = new PropertyTable(logs.Count);
        table.Adopt(Property.MeasuredDepth, logs.Depths);
        foreach (var curve in logs.Curves)
        {
            // Stages write shale volume and porosity; the logged values stay whole in the log table.
            var written = curve.Role.Property is Property.ShaleVolume or Property.Porosity;
            table.Adopt(curve.Role.Property, written ? (double[])curve.Values.Clone() : curve.Values);
        }

        return table;
    }
}
