using DepthStress.Core.Diagnostics;
using DepthStress.Core.Quantities;
using DepthStress.Files.Reading;

namespace DepthStress.Files.Setup;

/// <summary>The columns of a file of observations: where each stands, and the unit that its header states.</summary>
internal sealed class ObservationColumns
{
    private static readonly Dimension[] Values = [Dimension.Pressure, Dimension.Angle, Dimension.Density, Dimension.PressureGradient];

    private static readonly (string Name, bool Needed, Dimension[] Dimensions)[] Known =
    [
        ("top", true, [Dimension.Length]), ("base", true, [Dimension.Length]), ("depth_kind", true, []), ("kind", true, []),
        ("value", true, Values), ("pressure_at", false, []), ("fluid_density", false, [Dimension.Density, Dimension.PressureGradient]),
        ("sigma", true, Values), ("pore_pressure", false, [Dimension.Pressure]), ("date", false, []), ("note", false, []),
    ];

    private readonly Dictionary<string, (int Index, Unit? Unit)> _columns = new(StringComparer.Ordinal);

    private ObservationColumns()
    {
    }

    /// <summary>True for a header cell that names a column.</summary>
    public static bool IsName(string text) => Array.Exists(Known, k => k.Name == NameOf(text).Name);

    /// <summary>Finds the columns; null, with errors, where one that is needed is not there.</summary>
    public static ObservationColumns? Of(TextTable table, DiagnosticBag diagnostics)
    {
        var columns = new ObservationColumns();
        var sound = true;
        for (var i = 0; i < table.Header.Length; i++)
        {
            var (text, position) = table.Header[i];
            var (name, stated) = NameOf(text);
            if (text.Length == 0) continue;
            var known = Array.Find(Known, k => k.Name == name);
            if (known.Name is null)
            {
                diagnostics.Warning(position, $"found the column \"{Words.Short(text)}\", which is not read; columns with a meaning are {Names(false)}{NearestName.Hint(name, Known.Select(k => k.Name))}");
                continue;
            }

            var unit = stated is null ? null : Units.Find(stated, known.Dimensions);
            if (stated is not null && unit is null)
                sound = Refuse(position, $"column {name}: found \"{stated}\", expected {(known.Dimensions.Length == 0 ? "no unit" : $"one of {Units.Symbols(known.Dimensions)}")}");
            if (!columns._columns.TryAdd(name, (i, unit))) sound = Refuse(position, $"found a second column {name}, expected one");
        }

        foreach (var (name, needed, _) in Known)
        {
            if (needed && !columns._columns.ContainsKey(name))
                sound = Refuse(table.Header.Length > 0 ? table.Header[0].Position with { Column = 0 } : new SourcePosition(table.Name), $"found no column {name}, expected {Names(true)} in the header row, and where they apply {Names(null)}");
        }

        return sound ? columns : null;

        bool Refuse(SourcePosition position, string problem)
        {
            diagnostics.Error(position, problem);
            return false;
        }
    }

    /// <summary>The cell of a column in a row, and the unit its header states; an empty one where the file has no such column.</summary>
    public (TextCell Cell, Unit? Unit) Get(TextCell[] row, string name) =>
        _columns.TryGetValue(name, out var column) ? (row[column.Index], column.Unit) : (new TextCell("", row[0].Position with { Column = 0 }), null);

    private static (string Name, string? Unit) NameOf(string text)
    {
        var plain = Plain(text);
        if (Array.Exists(Known, k => k.Name == plain)) return (plain, null);
        var (name, unit) = CsvHeader.SplitUnit(text, suffixes: true);
        return (Plain(name), unit);
    }

    private static string Plain(string name) => name.Trim().Replace(' ', '_').Replace('-', '_').ToLowerInvariant();

    private static string Names(bool? needed) => string.Join(", ", Known.Where(k => needed != false ? k.Needed == (needed == true) : true).Select(k => k.Name));
}
