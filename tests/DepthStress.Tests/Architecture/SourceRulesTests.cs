using System.Text.RegularExpressions;

namespace DepthStress.Tests.Architecture;

/// <summary>Rules that the sources keep: results depend on the input alone, and libraries do not talk to the terminal.</summary>
public class SourceRulesTests
{
    private static readonly string[] Libraries = ["DepthStress.Core", "DepthStress.Files", "DepthStress.Report"];

    // Clock, machine, user and unseeded randomness; a stopwatch in the commands is allowed for timings on the terminal.
    private static readonly (string Pattern, string Reason)[] Rules =
    [
        (@"\bDateTime(Offset)?\.(Now|UtcNow|Today)\b", "no result may depend on the clock"),
        (@"\bTimeProvider\b", "no result may depend on the clock"),
        (@"\bEnvironment\.(MachineName|UserName|UserDomainName|TickCount|TickCount64|CurrentDirectory)\b", "no result may depend on the machine"),
        (@"\bnew Random\(\)|\bRandom\.Shared\b", "randomness needs a seed"),
        (@"\bRandom \w+ = new\(\)", "randomness needs a seed"),
        (@"\bGuid\.(NewGuid|CreateVersion7)\b", "no result may differ from run to run"),
        (@"\bNotImplementedException\b", "nothing is a stub"),
    ];

    [Fact]
    public void The_libraries_keep_to_their_input() => Assert.All(Rules, rule =>
    {
        var found = Sources.Find(Libraries.SelectMany(Sources.Of), line => Regex.IsMatch(line, rule.Pattern));
        Assert.True(found.Length == 0, $"{rule.Reason}: {string.Join(Environment.NewLine, found)}");
    });

    [Fact]
    public void Libraries_do_not_write_to_the_console() =>
        Assert.Empty(Sources.Find(Libraries.SelectMany(Sources.Of), line => Regex.IsMatch(line, @"\bConsole\.")));

    [Fact]
    public void Nothing_is_left_to_do() =>
        Assert.Empty(Sources.Find(Sources.Of("").Select(f => (f.Path, f.Lines.Select(l => "| " + l).ToArray())), line => Regex.IsMatch(line, @"\b(TODO|FIXME|HACK|XXX)\b")));

    [Fact]
    public void Project_files_carry_no_versions()
    {
        var files = new[] { "src", "tests" }.SelectMany(f => Directory.EnumerateFiles(Path.Combine(Sources.Root, f), "*.csproj", SearchOption.AllDirectories)).ToArray();
        Assert.NotEmpty(files);
        foreach (var file in files)
            Assert.DoesNotMatch(@"\bVersion(Override)?\s*=|<Version>", File.ReadAllText(file));
    }

    // Every rule must be able to fail.
    [Theory]
    [InlineData("var now = DateTime.UtcNow;")]
    [InlineData("var now = DateTimeOffset.Now;")]
    [InlineData("var name = Environment.MachineName;")]
    [InlineData("var random = new Random();")]
    [InlineData("Random random = new();")]
    [InlineData("var x = Random.Shared.Next();")]
    [InlineData("var id = Guid.NewGuid();")]
    public void A_planted_violation_is_seen(string line) =>
        Assert.Single(Sources.Find([("planted.cs", [line, "// " + line])], l => Rules.Any(r => Regex.IsMatch(l, r.Pattern))));

    [Fact]
    public void The_scan_sees_the_sources() => Assert.All(Libraries[..1], l => Assert.NotEmpty(Sources.Of(l)));
}
