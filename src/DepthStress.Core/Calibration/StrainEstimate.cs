namespace DepthStress.Core.Calibration;

/// <summary>The estimated strains of one group of zones.</summary>
/// <param name="Group">The group.</param>
/// <param name="AlongShmin">Strain along Shmin, compression positive.</param>
/// <param name="AlongShmax">Strain along SHmax.</param>
/// <param name="Difference">The second less the first; not negative.</param>
/// <param name="Correlation">Correlation of the estimates along Shmin and along SHmax; NaN where one is held or at a bound.</param>
/// <param name="Separated">True when the data determine both strains, each by itself.</param>
public sealed record StrainEstimate(
    StrainGroup Group, Estimate AlongShmin, Estimate AlongShmax, Estimate Difference, double Correlation, bool Separated)
{
    /// <summary>
    /// Beyond this correlation the two strains are not separated (choice of this program: closures alone give some 0.99,
    /// breakdowns or breakouts take it well below).
    /// </summary>
    public const double LargestCorrelation = 0.95;

    /// <summary>Beyond this standard error of the strain along SHmax the two strains are not separated (choice of this program).</summary>
    public const double LargestError = 150e-6;

    /// <summary>Strains beyond this size are hardly credible in rock that does not fail (common practice).</summary>
    public const double Credible = 2e-3;
}
