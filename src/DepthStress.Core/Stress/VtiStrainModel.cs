using System.Numerics;
using System.Runtime.CompilerServices;

namespace DepthStress.Core.Stress;

/// <summary>
/// Horizontal stress of poroelastic rock with flat beds under its own weight and two lateral tectonic strains (Zhang 2019,
/// Applied Petroleum Geomechanics, p. 208 eqs 6.36-6.37 and p. 24 eqs 1.44-1.45):
/// <c>Sh = (Eh/Ev) nu_v/(1-nu_hh) (Sv - a_v Pp) + a_h Pp + Eh/(1-nu_hh^2) (e_h + nu_hh e_H)</c>, and the same with the strains
/// swapped for SHmax. Compression positive. With equal constants both ways it is <see cref="StrainModel"/> to the last bit.
/// </summary>
public static class VtiStrainModel
{
    /// <summary>Total stress along one horizontal axis, Pa.</summary>
    /// <param name="vertical">Static Young's modulus across the beds, Pa.</param>
    /// <param name="horizontal">Static Young's modulus along the beds, Pa.</param>
    /// <param name="poissonVertical">Horizontal over vertical strain under vertical load.</param>
    /// <param name="poissonHorizontal">The same within the plane of the beds.</param>
    /// <param name="biotVertical">Biot's coefficient across the beds.</param>
    /// <param name="biotHorizontal">Biot's coefficient along the beds.</param>
    /// <param name="overburden">Vertical total stress, Pa.</param>
    /// <param name="pore">Pore pressure, Pa.</param>
    /// <param name="along">Tectonic strain along the axis.</param>
    /// <param name="across">Tectonic strain along the other horizontal axis.</param>
    public static double Of(
        double vertical, double horizontal, double poissonVertical, double poissonHorizontal, double biotVertical, double biotHorizontal,
        double overburden, double pore, double along, double across) =>
        (horizontal / vertical * (poissonVertical / (1 - poissonHorizontal)) * (overburden - (biotVertical * pore))) + (biotHorizontal * pore)
            + (horizontal / (1 - (poissonHorizontal * poissonHorizontal)) * (along + (poissonHorizontal * across)));

    /// <summary>Fills both horizontal stresses; a missing input gives missing results.</summary>
    /// <exception cref="ArgumentException">Lengths differ.</exception>
    [MethodImpl(MethodImplOptions.AggressiveOptimization)]
    public static void Fill(
        ReadOnlySpan<double> vertical,
        ReadOnlySpan<double> horizontal,
        ReadOnlySpan<double> poissonVertical,
        ReadOnlySpan<double> poissonHorizontal,
        ReadOnlySpan<double> biotVertical,
        ReadOnlySpan<double> biotHorizontal,
        ReadOnlySpan<double> overburden,
        ReadOnlySpan<double> pore,
        double strainAlongShmin,
        double strainAlongShmax,
        Span<double> shmin,
        Span<double> shmax)
    {
        var n = vertical.Length;
        if (horizontal.Length != n || poissonVertical.Length != n || poissonHorizontal.Length != n || biotVertical.Length != n || biotHorizontal.Length != n
            || overburden.Length != n || pore.Length != n || shmin.Length != n || shmax.Length != n)
        {
            throw new ArgumentException("Lengths differ.", nameof(vertical));
        }

        var i = 0;
        for (; i <= n - Vector<double>.Count; i += Vector<double>.Count)
        {
            // The scalar formula in the same order of operations: equal to the last bit.
            Vector<double> nu = new(poissonHorizontal[i..]), one = Vector<double>.One, eh = new(horizontal[i..]), pp = new(pore[i..]);
            var effective = new Vector<double>(overburden[i..]) - (new Vector<double>(biotVertical[i..]) * pp);
            var ratio = eh / new Vector<double>(vertical[i..]) * (new Vector<double>(poissonVertical[i..]) / (one - nu));
            var uniaxial = (ratio * effective) + (new Vector<double>(biotHorizontal[i..]) * pp);
            var plane = eh / (one - (nu * nu));
            (uniaxial + (plane * (new Vector<double>(strainAlongShmin) + (nu * strainAlongShmax)))).CopyTo(shmin[i..]);
            (uniaxial + (plane * (new Vector<double>(strainAlongShmax) + (nu * strainAlongShmin)))).CopyTo(shmax[i..]);
        }

        for (; i < n; i++)
        {
            shmin[i] = Of(
                vertical[i], horizontal[i], poissonVertical[i], poissonHorizontal[i], biotVertical[i], biotHorizontal[i], overburden[i], pore[i],
                strainAlongShmin, strainAlongShmax);
            shmax[i] = Of(
                vertical[i], horizontal[i], poissonVertical[i], poissonHorizontal[i], biotVertical[i], biotHorizontal[i], overburden[i], pore[i],
                strainAlongShmax, strainAlongShmin);
        }
    }
}
