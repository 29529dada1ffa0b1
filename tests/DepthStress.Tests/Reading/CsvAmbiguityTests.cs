namespace DepthStress.Tests.Reading;

/// <summary>Nothing that can be read in two ways is read in either.</summary>
public class CsvAmbiguityTests
{
    [Fact]
    public void A_comma_between_digits_may_be_either_mark() => LogReading.Csv("DEPT,GR\n1,\"1,234\"\n").IsRefusedWith(
        "a.csv(2,3): error: column \"GR\": found \"1,234\", which is 1.234 with a decimal comma or 1234 with a thousands separator; expected a decimal point");

    [Fact]
    public void A_file_whose_every_comma_may_be_either_mark_is_refused() => Assert.Equal(
        ["a.csv(2,3): error: column \"GR\": found \"1,234\", which is 1.234 with a decimal comma or 1234 with a thousands separator; expected a decimal point"],
        LogReading.Csv("DEPT;GR\n1;1,234\n2;5\n").Errors);

    [Fact]
    public void A_number_cut_by_the_delimiter_is_shown_in_both_readings() => LogReading.Csv("DEPT,GR\n1,1,234\n").IsRefusedWith(
        "a.csv(2): error: found 3 values, expected 2 (one for each column); \"1,1\" is two values where ',' is the delimiter, or 1.1 where it is the decimal mark");

    [Theory]
    [InlineData("\"1,234.5\"", "1,234.5", "1234.5")]
    [InlineData("\"1,234,567\"", "1,234,567", "1234567")]
    [InlineData("\"-12,345,678.\"", "-12,345,678.", "-12345678.")]
    public void Thousands_separators_are_refused(string cell, string quoted, string plain) => LogReading.Csv($"DEPT,GR\n1,{cell}\n").IsRefusedWith(
        $"a.csv(2,3): error: column \"GR\": found \"{quoted}\" with thousands separators, expected {plain}");

    [Theory]
    [InlineData("1.234,5", "\"1.234,5\" with thousands separators, expected 1234,5")]
    [InlineData("1.234", "\"1.234\", which is 1.234 with a decimal point or 1234 with a thousands separator; expected a decimal comma")]
    [InlineData("85.3", "the decimal point in \"85.3\", expected a decimal comma")]
    public void Points_in_a_file_of_decimal_commas_are_errors(string cell, string problem)
    {
        var rows = string.Concat(Enumerable.Range(1, 300).Select(i => FormattableString.Invariant($"{i};0,5\n")));
        Assert.Equal([$"a.csv(302,5): error: column \"GR\": found {problem}"], LogReading.Csv($"DEPT;GR\n{rows}301;{cell}\n").Errors);
    }

    [Theory]
    [InlineData("0,450", 0.45)]
    [InlineData("2550,000", 2550)]
    [InlineData("1,2345", 1.2345)]
    [InlineData("-,5", -0.5)]
    public void A_comma_that_can_be_nothing_else_settles_the_mark_for_the_file(string cell, double value) =>
        Assert.Equal([value, 1.234], LogReading.Csv($"DEPT;GR\n1;{cell}\n2;1,234\n").Column("GR").Values);

    [Fact]
    public void Both_marks_in_one_file_leave_the_point() => Assert.Equal(
        ["a.csv(3,3): error: column \"GR\": found the decimal comma in \"85,3\", expected a decimal point"],
        LogReading.Csv("DEPT;GR\n1;1.5\n2;85,3\n").Errors);
}
