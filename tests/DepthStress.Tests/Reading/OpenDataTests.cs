using System.Globalization;
using DepthStress.Core.Diagnostics;
using DepthStress.Files.Reading;
using DepthStress.Files.Setup;

namespace DepthStress.Tests.Reading;

/// <summary>
/// Real files, read or refused for the right reason. The data are no part of the project: three wells of the FORCE 2020
/// data set (Bormann et al. 2020, doi 10.5281/zenodo.4351156, NLOD 2.0) and test examples of a public LAS reader (MIT).
/// </summary>
public class OpenDataTests
{
    private const string Descending = "depth decreases, expected increasing (from 1670 to 1669.75)";

    /// <summary>The first error of every sample, or rows x columns where it can be read.</summary>
    private static readonly Dictionary<string, string> Samples = new(StringComparer.Ordinal)
    {
        ["comma_decimal_mark.las"] = "(45,39): error: column \"SFLU\": found the decimal comma in \"123,420\", expected a decimal point",
        ["encodings_cp1252.las"] = $"(45): error: {Descending}",
        ["encodings_utf16le.las"] = "(1,1): error: found UTF-16 text, expected UTF-8",
        ["encodings_utf16lebom.las"] = "(1,1): error: found UTF-16 text, expected UTF-8",
        ["encodings_utf8wbom.las"] = $"(45): error: {Descending}",
        ["excess_curves.las"] = "(27): error: found 4 values, expected 6 (one for each column)",
        ["header_only.las"] = ": error: found no ~A section, expected the data in it",
        ["index_null.las"] = ": 3 x 4",
        ["missing_a_section.las"] = ": error: found no data rows, expected at least one",
        ["missing_null.las"] = $"(44): error: {Descending}",
        ["missing_vers.las"] = $"(44): error: {Descending}",
        ["missing_wrap.las"] = $"(44): error: {Descending}",
        ["mnemonic_case.las"] = $"(44): error: {Descending}",
        ["mnemonic_duplicate.las"] = $"(45): error: {Descending}",
        ["mnemonic_duplicate2.las"] = $"(43): error: {Descending}",
        ["mnemonic_good.las"] = $"(45): error: {Descending}",
        ["mnemonic_leading_period.las"] = $"(45): error: {Descending}",
        ["mnemonic_missing.las"] = $"(45): error: {Descending}",
        ["mnemonic_missing_multiple.las"] = $"(45): error: {Descending}",
        ["not_a_las_file.las"] = "(1,1): error: found \"100.0,  0.6300,  302.1900\" before the first section, expected a line that starts with ~",
        ["null_policy_(null).las"] = "(46,18): error: column \"RHOB\": found \"(null)\", expected a number",
        ["null_policy_-999.25.las"] = $"(45): error: {Descending}",
        ["null_policy_9999.las"] = $"(45): error: {Descending}",
        ["null_policy_ERR.las"] = "(46,24): error: column \"RHOB\": found \"ERR\", expected a number",
        ["null_policy_dashes.las"] = "(44,18): error: column \"RHOB\": found \"-\", expected a number",
        ["null_policy_ind.las"] = "(21,31): error: column \"CN\": found \"-1.#IND0000\", expected a number",
        ["null_policy_runon.las"] = "(33): error: found 6 values, expected 7 (one for each column)",
        ["sample_2.0-small-neg-values.las"] = $"(46): error: {Descending}",
        ["sample_2.0.las"] = $"(46): error: {Descending}",
        ["sample_2.0_based.las"] = ": 6 x 3",
        ["sample_2.0_empty_other_section.las"] = $"(44): error: {Descending}",
        ["sample_2.0_inf_api_leading_zero.las"] = $"(46): error: {Descending}",
        ["sample_2.0_inf_uwi.las"] = $"(46): error: {Descending}",
        ["sample_2.0_inf_uwi_leading_zero.las"] = $"(46): error: {Descending}",
        ["sample_2.0_minimal.las"] = "(28): error: depth decreases, expected increasing (from 635 to 634.875)",
        ["sample_2.0_tab_dlm.las"] = $"(47): error: {Descending}",
        ["sample_2.0_universal_newline.las"] = $"(46): error: {Descending}",
        ["sample_2.0_wrapped.las"] = "(3): error: found WRAP YES, expected WRAP NO (wrapped files are not read yet)",
        ["sample_2.0_wrong_stop_value.las"] = $"(46): error: {Descending}",
        ["sample_null.las"] = $"(45): error: {Descending}",
        ["sample_rev.las"] = "(45): error: depth decreases, expected increasing (from 1670 to 1660)",
        ["sample.las_units-brackets.csv"] = $"(3): error: {Descending}",
        ["sample.las_units-line.csv"] = $"(4): error: {Descending}",
        ["sample.las_units-none.csv"] = $"(3): error: {Descending}",
        ["sample.las_units-parentheses.csv"] = $"(3): error: {Descending}",
    };

    [OpenDataFact]
    public void Every_sample_is_read_or_refused_for_the_right_reason()
    {
        var folder = Path.Combine(OpenDataFactAttribute.Folder, "las-samples");
        var found = Directory.GetFiles(folder).Select(Path.GetFileName).Where(f => f!.EndsWith(".las", StringComparison.Ordinal) || f.EndsWith(".csv", StringComparison.Ordinal));
        Assert.Equal(Samples.Keys.Order(StringComparer.Ordinal), found.Order(StringComparer.Ordinal));
        Assert.Equal(Samples.Select(s => s.Key + s.Value), Samples.Keys.Select(f => Outcome(folder, f)));
    }

    [OpenDataFact]
    public void The_wells_are_read_as_a_plain_split_of_their_lines_reads_them()
    {
        var paths = Directory.GetFiles(Path.Combine(OpenDataFactAttribute.Folder, "wells"), "*.las");
        Assert.Equal(3, paths.Length);
        foreach (var path in paths)
        {
            var bag = new DiagnosticBag();
            var file = LogFileReader.Read(path, "well", new LogReadOptions(), bag)!;

            // What the README of the data says of all three: the stated STOP is not the last index.
            Assert.StartsWith("STOP says", Assert.Single(bag.Items, d => d.Severity == Severity.Note).Text, StringComparison.Ordinal);
            Assert.Single(bag.Items);
            var lines = File.ReadAllLines(path);
            Assert.Equal(lines.Single(l => l.StartsWith("WELL.", StringComparison.Ordinal))[5..].Split(':')[0].Trim(), file.WellName);
            Assert.Equal("ohm.m", file.Columns.Single(c => c.Name == "RDEP").Unit);
            var rows = lines.SkipWhile(l => !l.StartsWith("~A", StringComparison.Ordinal)).Skip(1).ToArray();
            Assert.Equal((rows.Length, new FileInfo(path).Length), (file.Rows, file.Bytes));
            for (var r = 0; r < rows.Length; r++)
            {
                var cells = rows[r].Split(' ', StringSplitOptions.RemoveEmptyEntries);
                Assert.Equal(cells.Length, file.Columns.Count);
                for (var c = 0; c < cells.Length; c++)
                {
                    var expected = double.Parse(cells[c], CultureInfo.InvariantCulture);
                    Assert.Equal(expected == -999.25 ? double.NaN : expected, file.Columns[c].Values[r]);
                }
            }
        }
    }

    /// <summary>All three are vertical; their z_loc is in m, negative below the sea, though the files state no unit.</summary>
    [OpenDataFact]
    public void The_wells_own_positions_agree_with_vertical_holes()
    {
        foreach (var path in Directory.GetFiles(Path.Combine(OpenDataFactAttribute.Folder, "wells"), "*.las"))
        {
            var file = LogFileReader.Read(path, "well", new LogReadOptions(), new DiagnosticBag())!;
            Assert.Contains("# <- confirm: z_loc agrees with a vertical hole within 0.", StarterFile.For(file), StringComparison.Ordinal);
        }
    }

    private static string Outcome(string folder, string name)
    {
        var bag = new DiagnosticBag();
        var file = LogFileReader.Read(Path.Combine(folder, name), name, new LogReadOptions(), bag);
        return file is not null
            ? string.Create(CultureInfo.InvariantCulture, $"{name}: {file.Rows} x {file.Columns.Count}")
            : bag.Items.First(d => d.Severity == Severity.Error).ToString();
    }
}
