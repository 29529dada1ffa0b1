using DepthStress.Core.Catalogue;
using DepthStress.Core.Diagnostics;
using DepthStress.Core.Pressure;
using DepthStress.Core.Quantities;

namespace DepthStress.Core.Model;

/// <summary>Finds choices that are missing or that do not go together, zone by zone.</summary>
public static class SetupCheck
{
    /// <summary>Reports every problem of a setup whose single values are already sound.</summary>
    public static void Report(WellSetup setup, DiagnosticBag diagnostics)
    {
        ArgumentNullException.ThrowIfNull(setup);
        ArgumentNullException.ThrowIfNull(diagnostics);
        ZoneCheck.Report(setup, diagnostics);
        var reported = new HashSet<(SourcePosition, string)>();
        foreach (var (owner, position, settings) in Resolved(setup))
        {
            Report(new Scope(setup, owner, position, settings, (p, text) =>
            {
                if (reported.Add((p, text))) diagnostics.Error(p, text);
            }));
        }
    }

    private static IEnumerable<(string Owner, SourcePosition Position, StageSettings Settings)> Resolved(WellSetup setup)
    {
        var zones = new List<(string Owner, SourcePosition Position, StageSettings Settings)>();
        if (setup.Zones.Count == 0) zones.Add(("", setup.Position, setup.Settings));
        foreach (var zone in setup.Zones) zones.Add(($" in zone \"{zone.Name}\"", zone.Position, zone.Overrides.Over(setup.Settings)));
        return zones.Concat(
            from zone in zones
            from lithology in setup.Lithologies
            select ($"{zone.Owner} for lithology \"{lithology.Rule.Name}\"", lithology.Rule.Position, lithology.Overrides.Over(zone.Settings)));
    }

    private sealed record Scope(
        WellSetup Setup, string Owner, SourcePosition Position, StageSettings Settings, Action<SourcePosition, string> Error);

    private static void Report(Scope scope)
    {
        foreach (var slot in LawSlots.All) ReportLaw(scope, slot);
        ReportShale(scope);
        ReportPorePressure(scope);
        ReportStrains(scope);
    }

    private static void ReportLaw(Scope scope, LawSlot slot)
    {
        var choice = slot.Choice(scope.Settings);
        if (!choice.IsSet)
        {
            if (slot.Required) Missing(scope, slot.Key, $"methods: {MethodCatalogue.Choices(slot.Property)}");
            return;
        }

        var law = choice.Value;
        if (law.Standing == Standing.FromMemory && !scope.Setup.AcceptUnverified)
        {
            scope.Error(
                choice.Source.Position,
                $"{slot.Key} = \"{law.Id}\": its coefficients were recalled, not read in the source; set accept_unverified = true to use it");
        }

        foreach (var input in law.Inputs)
        {
            if (LawParameters.Of(input.Property) is { } parameter && double.IsNaN(parameter.Value(scope.Settings)))
                scope.Error(choice.Source.Position, $"{slot.Key} = \"{law.Id}\" needs {parameter.Key}{scope.Owner}");
        }
    }

    private static void ReportShale(Scope scope)
    {
        var shale = scope.Settings.Shale;
        if (!shale.Volume.IsSet) return;
        if (!shale.Clean.IsSet) Missing(scope, "[shale] clean", "the gamma radiation of clean rock, such as \"25 gAPI\"");
        if (!shale.Shale.IsSet) Missing(scope, "[shale] shale", "the gamma radiation of shale, such as \"130 gAPI\"");
        if (shale.Clean.IsSet && shale.Shale.IsSet && shale.Shale.Value <= shale.Clean.Value)
        {
            scope.Error(
                shale.Shale.Source.Position,
                UnitSystem.Metric.Show($"found a shale line of {new Quantity(shale.Shale.Value, Dimension.GammaRay)}, expected it above the clean line of {new Quantity(shale.Clean.Value, Dimension.GammaRay)}"));
        }
    }

    private static void ReportPorePressure(Scope scope)
    {
        var (pore, frame) = (scope.Settings.PorePressure, scope.Setup.Frame);
        if (!pore.Method.IsSet)
        {
            Missing(scope, "[pore_pressure] method", "hydrostatic, gradient or table");
            return;
        }

        switch (pore.Method.Value)
        {
            case PorePressureMethod.Hydrostatic when !pore.FluidDensity.IsSet:
                Missing(scope, "[pore_pressure] fluid_density", "such as \"1.03 g/cm3\"");
                break;
            case PorePressureMethod.Gradient:
                if (!pore.Gradient.IsSet) Missing(scope, "[pore_pressure] gradient", "such as \"10.5 kPa/m\"");
                if (!pore.Reference.IsSet) Missing(scope, "[pore_pressure] reference", "rotary table, ground, sea surface or mudline");
                else if (scope.Setup.FrameKnown && !frame.Has(pore.Reference.Value))
                    scope.Error(pore.Reference.Source.Position, $"found a reference that an {(frame.IsOffshore ? "offshore" : "onshore")} well does not have, expected {(frame.IsOffshore ? "rotary table, sea surface or mudline" : "rotary table or ground")}");
                break;
            case PorePressureMethod.Table:
                if (!pore.Points.IsSet) Missing(scope, "[pore_pressure] points", "a table of depth and pressure");
                if (!pore.DepthKind.IsSet) Missing(scope, "[pore_pressure] depth_kind", "md, tvd or tvdss");
                break;
        }
    }

    private static void ReportStrains(Scope scope)
    {
        var stress = scope.Settings.HorizontalStress;
        var (along, across) = (stress.StrainAlongShmin, stress.StrainAlongShmax);
        if (along.IsSet != across.IsSet)
        {
            Missing(
                scope,
                along.IsSet ? "[horizontal_stress] strain_along_shmax" : "[horizontal_stress] strain_along_shmin",
                "both strains or neither");
        }
        else if (along.IsSet && across.Value < along.Value)
        {
            scope.Error(across.Source.Position, "strain_along_shmax is below strain_along_shmin: exchange them and turn shmax_azimuth by 90 deg");
        }
    }

    private static void Missing(Scope scope, string key, string expected) =>
        scope.Error(scope.Position, $"{key} is not set{scope.Owner}; expected {expected}");
}
