using DepthStress.Core.Diagnostics;
using DepthStress.Core.Model;
using DepthStress.Core.Quantities;
using DepthStress.Files.Reading;

namespace DepthStress.Files.Setup;

/// <summary>Reads a laboratory table of core plugs from CSV: one row each, quantities with their unit in the cell or in the name of the column.</summary>
internal static class CoreFile
{
    // Common practice.
    private static readonly (string Column, Dimension? Dimension, string[] Names)[] Known =
    [
        ("depth", Dimension.Length, ["depth", "md", "measured_depth", "core_depth"]),
        ("orientation", null, ["orientation", "direction", "plug_orientation"]),
        ("confining_pressure", Dimension.Pressure, ["confining_pressure", "confining", "confining_stress", "pc"]),
        ("youngs_static", Dimension.Pressure, ["youngs_static", "youngs_modulus", "youngs", "static_youngs", "static_youngs_modulus", "e_static", "e"]),
        ("poisson_static", Dimension.None, ["poisson_static", "poissons_ratio", "poisson_ratio", "poisson", "nu_static", "nu"]),
        ("ucs", Dimension.Pressure, ["ucs", "unconfined_compressive_strength"]),
        ("strength", Dimension.Pressure, ["strength", "peak_strength", "compressive_strength"]),
    ];

    /// <summary>The sound rows of a file; every bad cell of the others is reported.</summary>
    /// <param name="path">Full path.</param>
    /// <param name="name">The file as the well file names it.</param>
    /// <param name="csv">How CSV files are written.</param>
    /// <param name="inputs">Gets the file with its hash.</param>
    /// <param name="diagnostics">Gets every problem.</param>
    public static IReadOnlyList<CorePlug> Read(string path, string name, CsvOptions csv, List<InputFile> inputs, DiagnosticBag diagnostics)
    {
        if (TextTable.Read(path, name, csv, text => Find(text).Column is not null, diagnostics) is not { } table) return [];
        inputs.Add(new InputFile(name, table.Sha256));
        var columns = new Dictionary<string, (int Index, Unit? Unit)>(StringComparer.Ordinal);
        var sound = true;
        for (var i = 0; i < table.Header.Length; i++) sound &= Take(table.Header[i], i, columns, diagnostics);
        if (!columns.ContainsKey("depth"))
        {
            diagnostics.Error(new SourcePosition(name, table.Header.Length > 0 ? table.Header[0].Position.Line : 0), $"found no column for depth, expected one named {string.Join(", ", Known[0].Names)}");
            return [];
        }

        if (!sound) return [];
        if (table.Rows.Count == 0) diagnostics.Warning(new SourcePosition(name), "found no rows below the header, expected a plug in each");
        var plugs = new List<CorePlug>();
        foreach (var row in table.Rows)
        {
            if (new CoreRow(columns, row, csv.Decimal == ',', diagnostics).Read() is { } plug) plugs.Add(plug);
        }

        return plugs;
    }

    private static bool Take(TextCell header, int index, Dictionary<string, (int Index, Unit? Unit)> columns, DiagnosticBag diagnostics)
    {
        if (header.Text.Length == 0) return true;
        var (column, dimension, stated) = Find(header.Text);
        if (column is null)
        {
            diagnostics.Note(header.Position, $"found the column \"{Words.Short(header.Text)}\", which is not read; columns with a meaning are {string.Join(", ", Known.Select(k => k.Column))}");
            return true;
        }

        var unit = stated is null || dimension is not { } wanted ? null : Units.Find(stated, [wanted]);
        if (stated is not null && unit is null)
        {
            diagnostics.Error(header.Position, $"column {column}: found the unit \"{stated}\", expected {(dimension is { } d && d != Dimension.None ? $"one of {Units.Symbols([d])}" : "none")}");
            return false;
        }

        if (columns.TryAdd(column, (index, unit))) return true;
        diagnostics.Error(header.Position, $"found a second column for {column}, expected one");
        return false;
    }

    /// <summary>The column a header cell names, what it measures, and the unit it states.</summary>
    private static (string? Column, Dimension? Dimension, string? Unit) Find(string text)
    {
        var whole = Plain(text);
        var known = Array.Find(Known, k => k.Names.Contains(whole));
        if (known.Column is not null) return (known.Column, known.Dimension, null);
        var (name, unit) = CsvHeader.SplitUnit(text, suffixes: true);
        known = Array.Find(Known, k => k.Names.Contains(Plain(name)));
        return (known.Column, known.Dimension, unit);
    }

    private static string Plain(string name) =>
        name.Trim().Replace("'", "", StringComparison.Ordinal).Replace(' ', '_').Replace('-', '_').ToLowerInvariant();
}
