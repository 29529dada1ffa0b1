using System.Globalization;
using System.Text.Json.Nodes;
using DepthStress.Tests.WellFiles;

namespace DepthStress.Tests.Cli;

/// <summary>Comparison curves from the well file to the results.</summary>
public sealed class CliComparisonTests : IDisposable
{
    private readonly CliRunner _cli = new();

    public void Dispose() => _cli.Dispose();

    private async Task<CliResult> RunAsync(string compare, string logs = WellText.Logs, string head = "")
    {
        _cli.Folder.Write("well.toml", $"{head}{WellText.Sound}[horizontal_stress]\ncompare = {compare}\n");
        _cli.Folder.Write("logs.csv", logs);
        return await _cli.RunAsync("run", "well.toml");
    }

    private string[][] Table(string name) =>
        [.. _cli.Folder.Read($"well-results/{name}").Split('\n', StringSplitOptions.RemoveEmptyEntries).Select(r => r.Split(','))];

    private static double Number(string text) => double.Parse(text, CultureInfo.InvariantCulture);

    // At the first sample from the printed Sv and Pp; tolerance: the printed decimals, times what the formula makes of them.
    [Fact]
    public async Task Curves_stand_in_a_file_of_their_own_and_leave_the_model_as_it_was()
    {
        Assert.Equal(0, (await RunAsync("[]")).Code);
        var without = _cli.Folder.Read("well-results/depth.csv");
        Assert.False(File.Exists(_cli.Folder.Of("well-results/comparison.csv")));

        var result = await RunAsync("[\"hubbert-willis-1957-least\", { method = \"eaton-1969\", ratio = 0.4 }, \"breckels-1982-gulf-coast\"]");
        Assert.Equal((0, ""), (result.Code, result.Error));
        Assert.Equal(without, _cli.Folder.Read("well-results/depth.csv"));
        var (rows, depth) = (Table("comparison.csv"), Table("depth.csv"));
        Assert.Equal(["md_m", "tvd_m", "tvdss_m", "hubbert_willis_1957_least_mpa", "eaton_1969_mpa", "breckels_1982_gulf_coast_mpa"], rows[0]);
        Assert.Equal(depth.Length, rows.Length);
        double At(string column) => Number(depth[1][Array.IndexOf(depth[0], column)]);
        var (sv, pp, feet) = (At("sv_mpa"), At("pp_mpa"), 995 / 0.3048);
        Assert.Equal((sv + (2 * pp)) / 3, Number(rows[1][3]), 2e-4);
        Assert.Equal(pp + (2.0 / 3 * (sv - pp)), Number(rows[1][4]), 2e-4);
        var psi = (0.197 * Math.Pow(feet, 1.145)) + (0.46 * ((pp / 0.006894757293168361) - (0.465 * feet)));
        Assert.Equal(psi * 0.006894757293168361, Number(rows[1][5]), 2e-4);

        var record = JsonNode.Parse(_cli.Folder.Read("well-results/run.json"))!["methods"]!.AsArray().Where(m => m!["key"]!.GetValue<string>() == "[horizontal_stress] compare");
        Assert.Equal(["hubbert-willis-1957-least", "eaton-1969", "breckels-1982-gulf-coast"], record.Select(m => m!["method"]!.GetValue<string>()));
        Assert.Contains("eaton_1969_mpa", _cli.Folder.Read("well-results/README.txt"), StringComparison.Ordinal);
        Assert.Contains("ratio 0.4", _cli.Folder.Read("well-results/stress.svg"), StringComparison.Ordinal);
    }

    [Fact]
    public async Task What_is_wrong_with_the_choice_is_said_in_one_run()
    {
        var result = await RunAsync("[\"eaton-1969\", { method = \"matthews-kelly-1967\", ratio = 0.9 }, \"matthews-kelly-1967\", { method = \"bonaparte-sub-basin-depth\", ratio = 0.2 }, { method = \"eaton-1969\", ratio = 0.7 }, \"holbrook-1993\"]");
        Assert.Equal((2, ""), (result.Code, result.Output));
        Assert.Equal(
            [
                "[horizontal_stress] compare: \"eaton-1969\" needs a ratio of your own, as in { method = \"eaton-1969\", ratio = ... }",
                "[horizontal_stress] compare: found \"matthews-kelly-1967\" twice, expected each method once",
                "[horizontal_stress] compare: \"matthews-kelly-1967\" needs a ratio of your own, as in { method = \"matthews-kelly-1967\", ratio = ... }",
                "[horizontal_stress] compare: found a ratio for \"bonaparte-sub-basin-depth\", expected none: it takes no ratio",
                "[horizontal_stress] compare: found \"eaton-1969\" twice, expected each method once",
                "[horizontal_stress] compare: found a ratio of 0.7 for \"eaton-1969\", expected one from 0 to 0.5",
                "[horizontal_stress] compare = \"holbrook-1993\": its coefficients were recalled, not read in the source; set accept_unverified = true to use it",
            ],
            result.Error.Split('\n', StringSplitOptions.RemoveEmptyEntries).Select(e => e[(e.IndexOf("error: ", StringComparison.Ordinal) + 7)..]));
        Assert.All(result.Error.Split('\n', StringSplitOptions.RemoveEmptyEntries), e => Assert.Matches(@"^well\.toml\(\d+,\d+\): error: ", e));
    }

    [Fact]
    public async Task An_unknown_method_is_named_with_the_nearest_one()
    {
        var result = await RunAsync("[\"eaton-1996\"]");
        Assert.Equal(2, result.Code);
        Assert.Contains("did you mean \"eaton-1969\"?", result.Error, StringComparison.Ordinal);
    }

    // 11,500 ft are 3505.2 m below the ground, 3510.2 m below the datum of the small well.
    [Theory]
    [InlineData("3000.0,90,160,2.40,60\n3509.0,91,161,2.41,61\n", false)]
    [InlineData("3508.0,90,160,2.40,60\n3512.0,91,161,2.41,61\n", true)]
    public async Task A_well_across_the_Gulf_Coast_join_is_warned_of_the_step(string rows, bool warned)
    {
        var result = await RunAsync("[\"breckels-1982-gulf-coast\", \"breckels-1982-gulf-coast-deep\"]", "DEPT[m],DTC[us/ft],DTS[us/ft],RHOB[g/cm3],GR[gAPI]\n" + rows);
        Assert.Equal(0, result.Code);
        Assert.Equal(warned, result.Output.Contains(
            "warning: [horizontal_stress] compare: the two branches of breckels-1982-gulf-coast are 0.24 MPa apart where they join, at 3505.2 m below the surface", StringComparison.Ordinal));
    }
}
