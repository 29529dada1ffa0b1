namespace DepthStress.Core.Pressure;

/// <summary>
/// How many independent values a row of correlated residuals is worth: <c>n / (1 + 2 sum of autocorrelations)</c>, the sum ending before
/// the first autocorrelation that is not positive, at a quarter of the row at most (Bartlett 1946; the cut as in common practice).
/// </summary>
public static class EffectiveCount
{
    /// <summary>The effective number, from 2 to the number of residuals.</summary>
    /// <param name="residuals">Residuals in the order of depth, none NaN; gaps in depth are not seen.</param>
    public static double Of(ReadOnlySpan<double> residuals)
    {
        var n = residuals.Length;
        if (n <= 2) return n;
        double mean = 0;
        foreach (var r in residuals) mean += r;
        mean /= n;
        var centred = new double[n];
        double variance = 0;
        for (var i = 0; i < n; i++)
        {
            centred[i] = residuals[i] - mean;
            variance += centred[i] * centred[i];
        }

        if (!(variance > 0)) return n;
        double sum = 0;
        for (var lag = 1; lag <= n / 4; lag++)
        {
            var correlation = Product(centred.AsSpan(lag), centred.AsSpan(0, n - lag)) / variance;
            if (!(correlation > 0)) break;
            sum += correlation;
        }

        return Math.Max(2, n / (1 + (2 * sum)));
    }

    /// <summary>The sum of products, four at a time in a fixed order.</summary>
    private static double Product(ReadOnlySpan<double> a, ReadOnlySpan<double> b)
    {
        double s0 = 0, s1 = 0, s2 = 0, s3 = 0;
        var i = 0;
        for (; i + 3 < a.Length; i += 4)
        {
            s0 += a[i] * b[i];
            s1 += a[i + 1] * b[i + 1];
            s2 += a[i + 2] * b[i + 2];
            s3 += a[i + 3] * b[i + 3];
        }

        for (; i < a.Length; i++) s0 += a[i] * b[i];
        return s0 + s1 + s2 + s3;
    }
}
