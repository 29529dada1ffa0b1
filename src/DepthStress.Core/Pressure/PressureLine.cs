using DepthStress.Core.Depth;
using DepthStress.Core.Quantities;

namespace DepthStress.Core.Pressure;

/// <summary>
/// Pore pressure as straight lines over true vertical depth: the plan that a prepare stage makes of the settings, and the
/// kernel that fills samples from it.
/// </summary>
public sealed class PressureLine
{
    private readonly double[] _depths;
    private readonly double[] _pressures;
    private readonly double _gradientBelow;

    private PressureLine(double[] depths, double[] pressures, double gradientBelow)
    {
        _depths = depths;
        _pressures = pressures;
        _gradientBelow = gradientBelow;
    }

    /// <summary>Makes the plan of a method that needs no log.</summary>
    /// <param name="settings">Complete settings of one method.</param>
    /// <param name="frame">The well's reference levels.</param>
    /// <param name="waterDensity">Density of sea water, kg/m3, for the pressure at the mudline.</param>
    /// <param name="toVertical">Turns a table depth of the stated kind into true vertical depth, m.</param>
    public static PressureLine Prepare(
        PorePressureSettings settings, DepthFrame frame, double waterDensity, Func<double, DepthKind, double> toVertical)
    {
        ArgumentNullException.ThrowIfNull(settings);
        ArgumentNullException.ThrowIfNull(frame);
        ArgumentNullException.ThrowIfNull(toVertical);
        switch (settings.Method.Value)
        {
            case PorePressureMethod.Gradient:
                var reference = settings.Reference.Value;
                var start = reference == DepthReference.Mudline ? waterDensity * Constants.StandardGravity * (frame.WaterDepth ?? 0) : 0;
                return new PressureLine([frame.TvdOf(reference)], [start], settings.Gradient.Value * Constants.StandardGravity);
            case PorePressureMethod.Table:
                return Table(settings, toVertical);
            default:
                return Hydrostatic(frame, settings.FluidDensity.Value);
        }
    }

    /// <summary>The weight of a fluid from sea level or the water table down.</summary>
    /// <param name="frame">The well's reference levels.</param>
    /// <param name="density">Density of the fluid, kg/m3.</param>
    public static PressureLine Hydrostatic(DepthFrame frame, double density)
    {
        ArgumentNullException.ThrowIfNull(frame);
        return new PressureLine([frame.HydrostaticTopTvd], [0], density * Constants.StandardGravity);
    }

    /// <summary>Straight lines between the points of the settings.</summary>
    /// <param name="settings">Settings with points and their kind of depth.</param>
    /// <param name="toVertical">Turns a table depth of the stated kind into true vertical depth, m.</param>
    public static PressureLine Table(PorePressureSettings settings, Func<double, DepthKind, double> toVertical)
    {
        ArgumentNullException.ThrowIfNull(settings);
        ArgumentNullException.ThrowIfNull(toVertical);
        var points = settings.Points.Value;
        return new PressureLine(
            [.. points.Select(p => toVertical(p.Depth, settings.DepthKind.Value))], [.. points.Select(p => p.Pressure)], double.NaN);
    }

    /// <summary>Pore pressure at a depth, Pa; NaN above the first point of a table and below its last.</summary>
    public double At(double tvd)
    {
        if (double.IsNaN(tvd)) return double.NaN;
        if (tvd < _depths[0]) return double.IsNaN(_gradientBelow) ? double.NaN : 0;
        var next = Array.BinarySearch(_depths, tvd);
        if (next >= 0) return _pressures[next];
        next = ~next;
        return next == _depths.Length
            ? _pressures[^1] + (_gradientBelow * (tvd - _depths[^1]))
            : _pressures[next - 1] + ((_pressures[next] - _pressures[next - 1]) * (tvd - _depths[next - 1]) / (_depths[next] - _depths[next - 1]));
    }

    /// <summary>Fills pore pressure for every sample; a missing depth gives a missing pressure.</summary>
    /// <exception cref="ArgumentException">Lengths differ.</exception>
    public void Fill(ReadOnlySpan<double> tvd, Span<double> pressure)
    {
        if (pressure.Length != tvd.Length) throw new ArgumentException("Lengths differ.", nameof(pressure));
        for (var i = 0; i < tvd.Length; i++) pressure[i] = At(tvd[i]);
    }
}
