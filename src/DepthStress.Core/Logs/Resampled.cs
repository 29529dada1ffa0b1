namespace DepthStress.Core.Logs;

/// <summary>What a curve is like between its samples.</summary>
public enum CurveShape
{
    /// <summary>It runs straight from sample to sample.</summary>
    Line,

    /// <summary>Its reciprocal does: a velocity, which the tool measured as slowness.</summary>
    Reciprocal,

    /// <summary>It keeps the value of the nearest sample: a code, or the diameter of a bit.</summary>
    Steps,
}

/// <summary>A stretch without values between two logged samples.</summary>
/// <param name="Top">Depth of the last sample above, m.</param>
/// <param name="Base">Depth of the first sample below, m.</param>
public readonly record struct DepthGap(double Top, double Base);

/// <summary>A curve on other depths.</summary>
/// <param name="Values">One value per wanted depth; NaN where there is none.</param>
/// <param name="Changes">Edited where a value was made from logged neighbours, filled where values missing between them were bridged, none where it is as logged or missing.</param>
/// <param name="Gaps">The gaps that were too long to be bridged.</param>
public sealed record Resampled(double[] Values, SampleOrigin[] Changes, IReadOnlyList<DepthGap> Gaps);
