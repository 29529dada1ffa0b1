using System.Globalization;
using DepthStress.Tests.Reading;

namespace DepthStress.Tests.Cli;

/// <summary>
/// Three open wells go from <c>init</c> over <c>check</c> to <c>run</c> with only what the starter asks for filled in. Bounds of the
/// results are common practice; water depths are assumed, for the files do not state them.
/// </summary>
public sealed class OpenWellTests : IDisposable
{
    private const double Water = 1030 * 9.80665;

    private readonly CliRunner _cli = new();

    public void Dispose() => _cli.Dispose();

    [OpenDataFact]
    public Task The_first_open_well_runs_and_is_sane() => Runs("31_3-4.las", elevation: 40, water: 218);

    [OpenDataFact]
    public Task The_second_open_well_runs_and_is_sane() => Runs("16_2-16.las", elevation: 26, water: 110);

    [OpenDataFact]
    public Task The_third_open_well_runs_and_is_sane() => Runs("32_2-1.las", elevation: 30, water: 300);

    private async Task Runs(string name, double elevation, double water)
    {
        File.Copy(Path.Combine(OpenDataFactAttribute.Folder, "wells", name), _cli.Folder.Of("well.las"));
        Assert.Equal(0, (await _cli.RunAsync("init", "well.las")).Code);
        Fill(elevation, water);
        foreach (var command in (string[])["check", "run"])
        {
            var result = await _cli.RunAsync(command, "well.toml");
            Assert.True(result.Code == 0, result.Error);
        }

        Check(_cli.Folder.Read("well-results/depth.csv"), elevation, water);
    }

    /// <summary>Fills in what the starter marks, as a user would; offshore.</summary>
    private void Fill(double elevation, double water)
    {
        var text = _cli.Folder.Read("well.toml").Split('\n').Select(line => line switch
        {
            _ when line.StartsWith("# datum_elevation", StringComparison.Ordinal) => FormattableString.Invariant($"datum_elevation = \"{elevation} m\""),
            _ when line.StartsWith("# water_depth", StringComparison.Ordinal) => FormattableString.Invariant($"water_depth = \"{water} m\""),
            _ when line.StartsWith("# ground_elevation", StringComparison.Ordinal) => line,
            _ when line.StartsWith("# ", StringComparison.Ordinal) && line.Contains("# <-", StringComparison.Ordinal) => line[2..],
            _ => line,
        });
        _cli.Folder.Write("well.toml", string.Join('\n', text));
    }

    private static void Check(string csv, double elevation, double water)
    {
        var lines = csv.TrimEnd('\n').Split('\n').Select(l => l.Split(',')).ToList();
        double Value(string[] row, string column) =>
            row[Array.IndexOf(lines[0], column)] is { Length: > 0 } cell ? double.Parse(cell, CultureInfo.InvariantCulture) : double.NaN;
        var rows = lines.Skip(1).ToList();
        var stressed = rows.Where(r => !double.IsNaN(Value(r, "shmin_mpa"))).ToList();
        Assert.NotEmpty(stressed);

        double Share(Func<string[], bool> holds) => stressed.Count(holds) / (double)stressed.Count;
        Assert.InRange(Share(r => Value(r, "pp_mpa") < Value(r, "shmin_mpa")), 0.995, 1);
        Assert.InRange(Share(r => Value(r, "youngs_static_gpa") < Value(r, "youngs_dynamic_gpa")), 0.95, 1);
        var mudline = elevation + water;
        foreach (var row in rows.Where(r => Value(r, "tvd_m") > mudline + 50 && !double.IsNaN(Value(r, "sv_mpa"))))
        {
            var gradient = (Value(row, "sv_mpa") - (Water * water * 1e-6)) / (Value(row, "tvd_m") - mudline) * 1000;
            Assert.InRange(gradient, 16, 27);
        }
    }
}
