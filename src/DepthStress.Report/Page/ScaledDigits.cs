using System.Globalization;

namespace DepthStress.Report.Page;

/// <summary>Numbers as the whole number that their printed digits make: 12.3456 with four decimals is 123456.</summary>
internal static class ScaledDigits
{
    /// <summary>Above this the scaled value's own rounding is no longer small against a half.</summary>
    private const double Limit = 1L << 42;

    /// <summary>How near a rounding tie the base library decides; scaling rounds by at most 2^-12 below <see cref="Limit"/>.</summary>
    private const double TieMargin = 1.0 / 2048;

    private static readonly double[] Scales = [1, 1e1, 1e2, 1e3, 1e4, 1e5, 1e6, 1e7, 1e8, 1e9];

    /// <summary>The digits of <c>value.ToString("F" + decimals)</c> without the point; NaN for a missing value.</summary>
    /// <param name="value">The number, in the unit it is printed in.</param>
    /// <param name="decimals">Digits after the point, 0 to 9.</param>
    public static double Of(double value, int decimals)
    {
        if (!double.IsFinite(value)) return double.NaN;
        var scaled = Math.Abs(value) * Scales[decimals];
        var (whole, rest) = (Math.Floor(scaled), scaled - Math.Floor(scaled));
        if (scaled >= Limit || Math.Abs(rest - 0.5) <= TieMargin)
        {
            var text = Math.Abs(value).ToString("F" + decimals.ToString(CultureInfo.InvariantCulture), CultureInfo.InvariantCulture);
            whole = double.Parse(text.Replace(".", "", StringComparison.Ordinal), CultureInfo.InvariantCulture);
        }
        else if (rest > 0.5)
        {
            whole++;
        }

        return value < 0 && whole > 0 ? -whole : whole;
    }

    /// <summary>The text that the digits stand for.</summary>
    public static string Show(double value, int decimals) =>
        double.IsFinite(value)
            ? (Of(value, decimals) / Scales[decimals]).ToString("F" + decimals.ToString(CultureInfo.InvariantCulture), CultureInfo.InvariantCulture)
            : "";
}
