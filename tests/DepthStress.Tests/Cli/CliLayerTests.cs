using System.Text.Json.Nodes;
using DepthStress.Files.Writing;
using DepthStress.Tests.WellFiles;
using DepthStress.Tests.Writing;

namespace DepthStress.Tests.Cli;

/// <summary>Layers from the command line: refused cuts write nothing, written ones fit the schema.</summary>
public sealed class CliLayerTests : IDisposable
{
    private readonly CliRunner _cli = new();

    public void Dispose() => _cli.Dispose();

    private async Task<CliResult> RunAsync(string layers)
    {
        _cli.SmallWell("well.toml");
        _cli.Folder.Write("well.toml", WellText.Sound + "[layers]\n" + layers);
        return await _cli.RunAsync("run", "well.toml");
    }

    [Theory]
    [InlineData("cut = \"equal thickness\"\ncount = 9\n", "found count = 9, expected at most 5: that is what the samples allow")]
    [InlineData("boundaries = \"3000 m\"\ndepth_kind = \"md\"\n", "found the boundary 3000.0 m, expected depths that the samples of a layer lie on both sides of")]
    [InlineData("nx = 1.5\n", "found a fraction, expected nx = a whole number")]
    [InlineData("extent = \"0 m\"\n", "extent")]
    public async Task Layers_that_cannot_be_cut_leave_the_earlier_results_whole(string layers, string message)
    {
        Assert.Equal(0, (await RunAsync("max_thickness = \"1 m\"\n")).Code);
        var before = _cli.Files("well-results");
        var result = await RunAsync(layers);
        Assert.Equal((2, ""), (result.Code, result.Output));
        Assert.Contains(message, result.Error, StringComparison.Ordinal);
        Assert.Equal(before, _cli.Files("well-results"));
    }

    [Fact]
    public async Task What_is_found_about_the_cut_is_printed_and_recorded()
    {
        var result = await RunAsync("cut = \"change of properties\"\n");
        Assert.Equal(0, result.Code);
        const string Note = "note: [layers]: 1 layers, cut where youngs_static, poisson_static, shmin change";
        Assert.Contains(Note, result.Output, StringComparison.Ordinal);
        Assert.Contains(Note, _cli.Folder.Read("well-results/run.json"), StringComparison.Ordinal);
        Assert.Equal("change of properties", JsonNode.Parse(_cli.Folder.Read("well-results/run.json"))!["setup"]!["layers"]!["cut"]!["value"]!.GetValue<string>());
    }

    [Theory]
    [InlineData("metric")]
    [InlineData("field")]
    public async Task Written_layers_fit_the_schema_that_is_printed(string units)
    {
        Assert.Equal(0, (await RunAsync($"max_thickness = \"1 m\"\n[output]\nunits = \"{units}\"\n")).Code);
        var printed = await _cli.RunAsync("schema", "--layers");
        Assert.Equal((0, LayersSchema.Json() + "\n"), (printed.Code, printed.Output));
        Assert.Empty(SchemaFit.Problems(JsonNode.Parse(printed.Output)!, JsonNode.Parse(_cli.Folder.Read("well-results/layers.json"))));
    }

    [Fact]
    public async Task The_deck_asked_for_is_written_and_its_column_is_in_balance()
    {
        Assert.Equal(0, (await RunAsync("deck = \"layered\"\nnx = 2\nextent = \"1000 m\"\n")).Code);
        var deck = _cli.Folder.Read("well-results/column.inp");
        Assert.Contains("*ELASTIC, TYPE=ENGINEERING CONSTANTS", deck, StringComparison.Ordinal);
        Assert.Contains("\n2, 500, 0, ", deck, StringComparison.Ordinal);
        var block = Assert.Single(JsonNode.Parse(_cli.Folder.Read("well-results/run.json"))!["column_check"]!.AsArray())!;
        Assert.InRange(block["equilibrium_residual"]!.GetValue<double>(), 0, 1e-9); // written with nine decimals
        Assert.InRange(block["vertical_stress_error"]!.GetValue<double>(), 0, 1e-9);
    }

    [Fact]
    public async Task Without_rock_that_a_solver_can_take_no_deck_is_written_and_the_run_says_so()
    {
        _cli.SmallWell("well.toml");
        string[] slownesses = [",160,", ",161,", ",162,", ",163,"];
        _cli.Folder.Write("logs.csv", slownesses.Aggregate(WellText.Logs, (logs, shear) => logs.Replace(shear, ",,", StringComparison.Ordinal)));
        var result = await _cli.RunAsync("run", "well.toml");
        Assert.Equal(0, result.Code);
        Assert.Contains("column.inp and column-balanced.inp are not written", result.Output, StringComparison.Ordinal);
        Assert.DoesNotContain("column.inp", _cli.Files("well-results").Keys);
        Assert.Contains("layers.vtu", _cli.Files("well-results").Keys);
        Assert.Null(JsonNode.Parse(_cli.Folder.Read("well-results/run.json"))!["column_check"]);
    }
}
