using System.Globalization;

namespace DepthStress.Report.Drawing;

/// <summary>Round numbers for scales: steps of 1, 2 or 5 times a power of ten.</summary>
internal static class RoundSteps
{
    /// <summary>The least round step that cuts a range into at most so many parts; 1 when the range is empty.</summary>
    public static double Step(double range, double parts)
    {
        var raw = range / Math.Max(1, parts);
        if (!(raw > 0) || !double.IsFinite(raw)) return 1;
        var power = Math.Pow(10, Math.Floor(Math.Log10(raw)));
        foreach (var factor in (ReadOnlySpan<double>)[1, 2, 5])
        {
            if (factor * power >= raw * (1 - 1e-9)) return factor * power;
        }

        return 10 * power;
    }

    /// <summary>The multiples of a step between two values, ends included.</summary>
    public static IEnumerable<double> Between(double low, double high, double step)
    {
        for (var i = Math.Ceiling((low / step) - 1e-9); i * step <= high + (step * 1e-9); i++) yield return i * step;
    }

    /// <summary>A multiple of a step as text, with the decimals the step needs.</summary>
    public static string Show(double value, double step)
    {
        var decimals = Math.Clamp((int)Math.Ceiling(-Math.Log10(step) - 1e-9), 0, 6);
        var text = value.ToString("F" + decimals.ToString(CultureInfo.InvariantCulture), CultureInfo.InvariantCulture);
        return text.Trim('-', '0', '.').Length == 0 ? text.TrimStart('-') : text;
    }

    /// <summary>A scale end as text, as short as it can be.</summary>
    public static string Show(double value) => value.ToString("0.####", CultureInfo.InvariantCulture);

    /// <summary>A scale with round ends that no value from low to high is beyond, not by rounding either; values that hardly differ get a scale of a thousandth of their size.</summary>
    public static CurveScale Around(double low, double high, int parts)
    {
        var step = Step(Math.Max(high - low, 1e-3 * Math.Max(Math.Abs(low), Math.Abs(high))), parts);
        var (left, right) = (Math.Floor((low / step) + 1e-9), Math.Ceiling((high / step) - 1e-9));
        if (right <= left) right = left + 1;
        return new CurveScale(Math.Min(left * step, low), Math.Max(right * step, high), (int)(right - left));
    }
}
