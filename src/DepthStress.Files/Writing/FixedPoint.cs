using System.Globalization;
using System.Numerics;

namespace DepthStress.Files.Writing;

/// <summary>
/// Numbers as text with a fixed count of digits after the point, several times faster than the base library.
/// The bytes equal <c>value.ToString("F" + decimals, CultureInfo.InvariantCulture)</c>, with one exception: a result whose
/// digits are all zero carries no minus sign ("0.0000", where the base library writes "-0.0000").
/// </summary>
public static class FixedPoint
{
    /// <summary>Above this the scaled value's own rounding is no longer small against a half.</summary>
    private const double Limit = 1L << 42;

    /// <summary>
    /// How near a rounding tie the base library decides. Scaling rounds once, by at most 2^-12 below <see cref="Limit"/>
    /// (half the spacing of doubles there).
    /// </summary>
    private const double TieMargin = 1.0 / 2048;

    private static readonly double[] Scales = [1, 1e1, 1e2, 1e3, 1e4, 1e5, 1e6, 1e7, 1e8, 1e9, 1e10, 1e11, 1e12];

    private static ReadOnlySpan<ulong> Powers =>
    [
        1, 10, 100, 1_000, 10_000, 100_000, 1_000_000, 10_000_000, 100_000_000, 1_000_000_000, 10_000_000_000, 100_000_000_000,
        1_000_000_000_000, 10_000_000_000_000,
    ];

    private static readonly string[] Formats =
        [.. Enumerable.Range(0, Scales.Length).Select(d => "F" + d.ToString(CultureInfo.InvariantCulture))];

    private static ReadOnlySpan<byte> Pairs =>
        "00010203040506070809101112131415161718192021222324252627282930313233343536373839404142434445464748495051525354555657585960616263646566676869707172737475767778798081828384858687888990919293949596979899"u8;

    /// <summary>The greatest count of digits after the point.</summary>
    public static int MaxDecimals => Scales.Length - 1;

    /// <summary>The longest text there can be: sign, 309 digits, point and decimals.</summary>
    public static int MaxLength => 1 + 309 + 1 + MaxDecimals;

    /// <summary>Writes a number; a NaN or an infinite one gives an empty text.</summary>
    /// <param name="value">The number.</param>
    /// <param name="decimals">Digits after the point, 0 to <see cref="MaxDecimals"/>.</param>
    /// <param name="destination">Gets the ASCII text.</param>
    /// <param name="written">How many bytes were written.</param>
    /// <returns>False when the destination is too short; nothing is then written.</returns>
    /// <exception cref="ArgumentOutOfRangeException">The decimals are out of range.</exception>
    public static bool TryFormat(double value, int decimals, Span<byte> destination, out int written)
    {
        ArgumentOutOfRangeException.ThrowIfGreaterThan((uint)decimals, (uint)MaxDecimals, nameof(decimals));
        written = 0;
        if (!double.IsFinite(value)) return true;
        var scaled = Math.Abs(value) * Scales[decimals];
        if (scaled < Limit)
        {
            var whole = (long)scaled;
            var rest = scaled - whole;
            if (Math.Abs(rest - 0.5) > TieMargin)
                return TryWrite(value < 0, (ulong)(rest > 0.5 ? whole + 1 : whole), decimals, destination, out written);
        }

        return TryLibrary(value, decimals, destination, out written);
    }

    /// <summary>Writes digits with a point before the last <paramref name="decimals"/> of them, from the end to the start.</summary>
    private static bool TryWrite(bool negative, ulong digits, int decimals, Span<byte> destination, out int written)
    {
        written = 0;
        var sign = negative && digits != 0 ? 1 : 0;
        var point = decimals > 0 ? 1 : 0;
        var at = sign + point + Math.Max(CountDigits(digits), decimals + 1);
        if (at > destination.Length) return false;
        written = at;
        var left = decimals;
        for (; left >= 2; left -= 2)
        {
            at -= 2;
            digits = PutPair(digits, destination[at..]);
        }

        if (left == 1) digits = PutDigit(digits, destination, --at);
        if (point == 1) destination[--at] = (byte)'.';
        for (; at - sign >= 2;)
        {
            at -= 2;
            digits = PutPair(digits, destination[at..]);
        }

        if (at > sign) PutDigit(digits, destination, --at);
        if (sign == 1) destination[0] = (byte)'-';
        return true;
    }

    private static ulong PutPair(ulong digits, Span<byte> destination)
    {
        var rest = digits / 100;
        Pairs.Slice((int)(digits - (rest * 100)) * 2, 2).CopyTo(destination);
        return rest;
    }

    private static ulong PutDigit(ulong digits, Span<byte> destination, int at)
    {
        var rest = digits / 10;
        destination[at] = (byte)('0' + (digits - (rest * 10)));
        return rest;
    }

    /// <summary>Count of decimal digits, 1 for zero: log10(2) is about 1233/4096, mended by one comparison.</summary>
    private static int CountDigits(ulong digits)
    {
        var guess = ((BitOperations.Log2(digits | 1) + 1) * 1233) >> 12;
        return digits >= Powers[guess] ? guess + 1 : Math.Max(guess, 1);
    }

    private static bool TryLibrary(double value, int decimals, Span<byte> destination, out int written)
    {
        if (!value.TryFormat(destination, out written, Formats[decimals], CultureInfo.InvariantCulture)) return false;
        if (value > 0 || destination[0] != '-' || destination[..written].ContainsAnyInRange((byte)'1', (byte)'9')) return true;
        destination[1..written].CopyTo(destination);
        written--;
        return true;
    }
}
