using DepthStress.Core.Logs;

namespace DepthStress.Core.Conditioning;

/// <summary>Moves a whole curve along the hole; values between samples come by straight lines, never across a gap.</summary>
public static class DepthShift
{
    /// <summary>The step's name in origins and findings.</summary>
    public const string Name = "depth shift";

    /// <summary>The curve moved down by a distance.</summary>
    /// <param name="depths">Measured depths, m, strictly increasing.</param>
    /// <param name="values">The curve; NaN means missing.</param>
    /// <param name="by">How far down, m; negative moves up.</param>
    /// <returns>One value per depth; NaN where the moved curve does not reach or has none.</returns>
    /// <exception cref="ArgumentException">Lengths differ.</exception>
    public static double[] Move(ReadOnlySpan<double> depths, ReadOnlySpan<double> values, double by)
    {
        var moved = new double[depths.Length];
        for (var i = 0; i < moved.Length; i++) moved[i] = depths[i] + by;
        return DepthGrid.Bring(moved, values, depths, new bool[depths.Length]);
    }
}
