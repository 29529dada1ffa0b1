using DepthStress.Core.Quantities;

namespace DepthStress.Core.Pressure;

/// <summary>The running state of the overburden integral between samples and between chunks.</summary>
/// <param name="Depth">True vertical depth of the last sample, m.</param>
/// <param name="Density">Density of the last sample, kg/m3.</param>
/// <param name="Stress">Vertical stress at the last sample, Pa.</param>
public readonly record struct OverburdenCarry(double Depth, double Density, double Stress);

/// <summary>
/// Vertical total stress as the weight of everything above (Zoback 2007, Reservoir Geomechanics, p. 9, eq. 1.6): sea water,
/// then what is assumed down to the first logged density, then the log by the trapezoidal rule in true vertical depth. Air adds
/// nothing. Gravity is 9.80665 m/s2.
/// </summary>
public static class Overburden
{
    /// <summary>The state at the first sample of the integral.</summary>
    /// <param name="waterDepth">Depth of sea water, m; zero onshore.</param>
    /// <param name="waterDensity">Density of sea water, kg/m3.</param>
    /// <param name="massAbove">Mass per area of the ground between its top and the first sample, kg/m2.</param>
    /// <param name="firstDepth">True vertical depth of the first sample, m.</param>
    /// <param name="firstDensity">Density of the first sample, kg/m3.</param>
    public static OverburdenCarry Start(double waterDepth, double waterDensity, double massAbove, double firstDepth, double firstDensity)
    {
        var water = waterDepth > 0 ? waterDensity * waterDepth : 0;
        return new OverburdenCarry(firstDepth, firstDensity, Constants.StandardGravity * (water + massAbove));
    }

    /// <summary>Adds up the weight from sample to sample; a sample without density gets no stress and adds nothing of its own.</summary>
    /// <param name="tvd">True vertical depth, m, increasing over the samples that have density.</param>
    /// <param name="density">Density, kg/m3; NaN where the sample stays out.</param>
    /// <param name="stress">Vertical stress, Pa.</param>
    /// <param name="carry">The state before the first sample, updated to the last.</param>
    /// <exception cref="ArgumentException">Lengths differ.</exception>
    public static void Scan(ReadOnlySpan<double> tvd, ReadOnlySpan<double> density, Span<double> stress, ref OverburdenCarry carry)
    {
        if (density.Length != tvd.Length || stress.Length != tvd.Length) throw new ArgumentException("Lengths differ.", nameof(tvd));
        var (depth, last, sum) = carry;
        for (var i = 0; i < tvd.Length; i++)
        {
            if (double.IsNaN(density[i]))
            {
                stress[i] = double.NaN;
                continue;
            }

            sum += 0.5 * (density[i] + last) * Constants.StandardGravity * (tvd[i] - depth);
            depth = tvd[i];
            last = density[i];
            stress[i] = sum;
        }

        carry = new OverburdenCarry(depth, last, sum);
    }

    /// <summary>
    /// Fills the share of the vertical stress that comes from depths without a density log: what is assumed above it and
    /// every step of the integral that ends on a sample that was not logged.
    /// </summary>
    /// <param name="stress">Vertical stress, Pa; NaN where a sample stays out.</param>
    /// <param name="logged">True where density was logged.</param>
    /// <param name="unloggedAbove">Stress at the first sample that comes from above it, water not counted, Pa.</param>
    /// <param name="share">Gets the share, 0 to 1; NaN where there is no stress.</param>
    /// <exception cref="ArgumentException">Lengths differ.</exception>
    public static void FillUnloggedShare(ReadOnlySpan<double> stress, ReadOnlySpan<bool> logged, double unloggedAbove, Span<double> share)
    {
        if (logged.Length != stress.Length || share.Length != stress.Length) throw new ArgumentException("Lengths differ.", nameof(stress));
        var (unlogged, last) = (unloggedAbove, double.NaN);
        for (var i = 0; i < stress.Length; i++)
        {
            share[i] = double.NaN;
            if (double.IsNaN(stress[i])) continue;
            if (!logged[i] && !double.IsNaN(last)) unlogged += stress[i] - last;
            last = stress[i];
            share[i] = stress[i] > 0 ? unlogged / stress[i] : double.NaN;
        }
    }
}
