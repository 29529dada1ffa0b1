using DepthStress.Core.Logs;

namespace DepthStress.Tests.Ingest;

/// <summary>All curves on the regular depth grid that the well file asks for.</summary>
public sealed class ResampleTests
{
    private const string Uneven = "DEPT[m],GR[gAPI],DTC[us/ft],FACIES,BS[in]\n"
        + "1000.1,50,100,1,12.25\n1000.5,60,100,1,12.25\n1001.1,66,110,2,8.5\n1001.5,70,-999.25,2,8.5\n1002,75,100,3,8.5\n1005,90,100,3,8.5\n1005.5,95,100,3,8.5\n";

    [Fact]
    public void Every_curve_comes_onto_whole_multiples_of_the_step()
    {
        var (logs, messages) = One(Uneven, "step = \"0.5 m\", method = \"linear\", max_gap = \"1 m\"");
        Assert.Equal([1000.5, 1001, 1001.5, 1002, 1002.5, 1003, 1003.5, 1004, 1004.5, 1005, 1005.5], logs!.Depths);
        var gamma = logs[Property.GammaRay]!;
        Assert.Equal([60, 65, 70, 75], gamma.Values[..4].Select(v => Math.Round(v, 9))); // rounding of 1001.1 - 1000.5
        Assert.Equal(
            ["0-1 Measured GR in a.csv", "1-2 Edited resampling", "2-4 Measured GR in a.csv", "4-9 None", "9-11 Measured GR in a.csv"], gamma.Origins());

        // The sonic as slowness: 108.33 us/ft at 1001 m; the missing value at 1001.5 m is bridged: 110 - 10 * 0.4 / 0.9.
        Assert.Equal([100, 108.333333, 105.555556, 100], logs[Property.Vp]!.Values[..4].Select(v => Math.Round(304800 / v, 6)));
        Assert.Equal(
            ["0-1 Measured DTC in a.csv", "1-2 Edited resampling", "2-3 Filled resampling", "3-4 Measured DTC in a.csv", "4-9 None", "9-11 Measured DTC in a.csv"],
            logs[Property.Vp]!.Origins());
        Assert.Equal([1, 2, 2, 3], logs[Property.Facies]!.Values[..4]);
        Assert.Equal([0.31115, 0.2159], logs[Property.BitSize]!.Values[..2].Select(v => Math.Round(v, 9))); // never a bit between two bits
        Assert.Equal(
            [
                "a.csv(1,1): note: uneven depths: 4 of 6 steps differ by more than a tenth from the usual 0.5 m, they run from 0.4 to 3 m; all curves are brought onto whole multiples of 0.5 m",
                "a.csv(1,18): note: compressional: 2 of 6 samples come from resampling, 1 of them bridge missing values",
                "a.csv(1,18): note: compressional: 1 gap longer than max_gap (1 m) stays missing: 1002.0 to 1005.0 m",
                "a.csv(1,9): note: gamma_ray: 1 of 6 samples come from resampling",
                "a.csv(1,9): note: gamma_ray: 1 gap longer than max_gap (1 m) stays missing: 1002.0 to 1005.0 m",
            ],
            messages.Take(5));
    }

    [Fact]
    public void Even_input_on_its_own_step_stays_as_logged_and_nothing_is_said()
    {
        var (logs, messages) = One(Ingesting.Csv("GR[gAPI]", 1000, 0.5, 50, 60, 70), "step = \"0.5 m\", method = \"mean\", max_gap = \"1 m\"");
        Assert.Empty(messages);
        Assert.Equal(["0-3 Measured GR in a.csv"], logs![Property.GammaRay]!.Origins());
    }

    [Fact]
    public void Spliced_files_of_other_steps_come_straight_onto_one_grid()
    {
        var (logs, messages) = Ingesting.Read(
            "[logs]\nfiles = [\"a.csv\", \"b.csv\"]\nresample = { step = \"1 m\", method = \"mean\", max_gap = \"2 m\" }\n"
            + "[logs.curves]\ngamma_ray = [{ column = \"GR\", file = \"a.csv\", base = \"1002 m\" }, { column = \"GR\", file = \"b.csv\" }]\n",
            ("a.csv", Ingesting.Csv("GR[gAPI]", 1000, 0.5, 50, 51, 52, 53, 54, 55)), ("b.csv", Ingesting.Csv("GR[gAPI]", 1001.25, 1, 100, 104, 108, 112)));
        Assert.Equal([1000, 1001, 1002, 1003, 1004], logs!.Depths);
        Assert.Equal([50, 52, 54, 107, 111], logs[Property.GammaRay]!.Values);
        Assert.Equal(["0-1 Spliced GR in a.csv", "1-5 Edited resampling"], logs[Property.GammaRay]!.Origins());
        Assert.Equal(["a.csv(1,9): note: gamma_ray: 4 of 5 samples come from resampling"], messages);
    }

    [Theory]
    [InlineData("step = \"0.5 m\"", "well.toml(27,12): error: [resample] method is not set; expected \"linear\" or \"mean\"")]
    [InlineData("step = \"0.5 m\"", "well.toml(27,12): error: [resample] max_gap is not set; expected the longest distance between logged samples that is bridged, such as \"1 m\"")]
    [InlineData("method = \"mean\"", "well.toml(27,12): error: [resample] step is not set; expected the distance between depths, such as \"0.1524 m\"")]
    [InlineData("", "well.toml(27,12): error: [resample] step is not set; expected the distance between depths, such as \"0.1524 m\"")]
    [InlineData("step = 0.5", "well.toml(27,21): error: found the bare number 0.5, expected step = a quantity in quotes with a unit (m, ft, in, mm, cm)")]
    [InlineData("step = \"0 m\"", "well.toml(27,21): error: found the text \"0 m\", expected step above zero")]
    [InlineData("method = \"median\"", "well.toml(27,23): error: found \"median\", expected method = one of \"linear\", \"mean\"; did you mean \"mean\"?")]
    [InlineData("step = \"0.0001 mm\", method = \"mean\", max_gap = \"2 m\"", "well.toml(27,21): error: found a step of 0.0000001 m, which makes more than 10,000,000 depths of 1000.1 to 1005.5 m, expected a coarser one")]
    [InlineData("step = \"1000 m\", method = \"mean\", max_gap = \"2 m\"", "well.toml(27,21): error: found a step of 1000 m, of which fewer than two whole multiples lie within 1000.1 to 1005.5 m, expected a finer one")]
    [InlineData("step = \"0.5 m\", method = \"mean\", max_gap = \"0.2 m\"", "well.toml(27,57): error: found max_gap = 0.2 m, expected at least the usual step of a.csv, 0.5 m: no two of its samples would be joined")]
    public void A_grid_that_is_half_stated_or_of_no_use_is_an_error(string keys, string expected) =>
        Assert.Contains(One(Uneven, keys).Messages, m => m.Contains(expected, StringComparison.Ordinal));

    [Fact]
    public void A_refused_value_is_reported_once() =>
        Assert.Single(One(Uneven, "step = \"0.5 m\", method = \"median\", max_gap = \"1 m\"").Messages, m => m.Contains("error", StringComparison.Ordinal));

    private static (LogTable? Logs, string[] Messages) One(string csv, string keys) =>
        Ingesting.Read($"[logs]\nfiles = [\"a.csv\"]\nresample = {{ {keys} }}\n", ("a.csv", csv));
}
