namespace DepthStress.Tests.Reading;

public class NullTextTests
{
    [Theory]
    [InlineData("ERR")]
    [InlineData("err")]
    [InlineData("(null)")]
    [InlineData("NULL")]
    [InlineData("n/a")]
    [InlineData("#N/A")]
    [InlineData("-")]
    [InlineData("--")]
    [InlineData("-----")]
    [InlineData("-1.#IND")]
    [InlineData("-1.#IND0000")]
    [InlineData("1.#QNAN")]
    public void Words_for_no_value_are_missing_and_warned_of_in_both_formats(string word)
    {
        var las = LogReading.Las($"{LogReading.LasHead}~C\nDEPT.m:\nGR.:\n~A\n1 5\n2   {word}\n");
        var csv = LogReading.Csv($"DEPT,GR\n1,5\n2, {word}\n");
        Assert.Equal([5, double.NaN], las.Column("GR").Values);
        Assert.Equal([5, double.NaN], csv.Column("GR").Values);
        Assert.Equal((1, 1), (las.Column("GR").Missing, csv.Column("GR").Missing));
        Assert.Equal([$"a.las(11,5): warning: column \"GR\": found \"{word}\", read as missing"], las.Messages);
        Assert.Equal([$"a.csv(3,3): warning: column \"GR\": found \"{word}\", read as missing"], csv.Messages);
    }

    [Fact]
    public void Words_are_counted_for_each_column() => Assert.Equal(
        [
            "a.csv(2,3): warning: column \"GR\": found \"ERR\" and the like in 3 rows, read as missing",
            "a.csv(3,5): warning: column \"DT\": found \"--\", read as missing",
        ],
        LogReading.Csv("DEPT,GR,DT\n1,ERR,1\n2,-,--\n3,ERR,4\n4,4,4\n").Messages);

    [Fact]
    public void A_word_in_place_of_the_depth_is_an_error() => LogReading.Csv("DEPT,GR\n1,5\nERR,5\n").IsRefusedWith(
        "a.csv(3): error: found no depth in data row 2, expected a number");

    [Theory]
    [InlineData("ERRATIC")]
    [InlineData("13-DEC-86")]
    [InlineData("2020-01-05")]
    [InlineData("1.#INF")]
    [InlineData("1.#IND.5")]
    [InlineData("-x-")]
    public void Other_text_is_an_error(string text) => LogReading.Csv($"DEPT,GR\n1,{text}\n").IsRefusedWith(
        $"a.csv(2,3): error: column \"GR\": found \"{text}\", expected a number");

    [Fact]
    public void Several_codes_hold_in_one_file()
    {
        var file = LogReading.Las("~V\nVERS. 2.0:\nWRAP. NO:\n~W\nNULL. -77:\n~C\nDEPT.m:\nGR.:\n~A\n1 -77\n2 -999.25\n3 -9999\n4 -999\n5 9999\n").Clean();
        Assert.Equal([double.NaN, double.NaN, double.NaN, double.NaN, 9999], file.Columns[1].Values);
    }
}
