using DepthStress.Core.Depth;
using DepthStress.Core.Diagnostics;
using DepthStress.Core.Logs;
using DepthStress.Core.Quantities;

namespace DepthStress.Core.Model;

/// <summary>Turns measured depths into vertical ones and decides which samples enter the vertical integrals.</summary>
internal static class DepthStage
{
    /// <summary>Fills the depth columns and gives the usable samples.</summary>
    public static bool[] Apply(WellSetup setup, PropertyTable table, List<Finding> findings)
    {
        var md = table.Read(Property.MeasuredDepth);
        var tvd = table.Write(Property.TrueVerticalDepth);
        var inclination = table.Write(Property.Inclination);
        var azimuth = new double[table.Count];
        setup.Trajectory.Fill(md, tvd, inclination, azimuth);
        setup.Bedding.Fill(inclination, azimuth, table.Write(Property.BeddingAngle));

        var usable = new bool[table.Count];
        VerticalProgress.Mask(tvd, inclination, VerticalProgress.DefaultMaxInclination, usable);
        var left = new bool[table.Count];
        var above = new bool[table.Count];
        var beyond = new bool[table.Count];
        for (var i = 0; i < usable.Length; i++)
        {
            left[i] = !usable[i];
            above[i] = tvd[i] < setup.Frame.SolidTopTvd;
            usable[i] &= !above[i];
            beyond[i] = md[i] > setup.Trajectory.LastStation;
        }

        var last = setup.PathCurve.IsSet ? "value of the depth curve" : "survey station";
        Add(findings, Severity.Warning, $"hole steeper than 80 deg or turning upwards: left out of the overburden, trends and layers", md, left);
        Add(findings, Severity.Note, $"logs above the ground or mudline: left out", md, above);
        Add(findings, Severity.Warning, $"logs below the last {last} at {Quantity.Length(setup.Trajectory.LastStation)} measured depth: the hole is taken to go straight on", md, beyond);
        return usable;
    }

    private static void Add(List<Finding> findings, Severity severity, FormattableString text, ReadOnlySpan<double> md, bool[] marks)
    {
        if (Finding.About(severity, text, md, marks) is { } finding) findings.Add(finding);
    }
}
