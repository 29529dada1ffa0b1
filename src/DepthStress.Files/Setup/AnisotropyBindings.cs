using DepthStress.Core.Catalogue;
using DepthStress.Core.Quantities;
using DepthStress.Core.Rock;
using DepthStress.Core.Stress;

namespace DepthStress.Files.Setup;

/// <summary>Declares the keys of the [anisotropy] and [temperature] sections.</summary>
internal static class AnisotropyBindings
{
    private static readonly (string, AnisotropyModel)[] Models =
    [
        ("isotropic", AnisotropyModel.Isotropic), ("annie", AnisotropyModel.Annie),
        ("modified-annie", AnisotropyModel.ModifiedAnnie), ("thomsen", AnisotropyModel.Thomsen),
    ];

    private static readonly (string, BedShearSource)[] BedShears =
    [
        ("stoneley", BedShearSource.Stoneley), ("fast shear", BedShearSource.FastShear),
        ("slow shear", BedShearSource.SlowShear), ("gamma", BedShearSource.Gamma),
    ];

    private static readonly (string, bool)[] Velocities = [("along hole", true), ("vertical", false)];

    private static readonly (string, ShearWave)[] Waves = [("sh", ShearWave.AlongBeds), ("sv", ShearWave.AcrossBeds)];

    private static readonly (string, bool)[] Outsides = [("missing", false), ("isotropic", true)];

    private static readonly (string, StaticConversion)[] Conversions =
        [("each modulus", StaticConversion.EachModulus), ("whole stiffness", StaticConversion.WholeStiffness)];

    private static readonly (string, TemperatureSource)[] Sources = [("log", TemperatureSource.Log), ("gradient", TemperatureSource.Gradient)];

    /// <summary>The [anisotropy] section.</summary>
    public static AnisotropySettings Anisotropy(ISection s, AnisotropySettings c) => c with
    {
        Model = s.Choice("model", c.Model, Models, "what gives the stiffnesses that sonic across the beds does not"),
        Epsilon = s.Number("epsilon", c.Epsilon, new Interval(-0.2, 1), "thomsen: how much stiffer compression is along the beds, (C11 - C33) / (2 C33)"),
        Gamma = s.Number("gamma", c.Gamma, new Interval(-0.2, 1.5), "thomsen, or c66 = \"gamma\": how much stiffer shear is along the beds, (C66 - C44) / (2 C44)"),
        Delta = s.Number("delta", c.Delta, new Interval(-0.4, 1), "thomsen: how compression changes close to the normal of the beds"),
        ScaleWithShale = s.Flag("scale_with_shale", c.ScaleWithShale, "true when epsilon, gamma and delta are those of pure shale and are multiplied by shale volume (common practice)"),
        C66 = s.Choice("c66", c.C66, BedShears, "annie, modified-annie: where the shear stiffness in the plane of the beds comes from: the Stoneley wave within 20 deg of the normal of the beds, or the SH wave of a shear log from 60 deg on, or gamma"),
        MudDensity = s.FluidDensity("mud_density", c.MudDensity, "stoneley: density of the mud the wave ran in"),
        MudVelocity = s.Quantity("mud_velocity", c.MudVelocity, Sign.Positive, Dimension.Velocity, "stoneley: velocity of sound in that mud"),
        C11Factor = s.Number("c11_factor", c.C11Factor, new Interval(0.5, 2), "modified-annie: C11 over 2 (C66 - C44) + C33, from core"),
        C12Factor = s.Number("c12_factor", c.C12Factor, new Interval(0.5, 2), "modified-annie: C12 over C13, from core"),
        AlongHole = s.Choice("velocities", c.AlongHole, Velocities, "what the velocities given are: those along the hole, as a tool measures them, or already those across the beds"),
        ShearWave = s.Choice("shear_wave", c.ShearWave, Waves, "what the shear log shows where the hole crosses beds obliquely: the wave that moves along the beds (sh) or the other one (sv)"),
        IsotropicOutside = s.Choice("outside", c.IsotropicOutside, Outsides, "what samples are that the model cannot serve"),
        StaticConversion = s.Choice("static_conversion", c.StaticConversion, Conversions, "how the stiffness becomes static: the laws of [moduli] on both moduli and both Poisson's ratios, or the factor of the vertical modulus on the whole stiffness"),
    };

    /// <summary>The [temperature] section.</summary>
    public static TemperatureSettings Temperature(ISection s, TemperatureSettings c) => c with
    {
        Source = s.Choice("source", c.Source, Sources, "where the temperature of the rock comes from"),
        Surface = s.Quantity("surface", c.Surface, Sign.Any, Dimension.Temperature, "gradient: temperature at the ground or mudline"),
        Gradient = s.Quantity("gradient", c.Gradient, Sign.Any, Dimension.TemperatureGradient, "gradient: rise with true vertical depth"),
        Reference = s.Quantity("reference", c.Reference, Sign.Any, Dimension.Temperature, "the temperature at which the rock had no thermal stress"),
    };
}
