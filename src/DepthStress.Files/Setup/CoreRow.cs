using DepthStress.Core.Diagnostics;
using DepthStress.Core.Model;
using DepthStress.Core.Quantities;
using DepthStress.Files.Reading;

namespace DepthStress.Files.Setup;

/// <summary>One row of a table of core plugs. Every cell that is wrong is reported.</summary>
internal sealed class CoreRow(IReadOnlyDictionary<string, (int Index, Unit? Unit)> columns, TextCell[] row, bool decimalComma, DiagnosticBag diagnostics)
{
    /// <summary>Plugs cut so near to across or along the bedding are taken as such (common practice).</summary>
    private const double Near = 10 * Math.PI / 180;

    private bool _bad;

    /// <summary>The plug, or null when a cell is wrong.</summary>
    public CorePlug? Read()
    {
        var depth = Quantity("depth", Dimension.Length, "a measured depth", v => true);
        if (Text("depth").Length == 0) Report("depth", "found nothing, expected a measured depth");
        var (orientation, angle) = Orientation();
        var confining = Quantity("confining_pressure", Dimension.Pressure, "a pressure not below zero", v => v >= 0);
        var strength = Quantity("strength", Dimension.Pressure, "a strength above zero", v => v > 0);
        var plug = new CorePlug
        {
            Position = row[0].Position with { Column = 0 },
            Depth = depth,
            Orientation = orientation,
            AngleToBedding = angle,
            ConfiningPressure = confining,
            YoungsStatic = Quantity("youngs_static", Dimension.Pressure, "a modulus above zero", v => v > 0),
            PoissonStatic = Quantity("poisson_static", Dimension.None, "a ratio from 0 to below 0.5", v => v is >= 0 and < 0.5),
            // What breaks under confining pressure is stronger than unconfined.
            Ucs = Quantity("ucs", Dimension.Pressure, "a strength above zero", v => v > 0) is var ucs && double.IsNaN(ucs) && confining == 0 ? strength : ucs,
        };
        if (!_bad && double.IsNaN(plug.Ucs) && !double.IsNaN(strength))
            diagnostics.Note(Cell("strength").Position, "strength: not compared with UCS, which takes a confining pressure of zero");
        return _bad ? null : plug;
    }

    private (PlugOrientation Orientation, double Angle) Orientation()
    {
        var text = Text("orientation");
        if (text.Length == 0) return (PlugOrientation.NotStated, double.NaN);
        if (text.Equals("vertical", StringComparison.OrdinalIgnoreCase) || text.Equals("v", StringComparison.OrdinalIgnoreCase)) return (PlugOrientation.Vertical, Math.PI / 2);
        if (text.Equals("horizontal", StringComparison.OrdinalIgnoreCase) || text.Equals("h", StringComparison.OrdinalIgnoreCase)) return (PlugOrientation.Horizontal, 0);
        if (!Words.StartsNumber(text))
        {
            Report("orientation", $"found \"{Words.Short(text)}\", expected \"vertical\", \"horizontal\" or degrees to the bedding such as \"45 deg\"");
            return (PlugOrientation.NotStated, double.NaN);
        }

        var angle = Quantity("orientation", Dimension.Angle, "an angle from 0 to 90 deg", v => v is >= 0 and <= Math.PI / 2);
        return (angle >= (Math.PI / 2) - Near ? PlugOrientation.Vertical : angle <= Near ? PlugOrientation.Horizontal : PlugOrientation.Inclined, angle);
    }

    /// <summary>A quantity in SI; NaN for an empty cell, or, with the reason reported, for a wrong one.</summary>
    private double Quantity(string column, Dimension dimension, string expected, Predicate<double> fits)
    {
        var text = Text(column);
        if (text.Length == 0) return double.NaN;
        if (decimalComma) text = text.Replace(',', '.');
        double si;
        if (columns[column].Unit is { } unit && QuantityText.TryNumber(text, out var value))
        {
            si = unit.ToSi(value);
        }
        else if (!QuantityText.TryParse(text, [dimension], out si, out _, out var problem))
        {
            Report(column, problem!);
            return double.NaN;
        }

        if (fits(si)) return si;
        Report(column, $"found \"{Words.Short(Text(column))}\", expected {expected}");
        return double.NaN;
    }

    private TextCell Cell(string column) => columns.TryGetValue(column, out var c) ? row[c.Index] : new TextCell("", row[0].Position);

    private string Text(string column) => Cell(column).Text;

    private void Report(string column, string problem)
    {
        _bad = true;
        diagnostics.Error(Cell(column).Position, $"{column}: {problem}");
    }
}
