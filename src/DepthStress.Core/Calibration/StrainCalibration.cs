using DepthStress.Core.Diagnostics;
using DepthStress.Core.Model;
using MathNet.Numerics.Distributions;

namespace DepthStress.Core.Calibration;

/// <summary>
/// Estimates tectonic strains by bounded, weighted least squares on the observations of stress. The profile's own error is
/// estimated with them: the standard deviation that, added to the observations' own, makes the residuals as large as they are.
/// </summary>
public static class StrainCalibration
{
    private const double Level = 0.975;

    /// <summary>Estimates the strains.</summary>
    /// <param name="model">The model with the strains as they are.</param>
    /// <param name="settings">What is free and what is held.</param>
    /// <param name="diagnostics">Gets why nothing could be estimated.</param>
    /// <returns>The result, or null with an error reported.</returns>
    public static CalibrationResult? Run(EarthModel model, CalibrationSettings settings, DiagnosticBag diagnostics)
    {
        ArgumentNullException.ThrowIfNull(model);
        ArgumentNullException.ThrowIfNull(settings);
        ArgumentNullException.ThrowIfNull(diagnostics);
        var groups = StrainGroup.Of(model.Setup, settings);
        var readings = Readings.Of(model, groups);
        var start = Start(model.Setup, groups);
        var held = Enumerable.Repeat(settings.Hold.Value, groups.Count).ToArray();
        var known = start.Select(s => double.IsNaN(s) ? 0 : s).ToArray();
        if (Problem(model.Setup, groups, readings, start, held) is { } problem)
        {
            diagnostics.Error(settings.Hold.Source.Position.File.Length > 0 ? settings.Hold.Source.Position : model.Setup.Position, problem);
            return null;
        }

        var fitter = new StrainFitter([.. readings.Where(r => r.OnStrains)], known, settings.Robust.Value, model.Setup.ObservationSettings.StrengthError.Value);
        var best = fitter.Fit(held);
        var strains = new StrainEstimate[groups.Count];
        var quantile = fitter.DegreesOfFreedom(best) is > 0 and var dof ? StudentT.InvCDF(0, 1, dof, Level) : Normal.InvCDF(0, 1, Level);
        for (var g = 0; g < groups.Count; g++) strains[g] = new StrainIntervals(fitter, best, held, quantile).Of(groups[g], g, start);

        var setup = model.Setup;
        for (var g = 0; g < groups.Count; g++) setup = groups[g].With(setup, best.Strains[2 * g], best.Strains[(2 * g) + 1]);

        var left = fitter.LeaveOneOut(best, held);
        var fitted = readings.Select(r => r.Compare(best.Strains, best.ModelError, best.Strength) with { LeftOut = left.GetValueOrDefault(r, double.NaN) }).ToList();
        var result = new CalibrationResult
        {
            Before = model,
            After = StressStage.Again(model, setup),
            Strains = strains,
            BeforeFit = [],
            AfterFit = fitted,
            DegreesOfFreedom = fitter.DegreesOfFreedom(best),
            ReducedChiSquare = fitter.OwnChiSquare(held) / fitter.DegreesOfFreedom(best),
            ModelError = best.ModelError,
            Strength = (best.Strength, best.StrengthError),
            Quantile = quantile,
            JointQuantile = Joint(fitter.DegreesOfFreedom(best)),
            Covariances = [.. groups.Select((_, g) => (best.Covariance[2 * g, 2 * g], best.Covariance[2 * g, (2 * g) + 1], best.Covariance[(2 * g) + 1, (2 * g) + 1]))],
        };
        return result with { Findings = CalibrationFindings.Of(result) };
    }

    /// <summary>The strains before, along Shmin and along SHmax, group by group; NaN where the well file states none.</summary>
    private static double[] Start(WellSetup setup, IReadOnlyList<StrainGroup> groups)
    {
        var start = new double[2 * groups.Count];
        for (var g = 0; g < groups.Count; g++)
        {
            var settings = groups[g].Zones.Count == 0 ? setup.Settings : setup.Zones[groups[g].Zones[0]].Overrides.Over(setup.Settings);
            var (along, across) = (settings.HorizontalStress.StrainAlongShmin, settings.HorizontalStress.StrainAlongShmax);
            (start[2 * g], start[(2 * g) + 1]) = (along.IsSet ? along.Value : double.NaN, across.IsSet ? across.Value : double.NaN);
        }

        return start;
    }

    private static string? Problem(
        WellSetup setup, IReadOnlyList<StrainGroup> groups, IReadOnlyList<Reading> readings, double[] start, HeldStrain[] held)
    {
        if (setup.Observations.Count == 0) return "found no observations, expected [observations] files: there is nothing to calibrate on";
        for (var g = 0; g < groups.Count; g++)
        {
            var name = groups[g].Zones.Count == 0 ? "" : $" for {groups[g].Name(setup)}";
            if (held[g] != HeldStrain.None && (double.IsNaN(start[2 * g]) || double.IsNaN(start[(2 * g) + 1])))
                return $"found a strain to hold{name} but no value of it, expected strain_along_shmin and strain_along_shmax in [horizontal_stress]";
            var values = readings.Count(r => r.OnStrains && r.Meaning == Meaning.Value && r.Touches(g));
            var needed = held[g] == HeldStrain.None ? "two" : "one";
            if (values == 0) return $"found no observation that gives a value of a horizontal stress{name}, expected {needed} at least: bounds alone determine no strain";
            if (values == 1 && held[g] == HeldStrain.None)
                return $"found one observation that gives a value of a horizontal stress{name}, expected {needed} at least: one of the strains is not determined; choose with [calibration] hold what is kept as it is: \"difference\", \"strain_along_shmin\" or \"strain_along_shmax\"";
        }

        return null;
    }

    private static double Joint(int freedom) =>
        Math.Sqrt(freedom > 0 ? 2 * FisherSnedecor.InvCDF(2, freedom, 0.95) : ChiSquared.InvCDF(2, 0.95));
}
