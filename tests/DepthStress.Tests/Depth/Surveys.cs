using CsCheck;
using DepthStress.Core.Depth;

namespace DepthStress.Tests.Depth;

/// <summary>Invented surveys for tests.</summary>
internal static class Surveys
{
    /// <summary>Stations whose hole may climb, with doglegs of any size.</summary>
    public static readonly Gen<SurveyStation[]> Any = Of(1.7);

    /// <summary>Stations whose hole always goes down, at 75 deg at most.</summary>
    public static readonly Gen<SurveyStation[]> Descending = Of(75 * Math.PI / 180);

    /// <summary>Degrees, as surveys give them.</summary>
    public static SurveyStation Station(double md, double inclination, double azimuth) =>
        new(md, inclination * Math.PI / 180, azimuth * Math.PI / 180);

    public static Trajectory Path(params ReadOnlySpan<SurveyStation> stations)
    {
        List<(int Station, string Problem)> problems = [];
        Assert.True(Trajectory.TryCreate(stations, out var trajectory, problems, []), string.Join("; ", problems));
        return trajectory;
    }

    /// <summary>A survey that counts from a tie-in.</summary>
    public static Trajectory Tied(TieIn tieIn, params ReadOnlySpan<SurveyStation> stations)
    {
        List<(int Station, string Problem)> problems = [];
        Assert.True(Trajectory.TryCreate(stations, tieIn, out var trajectory, problems, []), string.Join("; ", problems));
        return trajectory;
    }

    /// <summary>Filling many depths gives the very numbers of single points.</summary>
    public static void FillEqualsAt(Trajectory path, double[] md)
    {
        double[] tvd = new double[md.Length], inclination = new double[md.Length], azimuth = new double[md.Length];
        path.Fill(md, tvd, inclination, azimuth);
        Assert.Equal(md.Select(d => path.At(d).TrueVerticalDepth), tvd);
        Assert.Equal(md.Select(d => path.At(d).Inclination), inclination);
        Assert.Equal(md.Select(d => path.At(d).Azimuth), azimuth);
    }

    private static Gen<SurveyStation[]> Of(double maxInclination) =>
        Gen.Select(Gen.Double[0.5, 200], Gen.Double[0, maxInclination], Gen.Double[0, Math.Tau]).Array[1, 12].Select(steps =>
        {
            var md = 0.0;
            return Array.ConvertAll(steps, step => new SurveyStation(md += step.Item1, step.Item2, step.Item3));
        });
}
