namespace DepthStress.Core.Stress;

/// <summary>
/// Horizontal stress by a ratio of effective stresses (Matthews and Kelly 1967, Oil and Gas J.; as Hubbert and Willis 1957,
/// Trans. AIME 210, 153-168, with a ratio of 1/3): <c>S = Pp + k (Sv - Pp)</c>. The whole pore pressure counts, without
/// Biot's coefficient; the ratio is the user's.
/// </summary>
public static class EffectiveStressRatio
{
    /// <summary>Total horizontal stress, Pa.</summary>
    public static double Of(double ratio, double vertical, double pore) => pore + (ratio * (vertical - pore));

    /// <summary>Fills a horizontal stress; a missing input gives a missing result.</summary>
    /// <exception cref="ArgumentException">Lengths differ.</exception>
    public static void Fill(double ratio, ReadOnlySpan<double> vertical, ReadOnlySpan<double> pore, Span<double> stress)
    {
        if (pore.Length != vertical.Length || stress.Length != vertical.Length) throw new ArgumentException("Lengths differ.", nameof(vertical));
        for (var i = 0; i < stress.Length; i++) stress[i] = Of(ratio, vertical[i], pore[i]);
    }
}
