using System.Globalization;
using System.Runtime.CompilerServices;

namespace DepthStress.Files.Reading;

/// <summary>Reads decimal numbers from UTF-8 bytes: a point, no group separators, correctly rounded.</summary>
internal static class NumberText
{
    private const ulong ExactInteger = 1UL << 53;
    private const int MostDigits = 19;

    // Powers of ten that are exact in binary64.
    private static ReadOnlySpan<double> PowersOfTen =>
    [
        1e0, 1e1, 1e2, 1e3, 1e4, 1e5, 1e6, 1e7, 1e8, 1e9, 1e10, 1e11, 1e12, 1e13, 1e14, 1e15, 1e16, 1e17, 1e18, 1e19, 1e20, 1e21, 1e22,
    ];

    /// <summary>
    /// Reads the number at the start of <paramref name="text"/> and gives its length in bytes, 0 where there is none.
    /// A product or quotient of two exact numbers is rounded once (Clinger 1990, fast path); the rest goes to the base library.
    /// </summary>
    [MethodImpl(MethodImplOptions.AggressiveOptimization)]
    public static int Read(ReadOnlySpan<byte> text, out double value)
    {
        var i = 0;
        var negative = text.Length > 0 && text[0] == (byte)'-';
        if (negative || (text.Length > 0 && text[0] == (byte)'+')) i++;
        ulong mantissa = 0;
        var start = i;
        for (; i < text.Length && (uint)(text[i] - '0') is var digit and <= 9; i++) mantissa = (mantissa * 10) + digit;
        var digits = i - start;
        var power = 0;
        if (i < text.Length && text[i] == (byte)'.')
        {
            var point = i++;
            for (; i < text.Length && (uint)(text[i] - '0') is var digit and <= 9; i++) mantissa = (mantissa * 10) + digit;
            power = point + 1 - i;
            digits -= power;
        }

        value = double.NaN;
        if (digits == 0) return 0;
        if (i < text.Length && (text[i] | 0x20) == 'e') i = ReadExponent(text, i, ref power);
        if (digits <= MostDigits && mantissa <= ExactInteger && Math.Abs(power) < PowersOfTen.Length)
        {
            var magnitude = power < 0 ? mantissa / PowersOfTen[-power] : mantissa * PowersOfTen[power];
            value = negative ? -magnitude : magnitude;
        }
        else
        {
            double.TryParse(text[..i], NumberStyles.Float, CultureInfo.InvariantCulture, out value);
        }

        return i;
    }

    /// <summary>Reads a whole cell; empty and NaN give NaN. False where it is anything else than one finite number.</summary>
    [MethodImpl(MethodImplOptions.AggressiveOptimization)]
    public static bool TryParse(ReadOnlySpan<byte> cell, out double value)
    {
        if (cell.Length > 0 && (cell[0] <= ' ' || cell[^1] <= ' ')) cell = cell.Trim(" \t"u8);
        var length = Read(cell, out value);
        if (length == cell.Length && length > 0) return double.IsFinite(value);
        value = double.NaN;
        return IsMissing(cell);
    }

    /// <summary>True for an empty cell and for NaN in any case.</summary>
    public static bool IsMissing(ReadOnlySpan<byte> cell) =>
        cell.IsEmpty || (cell.Length == 3 && (cell[0] | 0x20) == 'n' && (cell[1] | 0x20) == 'a' && (cell[2] | 0x20) == 'n');

    private static int ReadExponent(ReadOnlySpan<byte> text, int letter, ref int power)
    {
        var i = letter + 1;
        var negative = i < text.Length && text[i] == (byte)'-';
        if (negative || (i < text.Length && text[i] == (byte)'+')) i++;
        int start = i, exponent = 0;
        for (; i < text.Length && text[i] is >= (byte)'0' and <= (byte)'9'; i++)
        {
            if (exponent < 100_000) exponent = (exponent * 10) + (text[i] - '0');
        }

        if (i == start) return letter;
        power += negative ? -exponent : exponent;
        return i;
    }
}
