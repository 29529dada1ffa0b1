using DepthStress.Core.Quantities;

namespace DepthStress.Core.Model;

/// <summary>An observation against the path of the hole: where it lies along it, and what it reads down there.</summary>
/// <param name="Observation">The observation.</param>
/// <param name="Top">Measured depth of the top, m; NaN when the hole never reaches it.</param>
/// <param name="Base">Measured depth of the base, m; NaN when the hole never reaches it.</param>
/// <param name="OpenTop">
/// Measured depth from which rock was exposed to the pressure, m: the casing shoe above the top of a leak-off or integrity test,
/// else the top.
/// </param>
/// <param name="MiddleTvd">True vertical depth of the middle of top and base, m.</param>
/// <param name="Inclination">Inclination of the hole in the middle, rad.</param>
/// <param name="Azimuth">Its azimuth there, rad, from the north of the survey.</param>
/// <param name="FluidDensity">Density of the fluid in the hole, kg/m3: the row's, else the mud's; null where neither is known.</param>
/// <param name="Value">The pressure down in the middle, Pa, the fluid's column added where it was read at the surface; or the width, rad.</param>
/// <param name="Sigma">Its standard deviation, Pa or rad.</param>
public sealed record ObservedInterval(
    Observation Observation, double Top, double Base, double OpenTop, double MiddleTvd, double Inclination, double Azimuth,
    double? FluidDensity, double Value, double Sigma)
{
    /// <summary>Resolves an observation; the setup's path must be known.</summary>
    public static ObservedInterval Of(WellSetup setup, Observation observation)
    {
        ArgumentNullException.ThrowIfNull(setup);
        ArgumentNullException.ThrowIfNull(observation);
        var top = ZoneIndex.ToMeasured(setup, observation.Top, observation.DepthKind);
        var bottom = ZoneIndex.ToMeasured(setup, observation.Base, observation.DepthKind);
        var middle = setup.Trajectory.At((top + bottom) / 2);
        var tvd = middle.TrueVerticalDepth;
        var open = observation.Kind.IsBelowShoe() ? HoleIndex.ShoeAbove(setup, top) ?? top : top;
        var column = observation.AtSurface ? Column(observation.FluidDensity ?? double.NaN, tvd) : 0;
        return new(
            observation, top, bottom, open, tvd, middle.Inclination, middle.Azimuth,
            observation.FluidDensity ?? HoleIndex.MudDensity(setup, middle.MeasuredDepth),
            observation.AsDensity ? Column(observation.Value, tvd) : observation.Value + column,
            observation.AsDensity ? Column(observation.Sigma, tvd) : observation.Sigma);
    }

    /// <summary>
    /// The pressure at another depth of the same fluid at rest, Pa: for tests that press on the whole open hole. The value itself
    /// where the fluid's density is not known.
    /// </summary>
    /// <param name="tvd">True vertical depth, m.</param>
    public double PressureAt(double tvd) => Value + Column(FluidDensity ?? 0, tvd - MiddleTvd);

    /// <summary>Pressure of a resting mud column at the middle, Pa: the support of the wall when breakouts formed. NaN where no density is known.</summary>
    public double MudPressure => Column(FluidDensity ?? double.NaN, MiddleTvd);

    /// <summary>
    /// The samples the interval covers, as their first index and count. An interval between two samples, or a point, takes the
    /// nearer one; none above the first sample or below the last.
    /// </summary>
    /// <param name="measuredDepth">Measured depths of the samples, m, increasing.</param>
    public (int First, int Count) Samples(ReadOnlySpan<double> measuredDepth) => Within(measuredDepth, Top, Base);

    /// <summary>The same for the rock exposed to the pressure, from <see cref="OpenTop"/> down.</summary>
    /// <param name="measuredDepth">Measured depths of the samples, m, increasing.</param>
    public (int First, int Count) OpenSamples(ReadOnlySpan<double> measuredDepth) => Within(measuredDepth, OpenTop, Base);

    private static (int First, int Count) Within(ReadOnlySpan<double> depths, double top, double bottom)
    {
        if (depths.IsEmpty || !(top <= bottom) || bottom < depths[0] || top > depths[^1]) return (0, 0);
        var first = AtOrBelow(depths, top);
        var last = first;
        while (last < depths.Length && depths[last] <= bottom) last++;
        if (last > first) return (first, last - first);
        var middle = (top + bottom) / 2;
        return (first > 0 && middle - depths[first - 1] <= depths[first] - middle ? first - 1 : first, 1);
    }

    private static int AtOrBelow(ReadOnlySpan<double> depths, double depth)
    {
        var i = depths.BinarySearch(depth);
        return i < 0 ? ~i : i;
    }

    private static double Column(double density, double height) => density * Constants.StandardGravity * height;
}
