using System.Globalization;
using DepthStress.Core.Depth;
using DepthStress.Core.Diagnostics;
using DepthStress.Core.Logs;
using DepthStress.Core.Quantities;

namespace DepthStress.Core.Model;

/// <summary>Makes the path of the hole from a depth curve of the logs.</summary>
internal static class CurvePath
{
    /// <summary>
    /// Points of the path lie at least so far apart, m: nearer ones would turn the rounding of depths into inclination. At a
    /// dogleg of 3 deg over 30 m the straight lines between them are off by 2 cm.
    /// </summary>
    private const double Spacing = 10;

    /// <summary>Longer gaps in the curve are not bridged, m.</summary>
    private const double LongestGap = 50;

    /// <summary>How much more the hole may get deeper than longer between two points, m: rounding.</summary>
    private const double Rounding = 0.05;

    /// <summary>The setup with the path that its depth curve gives; null when the curve cannot serve, with the reason reported.</summary>
    public static WellSetup? Resolve(WellSetup setup, LogTable logs, DiagnosticBag diagnostics, List<Finding> findings)
    {
        if (!setup.PathCurve.IsSet) return setup;
        var position = setup.PathCurve.Source.Position;
        if (logs[setup.PathCurve.Value] is not { } curve)
        {
            var id = CurveRoles.Of(setup.PathCurve.Value)!.Id;
            diagnostics.Error(position, $"[survey] curve = \"{id}\": found no such curve in the log files, expected one with a usual name, or its column in [logs.curves]: {id} = \"...\"");
            return null;
        }

        var depth = LoggedDepth.Read(setup.Frame, logs.Depths, curve);
        var known = Enumerable.Range(0, logs.Count).Where(i => logs.Depths[i] > 0 && double.IsFinite(depth.Tvd[i])).ToArray();
        var (md, tvd) = (Array.ConvertAll(known, i => logs.Depths[i]), Array.ConvertAll(known, i => depth.Tvd[i]));
        if (Problem(md, tvd) is { } problem)
        {
            diagnostics.Error(position, $"the curve {curve.Source} ({depth.Reading}): {problem}");
            return null;
        }

        var nodes = Nodes(md);
        var path = Trajectory.Follow(Array.ConvertAll(nodes, i => md[i]), Array.ConvertAll(nodes, i => tvd[i]));
        findings.Add(Finding.General(
            Severity.Note,
            $"the path of the hole follows the curve {curve.Source}, read as {depth.Reading}; above its first value at {Quantity.Length(md[0])} measured depth the hole is taken as straight from the datum"));
        var followed = setup with { Trajectory = path };
        ZoneCheck.Report(followed, diagnostics);
        ObservationCheck.Report(followed, diagnostics);
        return diagnostics.HasErrors ? null : followed;
    }

    private static string? Problem(double[] md, double[] tvd)
    {
        var invariant = CultureInfo.InvariantCulture;
        if (md.Length == 0) return "found no value below the datum, expected one at least";
        if (!(tvd[0] > 0 && tvd[0] <= md[0] + DepthAgreement.Tolerance(md[0])))
            return string.Create(invariant, $"found a true vertical depth of {tvd[0]:F2} m at {md[0]:F2} m measured depth, expected it above zero and no deeper than along the hole; are the datum elevation and the unit right?");
        var nodes = Nodes(md);
        var steps = Enumerable.Range(1, md.Length - 1).Select(i => (From: i - 1, To: i))
            .Concat(nodes.Zip(nodes.Skip(1), (from, to) => (From: from, To: to)));
        foreach (var (from, to) in steps)
        {
            var (along, down) = (md[to] - md[from], tvd[to] - tvd[from]);
            if (along > LongestGap)
                return string.Create(invariant, $"found no value between {md[from]:F2} m and {md[to]:F2} m measured depth, expected gaps of at most {LongestGap} m");
            if (Math.Abs(down) > along + Rounding)
                return string.Create(invariant, $"found {down:F2} m more true vertical depth from {md[from]:F2} m to {md[to]:F2} m measured depth, expected no more than along the hole");
        }

        return null;
    }

    /// <summary>Indices of the points that the path goes through: the first, the last, and those in between far enough apart.</summary>
    private static int[] Nodes(double[] md)
    {
        var nodes = new List<int> { 0 };
        for (var i = 1; i < md.Length; i++)
        {
            if (md[i] - md[nodes[^1]] >= Spacing) nodes.Add(i);
        }

        // What is left at the end joins the last stretch.
        if (nodes[^1] != md.Length - 1)
        {
            if (nodes.Count > 1) nodes[^1] = md.Length - 1;
            else nodes.Add(md.Length - 1);
        }

        return [.. nodes];
    }
}
