using DepthStress.Core.Depth;

namespace DepthStress.Core.Model;

/// <summary>Where the zones lie along the hole.</summary>
public static class ZoneIndex
{
    /// <summary>The sample lies in no zone.</summary>
    public const short None = -1;

    /// <summary>Measured depth of a depth of some kind, m; NaN when the hole never reaches it.</summary>
    public static double ToMeasured(WellSetup setup, double depth, DepthKind kind)
    {
        ArgumentNullException.ThrowIfNull(setup);
        return kind switch
        {
            DepthKind.Measured => depth,
            DepthKind.TrueVertical => setup.Trajectory.MeasuredDepthAt(depth),
            _ => setup.Trajectory.MeasuredDepthAt(setup.Frame.FromSubsea(depth)),
        };
    }

    /// <summary>True vertical depth of a depth of some kind, m.</summary>
    public static double ToVertical(WellSetup setup, double depth, DepthKind kind)
    {
        ArgumentNullException.ThrowIfNull(setup);
        return kind switch
        {
            DepthKind.Measured => setup.Trajectory.At(depth).TrueVerticalDepth,
            DepthKind.TrueVertical => depth,
            _ => setup.Frame.FromSubsea(depth),
        };
    }

    /// <summary>Fills the zone of each sample; a sample on a top belongs to the zone below it.</summary>
    public static void Fill(WellSetup setup, ReadOnlySpan<double> measuredDepth, Span<short> index)
    {
        ArgumentNullException.ThrowIfNull(setup);
        index.Fill(None);
        for (var z = 0; z < setup.Zones.Count; z++)
        {
            var zone = setup.Zones[z];
            var top = ToMeasured(setup, zone.Top, zone.DepthKind);
            var bottom = zone.Base is { } b ? ToMeasured(setup, b, zone.DepthKind)
                : z + 1 < setup.Zones.Count ? ToMeasured(setup, setup.Zones[z + 1].Top, setup.Zones[z + 1].DepthKind)
                : double.PositiveInfinity;
            if (double.IsNaN(top)) continue;
            if (double.IsNaN(bottom)) bottom = double.PositiveInfinity;
            for (var i = FirstAtOrBelow(measuredDepth, top); i < measuredDepth.Length && measuredDepth[i] < bottom; i++) index[i] = (short)z;
        }
    }

    private static int FirstAtOrBelow(ReadOnlySpan<double> depths, double depth)
    {
        var i = depths.BinarySearch(depth);
        return i < 0 ? ~i : i;
    }
}
