namespace DepthStress.Core.Stress;

/// <summary>A pair of horizontal stresses, Pa.</summary>
/// <param name="Shmin">The least.</param>
/// <param name="Shmax">The greatest.</param>
public readonly record struct HorizontalPair(double Shmin, double Shmax);

/// <summary>
/// The horizontal stresses that friction on existing faults allows at one depth (Zoback 2007, Reservoir Geomechanics; see
/// <see cref="FrictionalLimit"/>): a polygon over Shmin and SHmax.
/// </summary>
/// <param name="Vertical">Vertical stress, Pa, above the pore pressure.</param>
/// <param name="Pore">Pore pressure, Pa.</param>
/// <param name="Friction">Coefficient of friction, above zero.</param>
public sealed record StressPolygon(double Vertical, double Pore, double Friction)
{
    /// <summary>True when there is a polygon: known stresses, the pore pressure below the vertical stress, and friction.</summary>
    public bool Exists => Vertical > Pore && Friction > 0;

    /// <summary>The least Shmin, Pa, by normal faulting.</summary>
    public double LowestShmin => FrictionalLimit.LowestShmin(Vertical, Pore, Friction);

    /// <summary>The greatest SHmax, Pa, by reverse faulting.</summary>
    public double HighestShmax => FrictionalLimit.HighestShmax(Vertical, Vertical, Pore, Friction);

    /// <summary>
    /// Its corners: both stresses at their least; normal and strike-slip faulting meet; strike-slip and reverse faulting meet; both
    /// stresses at their greatest.
    /// </summary>
    public IReadOnlyList<HorizontalPair> Corners =>
    [
        new(LowestShmin, LowestShmin), new(LowestShmin, Vertical), new(Vertical, HighestShmax), new(HighestShmax, HighestShmax),
    ];

    /// <summary>The greatest SHmax for a Shmin, Pa.</summary>
    public double HighestShmaxAt(double shmin) => FrictionalLimit.HighestShmax(Vertical, shmin, Pore, Friction);

    /// <summary>True when friction allows the pair; false when one of them is missing.</summary>
    public bool Contains(double shmin, double shmax) =>
        shmin >= LowestShmin && shmax >= shmin && shmax <= HighestShmaxAt(shmin);
}
