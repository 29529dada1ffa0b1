using DepthStress.Core.Catalogue;
using DepthStress.Core.Logs;
using DepthStress.Core.Pressure;

namespace DepthStress.Core.Model;

/// <summary>Prepares the pore pressure of every resolved choice once.</summary>
internal static class PressurePlans
{
    /// <summary>The plan of each settings object that chooses a method.</summary>
    public static Dictionary<StageSettings, PressurePlan> Prepare(
        WellSetup setup, PropertyTable table, IReadOnlyList<SettingsRun> runs, bool[] shale, PressureOutcome outcome)
    {
        var plans = new Dictionary<StageSettings, PressurePlan>(ReferenceEqualityComparer.Instance);
        var trends = new TrendStage(setup, table, runs, shale, outcome);
        var laws = new Dictionary<(PorePressureMethod, double, bool), Law>();
        foreach (var settings in runs.Select(r => r.Settings))
        {
            if (plans.ContainsKey(settings) || !settings.PorePressure.Method.IsSet) continue;
            plans.Add(settings, Prepare(setup, table, settings, trends, laws));
        }

        return plans;
    }

    private static PressurePlan Prepare(
        WellSetup setup, PropertyTable table, StageSettings settings, TrendStage trends, Dictionary<(PorePressureMethod, double, bool), Law> laws)
    {
        var pore = settings.PorePressure;
        double Vertical(double depth, Depth.DepthKind kind) => ZoneIndex.ToVertical(setup, depth, kind);
        FluidLine Fluids() => FluidLine.Prepare(settings.Fluids, pore, setup.Frame, Vertical);
        if (ShaleMethod.Of(pore.Method.Value) is not { } method)
        {
            return pore.Method.Value == PorePressureMethod.FluidLine
                ? new PressurePlan(settings) { Fluids = Fluids() }
                : new PressurePlan(settings) { Line = PressureLine.Prepare(pore, setup.Frame, setup.Overburden.WaterDensity.Value, Vertical) };
        }

        var line = pore.FluidDensity.IsSet ? PressureLine.Hydrostatic(setup.Frame, pore.FluidDensity.Value) : null;
        var trend = method.Trend is { } quantity ? trends.For(settings, quantity) : null;
        return new PressurePlan(trend is ExponentialTrend known ? Put(settings, known) : settings)
        {
            Line = line,
            Method = method,
            Law = Law(method, pore, laws),
            Trend = trend,
            Stresses = method.Method == PorePressureMethod.EquivalentDepth && line is not null ? NormalStress.Of(setup, table, line) : null,
            SandLine = pore.Sands is { IsSet: true, Value: SandPressure.Table } ? PressureLine.Table(pore, Vertical) : null,
            SandFluids = pore.Sands is { IsSet: true, Value: SandPressure.FluidLine } ? Fluids() : null,
        };
    }

    private static StageSettings Put(StageSettings settings, ExponentialTrend trend) =>
        settings with { PorePressure = settings.PorePressure with { NormalTrend = settings.PorePressure.NormalTrend.With(trend) } };

    /// <summary>
    /// The law with the user's exponent in Eaton's methods, and with results below zero where the normal pressure takes their place;
    /// equal choices share one.
    /// </summary>
    private static Law Law(ShaleMethod method, PorePressureSettings pore, Dictionary<(PorePressureMethod, double, bool), Law> laws)
    {
        var eaton = method.Method is PorePressureMethod.EatonSonic or PorePressureMethod.EatonResistivity;
        var exponent = eaton && pore.Exponent.IsSet ? pore.Exponent.Value : double.NaN;
        if (laws.TryGetValue((method.Method, exponent, pore.AtLeastNormal.Value), out var law)) return law;
        law = method.Law;
        if (!double.IsNaN(exponent)) law = law with { Coefficients = [new Coefficient("n", exponent)] };
        if (pore.AtLeastNormal.Value) law = law with { ResultDomain = Interval.All };
        laws.Add((method.Method, exponent, pore.AtLeastNormal.Value), law);
        return law;
    }
}
