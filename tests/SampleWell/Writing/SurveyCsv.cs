using SampleWell.Hidden;

namespace SampleWell.Writing;

/// <summary>Writes the directional survey, a station every 30 m to below the last sample.</summary>
internal static class SurveyCsv
{
    private const int Interval = 30;

    /// <summary>As an instrument reports it: two decimals, small errors, and a wandering azimuth where the hole is nearly vertical.</summary>
    public static void WriteMeasured(string path, WellPlan plan)
    {
        var draws = new Draws(plan.Seed, "survey");
        using var text = Open(path);
        for (var md = 0; md < plan.LastMd + Interval; md += Interval)
        {
            var inclination = plan.Path.Inclination(md);
            var steady = Physics.Smooth(0, 4, inclination);
            var reported = md == 0 ? 0 : Math.Max(0.05, inclination + 0.06 * draws.Normal() + (1 - steady) * draws.Between(0.1, 0.4));
            var azimuth = plan.Path.AzimuthDegrees + (0.25 + (1 - steady) * 40) * draws.Normal();
            Station(text, md, reported, md == 0 ? 0 : (azimuth + 720) % 360, 2);
        }
    }

    /// <summary>The path itself, with all the digits it has; the arc starts and ends at stations, so minimum curvature returns it.</summary>
    public static void WriteExact(string path, WellPlan plan)
    {
        using var text = Open(path);
        for (var md = 0; md < plan.LastMd + Interval; md += Interval)
            Station(text, md, plan.Path.Inclination(md), plan.Path.AzimuthDegrees, 12);
    }

    private static FixedText Open(string path) => new FixedText(path).Add("md_m,inclination_deg,azimuth_deg\n");

    private static void Station(FixedText text, int md, double inclination, double azimuth, int decimals) =>
        text.Add(md, 1).Add(",").Add(inclination, decimals).Add(",").Add(azimuth, decimals == 2 ? 2 : 6).Add("\n");
}
