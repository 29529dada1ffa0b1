using SampleWell.Hidden;

namespace SampleWell.Twins;

/// <summary>Where a twin stands: what lies above its first sample, and how its well file says so.</summary>
/// <param name="Path">The hole.</param>
/// <param name="Datum">Rotary table above sea level, m.</param>
/// <param name="Floor">Vertical depth of the ground or the sea floor below the rotary table, m.</param>
/// <param name="Water">Vertical depth below the rotary table where hydrostatic pressure starts, m: water table or sea level.</param>
/// <param name="WaterDensity">Density of the sea, kg/m3; 0 on land.</param>
/// <param name="DensityAbove">Mean density from the floor to the first sample, kg/m3.</param>
internal sealed record TwinSite(WellPath Path, double Datum, double Floor, double Water, double WaterDensity, double DensityAbove)
{
    /// <summary>Density of the pore fluid of every twin, kg/m3.</summary>
    public const double FluidDensity = 1030;

    /// <summary>A deviated well on land.</summary>
    public static TwinSite Onshore { get; } = new(new WellPath(1140, 1680, 35, 118), 312.4, 7.5, 25.5, 0, 2100);

    /// <summary>A vertical well in 85 m of sea with 24 m of air above it.</summary>
    public static TwinSite Offshore { get; } = new(new WellPath(0, 30, 0, 0), 24, 24 + 85, 24, 1025, 1950);

    /// <summary>Overburden at the first sample, MPa.</summary>
    public double OverburdenAt(double tvd) =>
        Physics.ColumnMpa(WaterDensity, Floor - Water) + Physics.ColumnMpa(DensityAbove, tvd - Floor);

    /// <summary>The part of the well file that differs from site to site.</summary>
    public string WellSection => WaterDensity > 0
        ? $"""
          datum_elevation = "{Writing.FixedText.Quantity(Datum, 1, "m")}"
          water_depth = "{Writing.FixedText.Quantity(Floor - Water, 1, "m")}"
          """
        : $"""
          datum_elevation = "{Writing.FixedText.Quantity(Datum, 1, "m")}"
          ground_elevation = "{Writing.FixedText.Quantity(Datum - Floor, 1, "m")}"
          water_table_depth = "{Writing.FixedText.Quantity(Water - Floor, 1, "m")}"
          """;

    /// <summary>The overburden part of the well file.</summary>
    public string OverburdenSection => WaterDensity > 0
        ? $"""
          above_log = "{Writing.FixedText.Quantity(DensityAbove / 1000, 3, "g/cm3")}"
          water_density = "{Writing.FixedText.Quantity(WaterDensity / 1000, 3, "g/cm3")}"
          """
        : $"""above_log = "{Writing.FixedText.Quantity(DensityAbove / 1000, 3, "g/cm3")}" """.TrimEnd();
}
