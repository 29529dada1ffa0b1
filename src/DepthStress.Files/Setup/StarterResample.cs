using System.Text;
using DepthStress.Core.Quantities;
using DepthStress.Files.Reading;
using MathNet.Numerics.Statistics;
using static System.FormattableString;

namespace DepthStress.Files.Setup;

/// <summary>The choice of a regular depth grid in a starter well file, with how even the log's depths are.</summary>
internal static class StarterResample
{
    /// <summary>The line for <c>resample</c> as a comment; nothing where the log has no two depths.</summary>
    public static void Append(StringBuilder text, LogFile log)
    {
        var (column, depths) = (log.Columns[log.DepthColumn], log.Columns[log.DepthColumn].Values);
        if (depths.Length < 2) return;
        var unit = Units.Find(column.Unit ?? "", Dimension.Length) ?? Units.Metre;
        var steps = Enumerable.Range(1, depths.Length - 1).Select(i => depths[i] - depths[i - 1]).ToArray();
        var (least, most) = (steps.Min(), steps.Max());
        var usual = ArrayStatistics.MedianInplace(steps);
        var even = most - least <= 0.1 * usual ? "are even" : Invariant($"run in steps of {least:0.####} to {most:0.####} {unit.Symbol}");
        var gap = Math.Max(1, Math.Ceiling(unit.ToSi(2 * usual)));
        text.AppendLine(Invariant($"# resample = {{ step = \"{usual:0.####} {unit.Symbol}\", method = \"linear\", max_gap = \"{gap} m\" }}   # or \"mean\"; one regular depth grid for all curves: the log's depths {even}"));
    }
}
