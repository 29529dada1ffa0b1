using DepthStress.Core.Depth;
using DepthStress.Core.Diagnostics;
using DepthStress.Core.Logs;
using DepthStress.Core.Quantities;

namespace DepthStress.Core.Model;

/// <summary>Compares depth curves of the logs with the path of the hole.</summary>
internal static class DepthCrossCheck
{
    /// <summary>A finding for each curve that differs by more than 0.5 m and 0.1 % of depth; the curve of the path itself is left out.</summary>
    public static IEnumerable<Finding> Of(WellSetup setup, LogTable logs, PropertyTable table)
    {
        foreach (var curve in logs.Curves.Where(c => c.Role.IsPosition && !(setup.PathCurve.IsSet && setup.PathCurve.Value == c.Role.Property)))
        {
            var depth = LoggedDepth.Read(setup.Frame, logs.Depths, curve);
            var tvd = table.Read(Property.TrueVerticalDepth);
            var (marks, largest, at) = (new bool[logs.Count], 0.0, 0.0);
            for (var i = 0; i < marks.Length; i++)
            {
                var difference = Math.Abs(depth.Tvd[i] - tvd[i]);
                marks[i] = difference > DepthAgreement.Tolerance(tvd[i]);
                if (marks[i] && difference > largest) (largest, at) = (difference, logs.Depths[i]);
            }

            FormattableString text = $"the curve {curve.Source}, read as {depth.Reading}, differs from the path of the hole by up to {Quantity.Length(largest)}, at {Quantity.Length(at)} measured depth";
            if (Finding.About(Severity.Warning, text, logs.Depths, marks) is { } finding) yield return finding;
        }
    }
}
