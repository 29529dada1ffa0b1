using System.Globalization;

namespace DepthStress.Core.Depth;

/// <summary>Finds what keeps survey stations from being used, and what the reader should know about them.</summary>
internal static class SurveyCheck
{
    /// <summary>A first station below the datum and steeper than this (rad) is noted: the hole above it is taken as vertical.</summary>
    private const double SlantLimit = Math.PI / 180;

    /// <summary>Headings as near as this (rad) to opposite ones leave the plane of the arc open.</summary>
    private const double ReversalMargin = 1e-6;

    public static void Problems(ReadOnlySpan<SurveyStation> stations, TieIn? tieIn, List<(int Station, string Problem)> problems)
    {
        if (stations.Length == 0) problems.Add((0, "found no survey station, expected one at least"));
        for (var i = 0; i < stations.Length; i++)
        {
            Values(stations[i], i, problems);
            if (i == 0) continue;
            Order(stations[i - 1].MeasuredDepth, stations[i].MeasuredDepth, i, problems);
            if (IsReversal(stations[i - 1], stations[i]))
                problems.Add((i, "found a hole that turns back on itself since the station before, expected a turn of less than 180 deg"));
        }

        if (tieIn is not null && stations.Length > 0 && stations[0].MeasuredDepth < tieIn.MeasuredDepth)
            problems.Add((0, string.Create(CultureInfo.InvariantCulture, $"found measured depth {stations[0].MeasuredDepth:G10} m above the tie-in at {tieIn.MeasuredDepth:G10} m, expected none above it")));
    }

    public static void Notes(ReadOnlySpan<SurveyStation> stations, List<(int Station, string Note)> notes)
    {
        var first = stations[0];
        if (first.MeasuredDepth > 0 && first.Inclination > SlantLimit)
        {
            notes.Add((0, string.Create(
                CultureInfo.InvariantCulture,
                $"found an inclination of {Degrees(first.Inclination)} deg at the first station, measured depth {first.MeasuredDepth:G10} m, below a hole that is taken as vertical")));
        }
    }

    private static void Values(SurveyStation station, int i, List<(int Station, string Problem)> problems)
    {
        Finite(station.MeasuredDepth, "measured depth", i, problems);
        Finite(station.Inclination, "inclination", i, problems);
        Finite(station.Azimuth, "azimuth", i, problems);
        if (i == 0 && station.MeasuredDepth < 0)
            problems.Add((i, string.Create(CultureInfo.InvariantCulture, $"found a measured depth of {station.MeasuredDepth:G10} m, expected 0 m or more")));
        if (station.Inclination is < 0 or > Math.PI)
            problems.Add((i, string.Create(CultureInfo.InvariantCulture, $"found an inclination of {Degrees(station.Inclination)} deg, expected 0 to 180 deg")));
    }

    private static void Order(double before, double here, int i, List<(int Station, string Problem)> problems)
    {
        if (here == before)
            problems.Add((i, string.Create(CultureInfo.InvariantCulture, $"found measured depth {here:G10} m equal to that of the station before ({before:G10} m), expected a greater one")));
        else if (here < before)
            problems.Add((i, string.Create(CultureInfo.InvariantCulture, $"found measured depth {here:G10} m above that of the station before ({before:G10} m), expected a greater one")));
    }

    private static bool IsReversal(SurveyStation a, SurveyStation b) =>
        SurveyArc.Angle(Heading.Of(a.Inclination, a.Azimuth), Heading.Of(b.Inclination, b.Azimuth)) > Math.PI - ReversalMargin;

    private static void Finite(double value, string name, int i, List<(int Station, string Problem)> problems)
    {
        if (!double.IsFinite(value))
            problems.Add((i, string.Create(CultureInfo.InvariantCulture, $"found the {name} {value}, expected a finite number")));
    }

    private static double Degrees(double angle) => Math.Round(angle * 180 / Math.PI, 6);
}
