using DepthStress.Core.Depth;
using DepthStress.Core.Diagnostics;
using DepthStress.Core.Logs;
using DepthStress.Core.Pressure;
using DepthStress.Core.Quantities;

namespace DepthStress.Core.Model;

/// <summary>
/// Pressure of rock that is not shale where the method tells that of shale alone: the table, the fluid column, or a straight line in true
/// vertical depth between the nearest shale above and below. Above the first shale its excess over the normal pressure falls off to nothing at the ground or mudline; below the last it stays.
/// </summary>
internal static class SandStage
{
    /// <summary>Fills the sands.</summary>
    public static void Fill(
        WellSetup setup, PropertyTable table, IReadOnlyList<SettingsRun> runs, IReadOnlyDictionary<StageSettings, PressurePlan> plans, bool[] shale, PressureOutcome outcome)
    {
        var pressure = table.Write(Property.PorePressure);
        var tvd = table.Read(Property.TrueVerticalDepth);
        Neighbours? neighbours = null;
        var carried = new bool[table.Count];
        foreach (var run in runs)
        {
            if (!plans.TryGetValue(run.Settings, out var plan) || plan.Method is null) continue;
            var pore = run.Settings.PorePressure;
            if (pore.Sands is { IsSet: true, Value: SandPressure.Shale })
                neighbours ??= Neighbours.Of(setup.Frame, table, runs, plans, shale);
            for (var i = run.Start; i < run.End; i++)
            {
                if (shale[i]) continue;
                if (plan.SandLine is { } line) pressure[i] = line.At(tvd[i]);
                else if (plan.SandFluids is { } fluids) pressure[i] = fluids.At(tvd[i]);
                else if (pore.Sands.IsSet) pressure[i] = neighbours!.At(i, tvd, pore, out carried[i]);
            }
        }

        if (Finding.About(
            Severity.Note, $"no shale on one side: the pressure of these sands is the normal one with the excess of the nearest shale", table.Read(Property.MeasuredDepth), carried) is { } finding)
        {
            outcome.Findings.Add(finding);
        }
    }

    /// <summary>The shale samples that have a pressure, in order.</summary>
    private sealed class Neighbours(DepthFrame frame, int[] samples, double[] depths, double[] pressures)
    {
        private readonly Dictionary<double, double[]> _smooth = [];

        public static Neighbours Of(DepthFrame frame, PropertyTable table, IReadOnlyList<SettingsRun> runs, IReadOnlyDictionary<StageSettings, PressurePlan> plans, bool[] shale)
        {
            var pressure = table.Read(Property.PorePressure);
            var tvd = table.Read(Property.TrueVerticalDepth);
            var samples = new List<int>();
            foreach (var run in runs)
            {
                if (!plans.TryGetValue(run.Settings, out var plan) || plan.Method is null) continue;
                for (var i = run.Start; i < run.End; i++)
                {
                    if (shale[i] && !double.IsNaN(pressure[i])) samples.Add(i);
                }
            }

            var (depths, pressures) = (new double[samples.Count], new double[samples.Count]);
            for (var k = 0; k < depths.Length; k++) (depths[k], pressures[k]) = (tvd[samples[k]], pressure[samples[k]]);
            return new Neighbours(frame, [.. samples], depths, pressures);
        }

        public double At(int sample, ReadOnlySpan<double> tvd, PorePressureSettings pore, out bool carried)
        {
            carried = false;
            if (samples.Length == 0 || double.IsNaN(tvd[sample])) return double.NaN;
            var values = pore.SandWindow.IsSet ? Smooth(pore.SandWindow.Value) : pressures;
            var below = ~Array.BinarySearch(samples, sample);
            if (below > 0 && below < samples.Length)
            {
                var (top, bottom) = (depths[below - 1], depths[below]);
                var share = bottom == top ? 0.5 : (tvd[sample] - top) / (bottom - top);
                return values[below - 1] + (share * (values[below] - values[below - 1]));
            }

            if (!pore.FluidDensity.IsSet) return double.NaN;
            carried = true;
            var nearest = below == 0 ? 0 : samples.Length - 1;
            var excess = values[nearest] - Normal(depths[nearest]);
            if (below == 0) excess *= Math.Clamp((tvd[sample] - frame.SolidTopTvd) / (depths[0] - frame.SolidTopTvd), 0, 1);
            return Normal(tvd[sample]) + excess;

            double Normal(double depth) => pore.FluidDensity.Value * Constants.StandardGravity * Math.Max(0, depth - frame.HydrostaticTopTvd);
        }

        private double[] Smooth(double window)
        {
            if (_smooth.TryGetValue(window, out var smooth)) return smooth;
            RunningWindow.Fill(depths, pressures, window, Smoothing.Mean, smooth = new double[pressures.Length]);
            _smooth.Add(window, smooth);
            return smooth;
        }
    }
}
