using System.Text.RegularExpressions;
using DepthStress.Cli;

namespace DepthStress.Tests.Readme;

/// <summary>
/// The README's commands, run in process on the sample well, and its excerpts and pictures against what they give. In an excerpt
/// the line <c>...</c> stands for any number of lines. <c>DEPTHSTRESS_UPDATE_GOLDEN=1</c> rewrites the pictures.
/// </summary>
public sealed partial class ReadmeTests : IDisposable
{
    private readonly TestFolder _folder = new();

    private static string Text => File.ReadAllText(Path.Combine(Golden.RepoRoot, "README.md"));

    public void Dispose() => _folder.Dispose();

    [Fact]
    public void The_first_paragraph_states_the_job_in_one_paragraph() =>
        Assert.StartsWith("DepthStress builds a one-dimensional mechanical earth model from well logs", Text.Split("\n\n")[0], StringComparison.Ordinal);

    [Fact]
    public async Task Every_excerpt_is_what_its_command_prints()
    {
        CopySampleLogs();
        var excerpts = Excerpts().Matches(Text);
        Assert.NotEmpty(excerpts);
        foreach (Match excerpt in excerpts)
        {
            using var output = new StringWriter { NewLine = "\n" };
            using var error = new StringWriter { NewLine = "\n" };
            var terminal = new Terminal(output, error, _folder.Path);
            Assert.Equal(0, await Application.RunAsync(excerpt.Groups["command"].Value.Split(' '), terminal, CancellationToken.None));
            Assert.True(Holds(Lines(excerpt.Groups["text"].Value), Lines(output.ToString())), $"README excerpt of \"{excerpt.Groups["command"].Value}\" is not what it prints:\n{output}");
        }
    }

    [Fact]
    public void An_excerpt_that_was_never_printed_is_found_out()
    {
        string[] printed = ["a", "b", "c", "d"];
        Assert.True(Holds(["a", "...", "c", "d"], printed));
        Assert.True(Holds(["b", "c", "..."], ["b", "c", "d"]));
        Assert.False(Holds(["a", "c"], printed));
        Assert.False(Holds(["a", "...", "x"], printed));
        Assert.False(Holds(["a", "b", "c"], printed));
    }

    [Theory]
    [InlineData("tracks.svg")]
    [InlineData("stress.svg")]
    [InlineData("layers.svg")]
    public async Task The_pictures_are_what_the_first_command_draws(string name)
    {
        CopySampleLogs();
        Assert.Contains($"(.readme/{name})", Text, StringComparison.Ordinal);
        using var output = new StringWriter();
        Assert.Equal(0, await Application.RunAsync(["run", "sample-logs/quillback-4.toml"], new Terminal(output, output, _folder.Path), CancellationToken.None));
        var drawn = await File.ReadAllTextAsync(Path.Combine(_folder.Path, "sample-logs", "quillback-4-results", name));
        var kept = Path.Combine(Golden.RepoRoot, ".readme", name);
        if (Golden.Updating) await File.WriteAllTextAsync(kept, drawn);
        Assert.True(drawn == await File.ReadAllTextAsync(kept), $".readme/{name} is not what the sample well gives");
    }

    [Fact]
    public async Task The_picture_of_the_calibration_is_what_calibrate_draws()
    {
        CopySampleLogs();
        Assert.Contains("(.readme/calibration.svg)", Text, StringComparison.Ordinal);
        using var output = new StringWriter();
        Assert.Equal(0, await Application.RunAsync(["calibrate", "sample-logs/quillback-4.toml"], new Terminal(output, output, _folder.Path), CancellationToken.None));
        var drawn = await File.ReadAllTextAsync(Path.Combine(_folder.Path, "sample-logs", "quillback-4-calibration", "calibration.svg"));
        var kept = Path.Combine(Golden.RepoRoot, ".readme", "calibration.svg");
        if (Golden.Updating) await File.WriteAllTextAsync(kept, drawn);
        Assert.True(drawn == await File.ReadAllTextAsync(kept), ".readme/calibration.svg is not what the sample well gives");
    }

    [Fact]
    public async Task The_layer_table_of_the_sample_well_is_as_agreed()
    {
        CopySampleLogs();
        using var output = new StringWriter();
        Assert.Equal(0, await Application.RunAsync(["run", "sample-logs/quillback-4.toml"], new Terminal(output, output, _folder.Path), CancellationToken.None));
        Golden.Match("sample-layers.csv", _folder.Read("sample-logs/quillback-4-results/layers.csv"));
    }

    /// <summary>An excerpt of a result file is whole lines of it, cut to the named columns.</summary>
    [Fact]
    public async Task The_excerpt_of_the_layer_table_is_what_the_first_command_writes()
    {
        CopySampleLogs();
        using var output = new StringWriter();
        Assert.Equal(0, await Application.RunAsync(["run", "sample-logs/quillback-4.toml"], new Terminal(output, output, _folder.Path), CancellationToken.None));
        var table = Lines(_folder.Read("sample-logs/quillback-4-results/layers.csv")).Select(l => l.Split(',')).ToList();
        var excerpt = TableExcerpt().Match(Text);
        Assert.True(excerpt.Success);
        var rows = Lines(excerpt.Groups["text"].Value).Where(l => l != "...").Select(l => l.Split(',')).ToList();
        var columns = rows[0].Select(name => Array.IndexOf(table[0], name)).ToList();
        Assert.DoesNotContain(-1, columns);
        Assert.InRange(rows.Count, 3, table.Count);
        foreach (var row in rows) Assert.Contains(table, line => columns.Select(c => line[c]).SequenceEqual(row));
    }

    [Fact]
    public void The_two_commands_stand_in_the_readme_as_the_check_script_runs_them()
    {
        var script = File.ReadAllText(Path.Combine(Golden.RepoRoot, ".ci", "run"));
        foreach (var command in (string[])["dotnet run --project src/DepthStress.Cli -- run sample-logs/quillback-4.toml", "dotnet test"])
        {
            Assert.Contains($"\n    {command}\n", Text, StringComparison.Ordinal);
            Assert.Contains(command, script, StringComparison.Ordinal);
        }
    }

    private void CopySampleLogs()
    {
        var target = Directory.CreateDirectory(Path.Combine(_folder.Path, "sample-logs")).FullName;
        foreach (var file in Directory.GetFiles(Path.Combine(Golden.RepoRoot, "sample-logs"))) File.Copy(file, Path.Combine(target, Path.GetFileName(file)));
    }

    private static string[] Lines(string text) => [.. text.Split('\n').Select(l => l.TrimEnd()).Where(l => l.Length > 0)];

    /// <summary>True when the wanted lines are the printed ones, but for what <c>...</c> leaves out.</summary>
    private static bool Holds(ReadOnlySpan<string> wanted, ReadOnlySpan<string> printed)
    {
        if (wanted.IsEmpty) return printed.IsEmpty;
        if (wanted[0] != "...") return !printed.IsEmpty && wanted[0] == printed[0] && Holds(wanted[1..], printed[1..]);
        for (var skipped = 0; skipped <= printed.Length; skipped++)
        {
            if (Holds(wanted[1..], printed[skipped..])) return true;
        }

        return false;
    }

    [GeneratedRegex("<!-- columns of layers.csv -->\n```\n(?<text>.*?)```", RegexOptions.Singleline | RegexOptions.ExplicitCapture)]
    private static partial Regex TableExcerpt();

    [GeneratedRegex("<!-- excerpt: (?<command>[^\n]+) -->\n```\n(?<text>.*?)```", RegexOptions.Singleline | RegexOptions.ExplicitCapture)]
    private static partial Regex Excerpts();
}
