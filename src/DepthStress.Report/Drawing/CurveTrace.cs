using DepthStress.Core.Model;
using DepthStress.Core.Quantities;

namespace DepthStress.Report.Drawing;

/// <summary>What a picture needs of one curve: its thinned lines and what the thinning leaves out.</summary>
/// <param name="Curve">The curve.</param>
/// <param name="Lines">Lines without gaps.</param>
/// <param name="Tally">All its samples against its scale.</param>
internal sealed record CurveTrace(CurveDefinition Curve, IReadOnlyList<IReadOnlyList<LogPoint>> Lines, ScaleTally Tally)
{
    private const int Chunk = 4096;

    /// <summary>How many samples lie beyond an end of the scale.</summary>
    public int OffScale => Tally.OffScale;

    /// <summary>Fills a span with values in the picture's unit, from a sample on.</summary>
    private delegate void Filler(int start, Span<double> destination);

    /// <summary>Reads a curve in one pass over chunks; null when it has no value.</summary>
    /// <param name="model">The model.</param>
    /// <param name="curve">The curve.</param>
    /// <param name="units">The picture's units.</param>
    /// <param name="depths">Depth of each sample, in the picture's unit.</param>
    /// <param name="axis">The depth axis, which decides what can still be told apart.</param>
    public static CurveTrace? Read(EarthModel model, CurveDefinition curve, UnitSystem units, double[] depths, DepthAxis axis) =>
        Read(curve, units, depths, axis, (start, destination) => curve.Column.Fill(model, start, units, destination));

    /// <summary>The same of values in SI, one for each depth; null when none is there.</summary>
    public static CurveTrace? Of(CurveDefinition curve, double[] values, UnitSystem units, double[] depths, DepthAxis axis)
    {
        var unit = curve.Column.In(units).Unit;
        return Read(curve, units, depths, axis, (start, destination) =>
        {
            values.AsSpan(start, destination.Length).CopyTo(destination);
            unit.FromSi(destination);
        });
    }

    private static CurveTrace? Read(CurveDefinition curve, UnitSystem units, double[] depths, DepthAxis axis, Filler fill)
    {
        var values = new double[Math.Min(Chunk, depths.Length)];
        var decimator = new Decimator(axis.Top, axis.Pixel);
        var tally = new ScaleTally(curve.Scale(units));
        for (var start = 0; start < depths.Length; start += Chunk)
        {
            var n = Math.Min(Chunk, depths.Length - start);
            fill(start, values.AsSpan(0, n));
            for (var i = 0; i < n; i++)
            {
                decimator.Add(depths[start + i], values[i]);
                tally.Add(values[i]);
            }
        }

        var lines = decimator.Lines();
        return lines.Count == 0 ? null : new CurveTrace(curve, lines, tally);
    }

    /// <summary>The scale of each curve of a track, those that follow the data set to round ends.</summary>
    public static IReadOnlyList<CurveScale> Scales(IReadOnlyList<CurveTrace> traces) => ScaleTally.Scales([.. traces.Select(t => t.Tally)]);
}
