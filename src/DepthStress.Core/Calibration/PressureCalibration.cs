using DepthStress.Core.Diagnostics;
using DepthStress.Core.Logs;
using DepthStress.Core.Model;
using MathNet.Numerics.Distributions;

namespace DepthStress.Core.Calibration;

/// <summary>An estimated parameter of the pore pressure.</summary>
/// <param name="Parameter">The parameter.</param>
/// <param name="Estimate">Its estimate.</param>
public sealed record PressureEstimate(PressureParameter Parameter, Estimate Estimate);

/// <summary>What the formation pressures determine.</summary>
/// <param name="Setup">The setup with the estimates put in.</param>
/// <param name="Estimates">The estimates.</param>
/// <param name="Correlation">Correlation of each pair of estimates.</param>
/// <param name="ReducedChiSquare">Sum of squared residuals per degree of freedom with the tests' own standard deviations; NaN without any.</param>
public sealed record PressureResult(WellSetup Setup, IReadOnlyList<PressureEstimate> Estimates, double[,] Correlation, double ReducedChiSquare);

/// <summary>
/// Estimates parameters of the pore pressure from measured formation pressures alone: stress observations say little of them and
/// would carry the stress model's own error into them. Each trial is the run's own pore-pressure stage.
/// </summary>
public static class PressureCalibration
{
    /// <summary>Columns that the stage writes: a trial has its own.</summary>
    private static readonly Property[] Written =
    [
        Property.PorePressure, Property.NormalPressure, Property.NormalSlowness, Property.NormalResistivity, Property.NormalPorosity, Property.PickedSlowness,
    ];

    /// <summary>Estimates the parameters; null with an error reported where they are not determined.</summary>
    public static PressureResult? Run(EarthModel model, IReadOnlyList<PressureParameter> parameters, SourcePosition position, DiagnosticBag diagnostics)
    {
        ArgumentNullException.ThrowIfNull(model);
        ArgumentNullException.ThrowIfNull(parameters);
        ArgumentNullException.ThrowIfNull(diagnostics);
        var tests = Readings.Of(model, []).Where(r => r.Subject == Reading.PorePressure && r.Problem is null).ToList();
        if (tests.Count < parameters.Count)
        {
            diagnostics.Error(position, FormattableString.Invariant($"[calibration] free: found {tests.Count} formation pressures within the logs, expected as many as freed parameters of the pore pressure at least, {parameters.Count}: {parameters[^1].Key} is not determined"));
            return null;
        }

        if (model.Runs.Any(r => r.Settings.PorePressure.HonourTests.Value))
        {
            diagnostics.Error(position, "[calibration] free: found parameters of the pore pressure while [pore_pressure] honour_tests moves it to the tests, expected one of the two");
            return null;
        }

        var problem = new FitProblem([.. parameters.Select(p => p.Fit)], tests.Count, new Trial(model, parameters, tests).Residuals);
        var fit = BoundedFit.Solve(problem);
        if (fit.StandardErrors.Any(double.IsPositiveInfinity))
        {
            diagnostics.Error(position, "[calibration] free: the formation pressures do not tell the freed parameters of the pore pressure apart, expected fewer of them: state the others in the well file");
            return null;
        }

        var setup = model.Setup;
        for (var k = 0; k < parameters.Count; k++) setup = parameters[k].Put(setup, fit.Estimates[k]);
        return new(setup, Estimates(problem, fit, parameters), Correlations(fit), fit.ReducedChiSquare);
    }

    private static IReadOnlyList<PressureEstimate> Estimates(FitProblem problem, FitResult fit, IReadOnlyList<PressureParameter> parameters)
    {
        // Errors larger than stated widen the intervals; smaller ones do not narrow them.
        var inflation = fit.DegreesOfFreedom > 0 ? Math.Max(1, fit.ReducedChiSquare) : 1;
        var quantile = fit.DegreesOfFreedom > 0 ? StudentT.InvCDF(0, 1, fit.DegreesOfFreedom, 0.975) : Normal.InvCDF(0, 1, 0.975);
        var bound = fit.Bounds.Any(b => b != BoundState.Free);
        return
        [
            .. parameters.Select((parameter, k) =>
            {
                var (value, start) = (fit.Estimates[k], parameter.Fit.Start);
                if (bound)
                {
                    var profile = ProfileInterval.Of(problem, fit, k, quantile * quantile * inflation);
                    return new PressureEstimate(parameter, new Estimate(value, double.NaN, profile.Low, profile.High, start) { AtBound = fit.Bounds[k] != BoundState.Free });
                }

                var error = fit.StandardErrors[k] * Math.Sqrt(inflation);
                return new PressureEstimate(parameter, new Estimate(value, error, value - (quantile * error), value + (quantile * error), start));
            }),
        ];
    }

    private static double[,] Correlations(FitResult fit)
    {
        var n = fit.Estimates.Count;
        var correlations = new double[n, n];
        for (var i = 0; i < n; i++)
        {
            for (var j = 0; j < n; j++) correlations[i, j] = fit.Correlation(i, j);
        }

        return correlations;
    }

    /// <summary>The pore-pressure stage with trial parameters, on a table that shares every other column with the model.</summary>
    private sealed class Trial(EarthModel model, IReadOnlyList<PressureParameter> parameters, IReadOnlyList<Reading> tests)
    {
        private readonly PropertyTable _table = model.Values.Sharing(Written);

        public void Residuals(ReadOnlySpan<double> values, Span<double> residuals)
        {
            var setup = model.Setup;
            for (var k = 0; k < parameters.Count; k++) setup = parameters[k].Put(setup, values[k]);
            PressureStage.PorePressure(setup, _table, SettingsRun.Resolve(setup, model.Zones, model.Lithologies), []);
            var md = _table.Read(Property.MeasuredDepth);
            for (var i = 0; i < tests.Count; i++)
            {
                var (first, count) = tests[i].Interval.Samples(md);
                residuals[i] = (SampleMean.Of(_table, Property.PorePressure, first, count) - tests[i].Interval.Value) / tests[i].Sigma;
            }
        }
    }
}
