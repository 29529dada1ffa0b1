using System.Globalization;
using System.Xml.Linq;
using SampleWell.Twins;

namespace DepthStress.Tests.Cli;

/// <summary><c>depthstress compare</c> on small wells of 400 samples.</summary>
public sealed class CliCompareTests : IDisposable
{
    private readonly CliRunner _cli = new();

    public void Dispose() => _cli.Dispose();

    [Fact]
    public async Task Two_runs_of_one_well_do_not_differ()
    {
        await Run("a");
        await Run("b");
        var result = await Compare();
        Assert.Equal((0, ""), (result.Code, result.Error));
        Assert.StartsWith("Nothing differs between a/twin-results and b/twin-results.\n", result.Output, StringComparison.Ordinal);
    }

    [Fact]
    public async Task A_changed_setting_shows_with_what_it_did_to_stress()
    {
        await Run("a");
        await Run("b", Strain);
        var result = await Compare("--out", "c.svg");
        Assert.Equal((0, ""), (result.Code, result.Error));
        Assert.Matches(@"\nSetup:\n    horizontal_stress\.strain_along_shmin: \S+ microstrain -> 250 microstrain\n\n", result.Output);
        Assert.Matches(@"\nInputs:\n    twin\.toml: sha256 [0-9a-f]{12} -> sha256 [0-9a-f]{12}\n\n", result.Output);
        var (zones, before, after) = ("Mean stress by zone:", Shmin("a"), Shmin("b"));
        Assert.Contains(zones, result.Output, StringComparison.Ordinal);
        Assert.DoesNotContain("\n Sv", result.Output, StringComparison.Ordinal);
        var known = before.Zip(after).Where(p => !double.IsNaN(p.First) && !double.IsNaN(p.Second)).Select(p => p.Second - p.First).ToList();
        var line = System.Text.RegularExpressions.Regex.Match(result.Output, @"  Shmin: mean change (?<mean>[-+][\d.]+) MPa, greatest (?<greatest>[-+][\d.]+) MPa at ");
        Assert.True(line.Success, result.Output);
        Assert.Equal(known.Average(), double.Parse(line.Groups["mean"].Value, CultureInfo.InvariantCulture), 0.00501); // half the last printed decimal
        Assert.Equal(known.MaxBy(Math.Abs), double.Parse(line.Groups["greatest"].Value, CultureInfo.InvariantCulture), 0.00501); // half the last printed decimal

        var texts = XDocument.Parse(_cli.Folder.Read("c.svg")).Descendants().Where(e => e.Name.LocalName == "text").Select(e => e.Value).ToList();
        foreach (var expected in new[] { "first: a/twin-results", "second: b/twin-results", "Second less first, MPa", "Total stress and pore pressure, MPa", "Shmin, least horizontal stress" })
            Assert.Contains(expected, texts);
        Assert.Contains(texts, t => t.StartsWith("True vertical depth below ", StringComparison.Ordinal) && t.EndsWith(", m", StringComparison.Ordinal));
        var drawn = _cli.Folder.Read("c.svg");
        await Compare("--out", "c.svg");
        Assert.Equal(drawn, _cli.Folder.Read("c.svg"));
    }

    [Fact]
    public async Task The_other_way_round_changes_have_the_other_sign()
    {
        await Run("b");
        await Run("a", Strain);
        Assert.Contains("  Shmin: mean change -", (await Compare()).Output, StringComparison.Ordinal);
    }

    [Fact]
    public async Task Another_unit_system_is_no_change_of_stress()
    {
        await Run("a");
        await Run("b", t => t + "\n[output]\nunits = \"field\"\n");
        var result = await Compare();
        Assert.Equal((0, ""), (result.Code, result.Error));
        Assert.Contains("    output.units: metric -> field\n", result.Output, StringComparison.Ordinal);
        foreach (var absent in new[] { "Mean stress by zone", "Layers:", "Profile", "Findings", "Methods" }) Assert.DoesNotContain(absent, result.Output, StringComparison.Ordinal);
    }

    [Fact]
    public async Task Other_depths_are_compared_by_straight_lines()
    {
        await Run("a");
        await Run("b", samples: 501);
        var result = await Compare();
        Assert.Equal((0, ""), (result.Code, result.Error));
        Assert.Contains("note: the depths differ: 400 samples in the first, 501 in the second\n", result.Output, StringComparison.Ordinal);
        Assert.Contains("the second by straight lines between its depths, never across gaps", result.Output, StringComparison.Ordinal);
    }

    [Theory]
    [InlineData("folder not found", null, null)]
    [InlineData("found no run.json, expected a result folder of \"depthstress run\"", "run.json", null)]
    [InlineData("b/twin-results/depth.csv: error: file not found", "depth.csv", null)]
    [InlineData("b/twin-results/layers.csv: error: file not found", "layers.csv", null)]
    [InlineData("b/twin-results/run.json(1,1): error: found broken JSON, expected run.json as this program writes it", "run.json", "<run>")]
    [InlineData("found no record of a run of this program, expected \"program\": \"DepthStress\"", "run.json", "{\"program\": \"other\"}")]
    [InlineData("b/twin-results/run.json: error: found results of version \"0.0.1\", expected ", "run.json", "{\"program\": \"DepthStress\", \"version\": \"0.0.1\"}")]
    [InlineData("b/twin-results/depth.csv(1): error: found no column md_m, tvd_m, sv_mpa, pp_mpa, shmin_mpa, shmax_mpa, zone, expected a table as this program writes it", "depth.csv", "depth,value\n1,2\n")]
    [InlineData("b/twin-results/depth.csv(1): error: found an empty file, expected a result table", "depth.csv", "")]
    [InlineData("b/twin-results/depth.csv(2): error: column sv_mpa: found \"x\", expected a number or nothing", "depth.csv", "md_m,tvd_m,sv_mpa,pp_mpa,shmin_mpa,shmax_mpa,zone\n1,1,x,,,,z\n")]
    [InlineData("b/twin-results/depth.csv(2): error: found a row of 3 cells, expected 7 as in the header row", "depth.csv", "md_m,tvd_m,sv_mpa,pp_mpa,shmin_mpa,shmax_mpa,zone\n1,1,1\n")]
    public async Task What_is_no_result_is_refused(string expected, string? file, string? content)
    {
        await Run("a");
        if (file is not null) await Run("b");
        if (file is not null && content is not null) _cli.Folder.Write($"b/twin-results/{file}", content);
        else if (file is not null) File.Delete(_cli.Folder.Of($"b/twin-results/{file}"));
        var result = await Compare("--out", "c.svg");
        Assert.Equal((2, ""), (result.Code, result.Output));
        Assert.Contains(expected, result.Error, StringComparison.Ordinal);
        Assert.False(File.Exists(_cli.Folder.Of("c.svg")));
    }

    [Fact]
    public async Task A_picture_does_not_go_into_a_result_folder()
    {
        await Run("a");
        await Run("b");
        var before = _cli.Files("b/twin-results");
        var result = await Compare("--out", "b/twin-results/c.svg");
        Assert.Equal(2, result.Code);
        Assert.Contains("found --out inside a result folder", result.Error, StringComparison.Ordinal);
        Assert.Equal(before, _cli.Files("b/twin-results"));
    }

    private static string Strain(string text) =>
        System.Text.RegularExpressions.Regex.Replace(text, "(?m)^strain_along_shmin = .*$", "strain_along_shmin = \"250 microstrain\"");

    private Task<CliResult> Compare(params string[] more) => _cli.RunAsync(["compare", "a/twin-results", "b/twin-results", .. more]);

    private async Task Run(string folder, Func<string, string>? edit = null, int samples = 400)
    {
        Twin.Write(_cli.Folder.Of(folder), samples, 2);
        if (edit is not null) _cli.Folder.Write($"{folder}/twin.toml", edit(_cli.Folder.Read($"{folder}/twin.toml")));
        Assert.Equal(0, (await _cli.RunAsync("run", $"{folder}/twin.toml")).Code);
    }

    private double[] Shmin(string folder)
    {
        var rows = _cli.Folder.Read($"{folder}/twin-results/depth.csv").Split('\n', StringSplitOptions.RemoveEmptyEntries).Select(r => r.Split(',')).ToList();
        var at = Array.IndexOf(rows[0], "shmin_mpa");
        return [.. rows.Skip(1).Select(r => double.TryParse(r[at], CultureInfo.InvariantCulture, out var value) ? value : double.NaN)];
    }
}
