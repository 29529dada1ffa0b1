using System.Text;
using DepthStress.Core.Layers;
using DepthStress.Files.Writing;
using DepthStress.Tests.Solver;

namespace DepthStress.Tests.Readme;

/// <summary>The README's numbers of the closed loop are what CalculiX gives; <c>DEPTHSTRESS_UPDATE_GOLDEN=1</c> rewrites them.</summary>
public class ClosedLoopReadmeTests
{
    private const string Start = "<!-- closed loop -->\n";
    private const string End = "<!-- end of closed loop -->";

    [SolverFact]
    public void The_two_numbers_are_what_the_solver_gives()
    {
        var table = new StringBuilder("| deck | against the layers' formula, at most | against the profile |\n|---|---|---|\n");
        foreach (var (rock, name) in (ReadOnlySpan<(SolverRock, string)>)[(SolverRock.Isotropic, "isotropic"), (SolverRock.Layered, "layered")])
        {
            var settings = SampleColumn.Settings(rock);
            var run = CalculixRun.Of(SampleColumn.Deck(SampleColumn.Table, SampleColumn.Model.Setup, settings, DeckStart.FromLoads));
            table.Append("| ").Append(name).Append(" | ").Append(CalculixLoop.Of(SampleColumn.Table, SolverColumn.Of(SampleColumn.Table, rock)!, run, settings)).Append(" |\n");
        }

        var path = Path.Combine(Golden.RepoRoot, "README.md");
        var text = File.ReadAllText(path);
        var (from, to) = (text.IndexOf(Start, StringComparison.Ordinal) + Start.Length, text.IndexOf(End, StringComparison.Ordinal));
        if (Golden.Updating) File.WriteAllText(path, text[..from] + table + text[to..]);
        else Assert.Equal(table.ToString(), text[from..to]);
    }
}
