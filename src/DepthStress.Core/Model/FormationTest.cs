using DepthStress.Core.Diagnostics;
using DepthStress.Core.Logs;

namespace DepthStress.Core.Model;

/// <summary>A measured formation pressure beside what the profile has at its depth.</summary>
/// <param name="Observation">The observation.</param>
/// <param name="MeasuredDepth">Measured depth of its middle, m.</param>
/// <param name="Sample">The sample nearest to it.</param>
/// <param name="Pressure">Measured pressure at its depth, Pa.</param>
/// <param name="Sigma">Its standard deviation, Pa.</param>
/// <param name="Computed">Pore pressure of the profile there, Pa; NaN when it has none.</param>
/// <param name="Stress">Vertical stress there, Pa; NaN when the profile has none.</param>
internal sealed record FormationTest(Observation Observation, double MeasuredDepth, int Sample, double Pressure, double Sigma, double Computed, double Stress)
{
    /// <summary>Measured less computed, Pa.</summary>
    public double Residual => Pressure - Computed;

    /// <summary>The formation pressures inside the logged interval, in the order of their rows; what cannot be used goes to the findings.</summary>
    public static List<FormationTest> Of(WellSetup setup, PropertyTable table, List<Finding>? findings)
    {
        var tests = new List<FormationTest>();
        var md = table.Read(Property.MeasuredDepth);
        var tvd = table.Read(Property.TrueVerticalDepth);
        foreach (var observation in setup.Observations.Where(o => o.Kind == ObservationKind.FormationPressure))
        {
            var interval = ObservedInterval.Of(setup, observation);
            var depth = 0.5 * (interval.Top + interval.Base);
            if (md.Length < 2 || !(depth >= md[0] && depth <= md[^1]))
            {
                findings?.Add(Finding.General(Severity.Note, $"{observation.Position}: the formation pressure lies outside the logs and was not used"));
                continue;
            }

            if (double.IsNaN(interval.Value))
            {
                findings?.Add(Finding.General(Severity.Warning, $"{observation.Position}: the formation pressure was read at the surface and lacks the density of the fluid in the hole; it was not used"));
                continue;
            }

            var vertical = interval.MiddleTvd;
            var k = Math.Clamp(md.BinarySearch(depth) is var found && found >= 0 ? found : ~found, 1, md.Length - 1);
            var near = depth - md[k - 1] < md[k] - depth ? k - 1 : k;
            tests.Add(new FormationTest(
                observation, depth, near, interval.Value, interval.Sigma,
                Between(table.Read(Property.PorePressure), tvd, k, near, vertical), Between(table.Read(Property.VerticalStress), tvd, k, near, vertical)));
        }

        return tests;
    }

    /// <summary>A column at a depth between two samples; that of the nearer one where the other has none.</summary>
    private static double Between(ReadOnlySpan<double> column, ReadOnlySpan<double> tvd, int below, int near, double depth)
    {
        if (column.IsEmpty) return double.NaN;
        var (a, b) = (column[below - 1], column[below]);
        if (double.IsNaN(a) || double.IsNaN(b) || tvd[below] == tvd[below - 1]) return column[near];
        return a + ((b - a) * (depth - tvd[below - 1]) / (tvd[below] - tvd[below - 1]));
    }
}
