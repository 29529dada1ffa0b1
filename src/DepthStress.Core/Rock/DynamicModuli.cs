using System.Numerics;
using System.Runtime.CompilerServices;

namespace DepthStress.Core.Rock;

/// <summary>
/// Dynamic elastic constants of isotropic rock from velocities and density (Mavko, Mukerji and Dvorkin 2009, The Rock
/// Physics Handbook, 2nd ed.; Zhang 2019, Applied Petroleum Geomechanics, pp. 66 and 72). A bulk modulus above zero needs
/// <c>Vp/Vs &gt; sqrt(4/3)</c>.
/// </summary>
public static class DynamicModuli
{
    /// <summary>Shear modulus, Pa: <c>rho Vs^2</c>.</summary>
    public static double Shear(double vs, double density) => density * vs * vs;

    /// <summary>Poisson's ratio: <c>(Vp^2 - 2 Vs^2) / (2 (Vp^2 - Vs^2))</c>.</summary>
    public static double Poisson(double vp, double vs)
    {
        double p = vp * vp, s = vs * vs;
        return (p - (2 * s)) / (2 * (p - s));
    }

    /// <summary>Young's modulus, Pa: <c>2 G (1 + nu)</c>.</summary>
    public static double Youngs(double vp, double vs, double density) => 2 * Shear(vs, density) * (1 + Poisson(vp, vs));

    /// <summary>Fills Young's modulus and Poisson's ratio; a missing input gives missing results.</summary>
    /// <param name="vp">Compressional velocity, m/s.</param>
    /// <param name="vs">Shear velocity, m/s.</param>
    /// <param name="density">Bulk density, kg/m3.</param>
    /// <param name="youngs">Young's modulus, Pa.</param>
    /// <param name="poisson">Poisson's ratio.</param>
    /// <exception cref="ArgumentException">Lengths differ.</exception>
    [MethodImpl(MethodImplOptions.AggressiveOptimization)]
    public static void Fill(
        ReadOnlySpan<double> vp, ReadOnlySpan<double> vs, ReadOnlySpan<double> density, Span<double> youngs, Span<double> poisson)
    {
        var n = vp.Length;
        if (vs.Length != n || density.Length != n || youngs.Length != n || poisson.Length != n)
            throw new ArgumentException("Lengths differ.", nameof(vp));
        var i = 0;
        for (; i <= n - Vector<double>.Count; i += Vector<double>.Count)
        {
            // The scalar formulas in the same order of operations: equal to the last bit.
            Vector<double> s = new(vs[i..]), pp = new(vp[i..]);
            var (p2, s2) = (pp * pp, s * s);
            var nu = (p2 - (2 * s2)) / (2 * (p2 - s2));
            nu.CopyTo(poisson[i..]);
            (2 * (new Vector<double>(density[i..]) * s * s) * (Vector<double>.One + nu)).CopyTo(youngs[i..]);
        }

        for (; i < n; i++)
        {
            youngs[i] = Youngs(vp[i], vs[i], density[i]);
            poisson[i] = Poisson(vp[i], vs[i]);
        }
    }
}
