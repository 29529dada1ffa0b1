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
        var (file, _, model, _) = well;
        var units = file.Sections.Output.Units.Value;
        terminal.Output.WriteLine($"Well {file.Setup.Name}: {Extent(model, units)}");
        terminal.Output.WriteLine();
        foreach (var columns in terminal.Width < FullWidth ? Narrow : [Columns]) terminal.Tables().Write(Zones(well.Zones, units, columns));
        terminal.Output.WriteLine();
        ChoicePrinter.Print(terminal, well);
        SpreadPrinter.Print(terminal, well);
        BarrierPrinter.Print(terminal, well);
        ObservationPrinter.Print(terminal, well);
        DepletionPrinter.Print(terminal, model, units);
        CorePrinter.Print(terminal, well.Core, units);
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

    /// <summary>The columns of the zone table, with the decimals that suit an overview.</summary>
    private static readonly (string Title, string Column, int Metric, int Field)[] Columns =
    [
        ("Sv", "sv", 1, 0), ("Pp", "pp", 1, 0), ("Shmin", "shmin", 1, 0), ("SHmax", "shmax", 1, 0),
        ("Sv/z", "sv_gradient", 2, 3), ("Pp/z", "pp_gradient", 2, 3), ("Shmin/z", "shmin_gradient", 2, 3),
        ("E dyn", "youngs_dynamic", 1, 2), ("E stat", "youngs_static", 1, 2), ("nu", "poisson_static", 3, 3), ("biot", "biot", 2, 2),
    ];

    /// <summary>Below this many characters the table is cut into three, so that no heading is.</summary>
    private const int FullWidth = 120;

    private static readonly (string Title, string Column, int Metric, int Field)[][] Narrow = [Columns[..4], Columns[4..7], Columns[7..]];

    private static Table Zones(IReadOnlyList<ZoneMeans> zones, UnitSystem units, (string Title, string Column, int Metric, int Field)[] columns)
    {
        var table = new Table().Border(TableBorder.Simple);
        var length = units.UnitFor(Dimension.Length).Unit;
        table.AddColumn(new TableColumn("zone").NoWrap());
        table.AddColumn(Numbers($"top md\n{length}"));
        table.AddColumn(Numbers("cover\n%"));
        foreach (var (title, id, _, _) in columns) table.AddColumn(Numbers($"{title}\n{DepthColumns.Get(id).In(units).Unit}"));
        var last = columns.Contains(Columns[^1]);
        if (last) table.AddColumn(Numbers("no log\n% Sv"));
        foreach (var column in table.Columns) column.NoWrap().Padding(0, 0, 1, 0);

        foreach (var zone in zones)
        {
            var cells = columns.Select(c =>
            {
                var column = DepthColumns.Get(c.Column);
                return Show(zone.Mean(column), column.In(units).Unit, units == UnitSystem.Metric ? c.Metric : c.Field);
            });
            string[] share = last ? [Show(zone.Mean(DepthColumns.Get("sv_unlogged_share")), Units.Percent, 0)] : [];
            table.AddRow([
                Markup.Escape(zone.Title), Show(zone.TopMd, length, 1), Show(zone.Covered, Units.Percent, 0), .. cells, .. share]);
        }

        return table;
    }

    private static TableColumn Numbers(string title) => new TableColumn(title).RightAligned().NoWrap().PadLeft(1).PadRight(0);

    private static string Show(double si, Unit unit, int decimals) =>
        double.IsNaN(si) ? "" : unit.FromSi(si).ToString("F" + decimals.ToString(CultureInfo.InvariantCulture), CultureInfo.InvariantCulture);
}
