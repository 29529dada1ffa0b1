namespace DepthStress.Core.Calibration;

/// <summary>One weighted fit of the strains to readings.</summary>
/// <param name="Parameters">What was estimated.</param>
/// <param name="Strains">The strains, along Shmin and along SHmax, group by group.</param>
/// <param name="Covariance">Covariance of the strains; NaN where a bound is active and none is valid.</param>
/// <param name="ChiSquare">Sum of squared residuals in standard deviations.</param>
/// <param name="Bound">For each parameter whether it lies at a bound.</param>
/// <param name="ModelError">The profile's own error, Pa, that the standard deviations include.</param>
internal sealed record StrainFit(
    StrainParameters Parameters, double[] Strains, double[,] Covariance, double ChiSquare, bool[] Bound, double ModelError)
{
    /// <summary>Factor on the rock's strengths, one without readings that rest on them.</summary>
    public double Strength { get; init; } = 1;

    /// <summary>Its standard error.</summary>
    public double StrengthError { get; init; }
}
