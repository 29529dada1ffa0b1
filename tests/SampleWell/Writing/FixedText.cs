using System.Globalization;
using System.Text;

namespace SampleWell.Writing;

/// <summary>
/// A growing file of text with numbers of fixed decimals. Digits come from whole-number arithmetic, so they do not depend on the
/// runtime, and a million rows take about a second. Lines end in a line feed everywhere.
/// </summary>
internal sealed class FixedText : IDisposable
{
    private readonly FileStream file;
    private readonly byte[] buffer = new byte[1 << 16];
    private int used;

    /// <summary>Opens (or replaces) a file.</summary>
    public FixedText(string path) => file = File.Create(path);

    /// <summary>Adds text with line feeds alone, however the source that holds it was checked out.</summary>
    public FixedText Add(string text)
    {
        foreach (var letter in Encoding.UTF8.GetBytes(text.ReplaceLineEndings("\n")))
            Put(letter);
        return this;
    }

    /// <summary>Adds a number, right-aligned in <paramref name="width"/> if that is wider. |value| x 10^decimals must stay below 2^53.</summary>
    public FixedText Add(double value, int decimals, int width = 0)
    {
        Span<byte> digits = stackalloc byte[32];
        var length = 0;
        var whole = (long)Math.Round(Math.Abs(value) * Power(decimals), MidpointRounding.AwayFromZero);
        var negative = value < 0 && whole > 0;
        for (; whole > 0 || length <= decimals + (decimals > 0 ? 1 : 0); whole /= 10)
        {
            if (length == decimals && decimals > 0)
                digits[length++] = (byte)'.';
            digits[length++] = (byte)('0' + whole % 10);
        }

        for (var pad = length + (negative ? 1 : 0); pad < width; pad++)
            Put((byte)' ');
        if (negative)
            Put((byte)'-');
        while (length > 0)
            Put(digits[--length]);
        return this;
    }

    /// <summary>Writes what is left and closes the file.</summary>
    public void Dispose()
    {
        file.Write(buffer, 0, used);
        file.Dispose();
    }

    /// <summary>A quantity as text: number, blank, unit.</summary>
    public static string Quantity(double value, int decimals, string unit)
    {
        var number = value.ToString(string.Create(CultureInfo.InvariantCulture, $"F{decimals}"), CultureInfo.InvariantCulture);
        return unit.Length == 0 ? number : number + " " + unit;
    }

    private static double Power(int decimals)
    {
        var power = 1.0;
        for (var i = 0; i < decimals; i++)
            power *= 10;
        return power;
    }

    private void Put(byte letter)
    {
        if (used == buffer.Length)
        {
            file.Write(buffer, 0, used);
            used = 0;
        }

        buffer[used++] = letter;
    }
}
