using DepthStress.Core.Diagnostics;
using DepthStress.Core.Model;
using DepthStress.Core.Quantities;
using DepthStress.Files.Reading;

namespace DepthStress.Files.Setup;

/// <summary>One row of a file of observations. Every cell that is wrong is reported.</summary>
internal sealed class ObservationRow(ObservationColumns columns, TextCell[] row, bool decimalComma, DiagnosticBag diagnostics)
{
    private static readonly Dimension[] Length = [Dimension.Length], Pressure = [Dimension.Pressure], Angle = [Dimension.Angle];

    // The equivalent density of a pressure, or its gradient, counted from the datum.
    private static readonly Dimension[] Density = [Dimension.Density, Dimension.PressureGradient];

    private bool _bad;

    /// <summary>The observation, or null when a cell is wrong.</summary>
    public Observation? Read()
    {
        var kind = Word("kind", ObservationKinds.All.Select(k => (k.Word, k.Kind)));
        var depthKind = Word("depth_kind", Bindings.DepthKinds);
        var (top, bottom) = (Quantity("top", Length), Quantity("base", Length));
        if (top > bottom) Report("base", $"found it above the top, expected it at or below");
        var atSurface = AtSurface(kind);
        var (value, asDensity) = Value(kind, atSurface);
        var sigma = Quantity("sigma", kind?.IsBreakout() == true ? Angle : asDensity ? Density : kind is null ? [.. Pressure, .. Angle, .. Density] : Pressure, densities: asDensity);
        if (sigma <= 0) Report("sigma", $"found \"{Cell("sigma").Text}\", expected a standard deviation above zero");
        var fluid = Optional("fluid_density", Density);
        if (fluid <= 0) Report("fluid_density", $"found \"{Cell("fluid_density").Text}\", expected a density above zero");
        if (atSurface && Cell("fluid_density").Text.Length == 0)
            Report("fluid_density", "found nothing, expected the density of the fluid in the hole: the pressure was read at the surface");
        var pore = Optional("pore_pressure", Pressure);
        if (pore < 0) Report("pore_pressure", $"found \"{Cell("pore_pressure").Text}\", expected a pressure not below zero");
        if (_bad) return null;
        return new Observation
        {
            Position = row[0].Position with { Column = 0 },
            Top = top,
            Base = bottom,
            DepthKind = depthKind!.Value,
            Kind = kind!.Value,
            Value = value,
            AsDensity = asDensity,
            AtSurface = atSurface,
            FluidDensity = double.IsNaN(fluid) ? null : fluid,
            Sigma = sigma,
            PorePressure = double.IsNaN(pore) ? null : pore,
            Date = Cell("date").Text,
            Note = Cell("note").Text,
        };
    }

    private bool AtSurface(ObservationKind? kind)
    {
        var where = Cell("pressure_at").Text;
        if (kind?.IsBreakout() == true && where.Length == 0) return false;
        if (kind?.IsBreakout() == true)
        {
            Report("pressure_at", $"found \"{where}\", expected nothing: a breakout is no pressure");
            return false;
        }

        return Word("pressure_at", [("surface", true), ("downhole", false)]) == true;
    }

    private (double Value, bool AsDensity) Value(ObservationKind? kind, bool atSurface)
    {
        var text = Cell("value").Text;
        if (kind == ObservationKind.NoBreakout && text.Length == 0) return (0, false);
        if (kind is null)
        {
            if (text.Length == 0) Report("value", "found nothing, expected a quantity");
            return (double.NaN, false);
        }

        if (kind.Value.IsBreakout())
        {
            var width = Quantity("value", Angle);
            if (width is < 0 or > Math.PI) Report("value", $"found \"{text}\", expected the full opening angle of one side, from 0 to 180 deg");
            if (kind == ObservationKind.NoBreakout && width > 0) Report("value", $"found \"{text}\", expected nothing or 0 deg for no-breakout, or the kind breakout-width");
            return (width, false);
        }

        var asDensity = Measures("value") is Dimension.Density or Dimension.PressureGradient;
        var pressure = Quantity("value", asDensity ? Density : Pressure, asDensity);
        if (asDensity && atSurface) Report("value", $"found \"{text}\", an equivalent density, for a pressure read at the surface, expected a pressure, or downhole: an equivalent density holds the fluid's column already");
        if (pressure < 0 || (pressure == 0 && !atSurface)) Report("value", $"found \"{text}\", expected {(atSurface ? "a pressure not below zero" : "one above zero")}");
        return (pressure, asDensity);
    }

    private TextCell Cell(string column) => columns.Get(row, column).Cell;

    /// <summary>What the cell measures by its unit, or by the header's where it is a bare number.</summary>
    private Dimension? Measures(string column)
    {
        var (cell, unit) = columns.Get(row, column);
        var text = Point(cell.Text);
        return QuantityText.TryNumber(text, out _) ? unit?.Dimension : QuantityText.TryParse(text, [.. Pressure, .. Angle, .. Density], out _, out var own, out _) ? own.Dimension : null;
    }

    private double Optional(string column, Dimension[] dimensions) => Cell(column).Text.Length == 0 ? double.NaN : Quantity(column, dimensions, true);

    /// <summary>A quantity in SI, a pressure gradient as the density of its fluid; NaN and a message where the cell holds none.</summary>
    private double Quantity(string column, Dimension[] dimensions, bool densities = false)
    {
        var (cell, unit) = columns.Get(row, column);
        if (cell.Text.Length == 0)
        {
            Report(column, $"found nothing, expected {(column == "sigma" ? "a standard deviation" : "a quantity")} with a unit ({Units.Symbols(dimensions)})");
            return double.NaN;
        }

        var text = Point(cell.Text);
        if (unit is not null && QuantityText.TryNumber(text, out _)) text += " " + unit.Symbol;
        if (!QuantityText.TryParse(text, dimensions, out var si, out var own, out var problem))
        {
            Report(column, problem!);
            return double.NaN;
        }

        return densities && own.Dimension == Dimension.PressureGradient ? si / Constants.StandardGravity : si;
    }

    private string Point(string text) => decimalComma ? text.Replace(',', '.') : text;

    private T? Word<T>(string column, IEnumerable<(string Word, T Value)> words)
        where T : struct
    {
        var text = Cell(column).Text;
        var plain = text.Replace('_', '-').Replace(' ', '-');
        foreach (var (word, value) in words)
        {
            if (word.Equals(plain, StringComparison.OrdinalIgnoreCase)) return value;
        }

        var list = words.Select(w => w.Word).ToList();
        Report(column, $"found {(text.Length == 0 ? "nothing" : $"\"{Words.Short(text)}\"")}, expected one of {string.Join(", ", list)}{(text.Length == 0 ? "" : NearestName.Hint(plain, list))}");
        return null;
    }

    private void Report(string column, string problem)
    {
        _bad = true;
        diagnostics.Error(Cell(column).Position, $"{column}: {problem}");
    }
}
