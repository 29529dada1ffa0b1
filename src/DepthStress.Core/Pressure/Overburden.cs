using DepthStress.Core.Quantities;

namespace DepthStress.Core.Pressure;

/// <summary>The running state of the overburden integral between samples and between chunks.</summary>
/// <param name="Depth">True vertical depth of the last sample, m.</param>
/// <param name="Density">Density of the last sample, kg/m3.</param>
/// <param name="Stress">Vertical stress at the last sample, Pa.</param>
public readonly record struct OverburdenCarry(double Depth, double Density, double Stress);

/// <summary>
/// Vertical total stress as the weight of everything above (Zoback 2007, Reservoir Geomechanics, p. 9, eq. 1.6): sea water,
/// then a mean density down to the first logged one, then the log by the trapezoidal rule in true vertical depth. Air adds
/// nothing. Gravity is 9.80665 m/s2.
/// </summary>
public static class Overburden
{
    /// <summary>The state at the first sample of the integral.</summary>
    /// <param name="waterDepth">Depth of sea water, m; zero onshore.</param>
    /// <param name="waterDensity">Density of sea water, kg/m3.</param>
    /// <param name="solidTop">True vertical depth of the ground or mudline, m.</param>
    /// <param name="meanDensity">Mean density from there to the first sample, kg/m3.</param>
    /// <param name="firstDepth">True vertical depth of the first sample, m.</param>
    /// <param name="firstDensity">Density of the first sample, kg/m3.</param>
    public static OverburdenCarry Start(
        double waterDepth, double waterDensity, double solidTop, double meanDensity, double firstDepth, double firstDensity)
    {
        var water = waterDepth > 0 ? waterDensity * waterDepth : 0;
        var solid = firstDepth <= solidTop ? 0 : meanDensity * (firstDepth - solidTop);
        return new OverburdenCarry(firstDepth, firstDensity, Constants.StandardGravity * (water + solid));
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
}
