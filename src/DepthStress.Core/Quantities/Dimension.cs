namespace DepthStress.Core.Quantities;

/// <summary>What a number measures. Inside the program every dimension has one SI unit, named here.</summary>
public enum Dimension
{
    /// <summary>A pure number.</summary>
    None,

    /// <summary>Length or depth, m.</summary>
    Length,

    /// <summary>Slowness (transit time per length), s/m.</summary>
    Slowness,

    /// <summary>Velocity, m/s.</summary>
    Velocity,

    /// <summary>Mass density, kg/m3.</summary>
    Density,

    /// <summary>Pressure, stress, strength or elastic modulus, Pa.</summary>
    Pressure,

    /// <summary>Pressure per depth, Pa/m.</summary>
    PressureGradient,

    /// <summary>Natural gamma radiation, gAPI (no SI unit; kept as it is).</summary>
    GammaRay,

    /// <summary>Photoelectric factor, barn per electron (kept as it is).</summary>
    Photoelectric,

    /// <summary>Electrical resistivity, ohm.m.</summary>
    Resistivity,

    /// <summary>Temperature, K.</summary>
    Temperature,

    /// <summary>Temperature per depth, K/m.</summary>
    TemperatureGradient,

    /// <summary>Volume or mass fraction, v/v.</summary>
    Fraction,

    /// <summary>Angle, rad.</summary>
    Angle,

    /// <summary>Permeability, m2.</summary>
    Permeability,

    /// <summary>Fracture toughness, Pa.m^0.5.</summary>
    Toughness,

    /// <summary>Strain, m/m.</summary>
    Strain,

    /// <summary>Linear thermal expansion, 1/K.</summary>
    ThermalExpansion,
}
