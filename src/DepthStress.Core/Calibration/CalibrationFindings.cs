using DepthStress.Core.Diagnostics;
using DepthStress.Core.Model;
using DepthStress.Core.Quantities;

namespace DepthStress.Core.Calibration;

/// <summary>What a reader should know of a calibration, in plain words.</summary>
internal static class CalibrationFindings
{
    private const double Far = 3;

    /// <summary>Everything worth saying, most important first.</summary>
    public static IReadOnlyList<Finding> Of(CalibrationResult result) =>
    [
        .. result.Strains.SelectMany(s => Separation(result, s)),
        .. result.Strains.SelectMany(s => Credible(result, s)),
        .. Far3(result),
        .. Crossing(result),
        .. ModelError(result),
        .. Strength(result),
    ];

    private static IEnumerable<Finding> Separation(CalibrationResult result, StrainEstimate strain)
    {
        var where = Where(result, strain);
        if (strain.AlongShmin.Held || strain.AlongShmax.Held || strain.Difference.Held) yield break;
        if (!strain.Separated)
        {
            yield return Finding.General(
                Severity.Warning,
                $"the observations do not separate the two strains{where}: their estimates correlate by {strain.Correlation:F2} and the standard error along SHmax is {Error(strain.AlongShmax, result)}; closures alone determine little more than one combination of the two, breakdowns or breakouts separate them; state with [calibration] hold what is kept, or \"none\" to accept both");
        }
        else if (strain.Difference.AtBound)
        {
            yield return Finding.General(
                Severity.Note, $"the two strains come out equal{where}, the least difference that their names allow: the intervals are those of the profile, not of a standard error");
        }
        else
        {
            yield return Finding.General(
                Severity.Note, $"the observations separate the two strains{where}: their estimates correlate by {strain.Correlation:F2}, the standard errors are {Error(strain.AlongShmin, result)} and {Error(strain.AlongShmax, result)}");
        }
    }

    private static IEnumerable<Finding> Credible(CalibrationResult result, StrainEstimate strain)
    {
        foreach (var (name, estimate) in new[] { ("Shmin", strain.AlongShmin), ("SHmax", strain.AlongShmax) })
        {
            if (Math.Abs(estimate.Value) > StrainEstimate.Credible)
                yield return Finding.General(Severity.Warning, $"the strain along {name}{Where(result, strain)} of {Strain(estimate.Value)} is hardly credible: beyond {Strain(StrainEstimate.Credible)} rock fails; look at the moduli, the pore pressure and the observations first");
        }
    }

    private static IEnumerable<Finding> Far3(CalibrationResult result) => result.AfterFit
        .Where(c => Math.Abs(c.Residual) > Far)
        .Select(c => Finding.General(
            Severity.Warning,
            $"the {c.Reading.Interval.Observation.Kind.Word()} at {Quantity.Length(c.Reading.Interval.Top)} measured depth is missed by {Math.Abs(c.Residual):F1} standard deviations even after the fit"));

    /// <summary>Bounds may cross, since each is noisy; the reader should know.</summary>
    private static IEnumerable<Finding> Crossing(CalibrationResult result)
    {
        var bounds = result.AfterFit.Where(c => c.Reading.Subject == Reading.Shmin).ToList();
        foreach (var upper in bounds.Where(c => c.Reading.Meaning == Meaning.UpperBound))
        {
            foreach (var lower in bounds.Where(c => c.Reading.Meaning == Meaning.LowerBound))
            {
                var (a, b) = (upper.Reading.Interval, lower.Reading.Interval);
                if (a.Top <= b.Base && b.Top <= a.Base && lower.Measured > upper.Measured)
                    yield return Finding.General(Severity.Note, $"an upper bound of {Quantity.Pressure(upper.Measured)} lies below a lower bound of {Quantity.Pressure(lower.Measured)} near {Quantity.Length(a.Top)} measured depth: both enter by their standard deviations");
            }
        }
    }

    private static IEnumerable<Finding> ModelError(CalibrationResult result)
    {
        if (result.DegreesOfFreedom <= 0)
            yield return Finding.General(Severity.Warning, $"as many strains were estimated as there are observations: nothing is left to tell the model's error, and the standard errors rest on the stated ones alone");
        else if (result.ModelError > 0)
            yield return Finding.General(Severity.Note, $"the residuals are {Math.Sqrt(result.ReducedChiSquare):F1} times what the observations' standard deviations explain; a model error of {Quantity.Pressure(result.ModelError)} in each horizontal stress accounts for the rest and is part of the standard errors");
    }

    private static IEnumerable<Finding> Strength(CalibrationResult result)
    {
        if (result.Strength.Error > 0)
            yield return Finding.General(Severity.Note, $"breakdowns and breakouts rest on the rock's strength: a factor of {result.Strength.Factor:F2} with a standard error of {result.Strength.Error:F2} on it was estimated along, starting from the stated error of {100 * result.After.Setup.ObservationSettings.StrengthError.Value:F0} %; the standard errors include it, the profile's strength stays");
    }

    private static FormattableString Where(CalibrationResult result, StrainEstimate strain)
    {
        var name = strain.Group.Name(result.After.Setup);
        return name.Length == 0 ? $"" : (FormattableString)$" of {name}";
    }

    private static Quantity Strain(double value) => new(value, Dimension.Strain);

    private static Quantity Error(Estimate estimate, CalibrationResult result) =>
        Strain(double.IsNaN(estimate.StandardError) ? (estimate.High - estimate.Low) / (2 * result.Quantile) : estimate.StandardError);
}
