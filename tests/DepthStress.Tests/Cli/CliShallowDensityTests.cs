using System.Text.Json.Nodes;
using DepthStress.Tests.WellFiles;

namespace DepthStress.Tests.Cli;

/// <summary>Density above the log and pore pressure by a trend, from the well file to the results.</summary>
public sealed class CliShallowDensityTests : IDisposable
{
    private const string Above = "above_log = \"2.0 g/cm3\"";
    private readonly CliRunner _cli = new();

    public void Dispose() => _cli.Dispose();

    private async Task<CliResult> RunAsync(string well, string? logs = null)
    {
        _cli.Folder.Write("well.toml", well);
        _cli.Folder.Write("logs.csv", logs ?? WellText.Logs);
        return await _cli.RunAsync("run", "well.toml");
    }

    private JsonNode Record() => JsonNode.Parse(_cli.Folder.Read("well-results/run.json"))!;

    private JsonNode? Method(string key) => Record()["methods"]!.AsArray().SingleOrDefault(m => m!["key"]!.GetValue<string>() == key);

    private double[] Column(string name)
    {
        var rows = _cli.Folder.Read("well-results/depth.csv").Split('\n', StringSplitOptions.RemoveEmptyEntries).Select(r => r.Split(',')).ToList();
        var at = Array.IndexOf(rows[0], name);
        return [.. rows.Skip(1).Select(r => double.Parse(r[at], System.Globalization.CultureInfo.InvariantCulture))];
    }

    [Fact]
    public async Task An_exponential_that_cannot_meet_the_log_ends_with_2_and_says_where()
    {
        var result = await RunAsync(WellText.With(
            Above, "above_log = { method = \"exponential\", surface_density = \"2.5 g/cm3\", matrix_density = \"2.7 g/cm3\" }"));
        Assert.Equal((2, ""), (result.Code, result.Output));
        Assert.Equal(
            "well.toml(22,13): error: the exponential above the log cannot meet the first logged density of 2.410 g/cm3: it runs from 2.500 g/cm3 to 2.700 g/cm3; change surface_density or matrix_density in [overburden] above_log\n",
            result.Error);
        Assert.False(Directory.Exists(_cli.Folder.Of("well-results")));
    }

    // The log starts at 1000 m below a datum 5 m above the ground: 995 m of sediment. Values to the printed decimals.
    [Fact]
    public async Task A_method_above_the_log_is_recorded_with_its_source()
    {
        var result = await RunAsync(WellText.With(Above, "above_log = \"traugott-1997\""));
        Assert.Equal((0, ""), (result.Code, result.Error));
        var mean = (16.3 + Math.Pow(995 / 0.3048 / 3125, 0.6)) * 119.82642731689663;
        Assert.Equal(mean * 9.80665 * 995 / 1e6, Column("sv_mpa")[0], 5.1e-5);
        Assert.Contains("rests on the mean density of traugott-1997 above the log", result.Output, StringComparison.Ordinal);
        var method = Method("[overburden] above_log")!;
        Assert.Equal("traugott-1997", method["method"]!.GetValue<string>());
        Assert.Contains("Traugott 1997", method["source"]!.GetValue<string>(), StringComparison.Ordinal);
        Assert.Equal("coefficients read in the source", method["standing"]!.GetValue<string>());
    }

    [Theory]
    [InlineData("\"2.0 g/cm3\"", "an assumed mean density of 2.000 g/cm3 above the log")]
    [InlineData("\"miller-gulf\"", "the density of miller-gulf above the log")]
    [InlineData("[{ depth = \"0 m\", density = \"1.9 g/cm3\" }]", "the densities given in [overburden] above_log above the log")]
    [InlineData(
        "{ method = \"exponential\", surface_density = \"1.9 g/cm3\", matrix_density = \"2.7 g/cm3\" }",
        "an exponential from 1.900 g/cm3 at the ground or mudline to the first logged density above the log")]
    public async Task Every_kind_runs_and_says_what_Sv_rests_on(string value, string words)
    {
        var result = await RunAsync(WellText.With(Above, $"above_log = {value}"));
        Assert.Equal((0, ""), (result.Code, result.Error));
        Assert.Contains($"at 1000.0 m true vertical depth rests on {words}", result.Output, StringComparison.Ordinal);
        Assert.Equal(1, Column("sv_unlogged_share")[0]);
        Assert.NotNull(Record()["setup"]!["overburden"]!["above_log"]);
        Assert.Equal(value.Contains("miller", StringComparison.Ordinal), Method("[overburden] above_log") is not null);
    }

    // DTC 90 us/ft at the first sample, on a trend of 75 us/ft everywhere: by hand from the printed Sv and the water column.
    [Fact]
    public async Task A_trend_gives_the_pore_pressure_and_the_record_names_it()
    {
        var result = await RunAsync(WellText.With(
            "method = \"hydrostatic\"\nfluid_density = \"1.03 g/cm3\"\n",
            "method = \"eaton-1975-sonic\"\nfluid_density = \"1.03 g/cm3\"\nexponent = 2\ntrend = [{ depth = \"0 m\", slowness = \"75 us/ft\" }, { depth = \"3 km\", slowness = \"75 us/ft\" }]\n".Replace("3 km", "3000 m", StringComparison.Ordinal)));
        Assert.Equal((0, ""), (result.Code, result.Error));
        var (sv, normal) = (Column("sv_mpa")[0], 1030 * 9.80665 * (1000 - 15) / 1e6); // water table 10 m below a ground 5 m below the datum
        Assert.Equal(sv - ((sv - normal) * Math.Pow(75 / 90.0, 2)), Column("pp_mpa")[0], 1e-4);
        var method = Method("[pore_pressure] method")!;
        Assert.Equal("eaton-1975-sonic", method["method"]!.GetValue<string>());
        Assert.Contains("Eaton 1975", method["source"]!.GetValue<string>(), StringComparison.Ordinal);
        Assert.Contains("2", method["formula"]!.GetValue<string>(), StringComparison.Ordinal);
        var setup = Record()["setup"]!["pore_pressure"]!.ToJsonString();
        Assert.Contains("trend", setup, StringComparison.Ordinal);
        Assert.Contains("exponent", setup, StringComparison.Ordinal);
    }

    // A rule chooses laws inside zones; the record says where each law served.
    [Fact]
    public async Task Rules_choose_laws_inside_zones_and_the_record_says_where()
    {
        const string Rules = """
            [shale]
            volume = "linear-gamma-ray"
            clean = "60 gAPI"
            shale = "64 gAPI"

            [[zones]]
            name = "upper"
            top = "1000 m"
            depth_kind = "md"

            [[zones]]
            name = "lower"
            top = "1001 m"
            depth_kind = "md"
            target = true
            [zones.moduli]
            static_youngs = "lacy-1997-sandstone"

            [[lithology]]
            name = "shaly"
            shale_volume_min = 0.7
            [lithology.moduli]
            static_youngs = "lacy-1997-shale"
            """;
        var result = await RunAsync(WellText.Sound + Rules);
        Assert.Equal((0, ""), (result.Code, result.Error));
        var rows = _cli.Folder.Read("well-results/depth.csv").Split('\n', StringSplitOptions.RemoveEmptyEntries).Select(r => r.Split(',')).ToList();
        var at = Array.IndexOf(rows[0], "lithology");
        Assert.Equal(["", "", "", "shaly", "shaly"], rows.Skip(1).Select(r => r[at]));
        var young = Record()["methods"]!.AsArray().Where(m => m!["key"]!.GetValue<string>() == "[moduli] static_youngs").ToDictionary(
            m => m!["method"]!.GetValue<string>(),
            m => string.Join("; ", m!["where"]!.AsArray().Select(w => $"{w!["zone"]}/{w["lithology"]}: {w["samples"]}")));
        Assert.Equal(3, young.Count);
        Assert.Equal("upper/: 2", young["lacy-1997-combined"]);
        Assert.Equal("lower/: 1", young["lacy-1997-sandstone"]);
        Assert.Equal("lower/shaly: 2", young["lacy-1997-shale"]);
        Assert.Contains("Target lower, mean Shmin ", result.Output, StringComparison.Ordinal);
    }

    [Fact]
    public async Task Zones_that_overlap_are_refused_and_a_target_beyond_the_log_says_so()
    {
        const string Overlap = "[[zones]]\nname = \"a\"\ntop = \"900 m\"\nbase = \"1002 m\"\ndepth_kind = \"md\"\n[[zones]]\nname = \"b\"\ntop = \"1001 m\"\ndepth_kind = \"md\"\n";
        var result = await RunAsync(WellText.Sound + Overlap);
        Assert.Equal(2, result.Code);
        Assert.Equal("well.toml(32,3): error: zone \"b\" starts at 1001.0 m measured depth, inside zone \"a\" that ends at 1002.0 m\n", result.Error);

        result = await RunAsync(WellText.Sound + "[[zones]]\nname = \"a\"\ntop = \"900 m\"\ndepth_kind = \"md\"\n[[zones]]\nname = \"deep\"\ntop = \"2000 m\"\ndepth_kind = \"md\"\ntarget = true\n");
        Assert.Equal((0, ""), (result.Code, result.Error));
        Assert.Contains("Target deep: no Shmin inside it, so nothing can be said about barriers.\n", result.Output, StringComparison.Ordinal);
    }

    // Density 2.40 g/cm3 lies far beyond the porosities the law can have there: every sample, and it is said once.
    [Fact]
    public async Task A_law_without_meaning_at_every_sample_is_said_to_be_so()
    {
        var result = await RunAsync(WellText.Sound + "[porosity]\nporosity = \"density-porosity\"\nmatrix_density = \"2.10 g/cm3\"\nfluid_density = \"1.03 g/cm3\"\n");
        Assert.Equal(0, result.Code);
        Assert.Contains("[porosity] porosity: density-porosity gives no result at any sample, it has no meaning for their values; 5 samples (100.0 %)", result.Output, StringComparison.Ordinal);
    }
}
