using System.Globalization;
using SampleWell;

namespace DepthStress.Tests.Cli;

/// <summary>Both unit systems are whole: every number has its unit, and the numbers agree.</summary>
public sealed class CliUnitSystemTests : IDisposable
{
    /// <summary>Metric suffix, field suffix, and field units per metric one: exact definitions, and NIST SP 811 App. B.8 for the psi.</summary>
    private static readonly (string Metric, string Field, double Factor)[] Factors =
    [
        ("_m", "_ft", 1 / 0.3048),
        ("_m_s", "_ft_s", 1 / 0.3048),
        ("_mpa", "_psi", 1e6 / 6894.757293168361),
        ("_gpa", "_mpsi", 1e3 / 6894.757293168361),
        ("_kpa_m", "_psi_ft", 1e3 * 0.3048 / 6894.757293168361),
        ("_degc", "_degf", 1.8),
        ("_mpa_m05", "_psi_in05", 1e6 / 6894.757293168361 / 0.15937377450509227), // root of 0.0254 m
        ("_emw_g_cm3", "_emw_lb_gal", 1e3 * 231 * Inch * Inch * Inch / 0.45359237),
    ];

    private const double Inch = 0.0254;

    private readonly CliRunner _cli = new();

    public void Dispose() => _cli.Dispose();

    private async Task<(string Output, string[][] Rows)> RunAsync(string units)
    {
        SampleLogs.Write(_cli.Folder.Path);
        await File.AppendAllTextAsync(_cli.Folder.Of("quillback-4.toml"), $"\n[output]\nunits = \"{units}\"\ntracks = [\"stress\"]\n");
        var result = await _cli.RunAsync("run", "quillback-4.toml");
        Assert.Equal(0, result.Code);
        return (result.Output, [.. _cli.Folder.Read("quillback-4-results/depth.csv").Split('\n', StringSplitOptions.RemoveEmptyEntries).Select(r => r.Split(','))]);
    }

    [Fact]
    public async Task The_sample_well_says_the_same_in_either()
    {
        var (metric, field) = (await RunAsync("metric"), await RunAsync("field"));
        Assert.Equal(metric.Rows.Length, field.Rows.Length);
        for (var c = 0; c < metric.Rows[0].Length; c++) Agree(metric.Rows, field.Rows, c);
        Summary(metric.Output, "m", "MPa", "kPa/m", "GPa");
        Summary(field.Output, "ft", "psi", "psi/ft", "Mpsi");
    }

    /// <summary>Each printed number may be off by half its last decimal.</summary>
    private static void Agree(string[][] metric, string[][] field, int column)
    {
        var (from, to) = (metric[0][column], field[0][column]);
        var unit = Factors.Where(f => from.EndsWith(f.Metric, StringComparison.Ordinal) && to.EndsWith(f.Field, StringComparison.Ordinal)).ToList();
        if (from != to) Assert.NotEmpty(unit);
        var factor = from == to ? 1 : unit.MaxBy(f => f.Metric.Length).Factor;
        var zero = to.EndsWith("_degf", StringComparison.Ordinal) ? 32 : 0;
        for (var r = 1; r < metric.Length; r++)
        {
            var (a, b) = (metric[r][column], field[r][column]);
            if (!double.TryParse(a, CultureInfo.InvariantCulture, out var x) || !double.TryParse(b, CultureInfo.InvariantCulture, out var y))
            {
                Assert.Equal(a, b);
                continue;
            }

            var room = 0.5000001 * ((factor * Last(a)) + Last(b));
            Assert.True(Math.Abs((x * factor) + zero - y) <= room, $"{from} {a} is not {to} {b} at {metric[r][0]}");
        }
    }

    private static double Last(string number) =>
        Math.Pow(10, number.Contains('.', StringComparison.Ordinal) ? -(number.Length - 1 - number.IndexOf('.', StringComparison.Ordinal)) : 0);

    private static void Summary(string output, string length, string pressure, string gradient, string modulus)
    {
        var lines = output.Split('\n');
        Assert.Matches($@"^Well Quillback 4: \d+ samples, [\d.]+ {length} to [\d.]+ {length} measured depth, [\d.]+ {length} to [\d.]+ {length} true vertical depth below the rotary table$", lines[0]);
        var head = Array.FindIndex(lines, l => l.TrimStart().StartsWith("zone ", StringComparison.Ordinal));
        string[] expected = [length, "%", pressure, pressure, pressure, pressure, gradient, gradient, gradient, modulus, modulus, "%", "Sv"];
        Assert.Equal(expected, lines[head + 1].Split(' ', StringSplitOptions.RemoveEmptyEntries)); // nu and biot have none
        Assert.Contains($"What the choices of static Poisson's ratio and Biot's coefficient do to mean Shmin, {pressure}:", lines);
        var target = Assert.Single(lines, l => l.StartsWith("Target ", StringComparison.Ordinal));
        Assert.Matches($@"^Target bracken sand, mean Shmin [\d.]+ {pressure}: barrier above apricot shale \([\d.]+-[\d.]+ {length} md\), [\d.]+ {pressure} more at equal depth over [\d.]+ {length} tvd, \d+ % of it on measured logs; below cinder marl and dapple shale and elm limestone and fern shale \([\d.]+-[\d.]+ {length} md\), [\d.]+ {pressure} more at equal depth over [\d.]+ {length} tvd, \d+ % of it on measured logs\.$", target);
        Assert.All(
            lines.Where(l => l.StartsWith("warning: ", StringComparison.Ordinal) && l.Contains(" at ", StringComparison.Ordinal)),
            l => Assert.Contains($" {length} md", l, StringComparison.Ordinal));
        Assert.Matches($@"the vertical stress of [\d.]+ {pressure} at [\d.]+ {length} true vertical depth rests on an assumed mean density of 2\.100 g/cm3", output);
    }
}
