using DepthStress.Core.Depth;
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
            scope.Missing("[pore_pressure] method", $"hydrostatic, gradient, table or {PressureMethods.EatonSonic.Id}");
            return;
        }

        switch (pore.Method.Value)
        {
            case PorePressureMethod.Hydrostatic when !pore.FluidDensity.IsSet:
                scope.Missing("[pore_pressure] fluid_density", "such as \"1.03 g/cm3\"");
                break;
            case PorePressureMethod.EatonSonic:
                if (!pore.FluidDensity.IsSet) scope.Missing("[pore_pressure] fluid_density", "the fluid of normal pressure, such as \"1.03 g/cm3\"");
                if (!pore.Trend.IsSet) scope.Missing("[pore_pressure] trend", "two or more points of depth below the ground or mudline and slowness");
                else if (!IsTrend(pore.Trend.Value))
                    scope.Error(pore.Trend.Source.Position, "[pore_pressure] trend: expected two or more points with depth and slowness, from top to bottom");
                break;
            case PorePressureMethod.Gradient:
                if (!pore.Gradient.IsSet) scope.Missing("[pore_pressure] gradient", "such as \"10.5 kPa/m\"");
                if (!pore.Reference.IsSet) scope.Missing("[pore_pressure] reference", "rotary table, ground, sea surface or mudline");
                else if (scope.Setup.FrameKnown && !frame.Has(pore.Reference.Value))
                    scope.Error(pore.Reference.Source.Position, $"found a reference that an {(frame.IsOffshore ? "offshore" : "onshore")} well does not have, expected {(frame.IsOffshore ? "rotary table, sea surface or mudline" : "rotary table or ground")}");
                break;
            case PorePressureMethod.Table:
                if (!pore.Points.IsSet) scope.Missing("[pore_pressure] points", "a table of depth and pressure");
                if (!pore.DepthKind.IsSet) scope.Missing("[pore_pressure] depth_kind", "md, tvd or tvdss");
                if (pore.Points.IsSet && pore.DepthKind.IsSet && !GetsDeeper(scope.Setup, pore.Points.Value, pore.DepthKind.Value))
                    scope.Error(pore.Points.Source.Position, "[pore_pressure] points do not get deeper, expected true vertical depths that increase from point to point");
                break;
        }
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
