using DepthStress.Core.Logs;
using MathNet.Numerics.Statistics;

namespace DepthStress.Core.Model;

/// <summary>How many samples of a curve came from one origin and step.</summary>
/// <param name="Origin">Where the values came from.</param>
/// <param name="Step">What put them there.</param>
/// <param name="Samples">How many.</param>
public readonly record struct OriginCount(SampleOrigin Origin, string Step, int Samples);

/// <summary>What a curve covers and where its values came from, as the chain used it.</summary>
/// <param name="Role">What the curve is.</param>
/// <param name="Source">The columns and files it was read from.</param>
/// <param name="Present">Share of the samples that have a value, 0 to 1.</param>
/// <param name="Top">Measured depth of the first value, m; NaN when there is none.</param>
/// <param name="Base">Measured depth of the last value, m; NaN when there is none.</param>
/// <param name="Median">Median of the values, SI; NaN when there is none.</param>
/// <param name="Gaps">Number of gaps between the first and the last value.</param>
/// <param name="LongestGap">Measured length of the longest of them, from value to value, m; zero when there is none.</param>
/// <param name="Origins">Counts by origin and step, in the order of depth.</param>
public sealed record CurveQuality(
    CurveRole Role, string Source, double Present, double Top, double Base, double Median, int Gaps, double LongestGap, IReadOnlyList<OriginCount> Origins)
{
    /// <summary>The quality of every curve of a model, in the order of the role table.</summary>
    public static IReadOnlyList<CurveQuality> Of(EarthModel model)
    {
        ArgumentNullException.ThrowIfNull(model);
        return [.. model.Logs.Curves.Select(c => Of(model, c))];
    }

    private static CurveQuality Of(EarthModel model, Curve curve)
    {
        // Density and predicted curves are looked at as the chain used them.
        var values = model.Values.Has(curve.Role.Property) ? model.Values.Read(curve.Role.Property) : curve.Values;
        var depths = model.Logs.Depths;
        var known = new List<double>();
        var (first, last, gaps, longest) = (-1, -1, 0, 0.0);
        for (var i = 0; i < values.Length; i++)
        {
            if (double.IsNaN(values[i])) continue;
            known.Add(values[i]);
            if (first < 0) first = i;
            if (last >= 0 && i > last + 1)
            {
                gaps++;
                longest = Math.Max(longest, depths[i] - depths[last]);
            }

            last = i;
        }

        return new CurveQuality(
            curve.Role,
            curve.Source,
            known.Count / (double)Math.Max(1, values.Length),
            first < 0 ? double.NaN : depths[first],
            last < 0 ? double.NaN : depths[last],
            known.Count == 0 ? double.NaN : known.Median(),
            gaps,
            longest,
            Count(model.Origins(curve.Role.Property) ?? curve.Origins));
    }

    private static List<OriginCount> Count(OriginTrack origins) =>
    [
        .. origins.Runs
            .Where(r => r.Origin != SampleOrigin.None)
            .GroupBy(r => (r.Origin, r.Step))
            .Select(g => new OriginCount(g.Key.Origin, g.Key.Step, g.Sum(r => r.End - r.Start))),
    ];
}
