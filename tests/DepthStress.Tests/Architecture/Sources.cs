using System.Reflection;

namespace DepthStress.Tests.Architecture;

/// <summary>The program's source files.</summary>
internal static class Sources
{
    public static string Root { get; } = typeof(Sources).Assembly.GetCustomAttributes<AssemblyMetadataAttribute>().Single(a => a.Key == "RepoRoot").Value!;

    /// <summary>Every C# file below src, or below one of its projects, with its path from the root.</summary>
    public static IReadOnlyList<(string Path, string[] Lines)> Of(string folder) =>
    [
        .. Directory.EnumerateFiles(Path.Combine(Root, "src", folder), "*.cs", SearchOption.AllDirectories)
            .Order(StringComparer.Ordinal)
            .Select(f => (Path.GetRelativePath(Root, f).Replace('\\', '/'), File.ReadAllLines(f))),
    ];

    /// <summary>Lines of code, without comment lines, that match, as <c>path(line): text</c>.</summary>
    public static string[] Find(IEnumerable<(string Path, string[] Lines)> files, Func<string, bool> match) =>
    [
        .. files.SelectMany(f => f.Lines.Select((line, i) => (f.Path, Number: (i + 1).ToString(System.Globalization.CultureInfo.InvariantCulture), Line: line.Trim())))
            .Where(l => !l.Line.StartsWith("//", StringComparison.Ordinal) && match(l.Line))
            .Select(l => $"{l.Path}({l.Number}): {l.Line}"),
    ];
}
