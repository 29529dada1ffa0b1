using System.Globalization;
using System.Text.Json.Nodes;
using DepthStress.Tests.WellFiles;

namespace DepthStress.Tests.Cli;

/// <summary>Core plugs and pressure changes from the well file to the results.</summary>
public sealed class CliCoreTests : IDisposable
{
    private readonly CliRunner _cli = new();

    public void Dispose() => _cli.Dispose();

    // Residuals against the printed model value at the same depth; tolerance: the printed decimals.
    [Fact]
    public async Task Plugs_stand_in_core_csv_and_leave_the_profile_as_it_was()
    {
        _cli.Folder.Write("logs.csv", WellText.Logs);
        _cli.Folder.Write("well.toml", WellText.Sound);
        Assert.Equal(0, (await _cli.RunAsync("run", "well.toml")).Code);
        var before = _cli.Folder.Read("well-results/depth.csv");

        _cli.Folder.Write("core.csv", "depth_m,orientation,confining_pressure,youngs_static,poisson_static\n1000.5,vertical,8 MPa,7 GPa,0.25\n1001.5,vertical,8 MPa,8 GPa,0.27\n1001,horizontal,8 MPa,9 GPa,0.2\n");
        _cli.Folder.Write("well.toml", WellText.Sound + "[core]\nfiles = [\"core.csv\"]\n[horizontal_stress]\npressure_change = \"-5 MPa\"\n");
        var result = await _cli.RunAsync("run", "well.toml");
        Assert.Equal((0, ""), (result.Code, result.Error));
        Assert.Equal(before, _cli.Folder.Read("well-results/depth.csv"));
        string[][] Table(string text) => [.. text.Split('\n', StringSplitOptions.RemoveEmptyEntries).Select(r => r.Split(','))];
        var (depth, core) = (Table(before), Table(_cli.Folder.Read("well-results/core.csv")));
        double Number(string[][] table, int row, string column) => double.Parse(table[row][Array.IndexOf(table[0], column)], CultureInfo.InvariantCulture);
        Assert.Equal(4, core.Length);
        Assert.Equal(Number(depth, 2, "youngs_static_gpa"), Number(core, 1, "youngs_static_model_gpa"), 1e-9);
        Assert.Equal(Number(depth, 2, "youngs_static_gpa") - 7, Number(core, 1, "youngs_static_residual_gpa"), 1.1e-4);
        Assert.Contains("vertical; confined at 8.00 MPa to 8.00 MPa, 2 plugs", result.Output, StringComparison.Ordinal);
        Assert.Contains("static_youngs_factor that meets them", result.Output, StringComparison.Ordinal);
        Assert.Contains("Pressure change -5.00 MPa in whole log: Shmin follows by 0.", result.Output, StringComparison.Ordinal);
        Assert.Contains("core_md_m", _cli.Folder.Read("well-results/README.txt"), StringComparison.Ordinal);

        var record = JsonNode.Parse(_cli.Folder.Read("well-results/run.json"))!;
        Assert.Contains(record["inputs"]!.AsArray(), i => i!["file"]!.GetValue<string>() == "core.csv");
        Assert.Equal(["vertical; confined", "horizontal; confined"], record["core"]!["moduli"]!.AsArray().Select(g => g!["group"]!.GetValue<string>()));
        Assert.Equal(-5, record["depletion"]![0]!["pressure_change_mpa"]!.GetValue<double>());
    }
}
