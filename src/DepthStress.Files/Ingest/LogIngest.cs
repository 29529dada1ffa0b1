using DepthStress.Core.Diagnostics;
using DepthStress.Core.Logs;
using DepthStress.Core.Quantities;
using DepthStress.Files.Reading;
using DepthStress.Files.Setup;

namespace DepthStress.Files.Ingest;

/// <summary>The logs on one set of depths in SI, with the files and columns they came from.</summary>
/// <param name="Logs">The logs.</param>
/// <param name="Files">The files, in the well file's order.</param>
/// <param name="Roles">The columns that serve each role.</param>
public sealed record IngestedLogs(LogTable Logs, IReadOnlyList<LogFile> Files, IReadOnlyList<RoleChoice> Roles);

/// <summary>Reads the log files of a well file and brings their curves onto one set of depths in SI.</summary>
public static class LogIngest
{
    /// <summary>Reads everything; null when it cannot be used, with every problem reported.</summary>
    public static IngestedLogs? Read(WellFile well, DiagnosticBag diagnostics)
    {
        ArgumentNullException.ThrowIfNull(well);
        ArgumentNullException.ThrowIfNull(diagnostics);
        var own = new DiagnosticBag();
        var logs = well.Sections.Logs.Files is { IsSet: true, Value.Count: > 0 } ? ReadFiles(well, own) : null;
        foreach (var diagnostic in own.Items) diagnostics.Add(diagnostic);
        return logs;
    }

    private static IngestedLogs? ReadFiles(WellFile well, DiagnosticBag diagnostics)
    {
        var section = well.Sections.Logs;
        var files = new List<LogFile>();
        foreach (var name in section.Files.Value.Distinct(StringComparer.Ordinal).Where(f => !string.IsNullOrWhiteSpace(f)))
        {
            if (LogFileReader.Read(well.Resolve(name), name, Options(section, name), diagnostics) is { } file) files.Add(file);
        }

        if (diagnostics.HasErrors) return null;
        var roles = RoleAssignment.Assign(section, files, diagnostics).ToList();
        var depths = files.ConvertAll(f => Depths(f, section, diagnostics));
        if (diagnostics.HasErrors) return null;

        if (DepthMerge.Of(section.Resample, files, depths, diagnostics) is not { } merge) return null;
        var curves = new List<Curve>();
        foreach (var role in roles)
        {
            if (Curve(role, files, depths, merge, diagnostics) is { } curve) curves.Add(curve);
        }

        ShearServing.Choose(section, roles, curves, diagnostics);
        return diagnostics.HasErrors ? null : new IngestedLogs(new LogTable(merge.Grid, curves), files, roles);
    }

    private static LogReadOptions Options(LogsSection section, string file) => new()
    {
        Csv = section.Csv.Options(),
        RepeatedDepth = section.RepeatedDepth.Value,
        DepthColumn = section.Depth is { Column.IsSet: true } depth ? depth.Column.Value : null,
        MissingByColumn = section.Curves
            .SelectMany(c => c.Sources)
            .Where(s => s.Column.IsSet && s.Missing.IsSet && (!s.File.IsSet || s.File.Value == file))
            .GroupBy(s => s.Column.Value, StringComparer.OrdinalIgnoreCase)
            .ToDictionary(g => g.Key, g => g.First().Missing.Value, StringComparer.OrdinalIgnoreCase),
    };

    private static double[] Depths(LogFile file, LogsSection section, DiagnosticBag diagnostics)
    {
        var column = file.Columns[file.DepthColumn];
        var stated = section.Depth?.Unit ?? default;
        var text = stated.IsSet ? stated.Value : column.Unit ?? "";
        if (Units.Find(text, Dimension.Length) is not { } unit)
        {
            var found = text.Length > 0 ? $"the unit \"{text}\"" : "no unit";
            diagnostics.Error(
                stated.IsSet ? stated.Source.Position : column.Position,
                $"depth column {column.Name}: found {found}, expected one of {Units.Symbols(Dimension.Length)}; state it in [logs.curves]: depth = {{ column = \"{column.Name}\", unit = \"m\" }}");
            return [];
        }

        var depths = (double[])column.Values.Clone();
        unit.ToSi(depths);
        return depths;
    }

    private static Curve? Curve(
        RoleChoice choice, List<LogFile> files, List<double[]> depths, DepthMerge merge, DiagnosticBag diagnostics)
    {
        var parts = new List<CurvePart>();
        var usable = true;
        foreach (var column in choice.Columns)
        {
            if (CurveUnits.Find(choice, column, diagnostics) is not { } unit)
            {
                usable = false;
                continue;
            }

            var si = CurveUnits.ToSi(choice.Role, column, unit, diagnostics);
            usable &= CurveUnits.Check(choice.Role, column, unit, si, diagnostics);
            parts.Add(merge.Bring(choice.Role, column, depths[files.IndexOf(column.File)], si));
        }

        if (!usable) return null;
        var curve = Splice.Join(choice.Role, parts, merge.Grid, merge.Step);
        merge.Report(curve, parts, diagnostics);
        return curve;
    }
}
