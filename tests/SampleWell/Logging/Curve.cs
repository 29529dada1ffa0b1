namespace SampleWell.Logging;

/// <summary>A log curve as it is written.</summary>
/// <param name="Name">Its column name.</param>
/// <param name="Unit">Its unit.</param>
/// <param name="Decimals">Digits behind the point.</param>
/// <param name="Role">What the well file calls it.</param>
/// <param name="Description">What the LAS file says of it.</param>
public sealed record Curve(string Name, string Unit, int Decimals, string Role, string Description)
{
    /// <summary>The number that stands for a missing value.</summary>
    public const double Missing = -999.25;

    /// <summary>Every curve but depth, in the order of the columns.</summary>
    public static IReadOnlyList<Curve> All { get; } =
    [
        new("GR", "gAPI", 2, "gamma_ray", "GAMMA RAY"),
        new("CALI", "in", 3, "caliper", "CALIPER"),
        new("BS", "in", 3, "bit_size", "BIT SIZE"),
        new("DTC", "us/ft", 3, "compressional", "COMPRESSIONAL SLOWNESS"),
        new("DTS", "us/ft", 3, "shear", "SHEAR SLOWNESS"),
        new("RHOB", "g/cm3", 4, "density", "BULK DENSITY"),
        new("DRHO", "g/cm3", 4, "density_correction", "BULK DENSITY CORRECTION"),
        new("NPHI", "v/v", 4, "neutron", "NEUTRON POROSITY, LIMESTONE UNITS"),
        new("PEF", "b/e", 3, "photoelectric", "PHOTOELECTRIC FACTOR"),
        new("RD", "ohm.m", 3, "deep_resistivity", "DEEP RESISTIVITY"),
    ];
}
