using DepthStress.Core.Logs;
using DepthStress.Core.Quantities;

namespace DepthStress.Core.Catalogue;

/// <summary>The inputs that published laws share, in the units their sources use. A velocity or slowness is above zero.</summary>
internal static class InputOf
{
    private static readonly Interval Positive = new(double.Epsilon, double.PositiveInfinity);

    /// <summary>Compressional slowness, us/ft.</summary>
    public static LawInput Slowness { get; } = new("dt", Property.CompressionalSlowness, Units.MicrosecondPerFoot, Positive, Interval.All);

    /// <summary>Compressional velocity, km/s.</summary>
    public static LawInput Vp { get; } = new("Vp", Property.Vp, Units.KilometrePerSecond, Positive, Interval.All);

    /// <summary>Compressional velocity, m/s.</summary>
    public static LawInput VpMetre { get; } = new("Vp", Property.Vp, Units.MetrePerSecond, Positive, Interval.All);

    /// <summary>Shear velocity, m/s.</summary>
    public static LawInput VsMetre { get; } = new("Vs", Property.Vs, Units.MetrePerSecond, Positive, Interval.All);

    /// <summary>Bulk density, kg/m3.</summary>
    public static LawInput Density { get; } = new("rho", Property.Density, Units.KilogramPerCubicMetre, Positive, Interval.All);

    /// <summary>Bulk density, g/cm3.</summary>
    public static LawInput DensityGram { get; } = new("rho", Property.Density, Units.GramPerCubicCentimetre, Positive, Interval.All);

    /// <summary>Dynamic Young's modulus, GPa.</summary>
    public static LawInput DynamicModulus { get; } = new("Ed", Property.YoungsDynamic, Units.Gigapascal, Positive, Interval.All);

    /// <summary>Dynamic Poisson's ratio.</summary>
    public static LawInput DynamicPoisson { get; } = new("nu", Property.PoissonDynamic, Units.One, new(-1, 0.5), Interval.All);

    /// <summary>Static Young's modulus, GPa.</summary>
    public static LawInput StaticModulus { get; } = new("Es", Property.YoungsStatic, Units.Gigapascal, Positive, Interval.All);

    /// <summary>Porosity, a fraction.</summary>
    public static LawInput Porosity { get; } = new("phi", Property.Porosity, Units.Fraction, new(0, 1), Interval.All);

    /// <summary>Porosity where the formula has no value at zero.</summary>
    public static LawInput PorosityAboveZero { get; } = Porosity with { Domain = new(double.Epsilon, 1) };

    /// <summary>Shale volume, a fraction, where the source speaks of clay.</summary>
    public static LawInput Clay { get; } = new("Vclay", Property.ShaleVolume, Units.Fraction, new(0, 1), Interval.All);

    /// <summary>Gamma-ray index.</summary>
    public static LawInput GammaRayIndex { get; } = new("I", Property.GammaRayIndex, Units.Fraction, new(0, 1), Interval.All);

    /// <summary>The same input, fitted in a range; published unit.</summary>
    public static LawInput Within(this LawInput input, double low, double high) => input with { Range = new(low, high) };

    /// <summary>The same input, meaningless outside a domain; published unit.</summary>
    public static LawInput Only(this LawInput input, double low, double high) => input with { Domain = new(low, high) };
}
