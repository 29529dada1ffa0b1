namespace SampleWell.Hidden;

/// <summary>Everything that is decided about a well before its rock is drawn. Depths in m, pressures in MPa.</summary>
public sealed record WellPlan
{
    /// <summary>Seed of every random stream of the well.</summary>
    public required ulong Seed { get; init; }

    /// <summary>Formations from top to bottom.</summary>
    public required IReadOnlyList<Formation> Formations { get; init; }

    /// <summary>The hole.</summary>
    public WellPath Path { get; init; } = new(1140, 1680, 35, 118);

    /// <summary>Rotary table above sea level.</summary>
    public double DatumElevation { get; init; } = 312.4;

    /// <summary>Ground above sea level.</summary>
    public double GroundElevation { get; init; } = 304.9;

    /// <summary>Water table below ground.</summary>
    public double WaterTable { get; init; } = 18;

    /// <summary>First and last sample, in half feet of measured depth below the datum.</summary>
    public (int First, int Last) HalfFeet { get; init; } = (5906, 22309);

    /// <summary>Mean density between the ground and the first sample, kg/m3.</summary>
    public double DensityAbove { get; init; } = 2100;

    /// <summary>Density of the pore fluid, kg/m3.</summary>
    public double FluidDensity { get; init; } = 1030;

    /// <summary>Pressure above hydrostatic in the limestone and in the lowest shale.</summary>
    public (double Limestone, double Deep) Excess { get; init; } = (4.2, 9.4);

    /// <summary>Tectonic strain along the least horizontal stress, compression positive.</summary>
    public double StrainMin { get; init; } = 140e-6;

    /// <summary>Tectonic strain along the greatest horizontal stress, compression positive.</summary>
    public double StrainMax { get; init; } = 460e-6;

    /// <summary>Azimuth of the greatest horizontal stress, degrees.</summary>
    public double ShmaxAzimuth { get; init; } = 62;

    /// <summary>Thomsen's epsilon, gamma and delta of pure shale; all zero makes every rock isotropic.</summary>
    public (double Epsilon, double Gamma, double Delta) Anisotropy { get; init; } = (0.08, 0.11, 0.02);

    /// <summary>Measured depth of the splice between the two runs.</summary>
    public double Splice => 2101;

    /// <summary>Vertical distance from the datum down to the ground.</summary>
    public double GroundTvd => DatumElevation - GroundElevation;

    /// <summary>Vertical depth of the water table below the datum.</summary>
    public double WaterTvd => GroundTvd + WaterTable;

    /// <summary>Measured depth of the first sample.</summary>
    public double FirstMd => HalfFeet.First * Physics.HalfFoot;

    /// <summary>Measured depth of the last sample.</summary>
    public double LastMd => HalfFeet.Last * Physics.HalfFoot;

    /// <summary>Index of the formation that holds a measured depth; a top belongs to the formation below it.</summary>
    public int FormationAt(double md)
    {
        var index = 0;
        while (index + 1 < Formations.Count && md >= Formations[index + 1].Top)
            index++;
        return index;
    }

    /// <summary>Top and base of a formation along the hole.</summary>
    public (double Top, double Base) Span(int index) =>
        (Formations[index].Top, index + 1 < Formations.Count ? Formations[index + 1].Top : LastMd);
}
