using DepthStress.Files.Reading;

namespace DepthStress.Tests.Reading;

public class SecondDepthTests
{
    [Theory]
    [InlineData("DEPTH_MD.m:", "1.004 5\n2 6\n")]
    [InlineData("DEPTH_MD.ft:", "3.2808 5\n6.5617 6\n")]
    [InlineData("TVD.m:", "9 5\n9 6\n")]
    [InlineData("DEPTH_MD.m:", "-999.25 5\n2 6\n")]
    public void A_second_depth_that_agrees_but_for_rounding_is_not_mentioned(string curve, string rest) => Read(curve, rest).Clean();

    [Fact]
    public void A_second_depth_that_differs_is_noted_and_the_first_curve_stays_the_depth()
    {
        var read = Read("DEPTH_MD.ft:", "3.2808 5\n8 6\n");
        Assert.Equal([1, 2], read.File!.Columns[read.File.DepthColumn].Values);

        // 8 ft are 2.4384 m (0.3048 m to the foot, exact).
        Assert.Equal(["a.las(8,1): note: column \"DEPTH_MD\" differs from the depth column \"DEPT\" by up to 0.4384 m; the depth is \"DEPT\""], read.Messages);
    }

    [Fact]
    public void Nothing_is_said_where_the_well_file_names_the_depth() =>
        Read("DEPTH_MD.m:", "7 5\n8 6\n", new LogReadOptions { DepthColumn = "DEPTH_MD" }).Clean();

    private static LogReading Read(string curve, string rest, LogReadOptions? options = null)
    {
        var rows = rest.Split('\n', StringSplitOptions.RemoveEmptyEntries);
        return LogReading.Las($"{LogReading.LasHead}~C\nDEPT.m:\n{curve}\nGR.:\n~A\n1 {rows[0]}\n2 {rows[1]}\n", options);
    }
}
