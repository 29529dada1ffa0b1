using System.Globalization;
using DepthStress.Core.Diagnostics;

namespace DepthStress.Files.Reading;

/// <summary>What a file says of a column before its values.</summary>
internal sealed record ColumnHeader(string Name, string? Unit, string Description, SourcePosition Position)
{
    /// <summary>Names blank columns UNKNOWN and numbers equal names (without regard to case) <c>:1</c>, <c>:2</c>, each with a note, up to a limit.</summary>
    public static void MakeUnique(List<ColumnHeader> headers, DiagnosticBag diagnostics)
    {
        var notes = 0;
        for (var i = 0; i < headers.Count; i++)
        {
            if (headers[i].Name.Length > 0) continue;
            headers[i] = headers[i] with { Name = "UNKNOWN" };
            if (++notes <= ProblemTally.Limit) diagnostics.Note(headers[i].Position, "found a column without a name, called it UNKNOWN");
        }

        var taken = headers.Select(h => h.Name).ToHashSet(StringComparer.OrdinalIgnoreCase);
        if (taken.Count == headers.Count) return;
        var uses = headers.GroupBy(h => h.Name, StringComparer.OrdinalIgnoreCase)
            .Where(g => g.Count() > 1).ToDictionary(g => g.Key, _ => 0, StringComparer.OrdinalIgnoreCase);
        for (var i = 0; i < headers.Count; i++)
        {
            var name = headers[i].Name;
            if (!uses.TryGetValue(name, out var number)) continue;
            string unique;
            do unique = string.Create(CultureInfo.InvariantCulture, $"{name}:{++number}");
            while (!taken.Add(unique));
            uses[name] = number;
            headers[i] = headers[i] with { Name = unique };
            if (++notes <= ProblemTally.Limit) diagnostics.Note(headers[i].Position, $"found the name \"{name}\" more than once, called this column \"{unique}\"");
        }

        if (notes > ProblemTally.Limit) diagnostics.Note(headers[0].Position, string.Create(CultureInfo.InvariantCulture, $"and {notes - ProblemTally.Limit} more names of columns were made or changed"));
    }

    /// <summary>Finds a column by the name the user gave; -1 and an error when there is none.</summary>
    public static int FindNamed(List<ColumnHeader> headers, string name, LogSource source)
    {
        var index = headers.FindIndex(h => h.Name == name);
        if (index < 0) index = headers.FindIndex(h => h.Name.Equals(name, StringComparison.OrdinalIgnoreCase));
        if (index < 0)
        {
            source.Diagnostics.Error(
                source.At(), $"found no column \"{name}\", expected it as depth{NearestName.Hint(name, headers.Select(h => h.Name))}");
        }

        return index;
    }

    /// <summary>Finds the depth column of a CSV file by the usual names; -1 and an error when there is none.</summary>
    public static int FindDepth(List<ColumnHeader> headers, int line, LogSource source)
    {
        var names = source.Options.DepthNames;
        foreach (var name in names)
        {
            var index = headers.FindIndex(h => Matches(h.Name, name));
            if (index >= 0) return index;
        }

        if (!TimeIndex.Refuse(headers[0], source))
        {
            source.Diagnostics.Error(
                source.At(line), $"found no depth column, expected one named {string.Join(", ", names.SkipLast(1))} or {names[^1]}");
        }

        return -1;
    }

    /// <summary>True where a column of that name would be the depth column.</summary>
    public static bool IsDepth(string name, LogReadOptions options) => options.DepthColumn is { } named
        ? named.Equals(name, StringComparison.OrdinalIgnoreCase)
        : options.DepthNames.Any(n => Matches(name, n));

    private static bool Matches(string found, string usual) => found.Replace(' ', '_').Equals(usual, StringComparison.OrdinalIgnoreCase);
}
