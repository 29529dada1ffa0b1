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
}
