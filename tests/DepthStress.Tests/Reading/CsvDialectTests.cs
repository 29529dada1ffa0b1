using DepthStress.Files.Reading;

namespace DepthStress.Tests.Reading;

public class CsvDialectTests
{
    [Theory]
    [InlineData("DEPT;GR\n1.5;2\n2;85.3\n", "found ';' as delimiter")]
    [InlineData("DEPT\tGR\n1.5\t2\n2\t85.3\n", "found tabs as delimiter")]
    [InlineData("DEPT|GR\n1.5|2\n2|85.3\n", "found '|' as delimiter")]
    [InlineData("DEPT GR\n1.5 2\n2 85.3\n", "found blanks as delimiter")]
    [InlineData("  DEPT\t  GR \n  1.5    2\n\t2   85.3\n", "found blanks as delimiter")]
    [InlineData("DEPT;GR\n1,5;2\n2;85,3\n", "found ';' as delimiter, decimal commas")]
    [InlineData("DEPT\tGR\nm\tgAPI\n1,5\t2\n2\t85,3\n", "found tabs as delimiter, decimal commas")]
    [InlineData("DEPT   GR\nm   gAPI\n1,5   2\n2   85,3\n", "found blanks as delimiter, decimal commas")]
    [InlineData("\"DEPT\";\"GR\"\n\"1,5\";\"2\"\n\"2\";\"85,3\"\n", "found ';' as delimiter, decimal commas")]
    public void Delimiter_and_decimal_mark_are_detected_and_told(string text, string note)
    {
        var read = LogReading.Csv(text);
        Assert.Equal([1.5, 2], read.Column("DEPT").Values);
        Assert.Equal([2, 85.3], read.Column("GR").Values);
        Assert.Equal([$"a.csv(1): note: {note}"], read.Messages);
    }

    [Fact]
    public void Lines_before_the_header_are_passed_over_and_line_numbers_stay_exact()
    {
        var text = "Well: Bramble 7, depth measured from the rotary table\nlogged; in, 2020\n\n\"x\ny\nDEPT,GR\nm,gAPI\n1,10\n2,20\n";
        foreach (var (end, mark) in new[] { ("\n", ""), ("\r\n", "\ufeff"), ("\r", "") })
        {
            var lines = mark + text.Replace("\n", end, StringComparison.Ordinal);
            var read = LogReading.Csv(lines);
            Assert.Equal([10, 20], read.Column("GR").Values);
            Assert.Equal("gAPI", read.Column("GR").Unit);
            Assert.Equal(["a.csv(6): note: found the header below other lines, which are passed over"], read.Messages);
            Assert.Equal(["a.csv(10,3): error: column \"GR\": found \"x\", expected a number"], LogReading.Csv($"{lines}3,x{end}").Errors);
        }
    }

    [Fact]
    public void A_preamble_above_a_table_of_blanks_is_passed_over() => Assert.Equal(
        ["a.csv(2): note: found blanks as delimiter, the header below other lines, which are passed over"],
        LogReading.Csv("the depth of things\nDEPT GR\n1 2\n").Messages);

    [Fact]
    public void A_word_like_depth_in_a_sentence_is_no_header() =>
        LogReading.Csv("the depth, in metres\nGR,X\n1,2\n").IsRefusedWith(
            "a.csv(1): error: found no depth column, expected one named DEPT, DEPTH, MD, MEASURED_DEPTH, DEPTH_MD, TDEP, MD_DEPTH, MEASDEPTH or MEASUREDDEPTH");

    [Fact]
    public void A_delimiter_at_the_end_of_every_line_makes_a_column_of_its_own() =>
        Assert.Equal(3, LogReading.Csv("DEPT;GR;\n1;2;\n").File!.Columns.Count);

    [Fact]
    public void Blanks_around_commas_are_no_dialect() =>
        Assert.Equal([10, 20], LogReading.Csv("DEPT , GR\n 1 , 10\n 2 , 20\n").Clean().Columns[1].Values);

    [Fact]
    public void An_index_of_time_is_refused() => LogReading.Csv("TIME[s],GR\n1,2\n").IsRefusedWith(
        "a.csv(1,1): error: found the index \"TIME\" in s, a time; expected a depth (logs over time are not read)");

    [Fact]
    public void Every_part_of_the_dialect_can_be_stated_and_is_then_no_news()
    {
        var csv = new CsvOptions { Delimiter = ';', Decimal = ',', HeaderLine = 3 };
        var file = LogReading.Csv("DEPT;GR\n7;7\nDEPT;GR\n1;1,234\n2;2,345\n", new LogReadOptions { Csv = csv }).Clean();
        Assert.Equal([1.234, 2.345], file.Columns[1].Values);
    }

    [Fact]
    public void A_stated_delimiter_is_kept_even_where_another_would_fit() =>
        LogReading.Csv("DEPT;GR\n1;2\n", new LogReadOptions { Csv = new CsvOptions { Delimiter = ',' } }).IsRefusedWith(
            "a.csv(1): error: found 1 column in the header row, expected at least 2 separated by ','");

    [Fact]
    public void A_stated_decimal_comma_reads_quoted_cells_between_commas() => Assert.Equal(
        [85.3], LogReading.Csv("DEPT,GR\n1,\"85,3\"\n", new LogReadOptions { Csv = new CsvOptions { Decimal = ',' } }).Clean().Columns[1].Values);

    [Theory]
    [InlineData(2)]
    [InlineData(9)]
    public void A_stated_header_line_that_holds_nothing_is_an_error(int line) =>
        LogReading.Csv("DEPT,GR\n\n1,2\n", new LogReadOptions { Csv = new CsvOptions { HeaderLine = line } }).IsRefusedWith(
            FormattableString.Invariant($"a.csv({line}): error: found no header row, expected the names of the columns in this line, within the first 64 KB, as the well file says"));

    [Fact]
    public void Misplaced_quotes_name_the_delimiter_at_hand() => Assert.Contains(
        "a.csv(2): error: found text after a closing quote, expected ';' or the end of the line",
        LogReading.Csv("DEPT;GR\n1;\"2\"x\n").Messages);
}
