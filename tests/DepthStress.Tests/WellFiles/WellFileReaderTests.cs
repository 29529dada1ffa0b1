using System.Text;
using DepthStress.Core.Diagnostics;
using DepthStress.Files.Setup;

namespace DepthStress.Tests.WellFiles;

/// <summary>Whole well files: what cannot be opened or read, and every missing key in one run.</summary>
public sealed class WellFileReaderTests : IDisposable
{
    private readonly TestFolder _folder = new();

    public void Dispose() => _folder.Dispose();

    [Fact]
    public void A_sound_file_says_nothing() => Assert.Empty(WellText.Messages(WellText.Sound));

    [Fact]
    public void Every_missing_key_is_named_in_one_run() => Assert.Equal(
        [
            "well.toml: error: [well] name is not set",
            "well.toml: error: [logs] files is not set; expected the names of the log files",
            "well.toml: error: [well] datum is not set; expected \"rotary table\", \"ground\" or \"sea level\"",
            "well.toml: error: [well] datum_elevation is not set; expected the datum's height above mean sea level",
            "well.toml: error: [well] has neither ground_elevation (onshore) nor water_depth (offshore); expected one of them",
            "well.toml: error: [survey] is not set; expected file = \"...\", curve = \"...\" or vertical = true",
            "well.toml: error: [moduli] static_youngs is not set; expected a value or a method: lacy-1997-sandstone, lacy-1997-shale, lacy-1997-combined, ohen-2003-shale and others, see \"depthstress methods --for youngs_static\"",
            "well.toml: error: [moduli] static_poisson is not set; expected a value or a method: equal-to-dynamic",
            "well.toml: error: [biot] coefficient is not set; expected a value or a method: krief-1990-biot, consolidated-rock-biot, lee-2003-unconsolidated, nur-1998-critical-porosity and others, see \"depthstress methods --for biot\"",
            "well.toml: error: [pore_pressure] method is not set; expected hydrostatic, gradient, table, fluid line, eaton-1975-sonic, eaton-1975-resistivity, bowers-1995-loading, bowers-1995-unloading and others, see \"depthstress methods --for pp\"",
        ],
        WellText.Messages(""));

    [Fact]
    public void Several_problems_come_in_one_run()
    {
        var messages = WellText.Messages(WellText.Sound
            .Exchange("datum_elevation = \"30 m\"", "datum_elevation = 30")
            .Exchange("coefficient = 0.8", "coefficient = 8")
            .Exchange("method = \"hydrostatic\"", "method = \"hydrostatics\"")
            .Exchange("files = [\"logs.csv\"]", "file = [\"logs.csv\"]"));
        Assert.Equal(5, messages.Length);
        Assert.All(["(4,19)", "(9,1)", "(19,15)", "(25,10)", "[logs] files is not set"], place => Assert.Single(messages, m => m.Contains(place, StringComparison.Ordinal)));
    }

    [Fact]
    public void A_value_refused_in_one_zone_does_not_hide_that_another_zone_lacks_it()
    {
        var messages = WellText.Messages(WellText.With("static_youngs = \"lacy-1997-combined\"\n", "")
            + "[[zones]]\nname = \"a\"\ntop = \"1000 m\"\ndepth_kind = \"md\"\n[zones.moduli]\nstatic_youngs = \"typo\"\n"
            + "[[zones]]\nname = \"b\"\ntop = \"1001 m\"\ndepth_kind = \"md\"\n");
        Assert.Equal(2, messages.Length);
        Assert.Contains("found the unknown method \"typo\"", messages[0], StringComparison.Ordinal);
        Assert.Contains("[moduli] static_youngs is not set in zone \"b\"", messages[1], StringComparison.Ordinal);
    }

    [Fact]
    public void A_file_given_twice_is_an_error() => Assert.Equal(
        ["well.toml(9,9): error: found the file \"logs.csv\" twice in [logs] files, expected each once"],
        WellText.Messages(WellText.With("[\"logs.csv\"]", "[\"logs.csv\", \"logs.csv\"]")));

    [Theory]
    [InlineData("nope.toml", "nope.toml: error: found no such file, expected a well file")]
    [InlineData("nowhere/well.toml", "well.toml: error: found no such file, expected a well file")]
    [InlineData(".", ": error: found a folder, expected a well file")]
    public void What_is_not_there_is_named(string path, string expected) => Assert.EndsWith(expected, Assert.Single(Read(_folder.Of(path))), StringComparison.Ordinal);

    [Theory]
    [InlineData("well.las", "~Version\n")]
    [InlineData("well.toml", "~Version Information\n VERS. 2.0 :\n")]
    [InlineData("well.csv", "DEPT[m],GR[gAPI]\n")]
    public void A_log_file_in_its_place_is_told_from_a_well_file(string name, string text) => Assert.Equal(
        [$"{name}: error: found a log file, expected a well file (TOML); to write one for these logs: depthstress init {name}"],
        Read(_folder.Write(name, text)));

    [Fact]
    public void Bytes_that_are_no_utf_8_are_refused()
    {
        File.WriteAllBytes(_folder.Of("well.toml"), [.. "[well]\nname = \""u8, 0xE9, .. "\"\n"u8]);
        Assert.Equal(["well.toml: error: found bytes that are not UTF-8, expected a well file as UTF-8 text"], Read(_folder.Of("well.toml")));
    }

    [Fact]
    public void A_huge_file_is_refused_before_it_is_read()
    {
        using (var stream = File.Create(_folder.Of("well.toml"))) stream.SetLength((16 << 20) + 1);
        Assert.Equal(
            ["well.toml: error: found more than 16 MiB, expected a well file; is it a log file? then start with the command init"],
            Read(_folder.Of("well.toml")));
    }

    [Theory]
    [InlineData("\r\n", false)]
    [InlineData("\n", true)]
    public void Line_ends_a_byte_order_mark_and_a_missing_last_line_end_do_not_matter(string lineEnd, bool mark)
    {
        var text = (mark ? "\uFEFF" : "") + WellText.Sound.TrimEnd().ReplaceLineEndings(lineEnd);
        File.WriteAllBytes(_folder.Of("well.toml"), Encoding.UTF8.GetBytes(text));
        Assert.Empty(Read(_folder.Of("well.toml")));
    }

    [Fact]
    public void Positions_hold_under_windows_line_ends()
    {
        var text = WellText.With("\"30 m\"", "30").ReplaceLineEndings("\r\n");
        Assert.StartsWith("well.toml(4,19): error", Assert.Single(Read(_folder.Write("well.toml", text))), StringComparison.Ordinal);
    }

    [Theory]
    [InlineData("[", "")]
    [InlineData("[", "]")]
    [InlineData("{a=", "")]
    public void A_hundred_thousand_brackets_end_in_a_message(string open, string close)
    {
        var text = "a = " + string.Concat(Enumerable.Repeat(open, 100_000)) + string.Concat(Enumerable.Repeat(close, 100_000));
        Assert.Equal(["well.toml: error: TOML: found values nested too deeply, expected a well file"], Read(_folder.Write("well.toml", text)));
    }

    [Fact]
    public void A_long_text_is_cut_in_messages()
    {
        var message = Assert.Single(WellText.Messages(WellText.Sound + $"[output]\nunits = \"{new string('x', 5000)}\"\n"));
        Assert.Equal($"well.toml(28,9): error: found \"{new string('x', 80)}...\", expected units = one of \"metric\", \"field\"", message);
    }

    private static string[] Read(string path)
    {
        var diagnostics = new DiagnosticBag();
        WellFileReader.Read(path, diagnostics);
        Assert.True(diagnostics.HasErrors || diagnostics.Items.Count == 0);
        return [.. diagnostics.Items.Select(d => d.ToString())];
    }
}
