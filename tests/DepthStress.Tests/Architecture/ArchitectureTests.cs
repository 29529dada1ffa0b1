using System.Reflection;
using NetArchTest.Rules;

namespace DepthStress.Tests.Architecture;

public class ArchitectureTests
{
    private static readonly Assembly Core = typeof(Core.Model.Chain).Assembly;

    private static string[] References(string assembly) => [.. Assembly.Load(assembly).GetReferencedAssemblies().Select(a => a.Name!)];

    [Fact]
    public void Core_references_no_console_no_file_format_and_no_plotting() => Assert.DoesNotContain(
        References("DepthStress.Core"),
        a => a.StartsWith("DepthStress", StringComparison.Ordinal) || a is "depthstress" or "System.Console" or "CsvHelper" or "Tomlyn" or "OxyPlot" or "Spectre.Console" or "System.CommandLine");

    [Theory]
    [InlineData("DepthStress.Files", "DepthStress.Report")]
    [InlineData("DepthStress.Files", "depthstress")]
    [InlineData("DepthStress.Report", "DepthStress.Files")]
    [InlineData("DepthStress.Report", "depthstress")]
    public void Files_and_Report_know_neither_each_other_nor_the_commands(string from, string to)
    {
        Assert.DoesNotContain(to, References(from));
        var project = File.ReadAllText(Path.Combine(Sources.Root, "src", from, from + ".csproj"));
        Assert.DoesNotContain(to == "depthstress" ? "DepthStress.Cli" : to, project, StringComparison.Ordinal);
    }

    [Fact]
    public void Core_opens_no_files() => Assert.True(UsesNone(Core, FileTypes));

    // The same rule must fail where files are opened: these tests read the sources.
    [Fact]
    public void The_file_rule_can_fail() => Assert.False(UsesNone(typeof(Sources).Assembly, FileTypes));

    private static readonly string[] FileTypes =
        ["System.IO.File", "System.IO.FileInfo", "System.IO.FileStream", "System.IO.Directory", "System.IO.DirectoryInfo", "System.IO.StreamReader", "System.IO.StreamWriter", "System.Console"];

    private static bool UsesNone(Assembly assembly, string[] types) =>
        Types.InAssembly(assembly).ShouldNot().HaveDependencyOnAny(types).GetResult().IsSuccessful;
}
