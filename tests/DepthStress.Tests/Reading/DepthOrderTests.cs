using DepthStress.Files.Reading;

namespace DepthStress.Tests.Reading;

public class DepthOrderTests
{
    private const string Wish = " (or repeated_depth = \"first\" or \"mean\" in [logs])";

    private static LogReading Read(bool las, params string[] depths) => las
        ? LogReading.Las($"{LogReading.LasHead}~C\nDEPT.m :\nGR.gAPI :\n~A\n{string.Concat(depths.Select(d => $"{d} 5\n"))}")
        : LogReading.Csv($"DEPT,GR\n{string.Concat(depths.Select(d => $"{d},5\n"))}");

    private static string Place(bool las, int row) => FormattableString.Invariant($"{(las ? "a.las" : "a.csv")}({row + (las ? 9 : 1)})");

    [Theory]
    [InlineData(true)]
    [InlineData(false)]
    public void Rising_depths_pass_whatever_the_step(bool las) => Read(las, "-5", "-1", "0", "10.5", "10.6").Clean();

    [Theory]
    [InlineData(true)]
    [InlineData(false)]
    public void Repeats_name_the_first_line_and_the_count(bool las)
    {
        Read(las, "1", "2", "2", "3", "3", "4").IsRefusedWith(
            $"{Place(las, 3)}: error: depth repeats in 2 rows, first 2, expected increasing{Wish}");
        Read(las, "1", "2", "2", "3").IsRefusedWith($"{Place(las, 3)}: error: depth repeats in 1 row, first 2, expected increasing{Wish}");
    }

    [Theory]
    [InlineData(true)]
    [InlineData(false)]
    public void Falls_name_the_first_line_and_the_count(bool las) => Read(las, "1", "3", "2.5", "4", "3.5").IsRefusedWith(
        $"{Place(las, 3)}: error: depth decreases in 2 rows, first from 3 to 2.5, expected increasing");

    [Theory]
    [InlineData(true)]
    [InlineData(false)]
    public void Repeats_and_falls_are_told_apart(bool las) => Read(las, "1", "1", "0.5", "2").IsRefusedWith(
        $"{Place(las, 2)}: error: depth repeats in 1 row, first 1, expected increasing{Wish}",
        $"{Place(las, 3)}: error: depth decreases in 1 row, first from 1 to 0.5, expected increasing");

    [Theory]
    [InlineData(true)]
    [InlineData(false)]
    public void A_file_that_descends_throughout_is_turned_round_with_a_note(bool las)
    {
        var read = Read(las, "30", "20", "10");
        Assert.Equal([10, 20, 30], read.Column("DEPT").Values);
        Assert.Equal([$"{Place(las, 2)}: note: depth decreases throughout (from 30 to 10), the rows are turned round"], read.Messages);
    }

    [Fact]
    public void Turning_round_takes_every_column_along_with_its_missing_values()
    {
        var read = LogReading.Csv("DEPT,GR,DT\n3,30,\n2,20,5\n1,,6\n");
        Assert.Equal([double.NaN, 20, 30], read.Column("GR").Values);
        Assert.Equal([6, 5, double.NaN], read.Column("DT").Values);
        Assert.Equal((1, 1), (read.Column("GR").Missing, read.Column("DT").Missing));
    }

    [Theory]
    [InlineData(true)]
    [InlineData(false)]
    public void A_rise_in_a_file_that_else_descends_is_what_is_wrong(bool las) => Read(las, "30", "20", "25", "10", "5").IsRefusedWith(
        $"{Place(las, 3)}: error: depth increases in 1 row, first from 20 to 25, expected decreasing as in the other rows");

    [Theory]
    [InlineData(true, "-999.25")]
    [InlineData(true, "NaN")]
    [InlineData(false, "-999.25")]
    [InlineData(false, "")]
    public void A_row_without_depth_is_an_error_that_names_it(bool las, string cell) => Read(las, "1", cell, "2").IsRefusedWith(
        $"{Place(las, 2)}: error: found no depth in data row 2, expected a number");

    [Fact]
    public void Twenty_rows_without_depth_are_told_and_the_rest_counted()
    {
        var errors = Read(false, [.. Enumerable.Repeat("", 25)]).Errors;
        Assert.Equal(21, errors.Length);
        Assert.Equal("a.csv(22): error: and 5 more rows without depth, from here on", errors[20]);
    }

    [Fact]
    public void Order_is_checked_across_rows_that_are_left_out() => LogReading.Csv("DEPT,GR\n1,5\n3,x\n2,5\n4,5\n").IsRefusedWith(
        "a.csv(3,3): error: column \"GR\": found \"x\", expected a number",
        "a.csv(4): error: depth decreases in 1 row, first from 3 to 2, expected increasing");

    [Fact]
    public void A_code_for_the_depth_column_makes_it_missing()
    {
        var options = new LogReadOptions { MissingByColumn = new Dictionary<string, MissingCodes> { ["DEPT"] = new([0], []) } };
        LogReading.Csv("DEPT,GR\n1,5\n0,5\n", options).IsRefusedWith(
            "a.csv(3): error: found no depth in data row 2, expected a number");
    }
}
