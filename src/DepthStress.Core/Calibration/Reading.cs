using DepthStress.Core.Model;

namespace DepthStress.Core.Calibration;

/// <summary>Gives, from mean Shmin and SHmax, what was observed and the model's value of it, both in Pa.</summary>
/// <param name="shmin">Shmin, Pa.</param>
/// <param name="shmax">SHmax, Pa.</param>
/// <param name="strength">Factor on the rock's strengths as the model has them.</param>
public delegate (double Measured, double Modelled) StressComparison(double shmin, double shmax, double strength);

/// <summary>An observation as the model sees it: its samples, its meaning, and how it is compared.</summary>
public sealed class Reading
{
    /// <summary>Compared with Shmin.</summary>
    public const string Shmin = "Shmin";

    /// <summary>Compared with SHmax.</summary>
    public const string Shmax = "SHmax";

    /// <summary>Compared with the pressure that breaks the wall of the hole.</summary>
    public const string Breakdown = "breakdown pressure";

    /// <summary>Compared with the pore pressure.</summary>
    public const string PorePressure = "pore pressure";

    private readonly StrainResponse? _response;
    private readonly StressComparison? _compare;
    private readonly double[]? _pressures;

    /// <summary>A reading that can be compared with horizontal stresses.</summary>
    /// <param name="interval">Where it lies.</param>
    /// <param name="meaning">What it says.</param>
    /// <param name="subject">What is compared, such as "Shmin".</param>
    /// <param name="sigma">Standard deviation of the comparison, Pa.</param>
    /// <param name="response">The stresses of its samples.</param>
    /// <param name="compare">How it is compared.</param>
    /// <param name="pressures">
    /// Where the least margin over a stretch of open hole counts: the pressure of the test at each sample, Pa; else null.
    /// </param>
    public Reading(
        ObservedInterval interval, Meaning meaning, string subject, double sigma, StrainResponse response, StressComparison compare, double[]? pressures = null)
    {
        (Interval, Meaning, Subject, Sigma) = (interval, meaning, subject, sigma);
        (_response, _compare, _pressures) = (response, compare, pressures);
    }

    /// <summary>A reading that does not depend on the strains.</summary>
    /// <param name="interval">Where it lies.</param>
    /// <param name="meaning">What it says.</param>
    /// <param name="subject">What is compared.</param>
    /// <param name="sigma">Standard deviation, Pa.</param>
    /// <param name="modelled">The model's value, Pa.</param>
    public Reading(ObservedInterval interval, Meaning meaning, string subject, double sigma, double modelled)
    {
        (Interval, Meaning, Subject, Sigma, Fixed) = (interval, meaning, subject, sigma, modelled);
    }

    /// <summary>A reading that cannot be compared.</summary>
    /// <param name="interval">Where it lies.</param>
    /// <param name="subject">What would be compared.</param>
    /// <param name="problem">Why it is not.</param>
    public Reading(ObservedInterval interval, string subject, string problem)
    {
        (Interval, Subject, Problem, Fixed) = (interval, subject, problem, double.NaN);
    }

    /// <summary>Where the observation lies and what it reads there.</summary>
    public ObservedInterval Interval { get; }

    /// <summary>What it says.</summary>
    public Meaning Meaning { get; }

    /// <summary>What is compared: Shmin, SHmax, breakdown pressure, pore pressure.</summary>
    public string Subject { get; }

    /// <summary>Why it is not compared; null where it is.</summary>
    public string? Problem { get; }

    /// <summary>Standard deviation of the observation, Pa.</summary>
    public double Sigma { get; } = double.NaN;

    /// <summary>True when the rock's strength enters the comparison: every such reading shares the error of the relation that gives it.</summary>
    public bool OnStrength { get; init; }

    /// <summary>True when the horizontal stresses enter the comparison.</summary>
    public bool OnStress => _response is not null && Meaning != Meaning.Nothing;

    /// <summary>True when some of its samples take strains that are estimated.</summary>
    public bool OnStrains => OnStress && _response!.Groups.ContainsAnyExcept(-1);

    /// <summary>True when some of its samples take the strains of a group.</summary>
    public bool Touches(int group) => _response is not null && _response.Groups.Contains(group);

    private double Fixed { get; }

    /// <summary>The observation and the model's value for some strains, Pa.</summary>
    /// <param name="strains">Along Shmin and along SHmax, group by group.</param>
    /// <param name="strength">Factor on the rock's strengths.</param>
    public (double Measured, double Modelled) At(ReadOnlySpan<double> strains, double strength = 1)
    {
        if (_response is null) return (Interval.Value, Fixed);
        if (_pressures is not null) return (Interval.Value, Interval.Value + _response.LeastMargin(strains, _pressures));
        var (shmin, shmax) = _response.Mean(strains);
        return _compare!(shmin, shmax, strength);
    }

    /// <summary>
    /// By how much an error of one unit in both horizontal stresses, independent of each other, moves the comparison: 1 for a
    /// closure, about 3 for a breakdown.
    /// </summary>
    /// <param name="strains">The strains at which this is asked.</param>
    public double Leverage(ReadOnlySpan<double> strains)
    {
        if (_response is null) return 0;
        if (_pressures is not null) return 1;
        const double Step = 1e3;
        var (shmin, shmax) = _response.Mean(strains);
        double Miss(double low, double high)
        {
            var (measured, modelled) = _compare!(low, high, 1);
            return modelled - measured;
        }

        var here = Miss(shmin, shmax);
        return double.Hypot((Miss(shmin + Step, shmax) - here) / Step, (Miss(shmin, shmax + Step) - here) / Step);
    }

    /// <summary>The reading beside the model as it is, the error of the rock's strength in its standard deviation.</summary>
    /// <param name="strengthError">Relative standard deviation of the strength.</param>
    public Comparison CompareAsItIs(double strengthError)
    {
        const double Step = 1e-3;
        var comparison = Compare([]);
        if (!OnStrength) return comparison;
        var (measured, modelled) = At([], 1 + Step);
        var perStrength = (modelled - measured - (comparison.Modelled - comparison.Measured)) / Step;
        return comparison with { Sigma = double.Hypot(Sigma, perStrength * strengthError) };
    }

    /// <summary>The reading beside the model for some strains.</summary>
    /// <param name="strains">Along Shmin and along SHmax, group by group.</param>
    /// <param name="modelError">Standard deviation of the profile's own error, Pa.</param>
    /// <param name="strength">Factor on the rock's strengths.</param>
    public Comparison Compare(ReadOnlySpan<double> strains, double modelError = 0, double strength = 1)
    {
        var (measured, modelled) = At(strains, strength);
        return new Comparison(this, measured, modelled, double.Hypot(Sigma, modelError * Leverage(strains)));
    }
}
