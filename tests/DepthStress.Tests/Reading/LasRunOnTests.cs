namespace DepthStress.Tests.Reading;

public class LasRunOnTests
{
    private static LogReading Read(string data) =>
        LogReading.Las($"{LogReading.LasHead}~C\nDEPT.m:\nGR.:\nDT.:\n~A\n{data}");

    [Theory]
    [InlineData("2 -999.25-999.25", double.NaN, double.NaN)]
    [InlineData("2 12.3-4.5", 12.3, -4.5)]
    [InlineData("2.0-12.3-4.5", -12.3, -4.5)]
    [InlineData("2 1.5e-5-4.5", 1.5e-5, -4.5)]
    [InlineData("2 -999-999", double.NaN, double.NaN)]
    public void Numbers_that_run_together_are_split_where_the_row_then_fits(string row, double gr, double dt)
    {
        var read = Read($"1 5 6\n{row}\n");
        Assert.Equal([5.0, gr], read.Column("GR").Values);
        Assert.Equal([6.0, dt], read.Column("DT").Values);
        Assert.Equal([$"a.las(12): warning: found numbers that run together in 1 row, split before the minus sign (\"{row}\")"], read.Messages);
    }

    [Fact]
    public void Rows_that_were_split_are_counted() =>
        Assert.Contains("in 3 rows, split", Assert.Single(Read("1 1.0-2.0\n2 1.0-2.0\n3 1.0-2.0\n").Messages), StringComparison.Ordinal);

    [Theory]
    [InlineData("2 12.3-4.5-6.7", 2)]
    [InlineData("2 12.3", 2)]
    [InlineData("2 12-11", 2)]
    [InlineData("2 -12-11-2020", 2)]
    public void A_row_that_would_not_fit_stays_as_it_is(string row, int found) =>
        Read($"1 5 6\n{row}\n").IsRefusedWith(FormattableString.Invariant($"a.las(12): error: found {found} values, expected 3 (one for each column)"));

    [Fact]
    public void A_row_that_fits_is_never_split() => Read("1 5 6.0-7.0\n").IsRefusedWith(
        "a.las(11,5): error: column \"DT\": found \"6.0-7.0\", expected a number");

    [Fact]
    public void Positive_numbers_that_run_together_cannot_be_told_apart() => Read("1 7.020101130.188\n").IsRefusedWith(
        "a.las(11): error: found 2 values, expected 3 (one for each column); \"7.020101130.188\" may be two numbers that run together, which cannot be told apart");
}
