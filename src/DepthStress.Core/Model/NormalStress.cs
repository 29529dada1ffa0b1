using DepthStress.Core.Logs;
using DepthStress.Core.Pressure;
using DepthStress.Core.Quantities;

namespace DepthStress.Core.Model;

/// <summary>
/// Effective stress at normal pressure against true vertical depth: the vertical stress of the profile, carried up to the ground or mudline
/// in the shape of what is assumed above the log, less the normal pressure.
/// </summary>
internal sealed class NormalStress
{
    private readonly double[] _depths;
    private readonly double[] _stresses;
    private readonly double _top;
    private readonly double _water;
    private readonly ShallowDensity? _above;
    private readonly PressureLine _normal;

    private NormalStress(double[] depths, double[] stresses, double top, double water, ShallowDensity? above, PressureLine normal)
    {
        (_depths, _stresses, _top, _water, _above, _normal) = (depths, stresses, top, water, above, normal);
    }

    /// <summary>Prepares it from the columns.</summary>
    public static NormalStress Of(WellSetup setup, PropertyTable table, PressureLine normal)
    {
        var (depths, stresses) = (new List<double>(), new List<double>());
        var tvd = table.Read(Property.TrueVerticalDepth);
        var sv = table.Read(Property.VerticalStress);
        var density = table.Read(Property.Density);
        var first = double.NaN;
        for (var i = 0; i < tvd.Length; i++)
        {
            if (double.IsNaN(sv[i]) || (depths.Count > 0 && !(tvd[i] > depths[^1]))) continue;
            if (depths.Count == 0) first = density[i];
            depths.Add(tvd[i]);
            stresses.Add(sv[i]);
        }

        var (frame, overburden) = (setup.Frame, setup.Overburden);
        var above = overburden.AboveLog.IsSet && depths.Count > 0 && depths[0] > frame.SolidTopTvd
            ? overburden.AboveLog.Value.Tie(depths[0] - frame.SolidTopTvd, first, out _)
            : null;
        var water = overburden.WaterDensity.Value * Constants.StandardGravity * (frame.WaterDepth ?? 0);
        return new NormalStress([.. depths], [.. stresses], frame.SolidTopTvd, water, above, normal);
    }

    /// <summary>Fills the effective stress where normally compacted shale has each sample's value; NaN where that depth has no stress.</summary>
    public void Fill(NormalTrend trend, double solidTop, ReadOnlySpan<double> log, Span<double> effective)
    {
        for (var i = 0; i < log.Length; i++)
        {
            var depth = trend.DepthOf(log[i]) + solidTop;
            effective[i] = StressAt(depth) - _normal.At(depth);
        }
    }

    private double StressAt(double tvd)
    {
        if (double.IsNaN(tvd) || _depths.Length == 0 || tvd < _top || tvd > _depths[^1]) return double.NaN;
        if (tvd < _depths[0])
        {
            var share = _above is null ? (tvd - _top) / (_depths[0] - _top) : _above.MassAbove(tvd - _top) / _above.MassAbove(_depths[0] - _top);
            return _water + ((_stresses[0] - _water) * share);
        }

        var k = Array.BinarySearch(_depths, tvd);
        if (k >= 0) return _stresses[k];
        k = ~k;
        return _stresses[k - 1] + ((_stresses[k] - _stresses[k - 1]) * (tvd - _depths[k - 1]) / (_depths[k] - _depths[k - 1]));
    }
}
