using System.CommandLine;
using DepthStress.Core.Model;

namespace DepthStress.Tests.Cli;

/// <summary>Help, version, wrong usage, the catalogue and the schema.</summary>
public sealed class CliHelpTests : IDisposable
{
    private readonly CliRunner _cli = new();

    public void Dispose() => _cli.Dispose();

    [Theory]
    [InlineData("help")]
    [InlineData("help-init", "init")]
    [InlineData("help-check", "check")]
    [InlineData("help-run", "run")]
    [InlineData("help-calibrate", "calibrate")]
    [InlineData("help-compare", "compare")]
    [InlineData("help-methods", "methods")]
    [InlineData("help-schema", "schema")]
    public async Task Help_is_as_it_was(string golden, params string[] command)
    {
        var result = await _cli.RunAsync([.. command, "--help"]);
        Assert.Equal((0, ""), (result.Code, result.Error));

        // The program's name comes from the process, which here is the one that runs the tests.
        Golden.Match(golden + ".txt", result.Output.Replace(RootCommand.ExecutableName + " ", "depthstress ", StringComparison.Ordinal));
    }

    [Fact]
    public async Task The_version_is_one_line()
    {
        var result = await _cli.RunAsync("--version");
        Assert.Equal((0, ""), (result.Code, result.Error));
        Assert.Matches(@"^\d+\.\d+\.\d+\n$", result.Output);
    }

    [Theory]
    [InlineData("error: Required command was not provided.\nRun \"depthstress --help\" for usage.\n")]
    [InlineData("error: Required command was not provided.\nerror: Unrecognized command or argument 'frob'.\nRun \"depthstress --help\" for usage.\n", "frob")]
    [InlineData("error: Required argument 'WELLFILE' missing for command: 'run'.\nRun \"depthstress run --help\" for usage.\n", "run")]
    [InlineData("error: Required argument 'WELLFILE' missing for command: 'check'.\nRun \"depthstress check --help\" for usage.\n", "check")]
    [InlineData("error: Unrecognized command or argument 'b'.\nRun \"depthstress check --help\" for usage.\n", "check", "a", "b")]
    [InlineData("error: found --jobs x, expected a whole number of 1 or more\nRun \"depthstress run --help\" for usage.\n", "run", "a", "--jobs", "x")]
    [InlineData("error: found --jobs 0, expected a whole number of 1 or more\nRun \"depthstress run --help\" for usage.\n", "run", "a", "--jobs", "0")]
    [InlineData("error: found --jobs 1,000, expected a whole number of 1 or more\nRun \"depthstress run --help\" for usage.\n", "run", "a", "--jobs", "1,000")]
    [InlineData("error: Required argument missing for option: '--jobs'.\nRun \"depthstress run --help\" for usage.\n", "run", "a", "--jobs")]
    [InlineData("error: Required argument missing for option: '--out'.\nRun \"depthstress run --help\" for usage.\n", "run", "a", "--out")]
    [InlineData("error: found --out with several well files, expected one: --out takes the results of one well\nRun \"depthstress run --help\" for usage.\n", "run", "a", "b", "--out", "c")]
    [InlineData("error: found the unknown option --outt, expected one of --out, --jobs, --strict, --spread, or ./--outt for a file of that name; did you mean \"--out\"?\nRun \"depthstress run --help\" for usage.\n", "run", "a", "--outt")]
    [InlineData("error: found the unknown option --froce, expected one of --force, or ./--froce for a file of that name; did you mean \"--force\"?\nRun \"depthstress init --help\" for usage.\n", "init", "--froce")]
    [InlineData("error: found an empty WELLFILE, expected the name of a file\nRun \"depthstress check --help\" for usage.\n", "check", "")]
    [InlineData("error: Required argument 'B' missing for command: 'compare'.\nRun \"depthstress compare --help\" for usage.\n", "compare", "a")]
    [InlineData("error: found --out c.png, expected a name that ends with .svg\nRun \"depthstress compare --help\" for usage.\n", "compare", "a", "b", "--out", "c.png")]
    [InlineData("error: found well files that share one result folder (a.toml, ./a.toml), expected each well once and under a name of its own\nRun \"depthstress run --help\" for usage.\n", "run", "a.toml", "./a.toml")]
    [InlineData("error: found well files that share one result folder (a.toml, a.txt), expected each well once and under a name of its own\nRun \"depthstress run --help\" for usage.\n", "run", "a.toml", "a.txt")]
    public async Task Wrong_usage_ends_with_1_and_says_so_on_the_error_writer(string expected, params string[] args)
    {
        var result = await _cli.RunAsync(args);
        Assert.Equal((1, "", expected), (result.Code, result.Output, result.Error));
    }

    [Fact]
    public async Task Methods_lists_every_method_once()
    {
        var result = await _cli.RunAsync("methods");
        Assert.Equal((0, ""), (result.Code, result.Error));
        foreach (var law in MethodCatalogue.All) Assert.Single(result.Output.Split('\n'), l => l.TrimStart(' ', '*').StartsWith($"{law.Id} ", StringComparison.Ordinal));
    }

    [Fact]
    public async Task Methods_shows_each_method_whole()
    {
        foreach (var law in MethodCatalogue.All)
        {
            var result = await _cli.RunAsync("methods", law.Id);
            Assert.Equal((0, ""), (result.Code, result.Error));
            Assert.Contains(law.Id, result.Output, StringComparison.Ordinal);
            Assert.Contains(law.Text, Unwrapped(result.Output), StringComparison.Ordinal);
            Assert.Contains(law.Source, Unwrapped(result.Output), StringComparison.Ordinal);
        }
    }

    [Fact]
    public async Task A_method_page_is_as_it_was() => Golden.Match("methods-lacy-1997-shale.txt", (await _cli.RunAsync("methods", "lacy-1997-shale")).Output);

    [Fact]
    public async Task An_unknown_method_comes_with_the_nearest_one()
    {
        var result = await _cli.RunAsync("methods", "lacy-1997-shal");
        Assert.Equal(
            (1, "", "error: found the unknown method \"lacy-1997-shal\", expected one of the list that \"depthstress methods\" prints; did you mean \"lacy-1997-shale\"?\n"),
            (result.Code, result.Output, result.Error));
    }

    [Fact]
    public async Task Schema_prints_the_schema()
    {
        var result = await _cli.RunAsync("schema");
        Assert.Equal((0, ""), (result.Code, result.Error));
        Golden.Match("schema.json", result.Output);
    }

    private static string Unwrapped(string text) => string.Join(' ', text.Split([' ', '\n'], StringSplitOptions.RemoveEmptyEntries));
}
