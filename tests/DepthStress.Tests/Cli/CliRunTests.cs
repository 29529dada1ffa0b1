using System.Text.Json.Nodes;
using DepthStress.Cli;
using DepthStress.Tests.WellFiles;
using SampleWell;

namespace DepthStress.Tests.Cli;

/// <summary>The command <c>run</c>: what it writes, what it ends with, and that results depend on the input alone.</summary>
public sealed class CliRunTests : IDisposable
{
    private readonly CliRunner _cli = new();

    public void Dispose() => _cli.Dispose();

    [Fact]
    public async Task A_run_writes_every_result_beside_the_well_file()
    {
        _cli.SmallWell("well.toml");
        var result = await _cli.RunAsync("run", "well.toml");
        Assert.Equal((0, ""), (result.Code, result.Error));
        Assert.Contains("\nResults: well-results\n", result.Output, StringComparison.Ordinal);
        Assert.StartsWith("Well Testwell 1: 5 samples, 1000.0 m to 1002.0 m measured depth", result.Output, StringComparison.Ordinal);
        Assert.Equal(
            [".depthstress-files", "README.txt", "column-balanced.inp", "column.inp", "depth.csv", "layers-solver.csv", "layers.csv", "layers.json", "layers.svg", "layers.vtu", "polygon.svg", "report.html", "results.las", "run.json", "stress.svg", "tracks.svg"],
            _cli.Files("well-results").Keys);
        Assert.Equal(["logs.csv", "well-results", "well.toml"], Directory.EnumerateFileSystemEntries(_cli.Folder.Path).Select(Path.GetFileName).Order(StringComparer.Ordinal));
    }

    [Fact]
    public async Task Nothing_but_results_and_messages_and_no_escape_codes()
    {
        SampleLogs.Write(_cli.Folder.Path);
        var run = await _cli.RunAsync("run", "quillback-4.toml");
        var check = await _cli.RunAsync("check", "quillback-4.toml");
        Assert.Equal((0, 0), (run.Code, check.Code));
        Assert.Equal(run.Error, check.Error);
        Assert.All(run.Error.Split('\n', StringSplitOptions.RemoveEmptyEntries), m => Assert.Matches(@"^quillback-4-run[12]\.csv\(1,\d+\): (note|warning): ", m));
        Assert.DoesNotContain('\u001b', run.Output + run.Error + check.Output);
        Assert.DoesNotContain('\r', run.Output + run.Error + check.Output);
        Assert.DoesNotContain('\u2026', run.Output); // no heading is cut off
    }

    [Fact]
    public async Task The_record_of_a_run_says_what_was_predicted_how_and_how_sure_it_is()
    {
        SampleLogs.Write(_cli.Folder.Path);
        Assert.Equal(0, (await _cli.RunAsync("run", "quillback-4.toml")).Code);
        var predictions = JsonNode.Parse(_cli.Folder.Read("quillback-4-results/run.json"))!["predictions"]!.AsArray();
        Assert.NotEmpty(predictions);
        foreach (var p in predictions.Select(p => p!.AsObject()))
        {
            Assert.Equal(["property", "method", "formula", "unit", "standard_error", "samples", "beyond_training"], p.Select(k => k.Key));
            Assert.Equal(("vs", "m/s"), (p["property"]!.GetValue<string>(), p["unit"]!.GetValue<string>()));
            Assert.StartsWith("trained on ", p["method"]!.GetValue<string>(), StringComparison.Ordinal);
            Assert.Matches(@"^Vs = -?[0-9.]+ Vp ", p["formula"]!.GetValue<string>());
            Assert.InRange(p["standard_error"]!.GetValue<double>(), 1, 300); // m/s: neither without error nor as good as none
            Assert.InRange(p["beyond_training"]!.GetValue<int>(), 0, p["samples"]!.GetValue<int>());
        }

        // Every sample that was predicted is in one of them, and no other: counted in the table of results.
        var rows = _cli.Folder.Read("quillback-4-results/depth.csv").Split('\n', StringSplitOptions.RemoveEmptyEntries).Select(r => r.Split(',')).ToList();
        var origin = Array.IndexOf(rows[0], "vs_origin");
        Assert.Equal(rows.Count(r => r[origin] == "predicted"), predictions.Sum(p => p!["samples"]!.GetValue<int>()));
    }

    [Theory]
    [InlineData("metric", 80)]
    [InlineData("metric", 120)]
    [InlineData("field", 80)]
    [InlineData("field", 120)]
    public async Task The_summary_fits_the_terminal_and_no_heading_is_cut_off(string units, int width)
    {
        using var cli = new CliRunner { Width = width };
        cli.SmallWell("well.toml");
        await File.AppendAllTextAsync(cli.Folder.Of("well.toml"), $"[output]\nunits = \"{units}\"\n[[zones]]\nname = \"apricot shale\"\ntop = \"1000 m\"\ndepth_kind = \"md\"\n");
        var result = await cli.RunAsync("run", "well.toml");
        Assert.Equal(0, result.Code);
        Assert.DoesNotContain('\u2026', result.Output);
        var tables = result.Output.Split("\n\n")[1].Split('\n');
        Assert.All(tables, line => Assert.True(line.Length <= width, line));
        foreach (var title in new[] { "Sv", "Pp", "Shmin", "SHmax", "Sv/z", "Pp/z", "Shmin/z", "E dyn", "E stat", "nu stat", "biot" })
            Assert.Contains(tables, line => line.Split(' ', StringSplitOptions.RemoveEmptyEntries).Contains(title.Split(' ')[^1]));
    }

    [Fact]
    public async Task A_terminal_that_cannot_be_written_ends_with_2()
    {
        _cli.SmallWell("well.toml");
        using var error = new StringWriter();
        await using var full = new FullWriter();
        Assert.Equal(2, await Application.RunAsync(["run", "well.toml"], new Terminal(full, error, _cli.Folder.Path), CancellationToken.None));
        Assert.Equal("error: cannot write what the command prints (full)\n", error.ToString());
    }

    [Fact]
    public async Task Out_takes_the_results_elsewhere()
    {
        var name = _cli.SmallWell("w\u00e9ll 'x'.toml", "a b/\u00fcn\u00ef");
        var result = await _cli.RunAsync("run", name, "--out", "other place/r");
        Assert.Equal(0, result.Code);
        Assert.Contains("Results: other place/r", result.Output, StringComparison.Ordinal);
        Assert.Contains("depth.csv", _cli.Files("other place/r").Keys);
        Assert.Equal(["logs.csv", "w\u00e9ll 'x'.toml"], Directory.EnumerateFileSystemEntries(_cli.Folder.Of("a b/\u00fcn\u00ef")).Select(Path.GetFileName).Order(StringComparer.Ordinal));
    }

    [Theory]
    [InlineData("well.toml/sub")]
    [InlineData("well.toml")]
    public async Task A_folder_that_cannot_be_written_ends_with_2(string target)
    {
        _cli.SmallWell("well.toml");
        var result = await _cli.RunAsync("run", "well.toml", "--out", target);
        Assert.Equal((2, ""), (result.Code, result.Output));
        Assert.Contains(": error: found ", result.Error, StringComparison.Ordinal);
        Assert.Contains("expected a folder", result.Error, StringComparison.Ordinal);
        Assert.Equal(WellText.Sound, _cli.Folder.Read("well.toml"));
    }

    [Fact]
    public async Task A_folder_with_somebodys_work_is_left_alone()
    {
        _cli.SmallWell("well.toml");
        _cli.Folder.Write("mine/notes.txt", "mine");
        var result = await _cli.RunAsync("run", "well.toml", "--out", "mine");
        Assert.Equal(2, result.Code);
        Assert.Contains("found \"notes.txt\"", result.Error, StringComparison.Ordinal);
        Assert.Equal(["notes.txt"], _cli.Files("mine").Keys);
    }

    [Fact]
    public async Task Strict_turns_warnings_into_2_and_writes_nothing()
    {
        _cli.SmallWell("well.toml"); // its Shmin lies below the frictional limit: a warning
        var strict = await _cli.RunAsync("run", "well.toml", "--strict");
        Assert.Equal(2, strict.Code);
        Assert.EndsWith("well.toml: error: found 1 warning, expected none with --strict; nothing was written\n", strict.Error, StringComparison.Ordinal);
        Assert.False(Directory.Exists(_cli.Folder.Of("well-results")));
        Assert.DoesNotContain("Results:", strict.Output, StringComparison.Ordinal);
        Assert.Equal(2, (await _cli.RunAsync("check", "well.toml", "--strict")).Code);
        Assert.Equal(0, (await _cli.RunAsync("check", "well.toml")).Code);

        // Tectonic strain lifts Shmin above the limit: no warning is left.
        await File.AppendAllTextAsync(_cli.Folder.Of("well.toml"), "[horizontal_stress]\nstrain_along_shmin = \"300 microstrain\"\nstrain_along_shmax = \"400 microstrain\"\n");
        var calm = await _cli.RunAsync("run", "well.toml", "--strict");
        Assert.Equal((0, ""), (calm.Code, calm.Error));
        Assert.True(Directory.Exists(_cli.Folder.Of("well-results")));
    }

    [Fact]
    public async Task Check_writes_nothing()
    {
        _cli.SmallWell("well.toml");
        var result = await _cli.RunAsync("check", "well.toml");
        Assert.Equal((0, ""), (result.Code, result.Error));
        Assert.Equal(["logs.csv", "well.toml"], _cli.Files(".").Keys);
        Assert.Empty(Directory.EnumerateDirectories(_cli.Folder.Path));
        Assert.Contains("compressional  DTC     us/ft", result.Output, StringComparison.Ordinal);
        Assert.Contains("no curve for: fast_shear, slow_shear, stoneley, caliper, bit_size,", result.Output, StringComparison.Ordinal);
    }

    [Fact]
    public async Task A_broken_well_stops_no_other()
    {
        string[] wells = [_cli.SmallWell("a.toml", "one"), _cli.SmallWell("b.toml", "two"), _cli.SmallWell("c.toml", "three")];
        _cli.Folder.Write(wells[1], WellText.With("\"30 m\"", "30"));
        var result = await _cli.RunAsync(["run", .. wells, "--jobs", "2"]);
        Assert.Equal(2, result.Code);
        Assert.Equal(
            "two/b.toml:\nb.toml(4,19): error: found the bare number 30, expected datum_elevation = a quantity in quotes with a unit (m, ft, in, mm, cm)\n",
            result.Error);
        Assert.True(File.Exists(_cli.Folder.Of("one/a-results/depth.csv")));
        Assert.False(Directory.Exists(_cli.Folder.Of("two/b-results")));
        Assert.True(File.Exists(_cli.Folder.Of("three/c-results/depth.csv")));
        Assert.True(result.Output.IndexOf("a-results", StringComparison.Ordinal) < result.Output.IndexOf("c-results", StringComparison.Ordinal), "summaries in the order asked");
    }

    [Fact]
    public async Task The_record_names_inputs_by_hash_and_holds_no_path()
    {
        _cli.SmallWell("well.toml");
        await _cli.RunAsync("run", "well.toml");
        var text = _cli.Folder.Read("well-results/run.json");
        var inputs = JsonNode.Parse(text)!["inputs"]!.AsArray();
        Assert.Equal(["well.toml", "logs.csv"], inputs.Select(i => i!["file"]!.GetValue<string>()));
        foreach (var input in inputs)
        {
            var bytes = File.ReadAllBytes(_cli.Folder.Of(input!["file"]!.GetValue<string>()));
            Assert.Equal(Convert.ToHexStringLower(System.Security.Cryptography.SHA256.HashData(bytes)), input["sha256"]!.GetValue<string>());
        }

        Assert.DoesNotContain(_cli.Folder.Path, text, StringComparison.Ordinal);
        Assert.DoesNotContain(Environment.MachineName, text, StringComparison.Ordinal);
    }

    private sealed class FullWriter : StringWriter
    {
        public override void WriteLine(string? value) => throw new IOException("full");
    }
}
