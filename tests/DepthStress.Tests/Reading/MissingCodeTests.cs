using DepthStress.Files.Reading;

namespace DepthStress.Tests.Reading;

/// <summary>Codes for missing values that the well file names, numbers and texts.</summary>
public sealed class MissingCodeTests
{
    private static readonly LogReadOptions Options = new()
    {
        MissingByColumn = new Dictionary<string, MissingCodes>
        {
            ["GR"] = new([0, -1], ["off", "fault \u00e9", "-5.50"]),
            ["absent"] = new([7], ["x"]),
        },
    };

    [Theory]
    [InlineData("off", true)]
    [InlineData("OFF", true)]
    [InlineData("fault \u00e9", true)]
    [InlineData("0", true)]
    [InlineData("-1.0", true)]
    [InlineData("-5.5", true)] // a text that is a number stands for the number, however it is written
    [InlineData("5", false)]
    public void Numbers_and_texts_mean_missing_in_a_csv_file_and_nothing_is_said(string cell, bool missing)
    {
        var file = LogReading.Csv($"DEPT,GR,RD\n1,10,0\n2,{cell},5\n3,12,-1\n", Options).Clean();
        Assert.Equal([missing ? 1 : 0, 0], new[] { file.Columns[1].Missing, file.Columns[2].Missing });
    }

    [Theory]
    [InlineData("off", true)]
    [InlineData("0.0", true)]
    [InlineData("-1", true)]
    [InlineData("1", false)]
    public void The_same_holds_for_a_las_file(string cell, bool missing)
    {
        var file = LogReading.Las($"{LogReading.LasHead}~C\nDEPT.m :\nGR.gAPI :\nRD.ohm.m :\n~A\n1 10 0\n2 {cell} 5\n3 12 -1\n", Options).Clean();
        Assert.Equal([missing ? 1 : 0, 0], new[] { file.Columns[1].Missing, file.Columns[2].Missing });
    }

    [Fact]
    public void A_decimal_comma_does_not_hide_a_text() => Assert.Equal(
        1, LogReading.Csv("DEPT;GR\n1,5;10,5\n2,5;a.b\n", new LogReadOptions { MissingByColumn = new Dictionary<string, MissingCodes> { ["GR"] = new([], ["a.b"]) } }).Column("GR").Missing);

    [Fact]
    public void A_text_that_is_no_code_of_its_column_stays_an_error() => Assert.Equal(
        ["a.csv(2,6): error: column \"RD\": found \"off\", expected a number"], LogReading.Csv("DEPT,GR,RD\n1,10,off\n2,11,3\n", Options).Messages);

    [Fact]
    public void A_word_that_is_missing_anyway_is_said_unless_the_column_has_it_as_a_code()
    {
        const string Csv = "DEPT,GR,RD\n1,N/A,2\n2,11,N/A\n";
        Assert.Equal(
            ["a.csv(2,3): warning: column \"GR\": found \"N/A\", read as missing", "a.csv(3,6): warning: column \"RD\": found \"N/A\", read as missing"],
            LogReading.Csv(Csv).Messages);
        var coded = new LogReadOptions { MissingByColumn = new Dictionary<string, MissingCodes> { ["gr"] = new([], ["n/a"]) } };
        Assert.Equal(["a.csv(3,6): warning: column \"RD\": found \"N/A\", read as missing"], LogReading.Csv(Csv, coded).Messages);
    }
}
