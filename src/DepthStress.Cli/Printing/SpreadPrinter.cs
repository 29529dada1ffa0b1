using System.Globalization;
using DepthStress.Cli.Runs;
using DepthStress.Core.Calibration;
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
            var evidence = SpreadEvidence.Of(model, well.Observed, well.Core, spread.Zone);
            table.AddRow(
                Markup.Escape(model.ZoneTitle(spread.Zone)), Show(spread.Chosen), Span(spread.All), Span(spread.ByYoungs), Span(spread.ByPoisson), Span(spread.ByBiot),
                evidence.Tests == 0 ? "" : FormattableString.Invariant($"{Show(evidence.TestMiss)} ({evidence.Tests})"),
                evidence.Plugs == 0 ? "" : FormattableString.Invariant($"{evidence.ModulusRatio:F2} ({evidence.Plugs})"), spread.Dominant);
        }

        terminal.Tables().Write(table);
        terminal.Output.WriteLine("E static, nu static, biot: with that choice alone changed. Strains are those of the run for every choice; relations that were recalled take part only with accept_unverified. Poisson's ratio is tried 0.05 lower and higher.");
        terminal.Output.WriteLine();
    }
}
