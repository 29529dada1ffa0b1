using DepthStress.Core.Diagnostics;
using DepthStress.Core.Model;

namespace DepthStress.Core.Calibration;

/// <summary>
/// Estimates what the settings free, in the order in which one rests on the other: the factor on static modulus from core, then
/// the pore pressure from formation pressures, then the strains from observations of stress. The model is run again in between.
/// </summary>
public static class WellCalibration
{
    /// <summary>Estimates everything.</summary>
    /// <param name="model">The model as it is.</param>
    /// <param name="settings">What is free and what is held.</param>
    /// <param name="run">Makes a model of a changed setup.</param>
    /// <param name="diagnostics">Gets why something could not be estimated.</param>
    /// <returns>The result, or null with an error reported.</returns>
    public static CalibrationResult? Run(
        EarthModel model, CalibrationSettings settings, Func<WellSetup, EarthModel?> run, DiagnosticBag diagnostics)
    {
        ArgumentNullException.ThrowIfNull(model);
        ArgumentNullException.ThrowIfNull(settings);
        ArgumentNullException.ThrowIfNull(run);
        ArgumentNullException.ThrowIfNull(diagnostics);
        var (now, position) = (model, settings.Free.Source.Position);
        var others = new List<ParameterEstimate>();
        if (settings.Frees(FreeParameter.StaticModulusFactor))
        {
            if (CoreCalibration.Run(now, position, diagnostics) is not var (setup, estimate) || run(setup) is not { } next) return null;
            others.Add(estimate);
            now = next;
        }

        var freed = PressureParameter.Of(now, settings, diagnostics);
        if (diagnostics.HasErrors) return null;
        if (freed.Count > 0)
        {
            if (PressureCalibration.Run(now, freed, position, diagnostics) is not { } pressure || run(pressure.Setup) is not { } next) return null;
            others.AddRange(pressure.Estimates.Select(e => new ParameterEstimate(e.Parameter.Section, e.Parameter.Key, e.Parameter.Dimension, e.Estimate, "formation pressures")));
            now = next;
        }

        var result = settings.Frees(FreeParameter.Strains) ? StrainCalibration.Run(now, settings, diagnostics) : Unchanged(now);
        return result is null ? null : result with { Before = model, BeforeFit = Before(model, result), Others = others };
    }

    /// <summary>The result where no strain is free.</summary>
    private static CalibrationResult Unchanged(EarthModel model) => new()
    {
        Before = model,
        After = model,
        Strains = [],
        BeforeFit = [],
        AfterFit = Comparison.Of(model),
        DegreesOfFreedom = 0,
        ReducedChiSquare = double.NaN,
        ModelError = 0,
        Strength = (1, 0),
        Quantile = double.NaN,
        JointQuantile = double.NaN,
        Covariances = [],
    };

    /// <summary>The observations beside the model before anything changed, with the standard deviations of the fit.</summary>
    private static IReadOnlyList<Comparison> Before(EarthModel model, CalibrationResult result) =>
        [.. Comparison.Of(model).Zip(result.AfterFit, (before, after) => before with { Sigma = after.Sigma })];
}
