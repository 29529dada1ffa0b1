using System.Text;
using DepthStress.Core.Calibration;
using DepthStress.Core.Layers;
using DepthStress.Core.Model;
using DepthStress.Core.Quantities;

namespace DepthStress.Files.Writing;

/// <summary>
/// <c>README.txt</c> of a result folder: the caution, the datum and depth kinds, and what every column of the plain tables
/// means. The tables themselves stay free of comments.
/// </summary>
public static class ResultGuide
{
    /// <summary>Writes the guide.</summary>
    /// <param name="setup">The well.</param>
    /// <param name="units">The units of the results.</param>
    /// <param name="destination">Gets the bytes; stays open.</param>
    /// <param name="comparison">The columns of comparison.csv; null or empty where it is not written.</param>
    public static void Write(WellSetup setup, UnitSystem units, Stream destination, IReadOnlyList<Column<EarthModel>>? comparison = null)
    {
        ArgumentNullException.ThrowIfNull(setup);
        ArgumentNullException.ThrowIfNull(destination);
        var text = new StringBuilder();
        text.Append("DepthStress results: ").Append(CellText.Clean(setup.Name)).Append("\n\nCaution\n  ").Append(Caution.Text).Append('\n');
        Depths(text, setup, units);
        Conventions(text, units);
        Columns(text, "Columns of depth.csv", DepthColumns.All, units);
        Columns(text, "Columns of layers.csv and layers.json", LayerColumns.All, units);
        if (setup.Observations.Count > 0) Columns(text, "Columns of observations.csv", ObservedColumns.All, units);
        if (setup.Core.Plugs.Count > 0) Columns(text, "Columns of core.csv", CoreColumns.All, units);
        if (comparison is { Count: > 0 }) Columns(text, "Columns of comparison.csv", comparison, units);
        destination.Write(Encoding.UTF8.GetBytes(text.ToString()));
    }

    /// <summary>Writes the guide of a calibration's folder.</summary>
    /// <param name="setup">The well.</param>
    /// <param name="units">The units of the results.</param>
    /// <param name="destination">Gets the bytes; stays open.</param>
    public static void WriteCalibration(WellSetup setup, UnitSystem units, Stream destination)
    {
        ArgumentNullException.ThrowIfNull(setup);
        ArgumentNullException.ThrowIfNull(destination);
        var text = new StringBuilder();
        text.Append("DepthStress calibration: ").Append(CellText.Clean(setup.Name)).Append("\n\nCaution\n  ").Append(Caution.Text).Append('\n');
        Depths(text, setup, units);
        Columns(text, "Columns of observations.csv", ObservedColumns.All, units);
        destination.Write(Encoding.UTF8.GetBytes(text.ToString()));
    }

    private static void Depths(StringBuilder text, WellSetup setup, UnitSystem units)
    {
        var length = DepthStatement.Length(units);
        text.Append("\nDepths\n");
        Row(text, "datum", "", setup.Frame.Datum.Name());
        foreach (var (name, meaning, metres) in DepthStatement.Surfaces(setup.Frame))
            Row(text, name, "", $"{DepthStatement.Show(metres, length)} {length.Unit.Symbol}, {meaning}");
        foreach (var (name, meaning) in DepthStatement.Kinds) Row(text, name, "", meaning);
    }

    private static void Conventions(StringBuilder text, UnitSystem units)
    {
        text.Append("\nConventions\n");
        Row(text, "units", "", units == UnitSystem.Metric ? "metric; a column's name ends with its unit" : "field; a column's name ends with its unit");
        Row(text, "stress", "", "stresses and pressures are total, compression positive");
        Row(text, "missing", "", $"empty in .csv, {ResultsLas.Null} in results.las, null in layers.json");
        Row(text, "names", "", "a text that a spreadsheet would run as a formula has an apostrophe in front; control characters are left out");
        Row(text, "results.las", "", $"the columns of numbers of depth.csv without {string.Join(", ", DepthColumns.Numbers.Where(c => !c.InLas).Select(c => c.Id))}, names in capitals without units, measured depth as DEPT");
        Row(text, "layers-solver.csv", "", "the columns of layers.csv in SI with every digit, and the lateral strains of the solver's column");
        Row(text, "layers.vtu", "", $"the same numbers as a grid, a hexahedron per layer; missing is {ResultsLas.Null}");
        Row(text, "column.inp", "", "the layers as a deck for CalculiX, whose comments say how to read it; column-balanced.inp starts from stress in balance");
        Row(text, "pictures.pdf", "", "where [output] pdf = true: the pictures, each on a page of A4; a letter that is not of Western Europe is a question mark there, the .svg files keep it");
        Row(text, ResultManifest.FileName, "", "names the files that a new run replaces; a folder that holds anything else is left alone");
    }

    private static void Columns<TSource>(StringBuilder text, string title, IReadOnlyList<Column<TSource>> columns, UnitSystem units)
    {
        text.Append('\n').Append(title).Append(" (name, unit, meaning; where it comes from)\n");
        foreach (var column in columns)
        {
            var unit = column is NumberColumn<TSource> number ? number.In(units).Unit.Symbol : "text";
            Row(text, column.NameIn(units), unit.Length > 0 ? unit : "1", $"{column.Title}; {column.Formula}");
        }
    }

    private static void Row(StringBuilder text, string name, string unit, string meaning)
    {
        text.Append("  ").Append(name.PadRight(28)).Append(' ');
        if (unit.Length > 0) text.Append(unit.PadRight(7)).Append(' ');
        text.Append(meaning).Append('\n');
    }
}
