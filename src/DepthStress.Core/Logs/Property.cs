namespace DepthStress.Core.Logs;

/// <summary>Everything the program knows per sample, as read or as computed; the index of <see cref="PropertyTable"/>.</summary>
public enum Property
{
    /// <summary>Depth along the hole below the datum, m.</summary>
    MeasuredDepth,

    /// <summary>Vertical depth below the datum, m.</summary>
    TrueVerticalDepth,

    /// <summary>Angle between the hole and the vertical, rad.</summary>
    Inclination,

    /// <summary>Angle between the hole and the normal of the beds, rad.</summary>
    BeddingAngle,

    /// <summary>Vertical depth below the datum as a log file has it, m.</summary>
    LoggedVerticalDepth,

    /// <summary>Height above or depth below mean sea level as a log file has it, m.</summary>
    LoggedVerticalPosition,

    /// <summary>Compressional velocity, m/s.</summary>
    Vp,

    /// <summary>Shear velocity, m/s.</summary>
    Vs,

    /// <summary>Bulk density, kg/m3.</summary>
    Density,

    /// <summary>Natural gamma radiation, gAPI.</summary>
    GammaRay,

    /// <summary>Hole diameter, m.</summary>
    Caliper,

    /// <summary>Bit diameter, m.</summary>
    BitSize,

    /// <summary>Density correction, kg/m3.</summary>
    DensityCorrection,

    /// <summary>Neutron porosity, v/v.</summary>
    NeutronPorosity,

    /// <summary>Photoelectric factor, b/e.</summary>
    Photoelectric,

    /// <summary>Deep resistivity, ohm.m.</summary>
    DeepResistivity,

    /// <summary>Formation temperature, K.</summary>
    Temperature,

    /// <summary>Facies code, a number without a unit.</summary>
    Facies,

    /// <summary>Gamma-ray index: 0 at the clean line, 1 at the shale line.</summary>
    GammaRayIndex,

    /// <summary>Shale volume, v/v.</summary>
    ShaleVolume,

    /// <summary>Porosity, v/v.</summary>
    Porosity,

    /// <summary>Dynamic Young's modulus, Pa.</summary>
    YoungsDynamic,

    /// <summary>Dynamic Poisson's ratio.</summary>
    PoissonDynamic,

    /// <summary>Static Young's modulus, Pa.</summary>
    YoungsStatic,

    /// <summary>Static Poisson's ratio.</summary>
    PoissonStatic,

    /// <summary>Biot's coefficient.</summary>
    Biot,

    /// <summary>Unconfined compressive strength, Pa.</summary>
    Ucs,

    /// <summary>Angle of internal friction, rad.</summary>
    FrictionAngle,

    /// <summary>Tensile strength, Pa.</summary>
    TensileStrength,

    /// <summary>Vertical total stress, Pa.</summary>
    VerticalStress,

    /// <summary>Pore pressure, Pa.</summary>
    PorePressure,

    /// <summary>Least horizontal total stress, Pa.</summary>
    MinHorizontalStress,

    /// <summary>Greatest horizontal total stress, Pa.</summary>
    MaxHorizontalStress,

    /// <summary>Compressional slowness, s/m; derived from <see cref="Vp"/>.</summary>
    CompressionalSlowness,

    /// <summary>Shear slowness, s/m; derived from <see cref="Vs"/>.</summary>
    ShearSlowness,

    /// <summary>Normal pore pressure, Pa.</summary>
    NormalPressure,

    /// <summary>Compressional slowness of normally compacted shale, s/m.</summary>
    NormalSlowness,

    /// <summary>Share of the vertical stress that comes from depths without a density log.</summary>
    UnloggedShare,

    /// <summary>True vertical depth below the ground or mudline, m; only laws of shallow density take it.</summary>
    DepthBelowSurface,

    /// <summary>Mean density from the ground or mudline to a depth, kg/m3; only laws of shallow density give it.</summary>
    MeanDensityAbove,

    /// <summary>Density above the first log, kg/m3; only laws of shallow density give it.</summary>
    ShallowDensity,

    /// <summary>Parameter: density of the rock's matrix, kg/m3.</summary>
    MatrixDensity,

    /// <summary>Parameter: density of the fluid in the pores the density tool sees, kg/m3.</summary>
    PoreFluidDensity,

    /// <summary>Parameter: compressional slowness of the rock's matrix, s/m.</summary>
    MatrixSlowness,

    /// <summary>Parameter: compressional slowness of the fluid in the pores, s/m.</summary>
    FluidSlowness,

    /// <summary>Compressional velocity of the rock's matrix, m/s; from <see cref="MatrixSlowness"/>.</summary>
    MatrixVelocity,

    /// <summary>Compressional velocity of the fluid in the pores, m/s; from <see cref="FluidSlowness"/>.</summary>
    FluidVelocity,

    /// <summary>Parameter: what the porosity of uncompacted rock is divided by, a number of 1 or more.</summary>
    CompactionFactor,

    /// <summary>Parameter: bulk modulus of the rock's grains, Pa.</summary>
    MineralBulkModulus,

    /// <summary>Parameter: shear modulus of the rock's grains, Pa.</summary>
    MineralShearModulus,

    /// <summary>Parameter: shear velocity of the rock's matrix, m/s.</summary>
    MatrixShearVelocity,

    /// <summary>Standard error of shear velocity where it is predicted, m/s.</summary>
    ShearError,

    /// <summary>Standard error of bulk density where it is predicted, kg/m3.</summary>
    DensityError,

    /// <summary>Parameter: porosity at which the grains of the rock part, v/v.</summary>
    CriticalPorosity,

    /// <summary>Velocity of the faster of the two shear waves of a crossed-dipole tool, m/s.</summary>
    FastShear,

    /// <summary>Velocity of the slower of the two shear waves of a crossed-dipole tool, m/s.</summary>
    SlowShear,

    /// <summary>Velocity of the Stoneley wave at low frequency, m/s.</summary>
    Stoneley,

    /// <summary>Shallow resistivity, ohm.m.</summary>
    ShallowResistivity,

    /// <summary>Medium resistivity, ohm.m.</summary>
    MediumResistivity,

    /// <summary>Parameter: density of the mud that the Stoneley wave runs in, kg/m3.</summary>
    MudDensity,

    /// <summary>Parameter: velocity of sound in the mud, m/s.</summary>
    MudVelocity,

    /// <summary>Parameter: factor of the stiffness along the beds in the modified three-parameter shale.</summary>
    C11Factor,

    /// <summary>Parameter: C12 over C13 in the modified three-parameter shale.</summary>
    C12Factor,

    /// <summary>Dynamic shear stiffness in the plane of the beds, C66, Pa.</summary>
    BedShearStiffness,

    /// <summary>Dynamic stiffness along the beds, C11, Pa; only laws give it.</summary>
    BedStiffness,

    /// <summary>Dynamic stiffness between along and across the beds, C13, Pa; only laws give it.</summary>
    CrossStiffness,

    /// <summary>Dynamic Young's modulus along the beds, Pa; missing in isotropic rock, where the other one holds both ways.</summary>
    YoungsDynamicHorizontal,

    /// <summary>Dynamic Poisson's ratio in the plane of the beds; missing in isotropic rock.</summary>
    PoissonDynamicHorizontal,

    /// <summary>Static Young's modulus along the beds, Pa; missing in isotropic rock.</summary>
    YoungsStaticHorizontal,

    /// <summary>Static Poisson's ratio in the plane of the beds; missing in isotropic rock.</summary>
    PoissonStaticHorizontal,

    /// <summary>Biot's coefficient along the beds; missing in isotropic rock.</summary>
    BiotHorizontal,

    /// <summary>Deep resistivity of normally compacted shale, ohm.m.</summary>
    NormalResistivity,

    /// <summary>Porosity of normally compacted shale, v/v.</summary>
    NormalPorosity,

    /// <summary>Slowness of the shale samples a normal trend was fitted to, smoothed as they were, s/m; missing elsewhere.</summary>
    PickedSlowness,

    /// <summary>Effective stress where normally compacted shale has the sample's slowness, Pa.</summary>
    EquivalentStress,

    /// <summary>Parameter: slowness of the normal trend at the ground or mudline, s/m.</summary>
    TrendSurfaceSlowness,

    /// <summary>Parameter: slowness that the normal trend tends to at great depth, s/m.</summary>
    TrendMatrixSlowness,

    /// <summary>Parameter: porosity of the normal trend at the ground or mudline, v/v.</summary>
    TrendSurfacePorosity,

    /// <summary>Parameter: depth over which the exponential of the normal trend changes by a factor e, m.</summary>
    TrendScaleLength,

    /// <summary>Parameter: factor A of velocity against effective stress, ft/s/psi^B.</summary>
    BowersFactor,

    /// <summary>Parameter: exponent B of velocity against effective stress.</summary>
    BowersExponent,

    /// <summary>Parameter: unloading exponent U, 1 or more.</summary>
    BowersUnloading,

    /// <summary>Parameter: velocity where unloading began, m/s.</summary>
    BowersMaxVelocity,

    /// <summary>Parameter: effective stress that reduces porosity by a factor e, Pa.</summary>
    CompactionStress,

    /// <summary>Mode-I fracture toughness, Pa.m^0.5.</summary>
    Toughness,

    /// <summary>A brittleness index, a number that compares only within one index.</summary>
    Brittleness,

    /// <summary>True vertical depth below the ground, offshore below the sea surface, m; only comparison relations take it.</summary>
    DepthBelowGroundOrSea,

    /// <summary>Parameter of comparison relations: ratio of effective stresses, or the ratio it is made from.</summary>
    MatrixStressRatio,

    /// <summary>Least horizontal stress by a relation that the model is compared with, Pa; it never enters the model.</summary>
    ComparisonShmin,
}
