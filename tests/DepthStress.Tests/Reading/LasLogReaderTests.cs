using DepthStress.Files.Reading;

namespace DepthStress.Tests.Reading;

public class LasLogReaderTests
{
    private const string Curves = "~C\nDEPT.m:\nGR.gAPI:\n";

    private static LogReading Read(string data, LogReadOptions? options = null) =>
        LogReading.Las($"{LogReading.LasHead}{Curves}~A\n{data}", options);

    [Theory]
    [InlineData("1 10\n2 20\n")]
    [InlineData("   1.0    10\n   2.0    20  \n")]
    [InlineData("1\t10\n2\t20")]
    [InlineData("1 10\r\n2 20\r\n")]
    [InlineData("1 10\r2 20\r")]
    public void Values_are_separated_by_blanks_or_tabs_and_lines_by_any_end(string data)
    {
        var file = Read(data).Clean();
        Assert.Equal((LogFormat.Las, 0, 2), (file.Format, file.DepthColumn, file.Rows));
        Assert.Equal([1, 2], file.Columns[0].Values);
        Assert.Equal([10, 20], file.Columns[1].Values);
    }

    [Theory]
    [InlineData("SPACE")]
    [InlineData("TAB")]
    public void A_delimiter_line_that_says_blank_or_tab_changes_nothing(string delimiter) =>
        Assert.Equal(1, LogReading.Las($"~V\nVERS. 2.0:\nWRAP. NO:\nDLM. {delimiter}:\n~W\nNULL. -1:\n{Curves}~A\n1\t10\n").Clean().Rows);

    [Fact]
    public void The_depth_curve_can_be_named() =>
        Assert.Equal(1, Read("9 1\n8 2\n", new LogReadOptions { DepthColumn = "gr" }).Clean().DepthColumn);

    [Fact]
    public void A_positive_null_value_does_not_hide_a_depth_that_equals_it()
    {
        var file = LogReading.Las($"~V\nVERS. 2.0:\nWRAP. NO:\n~W\nNULL. 999.25:\n{Curves}~A\n999 999.25\n999.25 1\n").Clean();
        Assert.Equal([999, 999.25], file.Columns[0].Values);
        Assert.Equal([double.NaN, 1], file.Columns[1].Values);
    }

    [Fact]
    public void A_byte_order_mark_is_passed_over() =>
        Assert.Equal(1, LogReading.Las($"\ufeff{LogReading.LasHead}{Curves}~A\n1 10\n").Clean().Rows);

    [Fact]
    public void Text_that_is_not_utf8_is_read_by_code_page_1252_with_a_note()
    {
        var read = LogReading.Bytes([.. "~V\nVERS. 2.0:\nWRAP. NO:\n~W\nNULL. -1:\n~C\nDEPT.m:\nDT."u8, 0xB5, .. "s/m:\n~A\n1 2\n"u8], "a.las");
        Assert.Equal("\u00b5s/m", read.File!.Columns[1].Unit);
        Assert.Equal(["a.las: note: found bytes that are not UTF-8, read them by code page 1252"], read.Messages);
    }

    [Fact]
    public void Blank_and_equal_mnemonics_are_made_unique_with_a_note()
    {
        var read = LogReading.Las($"{LogReading.LasHead}~C\nDEPT.m:\n.ohm.m:\nRES.:\nRES.:\n~A\n1 2 3 4\n");
        Assert.Equal(["DEPT", "UNKNOWN", "RES:1", "RES:2"], read.File!.Columns.Select(c => c.Name));
        Assert.Equal(
            [
                "a.las(8,1): note: found a column without a name, called it UNKNOWN",
                "a.las(9,1): note: found the name \"RES\" more than once, called this column \"RES:1\"",
                "a.las(10,1): note: found the name \"RES\" more than once, called this column \"RES:2\"",
            ],
            read.Messages);
    }

    [Fact]
    public void Stated_depths_and_step_that_the_data_bear_out_are_not_mentioned() =>
        Assert.Equal(3, LogReading.Las($"{LogReading.LasHead}STRT.m 1:\nSTOP.m 1.3048:\nSTEP.m 0.1524:\n{Curves}~A\n1 1\n1.1524 1\n1.3048 1\n").Clean().Rows);

    [Fact]
    public void Stated_depths_and_step_that_the_data_deny_are_notes()
    {
        var read = LogReading.Las($"{LogReading.LasHead}STRT.m 0:\nSTOP.m 9:\nSTEP.m 0.5:\n{Curves}~A\n1 1\n1.5 1\n3 1\n");
        Assert.Equal(3, read.File!.Rows);
        Assert.Equal(
            [
                "a.las(6): note: STRT says 0, the data start at 1",
                "a.las(7): note: STOP says 9, the data end at 3",
                "a.las(8): note: STEP says 0.5, the data have steps from 0.5 to 1.5",
            ],
            read.Messages);
    }

    [Fact]
    public void A_step_of_zero_allows_any_steps() =>
        Assert.Equal(3, LogReading.Las($"{LogReading.LasHead}STRT.m 1:\nSTOP.m 3:\nSTEP.m 0:\n{Curves}~A\n1 1\n1.5 1\n3 1\n").Clean().Rows);

    [Fact]
    public void A_curve_without_values_is_a_warning() => Assert.Equal(
        ["a.las(8,1): warning: column \"GR\" has no values, all are missing"], Read("1 -999.25\n2 NaN\n").Messages);

    [Fact]
    public void Missing_header_lines_are_told_and_assumed()
    {
        var read = LogReading.Las($"~W\nSTRT.m 1:\n{Curves}~A\n1 -999\n2 5\n");
        Assert.Equal(
            [
                "a.las: warning: found no VERS line, expected LAS 2.0; read as LAS 2.0",
                "a.las: warning: found no WRAP line, expected WRAP NO; read as not wrapped",
                "a.las: note: found no NULL line; -999.25, -999 and -9999 are read as missing",
            ],
            read.Messages);
        Assert.Equal(1, read.Column("GR").Missing);
    }

    [Fact]
    public void Odd_header_lines_are_warnings()
    {
        var read = LogReading.Las($"~V\nVERS. two:\nWRAP. NO:\n~W\nNULL. none:\nSTEP. a step\nno dot\n~Tops\nx\n{Curves}~A\n1 2\n");
        Assert.Equal(
            [
                "a.las(2): warning: found the version \"two\", read as LAS 2.0",
                "a.las(5): warning: found NULL \"none\", expected a number",
                "a.las(6): warning: found \"STEP. a step\" without a colon, expected MNEM.UNIT DATA : DESCRIPTION",
                "a.las(6): warning: found STEP \"a step\", expected a number",
                "a.las(7): warning: found \"no dot\" without a dot, expected MNEM.UNIT DATA : DESCRIPTION; the line is left out",
                "a.las(8,1): note: section \"~Tops\" is not read",
            ],
            read.Messages);
        Assert.Equal(1, read.File!.Rows);
    }
}
