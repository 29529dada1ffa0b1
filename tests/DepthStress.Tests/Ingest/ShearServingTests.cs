using DepthStress.Core.Logs;
using DepthStress.Files.Ingest;

namespace DepthStress.Tests.Ingest;

/// <summary>Which of a fast, a slow and a plain shear wave serves the isotropic chain, and that it is said.</summary>
public sealed class ShearServingTests
{
    // Slownesses of 150 and 160, and of 100 and 150 us/ft: velocities that differ by 2 (160 - 150) / 310 = 6.4516 % and 40 % of their mean.
    private const string Waves = "DEPT[m],DTSF[us/ft],DTSS[us/ft]\n1000,150,160\n1001,100,150\n1002,,150\n1003,140,\n";
    private const string Apart = "the fast one is 23.2 % faster on average over 2 samples than the slow one";

    [Theory]
    [InlineData("fast", 150, "0-2 Measured DTSF in a.csv|2-3 None|3-4 Measured DTSF in a.csv", "fast_shear (DTSF in a.csv)")]
    [InlineData("slow", 160, "0-3 Measured DTSS in a.csv|3-4 None", "slow_shear (DTSS in a.csv)")]
    [InlineData("mean", 155, "0-2 Edited mean of the fast and slow shear slowness|2-4 None", "the mean slowness of fast_shear (DTSF in a.csv) and slow_shear (DTSS in a.csv)")]
    public void The_wave_that_the_well_file_names_serves_as_shear(string word, double slowness, string origins, string served)
    {
        var (logs, messages) = Waved(Waves, word);
        Assert.Equal(304800 / slowness, logs![Property.Vs]!.Values[0], 1e-9); // four roundings
        Assert.Equal(origins.Split('|'), logs[Property.Vs]!.Origins());
        Assert.Equal([$"well.toml(27,14): note: shear: {served} serves; {Apart}"], messages);
        Assert.NotNull(logs[Property.FastShear]);
        Assert.NotNull(logs[Property.SlowShear]);
        Assert.NotSame(logs[Property.FastShear]!.Values, logs[Property.Vs]!.Values);
    }

    [Theory]
    [InlineData(Waves, "found fast_shear (DTSF in a.csv) and slow_shear (DTSS in a.csv) but no column for shear; " + Apart + "; expected shear_from = \"fast\", \"slow\" or \"mean\", or shear in [logs.curves]")]
    [InlineData("DEPT[m],DTSF[us/ft]\n1000,150\n", "found fast_shear (DTSF in a.csv) but no column for shear; expected shear_from = \"fast\", or shear in [logs.curves]")]
    [InlineData("DEPT[m],DTSS[us/ft]\n1000,150\n", "found slow_shear (DTSS in a.csv) but no column for shear; expected shear_from = \"slow\", or shear in [logs.curves]")]
    public void Without_a_word_nothing_is_chosen(string csv, string expected) =>
        Assert.Equal([$"well.toml(26,9): error: [logs] shear_from is not set: {expected}"], Waved(csv, null).Messages);

    [Fact]
    public void A_plain_shear_serves_and_the_note_says_by_how_much_the_others_differ()
    {
        var (logs, messages) = Waved(Plain(Waves), null);
        Assert.Equal([$"a.csv(1,33): note: shear: DTSM in a.csv serves; fast_shear (DTSF in a.csv) and slow_shear (DTSS in a.csv) are there too and do not enter the isotropic chain; {Apart}"], messages);
        Assert.Equal(["0-4 Measured DTSM in a.csv"], logs![Property.Vs]!.Origins());
    }

    [Fact]
    public void The_well_files_word_goes_before_a_plain_shear_found_by_its_name()
    {
        var (logs, messages) = Waved(Plain(Waves), "slow");
        Assert.Equal([$"well.toml(27,14): note: shear: slow_shear (DTSS in a.csv) serves, not DTSM in a.csv; {Apart}"], messages);
        Assert.Equal("DTSS in a.csv", logs![Property.Vs]!.Source);
    }

    [Fact]
    public void Two_words_about_shear_are_an_error() => Assert.Equal(
        ["well.toml(27,14): error: found both shear in [logs.curves] (DTSM in a.csv) and shear_from, expected one of them"],
        Waved(Plain(Waves), "slow", "shear = \"DTSM\"").Messages);

    [Theory]
    [InlineData("DEPT[m],DTSF[us/ft]\n1000,150\n", "slow", "found shear_from = \"slow\", but no column for slow_shear")]
    [InlineData("DEPT[m],DTSF[us/ft]\n1000,150\n", "mean", "found shear_from = \"mean\", but no column for slow_shear")]
    [InlineData("DEPT[m],DTSM[us/ft]\n1000,150\n", "fast", "found shear_from, but no column for fast_shear or slow_shear; expected it only where one of them is there")]
    [InlineData("DEPT[m],DTSF\n1000,150\n", "fast", "found shear_from = \"fast\", but fast_shear (DTSF in a.csv) cannot be used")]
    public void A_word_for_a_wave_that_is_not_there_is_an_error(string csv, string word, string expected) =>
        Assert.Contains($"well.toml(27,14): error: {expected}", Waved(csv, word).Messages);

    [Fact]
    public void A_fast_wave_that_is_slower_is_a_warning() => Assert.Equal(
        "a.csv(1,9): warning: fast_shear (DTSF in a.csv): found it 6.5 % slower on average over 1 sample than slow_shear (DTSS in a.csv), expected it faster; are the two exchanged?",
        Waved("DEPT[m],DTSF[us/ft],DTSS[us/ft]\n1000,160,150\n", "fast").Messages[0]);

    [Fact]
    public void The_difference_is_the_same_for_slownesses_but_for_the_sign()
    {
        var (velocity, count) = ShearServing.MeanDifference([2000, 2500, double.NaN], [1800, 2400, 2000]);
        Assert.Equal(2, count);
        Assert.Equal(((2 * 200 / 3800.0) + (2 * 100 / 4900.0)) / 2, velocity, 1e-12); // self-computed; a few roundings
        Assert.Equal(-velocity, ShearServing.MeanDifference([1 / 2000.0, 1 / 2500.0], [1 / 1800.0, 1 / 2400.0]).Share, 1e-12);
    }

    private static string Plain(string waves) => string.Join('\n', waves.TrimEnd().Split('\n').Select((line, i) => line + (i == 0 ? ",DTSM[us/ft]" : ",155"))) + "\n";

    private static (LogTable? Logs, string[] Messages) Waved(string csv, string? word, string curves = "") =>
        Ingesting.Read($"[logs]\nfiles = [\"a.csv\"]\n{(word is null ? "" : $"shear_from = \"{word}\"\n")}[logs.curves]\n{curves}\n", ("a.csv", csv));
}
