using DepthStress.Core.Depth;
using DepthStress.Core.Diagnostics;
using DepthStress.Core.Logs;
using DepthStress.Core.Pressure;

namespace DepthStress.Core.Model;

/// <summary>Finds choices of the pore pressure that are missing or that do not go together.</summary>
internal static class PorePressureCheck
{
    /// <summary>Reports what the pore pressure lacks.</summary>
    public static void Report(CheckScope scope)
    {
        var (pore, frame) = (scope.Settings.PorePressure, scope.Setup.Frame);
        if (!pore.Method.IsSet)
        {
            scope.Missing("[pore_pressure] method", $"hydrostatic, gradient, table, fluid line, {MethodCatalogue.Choices(Property.PorePressure)}");
            return;
        }

        switch (pore.Method.Value)
        {
            case PorePressureMethod.Hydrostatic when !pore.FluidDensity.IsSet:
                scope.Missing("[pore_pressure] fluid_density", "such as \"1.03 g/cm3\"");
                break;
            case PorePressureMethod.Gradient:
                if (!pore.Gradient.IsSet) scope.Missing("[pore_pressure] gradient", "such as \"10.5 kPa/m\"");
                if (!pore.Reference.IsSet) scope.Missing("[pore_pressure] reference", "rotary table, ground, sea surface or mudline");
                else if (scope.Setup.FrameKnown && !frame.Has(pore.Reference.Value))
                    scope.Error(pore.Reference.Source.Position, $"found a reference that an {(frame.IsOffshore ? "offshore" : "onshore")} well does not have, expected {(frame.IsOffshore ? "rotary table, sea surface or mudline" : "rotary table or ground")}");
                break;
            case PorePressureMethod.Table:
                ReportTable(scope);
                break;
            case PorePressureMethod.FluidLine:
                FluidCheck.Report(scope);
                break;
        }

        if (ShaleMethod.Of(pore.Method.Value) is { } method) ReportShale(scope, method);
    }

    /// <summary>Reports what a method that tells the pressure of shale lacks.</summary>
    private static void ReportShale(CheckScope scope, ShaleMethod method)
    {
        var pore = scope.Settings.PorePressure;
        if ((method.NeedsNormalPressure || pore.AtLeastNormal.Value) && !pore.FluidDensity.IsSet)
            scope.Missing("[pore_pressure] fluid_density", "the fluid of normal pressure, such as \"1.03 g/cm3\"");
        if (method.Trend is { } quantity) ReportTrend(scope, method, quantity);
        foreach (var parameter in method.Law.Inputs.Select(i => LawParameters.Of(i.Property)).OfType<LawParameter>())
        {
            // Those of a trend are fitted where they are not given.
            if (method.Trend is null && double.IsNaN(parameter.Value(scope.Settings))) scope.Missing(parameter.Key, $"a value: {method.Law.Id} has no default for it");
        }

        if (pore.ShaleLithologies.IsSet)
        {
            var names = scope.Setup.Lithologies.Select(l => l.Rule.Name).ToList();
            foreach (var name in pore.ShaleLithologies.Value.Except(names))
                scope.Error(pore.ShaleLithologies.Source.Position, $"found the unknown lithology \"{name}\" in shale_lithologies, expected one of {(names.Count == 0 ? "the names in [[lithology]], of which there are none" : string.Join(", ", names))}{NearestName.Hint(name, names)}");
        }

        if (!pore.Sands.IsSet) return;
        if (pore.Sands.Value == SandPressure.Table) ReportTable(scope);
        if (pore.Sands.Value == SandPressure.FluidLine) FluidCheck.Report(scope);
    }

    private static void ReportTrend(CheckScope scope, ShaleMethod method, TrendQuantity quantity)
    {
        var (pore, given) = (scope.Settings.PorePressure, scope.Settings.PorePressure.NormalTrend);
        // Zhang's forms take the trend's parameters, not its values.
        var points = quantity == TrendQuantity.Slowness && method.Method != PorePressureMethod.ZhangSonic;
        if (pore.Trend.IsSet && given.Says(quantity))
            scope.Error(pore.Trend.Source.Position, $"found both [pore_pressure] trend and [pore_pressure.normal_trend]{scope.Owner}, expected the trend as points or as an exponential");
        if (points && pore.Trend.IsSet)
        {
            if (!IsTrend(pore.Trend.Value))
                scope.Error(pore.Trend.Source.Position, "[pore_pressure] trend: expected two or more points with depth and slowness, from top to bottom");
            else if (pore.Trend.Value.Zip(pore.Trend.Value.Skip(1)).Any(p => p.Second.Slowness > p.First.Slowness))
                scope.Error(pore.Trend.Source.Position, "[pore_pressure] trend: found a trend that gets slower with depth, expected normally compacted shale that gets faster");
            return;
        }

        if (!given.Says(quantity))
        {
            if (points) scope.Missing("[pore_pressure] trend", "two or more points of depth below the ground or mudline and slowness, or [pore_pressure.normal_trend] with top, base and depth_kind of normally compacted shale");
            else scope.Missing("[pore_pressure.normal_trend]", "top, base and depth_kind of normally compacted shale, or the parameters of the trend");
            return;
        }

        if (quantity == TrendQuantity.Slowness && given.SurfaceSlowness.IsSet && given.MatrixSlowness.IsSet && given.SurfaceSlowness.Value <= given.MatrixSlowness.Value)
            scope.Error(given.SurfaceSlowness.Source.Position, "[pore_pressure.normal_trend]: expected surface_slowness above matrix_slowness: shale gets faster with depth");
        if (given.Smoothing.IsSet != given.Window.IsSet)
            scope.Missing(given.Window.IsSet ? "[pore_pressure.normal_trend] smoothing" : "[pore_pressure.normal_trend] window", "both or neither");
        if (given.IsWhole(quantity)) return;
        if (!given.Top.IsSet) scope.Missing("[pore_pressure.normal_trend] top", "the top of normally compacted shale to fit the trend to");
        if (!given.Base.IsSet) scope.Missing("[pore_pressure.normal_trend] base", "the base of normally compacted shale to fit the trend to");
        if (!given.DepthKind.IsSet) scope.Missing("[pore_pressure.normal_trend] depth_kind", "md, tvd or tvdss");
        if (given.Top.IsSet && given.Base.IsSet && given.Base.Value <= given.Top.Value)
            scope.Error(given.Base.Source.Position, "[pore_pressure.normal_trend]: expected base below top");
    }

    /// <summary>Reports what a table of points lacks.</summary>
    internal static void ReportTable(CheckScope scope)
    {
        var pore = scope.Settings.PorePressure;
        if (!pore.Points.IsSet) scope.Missing("[pore_pressure] points", "a table of depth and pressure");
        if (!pore.DepthKind.IsSet) scope.Missing("[pore_pressure] depth_kind", "md, tvd or tvdss");
        if (pore.Points.IsSet && pore.DepthKind.IsSet && !GetsDeeper(scope.Setup, pore.Points.Value, pore.DepthKind.Value))
            scope.Error(pore.Points.Source.Position, "[pore_pressure] points do not get deeper, expected true vertical depths that increase from point to point");
    }

    /// <summary>A value that could not be read has been reported where it stands.</summary>
    private static bool IsTrend(IReadOnlyList<TrendPoint> points) =>
        points.Count > 1 && points.Zip(points.Skip(1)).All(pair => !(pair.Second.Depth <= pair.First.Depth));

    private static bool GetsDeeper(WellSetup setup, IReadOnlyList<PressurePoint> points, DepthKind kind)
    {
        var above = double.NegativeInfinity;
        foreach (var point in points.Where(p => !double.IsNaN(p.Depth)))
        {
            var depth = ZoneIndex.ToVertical(setup, point.Depth, kind);
            if (!(depth > above)) return false;
            above = depth;
        }

        return points.Count > 0;
    }
}
