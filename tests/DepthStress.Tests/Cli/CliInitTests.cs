using DepthStress.Tests.WellFiles;
using SampleWell;

namespace DepthStress.Tests.Cli;

/// <summary>The command <c>init</c>: recognises, asks, never overwrites; what it writes runs once the marked lines are filled in.</summary>
public sealed class CliInitTests : IDisposable
{
    private readonly CliRunner _cli = new();

    public void Dispose() => _cli.Dispose();

    [Fact]
    public async Task Recognised_curves_and_units_are_written_down()
    {
        _cli.Folder.Write("well.csv", WellText.Logs);
        var result = await _cli.RunAsync("init", "well.csv");
        Assert.Equal((0, "Wrote well.toml. Fill in the lines marked <-, then run: depthstress check well.toml\n", ""), (result.Code, result.Output, result.Error));
        var text = _cli.Folder.Read("well.toml");
        Assert.Contains("files = [\"well.csv\"]\n", text, StringComparison.Ordinal);
        Assert.Contains("compressional = \"DTC\"                 # compressional slowness or velocity, us/ft, 1000.0 to 1002.0 m\n", text, StringComparison.Ordinal);
        Assert.Contains("density = \"RHOB\"                      # bulk density, g/cm3, 1000.0 to 1002.0 m\n", text, StringComparison.Ordinal);
        Assert.DoesNotContain('\r', text);
    }

    [Fact]
    public async Task What_only_the_user_knows_is_asked_for()
    {
        _cli.Folder.Write("well.csv", WellText.Logs);
        await _cli.RunAsync("init", "well.csv");
        var asked = _cli.Folder.Read("well.toml").Split('\n').Where(l => l.Contains("# <-", StringComparison.Ordinal)).Select(l => l.Trim('#', ' ').Split(' ')[0]);
        Assert.Equal(["datum_elevation", "water_depth", "ground_elevation", "vertical", "above_log", "method"], asked);

        var check = await _cli.RunAsync("check", "well.toml");
        Assert.Equal(2, check.Code);
        Assert.Equal(
            [
                "well.toml: error: [well] datum_elevation is not set; expected the datum's height above mean sea level",
                "well.toml: error: [well] has neither ground_elevation (onshore) nor water_depth (offshore); expected one of them",
                "well.toml: error: [pore_pressure] method is not set; expected hydrostatic, gradient, table, fluid line, eaton-1975-sonic, eaton-1975-resistivity, bowers-1995-loading, bowers-1995-unloading and others, see \"depthstress methods --for pp\"",
            ],
            check.Error.Split('\n', StringSplitOptions.RemoveEmptyEntries));
    }

    [Theory]
    [InlineData("z_loc[m]\n1000,-960.00\n1100,-1060.5\n1200,-1160.50\n", "vertical = true                       # <- confirm: z_loc agrees with a vertical hole within 0.50 m, its datum 39.5 m above sea level; or instead: file = ")]
    [InlineData("TVDSS[m]\n1000,960\n1100,1060\n", "vertical = true                       # <- confirm: TVDSS agrees with a vertical hole within 0.00 m, its datum 40.0 m above sea level; or instead: file = ")]
    [InlineData("TVD[m]\n1000,999.1\n1100,1099.3\n", "vertical = true                       # <- confirm: TVD agrees with a vertical hole within 0.90 m; or instead: file = ")]
    [InlineData("TVD[m]\n1000,998.4\n1100,1099\n", "curve = \"true_vertical_depth\"         # <- confirm: TVD departs from a vertical hole by up to 1.60 m; or instead: file = ")]
    [InlineData("ZLOC[ft]\n1000,-3000\n1100,-3200\n", "curve = \"vertical_position\"           # <- confirm: ZLOC departs from a vertical hole by up to 19.52 m; or instead: file = ")]
    public async Task A_depth_curve_says_whether_the_hole_is_vertical(string log, string expected)
    {
        _cli.Folder.Write("well.csv", "DEPT[m]," + log);
        await _cli.RunAsync("init", "well.csv");
        Assert.Contains("[survey]\n" + expected, _cli.Folder.Read("well.toml"), StringComparison.Ordinal);
    }

    [Fact]
    public async Task Units_that_the_file_lacks_are_marked()
    {
        _cli.Folder.Write("well.csv", "MD,DTC,DT,RHOB[g/cm3]\n1000,90,90,2.4\n1001,91,91,2.4\n");
        await _cli.RunAsync("init", "well.csv");
        var text = _cli.Folder.Read("well.toml");
        Assert.Contains("depth = { column = \"MD\", unit = \"m\" }   # <- the file states no unit: confirm\n", text, StringComparison.Ordinal);
        Assert.Contains(
            "compressional = { column = \"DTC\", unit = \"us/ft\" }# <- confirm the unit; compressional slowness or velocity, no unit, 1000.0 to 1001.0; also there: DT (DTC is the more specific name)\n",
            text, StringComparison.Ordinal);
    }

    [Fact]
    public async Task Rivals_for_the_further_roles_are_named_with_the_reason()
    {
        _cli.Folder.Write("well.csv", "DEPT[m],DTS_FAST[us/ft],DTSF[us/ft],DTSS[us/ft],DTST[us/ft],STONELEY[us/ft],ILM[ohm.m],RMED[ohm.m],LLS[ohm.m],SFLU[ohm.m]\n1000,150,150,160,220,221,2,3,4,5\n");
        await _cli.RunAsync("init", "well.csv");
        var text = _cli.Folder.Read("well.toml");
        foreach (var (role, column, rival) in new[] { ("fast_shear", "DTSF", "DTS_FAST"), ("stoneley", "DTST", "STONELEY"), ("medium_resistivity", "RMED", "ILM"), ("shallow_resistivity", "LLS", "SFLU") })
        {
            var line = Assert.Single(text.Split('\n'), l => l.StartsWith($"{role} = \"{column}\"", StringComparison.Ordinal));
            Assert.EndsWith($"; also there: {rival} ({column} is the more specific name)", line, StringComparison.Ordinal);
        }
    }

    [Theory]
    [InlineData("DEPT[ft],DTC[us/ft]\n1000,90\n1000.5,91\n1001,91\n", "# resample = { step = \"0.5 ft\", method = \"linear\", max_gap = \"1 m\" }   # or \"mean\"; one regular depth grid for all curves: the log's depths are even\n")]
    [InlineData("DEPT[m],DTC[us/ft]\n1000,90\n1002,91\n1004,91\n1007.5,91\n", "# resample = { step = \"2 m\", method = \"linear\", max_gap = \"4 m\" }   # or \"mean\"; one regular depth grid for all curves: the log's depths run in steps of 2 to 3.5 m\n")]
    public async Task A_regular_grid_is_offered_with_the_logs_own_step_and_taken_by_check(string log, string expected)
    {
        _cli.Folder.Write("well.csv", log);
        await _cli.RunAsync("init", "well.csv");
        var text = _cli.Folder.Read("well.toml");
        Assert.Contains(expected, text, StringComparison.Ordinal);
        _cli.Folder.Write("well.toml", text.Replace("# resample", "resample", StringComparison.Ordinal));
        Assert.DoesNotContain("resample", (await _cli.RunAsync("check", "well.toml")).Error, StringComparison.Ordinal);
    }

    [Theory]
    [InlineData("DTSF[us/ft],DTSS[us/ft]\n1000,150,160\n", "# shear_from = \"fast\"                 # <- fast (DTSF), slow (DTSS) or mean: stress or bedding parts the two waves, the isotropic chain takes one; the choice moves Vs by 6.5 % on average\n")]
    [InlineData("DTSF[m/s],DTSS[us/m]\n1000,2000,525\n", "the choice moves Vs by 4.9 % on average\n")]
    [InlineData("DTSF,DTSS\n1000,160,150\n", "the choice moves Vs by 6.5 % on average; the fast one is slower: are they exchanged?\n")]
    [InlineData("DTSS[us/ft]\n1000,150\n", "# shear_from = \"slow\"                 # <- of the two shear waves only the slow one is there (DTSS)\n")]
    [InlineData("DTSM[us/ft],DTSF[us/ft]\n1000,150,160\n", "# shear_from = \"fast\"                 # DTSM serves below; to take another, remove shear there: of the two shear waves only the fast one is there (DTSF)\n")]
    public async Task Where_shear_comes_in_two_waves_the_user_is_asked_which_one_serves(string log, string expected)
    {
        _cli.Folder.Write("well.csv", "DEPT[m]," + log);
        await _cli.RunAsync("init", "well.csv");
        var text = _cli.Folder.Read("well.toml");
        Assert.Contains(expected, text, StringComparison.Ordinal);
        Assert.DoesNotContain("[prediction]", text, StringComparison.Ordinal);
    }

    [Fact]
    public async Task The_run_says_which_shear_wave_served()
    {
        _cli.Folder.Write("well.csv", WellText.Logs.Replace("DTS[us/ft]", "DTSF[us/ft],DTSS[us/ft]", StringComparison.Ordinal).Replace(",2.", ",170,2.", StringComparison.Ordinal));
        await _cli.RunAsync("init", "well.csv");
        Fill("well.toml");
        Assert.Contains("\nshear_from = \"fast\" ", _cli.Folder.Read("well.toml").Split("[logs.curves]")[0], StringComparison.Ordinal);
        var result = await _cli.RunAsync("run", "well.toml");
        Assert.Equal(0, result.Code);
        const string Served = "note: shear: fast_shear (DTSF in well.csv) serves; the fast one is 5.3 % faster on average over 5 samples than the slow one";
        Assert.Contains(Served, result.Error, StringComparison.Ordinal);
        Assert.Contains(Served, _cli.Folder.Read("well-results/run.json"), StringComparison.Ordinal);
    }

    [Fact]
    public async Task An_existing_well_file_is_replaced_only_when_asked()
    {
        _cli.Folder.Write("well.csv", WellText.Logs);
        _cli.Folder.Write("well.toml", "mine");
        var refused = await _cli.RunAsync("init", "well.csv");
        Assert.Equal((2, "", "error: found well.toml already there; use --force to replace it\n"), (refused.Code, refused.Output, refused.Error));
        Assert.Equal("mine", _cli.Folder.Read("well.toml"));
        Assert.Equal(0, (await _cli.RunAsync("init", "well.csv", "--force")).Code);
        Assert.StartsWith("# Starter well file for well.csv.", _cli.Folder.Read("well.toml"), StringComparison.Ordinal);
    }

    [Theory]
    [InlineData("nope.las", "nope.las: error: file not found\n")]
    [InlineData("well.toml", "well.toml: error: found a well file, expected a log file (CSV or LAS 2.0); to run a well file: depthstress run well.toml\n")]
    [InlineData("folder", "folder: error: found a folder, expected a log file\n")]
    public async Task Something_else_than_a_log_file_is_refused(string name, string expected)
    {
        _cli.Folder.Write("well.toml", WellText.Sound);
        _cli.Folder.Write("folder/x", "");
        var result = await _cli.RunAsync("init", name);
        Assert.Equal((2, "", expected), (result.Code, result.Output, result.Error));
    }

    [Fact]
    public async Task Odd_names_stay_sound_in_the_well_file()
    {
        _cli.Folder.Write("l\u00f8g \"q\" \\ #.csv", WellText.Logs.Replace("GR[gAPI]", "\"G\"\"R[gAPI]\"", StringComparison.Ordinal));
        Assert.Equal(0, (await _cli.RunAsync("init", "l\u00f8g \"q\" \\ #.csv")).Code);
        Fill("l\u00f8g \"q\" \\ #.toml");
        var result = await _cli.RunAsync("check", "l\u00f8g \"q\" \\ #.toml");
        Assert.Equal((0, ""), (result.Code, result.Error));
    }

    [Fact]
    public async Task The_starter_for_the_sample_well_runs_once_its_marked_lines_are_filled_in()
    {
        SampleLogs.Write(_cli.Folder.Of("logs"));
        Assert.Equal(0, (await _cli.RunAsync("init", "logs/quillback-4.las")).Code);
        Assert.Contains("gaps = \"linear\"                     # <- gaps in density are an error unless bridged: found ", Fill("quillback-4.toml"), StringComparison.Ordinal);
        var result = await _cli.RunAsync("run", "quillback-4.toml");
        Assert.Equal(0, result.Code);
        Assert.DoesNotContain(": error: ", result.Error, StringComparison.Ordinal);
        Assert.Contains("depth.csv", _cli.Files("quillback-4-results").Keys);
        Assert.Contains("whole log", result.Output, StringComparison.Ordinal);
    }

    [Fact]
    public async Task The_sections_that_the_starter_offers_are_taken_by_check_as_they_stand()
    {
        SampleLogs.Write(_cli.Folder.Of("logs"));
        Assert.Equal(0, (await _cli.RunAsync("init", "logs/quillback-4.las")).Code);
        var text = Open(Open(Fill("quillback-4.toml"), "[conditioning]"), "[prediction]");
        Assert.Contains("\nshifts = [{ curve = \"density\"", text, StringComparison.Ordinal);
        Assert.Contains("\nshear = \"trained\"", text, StringComparison.Ordinal);
        _cli.Folder.Write("quillback-4.toml", text);
        var result = await _cli.RunAsync("check", "quillback-4.toml");
        Assert.Equal(0, result.Code);
        Assert.DoesNotContain(": error: ", result.Error, StringComparison.Ordinal);
        Assert.Matches(@"\n *density +RHOB .* edited [0-9.]+ *\n", result.Output); // all of it is shifted
        var lines = result.Output.Split('\n').Select(l => l.Trim()).ToList();
        Assert.StartsWith(">trained (on this well), ", lines[lines.IndexOf("[prediction] shear") + 1], StringComparison.Ordinal);
        Assert.DoesNotContain("trained", lines[lines.IndexOf("[prediction] density") + 1], StringComparison.Ordinal);
    }

    [Fact]
    public async Task A_published_relation_is_offered_where_most_of_the_shear_is_missing_and_check_takes_it()
    {
        _cli.Folder.Write("well.csv", WellText.Logs.Replace("DTS[us/ft]", "ODD", StringComparison.Ordinal));
        await _cli.RunAsync("init", "well.csv");
        var text = Open(Fill("well.toml"), "[prediction]");
        Assert.Contains("\nshear = \"castagna-1985-mudrock\"", text, StringComparison.Ordinal);
        _cli.Folder.Write("well.toml", text);
        var check = await _cli.RunAsync("check", "well.toml");
        Assert.Equal(0, check.Code);
        Assert.Matches(@"\n *shear .* predicted 100\.0 *\n", check.Output); // a curve without a column
    }

    /// <summary>Takes the comment signs from a section that the starter offers, down to the next empty line.</summary>
    private static string Open(string text, string section)
    {
        var lines = text.Split('\n');
        var first = Array.FindIndex(lines, l => l.TrimStart('#', ' ').StartsWith(section, StringComparison.Ordinal));
        Assert.True(first >= 0, $"no {section} in the starter");
        for (var i = first; i < lines.Length && lines[i].Length > 0; i++) lines[i] = lines[i].TrimStart('#', ' ');
        return string.Join('\n', lines);
    }

    /// <summary>Takes the comment sign from the marked lines, as a user would; onshore.</summary>
    private string Fill(string name)
    {
        var lines = _cli.Folder.Read(name).Split('\n').Select(line =>
            line.StartsWith("# ", StringComparison.Ordinal) && line.Contains("# <-", StringComparison.Ordinal) && !line.Contains("offshore", StringComparison.Ordinal)
                ? line[2..]
                : line.StartsWith("# water_table", StringComparison.Ordinal) ? line[2..] : line);
        return File.ReadAllText(_cli.Folder.Write(name, string.Join('\n', lines)));
    }
}
