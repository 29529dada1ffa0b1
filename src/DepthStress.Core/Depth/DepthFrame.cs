namespace DepthStress.Core.Depth;

/// <summary>
/// Where the surfaces around a well lie. Elevations are in metres above mean sea level; every <c>...Tvd</c> is a true
/// vertical depth in metres below the datum. Tides are not resolved: the sea surface is mean sea level.
/// </summary>
/// <param name="Datum">The surface at which depths are zero.</param>
/// <param name="DatumElevation">Elevation of the datum, m; 0 when the datum is sea level.</param>
/// <param name="GroundElevation">Elevation of the ground, m; null offshore.</param>
/// <param name="WaterDepth">Sea surface to sea floor, m, not negative; null onshore.</param>
/// <param name="WaterTableDepth">Ground to water table, m, not negative; null offshore, and onshore when it is at the ground.</param>
public sealed record DepthFrame(
    DatumKind Datum, double DatumElevation, double? GroundElevation, double? WaterDepth, double? WaterTableDepth)
{
    /// <summary>True when a water depth is given.</summary>
    public bool IsOffshore => WaterDepth.HasValue;

    /// <summary>Mean sea level, m tvd; negative when the datum lies below it.</summary>
    public double SeaLevelTvd => DatumElevation;

    /// <summary>The ground onshore, the sea surface offshore, m tvd: where result gradients count from.</summary>
    public double SurfaceTvd => IsOffshore ? SeaLevelTvd : GroundTvd;

    /// <summary>The top of the solid column, m tvd: the ground onshore, the mudline offshore.</summary>
    public double SolidTopTvd => IsOffshore ? MudlineTvd : GroundTvd;

    /// <summary>Where hydrostatic pressure starts, m tvd: the water table onshore, the sea surface offshore.</summary>
    public double HydrostaticTopTvd => IsOffshore ? SeaLevelTvd : GroundTvd + (WaterTableDepth ?? 0);

    private double GroundTvd => DatumElevation - (GroundElevation ?? double.NaN);

    private double MudlineTvd => SeaLevelTvd + (WaterDepth ?? double.NaN);

    /// <summary>True when the well has that surface: ground onshore only, sea surface and mudline offshore only.</summary>
    public bool Has(DepthReference reference) => double.IsFinite(TvdOf(reference));

    /// <summary>The surface a method counts from, m tvd; NaN when the well has no such surface.</summary>
    public double TvdOf(DepthReference reference) => reference switch
    {
        DepthReference.Datum => 0,
        DepthReference.Ground => IsOffshore ? double.NaN : GroundTvd,
        DepthReference.SeaSurface => IsOffshore ? SeaLevelTvd : double.NaN,
        DepthReference.Mudline => MudlineTvd,
        _ => throw new ArgumentOutOfRangeException(nameof(reference)),
    };

    /// <summary>True vertical depth below sea level (tvdss), m, positive downwards; NaN gives NaN.</summary>
    public double ToSubsea(double tvd) => tvd - SeaLevelTvd;

    /// <summary>True vertical depth below the datum from tvdss, m; NaN gives NaN.</summary>
    public double FromSubsea(double tvdss) => tvdss + SeaLevelTvd;

    /// <summary>Everything that keeps the frame from being used, in plain words; empty when it is sound.</summary>
    public static IReadOnlyList<string> Validate(DepthFrame frame)
    {
        ArgumentNullException.ThrowIfNull(frame);
        return DepthFrameCheck.Problems(frame);
    }
}
