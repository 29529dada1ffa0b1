using System.Text;
using DepthStress.Files.Reading;

namespace DepthStress.Tests.Reading;

public class CsvLogErrorTests
{
    [Fact]
    public void A_delimiter_inside_quotes_is_none() =>
        Assert.Equal("A;B;C", LogReading.Csv("DEPT,\"A;B;C\"\n1,2\n").Clean().Columns[1].Name);

    [Fact]
    public void A_quoted_decimal_comma_is_told_as_such() =>
        LogReading.Csv("DEPT,GR\n1,\"85,3\"\n").IsRefusedWith(
            "a.csv(2,3): error: column \"GR\": found the decimal comma in \"85,3\", expected a decimal point");

    [Theory]
    [InlineData("abc", "abc")]
    [InlineData("1.2.3", "1.2.3")]
    [InlineData("12 13", "12 13")]
    [InlineData("1e", "1e")]
    [InlineData("0x1F", "0x1F")]
    [InlineData("=1+1", "=1+1")]
    [InlineData("<b>1</b>", "<b>1</b>")]
    [InlineData("Infinity", "Infinity")]
    [InlineData("1e999", "1e999")]
    [InlineData("1\u0007x", "1x")]
    [InlineData("\u0661\u0662", "\u0661\u0662")]
    [InlineData("a123456789b123456789c123456789d123456789e", "a123456789b123456789c123456789d123456789...")]
    public void Cells_that_are_no_number_are_quoted(string cell, string quoted) =>
        LogReading.Csv($"DEPT,GR\n1,10\n2,{cell}\n").IsRefusedWith(
            $"a.csv(3,3): error: column \"GR\": found \"{quoted}\", expected a number");

    [Fact]
    public void The_column_of_a_bad_cell_counts_characters_and_quotes() =>
        LogReading.Csv("DEPT,A,B\n1,\"2\",x\n2,\u00b5,3\n").IsRefusedWith(
            "a.csv(2,7): error: column \"B\": found \"x\", expected a number",
            "a.csv(3,3): error: column \"A\": found \"\u00b5\", expected a number");

    [Fact]
    public void Ragged_rows_tell_line_found_and_expected() =>
        LogReading.Csv("DEPT,GR,DT\n1,2,3\n2,3\n3.5,4.5,5.5,6.5\n4\n").IsRefusedWith(
            "a.csv(3): error: found 2 values, expected 3 (one for each column)",
            "a.csv(4): error: found 4 values, expected 3 (one for each column)",
            "a.csv(5): error: found 1 value, expected 3 (one for each column)");

    [Fact]
    public void Twenty_problems_of_a_kind_are_told_and_the_rest_counted()
    {
        var text = new StringBuilder("DEPT,GR\n");
        for (var i = 2; i <= 31; i++) text.Append(i).Append(",x\n").Append(i).Append('\n');
        var errors = LogReading.Csv(text.ToString()).Errors;
        Assert.Equal(42, errors.Length);
        Assert.Equal("a.csv(2,3): error: column \"GR\": found \"x\", expected a number", errors[0]);
        Assert.Equal("a.csv(42): error: and 10 more cells that are not numbers, from here on", errors[40]);
        Assert.Equal("a.csv(43): error: and 10 more rows with a wrong number of values, from here on", errors[41]);
    }

    [Theory]
    [InlineData("1,a\"b", "found a quote inside a value, expected quotes only around a whole value")]
    [InlineData("1,\"a\"b", "found text after a closing quote, expected ',' or the end of the line")]
    [InlineData("1,\"ab", "found a quote that is not closed on its line, expected a closing quote")]
    public void Misplaced_quotes_are_told_with_their_line(string row, string problem) =>
        LogReading.Csv($"DEPT,GR\n{row}\n2,20\n").IsRefusedWith($"a.csv(2): error: {problem}");

    [Fact]
    public void A_misplaced_quote_in_the_header_row_is_an_error() =>
        LogReading.Csv("DEPT,\"GR\n1,2\n").IsRefusedWith(
            "a.csv(1): error: found a quote that is not closed on its line, expected a closing quote");

    [Fact]
    public void A_header_without_rows_is_an_error() =>
        LogReading.Csv("DEPT,GR\n").IsRefusedWith("a.csv: error: found no data rows, expected at least one");

    [Fact]
    public void A_header_and_a_unit_row_without_rows_is_an_error() =>
        LogReading.Csv("DEPT,GR\nm,gAPI\n").IsRefusedWith("a.csv: error: found no data rows, expected at least one");

    [Fact]
    public void One_column_is_an_error() => LogReading.Csv("DEPT\n1\n2\n").IsRefusedWith(
        "a.csv(1): error: found 1 column in the header row, expected at least 2 separated by ','");

    [Fact]
    public void Numbers_in_the_first_row_are_an_error() => LogReading.Csv("100.0,2.5\n101.0,2.6\n").IsRefusedWith(
        "a.csv(1): error: found numbers in the first row, expected the names of the columns");

    [Fact]
    public void A_depth_column_that_is_not_there_is_an_error_with_the_nearest_name() =>
        LogReading.Csv("TVD,GR\n1,2\n", new LogReadOptions { DepthColumn = "TVDX" }).IsRefusedWith(
            "a.csv: error: found no column \"TVDX\", expected it as depth; did you mean \"TVD\"?");

    [Fact]
    public void Many_bad_cells_in_a_long_row_are_counted_without_ado()
    {
        var names = string.Concat(Enumerable.Range(0, 100_000).Select(i => FormattableString.Invariant($",C{i}")));
        var errors = LogReading.Csv($"DEPT{names}\n1{string.Concat(Enumerable.Repeat(",x", 100_000))}\n").Errors;
        Assert.Equal("a.csv(2): error: and 99980 more cells that are not numbers, from here on", errors[^1]);
    }

    [Fact]
    public void A_line_beyond_the_limit_is_refused() =>
        LogReading.Csv($"DEPT,GR\n1,2\n\n3,{new string('1', 3 << 20)}\n").IsRefusedWith(
            "a.csv(4): error: found a line of more than 1 MiB, expected a line for each depth");
}
