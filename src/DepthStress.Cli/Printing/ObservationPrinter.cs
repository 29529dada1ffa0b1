using DepthStress.Cli.Runs;
using DepthStress.Core.Calibration;
using DepthStress.Core.Model;
using DepthStress.Core.Quantities;

namespace DepthStress.Cli.Printing;

/// <summary>Prints how well the profile meets the observations.</summary>
internal static class ObservationPrinter
{
    private const double Far = 3;
    private const int MostNamed = 3;

    /// <summary>Prints a few lines; nothing without observations.</summary>
    public static void Print(Terminal terminal, LoadedWell well)
    {
        var lines = Lines(well);
        foreach (var line in lines) terminal.Output.WriteLine(line);
        if (lines.Count > 0) terminal.Output.WriteLine();
    }

    /// <summary>The lines.</summary>
    internal static IReadOnlyList<string> Lines(LoadedWell well)
    {
        var units = well.File.Sections.Output.Units.Value;
        var all = well.Observed;
        if (all.Count == 0) return [];
        var compared = all.Where(c => double.IsFinite(c.Residual)).ToList();
        var far = compared.Where(c => Math.Abs(c.Residual) > Far).OrderByDescending(c => Math.Abs(c.Residual)).ToList();
        var inside = compared.Count(c => c.Inside);
        var lines = new List<string>
        {
            FormattableString.Invariant(
                $"Observations: {all.Count}, of which {compared.Count} can be compared; the model meets {inside} within their 95 % intervals and misses {far.Count} by more than {Far} standard deviations."),
        };
        lines.AddRange(far.Take(MostNamed).Select(comparison => "  " + Line(comparison, units)));
        if (far.Count > MostNamed) lines.Add(FormattableString.Invariant($"  and {far.Count - MostNamed} more, see observations.csv"));
        if (far.Any(c => c.Reading.Subject != Reading.PorePressure)) lines.Add($"  To estimate the tectonic strains from them: depthstress calibrate {well.File.Name}");
        return lines;
    }

    private static string Line(Comparison comparison, UnitSystem units) => FormattableString.Invariant(
        $"{comparison.Reading.Interval.Observation.Kind.Word()} at {units.Show(Quantity.Length(comparison.Reading.Interval.Top))} md: observed {units.Show(Quantity.Pressure(comparison.Measured))}, modelled {units.Show(Quantity.Pressure(comparison.Modelled))} ({comparison.Residual:+0.0;-0.0} standard deviations)");
}
