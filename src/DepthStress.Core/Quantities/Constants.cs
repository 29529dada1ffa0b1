namespace DepthStress.Core.Quantities;

/// <summary>
/// Exact constants from which every conversion factor is built. Source: NIST SP 811 (2008), Appendix B, where each is
/// given as exact (bold type).
/// </summary>
public static class Constants
{
    /// <summary>Standard acceleration of free fall, m/s2 (exact).</summary>
    public const double StandardGravity = 9.80665;

    /// <summary>International foot, m (exact).</summary>
    public const double Foot = 0.3048;

    /// <summary>International inch, m (exact).</summary>
    public const double Inch = 0.0254;

    /// <summary>Avoirdupois pound, kg (exact).</summary>
    public const double Pound = 0.45359237;

    /// <summary>US gallon, m3: 231 cubic inches (exact).</summary>
    public const double Gallon = 231 * Inch * Inch * Inch;

    /// <summary>Pound-force per square inch, Pa.</summary>
    public const double Psi = Pound * StandardGravity / (Inch * Inch);

    /// <summary>Standard atmosphere, Pa (exact).</summary>
    public const double Atmosphere = 101325;

    /// <summary>Kelvin at the ice point of the Celsius scale, K (exact).</summary>
    public const double CelsiusZero = 273.15;

    /// <summary>One millidarcy, m2: flow of 1 cm3/s of a 1 mPa.s fluid through 1 cm2 under 1 atm/cm, divided by 1000.</summary>
    public const double Millidarcy = 1e-10 / Atmosphere;

    /// <summary>Density that specific gravity is counted from, kg/m3 (common practice).</summary>
    public const double ReferenceWaterDensity = 1000;
}
