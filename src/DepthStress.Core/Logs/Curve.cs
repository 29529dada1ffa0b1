namespace DepthStress.Core.Logs;

/// <summary>One curve on the table's depths, in SI, with the origin of every sample.</summary>
/// <param name="Role">What the curve is.</param>
/// <param name="Source">The column and file it was read from, for messages.</param>
/// <param name="Values">One value per depth; NaN means missing.</param>
/// <param name="Origins">Where each value came from.</param>
public sealed record Curve(CurveRole Role, string Source, double[] Values, OriginTrack Origins);
