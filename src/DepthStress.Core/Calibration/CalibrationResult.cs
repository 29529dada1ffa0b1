using DepthStress.Core.Model;

namespace DepthStress.Core.Calibration;

/// <summary>What a calibration found.</summary>
public sealed record CalibrationResult
{
    /// <summary>The model as it was.</summary>
    public required EarthModel Before { get; init; }

    /// <summary>The model with the estimates put in.</summary>
    public required EarthModel After { get; init; }

    /// <summary>The strains, group by group.</summary>
    public required IReadOnlyList<StrainEstimate> Strains { get; init; }

    /// <summary>Every observation beside the model as it was, with the standard deviations of <see cref="AfterFit"/>.</summary>
    public required IReadOnlyList<Comparison> BeforeFit { get; init; }

    /// <summary>The same beside the estimates, with the model's error in the standard deviation and what leaving it out predicts.</summary>
    public required IReadOnlyList<Comparison> AfterFit { get; init; }

    /// <summary>Observations that were compared, less the parameters estimated.</summary>
    public required int DegreesOfFreedom { get; init; }

    /// <summary>Sum of squared residuals per degree of freedom with the observations' own standard deviations; NaN without any.</summary>
    public required double ReducedChiSquare { get; init; }

    /// <summary>
    /// Standard deviation of the profile's own error, Pa, that makes the residuals as large as they are; zero where the
    /// observations' own explain them.
    /// </summary>
    public required double ModelError { get; init; }

    /// <summary>
    /// Factor on the rock's strengths that the observations agree with best, and its standard error; one and zero where none rests
    /// on them. It widens the strains' intervals and is not applied.
    /// </summary>
    public required (double Factor, double Error) Strength { get; init; }

    /// <summary>The quantile of Student's distribution that the 95 % intervals use.</summary>
    public required double Quantile { get; init; }

    /// <summary>Half the length of the joint 95 % region of two parameters, in standard deviations.</summary>
    public required double JointQuantile { get; init; }

    /// <summary>The numbers, group by group, from which the strain plane is drawn: covariance of the strains along Shmin and along SHmax.</summary>
    public required IReadOnlyList<(double AlongShmin, double Both, double AlongShmax)> Covariances { get; init; }

    /// <summary>Estimates that are no strains, in the order in which they were made.</summary>
    public IReadOnlyList<ParameterEstimate> Others { get; init; } = [];

    /// <summary>What a reader should know, most important first.</summary>
    public IReadOnlyList<Finding> Findings { get; init; } = [];
}
