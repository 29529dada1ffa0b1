using DepthStress.Core.Quantities;

namespace DepthStress.Core.Calibration;

/// <summary>An estimated parameter of the well file that is no strain.</summary>
/// <param name="Section">The section that holds it.</param>
/// <param name="Key">Its key.</param>
/// <param name="Dimension">What it measures.</param>
/// <param name="Estimate">The estimate, SI.</param>
/// <param name="Basis">What it was estimated from.</param>
public sealed record ParameterEstimate(string Section, string Key, Dimension Dimension, Estimate Estimate, string Basis);
