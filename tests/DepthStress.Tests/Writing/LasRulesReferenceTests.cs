using System.Globalization;
using System.Text.RegularExpressions;
using DepthStress.Core.Model;
using DepthStress.Core.Quantities;
using DepthStress.Files.Writing;

namespace DepthStress.Tests.Writing;

/// <summary>
/// The rules of LAS Version 2.0 (Canadian Well Logging Society, "LAS Version 2.0: A Digital Standard for Logs"), each by name;
/// wording of the rules from memory, forms as in the standard's own example files.
/// </summary>
public sealed class LasRulesReferenceTests
{
    private static string Las(UnitSystem units = UnitSystem.Metric, int count = 8, double step = 0.5, string name = "Tiny 1") =>
        TinyWell.Text(s => ResultsLas.Write(TinyWell.Model(name, count: count, step: step), units, s));

    /// <summary>The lines of a section, without its title.</summary>
    private static List<string> Section(string las, char letter) =>
        [.. las.TrimEnd('\n').Split('\n').SkipWhile(l => !l.StartsWith("~" + letter, StringComparison.Ordinal)).Skip(1).TakeWhile(l => l[0] != '~')];

    private static (string Mnemonic, string Unit, string Data, string Description) Parse(string line)
    {
        var point = line.IndexOf('.', StringComparison.Ordinal);
        var blank = line.IndexOf(' ', point);
        var colon = line.LastIndexOf(':');
        return (line[..point].Trim(), line[(point + 1)..blank], line[blank..colon].Trim(), line[(colon + 1)..].Trim());
    }

    private static (string Mnemonic, string Unit, string Data, string Description) Entry(string las, char section, string mnemonic) =>
        Section(las, section).Select(Parse).Single(e => e.Mnemonic == mnemonic);

    private static string[][] Rows(string las) => [.. Section(las, 'A').Select(l => l.Split(' '))];

    [Fact]
    public void The_whole_file_is_as_kept() => Golden.Match("results.las", Las());

    [Fact]
    public void Rule_the_version_section_comes_first_and_the_data_section_last() => Assert.Equal(
        ["~V", "~W", "~C", "~P", "~O", "~A"], Las().Split('\n').Where(l => l.StartsWith('~')).Select(l => l[..2]));

    [Fact]
    public void Rule_the_version_section_states_version_and_wrap_mode() => Assert.Equal(
        [("VERS", "", "2.0"), ("WRAP", "", "NO")], Section(Las(), 'V').Select(Parse).Select(e => (e.Mnemonic, e.Unit, e.Data)));

    [Fact]
    public void Rule_the_well_section_holds_every_required_mnemonic() => Assert.Superset(
        new HashSet<string> { "STRT", "STOP", "STEP", "NULL", "COMP", "WELL", "FLD", "LOC", "PROV", "CNTY", "STAT", "CTRY", "SRVC", "DATE", "UWI" },
        Section(Las(), 'W').Select(l => Parse(l).Mnemonic).ToHashSet());

    [Theory]
    [InlineData(UnitSystem.Metric, "M")]
    [InlineData(UnitSystem.Field, "FT")]
    public void Rule_start_stop_and_step_have_the_unit_of_the_index_which_is_m_or_ft(UnitSystem units, string unit)
    {
        var las = Las(units);
        Assert.All(["STRT", "STOP", "STEP"], m => Assert.Equal(unit, Entry(las, 'W', m).Unit));
        Assert.Equal(unit, Entry(las, 'C', "DEPT").Unit);
    }

    [Theory]
    [InlineData(UnitSystem.Metric)]
    [InlineData(UnitSystem.Field)]
    public void Rule_start_and_stop_are_the_first_and_last_index_values(UnitSystem units)
    {
        var las = Las(units);
        Assert.Equal(Rows(las)[0][0], Entry(las, 'W', "STRT").Data);
        Assert.Equal(Rows(las)[^1][0], Entry(las, 'W', "STOP").Data);
    }

    [Theory]
    [InlineData(0.5, 8, "0.5000")]
    [InlineData(0.1524, 3000, "0.1524")]
    [InlineData(0.030480, 3000, "0.03048")]
    public void Rule_an_even_step_gives_every_index_value_from_the_start(double step, int count, string expected)
    {
        var las = Las(count: count, step: step);
        Assert.Equal(expected, Entry(las, 'W', "STEP").Data);
        var (start, stated) = (Number(Entry(las, 'W', "STRT").Data), Number(expected));
        var rows = Rows(las);
        // One digit as written: half for the rounding of each side.
        for (var i = 0; i < rows.Length; i++) Assert.Equal(start + (i * stated), Number(rows[i][0]), 1e-4);
    }

    [Fact]
    public void Rule_the_step_is_zero_when_samples_are_uneven()
    {
        var even = TinyWell.Model();
        double[] depths = [.. even.Logs.Depths];
        depths[^1] += 0.25;
        even.Values.Adopt(Core.Logs.Property.MeasuredDepth, depths);
        Assert.Equal(0, Number(Entry(TinyWell.Text(s => ResultsLas.Write(even, UnitSystem.Metric, s)), 'W', "STEP").Data));
    }

    [Fact]
    public void Rule_the_first_curve_is_the_index_and_curves_stand_in_the_order_of_the_data()
    {
        var las = Las();
        var curves = Section(las, 'C').Select(Parse).ToList();
        Assert.Equal("DEPT", curves[0].Mnemonic);
        Assert.Equal(DepthColumns.Numbers.Count(c => c.InLas), curves.Count);
        Assert.All(Rows(las), r => Assert.Equal(curves.Count, r.Length));
        var sv = curves.FindIndex(c => c.Mnemonic == "SV");
        var csv = TinyWell.Text(s => DepthCsv.Write(TinyWell.Model(), UnitSystem.Metric, s)).Split('\n');
        Assert.Equal(csv[1].Split(',')[Array.IndexOf(csv[0].Split(','), "sv_mpa")], Rows(las)[0][sv]);
    }

    [Fact]
    public void Rule_curve_mnemonics_are_unique_and_hold_no_blank_point_or_colon()
    {
        var mnemonics = Section(Las(), 'C').Select(l => Parse(l).Mnemonic).ToList();
        Assert.Equal(mnemonics.Count, mnemonics.Distinct().Count());
        Assert.All(mnemonics, m => Assert.Matches("^[A-Z0-9_]+$", m));
    }

    [Fact]
    public void Rule_every_header_line_has_a_mnemonic_a_point_a_unit_a_blank_data_and_a_colon()
    {
        var las = Las(name: "W: 4.5");
        Assert.All(
            Section(las, 'V').Concat(Section(las, 'W')).Concat(Section(las, 'C')).Concat(Section(las, 'P')),
            l => Assert.Matches(new Regex("^ [A-Z0-9_]+ *\\.[^ :]* .* : [^:]+$"), l));
        Assert.Equal("W: 4.5", Entry(las, 'W', "WELL").Data);
    }

    [Fact]
    public void Rule_units_stand_beside_the_curves_as_text() => Assert.Equal(
        ["M", "MPa", "kPa/m", "g/cm3", ""],
        new[] { "TVD", "SHMIN", "SHMIN_GRADIENT", "SHMIN_EMW", "BIOT" }.Select(m => Entry(Las(), 'C', m).Unit));

    [Fact]
    public void Rule_a_missing_value_is_the_null_value_of_the_well_section()
    {
        var las = Las();
        Assert.Equal("-999.25", Entry(las, 'W', "NULL").Data);
        var vs = Section(las, 'C').FindIndex(l => Parse(l).Mnemonic == "VS");
        Assert.Equal([3], Rows(las).Index().Where(r => r.Item[vs] == "-999.25").Select(r => r.Index));
    }

    [Fact]
    public void Rule_data_are_numbers_only() => Assert.All(
        Rows(Las(UnitSystem.Field, 100)),
        r => Assert.All(r, c => Assert.Matches("^-?[0-9]+(\\.[0-9]+)?$", c)));

    [Theory]
    [InlineData(UnitSystem.Metric)]
    [InlineData(UnitSystem.Field)]
    public void Rule_lines_without_wrap_have_at_most_256_characters(UnitSystem units) =>
        Assert.All(Las(units, 3000, 1).Split('\n'), l => Assert.InRange(l.Length + 2, 0, 256));

    [Fact]
    public void Rule_the_file_is_plain_ascii() =>
        Assert.All(Las(name: "Sk\u00e5l \u4e95\u0007 1"), c => Assert.True(c is '\n' or (>= ' ' and <= '~'), $"U+{(int)c:X4}"));

    [Fact]
    public void The_other_section_carries_the_caution_and_the_parameters_the_datum()
    {
        var las = Las();
        var other = string.Join(' ', Section(las, 'O').Select(l => l.Trim()));
        Assert.Contains(Caution.Text, other, StringComparison.Ordinal);
        Assert.Equal("ROTARY TABLE", Entry(las, 'P', "DATUM").Data);
        Assert.Equal("112.5000", Entry(las, 'P', "DATUM_ELEVATION").Data);
        Assert.Equal("MEASURED DEPTH", Entry(las, 'P', "DEPTH_KIND").Data);
    }

    private static double Number(string text) => double.Parse(text, CultureInfo.InvariantCulture);
}
