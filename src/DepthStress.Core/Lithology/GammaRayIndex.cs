namespace DepthStress.Core.Lithology;

/// <summary>
/// The gamma-ray index <c>I = (GR - GR_clean) / (GR_shale - GR_clean)</c>, the only quantity the program saturates: values
/// beyond the two lines become 0 or 1 and are counted. Source: Asquith and Gibson 1982, Basic Well Log Analysis for Geologists.
/// </summary>
public static class GammaRayIndex
{
    /// <summary>Computes the index of one sample, not saturated.</summary>
    /// <param name="gammaRay">Gamma radiation, gAPI.</param>
    /// <param name="clean">Clean line, gAPI.</param>
    /// <param name="shale">Shale line, gAPI, above the clean line.</param>
    public static double Of(double gammaRay, double clean, double shale) => (gammaRay - clean) / (shale - clean);

    /// <summary>Computes the saturated index of every sample; NaN in gives NaN out.</summary>
    /// <returns>How many samples were saturated.</returns>
    /// <exception cref="ArgumentException">Lengths differ, or the shale line is not above the clean line.</exception>
    public static int Fill(ReadOnlySpan<double> gammaRay, double clean, double shale, Span<double> index)
    {
        if (gammaRay.Length != index.Length) throw new ArgumentException("Lengths differ.", nameof(index));
        if (!(shale > clean)) throw new ArgumentException("The shale line must lie above the clean line.", nameof(shale));
        var saturated = 0;
        for (var i = 0; i < gammaRay.Length; i++)
        {
            var value = Of(gammaRay[i], clean, shale);
            if (value is < 0 or > 1)
            {
                saturated++;
                value = value < 0 ? 0 : 1;
            }

            index[i] = value;
        }

        return saturated;
    }
}
