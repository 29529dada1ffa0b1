namespace DepthStress.Core.Conditioning;

/// <summary>
/// Median and scaled median absolute deviation. The factor makes the deviation that of a normal distribution: 1/0.674490
/// (Hampel 1974, J. Am. Stat. Assoc. 69, 383-393, doi:10.1080/01621459.1974.10482962).
/// </summary>
public static class RobustScale
{
    /// <summary>Median absolute deviation to standard deviation.</summary>
    public const double Factor = 1.4826;

    /// <summary>Median and scale of some numbers; NaN when there are none. The numbers are put out of order.</summary>
    public static (double Median, double Scale) Of(Span<double> values)
    {
        if (values.IsEmpty) return (double.NaN, double.NaN);
        values.Sort();
        var median = Middle(values);
        for (var i = 0; i < values.Length; i++) values[i] = Math.Abs(values[i] - median);
        values.Sort();
        return (median, Factor * Middle(values));
    }

    private static double Middle(ReadOnlySpan<double> sorted) =>
        sorted.Length % 2 == 1 ? sorted[sorted.Length / 2] : 0.5 * (sorted[(sorted.Length / 2) - 1] + sorted[sorted.Length / 2]);
}
