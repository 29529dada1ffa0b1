using DepthStress.Core.Diagnostics;
using DepthStress.Core.Logs;
using DepthStress.Core.Quantities;

namespace DepthStress.Core.Model;

/// <summary>
/// Moves a zone's pore pressure to its measured formation pressures, where that is asked for: by the mean of measured less computed,
/// weighted by one over the square of sigma, the same over the whole zone, so that gradients stay. Measured pressures that cannot be are
/// reported whether or not they are honoured.
/// </summary>
internal static class TestShift
{
    /// <summary>Moves the pressures.</summary>
    public static void Apply(WellSetup setup, PropertyTable table, IReadOnlyList<SettingsRun> runs, PressureOutcome outcome)
    {
        if (setup.Observations.Count == 0) return;
        var tests = FormationTest.Of(setup, table, outcome.Findings);
        foreach (var test in tests.Where(t => t.Pressure >= t.Stress))
        {
            outcome.Problems.Add((
                test.Observation.Position,
                $"found a formation pressure of {Quantity.Pressure(test.Pressure)} at {Quantity.Length(test.MeasuredDepth)} measured depth, expected it below the vertical stress there of {Quantity.Pressure(test.Stress)}"));
        }

        foreach (var zone in runs.Where(r => r.Settings.PorePressure.HonourTests.Value).GroupBy(r => r.Zone))
        {
            var own = tests.Where(t => !double.IsNaN(t.Residual) && zone.Any(r => t.Sample >= r.Start && t.Sample < r.End)).ToList();
            if (own.Count == 0) continue;
            double weighted = 0, weights = 0;
            foreach (var test in own)
            {
                var weight = 1 / (test.Sigma * test.Sigma);
                weighted += weight * test.Residual;
                weights += weight;
            }

            var shift = weighted / weights;
            var pressure = table.Write(Property.PorePressure);
            foreach (var run in zone)
            {
                foreach (ref var value in pressure.Slice(run.Start, run.Length)) value += shift;
            }

            var where = zone.Key < 0 ? "the well" : setup.Zones[zone.Key].Name;
            var residuals = own
                .Select(t => (FormattableString)$"{Quantity.Pressure(t.Residual - shift)} at {Quantity.Length(t.MeasuredDepth)} measured depth")
                .Aggregate((a, b) => $"{a}, {b}");
            outcome.Findings.Add(Finding.General(
                Severity.Note, $"pore pressure in {where} was moved by {Quantity.Pressure(shift)} to its formation pressures ({own.Count}); measured less computed after that: {residuals}"));
        }
    }
}
