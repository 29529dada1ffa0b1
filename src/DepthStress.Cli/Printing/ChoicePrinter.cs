using System.Globalization;
using DepthStress.Cli.Runs;
using DepthStress.Core.Model;
using DepthStress.Core.Quantities;
using Spectre.Console;

namespace DepthStress.Cli.Printing;

/// <summary>Prints how much Shmin hangs on the two choices that logs cannot settle.</summary>
internal static class ChoicePrinter
{
    /// <summary>Prints one row per zone that has a Shmin; nothing when none has.</summary>
    public static void Print(Terminal terminal, LoadedWell well)
    {
        var (sensitivities, units) = (well.Sensitivities, well.File.Sections.Output.Units.Value);
        if (sensitivities.Count == 0) return;
        var (unit, decimals) = units == UnitSystem.Metric ? (Units.Megapascal, 1) : (Units.Psi, 0);
        var format = "F" + decimals.ToString(CultureInfo.InvariantCulture);
        var signed = decimals == 0 ? "+0;-0;0" : "+0.0;-0.0;0.0";
        var (nu, biot) = (ShminSensitivity.PoissonStep, ShminSensitivity.BiotStep);
        terminal.Output.WriteLine($"What the choices of static Poisson's ratio and Biot's coefficient do to mean Shmin, {unit}:");
        var table = new Table().Border(TableBorder.Simple);
        table.AddColumn(new TableColumn("zone").NoWrap());
        foreach (var title in (string[])["Shmin", Shift("nu stat", -nu), Shift("nu stat", nu), Shift("biot", -biot), Shift("biot", biot)])
            table.AddColumn(new TableColumn(title).RightAligned());
        foreach (var s in sensitivities)
        {
            string Change(double si) => unit.FromSi(si).ToString(signed, CultureInfo.InvariantCulture);
            table.AddRow(
                Markup.Escape(well.Model.ZoneTitle(s.Zone)),
                unit.FromSi(s.Shmin).ToString(format, CultureInfo.InvariantCulture),
                Change(s.PoissonLower), Change(s.PoissonHigher), Change(s.BiotLower), Change(s.BiotHigher));
        }

        terminal.Tables().Write(table);
        if (sensitivities.Sum(s => s.Held) is > 0 and var held)
            terminal.Output.WriteLine(FormattableString.Invariant($"In {held} samples a shifted value was held at its limit: Poisson's ratio at 0.5 at most, Biot's coefficient at 0 to 1."));
        terminal.Output.WriteLine();
    }

    private static string Shift(string name, double step) => string.Create(CultureInfo.InvariantCulture, $"{name} {step:+0.00;-0.00}");
}
