using DepthStress.Core.Diagnostics;
using DepthStress.Core.Logs;
using DepthStress.Files.Reading;
using DepthStress.Files.Setup;

namespace DepthStress.Files.Ingest;

/// <summary>Decides which columns serve which role: as the well file says, else by the usual mnemonics.</summary>
internal static class RoleAssignment
{
    /// <summary>Assigns every role that has a column.</summary>
    public static IReadOnlyList<RoleChoice> Assign(LogsSection logs, IReadOnlyList<LogFile> files, DiagnosticBag diagnostics)
    {
        var choices = new List<RoleChoice>();
        foreach (var role in CurveRoles.All)
        {
            var stated = logs.Curves.FirstOrDefault(c => c.Role == role.Id);
            var columns = stated is null ? ByName(role, files, choices, diagnostics) : Stated(role, stated.Sources, files, diagnostics);
            if (columns.Count > 0) choices.Add(new RoleChoice(role, columns));
        }

        ReportShared(choices, diagnostics);
        return choices;
    }

    private static void ReportShared(List<RoleChoice> choices, DiagnosticBag diagnostics)
    {
        var shared =
            from choice in choices
            from column in choice.Columns
            group (choice.Role, Choice: column) by column.Column into uses
            where uses.Select(u => u.Role).Distinct().Count() > 1
            select uses.ToList();
        foreach (var uses in shared)
        {
            var source = uses.Select(u => u.Choice.Source).LastOrDefault(s => s is not null);
            diagnostics.Error(
                source?.Column.Source.Position ?? uses[0].Choice.Column.Position,
                $"found the column \"{uses[0].Choice.Column.Name}\" for {string.Join(" and ", uses.Select(u => u.Role.Id).Distinct())}, expected a column of its own for each role");
        }
    }

    /// <summary>The columns that usual mnemonics find for a role, the most specific mnemonic first.</summary>
    public static IReadOnlyList<ColumnChoice> Candidates(CurveRole role, IReadOnlyList<LogFile> files) =>
    [
        .. from mnemonic in role.Mnemonics
           from file in files
           from column in file.Columns
           where column.Name.Equals(mnemonic, StringComparison.OrdinalIgnoreCase) && column != file.Columns[file.DepthColumn]
           select new ColumnChoice(file, column, null),
    ];

    private static IReadOnlyList<ColumnChoice> ByName(
        CurveRole role, IReadOnlyList<LogFile> files, List<RoleChoice> taken, DiagnosticBag diagnostics)
    {
        var found = Candidates(role, files);
        if (role.IsPosition)
        {
            // Nobody asked for these: they never stand in the way of what the well file says.
            found = [.. found.Where(f => !taken.Exists(t => t.Columns.Any(c => c.Column == f.Column)))];
            if (found.Count > 1)
            {
                diagnostics.Note(
                    found[0].Column.Position,
                    $"found {found.Count} columns for the role {role.Id} ({string.Join(", ", found.Select(c => $"{c.Column.Name} in {c.File.Name}"))}), took the first; another can be named in [logs.curves]");
            }

            return [.. found.Take(1)];
        }

        if (found.Count < 2) return found;
        var names = string.Join(", ", found.Select(c => $"{c.Column.Name} in {c.File.Name}"));
        diagnostics.Error(
            found[1].Column.Position,
            $"found {found.Count} columns for the role {role.Id} ({names}); expected one, or their order in [logs.curves]: {Example(role, found)}");
        return [];
    }

    private static List<ColumnChoice> Stated(
        CurveRole role, IReadOnlyList<CurveSource> sources, IReadOnlyList<LogFile> files, DiagnosticBag diagnostics)
    {
        var columns = new List<ColumnChoice>();
        double above = double.NegativeInfinity;
        for (var k = 0; k < sources.Count; k++)
        {
            var source = sources[k];
            if (!source.Column.IsSet)
            {
                diagnostics.Error(source.Position, $"{role.Id}: expected column = the name of a column");
                continue;
            }

            if (Find(role, source, files, diagnostics) is { } choice) columns.Add(choice);
            if (k < sources.Count - 1 && !source.Base.IsSet)
                diagnostics.Error(source.Position, $"{role.Id}: expected base = the measured depth where the next column takes over");
            if (source.Base.IsSet && source.Base.Value <= above)
                diagnostics.Error(source.Base.Source.Position, $"{role.Id}: expected the splice depths in increasing order");
            if (source.Base.IsSet) above = source.Base.Value;
        }

        return columns;
    }

    private static ColumnChoice? Find(CurveRole role, CurveSource source, IReadOnlyList<LogFile> files, DiagnosticBag diagnostics)
    {
        var (name, position) = (source.Column.Value, source.Column.Source.Position);
        var searched = files;
        if (source.File.IsSet)
        {
            searched = [.. files.Where(f => f.Name == source.File.Value)];
            if (searched.Count == 0)
            {
                var names = files.Select(f => f.Name).ToList();
                diagnostics.Error(
                    source.File.Source.Position,
                    $"{role.Id}: found the file \"{source.File.Value}\", expected one of [logs] files: {string.Join(", ", names)}{NearestName.Hint(source.File.Value, names)}");
                return null;
            }
        }

        var found = (
            from file in searched
            from column in file.Columns
            where column.Name.Equals(name, StringComparison.OrdinalIgnoreCase)
            select new ColumnChoice(file, column, source)).ToList();
        if (found.Count == 1) return found[0];
        if (found.Count == 0)
        {
            var names = searched.SelectMany(f => f.Columns).Select(c => c.Name).Distinct().ToList();
            diagnostics.Error(position, $"{role.Id}: found no column \"{name}\"; the files have {string.Join(", ", names)}{NearestName.Hint(name, names)}");
        }
        else
        {
            diagnostics.Error(
                position,
                $"{role.Id}: found the column \"{name}\" in {string.Join(" and ", found.Select(c => c.File.Name))}; expected file = one of them, or both in order with base depths");
        }

        return null;
    }

    private static string Example(CurveRole role, IReadOnlyList<ColumnChoice> found)
    {
        var (a, b) = (found[0], found[1]);
        return a.File == b.File
            ? $"{role.Id} = \"{a.Column.Name}\""
            : $"{role.Id} = [{{ column = \"{a.Column.Name}\", file = \"{a.File.Name}\", base = \"1234 m\" }}, {{ column = \"{b.Column.Name}\", file = \"{b.File.Name}\" }}]";
    }
}
