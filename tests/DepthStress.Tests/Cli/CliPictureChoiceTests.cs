using System.Xml.Linq;
using DepthStress.Report;
using DepthStress.Tests.WellFiles;

namespace DepthStress.Tests.Cli;

/// <summary>The tracks and scales of [output] in the drawn picture, and wrong ones.</summary>
public sealed class CliPictureChoiceTests : IDisposable
{
    private readonly CliRunner _cli = new();

    public void Dispose() => _cli.Dispose();

    private async Task<CliResult> RunAsync(string output)
    {
        _cli.Folder.Write("well.toml", WellText.Sound + "[output]\n" + output);
        _cli.Folder.Write("logs.csv", WellText.Logs);
        return await _cli.RunAsync("run", "well.toml");
    }

    private List<(string Text, double X)> Texts() =>
    [
        .. XDocument.Parse(_cli.Folder.Read("well-results/tracks.svg")).Descendants()
            .Where(e => e.Name.LocalName == "text")
            .Select(e => (string.Concat(e.Nodes().OfType<XText>().Select(t => t.Value)), X(e))),
    ];

    private static double X(XElement text)
    {
        var place = text.Attribute("transform")?.Value ?? $"translate({text.Attribute("x")?.Value ?? "0"},0)";
        return double.Parse(place.Split('(')[1].Split(',', ')')[0], System.Globalization.CultureInfo.InvariantCulture);
    }

    private async Task RefusesAsync(string output, params string[] messages)
    {
        var result = await RunAsync(output);
        Assert.Equal((2, ""), (result.Code, result.Output));
        Assert.Equal(messages.Select(m => $"well.toml{m}"), result.Error.Split('\n', StringSplitOptions.RemoveEmptyEntries));
        Assert.False(Directory.Exists(_cli.Folder.Of("well-results")));
    }

    [Fact]
    public async Task The_chosen_tracks_are_drawn_in_their_order()
    {
        Assert.Equal(0, (await RunAsync("tracks = [\"stress\", \"density\", \"youngs\"]\n")).Code);
        var texts = Texts();
        double At(string title) => Assert.Single(texts, t => t.Text == title).X;
        Assert.True(At("Pressure and total stress") < At("Density, neutron"));
        Assert.True(At("Density, neutron") < At("Young's modulus"));
        Assert.DoesNotContain(texts, t => t.Text is "Slowness" or "Gamma ray, shale volume" or "Equivalent mud density");
    }

    [Fact]
    public async Task An_unknown_track_is_answered_with_the_nearest() => await RefusesAsync(
        "tracks = [\"stres\", \"density\"]\n",
        $"(28,10): error: found the unknown track \"stres\", expected some of {string.Join(", ", TrackTable.All.Select(t => t.Id))}; did you mean \"stress\"?");

    [Fact]
    public async Task An_unknown_curve_is_answered_with_the_nearest()
    {
        var names = TrackTable.All.SelectMany(t => t.Curves).Select(c => c.Column.Id).Distinct();
        await RefusesAsync(
            "[[output.scales]]\ncurve = \"gamma_rey\"\nleft = \"0 gAPI\"\nright = \"200 gAPI\"\n",
            $"(29,9): error: found the unknown curve \"gamma_rey\", expected one of {string.Join(", ", names)}; did you mean \"gamma_ray\"?");
    }

    [Theory]
    [InlineData("left = \"5 gAPI\"\nright = \"5 gAPI\"\n", "(28,3): error: [[output.scales]]: found the same value left and right, expected two values")]
    [InlineData("left = \"5 m\"\nright = \"50 gAPI\"\n", "(30,8): error: [[output.scales]]: found \"5 m\", a length; expected a gamma-ray value in one of gAPI")]
    [InlineData("left = \"5 gAPI\"\n", "(28,3): error: [[output.scales]]: expected curve, left and right")]
    public async Task Scales_that_cannot_be_drawn_are_refused(string ends, string message) =>
        await RefusesAsync("[[output.scales]]\ncurve = \"gamma_ray\"\n" + ends, message);

    [Fact]
    public async Task A_second_scale_for_a_curve_is_refused() => await RefusesAsync(
        "[[output.scales]]\ncurve = \"gamma_ray\"\nleft = \"0 gAPI\"\nright = \"50 gAPI\"\n[[output.scales]]\ncurve = \"gamma_ray\"\nleft = \"0 gAPI\"\nright = \"70 gAPI\"\n",
        "(32,3): error: [[output.scales]]: found a second scale for \"gamma_ray\", expected one");

    // Gamma ray runs from 60 to 64 gAPI: on a scale to 61.5 three of five samples are off it.
    [Fact]
    public async Task A_scale_is_drawn_and_the_marks_follow_it()
    {
        Assert.Equal(0, (await RunAsync("tracks = [\"gamma_ray\"]\n")).Code);
        Assert.DoesNotContain(Texts(), t => t.Text.Contains("off scale", StringComparison.Ordinal));
        Assert.Equal(0, (await RunAsync("tracks = [\"gamma_ray\"]\n[[output.scales]]\ncurve = \"gamma_ray\"\nleft = \"20 gAPI\"\nright = \"61.5 gAPI\"\n")).Code);
        var texts = Texts();
        Assert.Contains(texts, t => t.Text == "3 off scale");
        Assert.Contains(texts, t => t.Text == "20");
        Assert.Contains(texts, t => t.Text == "61.5");
        Assert.DoesNotContain(texts, t => t.Text == "150");
    }

    // 20 MPa is 2901 psi: a scale may be written in any unit of pressure, and is drawn in the unit of the results.
    [Fact]
    public async Task A_scale_in_field_units_is_drawn_in_psi()
    {
        const string Scale = "tracks = [\"stress\"]\n[[output.scales]]\ncurve = \"sv\"\nleft = \"1000 psi\"\nright = \"3000 psi\"\n";
        Assert.Equal(0, (await RunAsync("units = \"field\"\n" + Scale)).Code);
        var texts = Texts();
        Assert.Contains(texts, t => t.Text == "1000");
        Assert.Contains(texts, t => t.Text == "3000");
        Assert.DoesNotContain(texts, t => t.Text.Contains("off scale", StringComparison.Ordinal)); // Sv is 2830 psi
        Assert.Equal(0, (await RunAsync("units = \"metric\"\n" + Scale.Replace("3000 psi", "15 MPa", StringComparison.Ordinal).Replace("1000 psi", "0 MPa", StringComparison.Ordinal))).Code);
        Assert.Contains(Texts(), t => t.Text == "5 off scale"); // and 19.5 MPa
    }

    [Fact]
    public async Task A_fraction_needs_no_unit_and_may_grow_to_the_left()
    {
        Assert.Equal(0, (await RunAsync("tracks = [\"poisson\"]\n[[output.scales]]\ncurve = \"biot\"\nleft = \"0.9\"\nright = \"0.3\"\n")).Code);
        var texts = Texts();
        Assert.True(texts.Single(t => t.Text == "0.9").X < texts.Single(t => t.Text == "0.3").X);
    }
}
