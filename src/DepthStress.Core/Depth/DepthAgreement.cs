namespace DepthStress.Core.Depth;

/// <summary>How far two statements of a depth may be apart and still agree.</summary>
public static class DepthAgreement
{
    /// <summary>Half a metre and a thousandth of the depth, m: rounding, sag and stretch (common practice).</summary>
    /// <param name="depth">The depth, m.</param>
    public static double Tolerance(double depth) => 0.5 + (1e-3 * Math.Abs(depth));
}
