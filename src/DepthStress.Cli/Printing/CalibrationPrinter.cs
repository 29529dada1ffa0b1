using System.Globalization;
using DepthStress.Cli.Runs;
using DepthStress.Core.Calibration;
using DepthStress.Core.Model;
using DepthStress.Core.Quantities;
using DepthStress.Files.Writing;
using Spectre.Console;

namespace DepthStress.Cli.Printing;

/// <summary>Prints what a calibration found: the estimates, each observation beside the model, and what to make of it.</summary>
internal static class CalibrationPrinter
{
    /// <summary>Prints the result.</summary>
    public static void Print(Terminal terminal, LoadedWell well, CalibrationResult result)
    {
        var units = well.File.Sections.Output.Units.Value;
        terminal.Output.WriteLine($"Calibration of {well.File.Setup.Name}");
        terminal.Output.WriteLine();
        if (result.Strains.Count > 0)
        {
            terminal.Tables().Write(Estimates(result));
            terminal.Output.WriteLine(Statistics(result, units));
        }

        if (result.Others.Count > 0) terminal.Tables().Write(Others(result));
        terminal.Output.WriteLine();
        terminal.Tables().Write(Observations(result, units));
        foreach (var comparison in result.AfterFit.Where(c => c.Reading.Problem is not null))
            terminal.Output.WriteLine($"Not compared: {Name(comparison)} at {units.Show(Quantity.Length(comparison.Reading.Interval.Top))} measured depth: {comparison.Reading.Problem}");
        terminal.Output.WriteLine();
        foreach (var finding in result.Findings) terminal.Output.WriteLine(FindingText.Of(finding, units, result.After.Count));
        terminal.Output.WriteLine();
    }

    private static string Name(Comparison comparison) => comparison.Reading.Interval.Observation.Kind.Word();

    private static Table Estimates(CalibrationResult result)
    {
        var table = new Table().Border(TableBorder.Simple);
        table.AddColumn(new TableColumn("strain, microstrain").NoWrap());
        foreach (var title in (string[])["before", "estimate", "std error", "95 % from", "to", ""]) table.AddColumn(Numbers(title));
        foreach (var strain in result.Strains)
        {
            var zones = strain.Group.Name(result.After.Setup);
            var where = zones.Length > 0 ? $" ({zones})" : "";
            Row(table, "along Shmin" + where, strain.AlongShmin);
            Row(table, "along SHmax" + where, strain.AlongShmax);
            Row(table, "difference" + where, strain.Difference);
        }

        return table;
    }

    private static Table Others(CalibrationResult result)
    {
        var table = new Table().Border(TableBorder.Simple);
        table.AddColumn(new TableColumn("parameter").NoWrap());
        foreach (var title in (string[])["before", "estimate", "std error", "95 % from", "to"]) table.AddColumn(Numbers(title));
        table.AddColumn(new TableColumn("from").NoWrap());
        foreach (var (_, key, dimension, estimate, basis) in result.Others)
        {
            var (unit, decimals) = CalibrationEdits.UnitOf(dimension);
            string Show(double si) => double.IsNaN(si) ? "" : unit.FromSi(si).ToString("F" + decimals.ToString(CultureInfo.InvariantCulture), CultureInfo.InvariantCulture);
            string Error(double si) => double.IsNaN(si) ? "bound" : (si / unit.Factor).ToString("F" + decimals.ToString(CultureInfo.InvariantCulture), CultureInfo.InvariantCulture);
            table.AddRow(
                Markup.Escape(unit.Symbol.Length == 0 ? key : $"{key}, {unit.Symbol}"), Show(estimate.Start), Show(estimate.Value), Error(estimate.StandardError),
                Show(estimate.Low), Show(estimate.High), Markup.Escape(basis));
        }

        return table;
    }

    private static void Row(Table table, string name, Estimate estimate) => table.AddRow(
        Markup.Escape(name), Micro(estimate.Start), Micro(estimate.Value), estimate.Held ? "" : Micro(estimate.StandardError),
        estimate.Held ? "" : Micro(estimate.Low), estimate.Held ? "" : Micro(estimate.High), estimate.Held ? "held" : estimate.AtBound ? "bound" : "");

    private static string Micro(double strain) =>
        double.IsNaN(strain) ? "" : Units.Microstrain.FromSi(strain).ToString("F1", CultureInfo.InvariantCulture);

    private static string Statistics(CalibrationResult result, UnitSystem units)
    {
        var chi = double.IsFinite(result.ReducedChiSquare) ? FormattableString.Invariant($"{result.ReducedChiSquare:F2}") : "unknown";
        var correlations = string.Join(", ", result.Strains.Where(s => double.IsFinite(s.Correlation)).Select(s => FormattableString.Invariant($"{s.Correlation:F2}")));
        return FormattableString.Invariant($"Degrees of freedom {result.DegreesOfFreedom}; reduced chi-square {chi} with the observations' own standard deviations; model error {units.Show(Quantity.Pressure(result.ModelError))}")
            + (correlations.Length > 0 ? $"; correlation {correlations}" : "") + ".";
    }

    private static Table Observations(CalibrationResult result, UnitSystem units)
    {
        var table = new Table().Border(TableBorder.Simple);
        var (length, pressure) = (units.UnitFor(Dimension.Length), units.UnitFor(Dimension.Pressure));
        table.AddColumn(new TableColumn("observation").NoWrap());
        table.AddColumn(new TableColumn("says").NoWrap());
        foreach (var title in (string[])
        [
            $"top md\n{length.Unit}", $"observed\n{pressure.Unit}", $"before\n{pressure.Unit}", $"fitted\n{pressure.Unit}", $"sigma\n{pressure.Unit}", "before\nsigmas", "fitted\nsigmas", "left out\nsigmas",
        ])
        {
            table.AddColumn(Numbers(title));
        }

        foreach (var (after, before) in result.AfterFit.Zip(result.BeforeFit).Where(r => r.First.Reading.Problem is null).OrderBy(r => r.First.Reading.Interval.MiddleTvd))
        {
            string Depth(double si) => length.Unit.FromSi(si).ToString("F1", CultureInfo.InvariantCulture);
            string Pressure(double si) => double.IsNaN(si) ? "" : pressure.Unit.FromSi(si).ToString(units == UnitSystem.Metric ? "F2" : "F0", CultureInfo.InvariantCulture);
            table.AddRow(
                Name(after), Says(after.Reading), Depth(after.Reading.Interval.Top), Pressure(after.Measured), Pressure(before.Modelled), Pressure(after.Modelled),
                Pressure(after.Sigma), Sigmas(before.Residual), Sigmas(after.Residual), Sigmas(after.LeftOut));
        }

        return table;
    }

    private static string Says(Reading reading) => reading.Meaning switch
    {
        Meaning.Value => reading.Subject,
        Meaning.UpperBound => $"{reading.Subject} at most",
        Meaning.LowerBound => $"{reading.Subject} at least",
        _ => "nothing here",
    };

    private static string Sigmas(double residual) =>
        double.IsNaN(residual) ? "" : residual.ToString("+0.0;-0.0;0.0", CultureInfo.InvariantCulture);

    private static TableColumn Numbers(string title) => new TableColumn(title).RightAligned().NoWrap().PadLeft(1).PadRight(0);
}
