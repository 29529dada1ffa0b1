using DepthStress.Files.Reading;

namespace DepthStress.Tests.Reading;

public class RepeatedDepthTests
{
    private const string Rows = "1,10\n2,20\n2,\n2,60\n3,30\n4,\n4,\n";

    private static LogReading Read(RepeatedDepth repeated, string rows = Rows) =>
        LogReading.Csv($"DEPT,GR\n{rows}", new LogReadOptions { RepeatedDepth = repeated });

    [Fact]
    public void The_first_row_of_each_depth_can_be_kept()
    {
        var read = Read(RepeatedDepth.First);
        Assert.Equal([1, 2, 3, 4], read.Column("DEPT").Values);
        Assert.Equal([10, 20, 30, double.NaN], read.Column("GR").Values);
        Assert.Equal((4, 1), (read.File!.Rows, read.Column("GR").Missing));
        Assert.Equal(["a.csv(4): note: depth repeats in 3 rows, first 2; the first row of each depth is kept"], read.Messages);
    }

    [Fact]
    public void Each_depth_can_take_the_mean_of_its_rows()
    {
        var read = Read(RepeatedDepth.Mean);
        Assert.Equal([10, 40, 30, double.NaN], read.Column("GR").Values);
        Assert.Equal(["a.csv(4): note: depth repeats in 3 rows, first 2; each depth takes the mean of its rows"], read.Messages);
    }

    // 0.1 + 0.1 + 0.1 divided by 3 is not 0.1 in binary64.
    [Fact]
    public void The_mean_leaves_the_depth_as_it_is() =>
        Assert.Equal([0.1, 0.2], Read(RepeatedDepth.Mean, "0.1,1\n0.1,2\n0.1,3\n0.2,4\n").Column("DEPT").Values);

    [Fact]
    public void A_descending_file_is_joined_and_turned_round()
    {
        var read = Read(RepeatedDepth.First, "3,30\n2,20\n2,21\n1,10\n");
        Assert.Equal([10, 20, 30], read.Column("GR").Values);
        Assert.Equal(2, read.Messages.Length);
    }

    [Theory]
    [InlineData(RepeatedDepth.First)]
    [InlineData(RepeatedDepth.Mean)]
    public void Depths_that_turn_back_stay_an_error(RepeatedDepth repeated) => Assert.Equal(
        ["a.csv(5): error: depth decreases in 1 row, first from 2 to 1.5, expected increasing"], Read(repeated, "1,1\n2,1\n2,1\n1.5,1\n3,1\n").Errors);

    [Fact]
    public void Repeats_are_errors_where_the_well_file_is_silent() => Read(RepeatedDepth.Error).IsRefusedWith(
        "a.csv(4): error: depth repeats in 3 rows, first 2, expected increasing (or repeated_depth = \"first\" or \"mean\" in [logs])");

    [Fact]
    public void A_file_of_one_depth_alone_becomes_one_row() => Assert.Equal([2], Read(RepeatedDepth.Mean, "5,1\n5,3\n").Column("GR").Values);
}
