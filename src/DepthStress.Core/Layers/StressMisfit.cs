namespace DepthStress.Core.Layers;

/// <summary>How far a stress at log scale lies from the best straight line in depth over its layer.</summary>
/// <param name="Mean">Mean distance over true vertical thickness.</param>
/// <param name="Greatest">Greatest distance.</param>
public readonly record struct StressMisfit(double Mean, double Greatest)
{
    /// <summary>Not known.</summary>
    public static StressMisfit None { get; } = new(double.NaN, double.NaN);

    /// <summary>The misfit of values with weights at depths; samples without a value are left out, and none at all gives NaN.</summary>
    public static StressMisfit Of(ReadOnlySpan<double> depths, ReadOnlySpan<double> values, ReadOnlySpan<double> weights)
    {
        var (w, _, residuals) = Centred.Of(depths, new CutCurve(values.ToArray(), weights[..values.Length].ToArray(), Trend: true));
        double sum = 0, total = 0, greatest = 0;
        for (var i = 0; i < w.Length; i++)
        {
            if (!(w[i] > 0)) continue;
            sum += w[i] * Math.Abs(residuals[i]);
            total += w[i];
            greatest = Math.Max(greatest, Math.Abs(residuals[i]));
        }

        return total > 0 ? new StressMisfit(sum / total, greatest) : None;
    }
}
