using DepthStress.Core.Diagnostics;
using DepthStress.Files.Reading;

namespace DepthStress.Tests.Reading;

public class CsvLogReaderTests
{
    [Fact]
    public void Columns_hold_the_values_as_read_with_units_and_positions()
    {
        var file = LogReading.Csv("DEPT[m],DT (us/ft),RHOB\n100,85.5,2.45\n100.5,1e2,-0.5\n").Clean();
        Assert.Equal(("a.csv", LogFormat.Csv, null, null, 0, 2), (file.Name, file.Format, file.WellName, file.NullValue, file.DepthColumn, file.Rows));
        Assert.Equal(["DEPT", "DT", "RHOB"], file.Columns.Select(c => c.Name));
        Assert.Equal(["m", "us/ft", null], file.Columns.Select(c => c.Unit));
        Assert.Equal([100, 100.5], file.Columns[0].Values);
        Assert.Equal([85.5, 100], file.Columns[1].Values);
        Assert.Equal([2.45, -0.5], file.Columns[2].Values);
        Assert.Equal(new SourcePosition("a.csv", 1, 20), file.Columns[2].Position);
    }

    [Theory]
    [InlineData("\n")]
    [InlineData("\r\n")]
    [InlineData("\r")]
    public void Any_line_end_reads_the_same_and_the_last_one_may_lack(string end)
    {
        var file = LogReading.Csv($"DEPT,GR{end}1,10{end}2,20").Clean();
        Assert.Equal([10, 20], file.Columns[1].Values);
    }

    [Fact]
    public void A_byte_order_mark_is_no_part_of_the_first_name() =>
        Assert.Equal("DEPT", LogReading.Csv("\ufeffDEPT,GR\n1,2\n").Clean().Columns[0].Name);

    [Fact]
    public void Empty_lines_and_lines_of_blanks_are_passed_over_and_line_numbers_stay_exact() =>
        LogReading.Csv("\nDEPT,GR\n\n1,10\n  \n2,x\n")
            .IsRefusedWith("a.csv(6,3): error: column \"GR\": found \"x\", expected a number");

    [Theory]
    [InlineData("-999.25")]
    [InlineData("-999.2500")]
    [InlineData("-9.9925e2")]
    [InlineData("-999")]
    [InlineData("-999.0")]
    [InlineData("-9999")]
    [InlineData("-9999.00")]
    [InlineData("")]
    [InlineData("  ")]
    [InlineData("NaN")]
    [InlineData("nan")]
    public void Missing_value_codes_and_empty_cells_become_NaN_and_are_counted(string cell)
    {
        var column = LogReading.Csv($"DEPT,GR\n1,10\n2,{cell}\n").Clean().Columns[1];
        Assert.Equal([10, double.NaN], column.Values);
        Assert.Equal(1, column.Missing);
    }

    // The neighbours of 2^64 and 2^53, where an integer of 64 or 53 bits gives out.
    [Theory]
    [InlineData("18446744073709551617", 18446744073709551616.0)]
    [InlineData("1844674407370955161.7", 1844674407370955264.0)]
    [InlineData("0.000000000000000000000000018446744073709551617", 1.8446744073709552e-26)]
    [InlineData("9007199254740993", 9007199254740992.0)]
    [InlineData("9007199254740995", 9007199254740996.0)]
    [InlineData("-.5", -0.5)]
    [InlineData("+5.", 5.0)]
    [InlineData("4.9e-324", 5e-324)]
    public void Numbers_with_many_digits_or_odd_forms_are_rounded_correctly(string cell, double expected) =>
        Assert.Equal(expected, LogReading.Csv($"DEPT,GR\n1,{cell}\n").Clean().Columns[1].Values[0]);

    [Theory]
    [InlineData("-999.3")]
    [InlineData("-99.925")]
    [InlineData("999.25")]
    [InlineData("-1000")]
    public void Values_near_a_missing_value_code_are_kept(string cell) =>
        Assert.Equal(0, LogReading.Csv($"DEPT,GR\n1,10\n2,{cell}\n").Clean().Columns[1].Missing);

    [Fact]
    public void A_code_for_one_column_holds_for_that_column_alone()
    {
        var options = new LogReadOptions { MissingByColumn = new Dictionary<string, MissingCodes> { ["gr"] = new([0], []), ["absent"] = new([7], []) } };
        var file = LogReading.Csv("DEPT,GR,DT\n1,0,0\n2,7,7\n", options).Clean();
        Assert.Equal([1, 0], new[] { file.Columns[1].Missing, file.Columns[2].Missing });
        Assert.Equal([double.NaN, 7], file.Columns[1].Values);
    }

    [Theory]
    [InlineData("GR,DEPTH")]
    [InlineData("GR,dept")]
    [InlineData("GR,MD [m]")]
    [InlineData("GR,Measured Depth (ft)")]
    [InlineData("GR,DEPTH_MD")]
    [InlineData("GR,TDEP")]
    public void Usual_names_of_measured_depth_are_found(string header) =>
        Assert.Equal(1, LogReading.Csv($"{header}\n5,1\n4,2\n").Clean().DepthColumn);

    [Fact]
    public void The_depth_column_can_be_named()
    {
        var options = new LogReadOptions { DepthColumn = "z" };
        Assert.Equal(1, LogReading.Csv("DEPT,Z\n5,1\n4,2\n", options).Clean().DepthColumn);
    }

    [Fact]
    public void Without_a_depth_column_the_file_cannot_be_used()
    {
        var read = LogReading.Csv("A,B\n1,5\n2,4\n");
        Assert.Null(read.File);
        Assert.Equal(
            ["a.csv(1): error: found no depth column, expected one named DEPT, DEPTH, MD, MEASURED_DEPTH, DEPTH_MD, TDEP, MD_DEPTH, MEASDEPTH or MEASUREDDEPTH"],
            read.Messages);
    }

    [Fact]
    public void A_unit_suffix_is_a_unit_only_where_it_is_asked_for()
    {
        var options = new LogReadOptions { UnitSuffixes = true };
        var file = LogReading.Csv("md_m,inclination_deg\n1,5\n2,4\n", options with { DepthNames = ["md"] }).Clean();
        Assert.Equal([("md", "m"), ("inclination", "deg")], file.Columns.Select(c => (c.Name, c.Unit!)));
        Assert.Equal("DT_M", LogReading.Csv("DEPT,DT_M\n1,5\n").Clean().Columns[1].Name);
    }

    [Fact]
    public void A_unit_row_gives_the_units()
    {
        var file = LogReading.Csv("DEPT,DT,GR\nFEET,us/ft,\n1,80,50\n").Clean();
        Assert.Equal(["FEET", "us/ft", null], file.Columns.Select(c => c.Unit));
        Assert.Equal(1, file.Rows);
    }

    [Fact]
    public void A_row_of_words_without_a_length_unit_under_depth_is_no_unit_row() =>
        LogReading.Csv("DEPT,DT\nsec,us/ft\n1,80\n").IsRefusedWith(
            "a.csv(2,1): error: column \"DEPT\": found \"sec\", expected a number",
            "a.csv(2,5): error: column \"DT\": found \"us/ft\", expected a number");

    [Fact]
    public void A_unit_in_the_header_row_outweighs_the_unit_row_and_the_conflict_is_told()
    {
        var read = LogReading.Csv("DEPT[m],DT[us/m]\nm,us/ft\n1,80\n");
        Assert.Equal("us/m", read.Column("DT").Unit);
        Assert.Equal(
            ["a.csv(2): warning: column \"DT\": found the unit \"us/ft\" below \"us/m\" in the header row, took \"us/m\""], read.Messages);
    }

    [Fact]
    public void An_index_in_brackets_belongs_to_the_name()
    {
        var column = LogReading.Csv("DEPT,WAVE[6]\n1,2\n").Clean().Columns[1];
        Assert.Equal(("WAVE[6]", null), (column.Name, column.Unit));
    }

    [Fact]
    public void Blank_and_equal_names_are_made_unique_with_a_note()
    {
        var read = LogReading.Csv("DEPT,,GR,gr,GR:1\n1,2,3,4,5\n");
        Assert.Equal(["DEPT", "UNKNOWN", "GR:2", "gr:3", "GR:1"], read.File!.Columns.Select(c => c.Name));
        Assert.Equal(
            [
                "a.csv(1,6): note: found a column without a name, called it UNKNOWN",
                "a.csv(1,7): note: found the name \"GR\" more than once, called this column \"GR:2\"",
                "a.csv(1,10): note: found the name \"gr\" more than once, called this column \"gr:3\"",
            ],
            read.Messages);
    }

    [Fact]
    public void Control_characters_are_removed_from_names() =>
        Assert.Equal("GR", LogReading.Csv("DEPT,G\u0007\u001bR\n1,2\n").Clean().Columns[1].Name);

    [Fact]
    public void Quoted_names_and_numbers_are_read()
    {
        var file = LogReading.Csv("\"DEPT\",\"GR, edited\"\n\"1\",\"10\"\n").Clean();
        Assert.Equal("GR, edited", file.Columns[1].Name);
        Assert.Equal([10], file.Columns[1].Values);
    }

    [Fact]
    public void A_column_without_values_is_a_warning()
    {
        var read = LogReading.Csv("DEPT,GR\n1,-999.25\n2,\n");
        Assert.Equal(["a.csv(1,6): warning: column \"GR\" has no values, all are missing"], read.Messages);
        Assert.Equal(2, read.Column("GR").Missing);
    }

    [Fact]
    public void Latin_letters_in_a_header_are_read_with_a_note()
    {
        var read = LogReading.Bytes([.. "DEPT,DT["u8, 0xB5, .. "s/ft]\n1,2\n"u8], "a.csv");
        Assert.Equal("\u00b5s/ft", read.File!.Columns[1].Unit);
        Assert.Equal(["a.csv(1): note: found bytes that are not UTF-8, read them by code page 1252"], read.Messages);
    }
}
