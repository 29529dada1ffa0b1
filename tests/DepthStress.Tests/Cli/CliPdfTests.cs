using DepthStress.Tests.WellFiles;
using UglyToad.PdfPig;

namespace DepthStress.Tests.Cli;

/// <summary>The PDF of the pictures, which the well file asks for.</summary>
public sealed class CliPdfTests : IDisposable
{
    private readonly CliRunner _cli = new();

    public void Dispose() => _cli.Dispose();

    private async Task<CliResult> RunAsync(string output)
    {
        _cli.Folder.Write("well.toml", $"{WellText.Sound}[output]\n{output}");
        _cli.Folder.Write("logs.csv", WellText.Logs);
        return await _cli.RunAsync("run", "well.toml");
    }

    [Fact]
    public async Task Where_the_well_file_asks_for_it_every_picture_is_a_page()
    {
        Assert.Equal(0, (await RunAsync("pdf = true\n")).Code);
        using var document = PdfDocument.Open(_cli.Folder.Of("well-results/pictures.pdf"));
        string[] pages = [.. document.GetPages().Select(p => p.Text)];
        string[] subjects = ["depth tracks", "stress over depth", "over the profile", "stress polygons"];
        Assert.Equal(subjects.Length, pages.Length);
        for (var k = 0; k < subjects.Length; k++)
        {
            Assert.Contains(subjects[k], pages[k], StringComparison.Ordinal);
            Assert.Contains("licensed engineer", pages[k], StringComparison.Ordinal);
        }
    }

    [Theory]
    [InlineData("")]
    [InlineData("pdf = false\n")]
    public async Task Otherwise_there_is_none(string output)
    {
        Assert.Equal(0, (await RunAsync(output)).Code);
        Assert.Contains("tracks.svg", _cli.Files("well-results").Keys);
        Assert.DoesNotContain("pictures.pdf", _cli.Files("well-results").Keys);
    }

    [Fact]
    public async Task Any_other_value_is_an_error_with_its_place()
    {
        var result = await RunAsync("pdf = \"A4\"\n");
        Assert.Equal((2, ""), (result.Code, result.Output));
        Assert.Equal("well.toml(28,7): error: found the text \"A4\", expected pdf = true or false\n", result.Error);
    }

    [Fact]
    public async Task A_calibration_has_its_own()
    {
        foreach (var file in Directory.GetFiles(Path.Combine(Golden.RepoRoot, "sample-logs"))) File.Copy(file, _cli.Folder.Of(Path.GetFileName(file)));
        File.AppendAllText(_cli.Folder.Of("quillback-4.toml"), "\n[output]\npdf = true\n");
        Assert.Equal(0, (await _cli.RunAsync("calibrate", "quillback-4.toml")).Code);
        using var document = PdfDocument.Open(_cli.Folder.Of("quillback-4-calibration/calibration.pdf"));
        Assert.Contains("calibration on observations", Assert.Single(document.GetPages()).Text, StringComparison.Ordinal);
    }
}
