namespace DepthStress.Tests.Reading;

/// <summary>
/// The rules for the data section of the standard: Canadian Well Logging Society, LAS version 2.0, sections "~A (ASCII log
/// data)", "~V (version information)" and "~W (well information)" (in own words, from memory; example values are our own).
/// DLM was added by version 3.0 and is found in files of version 2.0.
/// </summary>
public class LasDataReferenceTests
{
    private static LogReading Read(string version, string well, string data, string curves = "DEPT.m:\nGR.gAPI:\n") =>
        LogReading.Las($"~V\nVERS. 2.0:\nWRAP. NO:\n{version}~W\nNULL. -999.25:\n{well}~C\n{curves}~A\n{data}");

    // "~A": values are parted by one or more blanks.
    [Fact]
    public void Blanks_part_the_values() => Assert.Equal([10, 20], Read("", "", "1    10\n   2 20   \n").Clean().Columns[1].Values);

    // "~A": the data section is the last.
    [Theory]
    [InlineData("~Parameter\nBS.in 8.5:\n", "~Parameter")]
    [InlineData("~Tops\nany text\n", "~Tops")]
    public void Other_sections_after_the_data_are_passed_over_with_a_note(string section, string title) => Assert.Equal(
        [$"a.las(11): note: section \"{title}\" after the data is not read"], Read("", "", $"1 10\n{section}").Messages);

    // "~A": embedded blank lines are passed over.
    [Fact]
    public void Blank_lines_are_passed_over() => Assert.Equal(2, Read("", "", "\n1 10\n\n\n2 20\n\n").Clean().Rows);

    // "~W": STRT is the first and STOP the last depth, either way round; STEP is negative where depth decreases.
    [Fact]
    public void A_file_logged_upwards_bears_out_its_header()
    {
        var read = Read("", "STRT.m 30:\nSTOP.m 29:\nSTEP.m -0.5:\n", "30 3\n29.5 2\n29 1\n");
        Assert.Equal([1, 2, 3], read.Column("GR").Values);
        Assert.Equal(["a.las(14): note: depth decreases throughout (from 30 to 29), the rows are turned round"], read.Messages);
    }

    [Fact]
    public void A_step_of_the_wrong_sign_is_noted() => Assert.Equal(
        ["a.las(6): note: STEP says -0.5, the data have steps from 0.5 to 0.5"], Read("", "STEP.m -0.5:\n", "1 3\n1.5 2\n2 1\n").Messages);

    // "~W": a STEP of 0 says that the steps differ.
    [Fact]
    public void A_step_of_zero_says_nothing() => Assert.Empty(Read("", "STEP.m 0:\n", "1 3\n1.5 2\n9 1\n").Messages);

    // "~C": the index is a depth or a time; only depth is read here.
    [Theory]
    [InlineData("ETIM.s:", " in s")]
    [InlineData("TIME.ms:", " in ms")]
    [InlineData("DATE.:", "")]
    public void An_index_of_time_is_refused(string curve, string unit) => Read("", "", "1 10\n", $"{curve}\nGR.gAPI:\n").IsRefusedWith(
        $"a.las(7,1): error: found the index \"{curve.Split('.')[0]}\"{unit}, a time; expected a depth (logs over time are not read)");

    // DLM: SPACE, TAB or COMMA; an empty field between two delimiters is a missing value.
    [Theory]
    [InlineData("DLM. COMMA:\n", "1,,3\n2, 20 ,4\n")]
    [InlineData("DLM. TAB:\n", "1\t\t3\n2\t20\t4\n")]
    [InlineData("DLM. COMMA:\n", "1,\"\",3,\n\"2\",\"20\",4,\n")]
    public void A_stated_delimiter_parts_the_values_and_may_leave_one_empty(string version, string data)
    {
        var file = Read(version, "", data, "DEPT.m:\nGR.gAPI:\nDT.us/m:\n").Clean();
        Assert.Equal([double.NaN, 20], file.Columns[1].Values);
        Assert.Equal([3, 4], file.Columns[2].Values);
    }

    [Theory]
    [InlineData("", "1, 10\n2, 20\n", "a.las(9): note: found ',' between the values, not blanks, read as such")]
    [InlineData("DLM. SPACE:\n", "1,10\n2,20\n", "a.las(10): note: found ',' between the values, not the stated blanks, read as such")]
    [InlineData("DLM. COMMA:\n", "1 10\n2 20\n", "a.las(10): note: found blanks between the values, not the stated ',', read as such")]
    [InlineData("DLM. TAB:\n", "1 10\n2 20\n", "a.las(10): note: found blanks between the values, not the stated tabs, read as such")]
    public void A_delimiter_that_no_row_fits_gives_way_to_one_that_does(string version, string data, string note)
    {
        var read = Read(version, "", data);
        Assert.Equal([10, 20], read.Column("GR").Values);
        Assert.Equal([note], read.Messages);
    }

    [Theory]
    [InlineData("1,5 10,25\n2,5 20\n")]
    [InlineData("1,5\t10,250\n2,5\t20,000\n")]
    public void Decimal_commas_that_can_be_nothing_else_are_read_with_a_note(string data)
    {
        var read = Read("", "", data);
        Assert.Equal([1.5, 2.5], read.Column("DEPT").Values);
        Assert.Equal([10.25, 20], read.Column("GR").Values);
        Assert.Equal(["a.las(9): note: found decimal commas in the data, read as such"], read.Messages);
    }

    [Fact]
    public void A_point_further_down_in_a_file_of_decimal_commas_is_shown_in_both_readings()
    {
        var rows = string.Concat(Enumerable.Range(1, 60).Select(i => FormattableString.Invariant($"{i} 0,5\n")));
        Assert.Equal(
            ["a.las(70,4): error: column \"GR\": found \"1.234\", which is 1.234 with a decimal point or 1234 with a thousands separator; expected a decimal comma"],
            Read("", "", rows + "61 1.234\n").Errors);
    }

    [Fact]
    public void Commas_that_may_all_be_thousands_separators_are_errors() => Assert.StartsWith(
        "a.las(10,1): error: column \"DEPT\": found \"1,000\", which is 1.000 with a decimal comma or 1000 with a thousands separator",
        Read("", "", "1,000 2,500\n2,000 3,500\n").Errors[0], StringComparison.Ordinal);
}
