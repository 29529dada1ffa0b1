using DepthStress.Files.Reading;

namespace DepthStress.Tests.Reading;

public class DepthOrderTests
{
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
            $"{Place(las, 3)}: error: depth repeats in 2 rows, first 2, expected increasing");
        Read(las, "1", "2", "2", "3").IsRefusedWith($"{Place(las, 3)}: error: depth repeats in 1 row, first 2, expected increasing");
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
        $"{Place(las, 2)}: error: depth repeats in 1 row, first 1, expected increasing",
        $"{Place(las, 3)}: error: depth decreases in 1 row, first from 1 to 0.5, expected increasing");

    [Theory]
    [InlineData(true)]
    [InlineData(false)]
    public void A_file_that_descends_throughout_is_refused_as_such(bool las) => Read(las, "30", "20", "10").IsRefusedWith(
        $"{Place(las, 2)}: error: depth decreases, expected increasing (from 30 to 10)");

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
        var options = new LogReadOptions { MissingByColumn = new Dictionary<string, double> { ["DEPT"] = 0 } };
        LogReading.Csv("DEPT,GR\n1,5\n0,5\n", options).IsRefusedWith(
            "a.csv(3): error: found no depth in data row 2, expected a number");
    }
}
