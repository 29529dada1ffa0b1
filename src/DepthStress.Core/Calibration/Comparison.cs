using DepthStress.Core.Model;

namespace DepthStress.Core.Calibration;

/// <summary>An observation beside the model's value.</summary>
/// <param name="Reading">The observation as the model sees it.</param>
/// <param name="Measured">What was observed, Pa, as the quantity compared.</param>
/// <param name="Modelled">The model's value, Pa.</param>
/// <param name="Sigma">Standard deviation of the comparison, Pa: of the observation, and of the model's error where one was estimated.</param>
public sealed record Comparison(Reading Reading, double Measured, double Modelled, double Sigma)
{
    /// <summary>
    /// Model less observation in standard deviations; for a bound only what is beyond it, and zero on its good side; NaN where
    /// nothing can be compared.
    /// </summary>
    public double Residual => Reading.Meaning switch
    {
        Meaning.Value => (Modelled - Measured) / Sigma,
        Meaning.UpperBound => Math.Max(0, Modelled - Measured) / Sigma,
        Meaning.LowerBound => Math.Min(0, Modelled - Measured) / Sigma,
        _ => double.NaN,
    };

    /// <summary>What the same model, fitted without this observation, misses it by, in standard deviations; NaN where not done.</summary>
    public double LeftOut { get; init; } = double.NaN;

    /// <summary>Every observation of a model's well beside the model as it is.</summary>
    public static IReadOnlyList<Comparison> Of(EarthModel model)
    {
        ArgumentNullException.ThrowIfNull(model);
        var strengthError = model.Setup.ObservationSettings.StrengthError.Value;
        return [.. Readings.Of(model, []).Select(r => r.CompareAsItIs(strengthError))];
    }

    /// <summary>True when the model lies within the 95 % interval of the observation.</summary>
    public bool Inside => !(Math.Abs(Residual) > 1.96);
}
