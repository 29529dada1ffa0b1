using System.Globalization;
using DepthStress.Tests.WellFiles;

namespace DepthStress.Tests.Cli;

/// <summary>Bad inputs from end to end: each ends with 2 and a message that says what and where.</summary>
public sealed class CliBadInputTests : IDisposable
{
    private readonly CliRunner _cli = new();

    public void Dispose() => _cli.Dispose();

    [Fact]
    public async Task A_log_file_that_is_not_there() =>
        Assert.Equal(["logs.csv: error: file not found"], await _cli.CheckAsync(WellText.Sound, null));

    [Theory]
    [InlineData("", "logs.csv: error: found an empty file, expected a CSV or LAS log file")]
    [InlineData("DEPT[m],DTC[us/ft]\n", "logs.csv: error: found no data rows, expected at least one")]
    [InlineData("DEPT[m]\n1\n", "logs.csv(1): error: found 1 column in the header row, expected at least 2 separated by ','")]
    [InlineData(
        "TIME[s],DTC[us/ft]\n1,90\n",
        "logs.csv(1,1): error: found the index \"TIME\" in s, a time; expected a depth (logs over time are not read)")]
    [InlineData(
        "X[s],DTC[us/ft]\n1,90\n",
        "logs.csv(1,1): error: found the index \"X\" in s, a time; expected a depth (logs over time are not read)")]
    [InlineData(
        "X[m],DTC[us/ft]\n1,90\n",
        "logs.csv(1): error: found no depth column, expected one named DEPT, DEPTH, MD, MEASURED_DEPTH, DEPTH_MD, TDEP, MD_DEPTH, MEASDEPTH or MEASUREDDEPTH")]
    [InlineData(
        "DEPT[m],DTC[us/ft]\n1000,90,1\n",
        "logs.csv(2): error: found 3 values, expected 2 (one for each column); \"1000,90\" is two values where ',' is the delimiter, or 1000.90 where it is the decimal mark")]
    public async Task A_log_file_without_usable_content(string logs, string expected) => Assert.Equal([expected], await _cli.CheckAsync(WellText.Sound, logs));

    [Fact]
    public async Task A_binary_file()
    {
        File.WriteAllBytes(_cli.Folder.Of("logs.csv"), [.. Enumerable.Range(0, 2560).Select(i => (byte)i)]);
        Assert.Equal(["logs.csv(1): error: found a NUL byte (binary data), expected text"], await _cli.CheckAsync(WellText.Sound, null));
    }

    [Theory]
    [InlineData("1000.5,91", "1000.5,x91", "logs.csv(3,8): error: column \"DTC\": found \"x91\", expected a number")]
    [InlineData("1000.5,91", "1000.5,\"91,5\"", "logs.csv(3,8): error: column \"DTC\": found the decimal comma in \"91,5\", expected a decimal point")]
    [InlineData("1000.5,91", "1000.5,91,5", "logs.csv(3): error: found 6 values, expected 5 (one for each column); \"91,5\" is two values where ',' is the delimiter, or 91.5 where it is the decimal mark")]
    [InlineData("1000.5,91", "999.5,91", "logs.csv(3): error: depth decreases in 1 row, first from 1000 to 999.5, expected increasing")]
    [InlineData("1000.5,91", "1000.0,91", "logs.csv(3): error: depth repeats in 1 row, first 1000, expected increasing (or repeated_depth = \"first\" or \"mean\" in [logs])")]
    [InlineData("1000.5,91", ",91", "logs.csv(3): error: found no depth in data row 2, expected a number")]
    public async Task A_cell_or_a_depth_that_cannot_be(string old, string replacement, string expected) =>
        Assert.Equal([expected], await _cli.CheckAsync(WellText.Sound, WellText.Logs.Exchange(old, replacement)));

    [Theory]
    [InlineData("RHOB[g/cm3]", "XX[g/cm3]", "error: no bulk density at any depth, expected a density curve: the overburden needs it")]
    [InlineData("DTC[us/ft]", "DTC", "logs.csv(1,9): error: column DTC (compressional): found no unit, expected one of us/ft, us/m, m/s, km/s, ft/s; state it in [logs.curves]: compressional = { column = \"DTC\", unit = \"us/ft\" }")]
    [InlineData("DTC[us/ft]", "DTC[psi]", "logs.csv(1,9): error: column DTC (compressional): found the unit \"psi\", expected one of us/ft, us/m, m/s, km/s, ft/s; state it in [logs.curves]: compressional = { column = \"DTC\", unit = \"us/ft\" }")]
    [InlineData("GR[gAPI]", "DT[us/ft]", "logs.csv(1,43): error: found 2 columns for the role compressional (DTC in logs.csv, DT in logs.csv); expected one, or their order in [logs.curves]: compressional = \"DTC\"")]
    public async Task A_column_that_is_not_what_it_should_be(string old, string replacement, string expected) =>
        Assert.EndsWith(expected, Assert.Single(await _cli.CheckAsync(WellText.Sound, WellText.Logs.Exchange(old, replacement))), StringComparison.Ordinal);

    [Theory]
    [InlineData("shaer = \"DTS\"", "well.toml(12,1): error: found the unknown key \"shaer\" in [logs.curves], expected one of depth, compressional, shear, fast_shear, slow_shear, stoneley, density, gamma_ray, caliper, bit_size, density_correction, neutron, photoelectric, deep_resistivity, medium_resistivity, shallow_resistivity, temperature, porosity, shale_volume, facies, true_vertical_depth, vertical_position; did you mean \"shear\"?")]
    [InlineData("shear = [\"DTS\", \"GR\"]", "well.toml(12,10): error: shear: expected base = the measured depth where the next column takes over")]
    public async Task A_role_that_is_not_known_or_has_no_order(string curves, string expected) =>
        Assert.Contains(expected, await _cli.CheckAsync(WellText.With("[survey]", $"[logs.curves]\n{curves}\n[survey]"), WellText.Logs));

    [Fact]
    public async Task A_curve_without_values_is_a_warning_and_named_in_the_results()
    {
        var logs = string.Join('\n', WellText.Logs.Split('\n').Select(r => r.StartsWith('1') ? string.Join(',', r.Split(',').Select((c, i) => i == 2 ? "-999.25" : c)) : r));
        Assert.Equal(["logs.csv(1,20): warning: column \"DTS\" has no values, all are missing"], await _cli.CheckAsync(WellText.Sound, logs));
        var result = await _cli.RunAsync("run", "well.toml");
        Assert.Equal(0, result.Code);
        Assert.Contains("warning: shear log missing: no moduli, no horizontal stress; 5 samples (100.0 %)", result.Output, StringComparison.Ordinal);
    }

    [Fact]
    public async Task Problems_of_the_well_file_and_of_every_log_file_come_in_one_run()
    {
        _cli.Folder.Write("b.csv", "DEPT[m],GR[gAPI]\n1,x\n2,y\n");
        var well = WellText.Sound
            .Exchange("[\"logs.csv\"]", "[\"logs.csv\", \"b.csv\", \"c.csv\"]")
            .Exchange("coefficient = 0.8", "coefficient = 8")
            .Exchange("\"30 m\"", "30");
        Assert.Equal(
            [
                "well.toml(4,19): error: found the bare number 30, expected datum_elevation = a quantity in quotes with a unit (m, ft, in, mm, cm)",
                "well.toml(19,15): error: found the bare number 8, expected coefficient from 0 to 1",
                "logs.csv(3,8): error: column \"DTC\": found \"x91\", expected a number",
                "b.csv(2,3): error: column \"GR\": found \"x\", expected a number",
                "b.csv(3,3): error: column \"GR\": found \"y\", expected a number",
                "c.csv: error: file not found",
            ],
            await _cli.CheckAsync(well, WellText.Logs.Exchange("1000.5,91", "1000.5,x91")));
    }

    [Fact]
    public async Task A_gap_in_density_is_an_error_that_names_the_interval()
    {
        var message = Assert.Single(await _cli.CheckAsync(WellText.Sound, WellText.Logs.Exchange("2.42", "-999.25")));
        Assert.Contains("1000.5 m to 1001.5 m", message, StringComparison.Ordinal);
        Assert.Contains("[overburden] gaps", message, StringComparison.Ordinal);
        Assert.Contains("error: ", message, StringComparison.Ordinal);
    }

    [Fact]
    public async Task A_decimal_comma_of_the_computer_changes_nothing()
    {
        var before = CultureInfo.CurrentCulture;
        var comma = (CultureInfo)CultureInfo.InvariantCulture.Clone();
        comma.NumberFormat.NumberDecimalSeparator = ",";
        comma.NumberFormat.NumberGroupSeparator = ".";
        _cli.SmallWell("well.toml");
        var plain = await _cli.RunAsync("check", "well.toml");
        CultureInfo.CurrentCulture = comma;
        try
        {
            var other = await _cli.RunAsync("check", "well.toml");
            Assert.Equal(plain, other);
            Assert.Equal(0, other.Code);
        }
        finally
        {
            CultureInfo.CurrentCulture = before;
        }
    }
}
