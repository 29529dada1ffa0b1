namespace DepthStress.Core.Layers;

/// <summary>A curve on the cells that are cut into segments.</summary>
/// <param name="Values">One value per cell; NaN where it has none.</param>
/// <param name="Weights">How many independent samples each cell is worth, not below zero; a cell without a value is worth none.</param>
/// <param name="Trend">True when a segment keeps a straight line in depth, false when it keeps one value.</param>
public sealed record CutCurve(double[] Values, double[] Weights, bool Trend);
