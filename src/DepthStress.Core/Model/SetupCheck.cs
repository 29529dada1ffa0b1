using DepthStress.Core.Catalogue;
using DepthStress.Core.Diagnostics;
using DepthStress.Core.Lithology;
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
        // Where the path comes from a curve, what lies along it is checked once it is known.
        if (!setup.PathCurve.IsSet)
        {
            ZoneCheck.Report(setup, diagnostics);
            ObservationCheck.Report(setup, diagnostics);
        }

        ConditioningCheck.ReportOwners(setup, diagnostics);
        foreach (var (rule, overrides) in setup.Lithologies)
        {
            if (overrides.Shale != new ShaleSettings())
                diagnostics.Error(rule.Position, $"[shale] is set for lithology \"{rule.Name}\", expected it in the well or a zone: lithology rules hold by shale volume");
        }

        if (setup.Overburden.AboveLog is { IsSet: true, Value.Law: { } above } choice)
            ReportRecalled(setup, LawSlots.AboveLog, above, choice.Source.Position, diagnostics.Error);

        var reported = new HashSet<(SourcePosition, string)>();
        foreach (var scope in Scopes(setup, (position, text) =>
        {
            if (reported.Add((position, text))) diagnostics.Error(position, text);
        }))
        {
            Report(scope);
        }
    }

    /// <summary>Each zone, or the well when there are none, followed by its lithologies.</summary>
    private static IEnumerable<CheckScope> Scopes(WellSetup setup, Action<SourcePosition, string> error)
    {
        IEnumerable<CheckScope> zones = setup.Zones.Count == 0
            ? [new(setup, "", setup.Position, setup.Settings, error, null)]
            : setup.Zones.Select(z => new CheckScope(setup, $" in zone \"{z.Name}\"", z.Position, z.Overrides.Over(setup.Settings), error, null));
        foreach (var zone in zones)
        {
            yield return zone;
            foreach (var (rule, overrides) in setup.Lithologies)
            {
                yield return new CheckScope(
                    setup, $"{zone.Owner} for lithology \"{rule.Name}\"", rule.Position, overrides.Over(zone.Settings), error, zone);
            }
        }
    }

    private static void Report(CheckScope scope)
    {
        foreach (var slot in LawSlots.All) ReportLaw(scope, slot);
        ReportShale(scope);
        ConditioningCheck.Report(scope);
        PorePressureCheck.Report(scope);
        AnisotropyCheck.Report(scope);
        foreach (var (slot, law) in AnisotropyTally.LawsOf(scope.Settings.Anisotropy))
        {
            var source = slot == LawSlots.BedShear ? scope.Settings.Anisotropy.C66.Source : scope.Settings.Anisotropy.Model.Source;
            ReportRecalled(scope.Setup, slot, law, source.Position, scope.Error);
        }

        HorizontalStressCheck.Report(scope);
        ComparisonCheck.Report(scope);
    }

    /// <summary>Reports a law whose coefficients were recalled where the well does not accept them.</summary>
    internal static void ReportRecalled(WellSetup setup, LawSlot slot, Law law, SourcePosition position, Action<SourcePosition, string> error)
    {
        if (law.Standing == Standing.FromMemory && !setup.AcceptUnverified)
            error(position, $"{slot.Key} = \"{law.Id}\": its coefficients were recalled, not read in the source; set accept_unverified = true to use it");
    }

    private static void ReportLaw(CheckScope scope, LawSlot slot)
    {
        var choice = slot.Choice(scope.Settings);
        if (!choice.IsSet)
        {
            if (slot.Required) scope.Missing(slot.Key, $"a value or a method: {MethodCatalogue.Choices(slot.Property)}");
            return;
        }

        var law = choice.Value;
        ReportRecalled(scope.Setup, slot, law, choice.Source.Position, scope.Error);
        foreach (var input in law.Inputs)
        {
            if (LawParameters.Of(input.Property) is { } parameter && double.IsNaN(parameter.Value(scope.Settings)))
                scope.Error(choice.Source.Position, $"{slot.Key} = \"{law.Id}\" needs {parameter.Key}{scope.Owner}");
        }
    }

    private static void ReportShale(CheckScope scope)
    {
        var shale = scope.Settings.Shale;
        if (!shale.Volume.IsSet) return;
        if (!shale.Clean.IsSet) scope.Missing("[shale] clean", "the gamma radiation of clean rock, such as \"25 gAPI\"");
        if (!shale.Shale.IsSet) scope.Missing("[shale] shale", "the gamma radiation of shale, such as \"130 gAPI\"");
        if (shale.Clean.IsSet && shale.Shale.IsSet && shale.Shale.Value <= shale.Clean.Value)
        {
            scope.Error(
                shale.Shale.Source.Position,
                UnitSystem.Metric.Show($"found a shale line of {new Quantity(shale.Shale.Value, Dimension.GammaRay)}, expected it above the clean line of {new Quantity(shale.Clean.Value, Dimension.GammaRay)}"));
        }
    }
}
