using DepthStress.Core.Logs;

namespace DepthStress.Core.Model;

/// <summary>Means of the layered samples of a zone: those that have static constants along the beds.</summary>
/// <param name="Zone">Index of the zone, or -1.</param>
/// <param name="Samples">Number of samples.</param>
/// <param name="Vertical">Static Young's modulus across the beds, Pa.</param>
/// <param name="Horizontal">Static Young's modulus along the beds, Pa.</param>
/// <param name="DynamicRatio">C13/C33 of the dynamic constants.</param>
/// <param name="StaticRatio">C13/C33 of the static constants.</param>
public sealed record VtiZone(short Zone, int Samples, double Vertical, double Horizontal, double DynamicRatio, double StaticRatio)
{
    /// <summary>The zones that have such samples, from top to bottom.</summary>
    public static IReadOnlyList<VtiZone> Of(EarthModel model)
    {
        ArgumentNullException.ThrowIfNull(model);
        if (!model.Values.Has(Property.YoungsStaticHorizontal)) return [];
        var (ed, edh) = (SampleMarks.Column(model, Property.YoungsDynamic), SampleMarks.Column(model, Property.YoungsDynamicHorizontal));
        var (nd, ndh) = (SampleMarks.Column(model, Property.PoissonDynamic), SampleMarks.Column(model, Property.PoissonDynamicHorizontal));
        var (es, esh) = (SampleMarks.Column(model, Property.YoungsStatic), SampleMarks.Column(model, Property.YoungsStaticHorizontal));
        var (ns, nsh) = (SampleMarks.Column(model, Property.PoissonStatic), SampleMarks.Column(model, Property.PoissonStaticHorizontal));
        return
        [
            .. Enumerable.Range(0, model.Count).Where(i => double.IsFinite(esh[i])).GroupBy(i => model.Zones[i]).Select(g => new VtiZone(
                g.Key, g.Count(), g.Average(i => es[i]), g.Average(i => esh[i]),
                g.Average(i => Ratio(ed[i], edh[i], nd[i], ndh[i])), g.Average(i => Ratio(es[i], esh[i], ns[i], nsh[i])))),
        ];
    }

    private static double Ratio(double vertical, double horizontal, double poisson, double poissonHorizontal) =>
        new Rock.VtiConstants(vertical, horizontal, poisson, poissonHorizontal, double.NaN).StressRatio;
}
