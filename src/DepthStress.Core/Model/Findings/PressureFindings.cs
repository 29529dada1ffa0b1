using DepthStress.Core.Diagnostics;
using DepthStress.Core.Logs;
using DepthStress.Core.Pressure;
using DepthStress.Core.Quantities;

namespace DepthStress.Core.Model;

/// <summary>Pore pressures that are hardly credible, that miss the tests, or that rest on values outside what their method knows.</summary>
internal static class PressureFindings
{
    /// <summary>Share of the weight of water below which a pressure is looked at (common practice).</summary>
    private const double Below = 0.02;

    /// <summary>Density of fresh water, kg/m3, where the well file states no pore fluid.</summary>
    private const double FreshWater = 1000;

    private const double MostSigmas = 3;

    /// <summary>Looks for such pressures.</summary>
    public static IEnumerable<Finding> Of(EarthModel model)
    {
        var (pp, tvd) = (SampleMarks.Column(model, Property.PorePressure), SampleMarks.Column(model, Property.TrueVerticalDepth));
        var weight = new double[model.Count];
        foreach (var run in model.Runs)
        {
            var fluid = run.Settings.PorePressure.FluidDensity;
            Array.Fill(weight, Constants.StandardGravity * (fluid.IsSet ? fluid.Value : FreshWater), run.Start, run.Length);
        }

        var top = model.Setup.Frame.HydrostaticTopTvd;
        return
        [
            .. SampleMarks.Where(
                model, Severity.Warning, $"pore pressure is more than 2 % below the weight of water",
                i => tvd[i] > top && pp[i] < (1 - Below) * weight[i] * (tvd[i] - top)),
            .. Tests(model),
            .. Outside(model),
        ];
    }

    private static IEnumerable<Finding> Tests(EarthModel model) => FormationTest.Of(model.Setup, model.Values, null)
        .Where(t => Math.Abs(t.Residual) > MostSigmas * t.Sigma)
        .Select(t => Finding.General(
            Severity.Warning,
            $"the formation pressure of {Quantity.Pressure(t.Pressure)} at {Quantity.Length(t.MeasuredDepth)} measured depth is more than three sigma ({Quantity.Pressure(t.Sigma)} each) off the computed {Quantity.Pressure(t.Computed)}"));

    /// <summary>Where a log lies beyond the ends of its method's curve.</summary>
    private static IEnumerable<Finding> Outside(EarthModel model)
    {
        var vp = SampleMarks.Column(model, Property.Vp);
        var (pp, sv) = (SampleMarks.Column(model, Property.PorePressure), SampleMarks.Column(model, Property.VerticalStress));
        var marks = new Dictionary<string, bool[]>(StringComparer.Ordinal);
        var trends = model.Trends.Where(t => t.Trend.Quantity == TrendQuantity.Slowness).ToList();
        foreach (var run in model.Runs)
        {
            var pore = run.Settings.PorePressure;
            if (!pore.Method.IsSet || ShaleMethod.Of(pore.Method.Value) is not { } method) continue;
            foreach (var (text, outside) in Limits(method, pore, trends, run.Zone))
            {
                if (!marks.TryGetValue(text, out var mark)) marks.Add(text, mark = new bool[model.Count]);
                for (var i = run.Start; i < run.End; i++) mark[i] = outside(vp[i]) && !(pp[i] < sv[i]);
            }
        }

        foreach (var (text, mark) in marks)
        {
            if (Finding.About(Severity.Warning, $"{text}", model.Values.Read(Property.MeasuredDepth), mark) is { } finding) yield return finding;
        }
    }

    private static IEnumerable<(string Text, Predicate<double> Outside)> Limits(ShaleMethod method, PorePressureSettings pore, List<FittedTrend> trends, short zone)
    {
        switch (method.Method)
        {
            case PorePressureMethod.BowersLoading or PorePressureMethod.BowersUnloading:
                yield return ($"velocity at or below 5000 ft/s, where {method.Law.Id} has no effective stress", v => v <= 5000 * Constants.Foot);
                if (method.Method == PorePressureMethod.BowersUnloading)
                    yield return ($"velocity above maximum_velocity, where {method.Law.Id} does not hold: the rock was not unloaded", v => v > pore.BowersMaxVelocity.Value);
                break;
            case PorePressureMethod.ZhangSonic or PorePressureMethod.EquivalentDepth when !pore.Trend.IsSet:
                if ((trends.Find(t => t.Zone == zone) ?? trends.Find(t => t.Zone < 0))?.Trend is not { } trend) yield break;
                yield return ($"sonic at or faster than the matrix limit of the trend, where {method.Law.Id} has no result", v => 1 / v <= trend.Limit);
                yield return ($"sonic slower than the trend at the ground or mudline, where {method.Law.Id} gives no effective stress", v => 1 / v > trend.Surface);
                break;
        }
    }
}
