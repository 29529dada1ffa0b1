using DepthStress.Core.Diagnostics;
using DepthStress.Core.Quantities;

namespace DepthStress.Core.Model;

/// <summary>Finds observations, muds and shoes that the hole cannot have, once its path is known.</summary>
internal static class ObservationCheck
{
    /// <summary>Reports every problem.</summary>
    public static void Report(WellSetup setup, DiagnosticBag diagnostics)
    {
        ReportMud(setup, diagnostics);
        ReportShoes(setup, diagnostics);
        foreach (var observation in setup.Observations) Report(setup, ObservedInterval.Of(setup, observation), diagnostics);
    }

    private static void Report(WellSetup setup, ObservedInterval interval, DiagnosticBag diagnostics)
    {
        var (position, kind) = (interval.Observation.Position, interval.Observation.Kind);
        if (double.IsNaN(interval.Top) || double.IsNaN(interval.Base))
        {
            diagnostics.Error(position, $"{kind.Word()}: the hole never reaches its depths");
            return;
        }

        if (interval.Base < interval.Top)
        {
            diagnostics.Error(position, $"{kind.Word()}: the hole turns upwards here, so its vertical depths name no interval; expected measured depths");
            return;
        }

        if (kind.IsBreakout() && interval.FluidDensity is null)
            diagnostics.Error(position, $"{kind.Word()}: found no fluid_density, expected one, or [mud] density at {Show(interval.Top)} measured depth: the mud supports the wall");
        foreach (var shoe in kind.IsBelowShoe() ? HoleIndex.Shoes(setup) : [])
        {
            if (shoe > interval.Top && shoe < interval.Base)
                diagnostics.Warning(position, $"{kind.Word()}: found the casing shoe at {Show(shoe)} measured depth inside its interval, expected the interval to begin at or below the shoe");
        }
    }

    private static void ReportMud(WellSetup setup, DiagnosticBag diagnostics)
    {
        if (!setup.Mud.Density.IsSet || !setup.Mud.DepthKind.IsSet) return;
        var position = setup.Mud.Density.Source.Position;
        var previous = double.NegativeInfinity;
        foreach (var top in setup.Mud.Density.Value.Select(m => ZoneIndex.ToMeasured(setup, m.Top, setup.Mud.DepthKind.Value)))
        {
            if (double.IsNaN(top)) diagnostics.Error(position, "[mud] density: the hole never reaches one of the tops");
            else if (top <= previous) diagnostics.Error(position, $"[mud] density: found a top at {Show(top)} measured depth below one at {Show(previous)}, expected them from top to bottom");
            previous = double.IsNaN(top) ? previous : top;
        }
    }

    private static void ReportShoes(WellSetup setup, DiagnosticBag diagnostics)
    {
        if (HoleIndex.Shoes(setup).Any(double.IsNaN))
            diagnostics.Error(setup.Casing.Shoes.Source.Position, "[casing] shoes: the hole never reaches one of them");
    }

    private static string Show(double metres) => UnitSystem.Metric.Show(Quantity.Length(metres));
}
