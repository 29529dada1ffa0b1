using System.Globalization;
using DepthStress.Cli.Runs;
using DepthStress.Core.Layers;
using DepthStress.Core.Logs;
using DepthStress.Core.Model;
using DepthStress.Core.Quantities;
using DepthStress.Files.Writing;
using Spectre.Console;

namespace DepthStress.Cli.Printing;

/// <summary>Prints what a run found: a table of zones, then the findings, most important first.</summary>
internal static class SummaryPrinter
{
    /// <summary>Prints the summary of a well.</summary>
    /// <param name="terminal">Where to.</param>
    /// <param name="well">The well.</param>
    /// <param name="folder">Where the results are, or null when none were written.</param>
    public static void Print(Terminal terminal, LoadedWell well, string? folder)
    {
        var (file, _, model) = well;
        var units = file.Sections.Output.Units.Value;
        terminal.Output.WriteLine($"Well {file.Setup.Name}: {Extent(model, units)}");
        terminal.Output.WriteLine();
        terminal.Tables().Write(Zones(model, units));
        terminal.Output.WriteLine();
        foreach (var finding in model.Findings) terminal.Output.WriteLine(FindingText.Of(finding, units, model.Count));
        terminal.Output.WriteLine();
        if (folder is not null) terminal.Output.WriteLine($"Results: {Path.GetRelativePath(terminal.Folder, folder)}");
        terminal.Output.WriteLine(Caution.Text);
    }

    private static string Extent(EarthModel model, UnitSystem units)
    {
        var md = model.Values.Read(Property.MeasuredDepth);
        var tvd = model.Values.Read(Property.TrueVerticalDepth);
        return FormattableString.Invariant($"{model.Count} samples, ") + $"{units.Show(Quantity.Length(md[0]))} to {units.Show(Quantity.Length(md[^1]))} measured depth, "
            + $"{units.Show(Quantity.Length(tvd[0]))} to {units.Show(Quantity.Length(tvd[^1]))} true vertical depth below the {Datum(model)}";
    }

    private static string Datum(EarthModel model) => model.Setup.Frame.Datum switch
    {
        Core.Depth.DatumKind.RotaryTable => "rotary table",
        Core.Depth.DatumKind.Ground => "ground",
        _ => "sea level",
    };

    private static Table Zones(EarthModel model, UnitSystem units)
    {
        var table = new Table().Border(TableBorder.Simple);
        var stress = units == UnitSystem.Metric ? (Unit: Units.Megapascal, Format: "F1") : (Unit: Units.Psi, Format: "F0");
        var gradient = units == UnitSystem.Metric ? (Unit: Units.KilopascalPerMetre, Format: "F2") : (Unit: Units.PsiPerFoot, Format: "F3");
        var modulus = units == UnitSystem.Metric ? (Unit: Units.Gigapascal, Format: "F1") : (Unit: Units.Mpsi, Format: "F2");
        table.AddColumn("zone");
        string[] titles =
        [
            $"top md\n{units.UnitFor(Dimension.Length).Unit}", $"Sv\n{stress.Unit}", $"Pp\n{stress.Unit}", $"Shmin\n{stress.Unit}", $"SHmax\n{stress.Unit}",
            $"Sv/z\n{gradient.Unit}", $"Pp/z\n{gradient.Unit}", $"Shmin/z\n{gradient.Unit}", $"E dyn\n{modulus.Unit}", $"E stat\n{modulus.Unit}", "nu stat\n", "biot\n",
        ];
        foreach (var title in titles) table.AddColumn(new TableColumn(title).RightAligned());

        foreach (var zone in LayerBuilder.Build(model, new LayerSettings()).Layers)
        {
            var z = (0.5 * (zone.TopTvd + zone.BaseTvd)) - model.Setup.Frame.SurfaceTvd;
            string Stress(Property p) => Show(zone.Profile(p).Mean, stress.Unit, stress.Format);
            string Gradient(Property p) => Show(zone.Profile(p).Mean / z, gradient.Unit, gradient.Format);
            table.AddRow(
                Markup.Escape(zone.Zone.Length > 0 ? zone.Zone : "whole log"),
                Show(zone.TopMd, units.UnitFor(Dimension.Length).Unit, "F1"),
                Stress(Property.VerticalStress), Stress(Property.PorePressure), Stress(Property.MinHorizontalStress), Stress(Property.MaxHorizontalStress),
                Gradient(Property.VerticalStress), Gradient(Property.PorePressure), Gradient(Property.MinHorizontalStress),
                Show(zone.Mean(Property.YoungsDynamic), modulus.Unit, modulus.Format),
                Show(zone.Mean(Property.YoungsStatic), modulus.Unit, modulus.Format),
                Show(zone.Mean(Property.PoissonStatic), Units.One, "F3"),
                Show(zone.Mean(Property.Biot), Units.One, "F2"));
        }

        return table;
    }

    private static string Show(double si, Unit unit, string format) =>
        double.IsNaN(si) ? "" : unit.FromSi(si).ToString(format, CultureInfo.InvariantCulture);
}
