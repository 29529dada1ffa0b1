using System.Globalization;
using System.Text;
using DepthStress.Files.Writing;

namespace DepthStress.Tests.Writing;

public sealed class FixedPointTests
{
    internal static string Written(double value, int decimals)
    {
        var bytes = new byte[FixedPoint.MaxLength];
        Assert.True(FixedPoint.TryFormat(value, decimals, bytes, out var written));
        return Encoding.ASCII.GetString(bytes, 0, written);
    }

    /// <summary>What the base library writes; the one difference that is meant: a zero has no sign.</summary>
    internal static string Library(double value, int decimals)
    {
        var text = value.ToString("F" + decimals.ToString(CultureInfo.InvariantCulture), CultureInfo.InvariantCulture);
        return text.AsSpan().ContainsAnyInRange('1', '9') ? text : text.TrimStart('-');
    }

    [Theory]
    [InlineData(0, 0, "0")]
    [InlineData(0, 4, "0.0000")]
    [InlineData(1, 0, "1")]
    [InlineData(-1, 1, "-1.0")]
    [InlineData(0.05, 1, "0.1")]
    [InlineData(0.1251, 2, "0.13")]
    [InlineData(-2.5001, 0, "-3")]
    [InlineData(9.99996, 4, "10.0000")]
    [InlineData(1234.5678, 4, "1234.5678")]
    [InlineData(4398046511103, 0, "4398046511103")]
    [InlineData(1e15, 2, "1000000000000000.00")]
    public void Digits_are_rounded_to_the_nearest(double value, int decimals, string expected) =>
        Assert.Equal(expected, Written(value, decimals));

    [Fact]
    public void Every_count_of_digits_is_written_whole()
    {
        for (var power = 0; power <= 17; power++)
        {
            for (var decimals = 0; decimals <= FixedPoint.MaxDecimals; decimals++)
            {
                foreach (var value in new[] { Math.Pow(10, power), Math.Pow(10, power) - 1, Math.Pow(10, -power), 7 * Math.Pow(10, -power) })
                    Assert.Equal(Library(value, decimals), Written(value, decimals));
            }
        }
    }

    [Theory]
    [InlineData(-0.0)]
    [InlineData(-0.00001)]
    [InlineData(-0.00004999999)]
    [InlineData(-double.Epsilon)]
    public void A_result_of_zeros_has_no_minus_sign(double value) => Assert.Equal("0.0000", Written(value, 4));

    [Fact]
    public void A_negative_zero_near_a_tie_has_no_minus_sign() => Assert.Equal("0", Written(-0.49999999999999994, 0));

    [Theory]
    [InlineData(double.NaN)]
    [InlineData(double.PositiveInfinity)]
    [InlineData(double.NegativeInfinity)]
    public void A_number_that_is_not_finite_is_empty(double value) => Assert.Equal("", Written(value, 4));

    [Theory]
    [InlineData(double.MaxValue, 12)]
    [InlineData(double.MinValue, 12)]
    [InlineData(1e300, 0)]
    public void The_longest_numbers_fit_the_stated_length(double value, int decimals) =>
        Assert.Equal(Library(value, decimals), Written(value, decimals));

    [Theory]
    [InlineData(1234.5678)]
    [InlineData(-0.125)]
    [InlineData(-1e20)]
    [InlineData(0.00005)]
    public void A_destination_one_byte_too_short_is_refused_and_one_that_fits_is_not(double value)
    {
        var expected = Library(value, 4);
        Assert.True(FixedPoint.TryFormat(value, 4, new byte[expected.Length], out var written));
        Assert.Equal(expected.Length, written);
        Assert.False(FixedPoint.TryFormat(value, 4, new byte[expected.Length - 1], out written));
        Assert.Equal(0, written);
    }

    [Theory]
    [InlineData(-1)]
    [InlineData(13)]
    public void Decimals_out_of_range_are_refused(int decimals) =>
        Assert.Throws<ArgumentOutOfRangeException>(() => FixedPoint.TryFormat(1, decimals, new byte[100], out _));
}
