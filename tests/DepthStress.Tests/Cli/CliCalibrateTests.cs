using System.Text;

namespace DepthStress.Tests.Cli;

/// <summary>The story of a calibration as a user tells it, on the sample well, and what goes wrong on the way.</summary>
public sealed class CliCalibrateTests : IDisposable
{
    private const string Well = "quillback-4.toml";
    private readonly CliRunner _cli = new();

    public CliCalibrateTests()
    {
        foreach (var file in Directory.GetFiles(Path.Combine(Golden.RepoRoot, "sample-logs"))) File.Copy(file, _cli.Folder.Of(Path.GetFileName(file)));
    }

    public void Dispose() => _cli.Dispose();

    [Fact]
    public async Task Run_calibrate_apply_run()
    {
        var before = _cli.Folder.Read(Well);
        Assert.Matches(@"misses \d\d by more than 3 standard deviations\.", (await _cli.RunAsync("run", Well)).Output);

        var seen = await _cli.RunAsync("calibrate", Well);
        Assert.Equal(0, seen.Code);
        Assert.Equal(before, _cli.Folder.Read(Well));
        Assert.Equal(["calibration.json", "calibration.svg", "observations.csv", "README.txt"], _cli.Files("quillback-4-calibration").Keys.Where(f => f[0] != '.').Order(StringComparer.OrdinalIgnoreCase));

        var applied = await _cli.RunAsync("calibrate", "--apply", Well);
        Assert.Equal(0, applied.Code);
        var (old, changed) = (before.Split('\n'), _cli.Folder.Read(Well).Split('\n'));
        Assert.Equal(old.Length, changed.Length);
        var lines = Enumerable.Range(0, old.Length).Where(i => old[i] != changed[i]).ToList();
        Assert.Equal(2, lines.Count);
        Assert.All(lines, i => Assert.StartsWith("strain_along_sh", changed[i], StringComparison.Ordinal));
        Assert.All(lines, i => Assert.Equal(old[i][(old[i].LastIndexOf('"') + 1)..], changed[i][(changed[i].LastIndexOf('"') + 1)..])); // comments stay

        Assert.Contains("misses 0 by more than 3 standard deviations.", (await _cli.RunAsync("run", Well)).Output, StringComparison.Ordinal);
        Assert.Contains($"Applied: {Well} holds these estimates already.", (await _cli.RunAsync("calibrate", "--apply", Well)).Output, StringComparison.Ordinal);
    }

    [Fact]
    public async Task The_same_input_gives_the_same_bytes()
    {
        await _cli.RunAsync("calibrate", Well);
        await _cli.RunAsync("calibrate", Well, "--out", "again");
        Assert.Equal(_cli.Files("quillback-4-calibration"), _cli.Files("again"));
    }

    [Fact]
    public async Task Strains_that_are_not_separated_are_not_applied_until_the_user_says_what_is_kept()
    {
        var rows = File.ReadAllLines(_cli.Folder.Of("quillback-4-observations.csv"));
        _cli.Folder.Write("quillback-4-observations.csv", string.Join('\n', rows.Where((r, i) => i == 0 || r.Contains(",closure,", StringComparison.Ordinal))) + "\n");
        var before = _cli.Folder.Read(Well);
        var refused = await _cli.RunAsync("calibrate", "--apply", Well);
        Assert.Equal(2, refused.Code);
        Assert.Contains("the observations do not separate the two strains", refused.Output, StringComparison.Ordinal);
        Assert.Contains($"{Well}: error: found strains that the observations do not separate, expected [calibration] hold = ", refused.Error, StringComparison.Ordinal);
        Assert.Equal(before, _cli.Folder.Read(Well));

        _cli.Folder.Write(Well, before + "\n[calibration]\nhold = \"difference\"\n");
        var held = await _cli.RunAsync("calibrate", "--apply", Well);
        Assert.Equal(0, held.Code);
        Assert.Matches(@"difference +200\.0 +200\.0 +held", held.Output);
        Assert.Contains("Applied to quillback-4.toml", held.Output, StringComparison.Ordinal);
    }

    [Theory]
    [InlineData("free = [\"strain\"]", "found the unknown parameter \"strain\", expected some of strains, pressure_exponent, normal_trend, static_modulus_factor; did you mean \"strains\"?")]
    [InlineData("groups = [{ zones = [\"bracken\"] }]", "found the unknown zone \"bracken\", expected some of apricot shale, bracken sand, cinder marl, dapple shale, elm limestone, fern shale")]
    [InlineData("groups = [{ zones = [\"elm limestone\"] }, { zones = [\"elm limestone\"] }]", "found the zone \"elm limestone\" in two groups, expected it in one")]
    [InlineData("groups = [{ zones = [\"fern shale\"] }]", "found one observation that gives a value of a horizontal stress for fern shale, expected two at least: one of the strains is not determined; choose with [calibration] hold what is kept as it is: \"difference\", \"strain_along_shmin\" or \"strain_along_shmax\"")]
    public async Task A_choice_that_cannot_be_met_is_answered_with_what_can(string line, string message)
    {
        _cli.Folder.Write(Well, _cli.Folder.Read(Well) + $"\n[calibration]\n{line}\n");
        var result = await _cli.RunAsync("calibrate", Well);
        Assert.Equal(2, result.Code);
        Assert.Contains(result.Error.Split('\n'), l => l.Contains($": error: {message}", StringComparison.Ordinal));
        Assert.Equal("", result.Output);
        Assert.False(Directory.Exists(_cli.Folder.Of("quillback-4-calibration")));
    }

    [Fact]
    public async Task Groups_of_zones_have_strains_of_their_own_and_are_written_into_their_zones()
    {
        _cli.Folder.Write(Well, _cli.Folder.Read(Well) + "\n[calibration]\nhold = \"difference\"\ngroups = [{ zones = [\"bracken sand\", \"cinder marl\"] }, { zones = [\"elm limestone\"] }]\n");
        var result = await _cli.RunAsync("calibrate", "--apply", Well);
        Assert.Equal(0, result.Code);
        Assert.Contains("along Shmin (bracken sand, cinder marl)", result.Output, StringComparison.Ordinal);
        var text = _cli.Folder.Read(Well);
        Assert.Equal(3, text.Split("[zones.horizontal_stress]").Length - 1);
        Assert.Equal(0, (await _cli.RunAsync("run", Well)).Code);
    }

    [Fact]
    public async Task A_byte_order_mark_and_the_ends_of_lines_stay()
    {
        var text = _cli.Folder.Read(Well).Replace("\n", "\r\n", StringComparison.Ordinal);
        File.WriteAllBytes(_cli.Folder.Of(Well), [.. Encoding.UTF8.Preamble, .. Encoding.UTF8.GetBytes(text)]);
        Assert.Equal(0, (await _cli.RunAsync("calibrate", "--apply", Well)).Code);
        var bytes = File.ReadAllBytes(_cli.Folder.Of(Well));
        Assert.True(bytes.AsSpan(0, 3).SequenceEqual(Encoding.UTF8.Preamble));
        var after = Encoding.UTF8.GetString(bytes.AsSpan(3));
        Assert.Equal(after.Count(c => c == '\n'), after.Count(c => c == '\r'));
        Assert.NotEqual(text, after);
    }

    [Fact]
    public async Task The_spread_of_choices_is_shown_and_written()
    {
        var result = await _cli.RunAsync("run", "--spread", Well);
        Assert.Contains("Mean Shmin over every admissible choice for the rock, MPa (each combination in spread.csv):", result.Output, StringComparison.Ordinal);
        var lines = _cli.Folder.Read("quillback-4-results/spread.csv").TrimEnd('\n').Split('\n');
        Assert.Equal("zone,static_youngs,static_poisson,biot,chosen,shmin_mpa,shmin_change_mpa", lines[0]);
        Assert.Equal(6, lines.Count(l => l.Contains(",yes,", StringComparison.Ordinal))); // one chosen combination a zone
    }
}
