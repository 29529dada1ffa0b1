using System.Globalization;
using DepthStress.Cli.Runs;
using DepthStress.Core.Layers;
using DepthStress.Core.Quantities;

namespace DepthStress.Cli.Printing;

/// <summary>Prints a line per target zone on the nearest stress barriers around it.</summary>
internal static class BarrierPrinter
{
    /// <summary>Prints the lines; nothing when no zone is a target.</summary>
    public static void Print(Terminal terminal, LoadedWell well)
    {
        var lines = Lines(well);
        foreach (var line in lines) terminal.Output.WriteLine(line);
        if (lines.Count > 0) terminal.Output.WriteLine();
    }

    /// <summary>The lines.</summary>
    internal static IReadOnlyList<string> Lines(LoadedWell well)
    {
        var (file, _, model, _) = well;
        var (units, settings) = (file.Sections.Output.Units.Value, file.Sections.Layers);
        return [.. StressTarget.Find(model, well.Layers, settings).Select(t => Line(t, units, settings))];
    }

    /// <summary>The line of one target.</summary>
    internal static string Line(StressTarget target, UnitSystem units, LayerSettings settings)
    {
        if (double.IsNaN(target.Shmin)) return $"Target {target.Zone}: no Shmin inside it, so nothing can be said about barriers.";
        var limit = units.Show(Quantity.Pressure(settings.BarrierContrast.Value));
        return $"Target {target.Zone}, mean Shmin {units.Show(Quantity.Pressure(target.Shmin))}: "
            + $"barrier above {Words(target.Above, target.AboveUnknown, units, limit)}; below {Words(target.Below, target.BelowUnknown, units, limit)}.";
    }

    private static string Words(StressBarrier? barrier, bool unknown, UnitSystem units, string limit)
    {
        if (barrier is null && unknown) return $"unknown (rock without a layer or Shmin comes before any layer with {limit} more at equal depth)";
        if (barrier is null) return $"none in the log (no layer with {limit} more at equal depth)";
        var (unit, decimals) = units.UnitFor(Dimension.Length);
        string Depth(double si) => unit.FromSi(si).ToString("F" + decimals.ToString(CultureInfo.InvariantCulture), CultureInfo.InvariantCulture);
        var place = barrier.Distance < 0.01 ? "" : $", {units.Show(Quantity.Length(barrier.Distance))} away";
        return string.Create(
            CultureInfo.InvariantCulture,
            $"{string.Join(" and ", barrier.Zones)} ({Depth(barrier.TopMd)}-{Depth(barrier.BaseMd)} {unit} md{place}), {units.Show(Quantity.Pressure(barrier.Contrast))} more at equal depth over {units.Show(Quantity.Length(barrier.Thickness))} tvd, {100 * (1 - barrier.NotMeasured):F0} % of it on measured logs");
    }
}
