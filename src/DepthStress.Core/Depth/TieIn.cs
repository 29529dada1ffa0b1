namespace DepthStress.Core.Depth;

/// <summary>The point from which a survey counts; above it the hole is taken as straight from the datum.</summary>
/// <param name="MeasuredDepth">Depth along the hole, m, above zero.</param>
/// <param name="TrueVerticalDepth">Depth below the datum, m, above zero and at most the measured depth.</param>
public sealed record TieIn(double MeasuredDepth, double TrueVerticalDepth)
{
    /// <summary>Inclination of the straight hole above, rad.</summary>
    public double Inclination => Math.Acos(TrueVerticalDepth / MeasuredDepth);

    /// <summary>True when the point can lie on a hole that starts at the datum.</summary>
    internal bool IsSound => double.IsFinite(MeasuredDepth) && TrueVerticalDepth > 0 && TrueVerticalDepth <= MeasuredDepth;
}
