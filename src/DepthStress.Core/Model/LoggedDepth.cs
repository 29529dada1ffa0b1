using DepthStress.Core.Depth;
using DepthStress.Core.Logs;

namespace DepthStress.Core.Model;

/// <summary>A depth curve of a log file as true vertical depth below the datum.</summary>
/// <param name="Tvd">True vertical depths, m; NaN where the curve has none.</param>
/// <param name="Reading">How the curve was read, in plain words.</param>
internal sealed record LoggedDepth(double[] Tvd, string Reading)
{
    /// <summary>
    /// Reads the curve. A true vertical depth is what it is. A vertical position counts from sea level, upwards or downwards: the
    /// sign holds that puts more samples below the datum and no deeper vertically than along the hole, and between equals the one
    /// that goes down with measured depth.
    /// </summary>
    public static LoggedDepth Read(DepthFrame frame, ReadOnlySpan<double> md, Curve curve)
    {
        if (curve.Role.Property == Property.LoggedVerticalDepth) return new(curve.Values, "true vertical depth below the datum");
        var upwards = Array.ConvertAll(curve.Values, v => frame.FromSubsea(-v));
        var downwards = Array.ConvertAll(curve.Values, frame.FromSubsea);
        var better = Possible(md, upwards).CompareTo(Possible(md, downwards));
        if (better == 0) better = Rise(downwards) > 0 ? -1 : 1;
        return better > 0
            ? new(upwards, "height above sea level, negative below it")
            : new(downwards, "depth below sea level, positive downwards");
    }

    private static int Possible(ReadOnlySpan<double> md, double[] tvd)
    {
        var count = 0;
        for (var i = 0; i < tvd.Length; i++)
        {
            if (tvd[i] >= -DepthAgreement.Tolerance(0) && tvd[i] <= md[i] + DepthAgreement.Tolerance(md[i])) count++;
        }

        return count;
    }

    private static double Rise(double[] values) =>
        Array.FindLast(values, double.IsFinite) - Array.Find(values, double.IsFinite);
}
