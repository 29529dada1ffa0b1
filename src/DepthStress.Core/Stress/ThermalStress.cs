namespace DepthStress.Core.Stress;

/// <summary>
/// Horizontal stress of rock that was heated or cooled between sides that do not give way (Zhang 2019, Applied Petroleum
/// Geomechanics, eq. 1.44): <c>E aT (T - Tref) / (1 - nu)</c>, compression positive: rock warmer than its reference pushes
/// outwards and gains stress, cooled rock loses it. In rock with flat beds E and nu are those along the beds, and the
/// expansion is the horizontal one.
/// </summary>
public static class ThermalStress
{
    /// <summary>The thermal part of a horizontal stress, Pa.</summary>
    /// <param name="youngs">Static Young's modulus along the beds, Pa.</param>
    /// <param name="poisson">Static Poisson's ratio in the plane of the beds.</param>
    /// <param name="expansion">Linear thermal expansion of the rock along the beds, 1/K.</param>
    /// <param name="temperature">Temperature, K.</param>
    /// <param name="reference">Temperature without thermal stress, K.</param>
    public static double Of(double youngs, double poisson, double expansion, double temperature, double reference) =>
        youngs * expansion * (temperature - reference) / (1 - poisson);

    /// <summary>Adds the thermal part to both horizontal stresses; a missing input gives missing results.</summary>
    /// <exception cref="ArgumentException">Lengths differ.</exception>
    public static void Add(
        ReadOnlySpan<double> youngs, ReadOnlySpan<double> poisson, ReadOnlySpan<double> temperature, double expansion, double reference, Span<double> shmin, Span<double> shmax)
    {
        var n = youngs.Length;
        if (poisson.Length != n || temperature.Length != n || shmin.Length != n || shmax.Length != n) throw new ArgumentException("Lengths differ.", nameof(youngs));
        for (var i = 0; i < n; i++)
        {
            var thermal = Of(youngs[i], poisson[i], expansion, temperature[i], reference);
            shmin[i] += thermal;
            shmax[i] += thermal;
        }
    }
}
