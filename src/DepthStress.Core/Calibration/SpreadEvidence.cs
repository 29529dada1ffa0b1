using DepthStress.Core.Logs;
using DepthStress.Core.Model;

namespace DepthStress.Core.Calibration;

/// <summary>What tests and core say in a zone where choices spread Shmin.</summary>
/// <param name="Tests">Number of tests that give a value of Shmin.</param>
/// <param name="TestMiss">Mean of observed less modelled Shmin over them, Pa; NaN without any.</param>
/// <param name="Plugs">Number of plugs with a static modulus beside the model's.</param>
/// <param name="ModulusRatio">Mean ratio of the plugs' static modulus to the model's; NaN without any.</param>
public readonly record struct SpreadEvidence(int Tests, double TestMiss, int Plugs, double ModulusRatio)
{
    /// <summary>The evidence of a zone, or outside zones with -1.</summary>
    public static SpreadEvidence Of(EarthModel model, IReadOnlyList<Comparison> comparisons, CoreComparison? core, short zone)
    {
        ArgumentNullException.ThrowIfNull(model);
        var misses = comparisons.Where(c => c.Reading.Subject == Reading.Shmin && c.Reading.Meaning == Meaning.Value && ZoneAt(model, c.Reading.Interval.Top) == zone)
            .Select(c => c.Measured - c.Modelled).Where(double.IsFinite).ToList();
        var ratios = core?.Rows.Where(r => ZoneAt(model, r.Depth) == zone).Select(r => r.Plug.YoungsStatic / r.Youngs).Where(double.IsFinite).ToList() ?? [];
        return new SpreadEvidence(misses.Count, misses.Count > 0 ? misses.Average() : double.NaN, ratios.Count, ratios.Count > 0 ? ratios.Average() : double.NaN);
    }

    private static int ZoneAt(EarthModel model, double measuredDepth)
    {
        var at = model.Values.Read(Property.MeasuredDepth).BinarySearch(measuredDepth);
        return model.Zones[Math.Clamp(at < 0 ? ~at : at, 0, model.Count - 1)];
    }
}
