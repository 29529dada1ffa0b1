namespace DepthStress.Tests.Reading;

/// <summary>Wrapped data: LAS version 2.0, section "~A", rules for WRAP YES (in own words, from memory; example values are our own).</summary>
public class LasWrappedTests
{
    private const string Head = "~V\nVERS. 2.0:\nWRAP. YES:\n~W\nNULL. -999.25:\n~C\nDEPT.m:\nGR.gAPI:\nDT.us/m:\nRHOB.g/cm3:\n~A\n";

    // Rule: the index stands alone on its line, the other values follow on as many lines as they need.
    [Fact]
    public void A_depth_step_takes_several_lines()
    {
        var file = LogReading.Las($"{Head}1\n10 300\n-999.25\n# a comment\n2\n\n20\n310 2.5\n3\n30 320 2.6\n").Clean();
        Assert.Equal([1, 2, 3], file.Columns[0].Values);
        Assert.Equal([10, 20, 30], file.Columns[1].Values);
        Assert.Equal([300, 310, 320], file.Columns[2].Values);
        Assert.Equal([double.NaN, 2.5, 2.6], file.Columns[3].Values);
    }

    [Fact]
    public void A_step_that_lacks_a_value_is_told_where_the_next_one_should_start() => LogReading.Las($"{Head}1\n10 300\n2\n20 310 2.5\n3\n30 320 2.6\n").IsRefusedWith(
        "a.las(15): error: found 3 values where a depth step starts, expected the depth alone (a value is missing above, or one is too many)");

    [Fact]
    public void A_step_with_a_value_too_many_is_told() => LogReading.Las($"{Head}1\n10 300 2.4 9\n2\n20 310 2.5\n").IsRefusedWith(
        "a.las(12): error: found 5 values, expected 4 (one for each column)");

    [Fact]
    public void A_last_step_that_is_cut_off_is_told() => LogReading.Las($"{Head}1\n10 300 2.4\n2\n20\n").IsRefusedWith(
        "a.las(14): error: found 2 values, expected 4 (one for each column)");

    [Fact]
    public void A_bad_cell_is_told_with_its_own_line_and_column() => LogReading.Las($"{Head}1\n10 300\n x2\n2\n20 310 2.5\n").IsRefusedWith(
        "a.las(14,2): error: column \"RHOB\": found \"x2\", expected a number");

    [Fact]
    public void Values_beside_the_depth_are_read_by_their_number_with_a_note()
    {
        var read = LogReading.Las($"{Head}1 10\n300 2.4\n2 20\n310 2.5\n");
        Assert.Equal([2.4, 2.5], read.Column("RHOB").Values);
        Assert.Equal(
            ["a.las(12): note: found other values on the line of a depth, expected the depth alone; rows are told apart by their number of values"],
            read.Messages);
    }

    [Fact]
    public void One_column_needs_no_other_lines() =>
        Assert.Equal([1, 2], LogReading.Las("~V\nVERS. 2.0:\nWRAP. YES:\n~W\nNULL. -1:\n~C\nDEPT.m:\n~A\n1\n2\n").Clean().Columns[0].Values);

    [Fact]
    public void Sections_after_wrapped_data_are_noted() => Assert.Equal(
        ["a.las(14): note: section \"~Other\" after the data is not read"],
        LogReading.Las($"{Head}1\n10 300 2.4\n~Other\nany text\n").Messages);
}
