using CsCheck;

namespace DepthStress.Tests.Writing;

public sealed class FixedPointProperties
{
    private const int Cases = 100_000;

    private static readonly Gen<int> Decimals = Gen.Int[0, 8];

    private static void EqualsTheLibrary(Gen<double> values) =>
        Gen.Select(values, Decimals).Sample((v, d) => Assert.Equal(FixedPointTests.Library(v, d), FixedPointTests.Written(v, d)), iter: Cases);

    [Fact]
    public void Any_bit_pattern_is_written_like_the_base_library() =>
        EqualsTheLibrary(Gen.ULong.Select(BitConverter.UInt64BitsToDouble).Where(double.IsFinite));

    [Fact]
    public void Values_of_every_common_magnitude_are_written_like_the_base_library() =>
        EqualsTheLibrary(Gen.Select(Gen.Double[-10, 10], Gen.Int[-10, 14]).Select((v, p) => v * Math.Pow(10, p)));

    /// <summary>Whole numbers over powers of two are exact in binary, so many of them are exact ties in decimal.</summary>
    [Fact]
    public void Exact_halves_are_written_like_the_base_library() =>
        EqualsTheLibrary(Gen.Select(Gen.Int, Gen.Int[1, 9]).Select((n, p) => n / (double)(1 << p)));

    /// <summary>Decimal ties such as 0.00125 and their neighbours in double precision, on both sides.</summary>
    [Fact]
    public void Near_ties_are_written_like_the_base_library() =>
        EqualsTheLibrary(Gen.Select(Gen.Long[-100_000_000, 100_000_000], Gen.Int[0, 8], Gen.Int[-3, 3]).Select((n, d, ulps) =>
        {
            var value = (n + 0.5) / Math.Pow(10, d);
            return BitConverter.Int64BitsToDouble(BitConverter.DoubleToInt64Bits(value) + ulps);
        }));

    /// <summary>Just below and above the size where the fast path hands over.</summary>
    [Fact]
    public void Values_around_the_limit_of_the_fast_path_are_written_like_the_base_library() =>
        EqualsTheLibrary(Gen.Select(Gen.Double[0.5, 2], Gen.Int[0, 8]).Select((f, d) => f * (1L << 42) / Math.Pow(10, d)));
}
