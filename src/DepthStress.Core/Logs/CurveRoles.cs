using static DepthStress.Core.Quantities.Dimension;

namespace DepthStress.Core.Logs;

/// <summary>
/// The role table. Mnemonics are those in common use in the trade; credible medians are wide (common practice) and serve
/// only to catch a unit that cannot be right.
/// </summary>
public static class CurveRoles
{
    /// <summary>Every role, in the order results list them.</summary>
    public static IReadOnlyList<CurveRole> All { get; } =
    [
        new("compressional", "compressional slowness or velocity", Property.Vp, [Slowness, Velocity], 1400, 7500,
            "DTC", "DTCO", "DT", "AC", "DTP", "DT4P", "DTL", "VP"),
        new("shear", "shear slowness or velocity", Property.Vs, [Slowness, Velocity], 150, 4500,
            "DTS", "DTSM", "DTSH", "DT4S", "DTXX", "VS"),
        new("fast_shear", "slowness or velocity of the faster shear wave", Property.FastShear, [Slowness, Velocity], 150, 4500,
            "DTSF", "DTS_FAST", "DTSFAST", "FAST_SHEAR"),
        new("slow_shear", "slowness or velocity of the slower shear wave", Property.SlowShear, [Slowness, Velocity], 150, 4500,
            "DTSS", "DTS_SLOW", "DTSSLOW", "SLOW_SHEAR"),
        new("stoneley", "slowness or velocity of the Stoneley wave", Property.Stoneley, [Slowness, Velocity], 400, 1600,
            "DTST", "DT3R", "DTSTONELEY", "STONELEY"),
        new("density", "bulk density", Property.Density, [Density], 1300, 3300,
            "RHOB", "RHOZ", "DEN", "ZDEN", "ROBB", "RHO"),
        new("gamma_ray", "gamma ray", Property.GammaRay, [GammaRay], 5, 600,
            "GR", "SGR", "CGR", "GRC", "GAM", "ECGR"),
        new("caliper", "hole diameter", Property.Caliper, [Length], 0.05, 1.5,
            "CALI", "CAL", "HCAL", "CALX", "C1"),
        new("bit_size", "bit diameter", Property.BitSize, [Length], 0.05, 1.5,
            "BS", "BIT", "BITSIZE"),
        new("density_correction", "density correction", Property.DensityCorrection, [Density], -500, 500,
            "DRHO", "HDRA", "ZCOR", "DCOR"),
        new("neutron", "neutron porosity", Property.NeutronPorosity, [Fraction], -0.15, 0.8,
            "NPHI", "TNPH", "NPOR", "CNC", "NEU"),
        new("photoelectric", "photoelectric factor", Property.Photoelectric, [Photoelectric], 0.5, 10,
            "PEF", "PE", "PEFZ", "PDPE"),
        new("deep_resistivity", "deep resistivity", Property.DeepResistivity, [Resistivity], 0.02, 20000,
            "RDEP", "RT", "ILD", "LLD", "RD", "RESD", "AT90"),
        new("medium_resistivity", "medium resistivity", Property.MediumResistivity, [Resistivity], 0.02, 20000,
            "RMED", "ILM", "RESM", "RM", "AT30"),
        new("shallow_resistivity", "shallow resistivity", Property.ShallowResistivity, [Resistivity], 0.02, 20000,
            "RSHAL", "RSHA", "LLS", "SFL", "SFLU", "RESS", "RS", "AT10"),
        new("temperature", "formation temperature", Property.Temperature, [Temperature], 250, 600,
            "TEMP", "BHT", "FTEMP"),
        new("porosity", "porosity", Property.Porosity, [Fraction], 0, 0.7,
            "PHIT", "PHIE", "PHI", "POR"),
        new("shale_volume", "shale volume", Property.ShaleVolume, [Fraction], 0, 1,
            "VSH", "VSHALE", "VCL"),
        new("facies", "facies code", Property.Facies, [None], double.NegativeInfinity, double.PositiveInfinity,
            "FACIES", "LITHO", "LITHOLOGY"),
        new("true_vertical_depth", "true vertical depth below the datum", Property.LoggedVerticalDepth, [Length], double.NegativeInfinity, double.PositiveInfinity,
            "TVD", "TVDRT", "TVD_RT", "TVDBRT", "TVDKB", "TVD_KB", "TVDRKB", "TVD_RKB", "TVDDF"),
        new("vertical_position", "height above or depth below sea level", Property.LoggedVerticalPosition, [Length], double.NegativeInfinity, double.PositiveInfinity,
            "Z_LOC", "ZLOC", "TVDSS", "TVD_SS", "TVDMSL", "TVD_MSL", "ELEVATION", "Z"),
    ];

    /// <summary>Column names for measured depth (common practice).</summary>
    public static IReadOnlyList<string> DepthMnemonics { get; } =
        ["DEPT", "DEPTH", "MD", "MEASURED_DEPTH", "DEPTH_MD", "TDEP", "MD_DEPTH", "MEASDEPTH", "MEASUREDDEPTH"];

    /// <summary>Finds a role by its name in the well file, or null.</summary>
    public static CurveRole? Find(string id) => All.FirstOrDefault(r => r.Id == id);

    /// <summary>Finds a role by a property, or null when the property is never read from a file.</summary>
    public static CurveRole? Of(Property property) => All.FirstOrDefault(r => r.Property == property);
}
