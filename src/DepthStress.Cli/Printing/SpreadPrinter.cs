using System.Globalization;
using DepthStress.Cli.Runs;
using DepthStress.Core.Calibration;
using DepthStress.Core.Logs;
using DepthStress.Core.Model;
using DepthStress.Core.Quantities;
using Spectre.Console;

namespace DepthStress.Cli.Printing;

/// <summary>Prints what the choices of static modulus, Poisson's ratio and Biot's coefficient do to Shmin, beside tests and core.</summary>
internal static class SpreadPrinter
{
    /// <summary>Prints one row per zone; nothing when the spread was not asked for.</summary>
    public static void Print(Terminal terminal, LoadedWell well)
    {
        if (well.Spread is not { Count: > 0 } spreads) return;
        var (model, units) = (well.Model, well.File.Sections.Output.Units.Value);
        var (unit, decimals) = units == UnitSystem.Metric ? (Units.Megapascal, 1) : (Units.Psi, 0);
        string Show(double si) => double.IsNaN(si) ? "" : unit.FromSi(si).ToString("F" + decimals.ToString(CultureInfo.InvariantCulture), CultureInfo.InvariantCulture);
        string Span(SpreadRange range) => $"{Show(range.Low)}-{Show(range.High)}";
        terminal.Output.WriteLine($"Mean Shmin over every admissible choice for the rock, {unit} (each combination in spread.csv):");
        var table = new Table().Border(TableBorder.Simple);
        table.AddColumn(new TableColumn("zone").NoWrap());
        foreach (var title in (string[])["Shmin", "every choice", "E static", "nu static", "biot", "tests less\nmodel", "plug E\nover model"])
            table.AddColumn(new TableColumn(title).RightAligned().NoWrap().PadLeft(1).PadRight(0));
        table.AddColumn(new TableColumn("moves it\nmost").NoWrap());
        foreach (var spread in spreads)
        {
            var name = spread.Zone < 0 ? (model.Setup.Zones.Count == 0 ? "whole log" : "no zone") : model.ZoneName(spread.Zone);
            table.AddRow(
                Markup.Escape(name), Show(spread.Chosen), Span(spread.All), Span(spread.ByYoungs), Span(spread.ByPoisson), Span(spread.ByBiot),
                Tests(model, well.Observed, spread.Zone, Show), Core(model, well.Core, spread.Zone), spread.Dominant);
        }

        terminal.Tables().Write(table);
        terminal.Output.WriteLine("E static, nu static, biot: with that choice alone changed. Strains are those of the run for every choice; relations that were recalled take part only with accept_unverified. Poisson's ratio is tried 0.05 lower and higher.");
        terminal.Output.WriteLine();
    }

    /// <summary>Mean of observed less modelled Shmin over the tests that give a value of it.</summary>
    private static string Tests(EarthModel model, IReadOnlyList<Comparison> comparisons, short zone, Func<double, string> show)
    {
        var misses = comparisons.Where(c => c.Reading.Subject == Reading.Shmin && c.Reading.Meaning == Meaning.Value && ZoneAt(model, c.Reading.Interval.Top) == zone)
            .Select(c => c.Measured - c.Modelled).Where(double.IsFinite).ToList();
        return misses.Count == 0 ? "" : FormattableString.Invariant($"{show(misses.Average())} ({misses.Count})");
    }

    /// <summary>Mean ratio of plug and model static modulus.</summary>
    private static string Core(EarthModel model, CoreComparison? core, short zone)
    {
        var ratios = core?.Rows.Where(r => ZoneAt(model, r.Depth) == zone).Select(r => r.Plug.YoungsStatic / r.Youngs).Where(double.IsFinite).ToList() ?? [];
        return ratios.Count == 0 ? "" : FormattableString.Invariant($"{ratios.Average():F2} ({ratios.Count})");
    }

    private static int ZoneAt(EarthModel model, double measuredDepth)
    {
        var at = model.Values.Read(Property.MeasuredDepth).BinarySearch(measuredDepth);
        return model.Zones[Math.Clamp(at < 0 ? ~at : at, 0, model.Count - 1)];
    }
}
