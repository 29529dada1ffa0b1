using DepthStress.Core.Diagnostics;
using DepthStress.Core.Pressure;
using DepthStress.Core.Quantities;

namespace DepthStress.Core.Model;

/// <summary>Finds fluids and contacts that are missing or that do not go together.</summary>
internal static class FluidCheck
{
    /// <summary>Reports what a fluid column lacks.</summary>
    public static void Report(CheckScope scope)
    {
        var fluids = scope.Settings.Fluids;
        var (gasOil, oilWater, gasWater) = (fluids.GasOilContact, fluids.OilWaterContact, fluids.GasWaterContact);
        var contact = gasOil.IsSet || oilWater.IsSet || gasWater.IsSet;
        if (gasWater.IsSet && (gasOil.IsSet || oilWater.IsSet))
        {
            scope.Error(gasWater.Source.Position, $"[fluids]: found gas_water_contact beside another contact{scope.Owner}, expected it alone: where there is oil, gas lies on oil and oil on water");
            return;
        }

        Needs(scope, gasOil.IsSet || gasWater.IsSet, fluids.GasDensity, "gas_density", "0.2 g/cm3");
        Needs(scope, gasOil.IsSet || oilWater.IsSet, fluids.OilDensity, "oil_density", "0.75 g/cm3");
        Needs(scope, !gasOil.IsSet || oilWater.IsSet, fluids.WaterDensity, "water_density", "1.05 g/cm3");
        Heavier(scope, fluids.GasDensity, fluids.OilDensity, "gas_density", "oil_density");
        Heavier(scope, fluids.OilDensity, fluids.WaterDensity, "oil_density", "water_density");
        Heavier(scope, fluids.GasDensity, fluids.WaterDensity, "gas_density", "water_density");
        if ((contact || fluids.AnchorDepth.IsSet) && !fluids.DepthKind.IsSet) scope.Missing("[fluids] depth_kind", "md, tvd or tvdss");
        if (gasOil.IsSet && oilWater.IsSet && fluids.DepthKind.IsSet)
        {
            var (upper, lower) = (Vertical(scope, gasOil, fluids), Vertical(scope, oilWater, fluids));
            if (!(upper < lower))
                scope.Error(oilWater.Source.Position, UnitSystem.Metric.Show($"[fluids]: found the oil_water_contact at {Quantity.Length(lower)} and the gas_oil_contact at {Quantity.Length(upper)} true vertical depth, expected gas above oil above water"));
        }

        ReportAnchor(scope, fluids, contact);
    }

    private static void ReportAnchor(CheckScope scope, FluidSettings fluids, bool contact)
    {
        if (!fluids.Anchor.IsSet)
        {
            scope.Missing("[fluids] anchor", "hydrostatic (water below the deepest contact), table (the pressure of [pore_pressure] points at the deepest contact) or point (anchor_depth and anchor_pressure)");
            return;
        }

        switch (fluids.Anchor.Value)
        {
            case FluidAnchor.Hydrostatic when fluids.GasOilContact.IsSet && !fluids.OilWaterContact.IsSet:
                scope.Error(fluids.Anchor.Source.Position, $"[fluids]: found anchor = \"hydrostatic\" without a contact with water{scope.Owner}, expected oil_water_contact or another anchor");
                break;
            case FluidAnchor.Table:
                if (!contact) scope.Error(fluids.Anchor.Source.Position, $"[fluids]: found anchor = \"table\" without a contact{scope.Owner}, expected a contact that the column hangs on");
                PorePressureCheck.ReportTable(scope);
                break;
            case FluidAnchor.Point:
                if (!fluids.AnchorDepth.IsSet) scope.Missing("[fluids] anchor_depth", "the depth of the known pressure");
                if (!fluids.AnchorPressure.IsSet) scope.Missing("[fluids] anchor_pressure", "the known pressure");
                break;
        }
    }

    private static double Vertical(CheckScope scope, Setting<double> depth, FluidSettings fluids) =>
        ZoneIndex.ToVertical(scope.Setup, depth.Value, fluids.DepthKind.Value);

    private static void Needs(CheckScope scope, bool needed, Setting<double> density, string key, string example)
    {
        if (needed && !density.IsSet) scope.Missing($"[fluids] {key}", $"the density in place, such as \"{example}\"");
    }

    private static void Heavier(CheckScope scope, Setting<double> light, Setting<double> heavy, string lightKey, string heavyKey)
    {
        if (light.IsSet && heavy.IsSet && light.Value >= heavy.Value)
            scope.Error(light.Source.Position, $"[fluids]: expected {lightKey} below {heavyKey}");
    }
}
