using DepthStress.Cli.Printing;
using DepthStress.Core.Diagnostics;
using DepthStress.Core.Model;
using DepthStress.Files.Results;
using DepthStress.Report;

namespace DepthStress.Cli.Actions;

/// <summary>The command <c>compare</c>: what changed between two result folders.</summary>
internal static class CompareAction
{
    /// <summary>The vertical stress hardly ever changes, and would take the room of the others.</summary>
    private static readonly string[] Drawn = ["pp", "shmax", "shmin"];

    /// <summary>Compares two folders and draws them when asked to.</summary>
    public static int Run(Terminal terminal, string first, string second, string? picture)
    {
        var diagnostics = new DiagnosticBag();
        var (pathA, pathB) = (Path.GetFullPath(first, terminal.Folder), Path.GetFullPath(second, terminal.Folder));
        var a = ResultSet.Read(pathA, first, diagnostics);
        var b = ResultSet.Read(pathB, second, diagnostics);
        var target = picture is null ? null : Path.GetFullPath(picture, terminal.Folder);
        if (target is not null && new[] { pathA, pathB }.Any(f => Path.GetDirectoryName(target) == Path.TrimEndingDirectorySeparator(f)))
            diagnostics.Error(new SourcePosition(picture!), "found --out inside a result folder, expected a place beside it: a later run replaces the folder as a whole");
        if (a is null || b is null || diagnostics.HasErrors)
        {
            DiagnosticPrinter.Print(terminal, diagnostics);
            return ExitCodes.Input;
        }

        var stresses = ResultSet.Stresses.Select(s => Pair(a, b, s)).ToList();
        ComparePrinter.Print(terminal, a, b, RunChanges.Of(a, b), stresses);
        if (target is not null && !Draw(terminal, a, b, stresses, target, picture!)) return ExitCodes.Input;
        terminal.Output.WriteLine(Caution.Text);
        return ExitCodes.Done;
    }

    /// <summary>A stress in both, and what the second has more at the first one's depths.</summary>
    private static ProfilePairCurve Pair(ResultSet a, ResultSet b, string stress)
    {
        var (before, after) = (a.Depth.Numbers[stress], b.Depth.Numbers[stress]);
        var difference = ProfileMatch.SameDepths(a.Depth, b.Depth) ? [.. after] : ProfileMatch.At(b.Depth.Numbers["md"], after, a.Depth.Numbers["md"]);
        for (var i = 0; i < difference.Length; i++) difference[i] -= before[i];
        return new ProfilePairCurve(stress, before, after, difference);
    }

    private static bool Draw(Terminal terminal, ResultSet a, ResultSet b, IReadOnlyList<ProfilePairCurve> stresses, string target, string name)
    {
        List<ProfilePairCurve> drawn = [.. Drawn.Select(id => stresses.First(s => s.Column == id))];
        var pair = new ProfilePair(a.Well, a.Frame, a.Name, b.Name, a.Depth.Numbers["tvd"], b.Depth.Numbers["tvd"], drawn);
        var beside = target + ".depthstress-new";
        try
        {
            using (var stream = new FileStream(beside, FileMode.Create, FileAccess.Write)) ComparePicture.Write(pair, a.Units, stream);
            File.Move(beside, target, overwrite: true);
        }
        catch (Exception e) when (e is IOException or UnauthorizedAccessException)
        {
            terminal.Error.WriteLine($"{name}: error: the picture cannot be written ({e.Message})");
            return false;
        }

        terminal.Output.WriteLine($"Picture: {name}");
        return true;
    }
}
