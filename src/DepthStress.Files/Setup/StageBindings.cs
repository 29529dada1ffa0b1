using DepthStress.Core.Catalogue;
using DepthStress.Core.Diagnostics;
using DepthStress.Core.Lithology;
using DepthStress.Core.Logs;
using DepthStress.Core.Model;
using DepthStress.Core.Prediction;
using DepthStress.Core.Quantities;
using DepthStress.Core.Rock;
using DepthStress.Core.Stress;

namespace DepthStress.Files.Setup;

/// <summary>Declares the keys of the sections that a zone or a lithology rule may override.</summary>
internal static class StageBindings
{
    private static readonly (string, HorizontalStressMethod)[] StressMethods =
        [("strain", HorizontalStressMethod.Strain), ("effective-stress-ratio", HorizontalStressMethod.EffectiveStressRatio)];

    /// <summary>All of them.</summary>
    public static StageSettings All(ISection s, StageSettings c) => c with
    {
        Conditioning = s.Table("conditioning", c.Conditioning, ConditioningBindings.All, "log conditioning: what is taken out, moved or bridged"),
        Shale = s.Table("shale", c.Shale, Shale, "shale volume from gamma ray"),
        Prediction = s.Table("prediction", c.Prediction, Prediction, "shear velocity and density where they are not logged"),
        Porosity = s.Table("porosity", c.Porosity, Porosity, "porosity"),
        Anisotropy = s.Table("anisotropy", c.Anisotropy, AnisotropyBindings.Anisotropy, "how layered rock differs along and across its beds; without it rock is isotropic"),
        Moduli = s.Table("moduli", c.Moduli, Moduli, "static elastic constants from dynamic ones"),
        Strength = s.Table("strength", c.Strength, Strength, "rock strength"),
        Biot = s.Table("biot", c.Biot, Biot, "Biot's coefficient"),
        PorePressure = s.Table("pore_pressure", c.PorePressure, PressureBindings.PorePressure, "pore pressure"),
        Fluids = s.Table("fluids", c.Fluids, PressureBindings.Fluids, "fluids in the pores and their contacts, for method or sands = \"fluid line\""),
        Temperature = s.Table("temperature", c.Temperature, AnisotropyBindings.Temperature, "temperature of the rock, for thermal stress"),
        HorizontalStress = s.Table("horizontal_stress", c.HorizontalStress, HorizontalStress, "horizontal stresses"),
    };

    private static ShaleSettings Shale(ISection s, ShaleSettings c) => c with
    {
        Volume = s.Law("volume", c.Volume, Property.ShaleVolume, "relation between gamma-ray index and shale volume"),
        Clean = s.Quantity("clean", c.Clean, Sign.NotNegative, Dimension.GammaRay, "gamma ray of clean rock"),
        Shale = s.Quantity("shale", c.Shale, Sign.NotNegative, Dimension.GammaRay, "gamma ray of shale"),
    };

    private static PredictionSettings Prediction(ISection s, PredictionSettings c) => c with
    {
        Shear = s.Law("shear", c.Shear, Property.Vs, "relation that gives shear velocity where it is not logged, or \"trained\" on the well's own samples"),
        Density = s.Law("density", c.Density, Property.Density, "relation that gives density where it is not logged, or \"trained\" on the well's own samples"),
    };

    private static PorositySettings Porosity(ISection s, PorositySettings c) => c with
    {
        Porosity = s.Law("porosity", c.Porosity, Property.Porosity, "relation that gives porosity"),
        MatrixDensity = s.Quantity("matrix_density", c.MatrixDensity, Sign.Positive, Dimension.Density, "density of the matrix"),
        FluidDensity = s.FluidDensity("fluid_density", c.FluidDensity, "density of the fluid the density tool sees"),
        MatrixSlowness = s.Quantity("matrix_slowness", c.MatrixSlowness, Sign.Positive, Dimension.Slowness, "compressional slowness of the matrix"),
        FluidSlowness = s.Quantity("fluid_slowness", c.FluidSlowness, Sign.Positive, Dimension.Slowness, "compressional slowness of the pore fluid"),
        CompactionFactor = s.Number("compaction_factor", c.CompactionFactor, new Interval(1, 5), "what sonic porosity is divided by in rock that is not compacted"),
    };

    private static ModuliSettings Moduli(ISection s, ModuliSettings c) => c with
    {
        StaticYoungs = s.Law("static_youngs", c.StaticYoungs, Property.YoungsStatic, "relation that gives static Young's modulus"),
        StaticYoungsFactor = s.Number("static_youngs_factor", c.StaticYoungsFactor, new Interval(0.05, 20), "what the relation's static Young's modulus is multiplied with, as core plugs ask for it"),
        StaticPoisson = s.Law("static_poisson", c.StaticPoisson, Property.PoissonStatic, "choice that gives static Poisson's ratio"),
    };

    private static StrengthSettings Strength(ISection s, StrengthSettings c) => c with
    {
        Ucs = s.Law("ucs", c.Ucs, Property.Ucs, "relation that gives unconfined compressive strength"),
        FrictionAngle = s.Law("friction_angle", c.FrictionAngle, Property.FrictionAngle, "relation that gives the angle of internal friction"),
        TensileStrength = s.Law("tensile_strength", c.TensileStrength, Property.TensileStrength, "relation that gives tensile strength"),
        Toughness = s.Law("toughness", c.Toughness, Property.Toughness, "relation that gives mode-I fracture toughness"),
        Brittleness = s.Law("brittleness", c.Brittleness, Property.Brittleness, "brittleness index"),
    };

    private static BiotSettings Biot(ISection s, BiotSettings c) => c with
    {
        Coefficient = s.Law("coefficient", c.Coefficient, Property.Biot, "Biot's coefficient, a number or a relation"),
        MineralBulkModulus = s.Quantity("mineral_bulk_modulus", c.MineralBulkModulus, Sign.Positive, Dimension.Pressure, "bulk modulus of the grains"),
        MineralShearModulus = s.Quantity("mineral_shear_modulus", c.MineralShearModulus, Sign.Positive, Dimension.Pressure, "shear modulus of the grains"),
        MatrixShearVelocity = s.Quantity("matrix_shear_velocity", c.MatrixShearVelocity, Sign.Positive, Dimension.Velocity, "shear velocity of the matrix"),
        CriticalPorosity = s.Number("critical_porosity", c.CriticalPorosity, new Interval(0.01, 1), "porosity at which the grains part"),
    };

    private static HorizontalStressSettings HorizontalStress(ISection s, HorizontalStressSettings c) => c with
    {
        Method = s.Choice("method", c.Method, StressMethods, "strain: elastic rock between strained sides; effective-stress-ratio: Shmin = Pp + ratio (Sv - Pp), where strains and elastic constants do not enter"),
        Ratio = s.Number("ratio", c.Ratio, new Interval(0, 5), "effective-stress-ratio: effective Shmin over effective vertical stress"),
        RatioShmax = s.Number("ratio_shmax", c.RatioShmax, new Interval(0, 10), "effective-stress-ratio: the same for SHmax, which stays empty without"),
        ThermalExpansion = s.Quantity("thermal_expansion", c.ThermalExpansion, Sign.Positive, Dimension.ThermalExpansion, "strain: linear thermal expansion along the beds; rock warmer than [temperature] reference gains horizontal stress, cooler rock loses it"),
        Compare = Compare(s, c.Compare),
        PressureChange = s.Quantity("pressure_change", c.PressureChange, Sign.Any, Dimension.Pressure, "a later change of pore pressure, negative in depletion: the summary says what Shmin becomes; the profile stays"),
        StrainAlongShmin = s.Quantity("strain_along_shmin", c.StrainAlongShmin, Sign.Any, Dimension.Strain, "tectonic strain along Shmin, compression positive"),
        StrainAlongShmax = s.Quantity("strain_along_shmax", c.StrainAlongShmax, Sign.Any, Dimension.Strain, "tectonic strain along SHmax, compression positive"),
        ShmaxAzimuth = s.Quantity("shmax_azimuth", c.ShmaxAzimuth, Sign.Any, Dimension.Angle, "azimuth of SHmax from north"),
        FrictionCoefficient = s.Number("friction_coefficient", c.FrictionCoefficient, new Interval(0, 2), "friction of existing faults, for the frictional limit"),
    };

    private static Setting<IReadOnlyList<ComparisonChoice>> Compare(ISection s, Setting<IReadOnlyList<ComparisonChoice>> current)
    {
        var choices = s.Tables(
            "compare", current.IsSet ? current.Value : [], Comparison, new ComparisonChoice(), "relations whose curves stand beside the model's Shmin; they never enter it", "method");
        var source = s.SourceOf("compare");
        return source.Kind == SettingKind.NotSet ? current : new(choices, source);
    }

    private static ComparisonChoice Comparison(ISection s, ComparisonChoice c) => c with
    {
        Method = s.Choice("method", c.Method, [.. ComparisonMethods.All.Select(l => (l.Id, l))], "the relation"),
        Ratio = s.Number("ratio", c.Ratio, new Interval(0, 1), "the ratio that matthews-kelly-1967 and eaton-1969 take: yours, from leak-offs of the region"),
        Position = s.Position,
    };
}
