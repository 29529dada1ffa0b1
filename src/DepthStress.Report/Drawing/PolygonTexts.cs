using System.Globalization;
using DepthStress.Core.Model;
using DepthStress.Core.Quantities;
using DepthStress.Core.Stress;

namespace DepthStress.Report.Drawing;

/// <summary>The numbers below a stress polygon.</summary>
internal static class PolygonTexts
{
    /// <summary>What the panel says of its depth, line by line.</summary>
    public static IEnumerable<string> Of(StressState state, StressPolygon polygon, StressPolygon outer, UnitSystem units)
    {
        string Show(double stress) => units.Show(Quantity.Pressure(stress));
        string Known(string name, double stress) => double.IsNaN(stress) ? $"{name} unknown" : $"{name} {Show(stress)}";
        yield return $"{Known("Sv", state.Vertical)}, {Known("Pp", state.Pore)}, {Known("Shmin", state.Shmin)}, {Known("SHmax", state.Shmax)}";
        if (!polygon.Exists)
        {
            yield return "No polygon: it needs a vertical stress above the pore pressure, and friction.";
            yield break;
        }

        yield return Regime(state, polygon);
        foreach (var limit in new[] { polygon, outer })
            yield return $"Friction {Number(limit.Friction)}: Shmin from {Show(limit.LowestShmin)}, SHmax to {Show(limit.HighestShmax)}{At(limit)}";

        string At(StressPolygon limit) => double.IsNaN(state.Shmin) || state.Shmin < limit.LowestShmin ? "" : $"; at this Shmin SHmax to {Show(limit.HighestShmaxAt(state.Shmin))}";
    }

    private static string Regime(StressState state, StressPolygon polygon)
    {
        if (double.IsNaN(state.Shmin)) return "No horizontal stress here";
        var inside = state.Shmin < polygon.LowestShmin ? "Shmin is below the limit of the settings' friction"
            : double.IsNaN(state.Shmax) ? "Shmin is within the limit of the settings' friction"
            : polygon.Contains(state.Shmin, state.Shmax) ? "within the limits of the settings' friction" : "SHmax is above the limit of the settings' friction";
        var regime = FaultingRegimes.Of(state.Vertical, state.Shmin, state.Shmax);
        return regime switch
        {
            FaultingRegime.Unknown when double.IsNaN(state.Shmax) => inside,
            FaultingRegime.Unknown => "all three stresses equal",
            _ => $"{regime.Name()} faulting, A_phi {Number(FaultingRegimes.ShapeNumber(state.Vertical, state.Shmin, state.Shmax))}; {inside}",
        };
    }

    private static string Number(double value) => value.ToString("F2", CultureInfo.InvariantCulture);
}
