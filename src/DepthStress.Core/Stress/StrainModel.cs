using System.Numerics;
using System.Runtime.CompilerServices;

namespace DepthStress.Core.Stress;

/// <summary>
/// Horizontal stress of isotropic poroelastic rock under its own weight and two lateral tectonic strains (Zhang 2019,
/// Applied Petroleum Geomechanics, eq. 6.37; Blanton and Olson 1999, SPE 54653):
/// <c>Sh = nu/(1-nu) (Sv - a Pp) + a Pp + E/(1-nu^2) (e_h + nu e_H)</c>, and the same with the strains swapped for SHmax.
/// Compression positive. Without strains it is the uniaxial-strain stress. Valid for -1 &lt; nu &lt; 1/2.
/// </summary>
public static class StrainModel
{
    /// <summary>Total stress along one horizontal axis, Pa.</summary>
    /// <param name="youngs">Static Young's modulus, Pa.</param>
    /// <param name="poisson">Static Poisson's ratio.</param>
    /// <param name="biot">Biot's coefficient.</param>
    /// <param name="vertical">Vertical total stress, Pa.</param>
    /// <param name="pore">Pore pressure, Pa.</param>
    /// <param name="along">Tectonic strain along the axis.</param>
    /// <param name="across">Tectonic strain along the other horizontal axis.</param>
    public static double Of(double youngs, double poisson, double biot, double vertical, double pore, double along, double across)
    {
        var pressure = biot * pore;
        return (poisson / (1 - poisson) * (vertical - pressure)) + pressure
            + (youngs / (1 - (poisson * poisson)) * (along + (poisson * across)));
    }

    /// <summary>Fills both horizontal stresses; a missing input gives missing results.</summary>
    /// <exception cref="ArgumentException">Lengths differ.</exception>
    [MethodImpl(MethodImplOptions.AggressiveOptimization)]
    public static void Fill(
        ReadOnlySpan<double> youngs,
        ReadOnlySpan<double> poisson,
        ReadOnlySpan<double> biot,
        ReadOnlySpan<double> vertical,
        ReadOnlySpan<double> pore,
        double strainAlongShmin,
        double strainAlongShmax,
        Span<double> shmin,
        Span<double> shmax)
    {
        var n = youngs.Length;
        if (poisson.Length != n || biot.Length != n || vertical.Length != n || pore.Length != n || shmin.Length != n || shmax.Length != n)
            throw new ArgumentException("Lengths differ.", nameof(youngs));
        var i = 0;
        for (; i <= n - Vector<double>.Count; i += Vector<double>.Count)
        {
            // The scalar formula in the same order of operations: equal to the last bit.
            Vector<double> nu = new(poisson[i..]), one = Vector<double>.One;
            var pressure = new Vector<double>(biot[i..]) * new Vector<double>(pore[i..]);
            var uniaxial = (nu / (one - nu) * (new Vector<double>(vertical[i..]) - pressure)) + pressure;
            var plane = new Vector<double>(youngs[i..]) / (one - (nu * nu));
            (uniaxial + (plane * (new Vector<double>(strainAlongShmin) + (nu * strainAlongShmax)))).CopyTo(shmin[i..]);
            (uniaxial + (plane * (new Vector<double>(strainAlongShmax) + (nu * strainAlongShmin)))).CopyTo(shmax[i..]);
        }

        for (; i < n; i++)
        {
            shmin[i] = Of(youngs[i], poisson[i], biot[i], vertical[i], pore[i], strainAlongShmin, strainAlongShmax);
            shmax[i] = Of(youngs[i], poisson[i], biot[i], vertical[i], pore[i], strainAlongShmax, strainAlongShmin);
        }
    }
}
