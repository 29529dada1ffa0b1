using DepthStress.Files.Reading;

namespace DepthStress.Tests.Reading;

public class LasLogErrorTests
{
    private const string Curves = "~C\nDEPT.m:\nGR.gAPI:\n";

    private static LogReading Read(string data) => LogReading.Las($"{LogReading.LasHead}{Curves}~A\n{data}");

    [Fact]
    public void Wrapped_files_are_refused() => LogReading.Las("~V\nVERS. 2.0:\nWRAP. YES:\n~A\n").IsRefusedWith(
        "a.las(3): error: found WRAP YES, expected WRAP NO (wrapped files are not read yet)");

    [Fact]
    public void An_unknown_wrap_is_refused() => LogReading.Las("~V\nVERS. 2.0:\nWRAP. MAYBE:\n").IsRefusedWith(
        "a.las(3): error: found WRAP \"MAYBE\", expected NO");

    [Fact]
    public void Version_3_is_refused() => LogReading.Las("~V\nVERS. 3.0:\nWRAP. NO:\n").IsRefusedWith(
        "a.las(2): error: found LAS 3.0, expected LAS 2.0 (LAS 3.0 is not read yet)");

    [Fact]
    public void Comma_delimited_data_are_refused() => LogReading.Las("~V\nVERS. 2.0:\nWRAP. NO:\nDLM. COMMA:\n").IsRefusedWith(
        "a.las(4): error: found DLM COMMA, expected SPACE or TAB (other delimiters are not read yet)");

    [Fact]
    public void Rows_with_a_wrong_number_of_values_are_told() => Read("1 2\n2\n3 4 5\n").IsRefusedWith(
        "a.las(11): error: found 1 value, expected 2 (one for each column)",
        "a.las(12): error: found 3 values, expected 2 (one for each column)");

    [Fact]
    public void A_cell_left_empty_between_tabs_makes_a_row_short() =>
        LogReading.Las($"{LogReading.LasHead}{Curves}DT.us/m:\n~A\n1\t\t3\n").IsRefusedWith(
            "a.las(11): error: found 2 values, expected 3 (one for each column)");

    [Theory]
    [InlineData("ERR")]
    [InlineData("(null)")]
    [InlineData("--")]
    [InlineData("-1.#IND0000")]
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
    public void A_decimal_comma_is_told_as_such() => Read("1 123,45\n").IsRefusedWith(
        "a.las(10,3): error: column \"GR\": found the decimal comma in \"123,45\", expected a decimal point");

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
    public void A_section_after_the_data_is_an_error() => Read("1 2\n ~Other\n").IsRefusedWith(
        "a.las(11): error: found a section after ~A, expected the data to come last");

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
