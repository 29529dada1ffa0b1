using DepthStress.Core.Quantities;

namespace DepthStress.Core.Logs;

/// <summary>Names and dimensions of the properties that laws connect.</summary>
public static class PropertyNames
{
    /// <summary>
    /// The properties in the order in which the chain knows them: a law may start from any that comes before its result.
    /// </summary>
    private static readonly (Property Property, string Name, string Title, Dimension Dimension)[] Known =
    [
        (Property.Vp, "vp", "compressional velocity", Quantities.Dimension.Velocity),
        (Property.Vs, "vs", "shear velocity", Quantities.Dimension.Velocity),
        (Property.Density, "density", "bulk density", Quantities.Dimension.Density),
        (Property.GammaRay, "gamma_ray", "gamma ray", Quantities.Dimension.GammaRay),
        (Property.NeutronPorosity, "neutron", "neutron porosity", Quantities.Dimension.Fraction),
        (Property.DeepResistivity, "deep_resistivity", "deep resistivity", Quantities.Dimension.Resistivity),
        (Property.CompressionalSlowness, "compressional_slowness", "compressional slowness", Quantities.Dimension.Slowness),
        (Property.ShearSlowness, "shear_slowness", "shear slowness", Quantities.Dimension.Slowness),
        (Property.GammaRayIndex, "gamma_ray_index", "gamma-ray index", Quantities.Dimension.Fraction),
        (Property.ShaleVolume, "shale_volume", "shale volume", Quantities.Dimension.Fraction),
        (Property.MatrixDensity, "matrix_density", "matrix density", Quantities.Dimension.Density),
        (Property.PoreFluidDensity, "fluid_density", "pore fluid density", Quantities.Dimension.Density),
        (Property.MatrixSlowness, "matrix_slowness", "matrix slowness", Quantities.Dimension.Slowness),
        (Property.FluidSlowness, "fluid_slowness", "pore fluid slowness", Quantities.Dimension.Slowness),
        (Property.MatrixVelocity, "matrix_velocity", "matrix velocity", Quantities.Dimension.Velocity),
        (Property.FluidVelocity, "fluid_velocity", "pore fluid velocity", Quantities.Dimension.Velocity),
        (Property.CompactionFactor, "compaction_factor", "compaction factor", Quantities.Dimension.None),
        (Property.Porosity, "porosity", "porosity", Quantities.Dimension.Fraction),
        (Property.YoungsDynamic, "youngs_dynamic", "dynamic Young's modulus", Quantities.Dimension.Pressure),
        (Property.PoissonDynamic, "poisson_dynamic", "dynamic Poisson's ratio", Quantities.Dimension.None),
        (Property.YoungsStatic, "youngs_static", "static Young's modulus", Quantities.Dimension.Pressure),
        (Property.PoissonStatic, "poisson_static", "static Poisson's ratio", Quantities.Dimension.None),
        (Property.Ucs, "ucs", "unconfined compressive strength", Quantities.Dimension.Pressure),
        (Property.FrictionAngle, "friction_angle", "angle of internal friction", Quantities.Dimension.Angle),
        (Property.TensileStrength, "tensile_strength", "tensile strength", Quantities.Dimension.Pressure),
        (Property.Toughness, "toughness", "mode-I fracture toughness", Quantities.Dimension.Toughness),
        (Property.Brittleness, "brittleness", "brittleness index", Quantities.Dimension.None),
        (Property.MineralBulkModulus, "mineral_bulk_modulus", "bulk modulus of the mineral", Quantities.Dimension.Pressure),
        (Property.MineralShearModulus, "mineral_shear_modulus", "shear modulus of the mineral", Quantities.Dimension.Pressure),
        (Property.MatrixShearVelocity, "matrix_shear_velocity", "matrix shear velocity", Quantities.Dimension.Velocity),
        (Property.CriticalPorosity, "critical_porosity", "critical porosity", Quantities.Dimension.Fraction),
        (Property.Biot, "biot", "Biot's coefficient", Quantities.Dimension.None),
        (Property.VerticalStress, "sv", "vertical stress", Quantities.Dimension.Pressure),
        (Property.NormalPressure, "normal_pressure", "normal pore pressure", Quantities.Dimension.Pressure),
        (Property.NormalSlowness, "normal_slowness", "slowness of the normal trend", Quantities.Dimension.Slowness),
        (Property.NormalResistivity, "normal_resistivity", "resistivity of the normal trend", Quantities.Dimension.Resistivity),
        (Property.EquivalentStress, "equivalent_stress", "effective stress at the equivalent depth", Quantities.Dimension.Pressure),
        (Property.DepthBelowSurface, "depth_below_surface", "depth below ground or mudline", Quantities.Dimension.Length),
        (Property.TrendSurfaceSlowness, "trend_surface_slowness", "slowness of the normal trend at the ground or mudline", Quantities.Dimension.Slowness),
        (Property.TrendMatrixSlowness, "trend_matrix_slowness", "slowness of the normal trend at great depth", Quantities.Dimension.Slowness),
        (Property.TrendSurfacePorosity, "trend_surface_porosity", "porosity of the normal trend at the ground or mudline", Quantities.Dimension.Fraction),
        (Property.TrendScaleLength, "trend_scale_length", "scale length of the normal trend", Quantities.Dimension.Length),
        (Property.BowersFactor, "bowers_a", "factor of velocity against effective stress", Quantities.Dimension.None),
        (Property.BowersExponent, "bowers_b", "exponent of velocity against effective stress", Quantities.Dimension.None),
        (Property.BowersUnloading, "bowers_u", "unloading exponent", Quantities.Dimension.None),
        (Property.BowersMaxVelocity, "maximum_velocity", "velocity where unloading began", Quantities.Dimension.Velocity),
        (Property.CompactionStress, "compaction_stress", "effective stress that reduces porosity by a factor e", Quantities.Dimension.Pressure),
        (Property.PorePressure, "pp", "pore pressure", Quantities.Dimension.Pressure),
        (Property.MeanDensityAbove, "mean_density_above", "mean density above the log", Quantities.Dimension.Density),
        (Property.ShallowDensity, "shallow_density", "density above the log", Quantities.Dimension.Density),
        (Property.Stoneley, "stoneley", "velocity of the Stoneley wave", Quantities.Dimension.Velocity),
        (Property.MudDensity, "mud_density", "mud density", Quantities.Dimension.Density),
        (Property.MudVelocity, "mud_velocity", "velocity of sound in the mud", Quantities.Dimension.Velocity),
        (Property.BedShearStiffness, "c66", "shear stiffness in the plane of the beds", Quantities.Dimension.Pressure),
        (Property.C11Factor, "c11_factor", "factor of the stiffness along the beds", Quantities.Dimension.None),
        (Property.BedStiffness, "c11", "stiffness along the beds", Quantities.Dimension.Pressure),
        (Property.C12Factor, "c12_factor", "C12 over C13", Quantities.Dimension.None),
        (Property.CrossStiffness, "c13", "stiffness between along and across the beds", Quantities.Dimension.Pressure),
        (Property.DepthBelowGroundOrSea, "depth_below_ground_or_sea", "depth below ground, offshore below the sea surface", Quantities.Dimension.Length),
        (Property.MatrixStressRatio, "matrix_stress_ratio", "ratio stated beside the method", Quantities.Dimension.None),
        (Property.ComparisonShmin, "comparison_shmin", "Shmin for comparison", Quantities.Dimension.Pressure),
    ];

    /// <summary>The property of a name in well files, or null.</summary>
    public static Property? Find(string name) =>
        Array.Find(Known, k => k.Name == name) is { Name: not null } known ? known.Property : null;

    /// <summary>The property's name in well files.</summary>
    public static string Name(Property property) => Of(property).Name;

    /// <summary>The property in plain words.</summary>
    public static string Title(Property property) => Of(property).Title;

    /// <summary>What the property measures.</summary>
    public static Dimension Dimension(Property property) => Of(property).Dimension;

    /// <summary>The properties that the chain knows before it computes this one.</summary>
    public static IEnumerable<Property> LawInputsBefore(Property property) => property switch
    {
        // Logs are known from the start, but what is predicted starts from nothing that rests on it: density before porosity, shear after it.
        Property.Density => Before(Property.MatrixDensity).Except([Property.Density, Property.Vs, Property.ShearSlowness]),
        Property.Vs => Before(Property.YoungsDynamic).Except([Property.Vs, Property.ShearSlowness]).Append(Property.MatrixShearVelocity),
        _ => Before(property),
    };

    /// <summary>What a user's own law for the property starts from when the well file does not say.</summary>
    public static Property UsualInput(Property property) => property switch
    {
        Property.YoungsStatic => Property.YoungsDynamic,
        Property.PoissonStatic => Property.PoissonDynamic,
        Property.TensileStrength => Property.Ucs,
        Property.Toughness => Property.TensileStrength,
        Property.Brittleness => Property.YoungsStatic,
        Property.Ucs => Property.YoungsStatic,
        Property.ShaleVolume => Property.GammaRayIndex,
        Property.Porosity => Property.NeutronPorosity,
        Property.Biot => Property.Porosity,
        _ => Property.Vp,
    };

    private static IEnumerable<Property> Before(Property property) => Known.TakeWhile(k => k.Property != property).Select(k => k.Property);

    private static (Property Property, string Name, string Title, Dimension Dimension) Of(Property property) =>
        Array.Find(Known, k => k.Property == property) is { Name: not null } known
            ? known
            : throw new ArgumentOutOfRangeException(nameof(property), property, "No law gives or takes it.");
}
