using DepthStress.Files.Reading;

namespace DepthStress.Tests.Reading;

public class LasLogErrorTests
{
    private const string Curves = "~C\nDEPT.m:\nGR.gAPI:\n";

    private static LogReading Read(string data) => LogReading.Las($"{LogReading.LasHead}{Curves}~A\n{data}");

    [Fact]
    public void An_unknown_wrap_is_refused() => LogReading.Las("~V\nVERS. 2.0:\nWRAP. MAYBE:\n").IsRefusedWith(
        "a.las(3): error: found WRAP \"MAYBE\", expected YES or NO");

    [Fact]
    public void A_version_that_nobody_knows_is_refused() => LogReading.Las("~V\nVERS. 4.0:\nWRAP. NO:\n").IsRefusedWith(
        "a.las(2): error: found LAS 4.0, expected a version from 1.2 to 3.0");

    [Fact]
    public void An_unknown_delimiter_is_refused() => LogReading.Las("~V\nVERS. 2.0:\nWRAP. NO:\nDLM. SEMICOLON:\n").IsRefusedWith(
        "a.las(4): error: found DLM SEMICOLON, expected SPACE, TAB or COMMA");

    [Fact]
    public void Rows_with_a_wrong_number_of_values_are_told() => Read("1 2\n2\n3 4 5\n").IsRefusedWith(
        "a.las(11): error: found 1 value, expected 2 (one for each column)",
        "a.las(12): error: found 3 values, expected 2 (one for each column)");

    [Fact]
    public void A_cell_left_empty_between_tabs_makes_a_row_short() =>
        LogReading.Las($"{LogReading.LasHead}{Curves}DT.us/m:\n~A\n0\t2\t3\n1\t\t3\n").IsRefusedWith(
            "a.las(12): error: found 2 values, expected 3 (one for each column)");

    [Theory]
    [InlineData("ERRX")]
    [InlineData("-1.#INF0000")]
    [InlineData("2020-01-05")]
    [InlineData("13-DEC-86")]
    [InlineData("\u0661\u0662")]
    [InlineData("10.5x")]
    [InlineData("-Infinity")]
    [InlineData("1e400")]
    public void Text_in_the_data_is_told_with_line_and_column(string cell) => Read($"1 2\n 2  {cell}\n").IsRefusedWith(
        $"a.las(11,5): error: column \"GR\": found \"{cell}\", expected a number");

    [Theory]
    [InlineData("\n")]
    [InlineData("\r\n")]
    [InlineData("\r")]
    public void Line_numbers_are_exact_for_any_line_end(string end) =>
        LogReading.Las($"{LogReading.LasHead}{Curves}\n~A\n1 2\n2 x\n".Replace("\n", end, StringComparison.Ordinal)).IsRefusedWith(
            "a.las(12,3): error: column \"GR\": found \"x\", expected a number");

    [Fact]
    public void A_decimal_comma_among_points_is_told_as_such() => Read("1.0 123,45\n").IsRefusedWith(
        "a.las(10,5): error: column \"GR\": found the decimal comma in \"123,45\", expected a decimal point");

    [Fact]
    public void A_comma_that_may_be_either_mark_is_shown_in_both_readings() => Read("1.0 123,450\n").IsRefusedWith(
        "a.las(10,5): error: column \"GR\": found \"123,450\", which is 123.450 with a decimal comma or 123450 with a thousands separator; expected a decimal point");

    [Fact]
    public void A_missing_data_section_is_an_error() => LogReading.Las($"{LogReading.LasHead}{Curves}").IsRefusedWith(
        "a.las: error: found no ~A section, expected the data in it");

    [Fact]
    public void A_missing_curve_section_is_an_error() => LogReading.Las($"{LogReading.LasHead}~A\n1 2\n").IsRefusedWith(
        "a.las: error: found no curves, expected a ~C section that lists them");

    [Fact]
    public void A_data_section_without_rows_is_an_error() => Read("# nothing\n\n").IsRefusedWith(
        "a.las: error: found no data rows, expected at least one");

    [Fact]
    public void A_second_section_of_a_kind_is_an_error() => LogReading.Las($"{LogReading.LasHead}{Curves}{Curves}~A\n1 2\n").IsRefusedWith(
        "a.las(9,1): error: found a second ~C section, expected one");

    [Fact]
    public void A_section_that_the_data_need_is_an_error_after_them() => Read("1 2\n ~Well\n").IsRefusedWith(
        "a.las(11): error: found \"~Well\" after the data, expected the data to come last");

    [Fact]
    public void Text_before_the_first_section_is_an_error() => LogReading.Las("100.0 2.5\n101.0 2.6\n").IsRefusedWith(
        "a.las(1,1): error: found \"100.0 2.5\" before the first section, expected a line that starts with ~");

    [Fact]
    public void A_depth_curve_that_is_not_there_is_an_error() =>
        LogReading.Las($"{LogReading.LasHead}{Curves}~A\n1 2\n", new LogReadOptions { DepthColumn = "DEPTH" }).IsRefusedWith(
            "a.las: error: found no column \"DEPTH\", expected it as depth; did you mean \"DEPT\"?");

    [Fact]
    public void A_line_beyond_the_limit_is_refused_in_header_and_data()
    {
        var text = new string('1', 3 << 20);
        var message = "error: found a line of more than 1 MiB, expected a line for each depth";
        LogReading.Las($"~V\n{text}\n").IsRefusedWith($"a.las(2): {message}");
        Read($"1 2\n{text}\n").IsRefusedWith($"a.las(11): {message}");
    }
}
