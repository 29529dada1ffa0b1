using DepthStress.Tests.WellFiles;

namespace DepthStress.Tests.Cli;

/// <summary>The depths of the stress polygons, from the well file to the picture.</summary>
public sealed class CliPolygonTests : IDisposable
{
    private readonly CliRunner _cli = new();

    public void Dispose() => _cli.Dispose();

    private async Task<CliResult> RunAsync(string output)
    {
        _cli.Folder.Write("well.toml", $"{WellText.Sound}[output]\n{output}");
        _cli.Folder.Write("logs.csv", WellText.Logs);
        return await _cli.RunAsync("run", "well.toml");
    }

    private string Picture => _cli.Folder.Read("well-results/polygon.svg");

    [Fact]
    public async Task Depths_are_those_of_the_well_file()
    {
        var result = await RunAsync("polygon_depths = [\"1000.5 m\", \"1001.4 m\"]\npolygon_depth_kind = \"md\"\n");
        Assert.Equal((0, ""), (result.Code, result.Error));
        Assert.Contains("1000.5 m md, 1000.5 m tvd below rotary table", Picture, StringComparison.Ordinal);
        Assert.Contains("1001.5 m md", Picture, StringComparison.Ordinal);
        Assert.Contains("Depths as the well file names them", Picture, StringComparison.Ordinal);
        Assert.Contains("licensed engineer", Picture, StringComparison.Ordinal);
    }

    [Fact]
    public async Task Without_depths_the_picture_says_which_it_chose()
    {
        Assert.Equal(0, (await RunAsync("units = \"field\"\n")).Code);
        Assert.Contains("Depth: the middle of the profile", Picture, StringComparison.Ordinal);
        Assert.Contains("Shmin, psi", Picture, StringComparison.Ordinal);
        Assert.Contains("SHmax unknown", Picture, StringComparison.Ordinal);
    }

    [Fact]
    public async Task A_depth_outside_the_logs_is_warned_of_and_left_out()
    {
        var result = await RunAsync("polygon_depths = [\"1001 m\", \"2000 m\"]\npolygon_depth_kind = \"tvd\"\n");
        Assert.Equal(0, result.Code);
        Assert.Equal("well.toml(28,18): warning: [output] polygon_depths: found 2000.0 m, expected a depth within the logs; it is left out\n", result.Error);
    }

    [Theory]
    [InlineData("polygon_depths = [\"1001 m\"]\n", "[output] polygon_depth_kind is not set; expected \"md\", \"tvd\" or \"tvdss\"")]
    [InlineData("polygon_depth_kind = \"md\"\n", "[output] polygon_depth_kind is set without polygon_depths, expected both or neither")]
    [InlineData("polygon_depths = []\npolygon_depth_kind = \"md\"\n", "[output] polygon_depths: found 0 depths, expected 1 to 6")]
    [InlineData("polygon_depths = \"1001 psi\"\npolygon_depth_kind = \"md\"\n", "[output] polygon_depths: found \"1001 psi\", a pressure; expected a length in one of m, ft, in, mm, cm")]
    public async Task A_wrong_choice_is_an_error_with_its_place(string output, string message)
    {
        var result = await RunAsync(output);
        Assert.Equal((2, ""), (result.Code, result.Output));
        Assert.Matches(@"^well\.toml\(28,\d+\): error: ", result.Error);
        Assert.Contains(message, result.Error, StringComparison.Ordinal);
    }
}
