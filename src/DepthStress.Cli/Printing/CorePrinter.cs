using System.Globalization;
using DepthStress.Core.Calibration;
using DepthStress.Core.Catalogue;
using DepthStress.Core.Quantities;

namespace DepthStress.Cli.Printing;

/// <summary>Prints what core says of the model, in a few lines; core.csv and run.json have the rest.</summary>
internal static class CorePrinter
{
    private const int Best = 3;

    /// <summary>Prints the lines; nothing without core.</summary>
    public static void Print(Terminal terminal, CoreComparison? core, UnitSystem units)
    {
        if (core is null) return;
        foreach (var line in Lines(core, units)) terminal.Output.WriteLine(line);
        terminal.Output.WriteLine();
    }

    /// <summary>The lines.</summary>
    internal static IEnumerable<string> Lines(CoreComparison core, UnitSystem units)
    {
        var (modulus, decimals) = units == UnitSystem.Metric ? (Units.Gigapascal, "F2") : (Units.Mpsi, "F3");
        string Modulus(double si) => $"{modulus.FromSi(si).ToString(decimals, CultureInfo.InvariantCulture)} {modulus}";
        string Pressure(double si) => units.Show(Quantity.Pressure(si));
        yield return string.Create(CultureInfo.InvariantCulture, $"Core: {core.Rows.Count} plugs against the model (model minus plug):");
        foreach (var group in core.Groups)
        {
            var confining = double.IsNaN(group.Confining.Least) ? "" : $" at {Pressure(group.Confining.Least)} to {Pressure(group.Confining.Greatest)}";
            yield return string.Create(CultureInfo.InvariantCulture, $"  {group.Name}{confining}, {group.Rows.Count} plugs: static modulus {Show(group.Youngs, Modulus)}; Poisson's ratio {Show(group.Poisson, v => v.ToString("F3", CultureInfo.InvariantCulture))}");
            if (group.Factor is { } factor)
                yield return string.Create(CultureInfo.InvariantCulture, $"    static_youngs_factor that meets them: {factor.Value:F3}, standard error {factor.Error:F3}, 95 % from {factor.Low:F3} to {factor.High:F3}");
            if (group.Line is { } line && group.ThroughOrigin is { } slope)
                yield return string.Create(CultureInfo.InvariantCulture, $"    on the dynamic modulus: slope {line.Slope.Value:F3} (95 % from {line.Slope.Low:F3} to {line.Slope.High:F3}), intercept {Modulus(line.Intercept.Value)}; through the origin {slope.Value:F3} (from {slope.Low:F3} to {slope.High:F3})");
            var laws = group.Laws(core.At).Take(Best).Select(l => $"{l.Law.Id}{(l.Law.Standing == Standing.FromMemory ? " (recalled)" : "")} {Modulus(l.RootMeanSquare)}").ToList();
            if (laws.Count > 0) yield return $"    laws that miss them least, root mean square: {string.Join(", ", laws)}";
        }

        foreach (var (name, difference) in core.Ucs) yield return $"  {name}: UCS {Show(difference, Pressure)}";
        if (core.Match is not { } match) yield break;
        var what = match.Determined ? "set [core] depth_shift to apply it" : "not determined, so better left alone";
        yield return string.Create(CultureInfo.InvariantCulture, $"  Depths: a further shift of {units.Show(Quantity.Length(match.Shift))} fits best, {100 * match.Gain:F0} % less squared misfit; from {units.Show(Quantity.Length(match.Low))} to {units.Show(Quantity.Length(match.High))} fit no worse at 95 %; {what}");
    }

    private static string Show(Difference? difference, Func<double, string> show) =>
        difference is null ? "not there" : string.Create(CultureInfo.InvariantCulture, $"mean {show(difference.Mean)}, root mean square {show(difference.RootMeanSquare)} (n {difference.Count})");
}
