namespace DepthStress.Core.Layers;

/// <summary>Takes the mean, or the best straight line in depth, off a curve; what a segment costs does not change by it.</summary>
internal static class Centred
{
    /// <summary>Weights (zero where there is no value), depths between -1 and 1 about, and values without mean or line.</summary>
    public static (double[] Weights, double[] Depths, double[] Values) Of(ReadOnlySpan<double> depths, CutCurve curve)
    {
        var n = depths.Length;
        var (w, z, y) = (new double[n], depths.ToArray(), new double[n]);
        for (var i = 0; i < n; i++)
        {
            if (double.IsNaN(curve.Values[i])) continue;
            w[i] = curve.Weights[i];
            y[i] = curve.Values[i];
        }

        Shift(w, z);
        var size = n == 0 ? 0 : z.Max(Math.Abs);
        for (var i = 0; i < n && size > 0; i++) z[i] /= size;
        Shift(w, y);
        if (!curve.Trend) return (w, z, y);

        double spread = 0, slope = 0;
        for (var i = 0; i < n; i++)
        {
            spread += w[i] * z[i] * z[i];
            slope += w[i] * z[i] * y[i];
        }

        for (var i = 0; i < n && spread > 0; i++) y[i] -= slope / spread * z[i];
        return (w, z, y);
    }

    /// <summary>Takes off the weighted mean; cells of no weight may get any finite value, since they count for nothing.</summary>
    private static void Shift(double[] weights, double[] values)
    {
        double sum = 0, total = 0;
        for (var i = 0; i < values.Length; i++)
        {
            sum += weights[i] * values[i];
            total += weights[i];
        }

        for (var i = 0; i < values.Length && total > 0; i++) values[i] -= sum / total;
    }
}
