using DepthStress.Core.Diagnostics;
using DepthStress.Core.Quantities;

namespace DepthStress.Core.Model;

/// <summary>Finds zones that are out of order, overlap, share a name or are never reached.</summary>
internal static class ZoneCheck
{
    /// <summary>Reports every problem.</summary>
    public static void Report(WellSetup setup, DiagnosticBag diagnostics)
    {
        var names = new HashSet<string>(StringComparer.OrdinalIgnoreCase);
        Zone? previous = null;
        double previousTop = double.NaN, previousBase = double.NaN;
        foreach (var zone in setup.Zones)
        {
            if (!names.Add(zone.Name)) diagnostics.Error(zone.Position, $"found a second zone named \"{zone.Name}\", expected each name once");
            var top = ZoneIndex.ToMeasured(setup, zone.Top, zone.DepthKind);
            if (double.IsNaN(top))
            {
                diagnostics.Error(zone.Position, $"the hole never reaches the top of zone \"{zone.Name}\"");
                continue;
            }

            if (previous is not null && top <= previousTop)
            {
                diagnostics.Error(
                    zone.Position,
                    UnitSystem.Metric.Show($"zone \"{zone.Name}\" starts at {Quantity.Length(top)} measured depth, expected below zone \"{previous.Name}\" at {Quantity.Length(previousTop)}"));
            }
            else if (previous is not null && previousBase > top)
            {
                diagnostics.Error(
                    zone.Position,
                    UnitSystem.Metric.Show($"zone \"{zone.Name}\" starts at {Quantity.Length(top)} measured depth, inside zone \"{previous.Name}\" that ends at {Quantity.Length(previousBase)}"));
            }

            previous = zone;
            previousTop = top;
            previousBase = zone.Base is { } b ? ZoneIndex.ToMeasured(setup, b, zone.DepthKind) : double.NaN;
            if (previousBase <= top) diagnostics.Error(zone.Position, $"zone \"{zone.Name}\" ends above its top");
        }
    }
}
